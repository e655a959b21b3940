import { builtShares, builtSpans, formIds } from '../../lib/index.ts';
import { shareColumns, shareTable, type ShareColumnsInput } from '../charts/shareColumns.ts';
import { tableBehind, tablePiece } from '../charts/table.ts';
import { fixed, length } from '../format.ts';
import { formLooks } from '../forms/formLook.ts';
import { h } from '../html.ts';
import type { LineSection, Sheet } from '../page/index.ts';
import type { AnswerCells } from './answerCells.ts';
import { builtWords } from './words.ts';

/** What stands behind the grey lines: how the record counts each form. */
const counted = tablePiece({
  caption: 'Main spans behind the grey lines of 1+020, m',
  head: ['form', 'bridges', '5 %', '50 %', '95 %', 'counted as', 'what that holds'],
  rows: formIds.flatMap((form) => {
    const built = builtSpans(form);
    return built === null
      ? []
      : [
          [
            formLooks[form].name,
            fixed(built.count, 0),
            length(built.p5),
            length(built.p50),
            length(built.p95),
            built.recordedAs,
            built.scope,
          ],
        ];
  }),
});

/** Section 4: what was built at such spans. */
export function builtSection(page: Sheet, cells: AnswerCells): LineSection {
  const { bucket } = cells;
  const finding = page.live({ bucket }, (v) => builtWords(v.bucket));
  return page.section(4, 'What has been built', finding, [
    page.cell({
      station: '4+010',
      title: 'What was built at like spans',
      shows: { bucket },
      owns: [bucket],
      wide: true,
      body: (v, room) => {
        const input: ShareColumnsInput = {
          ...builtShares,
          asked: v.bucket,
          widthPx: room.widthPx,
          prefix: 'shares',
        };
        return [shareColumns(input), tableBehind(shareTable(input))];
      },
      notes: [
        h(
          'p',
          {},
          'Per cent of all bridges whose longest span lies in the column. Hollow: mostly miscoded records, a girder code with the span of the arch or stays of the same crossing. Reinforced boxes, frames and movable bridges are left out, so columns come to less than 100.',
        ),
        h(
          'p',
          {},
          'One country, owners who build what their contractors know. It says what was chosen, not what was best.',
        ),
        h(
          'p',
          { class: 'source' },
          'US National Bridge Inventory 2024, bridges of 152 m and more built since 1980, counted from the records.',
        ),
      ],
    }),
    page.cell({
      station: '4+020',
      title: 'How the record counts',
      shows: {},
      wide: true,
      body: h(
        'div',
        { class: 'across words-last', tabindex: 0, role: 'region', 'aria-label': 'How the record counts' },
        counted,
      ),
    }),
  ]);
}
