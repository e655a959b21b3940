import {
  readDraft,
  readStudy,
  sentence,
  survey,
  writeStudy,
  type Site,
  type Study,
} from '../../lib/index.ts';
import { scaleBar } from '../drawing/scaleBar.ts';
import { largestScale } from '../drawing/scale.ts';
import { sheet as drawingSheet } from '../drawing/sheet.ts';
import { exampleNames, type ExampleName } from '../exampleNames.ts';
import { workedExample } from '../examples.ts';
import { capitalised, countWords, fixed, listed } from '../format.ts';
import { h, type HtmlChild } from '../html.ts';
import {
  deviceCupboard,
  openFile,
  pagesFrom,
  pushed,
  sheet,
  studyShelf,
  type StoredStudy,
  type StudyCupboard,
} from '../page/index.ts';
import { graph as newGraph } from '../reactive/index.ts';
import { copyTitle, keptStudies, type KeptStudy } from './kept.ts';
import { keptGaps } from './keptGaps.ts';
import { newSentence } from './newSentence.ts';
import { smallCrossing } from './smallCrossing.ts';
import { studyHref, studyList } from './studyList.ts';

/** A worked example on the shelf: what has to be crossed, drawn at the scale of the examples, smaller where it is long. */
function exampleCell(name: ExampleName, widthPx: number): HTMLElement {
  const { title, brief } = workedExample(name);
  const site = survey(brief);
  const scale = largestScale(site.lengthM, Math.max(widthPx, 620) - 40, 2500);
  return h(
    'div',
    { class: 'example' },
    h('p', {}, h('a', { class: 'title', href: `./option-study.html?example=${name}` }, title)),
    h('p', { class: 'small' }, exampleWords(site)),
    pushed(`What ${title} has to cross`, smallCrossing(site, scale, `example-${name}`)),
    drawingSheet(360, 44, `Scale bar, 1 to ${String(scale)}`, [
      scaleBar(scale, 14, 18, { widthPx: 200, rightPx: 340 }),
    ]),
  );
}

/** 'A railway and a river in 230 m; no pier may stand in 60 m of it.' */
function exampleWords({ zones, lengthM, mainOpening }: Site): string {
  const kinds = listed([...new Set(zones.map(({ kind }) => `a ${kind}`))]);
  const barred = mainOpening === null ? '' : `; no pier may stand in ${fixed(mainOpening.widthM, 0)} m of it`;
  return `${capitalised(kinds)} in ${fixed(lengthM, 0)} m${barred}.`;
}

const answerWords = (kept: readonly KeptStudy[]): string => {
  const count = countWords(kept.length);
  const lie = kept.length === 0 ? 'yet' : 'and nowhere else';
  return `${capitalised(count)} ${kept.length < 2 ? 'study lies' : 'studies lie'} on this device ${lie}. For a new crossing, fill the sentence below; worked examples show what comes out: from a crossing and a budget to ranked forms, spans, depths, quantities and cost with honest ranges, and the reasons.`;
};

function nextWords(kept: readonly KeptStudy[]): HtmlChild {
  const newest = kept.find(({ read }) => read.ok);
  return newest === undefined
    ? [
        'fill gap 4 of the sentence, the length of the crossing, or ',
        h('a', { href: './option-study.html' }, 'open a worked example'),
      ]
    : [
        'open ',
        h('a', { href: studyHref(newest.stored.id) }, newest.stored.title),
        ', the last that was changed',
      ];
}

