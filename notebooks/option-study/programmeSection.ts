import { ofOption, type Asked } from '../drawing/asked.ts';
import { rangePanels, rangeTable } from '../charts/rangePanels.ts';
import { tableBehind } from '../charts/table.ts';
import { tradeOffs, tradeOffTable, type Measure } from '../charts/tradeOffs.ts';
import type { Appraisal, AppraisedOption, Spread } from '../../lib/index.ts';
import { fixed } from '../format.ts';
import { h } from '../html.ts';
import { workedFigure, type LineSection, type Sheet } from '../page/index.ts';
import { mainDesign, mainDesignPath } from '../drawing/sectionRow.ts';
import type { StudyCells } from './studyCells.ts';
import { budgetOf, findingOf } from './words.ts';

const certain = (value: number): Spread => ({ p10: value, p50: value, p90: value });

function measure(
  appraisal: Appraisal,
  name: string,
  places: number,
  valueOf: (option: AppraisedOption) => Spread | null,
  figures: (option: AppraisedOption) => Asked,
): Measure {
  const values = appraisal.options.flatMap((option) => {
    const value = valueOf(option);
    return value ? [[option.number, value] as const] : [];
  });
  return { name, places, figures, values: Object.fromEntries(values) };
}

const months = (appraisal: Appraisal): Measure =>
  measure(
    appraisal,
    'Programme, months',
    0,
    (option) => option.months,
    (option) => ofOption(option, 'months/p50'),
  );

/** Permanent reaction of the deck on all its supports over the deck area, t/m2: what foundations and an earthquake feel. */
function deckWeight(option: AppraisedOption): Spread {
  const permanent = option.designs
    .flatMap((design) => design.reactions)
    .reduce((sum, r) => sum + r.permanentKN, 0);
  return certain(permanent / 9.81 / option.deckAreaM2);
}

/** Reactions and area it was made from. */
const deckWeightFigures = (option: AppraisedOption): string[] => [
  ...option.designs.flatMap((design, u) =>
    design.reactions.map((_, r) => ofOption(option, `designs/${u}/reactions/${r}/permanentKN`)),
  ),
  ofOption(option, 'deckAreaM2'),
];

/** Section 8: time on site. Carbon and upkeep join when they are worked out. */
export function programmeSection(page: Sheet, cells: StudyCells): LineSection {
  const { appraisal, reference } = cells;
  const finding = page.live({ appraisal }, (v) => {
    const quick = [...v.appraisal.options].sort((a, b) => a.months.p50 - b.months.p50)[0];
    return quick
      ? findingOf(v.appraisal, [
          `Option ${quick.number} is first, after `,
          workedFigure(ofOption(quick, 'months/p50'), fixed(quick.months.p50, 0)),
          ' months.',
        ])
      : '';
  });
  return page.section(8, 'Programme', finding, [
    page.cell({
      station: '8+010',
      title: 'Programme',
      shows: { appraisal, reference },
      body: (v, room) => {
        const input = {
          options: v.appraisal.options,
          reference: v.reference?.number ?? null,
          measures: [months(v.appraisal)],
          widthPx: room.widthPx,
          prefix: 'months',
        };
        return [rangePanels(input), tableBehind(rangeTable(input))];
      },
      notes: [h('p', {}, 'From start on site to opening. Mark: likely. Line: 10 to 90 %.')],
    }),
  ]);
}

/** Height of a panel of the trade-offs on a printed sheet, which has the room to tell close marks apart, px. */
const PAPER_PANEL_PX = 620;

/** Section 9: what else the money buys. */
export function tradeOffSection(page: Sheet, cells: StudyCells): LineSection {
  const { appraisal, reference, brief } = cells;
  return page.section(
    9,
    'Trade-offs',
    'Cost against depth under the road, time and weight. Left and down is better.',
    [
      page.cell({
        station: '9+010',
        title: 'Trade-offs',
        shows: { appraisal, reference, brief },
        wide: true,
        body: (v, room) => {
          const input = {
            options: v.appraisal.options,
            reference: v.reference?.number ?? null,
            budget: budgetOf(v.brief),
            currency: v.appraisal.currency,
            measures: [
              measure(
                v.appraisal,
                'Depth of the main unit, m',
                2,
                (option) => certain(mainDesign(option)?.depthM.support ?? option.depthM.support),
                (option) => `${mainDesignPath(option)}/depthM/support`,
              ),
              months(v.appraisal),
              measure(v.appraisal, 'Weight of the deck, t/m²', 2, deckWeight, deckWeightFigures),
            ],
            widthPx: room.widthPx,
            prefix: 'trade',
            ...(room.paperPx !== null && { panelPx: PAPER_PANEL_PX }),
          };
          return [tradeOffs(input), tableBehind(tradeOffTable(input))];
        },
        notes: [
          h(
            'p',
            {},
            'Filled numbers are undominated in that picture: no other option is both cheaper and better on the axis.',
          ),
          h('p', {}, 'Cost on a log scale: equal steps are equal percentages.'),
        ],
      }),
    ],
  );
}
