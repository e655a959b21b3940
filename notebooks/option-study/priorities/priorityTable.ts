import { h } from '../../html.ts';
import { standing, type Fields, type StudyStore } from '../../page/index.ts';
import type { Graph } from '../../reactive/index.ts';
import { focusField, listAction } from '../brief/fieldTable.ts';
import { problemBeside } from '../brief/problemBeside.ts';
import { priorityNames, renamed, withNewPriority, withoutPriority, withWeight } from './priorityEdits.ts';

const nameKey = (name: string): string => `priorities.${name}.name`;

function row(fields: Fields, store: StudyStore, name: string): HTMLElement {
  const has = ({ priorities }: { priorities: { weights: object } }): boolean =>
    Object.hasOwn(priorities.weights, name);
  const words = fields.words(
    { key: nameKey(name), has, get: () => name, put: (study, next) => renamed(study, name, next) },
    { label: `priority ${name}`, most: 200 },
  );
  const weight = fields.figure(
    {
      key: `priorities.${name}.weight`,
      has,
      get: (study) => study.priorities.weights[name] ?? 0,
      put: (study, next) => (next === 'unknown' ? study : withWeight(study, name, next)),
      owns: [['priorities', 'weights', name]],
    },
    {
      label: `weight of ${name}`,
      places: 1,
      step: 1,
      min: { value: 0 },
      max: { value: 1e6 },
    },
  );
  return h(
    'tr',
    {},
    h('td', { class: 'text' }, words),
    h('td', { class: 'figure' }, weight),
    h(
      'td',
      {},
      listAction('take out', `take out priority ${name}`, `take.priorities.${name}`, () =>
        store.edit((study) => withoutPriority(study, name), { what: `taking out ${name}` }),
      ),
    ),
  );
}

/** What whoever decides puts first, as a stated list: names and weights, changed where they stand. */
export function priorityTable(graph: Graph, store: StudyStore): HTMLElement {
  const { element } = standing(graph, store, {
    say: problemBeside,
    shape: priorityNames,
    build(study, fields) {
      const names = priorityNames(study);
      return [
        names.length === 0
          ? h('p', {}, 'None are stated.')
          : h(
              'table',
              { class: 'priorities' },
              h(
                'thead',
                {},
                h(
                  'tr',
                  {},
                  h('th', { scope: 'col' }, 'priority'),
                  h('th', { scope: 'col', class: 'figure' }, 'weight'),
                  h('th', { scope: 'col' }, h('span', { class: 'unseen' }, 'action')),
                ),
              ),
              h(
                'tbody',
                {},
                names.map((name) => row(fields, store, name)),
              ),
            ),
        h(
          'p',
          { class: 'list-actions' },
          listAction('Add a priority', 'Add a priority', 'add.priorities', () => {
            const { study: next, name } = withNewPriority(store.valid());
            store.edit(() => next, { what: 'adding a priority' });
            focusField(element, nameKey(name));
          }),
        ),
      ];
    },
  });
  // A name that is kept may move in the list: the hand leaves its field, which stands for the old one.
  const leave = (event: KeyboardEvent): void => {
    if (event.key === 'Enter' && event.target instanceof HTMLElement && event.target.matches('.words'))
      event.target.blur();
  };
  element.addEventListener('keydown', leave, { capture: true });
  return element;
}
