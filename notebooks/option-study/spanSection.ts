import { formIds, spanWindow } from '../../lib/index.ts';
import type { Guide } from '../../lib/index.ts';
import { spanChart, spanTable, type SpanChartInput } from '../charts/spanChart.ts';
import { tableBehind } from '../charts/table.ts';
import { fixed } from '../format.ts';
import { h } from '../html.ts';
import type { LineSection, Sheet } from '../page/index.ts';
import type { StudyCells } from './studyCells.ts';

/** Left end of the span axis, m. */
const LEAST_M = 4;

function chartInput(guide: Guide, openingM: number, widthPx: number): SpanChartInput {
  const rows = formIds.map((form) => {
    const { possible, usual } = spanWindow(form);
    const answer = guide.forms.find((entry) => entry.form === form)!;
    return {
      form,
      usual,
      built: [Math.max(LEAST_M, possible[0]), possible[1]] as const,
      status: answer.status,
      words: answer.because[0] ?? '',
    };
  });
  return {
    rows,
    askedM: guide.span,
    askedWords: `${fixed(guide.span, 0)} m asked: ${fixed(openingM, 0)} clear, plus the piers`,
    widthPx,
    prefix: 'spans',
  };
}

/** Section 2: every form against the span that the barred stretch asks for. */
export function spanSection(page: Sheet, cells: StudyCells): LineSection {
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
        const input = chartInput(v.spanning, v.site.mainOpening.widthM, room.widthPx);
        return [spanChart(input), tableBehind(spanTable(input))];
      },
      notes: [
        h('p', {}, 'Every form is in, possible or out, with the number that decides.'),
        h(
          'p',
          {},
          'Ranges come from rules; where sources disagree the wider range is thin and the range they agree on is thick.',
        ),
        h(
          'p',
          { class: 'source' },
          'Handbook tables and bridge records, some read, some from memory: each rule names its own.',
        ),
      ],
    }),
  ]);
}
