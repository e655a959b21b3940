import { carries, formModule, isWorthSquaring } from '../forms/index.ts';
import {
  asMade,
  isOpen,
  saidOf,
  type AskedVariant,
  type MadeOption,
  type Option,
  type Unit,
  type Variant,
  type WorkedOption,
} from '../model/index.ts';
import { onGrid } from './depthGrid.ts';
import { depthRange } from './depthRange.ts';
import { depthThatCarries } from './depthThatCarries.ts';
import type { DepthTrial } from './leastCostDepth.ts';
import type { Work } from './work.ts';
import type { Workbench } from './workbench.ts';
import { skewOn, spansOf } from './askedTask.ts';
import { depthsOf, mainUnit, trialAt, workOptionAt } from './workOption.ts';

/** The table is read off straight lines and knows one pattern of spans: this much more is still looked at. */
const OVER_DECK_ALONE = 1.15;
/** A variant has to save this share of the cost: the curve is flat and the choice must not jitter. */
const PAYS = 0.01;
/** Midspan depth at which a variant is first tried over the best of constant depth. */
const FIRST_TRY = { haunched: 0.9, substringers: 1.2, other: 1 } as const;

/** Depth of least cost of an option made one way, m, and what it comes to. */
interface Made {
  readonly option: MadeOption;
  readonly depthM: number;
  readonly trial: DepthTrial;
}

const fits = ({ utilisation }: DepthTrial): boolean => carries(utilisation);

/** Cost of a trial that is too weak counts as many times as it is overloaded: what it lacks has its price. */
const worth = ({ cost, utilisation }: DepthTrial): number => cost * Math.max(1, utilisation);

const isBetter = (one: DepthTrial, than: DepthTrial): boolean =>
  fits(one) === fits(than) ? worth(one) < (1 - PAYS) * worth(than) : fits(one);

/**
 * Depths worth trying, m: the published band of how the option is made; of a plain one no more than somewhat over that of
 * least deck cost, since clearance, road and supports only ever ask for less depth than the deck alone.
 */
function depthsToTry(
  bench: Workbench,
  option: MadeOption,
  main: Unit,
): readonly [least: number, most: number] {
  const spans = spansOf(main);
  const { variant = {} } = option;
  const [least, most] = depthRange(main.form, option.method, spans, bench.site, variant);
  if (variant.substringers) return [least, most];
  const deckAlone = bench.tables.tableFor(option).depthM(main.form, Math.max(...spans));
  return [least, Math.max(least, Math.min(most, OVER_DECK_ALONE * deckAlone))];
}

/** The shallowest depth within 1 % of the least cost of the whole crossing at mean rates; deeper where nothing carries. */
function* atBestDepth(bench: Workbench, option: MadeOption, nearM: number): Work<Made> {
  const main = mainUnit(option.units);
  const tryAt = (depthM: number): DepthTrial => trialAt(bench, option, depthM);
  const { depthM } = yield* depthThatCarries(depthsToTry(bench, option, main), tryAt, nearM);
  return { option, depthM, trial: tryAt(depthM) };
}

/**
 * The cheapest way of making an option as it is asked: with no more than was asked, or one of the variants of its form that
 * agree with that where it saves more than 1 %; then on a skew, if that saves more than 1 % again, the same with its ends
 * square to the road.
 */
function* cheapestMade(bench: Workbench, plain: Made, asked: AskedVariant | undefined): Work<Made> {
  const { form, method, units } = plain.option;
  const module = formModule(form);
  const made = yield* cheaperOf(
    bench,
    plain,
    module.variants?.(spansOf(mainUnit(units)), bench.site.deck, method) ?? [],
    asked,
  );
  return yield* cheaperOf(bench, made, squaredOf(bench, made.option), asked);
}

/** The variant of an option with square ends, where its form leaves that choice and there is a skew worth speaking of. */
function squaredOf({ site }: Workbench, { form, variant = {} }: MadeOption): Variant[] {
  const { choices = [] } = formModule(form);
  const { skewDeg = 0 } = skewOn(site);
  return choices.includes('squareEnds') && isWorthSquaring(skewDeg) ? [{ ...variant, squareEnds: true }] : [];
}

/**
 * An option as it is made, or by one of some variants that agree with what was asked. Every variant is tried once; only for
 * the best of them, where it promises anything, the depth is sought again.
 */
function* cheaperOf(
  bench: Workbench,
  plain: Made,
  variants: readonly Variant[],
  asked: AskedVariant | undefined,
): Work<Made> {
  const { depthM: typedM } = plain.option;
  const tried: Made[] = [];
  for (const variant of variants) {
    const made = asMade(asked, variant);
    if (made === null) continue;
    const option: MadeOption = { ...plain.option, variant: made };
    const depthM = typedM ?? firstTryM(bench, option, made, plain.depthM);
    tried.push({ option, depthM, trial: trialAt(bench, option, depthM) });
    yield;
  }
  if (tried.length === 0) return plain;
  const best = tried.reduce((one, other) => (worth(other.trial) < worth(one.trial) ? other : one));
  if (typedM !== null) return isBetter(best.trial, plain.trial) ? best : plain;
  // About the best depth cost is flat: what is dearer where it is first tried will not save what it must.
  if (!(worth(best.trial) < worth(plain.trial))) return plain;
  const made = yield* atBestDepth(bench, best.option, best.depthM);
  return isBetter(made.trial, plain.trial) ? made : plain;
}

function firstTryM(
  bench: Workbench,
  option: MadeOption,
  { haunchRatio, substringers }: Variant,
  plainM: number,
): number {
  const [least, most] = depthsToTry(bench, option, mainUnit(option.units));
  const share =
    haunchRatio !== undefined ? FIRST_TRY.haunched : substringers ? FIRST_TRY.substringers : FIRST_TRY.other;
  return onGrid(Math.min(most, Math.max(least, share * plainM)));
}

/**
 * Works out one option: designs of its units, road profile, supports, take-off and programme. A depth that the option
 * leaves open is the shallowest within 1 % of the least cost of the whole crossing inside the published band; how its main
 * unit is made, where that is open, is the cheapest at mean rates. Pauses after each depth tried.
 *
 * @throws RangeError where a form cannot be sized for what it is asked
 */
export function* workOption(bench: Workbench, option: Option): Work<WorkedOption> {
  const main = mainUnit(option.units);
  const first: MadeOption = { ...option, variant: saidOf(option.variant ?? {}) };
  const nearM = bench.tables.tableFor(option).depthM(main.form, Math.max(...spansOf(main)));
  const { depthM } = option;
  const plain =
    depthM === null
      ? yield* atBestDepth(bench, first, nearM)
      : { option: first, depthM, trial: trialAt(bench, first, depthM) };
  const made = isOpen(option.variant) ? yield* cheapestMade(bench, plain, option.variant) : plain;
  return workOptionAt(bench, made.option, depthsOf(bench, made.option, made.depthM));
}
