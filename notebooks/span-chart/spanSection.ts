import { limitM, reachPath, type FormReach } from '../../lib/index.ts';
import { spanAxis, spanChart, spanTable, type SpanChartInput, type SpanRow } from '../charts/spanChart.ts';
import { spanRows } from '../charts/spanRows.ts';
import { tableBehind } from '../charts/table.ts';
import { countWords, length } from '../format.ts';
import { h, type HtmlChild } from '../html.ts';
import { choiceInput, type LineSection, type Sheet } from '../page/index.ts';
import type { Graph } from '../reactive/index.ts';
import { orderOf, type AnswerCells, type Order } from './answerCells.ts';
import { type ReachDesk } from './reachDesk.ts';
import { reachTable } from './reachTable.ts';
import { firstTurnWords } from './words.ts';

/** The rows with the limiting spans that have been worked out. */
const withLimits = (rows: readonly SpanRow[], reaches: readonly FormReach[]): SpanRow[] =>
  rows.map((row) => {
    const reach = reaches.find(({ form }) => form === row.form);
    const spanM = reach ? limitM(reach) : null;
    if (spanM === null || !reach?.fails) return row;
    const figure = reachPath(row.form, 'spanM');
    return { ...row, limit: { spanM, words: reach.fails.check.label, figure } };
  });

/** Narrower than this, forms that are out are folded away. */
const FOLD_PX = 680;

/** The chart; on a narrow sheet the forms that are out are folded below it, and stay unfolded once they are. */
function charts(input: SpanChartInput, fold: { isOpen: boolean }): HtmlChild {
  const out = input.rows.filter(({ status }) => status === 'out');
  const reaching = input.rows.filter(({ status }) => status !== 'out');
  if (input.widthPx >= FOLD_PX || reaching.length === 0 || out.length === 0) return spanChart(input);
  return [
    spanChart({ ...input, rows: reaching }),
    h(
      'details',
      {
        class: 'folded',
        open: fold.isOpen,
        ontoggle(event) {
          fold.isOpen = (event.currentTarget as HTMLDetailsElement).open;
        },
      },
      h('summary', {}, `${countWords(out.length)} more that do not reach, with the reason`),
      h('div', {}, spanChart({ ...input, rows: out, prefix: 'spans-out' })),
    ),
  ];
}

/** Section 1: every form against the span. */
export function spanSection(page: Sheet, graph: Graph, cells: AnswerCells, desk: ReachDesk): LineSection {
  const { answer, order } = cells;
  const { reaches, limits } = desk;
  const fold = { isOpen: false };
  const listedBy = choiceInput<Order>({
    label: 'order of the forms',
    value: 'family',
    choices: [
      { value: 'family', words: 'family' },
      { value: 'fit', words: 'fit' },
    ],
    change: (value) => graph.set(order, value),
  });
  return page.section(
    1,
    'How far',
    page.live({ answer }, (v) => firstTurnWords(v.answer)),
    [
      page.cell({
        station: '1+010',
        title: 'Order',
        shows: { order },
        owns: [order],
        body: h('p', { class: 'prose' }, 'Forms are listed by ', listedBy.element, '.'),
      }),
      page.cell({
        station: '1+020',
        title: 'How far forms span',
        wide: true,
        long: true,
        shows: { answer, order, limits },
        owns: [answer],
        body: (v, room) => {
          const rows = withLimits(spanRows(v.answer, orderOf(v.answer, v.order)), v.limits);
          const input: SpanChartInput = {
            rows,
            askedM: v.answer.span,
            askedWords: `${length(v.answer.span)} m asked`,
            axisM: spanAxis(rows, v.answer.span),
            groups: v.order === 'fit' ? 'status' : 'family',
            widthPx: room.widthPx,
            prefix: 'spans',
          };
          return [charts(input, fold), tableBehind(spanTable(input))];
        },
        notes: [
          h(
            'p',
            {},
            'In: inside the usual range, and nothing speaks against it. Possible: between the ends of what is usual and of what any rule allows, or with a caution. Out: a rule stops it.',
          ),
          h(
            'p',
            {},
            'What the question leaves open (ground, levels, method, where supports may stand) is not asked here and may still put a form out.',
          ),
          h(
            'p',
            { class: 'source' },
            'Grey: US National Bridge Inventory 2024, bridges of 152 m and more built since 1980, read; dotted where fewer than 20 were built. Six forms are not told apart in that record.',
          ),
        ],
      }),
      page.cell({
        station: '1+030',
        title: 'Limiting spans of this deck',
        wide: true,
        long: true,
        shows: { reaches },
        owns: [reaches, limits],
        body: (v) => reachTable(desk, v.reaches),
        notes: [
          h(
            'p',
            {},
            'The span from which no depth carries any more, in the published band of depths or to twice as deep, and the check that ends it; what is built is shorter. Sized as this tool sizes options: on square supports, by the usual method of the form, with side spans of ordinary proportion, lanes of 3.5 m and EN 1991-2 load model 1, the depth of least cost at demo rates. In the chart above it is the red tick in the row of the form.',
          ),
          h(
            'p',
            {},
            'Width and curve of the deck count; opening and length do not. A form takes a few seconds; each figure says where it comes from.',
          ),
        ],
      }),
    ],
  );
}
