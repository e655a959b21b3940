import { formModule, sizeableForms } from '../forms/index.ts';
import type { DepthPair, FormId, StandardId } from '../model/index.ts';
import { sentence } from '../messages/index.ts';
import { meanRates, ratesFor } from '../price/index.ts';
import { BARRIERS_M, deckSpec, LEAST_LANE_M, plainStrips, SURFACING_M } from '../site/index.ts';
import { limitingSpan, type SpanTried } from './limitingSpan.ts';
import type { Step } from './parts.ts';
import { trialUnit } from './trialUnit.ts';

/** Lanes are this wide where the width allows it, m (common practice, no source). */
const LANE_M = 3.5;
/** Loading of a deck of which only widths are known. */
const STANDARD: StandardId = 'lm1';
/** Two pylons where a form stands on pylons. */
const PYLONS = 2;
/** Rough share of the walk that one span takes: spans of a walk are counted against this many. */
const SPANS_TRIED = 20;

/** A deck of which only this is known, m. */
export interface PlainDeck {
  readonly widthM: number;
  /** Infinite where it is straight. */
  readonly radiusM: number;
}

/** A span that was worked out on the way to the limit. */
export interface SpanReached {
  readonly spanM: number;
  readonly depthM: DepthPair;
  /** Deepest section tried beyond the published band, m; null where none was needed. */
  readonly triedToM: number | null;
  readonly ownWeightShare: number;
  readonly check: { readonly label: string; readonly utilisation: number };
}

/** How far a form reaches with a deck. */
export interface FormReach {
  readonly form: FormId;
  readonly deck: PlainDeck;
  readonly lanes: number;
  readonly standard: StandardId;
  /** Spans of the unit over the governing one. */
  readonly ratios: readonly number[];
  /** Longest governing span found to carry, and the first found not to, whose check is the limit; null where there is none. */
  readonly carries: SpanReached | null;
  readonly fails: SpanReached | null;
  /** Governing spans at which own weight is half and 80 % of the governing moment or force, m; null where it is not. */
  readonly ownWeightHalfM: number | null;
  readonly ownWeight80M: number | null;
}

/** Why no limit can be said of a form on a deck. */
export interface NoReach {
  readonly form: FormId;
  readonly deck: PlainDeck;
  readonly because: string;
}

/** The span from which a form no longer carries, m; null where it carries as far as it can be laid out, or nowhere. */
export const limitM = ({ carries, fails }: FormReach): number | null =>
  carries !== null && fails !== null ? fails.spanM : null;

const reached = (tried: SpanTried | null): SpanReached | null =>
  tried && {
    spanM: tried.spanM,
    depthM: tried.design.depthM,
    triedToM: tried.triedToM,
    ownWeightShare: tried.design.ownWeightShare,
    check: {
      label: tried.design.limitingCheck.label,
      utilisation: tried.design.limitingCheck.utilisation,
    },
  };

/**
 * How far a form reaches with a deck of which only width and curve are known: on square supports, with as many lanes of
 * 3.5 m as fit between barriers, under load model 1, built by its usual method, with side spans of ordinary proportion, at
 * mean demo rates (see `limitingSpan`). Steps say the span that is tried.
 */
export function* formReach(form: FormId, deck: PlainDeck): Generator<Step, FormReach | NoReach> {
  if (!sizeableForms.includes(form)) return { form, deck, because: 'it is not sized by this tool' };
  const carriagewayM = deck.widthM - BARRIERS_M;
  const lanes = Math.floor(carriagewayM / LANE_M) || Math.floor(carriagewayM / LEAST_LANE_M);
  if (lanes < 1)
    return { form, deck, because: `a deck ${deck.widthM} m wide holds no lane between barriers` };
  const module = formModule(form);
  const { spansM, pylons } = trialUnit(form, 1, PYLONS, 1);
  const task = {
    form,
    spansM,
    deck: deckSpec(plainStrips(deck.widthM, carriagewayM, lanes), SURFACING_M, STANDARD),
    standard: STANDARD,
    planRadiusM: deck.radiusM,
    method: module.methods[0],
    ...(pylons && { pylons }),
  };
  const faults = module.faults?.(task) ?? [];
  if (faults.length > 0) return { form, deck, because: faults.map(sentence).join(' ') };
  const work = limitingSpan({ task, haunch: 1 }, meanRates(ratesFor({ ratePack: 'demo-2026', rates: [] })));
  const spans = new Set<number>();
  try {
    for (;;) {
      const next = work.next();
      if (next.done) {
        const { carries, fails, ownWeightHalfM, ownWeight80M } = next.value;
        return {
          form,
          deck,
          lanes,
          standard: STANDARD,
          ratios: spansM,
          carries: reached(carries),
          fails: reached(fails),
          ownWeightHalfM,
          ownWeight80M,
        };
      }
      spans.add(next.value);
      yield {
        done: spans.size,
        of: Math.max(SPANS_TRIED, spans.size + 1),
        what: `${next.value.toFixed(1)} m`,
      };
    }
  } catch (error) {
    if (!(error instanceof RangeError)) throw error;
    return { form, deck, because: error.message };
  }
}
