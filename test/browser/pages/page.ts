import example from '../../../data/examples/low-ferry.json' with { type: 'json' };
import { parseStudy, readDraft, readStudy, sentence, writeStudy } from '../../../lib/index.ts';
import type { Study } from '../../../lib/index.ts';
import { el } from '../../../notebooks/drawing/piece.ts';
import { sheet as drawing } from '../../../notebooks/drawing/sheet.ts';
import { fixed } from '../../../notebooks/format.ts';
import { h } from '../../../notebooks/html.ts';
import {
  choiceInput,
  deviceCupboard,
  fieldsOf,
  figureInput,
  putAt,
  sheet,
  standing,
  studyShelf,
  studyStore,
  undoKeys,
} from '../../../notebooks/page/index.ts';
import type { Figure, Path } from '../../../notebooks/page/index.ts';
import { graph } from '../../../notebooks/reactive/index.ts';

/** A notebook of a few cells, so that the page can be tried without the pipeline behind it. */
const read = parseStudy(example);
if (!read.ok) throw new Error(sentence(read.problems[0]!));

const g = graph();
const store = studyStore(g, read.value, (study: Study) => {
  const checked = parseStudy(study);
  return checked.ok ? [] : checked.problems;
});
const { brief } = store.slices;
const fields = fieldsOf(g, store, sentence);

/** How many waters there are decides how many sentences there are. */
const waters = standing(g, store, {
  say: sentence,
  shape: (draft) => draft.brief.waters.length,
  build: (draft, own) =>
    draft.brief.waters.map((_, i) =>
      h(
        'p',
        {},
        own.words(['brief', 'waters', i, 'name'], { label: `water ${i + 1}` }),
        ' stands at ',
        own.figure(['brief', 'waters', i, 'levelM'], { label: `level ${i + 1}`, unit: 'm', places: 2 }),
        ' m.',
      ),
    ),
});

const length = g.cell('length', { brief }, ({ brief: { crossing } }) => crossing.endM - crossing.startM);
const depth = g.input('depth', 2.3);
const spans = g.cell('spans', { length }, ({ length: total }) => [0.3, 0.4, 0.3].map((part) => part * total));
const told: (readonly [string, Figure])[] = [];
let answer: ((value: number) => void) | undefined;
let fail: ((error: Error) => void) | undefined;
const steel = g.slow(
  'steel',
  { spans, depth },
  ({ spans: all }, { report }) =>
    new Promise<number>((resolve, reject) => {
      report({ done: 3, of: 12, what: 'plates' });
      answer = () => resolve(Math.max(...all) * 2.4);
      fail = reject;
    }),
  { policy: 'latest' },
);
const cost = g.cell('cost', { steel, length }, ({ steel: kg, length: total }) => (kg * total) / 5000);
const rank = g.cell('rank', { cost }, ({ cost: price }) => (price > 10 ? 'over' : 'within'));

const page = sheet(g, {
  explain: (error) => ({
    words: `${(error as Error).message}.`,
    ways: [{ words: 'Make it 2.60 deep', take: () => g.set(depth, 2.6) }],
  }),
});
const { live, cell, section } = page;

const counts = { crossing: 0, cost: 0 };

