import { formModule } from '../forms/index.ts';
import type { Design, FormId, MeasuredLine, MethodId, Site } from '../model/index.ts';
import { deckOnSupport } from '../substructure/index.ts';
import { skewOn } from './askedTask.ts';
import { meanClearance } from './meanClearance.ts';
import { methodLines } from '../takeoff/index.ts';
import { depthRange } from './depthRange.ts';
import type { Kept } from '../kept.ts';
import { aloneSpanWork, endSpanWork, type DeckLoads } from './endSpanWork.ts';
import { openSpans } from './openSpans.ts';
import { quakeOn } from './quakeOn.ts';
import { leastCostDepth } from './leastCostDepth.ts';
import type { TrialRow } from './memory.ts';
import type { Sizer } from './sizer.ts';
import { tautSide } from './tautSide.ts';
import { trialSpans } from './trialSpans.ts';
import { isFrame, longestOfTwo, trialUnit } from './trialUnit.ts';
import { finish, type Work } from './work.ts';

/** Governing spans at which each form is really sized; in between cost grows with a power of the span. */
const TABLE_SPANS = 7;
/** Shares of the governing span at which the shorter spans of a unit are sized with the depth of the longest. */
export const SHARES = [0.5, 1] as const;
/** Spans under this are culverts, m. */
const LEAST_SPAN_M = 8;

/** A form built by one method. */
export interface FormAndMethod {
  readonly form: FormId;
  readonly method: MethodId;
}

/** Money of measured lines at one rate per item. */
type CostOf = (lines: readonly MeasuredLine[]) => number;

const isFixed = (line: MeasuredLine): boolean => line.part === 'pylons' || line.item === 'method-setup';

/** Rows of one form and method: one for each of its spans, each sized when it is first read. */
export interface TrialRows {
  readonly spansM: readonly number[];
  readonly row: (index: number) => TrialRow;
  /** The same, pausing after each trial. */
  readonly make: (index: number) => Work<TrialRow>;
  /** What a row is kept under. */
  readonly key: (index: number) => string;
}

/** What rows are made from besides their form and method. */
export interface RowMakers {
  readonly site: Site;
  readonly size: Sizer;
  readonly costOf: CostOf;
  readonly rows: Kept<TrialRow>;
  /** Text of the books behind `costOf`. */
  readonly booksKey: string;
}

/**
 * Rows of one form and method over its possible band of spans on a crossing.
 *
 * @throws RangeError where no span of the form fits the crossing
 */
