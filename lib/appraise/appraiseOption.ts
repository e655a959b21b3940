import type { AppraisedOption, Check, Option, Status, WorkedOption } from '../model/index.ts';
import { optionError, priceOption, type Draws, type PricedOption, type RateDraws } from '../price/index.ts';
import { rulingsFor, statusOf } from '../rules/index.ts';
import { expectedLines } from '../substructure/index.ts';
import { perM2, splitQuantities } from '../takeoff/index.ts';
import { optionFacts } from './facts.ts';
import { mainUnit, spareOf, workOption } from './workOption.ts';
import type { Workbench } from './workbench.ts';

/** An option worked out, priced and ruled on, with its cost in every draw. */
export interface PricedAppraisal {
  readonly option: AppraisedOption;
  readonly totals: PricedOption['totals'];
}

/**
 * One option from arrangement to P50, on the stored draws of its study: sizes, supports, quantities, months, price and
 * rulings. This is what dragging a pier asks for; odds and ranking are worked out on release.
 *
 * @throws RangeError where a form cannot be sized for what it is asked
 */
export function appraiseOption(
  bench: Workbench,
  draws: Draws,
  rates: RateDraws,
  option: Option,
): PricedAppraisal {
  const { study, site } = bench;
  const worked = workOption(bench, option);
  const priced = priceOption(worked, draws, rates, optionError(draws, option.number));
  const spare = spareOf(site, worked);
  const headroom = spare && { spareM: spare.spareM, reason: spare.limit.reason, chainageM: spare.chainageM };
  const { budget } = study.brief;
  const chance = budget === 'unknown' ? 'unknown' : shareWithin(priced.totals, budget.amount);
  const facts = optionFacts(study, site, worked, headroom, chance);
  const rulings = rulingsFor(['form', 'arrangement', 'option'], option.form, facts);
  const status: Status = statusOf(rulings);
  const deckAreaM2 = site.lengthM * site.deck.widthM;
  const foundations = worked.supports.flatMap((support) => expectedLines({ ...support, lines: [] }));
  const { superstructure, supports } = splitQuantities([...worked.lines, ...foundations]);
  const governing = limitingOf(worked);
  return {
    option: {
      ...worked,
      status,
      rulings,
      quantities: superstructure,
      perM2: perM2(superstructure, deckAreaM2),
      supportQuantities: supports,
      headroom,
      deckAreaM2,
      cost: priced.cost,
      quartiles: priced.quartiles,
      pricePerM2: {
        withApproaches: priced.cost.p50 / deckAreaM2,
        withoutApproaches: priced.withoutApproachesP50 / deckAreaM2,
      },
      parts: priced.parts,
      limitingCheck: { id: governing.id, label: governing.label, utilisation: governing.utilisation },
    },
    totals: priced.totals,
  };
}

function shareWithin(totals: Float64Array, amount: number): number {
  let count = 0;
  for (const total of totals) if (total <= amount) count += 1;
  return count / totals.length;
}

/** The check that governs the main unit; one of an approach only where it fails. */
function limitingOf(option: WorkedOption): Check {
  const main = option.designs[option.units.indexOf(mainUnit(option.units))]!.limitingCheck;
  return option.designs
    .map((design) => design.limitingCheck)
    .reduce((most, check) => (check.utilisation > Math.max(1, most.utilisation) ? check : most), main);
}
