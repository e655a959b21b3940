import { isAssumed, type ProfilePoint, type Study } from '../../../lib/index.ts';
import { fixed } from '../../format.ts';
import { h, type HtmlChild } from '../../html.ts';
import { standing, type Fields, type Path, type StudyStore } from '../../page/index.ts';
import type { Graph } from '../../reactive/index.ts';
import { confirmAction, listAction, saidBelow, sayIn } from './fieldTable.ts';
import { withEntry, withListOf, withoutEntry, withPasted } from './listEdits.ts';
import { pastedProfile } from './pastedProfile.ts';
import { problemBeside } from './problemBeside.ts';

const list: Path = ['brief', 'crossing', 'ground'];

/** A survey with more points than this is not set out point by point: nobody corrects it by hand. */
const MOST_SHOWN = 240;

/** Halfway to the next point, or as far beyond the last one as that is from the one before. */
function pointAfter(ground: readonly ProfilePoint[], index: number): ProfilePoint {
  const at = ground[index]!;
  const next = ground[index + 1];
  const before = ground[index - 1] ?? at;
  const round = (value: number, places: number): number => Number(value.toFixed(places));
  if (next === undefined) {
    return { chainageM: at.chainageM + (at.chainageM - before.chainageM || 10), levelM: at.levelM };
  }
  return {
    chainageM: round((at.chainageM + next.chainageM) / 2, 2),
    levelM: round((at.levelM + next.levelM) / 2, 2),
  };
}

/** Whether any of it is a start value still. */
const isSketched = (study: Study): boolean => isAssumed(study, list.join('.'));

function pointItem(fields: Fields, store: StudyStore, study: Study, index: number): HTMLElement {
  const { ground } = study.brief.crossing;
  const at = (key: string): Path => [...list, index, key];
  const named = `ground point ${index + 1}`;
  const chainage = fixed(ground[index]!.chainageM, 1);
  return h(
    'li',
    { class: 'point' },
    h(
      'span',
      { class: 'ch' },
      fields.figure(at('chainageM'), { label: `${named}, chainage`, places: 1, unit: 'm' }),
    ),
    h('span', {}, fields.figure(at('levelM'), { label: `${named}, level`, places: 2, unit: 'm', step: 0.1 })),
    h(
      'span',
      { class: 'acts' },
      isSketched(study) &&
        confirmAction(fields, store, {
          words: 'confirm',
          what: named,
          key: `confirm.ground.${index}`,
          paths: [[...list, index].join('.')],
        }),
      listAction('add', `add a point after ${chainage}`, `add.ground.${index}`, () => {
        store.edit(
          (study) => withEntry(study, list, index + 1, pointAfter(study.brief.crossing.ground, index)),
          { what: 'adding a point' },
        );
      }),
      ground.length > 2 &&
        listAction('take out', `take out the point at ${chainage}`, `take.ground.${index}`, () =>
          store.edit((study) => withoutEntry(study, list, index), { what: 'taking out a point' }),
        ),
    ),
  );
}

/** What a paste did or why it was refused, said below the table. */
function pasting(store: StudyStore) {
  const said = h('p', { class: 'pasted', role: 'status' });
  const take = (text: string): void => {
    const before = store.valid();
    const { ground } = before.brief.crossing;
    const read = pastedProfile(text);
    said.classList.toggle('refusal', !read.ok);
    if (!read.ok) {
      said.replaceChildren(`Nothing taken: ${read.why}. The ${ground.length} points stay as they are.`);
      return;
    }
    store.edit((study) => withPasted(study, list, read.points), { what: 'pasting the ground line' });
    const takeBack = (): void => {
      store.edit((study) => withListOf(study, list, before), { what: 'taking back the pasted ground line' });
      said.replaceChildren();
    };
    said.replaceChildren(
      `${[`${read.points.length} points taken in place of ${ground.length}`, ...read.remarks].join('; ')}. `,
      h('button', { type: 'button', class: 'action', click: takeBack }, 'Take them back'),
    );
  };
  return { said, take };
}

/** The ground line point by point, as in the band under a drawing; two pasted columns take its place. */
export function groundTable(graph: Graph, store: StudyStore): HTMLElement {
  const { said, take } = pasting(store);
  const box = h('textarea', {
    class: 'fig paste',
    rows: 1,
    'aria-label': 'paste the ground line: two columns, chainage and level',
    placeholder: 'paste two columns here',
    'data-key': 'paste.ground',
    spellcheck: 'false',
  });
  const takeBox = (): void => {
    const text = box.value;
    if (text.trim() === '') return;
    box.value = '';
    take(text);
  };
  box.addEventListener('change', takeBox);

  const points = standing(graph, store, {
    say: problemBeside,
    shape: (study) => [study.brief.crossing.ground.length, isSketched(study)],
    build(study, fields): HtmlChild {
      const { ground } = study.brief.crossing;
      const confirmLine = (): HtmlChild =>
        isSketched(study) &&
        confirmAction(fields, store, {
          words: 'Confirm the ground line',
          what: 'the ground line',
          key: 'confirm.ground',
          paths: [list.join('.')],
        });
      if (ground.length > MOST_SHOWN) {
        const said = h('p', { class: 'refusal', role: 'status' });
        const ends = [0, ground.length - 1].map((index): Path => [...list, index, 'chainageM']);
        fields.follow(ends, (_, problems) => sayIn(said, problems.map(problemBeside).join(' ')));
        const [fromM, toM] = [ground[0]!.chainageM, ground.at(-1)!.chainageM];
        return [
          h(
            'p',
            {},
            `${ground.length} points from ${fixed(fromM, 1)} to ${fixed(toM, 1)}: too many to set out. Change them where they come from and paste them again.`,
          ),
          said,
          confirmLine(),
        ];
      }
      const set = h(
        'ol',
        { class: 'points', 'aria-label': 'Ground line: chainage above, level below' },
        ground.map((_, index) => pointItem(fields, store, study, index)),
      );
      return [set, saidBelow(set), confirmLine()];
    },
  }).element;
  const element = h(
    'div',
    { class: 'ground-table' },
    h('p', { class: 'caption' }, 'Ground line: chainage above, level below'),
    points,
    h('p', { class: 'list-actions' }, box),
    said,
  );
  element.addEventListener(
    'paste',
    (event) => {
      const text = event.clipboardData?.getData('text/plain') ?? '';
      // A single figure is pasted into its field; lines and columns are a ground line.
      if (!/[\t\n\r;]/u.test(text.trim())) return;
      event.preventDefault();
      event.stopPropagation();
      take(text);
    },
    true,
  );
  return element;
}
