import { faultsOf } from '../arrange/index.ts';
import type { AppraisedOption, Check, MadeOption, Option, Status, WorkedOption } from '../model/index.ts';
import { optionError, priceOption, type PricedOption } from '../price/index.ts';
import { rulingsFor, statusOf } from '../rules/index.ts';
import { expectedLines } from '../substructure/index.ts';
import { perM2, splitQuantities } from '../takeoff/index.ts';
import type { Drawn } from './drawn.ts';
import { optionFacts } from './facts.ts';
import { remembered } from '../kept.ts';
import { pricedText } from './pricedText.ts';
import { patternOf, requestFor } from './requestFor.ts';
import { riversCrossed } from './riversCrossed.ts';
import { hundredMm } from './hundredMm.ts';
import type { Work } from './work.ts';
import { workOption } from './cheapestOption.ts';
import { mainUnit, spareOf, workOptionAt } from './workOption.ts';
import { benchFor, type Workbench } from './workbench.ts';

/** An option worked out, priced and ruled on, with its cost in every draw. */
export interface PricedAppraisal {
  readonly option: AppraisedOption;
  readonly totals: PricedOption['totals'];
}

/**
 * One option from arrangement to P50, on the stored draws of its study: sizes, supports, quantities, months, price and
 * rulings. Odds and ranking need the others as well. Pauses after each depth tried.
 *
 * @throws RangeError where a form cannot be sized for what it is asked
 */
export function* appraiseOption(bench: Workbench, drawn: Drawn, option: Option): Work<PricedAppraisal> {
  const own = benchFor(bench, option.units);
  return judged(own, drawn, yield* workOption(own, option));
}

/**
 * The same at depths that are given for each unit of the option, m, so that nothing is searched: what dragging asks for.
 *
 * @throws RangeError where a form cannot be sized for what it is asked
 */
export function appraiseOptionAt(
  bench: Workbench,
  drawn: Drawn,
  option: MadeOption,
  depthsM: readonly number[],
): PricedAppraisal {
  const own = benchFor(bench, option.units);
  return judged(own, drawn, workOptionAt(own, option, depthsM));
}

/** A worked option priced and ruled on; the bench is that of its own abutments. */
function judged(bench: Workbench, { draws, rates, key }: Drawn, worked: WorkedOption): PricedAppraisal {
  const { study, site } = bench;
  const priced = remembered(bench.kept.priced, `${worked.number} ${key} ${pricedText(worked)}`, () =>
    priceOption(worked, draws, rates, optionError(draws, worked.number)),
  );
  const spare = spareOf(site, worked);
  const headroom = spare && { spareM: spare.spareM, reason: spare.limit.reason, chainageM: spare.chainageM };
  const { budget } = study.brief;
  const chance = budget === 'unknown' ? 'unknown' : shareWithin(priced.totals, budget.amount);
  const facts = optionFacts(study, site, worked, headroom, chance);
  const rulings = rulingsFor(['form', 'arrangement', 'option'], worked.form, facts);
  const status: Status = statusOf(rulings);
  const deckAreaM2 = site.lengthM * site.deck.widthM;
  const foundations = worked.supports.flatMap((support) => expectedLines({ ...support, lines: [] }));
  const { superstructure, supports } = splitQuantities([...worked.lines, ...foundations]);
  const governing = limitingOf(worked);
  return {
    option: {
      ...worked,
      ...(site.windows ? { startM: site.startM, endM: site.endM } : {}),
      status,
      rulings,
      faults: faultsOf(worked.units, requestFor(worked, site, patternOf(worked.form, worked.units)), site),
      quantities: superstructure,
      perM2: perM2(superstructure, deckAreaM2),
      supportQuantities: supports,
      headroom,
      rivers: riversCrossed(site, worked),
      hundredMm: hundredMm(bench, worked),
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
  for (let k = 0; k < totals.length; k++) if (totals[k]! <= amount) count += 1;
  return count / totals.length;
}

/** The check that governs the main unit; one of an approach only where it fails. */
function limitingOf(option: WorkedOption): Check {
  const main = option.designs[option.units.indexOf(mainUnit(option.units))]!.limitingCheck;
  return option.designs
    .map((design) => design.limitingCheck)
    .reduce((most, check) => (check.utilisation > Math.max(1, most.utilisation) ? check : most), main);
}