page.mount(document.body, {
  bar: {
    pages: [
      { words: 'Spanledger', href: '#', here: true },
      { words: 'Shelf', href: '#' },
      { words: 'Span chart', href: '#' },
    ],
    tools: [
      h('span', { class: 'state' }, 'saved 14:02 on this device'),
      live({ history: store.history }, ({ history }) =>
        h(
          'button',
          { type: 'button', class: 'action', disabled: history.undo === null, click: store.undo },
          history.undo === null ? 'Undo' : `Undo ${history.undo}`,
        ),
      ),
    ],
  },
  head: {
    title: live({ head: store.slices.head }, ({ head }) => head.title),
    answer: live(
      { spans, cost },
      ({ spans: all, cost: price }) =>
        `Three spans of ${all.map((span) => fixed(span, 0)).join(' + ')} m come out at ${fixed(price, 1)} M€.`,
    ),
    next: ['ask for one borehole at each river pier. See ', h('a', { href: '#2+020' }, '2+020'), '.'],
    block: [
      ['Study', 'WEN 07'],
      ['Issue', 'B, draft'],
      ['Stage', 'option study; not for construction'],
    ],
  },
  sections: [
    section(
      1,
      'Brief',
      live({ length }, ({ length: total }) => `A river and a railway in ${fixed(total, 0)} m.`),
      [
        cell({
          station: '1+010',
          title: 'What is asked for',
          shows: { brief },
          body: h(
            'p',
            {},
            'A road has to cross the River Wend from chainage ',
            fields.figure(['brief', 'crossing', 'startM'], { label: 'start', unit: 'm', places: 0 }),
            ' to ',
            fields.figure(['brief', 'crossing', 'endM'], { label: 'end', unit: 'm', places: 0 }),
            ', on a line ',
            fields.figure(['brief', 'crossing', 'skewDeg'], {
              label: 'skew',
              unit: '°',
              places: 0,
              unknown: 'unknown',
              min: { value: 0 },
              max: { value: 60, because: 'beyond it nothing here holds' },
            }),
            '° off square to the river, for loads of ',
            fields.choice(['brief', 'loading'], {
              label: 'load standard',
              choices: [
                { value: 'lm1', words: 'EN 1991-2, LM1' },
                { value: 'hl93', words: 'AASHTO, HL-93' },
              ],
            }),
            '. The road may climb at ',
            fields.figure(['brief', 'road', 'maxGradient'], {
              label: 'steepest gradient',
              unit: '%',
              places: 1,
              per: 100,
              isPreset: () => true,
            }),
            ' % and the surfacing is ',
            fields.figure(['brief', 'surfacingM'], {
              label: 'surfacing',
              unit: 'mm',
              places: 0,
              per: 1000,
              step: 10,
            }),
            ' mm thick; whatever else the site asks for stands further down and is drawn on the crossing.',
          ),
          notes: [
            h('p', {}, 'The crossing is called ', fields.words(['title'], { label: 'title', most: 60 }), '.'),
            waters.element,
            h('p', {}, 'Plain underline: typed here. Dotted: preset, to be confirmed. Dashed: unknown.'),
            h('p', { class: 'caution' }, h('b', {}, 'Caution.'), ' 5.90 m is a preset.'),
            h('p', { class: 'source' }, 'Flood: hydraulic note, table 3, read.'),
          ],
        }),
        cell({
          station: '1+020',
          title: 'Crossing',
          shows: { brief, spans },
          body: ({ spans: all }, { widthPx }) => {
            counts.crossing += 1;
            const perM = (widthPx - 20) / all.reduce((sum, span) => sum + span, 0);
            const at = all.map((_, i) => 10 + all.slice(0, i).reduce((sum, span) => sum + span, 0) * perM);
            return drawing(widthPx, 120, 'Spans', [
              el('path', { d: `M10,40H${widthPx - 10}`, stroke: '#151A1E', 'stroke-width': 1.9 }),
              at.map((x, i) => [
                el('path', { d: `M${x},40v60`, stroke: '#151A1E', 'stroke-width': 0.95 }),
                el('text', { x: x + ((all[i] ?? 0) * perM) / 2, y: 30 }, fixed(all[i] ?? 0, 1)),
              ]),
            ]);
          },
          notes: h('p', {}, 'Drawn with the reference option.'),
        }),
      ],
    ),
    section(2, 'Section', 'One depth for all spans.', [
      cell({
        station: '2+010',
        title: 'Depth',
        shows: { depth, spans },
        // Drawn anew with every value: the figure under the hand has to stay.
        body: ({ depth: deep, spans: all }) =>
          h(
            'p',
            {},
            'Depth at midspan ',
            figureInput({
              label: 'depth at midspan',
              value: deep,
              places: 2,
              unit: 'm',
              min: { value: 1.75, because: 'the flange at the pier is at 100 % there' },
              max: { value: 6 },
              marks: () => [{ value: 3.1, words: 'option 1 drops out' }],
              step: 0.1,
              input: (value) => {
                told.push(['input', value]);
                if (value !== 'unknown') g.set(depth, value);
              },
              change: (value) => told.push(['change', value]),
            }).element,
            ` m, one in ${fixed(Math.max(...all) / deep, 0)} of the longest span; webs of `,
            choiceInput({
              label: 'steel',
              value: deep > 3 ? 's460' : 's355',
              choices: [
                { value: 's355', words: 'S355' },
                { value: 's460', words: 'S460' },
              ],
              change: (value) => told.push([value, 0]),
            }).element,
            '.',
          ),
      }),
      cell({
        station: '2+020',
        title: 'Steel',
        shows: { steel },
        body: ({ steel: kg }) => h('p', {}, h('span', { class: 'worked' }, fixed(kg, 0)), ' kg/m²'),
        notes: h('p', {}, 'Median of the plates.'),
      }),
    ]),
    section(
      3,
      'Cost and ranking',
      live({ rank }, ({ rank: where }) => `It is ${where} the budget.`),
      [
        cell({
          station: '3+010',
          title: 'Cost',
          shows: { cost },
          wide: true,
          body: ({ cost: price }, { widthPx }) => {
            counts.cost += 1;
            return drawing(widthPx, 460, 'Cost', [
              el('path', { d: `M0,20H${price * 60}`, stroke: '#376DC6', 'stroke-width': 9 }),
              el('text', { x: price * 60 + 8, y: 24 }, `${fixed(price, 1)} M€`),
            ]);
          },
        }),
        cell({
          station: '3+020',
          title: 'Ranking',
          shows: { rank },
          body: ({ rank: where }) => h('p', {}, `The first option is ${where} the budget.`),
        }),
      ],
    ),
    ...[
      'Programme, carbon, upkeep',
      'Trade-offs',
      'Ranking under the budget',
      'What would change the answer',
      'Decision',
    ].map((title, i) =>
      section(4 + i, title, null, [
        cell({
          station: `${4 + i}+010`,
          title,
          shows: { rank, brief },
          body: () => h('p', {}, 'One thing after the other, as far as it goes.'),
        }),
        cell({
          station: `${4 + i}+020`,
          title,
          shows: { cost },
          body: ({ cost: price }) => h('p', {}, `Differences from ${fixed(price, 1)} M€.`),
        }),
      ]),
    ),
  ],
});