export function trialRows({ form, method }: FormAndMethod, makers: RowMakers): TrialRows {
  const { site, size, costOf, rows, booksKey } = makers;
  const open = openSpans(form, site.lengthM);
  if (!open)
    throw new RangeError(`cost table: ${form} has no span that fits a crossing of ${site.lengthM} m`);
  const [, most] = open;
  const least = Math.min(most, Math.max(open[0], LEAST_SPAN_M));
  const { pattern, leapsAtM = [] } = formModule(form);
  const { kind } = pattern;
  // Where two spans give way to one the cost leaps as well.
  const leapsM = isFrame(pattern) ? [...leapsAtM, longestOfTwo(form, site.lengthM)] : leapsAtM;
  const spansM = trialSpans([least, most], leapsM, TABLE_SPANS);
  const hung = kind === 'pylon';
  const base = {
    form,
    method,
    deck: site.deck,
    standard: site.standard,
    planRadiusM: site.planRadiusM ?? Infinity,
    ...skewOn(site),
    ...(formModule(form).ignoresHeight ? {} : { clearM: meanClearance(site) }),
    ...quakeOn(site, formModule(form)),
  };

  const unitOver = (spanM: number, pylons: 1 | 2) => trialUnit(form, spanM, pylons, site.lengthM);
  // A wall between spans is priced where it stands, like any pier.
  const isOfDeck = (line: MeasuredLine): boolean => !isFixed(line) && line.part !== 'piers';
  const sized = (
    unit: ReturnType<typeof trialUnit>,
    depthM: number,
  ): { design: Design; perM: number; fixed: number } => {
    const { clearM, ...task } = base;
    const height = clearM === undefined ? {} : { clearUnderM: [clearM, ...unit.spansM.map(() => clearM)] };
    const design = size({ ...task, ...height, depthM, ...unit });
    const lines = [...design.lines, ...methodLines([design])];
    const lengthM = unit.spansM.reduce((sum, span) => sum + span, 0);
    return {
      design,
      perM: costOf(lines.filter(isOfDeck)) / lengthM,
      fixed: costOf(lines.filter(isFixed)),
    };
  };

  /** What a metre of a shorter span costs in a unit of the same depth. */
  const shorter = (spansM: readonly number[], share: number, depthM: number, perM: number): number => {
    const [spanM = 0, ...others] = spansM;
    if (!isFrame(pattern) || others.length === 0)
      return sized({ spansM: spansM.map((one) => share * one) }, depthM).perM;
    // Of two spans what the shorter adds to the longer, so that both together are what they cost.
    const both = sized({ spansM: [spanM, share * spanM] }, depthM).perM * (1 + share);
    return (both - perM) / share;
  };

  const { joined } = formModule(form);
  /** What an end span, or one alone, works like; 1 where the trial unit is what it is. */
  const workAs = (work: (loads: DeckLoads) => number, permanentKNm: number, trafficKNm: number): number => {
    if (hung || kind === 'simple-main' || isFrame(pattern) || joined === 'never') return 1;
    // Surfacing, barriers and what else is laid on the deck come when it is whole.
    const simpleKNm = joined === 'after-placing' ? Math.max(0, permanentKNm - site.deck.superimposedKNm) : 0;
    return work({ simpleKNm, continuousKNm: permanentKNm - simpleKNm, trafficKNm });
  };

  const made = function* (index: number): Work<TrialRow> {
    const spanM = spansM[index]!;
    const unit = unitOver(spanM, 1);
    const range = depthRange(form, method, unit.spansM, site);
    // The best depth is nearly the same share of the band for one span as for the one before it.
    const before = index > 0 ? yield* make(index - 1) : undefined;
    const look = before && (before.depthM * range[1]) / before.mostDepthM;
    const depthM = yield* leastCostDepth(
      range,
      (trialM) => {
        const { design, perM } = sized(unit, trialM);
        return { cost: perM, utilisation: design.limitingCheck.utilisation };
      },
      look,
    );
    const whole = sized(unit, depthM);
    yield;
    // Only a continuous unit has shorter spans of the same depth.
    // Where no depth of the band is strong enough, what is lacking has its price: a span that fails is no bargain.
    const weak = Math.max(1, whole.design.limitingCheck.utilisation);
    const perM = SHARES.map(
      (share) =>
        weak *
        (share === 1 || kind !== 'continuous' ? whole.perM : shorter(unit.spansM, share, depthM, whole.perM)),
    );
    yield;
    const double = hung ? sized(unitOver(spanM, 2), depthM) : null;
    const fixed = double ? [whole.fixed, whole.fixed, double.fixed] : [whole.fixed];
    const { permanentKNm, trafficKNm } = deckOnSupport(whole.design);
    return {
      depthM,
      mostDepthM: range[1],
      perM,
      fixed,
      endWorksAs: workAs(endSpanWork, permanentKNm, trafficKNm),
      aloneWorksAs: workAs(aloneSpanWork, permanentKNm, trafficKNm),
      tautSide: double ? tautSide(double.design) : Infinity,
      loadKNm: permanentKNm + trafficKNm,
    };
  };

  const key = (index: number): string => JSON.stringify([base, unitOver(spansM[index]!, 1).spansM, booksKey]);
  const known: (TrialRow | undefined)[] = spansM.map((_, index) => rows.get(key(index)));
  const make = function* (index: number): Work<TrialRow> {
    return (known[index] ??= rows.put(key(index), yield* made(index)));
  };
  return { spansM, row: (index) => known[index] ?? finish(make(index)), make, key };
}
