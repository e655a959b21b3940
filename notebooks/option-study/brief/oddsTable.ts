import {
  groundClassIds,
  groundLabels,
  type GroundClassId,
  type GroundStretch,
  type Study,
} from '../../../lib/index.ts';
import { fixed } from '../../format.ts';
import { h } from '../../html.ts';
import {
  getAt,
  putAt,
  standing,
  waysOn,
  type Fields,
  type Figure,
  type Made,
  type Path,
  type StudyStore,
} from '../../page/index.ts';
import type { Graph } from '../../reactive/index.ts';
import { fieldRow, listAction, saidBelow } from './fieldTable.ts';
import { withEntry, withoutEntry } from './listEdits.ts';
import { problemBeside } from './problemBeside.ts';
import {
  bearingBy,
  boundaryAt,
  likeliest,
  missingOdds,
  withBearingBy,
  withBoundary,
  withoutStretch,
  withSplit,
  withUnknownGround,
  type BearingBy,
} from './stretchEdits.ts';

const list: Path = ['brief', 'groundStretches'];

/** Ground classes by short names; their full names stand in the list. */
const shortNames: Readonly<Record<GroundClassId, string>> = {
  rock: 'rock',
  gravel: 'gravel',
  'stiff-clay': 'stiff clay',
  'soft-clay': 'soft clay',
};

/** One end of a stretch: the same figure ends one stretch and begins the next. */
const boundary = (index: number, stretch: number): Made<Figure> => ({
  key: `brief.groundStretches.${stretch}.${index === stretch ? 'fromM' : 'toM'}`,
  has: ({ brief }) => stretch < brief.groundStretches.length,
  get: (study) => boundaryAt(study, index),
  put: (study, value) => (value === 'unknown' ? study : withBoundary(study, index, value)),
  owns: [[...list, stretch, index === stretch ? 'fromM' : 'toM']],
});

const isProved = (stretch: number): Made<'known' | 'unknown'> => ({
  key: `brief.groundStretches.${stretch}.known`,
  has: ({ brief }) => stretch < brief.groundStretches.length,
  get: ({ brief }) => (brief.groundStretches[stretch]!.known ? 'known' : 'unknown'),
  put: (study, value) => putAt(study, [...list, stretch, 'known'], value === 'known'),
  from: () => [[...list, stretch, 'known']],
});

/** Where a class bears, however it is said. */
const bears = (stretch: number, c: number): Made<Figure> => {
  const place = (study: Study): Path => {
    const key = bearingBy(study, stretch, c) === 'depth' ? 'bearingDepthM' : 'bearingLevelM';
    return [...list, stretch, 'classes', c, key];
  };
  return {
    key: `brief.groundStretches.${stretch}.classes.${c}.bears`,
    has: (study) => bearingBy(study, stretch, c) !== undefined,
    get: (study) => getAt(study, place(study)) as Figure,
    put: (study, value) => putAt(study, place(study), value),
    owns: [
      [...list, stretch, 'classes', c, 'bearingLevelM'],
      [...list, stretch, 'classes', c, 'bearingDepthM'],
    ],
    from: (study) => [place(study)],
  };
};

const bearsBy = (stretch: number, c: number): Made<BearingBy> => ({
  key: `brief.groundStretches.${stretch}.classes.${c}.bearsBy`,
  has: (study) => bearingBy(study, stretch, c) !== undefined,
  get: (study) => bearingBy(study, stretch, c)!,
  put: (study, by) => withBearingBy(study, stretch, c, by),
});

function heading(fields: Fields, index: number): HTMLElement {
  const end = (at: number, words: string): HTMLElement =>
    fields.figure(boundary(at, index), { label: `stretch ${index + 1}, ${words}`, places: 0, unit: 'm' });
  return h(
    'caption',
    {},
    end(index, 'from'),
    ' to ',
    end(index + 1, 'to'),
    ', ',
    fields.choice(isProved(index), {
      label: `stretch ${index + 1}, proved`,
      choices: [
        { value: 'unknown', words: 'not proved' },
        { value: 'known', words: 'proved' },
      ],
    }),
  );
}

function classRow(
  fields: Fields,
  store: StudyStore,
  stretch: GroundStretch,
  index: number,
  c: number,
): HTMLElement[] {
  const at = (key: string): Path => [...list, index, 'classes', c, key];
  const named = `stretch ${index + 1}, class ${c + 1}`;
  const isSure = stretch.classes.length < 2;
  return fieldRow([
    fields.choice<GroundClassId>(at('ground'), {
      label: `${named}, ground`,
      choices: groundClassIds.map((value) => ({ value, words: shortNames[value] })),
    }),
    h(
      'span',
      { class: 'bears' },
      fields.figure(bears(index, c), { label: `${named}, bears at`, places: 1, unit: 'm', step: 0.5 }),
      ' ',
      fields.choice(bearsBy(index, c), {
        label: `${named}, bears at a level or a depth`,
        choices: [
          { value: 'level', words: 'level' },
          { value: 'depth', words: 'down' },
        ],
      }),
    ),
    fields.figure(at('odds'), {
      label: `${named}, odds`,
      places: 0,
      unit: '%',
      per: 100,
      step: 5,
      min: { value: 0 },
      max: { value: 100 },
    }),
    !isSure &&
      listAction(
        'take out',
        `take out ${shortNames[stretch.classes[c]!.ground]}`,
        `take.classes.${index}.${c}`,
        () =>
          store.edit((study) => withoutEntry(study, [...list, index, 'classes'], c), {
            what: 'taking out a class',
          }),
      ),
  ]);
}

