import { formIds, PIER_HALF_WIDTH_M } from '../../lib/index.ts';
import type { Guide, Site } from '../../lib/index.ts';
import { spanChart, spanTable, type SpanChartInput } from '../charts/spanChart.ts';
import { spanRows } from '../charts/spanRows.ts';
import { tableBehind } from '../charts/table.ts';
import { fixed } from '../format.ts';
import { h } from '../html.ts';
import type { LineSection, Sheet, StudyStore } from '../page/index.ts';
import { presetQuestion, writeQuestion, type Question } from '../span-chart/question.ts';
import { askedWords, formsNotAsked, formsTable, listWords, unsizedWords } from './formsTable.ts';
import type { StudyCells } from './studyCells.ts';

const chartInput = (guide: Guide, openingM: number, widthPx: number): SpanChartInput => ({
  rows: spanRows(guide, formIds, true),
  askedFigure: 'site/mainSpanM',
  askedM: guide.span,
  askedWords: `${fixed(guide.span, 0)} m asked: ${fixed(openingM, 0)} clear, plus the piers`,
  widthPx,
  prefix: 'spans',
});

/** What the span chart is asked for the widest opening and the deck of a site; figures it cannot take are left to it. */
function questionOf({ mainOpening, deck, lengthM, planRadiusM }: Site): Question {
  return {
    openingM: mainOpening?.widthM ?? presetQuestion.openingM,
    pierM: 2 * PIER_HALF_WIDTH_M,
    widthM: deck.widthM,
    lengthM,
    radiusM: planRadiusM === null || planRadiusM === Infinity ? 'straight' : planRadiusM,
  };
}

/** The heading over the chart on its printed sheet, the notes under it, and the forms asked for, which stand there too, px. */
const ROUND_CHART_PX = 275;

/** Section 2: every form against the span that the barred stretch asks for. */
export function spanSection(page: Sheet, store: StudyStore, cells: StudyCells): LineSection {
  const { spanning, site } = cells;
  const finding = page.live({ spanning }, (v) => {
    if (!v.spanning) return 'Nothing is barred: the span is free.';
    const count = (status: string): number => v.spanning!.forms.filter((f) => f.status === status).length;
    return `${fixed(v.spanning.span, 0)} m asks: ${count('in')} forms are in, ${count('possible')} possible, ${count('out')} out.`;
  });
  return page.section(2, 'What can span it', finding, [
    page.cell({
      station: '2+010',
      title: 'What can span it',
      wide: true,
      shows: { spanning, site },
      owns: [spanning],
      body: (v, room) => {
        if (!v.spanning || !v.site.mainOpening) {
          return h(
            'p',
            { class: 'prose' },
            'No stretch of this crossing bars supports, so no span is asked for.',
          );
        }
        const input = {
          ...chartInput(v.spanning, v.site.mainOpening.widthM, room.widthPx),
          ...(room.paperPx !== null && { heightPx: room.paperPx - ROUND_CHART_PX }),
        };
        return [spanChart(input), tableBehind(spanTable(input))];
      },
      notes: ({ site: of }) => [
        h(
          'p',
          {},
          'Every form is in, possible or out, with the number that decides, and what it takes to stand otherwise.',
        ),
        h(
          'p',
          {},
          'Ranges come from rules; where sources disagree the wider range is thin and the range they agree on is thick. Where they disagree, and by how much, is shown on the page ',
          h('a', { href: `./span-chart.html${writeQuestion(questionOf(of))}` }, 'Span chart'),
          ', which is asked for this opening and this deck, and there works out how far each form carries it.',
        ),
        h(
          'p',
          { class: 'source' },
          'Handbook tables, some read, some from memory: each rule names its own. Grey: US National Bridge Inventory 2024, bridges of 152 m and more built since 1980, read; dotted where fewer than 20 were built.',
        ),
      ],
    }),
    page.cell({
      station: '2+020',
      title: 'Forms asked for',
      shows: { options: store.slices.options },
      body: (_, room) => {
        const study = store.valid();
        return [
          h('p', { class: 'prose' }, askedWords(study)),
          // On paper nothing is asked for or left out: a sentence leaves room for it under the chart.
          room.paperPx === null
            ? formsTable(study, store)
            : formsNotAsked(study).length > 0 && h('p', { class: 'small' }, listWords(study)),
          h('p', { class: 'small' }, unsizedWords()),
        ];
      },
      notes: [
        h(
          'p',
          {},
          'What is asked for is arranged, sized and priced, unless a rule puts it out. What is not asked for is listed among what was dropped.',
        ),
      ],
    }),
  ]);
}
