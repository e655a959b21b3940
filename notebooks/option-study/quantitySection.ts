import { publishedBands } from '../../lib/index.ts';
import { quantityMarks, quantityTable } from '../charts/quantityMarks.ts';
import { tableBehind } from '../charts/table.ts';
import { h } from '../html.ts';
import type { LineSection, Sheet } from '../page/index.ts';
import { spansOf } from '../drawing/alongOption.ts';
import type { StudyCells } from './studyCells.ts';

/** Section 6: quantities of the superstructure per m2 of deck, published bands behind. */
export function quantitySection(page: Sheet, cells: StudyCells): LineSection {
  const { appraisal, reference } = cells;
  return page.section(
    6,
    'Quantities',
    'Per m² of deck, superstructure. Hatched behind a mark: what has been published for that form at that span.',
    [
      page.cell({
        station: '6+010',
        title: 'Quantities',
        shows: { appraisal, reference },
        body: (v, room) => {
          const { options } = v.appraisal;
          const input = {
            options,
            reference: v.reference?.number ?? null,
            perM2: Object.fromEntries(options.map((option) => [option.number, option.perM2])),
            published: Object.fromEntries(
              // A band speaks of one form from end to end; options with approaches of another form have none.
              options
                .filter((option) => option.units.length === 1)
                .map((option) => [option.number, publishedBands(option.form, spansOf(option))]),
            ),
            widthPx: room.widthPx,
            prefix: 'quantities',
          };
          return [quantityMarks(input), tableBehind(quantityTable(input))];
        },
        notes: [
          h(
            'p',
            {},
            'Bands are recalled laws of published practice, drawn 15 % wider; they check the figures and never set them.',
          ),
          h('p', {}, 'No band stands behind options whose approaches are of another form.'),
        ],
      }),
    ],
  );
}
