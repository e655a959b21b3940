import type { Obstacle, Study } from '../../../lib/index.ts';
import { h, type HtmlChild } from '../../html.ts';
import { putAt, standing, type Fields, type Path, type StudyStore } from '../../page/index.ts';
import type { Graph } from '../../reactive/index.ts';
import { obstacleKindChoices, supportChoices } from './briefChoices.ts';
import { clearanceState, withClearanceState, type ClearanceState } from './clearanceState.ts';
import { fieldRow, focusField, listAction } from './fieldTable.ts';
import { withEntry, withListOf, withoutEntry, withPasted } from './listEdits.ts';
import { pastedObstacles } from './pastedObstacles.ts';
import { problemBeside } from './problemBeside.ts';

const list: Path = ['brief', 'obstacles'];

/** An obstacle that changes nothing until it is said where it lies and what it asks for: 10 m in the middle. */
function newObstacle({ brief }: Study): Obstacle {
  const middleM = Math.round((brief.crossing.startM + brief.crossing.endM) / 2);
  return {
    kind: 'road',
    name: `Obstacle ${brief.obstacles.length + 1}`,
    fromM: middleM - 5,
    toM: middleM + 5,
    supports: 'none',
    pierPremium: 'unknown',
    clearance: null,
  };
}

function clearanceChoice(fields: Fields, index: number, name: string): HTMLElement {
  return fields.choice<ClearanceState>(
    {
      key: `brief.obstacles.${index}.clearance`,
      has: (study) => index < study.brief.obstacles.length,
      get: (study) => clearanceState(study.brief.obstacles[index]!),
      put: (study, state) =>
        putAt(study, [...list, index], withClearanceState(study.brief, study.brief.obstacles[index]!, state)),
      owns: [],
    },
    {
      label: `envelope over ${name}`,
      choices: [
        { value: 'none', words: 'none' },
        { value: 'preset', words: 'preset' },
        { value: 'confirmed', words: 'confirmed' },
      ],
      isPreset: (draft) => (draft as Study).brief.obstacles[index]?.clearance?.confirmed === false,
    },
  );
}

/** What a support in a soft stretch costs besides itself; nothing said takes the rate of the pack. */
function premium(fields: Fields, index: number, name: string, currency: string): HTMLElement {
  const at: Path = [...list, index, 'pierPremium'];
  return fields.figure(
    {
      key: at.join('.'),
      has: (study) => index < study.brief.obstacles.length,
      get: (study) => study.brief.obstacles[index]!.pierPremium,
      put: (study, sum) => putAt(study, at, sum),
      owns: [at],
    },
    {
      label: `${name}, sum for a support in it, thousand ${currency}`,
      places: 0,
      unit: `k${currency}`,
      per: 1e-3,
      step: 5,
      unknown: 'by rate',
      from: 90,
      min: { value: 0, open: true },
      max: { value: 1e9 },
    },
  );
}

function row(
  fields: Fields,
  store: StudyStore,
  obstacle: Obstacle,
  index: number,
  currency: string,
): HTMLElement[] {
  const at = (...rest: Path): Path => [...list, index, ...rest];
  const named = `obstacle ${index + 1}`;
  const metres = (what: string, places: number, ...rest: Path): HTMLElement =>
    fields.figure(at(...rest), {
      label: `${named}, ${what}`,
      places,
      unit: 'm',
      step: places > 1 ? 0.1 : 1,
      ...(rest.at(-1) === 'headroomM' && {
        isPreset: (draft: unknown) => (draft as Study).brief.obstacles[index]?.clearance?.confirmed === false,
        confirm: () =>
          store.edit((study) => putAt(study, at('clearance', 'confirmed'), true), { what: 'confirming' }),
      }),
    });
  const envelope =
    obstacle.clearance === null
      ? null
      : [
          metres('envelope from', 1, 'clearance', 'fromM'),
          metres('envelope to', 1, 'clearance', 'toM'),
          metres('envelope above level', 2, 'clearance', 'datumLevelM'),
          metres('headroom', 2, 'clearance', 'headroomM'),
        ];
  const cells: HtmlChild[] = [
    fields.words(at('name'), { label: `${named}, name`, most: 500 }),
    fields.choice(at('kind'), { label: `${named}, kind`, choices: obstacleKindChoices }),
    metres('from', 1, 'fromM'),
    metres('to', 1, 'toM'),
    fields.choice(at('supports'), { label: `${named}, supports`, choices: supportChoices }),
    obstacle.supports === 'soft' ? premium(fields, index, named, currency) : '–',
    clearanceChoice(fields, index, named),
    ...(envelope ?? ['–', '–', '–', '–']),
    listAction('take out', `take out ${obstacle.name}`, `take.obstacles.${index}`, () =>
      store.edit((study) => withoutEntry(study, list, index), { what: `taking out ${obstacle.name}` }),
    ),
  ];
  return fieldRow(cells);
}