const perCent = (share: number): string =>
  fixed(share * 100, Math.abs(share * 100 - Math.round(share * 100)) < 1e-6 ? 0 : 1);

/** What the odds of a stretch add up to; where that is not 100 %, what is missing and who could take it. */
function sum(fields: Fields, store: StudyStore, index: number): HTMLElement {
  const said = h('div', { class: 'sum', role: 'status' });
  let before: GroundStretch | undefined;
  fields.follow([[...list, index, 'classes']], ({ brief }) => {
    const stretch = brief.groundStretches[index];
    if (stretch === undefined || stretch === before) return;
    before = stretch;
    const missing = missingOdds(stretch.classes);
    said.classList.toggle('refusal', missing !== 0);
    if (missing === 0) {
      said.replaceChildren();
      return;
    }
    const c = likeliest(stretch.classes);
    const likely = stretch.classes[c]!;
    const odds = Number((likely.odds + missing).toFixed(6));
    const give = (): void =>
      store.edit((study) => putAt(study, [...list, index, 'classes', c, 'odds'], odds), { what: 'odds' });
    const name = shortNames[likely.ground];
    const sum = `The odds add up to ${perCent(1 - missing)} %`;
    const rest = missing > 0 ? `${perCent(missing)} % are missing` : `${perCent(-missing)} % too many`;
    const way = missing > 0 ? `Give them to ${name}` : `Take them from ${name}`;
    said.replaceChildren(
      h('span', { class: 'why' }, `${sum}: ${rest}. The last valid study is kept.`),
      ...(odds >= 0 ? waysOn([{ words: way, take: give }]) : []),
    );
  });
  return said;
}

function stretchTable(fields: Fields, store: StudyStore, study: Study, index: number): HTMLElement {
  const { groundStretches } = study.brief;
  const stretch = groundStretches[index]!;
  const classes: Path = [...list, index, 'classes'];
  const act = (words: string, key: string, change: (study: Study) => Study): HTMLElement =>
    listAction(words, `stretch ${index + 1}: ${words}`, `${key}.${index}`, () =>
      store.edit(change, { what: words }),
    );
  const addClass = (now: Study): Study => {
    const { classes: had } = now.brief.groundStretches[index]!;
    const free = groundClassIds.find((id) => !had.some(({ ground }) => ground === id)) ?? 'rock';
    const entry = {
      ...had.at(-1)!,
      ground: free,
      odds: Math.max(0, missingOdds(had)),
    };
    return withEntry(now, classes, had.length, entry);
  };
  const table = h(
    'table',
    { class: 'brief-table stretch' },
    heading(fields, index),
    h(
      'thead',
      {},
      h(
        'tr',
        {},
        ['ground', 'bears at, m', 'odds, %', ''].map((words) => h('th', { scope: 'col' }, words)),
      ),
    ),
    h(
      'tbody',
      {},
      stretch.classes.map((_, c) => classRow(fields, store, stretch, index, c)),
    ),
  );
  const caption = table.querySelector('caption')!;
  return h(
    'div',
    { class: 'stretch-block' },
    table,
    saidBelow(caption),
    sum(fields, store, index),
    h(
      'p',
      { class: 'list-actions' },
      stretch.classes.length < 20 && act('add a class', 'add.classes', addClass),
      act('not known', 'unknown.stretch', (now) => withUnknownGround(now, index)),
      act('split', 'split.stretch', (now) => withSplit(now, index)),
      groundStretches.length > 1 && act('take out', 'take.stretch', (now) => withoutStretch(now, index)),
    ),
  );
}

/** The ground by stretch: its classes, where each bears, and their odds; one table for each stretch. */
export function oddsTable(graph: Graph, store: StudyStore): HTMLElement {
  return standing(graph, store, {
    say: problemBeside,
    shape: ({ brief }) => brief.groundStretches.map(({ classes }) => classes.length),
    build: (study, fields) =>
      h(
        'div',
        { class: 'stretches' },
        study.brief.groundStretches.map((_, index) => stretchTable(fields, store, study, index)),
      ),
  }).element;
}

/** Full names of the ground classes, for the note beside the tables. */
export const groundNames = (): string =>
  groundClassIds.map((id) => `${shortNames[id]}: ${groundLabels[id].toLowerCase()}`).join('; ');