undoKeys(store);
const setField = (path: Path, value: unknown): void => store.edit((study) => putAt(study, path, value));

/** What the test asks of the page. */
const trial = {
  counts,
  told,
  setDepth: (metres: number): void => g.set(depth, metres),
  addWater: (): void =>
    store.edit((study) => {
      const [first] = study.brief.waters;
      return putAt(study, ['brief', 'waters'], [...study.brief.waters, { ...first!, name: 'Mill stream' }]);
    }),
  undo: store.undo,
  setEnd: (metres: number): void => setField(['brief', 'crossing', 'endM'], metres),
  /** Ends the slow run under way well, once it has begun. */
  answer: async (): Promise<void> => {
    await Promise.resolve();
    answer?.(0);
    await g.settled();
  },
  /** Ends the slow run under way with a failure. */
  fail: async (words: string): Promise<void> => {
    await Promise.resolve();
    fail?.(new Error(words));
    await g.settled();
  },
  valid: (): Study => store.valid(),
  draft: (): Study => {
    const state = g.state(store.draft);
    if (state.state !== 'ready') throw new Error('the draft is always there');
    return state.value;
  },
  /** Two pages that keep a study on the device: what each is told. */
  device: async () => {
    const name = `trial-${crypto.randomUUID()}`;
    const format = { readStudy, readDraft, writeStudy };
    const one = studyShelf(await deviceCupboard(name), format, () => new Date());
    const other = studyShelf(await deviceCupboard(name), format, () => new Date());
    const study = store.valid();
    const first = await one.save('a', { study: { ...study, title: 'First' }, draft: null }, 0);
    const second = await other.save('a', { study: { ...study, title: 'Second' }, draft: null }, 1);
    const late = await one.save('a', { study: { ...study, title: 'Late' }, draft: null }, 1);
    const loaded = await one.load('a');
    return {
      saved: [first, second].map((result) => (result.ok ? result.value.revision : null)),
      title: loaded.ok ? loaded.value.study.title : null,
      refused: late.ok ? [] : late.problems.map(({ code }) => code),
      listed: (await other.list()).map(({ title }) => title),
    };
  },
};
export type Trial = typeof trial;

Object.assign(window, { trial });