/** What a paste of obstacles did or why it was refused, said below the table; and the box it may be pasted into. */
function pasting(store: StudyStore): { readonly box: HTMLElement; readonly take: (text: string) => void } {
  const said = h('p', { class: 'pasted', role: 'status' });
  const field = h('textarea', {
    class: 'fig paste',
    rows: 1,
    'aria-label': 'paste obstacles: name, kind, from, to, supports, envelope from, to, above level, clear',
    placeholder: 'paste rows here',
    'data-key': 'paste.obstacles',
    spellcheck: 'false',
  });
  const take = (text: string): void => {
    const before = store.valid();
    const had = before.brief.obstacles.length;
    const read = pastedObstacles(text);
    said.classList.toggle('refusal', !read.ok);
    if (!read.ok) {
      said.replaceChildren(`Nothing taken: ${read.why}. The ${had} obstacles stay as they are.`);
      return;
    }
    store.edit((study) => withPasted(study, list, read.obstacles), { what: 'pasting obstacles' });
    const takeBack = (): void => {
      store.edit((study) => withListOf(study, list, before), { what: 'taking back pasted obstacles' });
      said.replaceChildren();
    };
    const words = [
      `${read.obstacles.length} ${read.obstacles.length === 1 ? 'obstacle' : 'obstacles'} taken in place of ${had}`,
      ...read.remarks,
    ];
    said.replaceChildren(
      `${words.join('; ')}. `,
      h('button', { type: 'button', class: 'action', onclick: takeBack }, 'Take them back'),
    );
  };
  field.addEventListener('change', () => {
    const text = field.value;
    field.value = '';
    if (text.trim() !== '') take(text);
  });
  return { box: h('div', {}, h('p', { class: 'list-actions' }, field), said), take };
}

/** The obstacles of the crossing in a table: where each lies, whether supports may stand there, what must stay clear. */
export function obstacleTable(graph: Graph, store: StudyStore): HTMLElement {
  const { element } = standing(graph, store, {
    say: problemBeside,
    shape: ({ brief }) =>
      brief.obstacles.map(({ clearance, supports }) => `${clearance !== null} ${supports === 'soft'}`),
    build: ({ brief, books }, fields) => [
      h(
        'div',
        { class: 'across' },
        h(
          'table',
          { class: 'brief-table obstacles' },
          h('caption', {}, 'Obstacles'),
          h(
            'thead',
            {},
            h(
              'tr',
              {},
              [
                '',
                '',
                'from',
                'to',
                'supports',
                'sum for one',
                'envelope',
                'from',
                'to',
                'above level',
                'clear',
                '',
              ].map((words) => h('th', { scope: 'col' }, words)),
            ),
          ),
          h(
            'tbody',
            {},
            brief.obstacles.map((obstacle, index) => row(fields, store, obstacle, index, books.currency)),
          ),
        ),
      ),
      h(
        'p',
        { class: 'list-actions' },
        listAction('Add an obstacle', 'Add an obstacle', 'add.obstacles', () => {
          const at = brief.obstacles.length;
          store.edit((study) => withEntry(study, list, at, newObstacle(study)), {
            what: 'adding an obstacle',
          });
          focusField(element, `brief.obstacles.${at}.name`);
        }),
      ),
    ],
  });
  const { box, take } = pasting(store);
  const whole = h('div', {}, element, box);
  whole.addEventListener(
    'paste',
    (event) => {
      const text = event.clipboardData?.getData('text/plain') ?? '';
      // A name or a single figure is pasted into its field; rows of columns are obstacles.
      if (!/[\t;]/u.test(text.trim())) return;
      event.preventDefault();
      event.stopPropagation();
      take(text);
    },
    true,
  );
  return whole;
}
