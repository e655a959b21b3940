import { checkBars, checkTable } from '../charts/checkBars.ts';
import { tableBehind } from '../charts/table.ts';
import { ofOption } from '../drawing/asked.ts';
import { section } from '../drawing/section.ts';
import type { Piece } from '../drawing/piece.ts';
import type { Scale } from '../drawing/scale.ts';
import { mainDesign, mainDesignPath, sectionRow } from '../drawing/sectionRow.ts';
import { use } from '../format.ts';
import { h } from '../html.ts';
import { workedFigure, type LineSection, type Sheet } from '../page/index.ts';
import type { StudyCells } from './studyCells.ts';
import { sizingWords } from './sizingWords.ts';
import { firstOfEachForm } from './words.ts';

/** Section 5: the cross-section of the reference with its checks, the others beside it. */
export function sectionSection(page: Sheet, cells: StudyCells): LineSection {
  const { appraisal, reference, options } = cells;
  const finding = page.live({ reference }, (v) =>
    v.reference
      ? [
          `Option ${v.reference.number} is governed by ${v.reference.limitingCheck.label}, `,
          workedFigure(
            ofOption(v.reference, 'limitingCheck/utilisation'),
            use(v.reference.limitingCheck.utilisation),
          ),
          '.',
        ]
      : '',
  );
  return page.section(5, 'Section', finding, [
    page.cell({
      station: '5+010',
      title: 'Section of the reference',
      shows: { reference },
      body: (v, room) => {
        const design = v.reference && mainDesign(v.reference);
        if (!v.reference || !design) return h('p', { class: 'prose' }, 'No option has been worked out yet.');
        const checks = {
          form: v.reference.form,
          checks: design.checks,
          design: mainDesignPath(v.reference),
          widthPx: Math.min(350, room.widthPx),
          prefix: 'checks',
        };
        return h(
          'div',
          { class: 'beside' },
          h(
            'div',
            {},
            section({
              design,
              path: mainDesignPath(v.reference),
              widthPx: Math.min(580, room.widthPx),
              prefix: 'section',
            }),
          ),
          h('div', {}, checkBars(checks), tableBehind(checkTable(checks))),
        );
      },
      notes: [
        h(
          'p',
          { class: 'caution' },
          h('b', {}, 'Caution.'),
          ' Quick checks, not code verification. Stability while launching, lifting and cantilevering is not covered.',
        ),
      ],
    }),
    page.cell({
      station: '5+015',
      title: 'What sizing says of the reference',
      shows: { reference, options },
      body: (v) => {
        if (!v.reference) return h('p', { class: 'prose' }, 'No option has been worked out yet.');
        const { number } = v.reference;
        const kept = v.options.kept.find((one) => one.number === number);
        return sizingWords(v.reference, (kept?.depthM ?? null) !== null);
      },
    }),
    page.cell({
      station: '5+020',
      title: 'Sections side by side',
      shows: { appraisal, reference },
      wide: true,
      body: (v, room) => {
        const at = (scale: Scale): Piece =>
          sectionRow({
            options: firstOfEachForm(v.appraisal.options),
            reference: v.reference?.number ?? null,
            widthPx: room.widthPx,
            scale,
            prefix: 'sections',
          });
        const whole = at(250);
        // What is taller than a sheet of paper stands on it at the next scale.
        return room.paperPx !== null && Number(whole.attrs['height']) > room.paperPx ? at(500) : whole;
      },
      notes: [h('p', {}, 'The cheapest option of each form, on one road level and one scale.')],
    }),
  ]);
}
