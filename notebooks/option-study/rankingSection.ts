import { fact, printed, type AppraisedOption, type Ruling } from '../../lib/index.ts';
import { ranking } from '../charts/ranking.ts';
import { ofOption } from '../drawing/asked.ts';
import { optionTitle } from '../drawing/optionWords.ts';
import { listed } from '../format.ts';
import { formLooks } from '../forms/formLook.ts';
import { h, type HtmlChild } from '../html.ts';
import { pushed, workedFigure, type LineSection, type Sheet, type StudyStore } from '../page/index.ts';
import type { Graph } from '../reactive/index.ts';
import { priorityTable } from './priorities/priorityTable.ts';
import type { StudyCells } from './studyCells.ts';
import { budgetOf, findingOf, toComeWords } from './words.ts';

const effects: readonly Ruling['effect'][] = ['out', 'caution', 'to confirm', 'in favour'];

const flipWords = (option: AppraisedOption, { flip, rule }: Ruling): HtmlChild => {
  if (!flip) return '';
  const turning = fact(flip.fact);
  const end = (which: 'from' | 'to'): HTMLElement =>
    workedFigure(ofOption(option, `rulings/${rule}/flip/${which}`), printed(turning, flip[which]));
  return [` Turns at ${turning.label} `, end('to'), '; now ', end('from'), '.'];
};

/** What the rules say of one option, worst first. */
function rulingsOf(option: AppraisedOption): HTMLElement {
  const sorted = [...option.rulings].sort((a, b) => effects.indexOf(a.effect) - effects.indexOf(b.effect));
  return h(
    'details',
    { class: 'behind' },
    h(
      'summary',
      {},
      `Option ${option.number}, ${optionTitle(option)}: ${option.status}, ${option.rulings.filter((r) => r.effect === 'caution').length} to be cautious of, ${option.rulings.filter((r) => r.effect === 'to confirm').length} to confirm`,
    ),
    h(
      'table',
      {},
      h(
        'tbody',
        {},
        sorted.map((ruling) =>
          h(
            'tr',
            {},
            h(
              'th',
              {
                scope: 'row',
                class: ruling.effect === 'out' || ruling.effect === 'caution' ? 'limit' : null,
              },
              ruling.effect,
            ),
            h('td', { class: 'text' }, `${ruling.because.join('; ')}.`, flipWords(option, ruling)),
            h('td', { class: 'text source' }, ruling.source),
          ),
        ),
      ),
    ),
  );
}

/** What puts options out or asks for caution, for paper: each reason once, with the options it is said of, those that put out first. */
function warningsTable(options: readonly AppraisedOption[]): HTMLElement {
  const said = new Map<string, { readonly ruling: Ruling; readonly numbers: number[] }>();
  for (const effect of ['out', 'caution'] as const) {
    for (const option of options) {
      for (const ruling of option.rulings) {
        if (ruling.effect !== effect) continue;
        const words = `${ruling.because.join('; ')}.`;
        const numbers = said.get(words)?.numbers ?? [];
        said.set(words, { ruling, numbers: [...numbers, option.number] });
      }
    }
  }
  const head = ['', 'options', 'because', 'source'].map((word) => h('th', { scope: 'col' }, word));
  return h(
    'table',
    { class: 'warnings' },
    h('caption', {}, 'What puts options out, and what asks for caution'),
    h('thead', {}, h('tr', {}, head)),
    h(
      'tbody',
      {},
      Array.from(said, ([words, { ruling, numbers }]) =>
        h(
          'tr',
          {},
          h('th', { scope: 'row', class: 'limit' }, ruling.effect),
          h('td', {}, listed(numbers.toSorted((a, b) => a - b).map(String))),
          h('td', { class: 'text' }, words),
          h('td', { class: 'text source' }, ruling.source),
        ),
      ),
    ),
  );
}

/** Section 10: order under the budget, and the rulings behind it. */
export function rankingSection(page: Sheet, graph: Graph, store: StudyStore, cells: StudyCells): LineSection {
  const { appraisal, reference, brief } = cells;
  const finding = page.live({ appraisal }, (v) =>
    findingOf(v.appraisal, v.appraisal.standing.because[0] ?? ''),
  );
  return page.section(10, 'Ranking under the budget', finding, [
    page.cell({
      station: '10+010',
      title: 'Ranking',
      shows: { appraisal, reference, brief },
      wide: true,
      body: (v) =>
        pushed(
          'Ranking',
          ranking({
            options: v.appraisal.options,
            standing: v.appraisal.standing,
            budget: budgetOf(v.brief),
            currency: v.appraisal.currency,
            reference: v.reference?.number ?? null,
          }),
        ),
      notes: (v) => [
        v.appraisal.toCome.length > 0 && h('p', {}, toComeWords(v.appraisal)),
        v.appraisal.standing.because.slice(1).map((words) => h('p', {}, words)),
        v.appraisal.dropped.map(({ form, option, because }) => {
          const of = option === undefined ? '' : `Option ${String(option)}, `;
          return h('p', {}, `${of}${formLooks[form].short} dropped: ${because.join('; ')}.`);
        }),
      ],
    }),
    page.cell({
      station: '10+015',
      title: 'Priorities',
      shows: { priorities: store.slices.priorities },
      body: [
        h(
          'p',
          {},
          'Stated priorities. The ranking above is by cost under the rules and does not use them; they are kept with the study for whoever decides.',
        ),
        priorityTable(graph, store),
      ],
      notes: [
        h(
          'p',
          {},
          'Weights are to each other as they stand: 2 counts twice 1. ',
          h('span', { class: 'on-screen' }, 'An emptied name takes its priority out.'),
        ),
      ],
    }),
    page.cell({
      station: '10+020',
      title: 'Rulings',
      shows: { appraisal },
      long: true,
      body: (v, room) =>
        room.paperPx === null ? v.appraisal.options.map(rulingsOf) : warningsTable(v.appraisal.options),
      notes: (_, room) =>
        room.paperPx === null &&
        h(
          'p',
          {},
          'Every ruling names its rule, the numbers, the source, and how far the nearest number is from turning it.',
        ),
    }),
    page.cell({
      station: '10+030',
      title: 'Cautions',
      shows: {},
      body: h(
        'div',
        { class: 'prose' },
        h(
          'p',
          { class: 'caution' },
          h('b', {}, 'Option stage only; not a design and not for construction.'),
          ' Sizes are quick checks, not code verification. Temporary works, and stability while launching, lifting and cantilevering, need their own design: box girders have failed in erection. Ground, flood, scour, vessel impact and seismic matters need specialists. Clearances and loads are presets to be confirmed with the authority. A licensed engineer and the local codes decide.',
        ),
      ),
    }),
  ]);
}