async function start(): Promise<void> {
  const cupboard: StudyCupboard | null = await deviceCupboard().catch(() => null);
  const graph = newGraph();
  const page = sheet(graph);
  /** Counts what was done to the studies, so that they are read again. */
  const turn = graph.input('turn', 0);
  const removed = graph.input<StoredStudy | null>('removed', null);
  const kept = graph.slow(
    'studies',
    { turn },
    (): Promise<readonly KeptStudy[]> => (cupboard === null ? Promise.resolve([]) : keptStudies(cupboard)),
    { policy: 'latest' },
  );
  let turns = 0;
  const after = async (work: Promise<void>, now: StoredStudy | null): Promise<void> => {
    await work;
    turns += 1;
    graph.batch(() => {
      graph.set(removed, now);
      graph.set(turn, turns);
    });
  };

  const said = h('span', { class: 'state', role: 'status' });
  if (cupboard === null)
    said.textContent = 'This browser keeps no studies; open and save them as files in the option study.';
  const shelf = cupboard && studyShelf(cupboard, { readStudy, readDraft, writeStudy }, () => new Date());
  /** Puts a study on the device under an id of its own; says why where it cannot. */
  const keep = async (study: Study, refusedWith: string): Promise<string | null> => {
    const id = crypto.randomUUID();
    const saved = await shelf!.save(id, { study, draft: null }, 0);
    if (saved.ok) return id;
    said.textContent = `${refusedWith} ${saved.problems.map(sentence).join(' ')}`;
    return null;
  };
  const keepAndOpen = async (study: Study, refusedWith: string, kept?: () => void): Promise<void> => {
    const id = await keep(study, refusedWith);
    if (id === null) return;
    kept?.();
    location.assign(studyHref(id));
  };
  const sentenceKept = keptGaps(() => localStorage);
  const open = async (): Promise<void> => {
    const text = await openFile();
    if (text === null || cupboard === null) return;
    const read = readStudy(text);
    if (read.ok) await keepAndOpen(read.value, 'Not opened.');
    else said.textContent = `Not opened. ${read.problems.map(sentence).join(' ')}`;
  };
  const titles = (): string[] => {
    const state = graph.state(kept);
    return 'value' in state ? state.value.map(({ stored }) => stored.title) : [];
  };
  const duplicate = async ({ text }: StoredStudy): Promise<void> => {
    const read = readStudy(text);
    if (!read.ok) return;
    await keep({ ...read.value, title: copyTitle(read.value.title, titles()) }, 'Not duplicated.');
  };

  page.mount(document.body, {
    bar: {
      pages: pagesFrom('shelf'),
      tools: [
        said,
        h(
          'button',
          { type: 'button', class: 'action', disabled: cupboard === null, onclick: () => void open() },
          'Open a file',
        ),
        h('button', { type: 'button', class: 'action', onclick: () => print() }, 'Print'),
      ],
    },
    head: {
      title: 'Shelf',
      answer: page.live({ kept }, (v) => answerWords(v.kept)),
      next: page.live({ kept }, (v) => nextWords(v.kept)),
    },
    hint: false,
    sections: [
      page.section(
        1,
        'A new study',
        'One gap is enough for a first answer; unknown is allowed in the others.',
        [
          page.cell({
            station: '1+010',
            title: 'A new study',
            shows: {},
            body: newSentence({
              titles,
              begin: shelf && ((study) => void keepAndOpen(study, 'Not begun.', sentenceKept.clear)),
              kept: sentenceKept,
            }),
            notes: [
              h('p', {}, 'Type, use the arrow keys, or leave a gap: a question mark makes it unknown again.'),
              h(
                'p',
                {},
                'What a gap leaves open stays unknown, or takes a usual value that is said below and in the study. All of it can be changed there.',
              ),
              h('p', { class: 'source' }, 'Usual values: common practice, no source.'),
            ],
          }),
        ],
      ),
      page.section(2, 'Studies', 'Newest first, on this device only; nothing leaves it.', [
        page.cell({
          station: '2+010',
          title: 'Studies on this device',
          shows: { kept, removed },
          owns: [kept, removed],
          wide: true,
          long: true,
          body: (v, room) =>
            studyList({
              kept: v.kept,
              removed: v.removed,
              now: new Date(),
              widthPx: room.widthPx,
              duplicate: (one) => void after(duplicate(one), null),
              remove: (one) => void after(cupboard!.remove(one.id), one),
              putBack: (one) =>
                void after(
                  cupboard!.change(one.id, () => one),
                  null,
                ),
            }),
          notes: [
            h(
              'p',
              {},
              'Saved as you type. A browser can lose what it keeps: save what matters as a file; the file holds the whole study and opens on any device.',
            ),
          ],
        }),
      ]),
      page.section(
        3,
        'Worked examples',
        'Complete and invented; the first change makes one a study of your own.',
        exampleNames.map((name, at) =>
          page.cell({
            station: `3+0${at + 1}0`,
            title: workedExample(name).title,
            shows: {},
            body: (_, room) => exampleCell(name, room.widthPx),
            notes: at === 0 ? [h('p', {}, workedExample(name).notice)] : [],
          }),
        ),
      ),
      page.section(4, 'What it is for, and what it is not', null, [
        page.cell({
          station: '4+010',
          title: 'What it is for',
          shows: {},
          body: [
            h(
              'p',
              {},
              'For the days in which a crossing has a budget and no ground investigation: which structural form, at which spans and depth, deserves to be taken forward; what it needs in concrete, steel and tendons; what it costs and how sure that is; why the others were dropped, and what would change the answer.',
            ),
            h(
              'dl',
              { class: 'remarks' },
              h('dt', {}, h('a', { href: './option-study.html' }, 'Option study')),
              h(
                'dd',
                {},
                'a crossing from its brief to a ranking under the budget, every figure with its rule and source.',
              ),
              h('dt', {}, h('a', { href: './span-chart.html' }, 'Span chart')),
              h(
                'dd',
                {},
                'one opening, no study: which forms reach it, how deep they are, where sources disagree, what has been built.',
              ),
            ),
            h(
              'p',
              {},
              'It works without a network and without an account. Unknown is an answer wherever it is true, and makes the result wider.',
            ),
          ],
        }),
        page.cell({
          station: '4+020',
          title: 'Cautions',
          shows: {},
          body: h(
            'p',
            { class: 'caution prose' },
            h('b', {}, 'Option stage only; not a design and not for construction.'),
            ' Sizes are quick checks, not code verification. Temporary works and stability while launching, lifting and cantilevering need their own design: box girders have failed in erection. Ground, flood, scour, vessel impact and seismic matters need specialists. Clearances and loads are presets to be confirmed with the authority. A licensed engineer and the local codes decide. All rates shipped with the tool are invented.',
          ),
        }),
      ]),
    ],
  });
}

void start();
