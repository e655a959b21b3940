import { cannotCarry, formModule } from '../forms/index.ts';
import type { Design } from '../model/index.ts';
import { spanWindow } from '../rules/index.ts';
import { bandOf, deckDepth, taskAt, type OpenDepth } from './deckDepth.ts';
import { saying } from './work.ts';

/** The walk begins here where no rule gives the form a shortest span, m. */
const SHORTEST_M = 6;
/** No span beyond this is tried, m: no bridge has one. */
const LONGEST_M = 3000;
/** From one span of the walk to the next. */
const STRIDE = 1.2;
/** The limit is found to this share of itself. */
const NEAR = 0.005;

/** A unit worked out at one governing span, at the depth of least cost that carries, or nearest to carrying. */
export interface SpanTried {
  readonly spanM: number;
  readonly design: Design;
  /** Deepest section tried beyond the published band, m; null where none was needed. */
  readonly triedToM: number | null;
}

/** How far a form reaches before something real stands in the way. */
export interface LimitingSpan {
  /** Longest governing span found to carry; null where none did. */
  readonly carries: SpanTried | null;
  /** The first found not to, whose limiting check is the limit; null where the form carries as far as it can be laid out. */
  readonly fails: SpanTried | null;
  /** Governing spans, m, at which own weight is these shares of the governing moment or force; null where the limit comes before, or all spans have more. */
  readonly ownWeightHalfM: number | null;
  readonly ownWeight80M: number | null;
}

/** A unit with its spans in the same proportion, the longest as given, m. */
function scaled({ task, haunch }: OpenDepth, spanM: number): OpenDepth {
  const governing = Math.max(...task.spansM);
  return { task: { ...task, spansM: task.spansM.map((one) => (one / governing) * spanM) }, haunch };
}

/**
 * The first governing span at which a unit hits a real limit, with its spans in proportion: a walk from short spans to long
 * until no depth carries that carried before, in the published band or beyond it, then halving between the last two. Depths
 * are those of least cost (see `deckDepth`). Short spans that do not carry, because parts have least sizes, are passed over.
 * Every limit is a check of the form that is past its limit; where the form cannot be laid out any longer there is none.
 * Says the span it is at whenever it pauses, m.
 *
 * @param open unit whose spans give the proportion
 * @param mean money per unit of each item
 */
export function* limitingSpan(
  open: OpenDepth,
  mean: Readonly<Record<string, number>>,
): Generator<number, LimitingSpan> {
  const module = formModule(open.task.form);
  const { mostSpanM = LONGEST_M } = module;
  /** Best depths are nearly the same share of the band at one span as at the one before. */
  let share: number | undefined;
  const at = function* (spanM: number): Generator<number, SpanTried> {
    const unit = scaled(open, spanM);
    const [least, most] = bandOf(unit);
    const near = share === undefined ? undefined : least + share * (most - least);
    const { depthM, triedToM } = yield* saying(spanM, deckDepth(unit, mean, near));
    share = most > least ? (Math.min(most, depthM) - least) / (most - least) : undefined;
    return { spanM, design: module.size(taskAt(unit, depthM)), triedToM };
  };

  const walked: SpanTried[] = [];
  let carries: SpanTried | null = null;
  let fails: SpanTried | null = null;
  const { possible, usual } = spanWindow(module.id);
  const first = Math.min(mostSpanM, possible[0] || SHORTEST_M);
  for (let spanM = first; ; spanM = Math.min(mostSpanM, STRIDE * spanM)) {
    const tried: SpanTried = yield* at(spanM);
    if (cannotCarry([tried.design]) === null) {
      carries = tried;
      walked.push(tried);
    } else if (carries !== null) {
      fails = tried;
      break;
    } else fails ??= tried;
    // Where nothing has carried by the end of the usual spans it is not the span that stands in the way.
    if (spanM >= (carries === null ? Math.min(mostSpanM, usual[1]) : mostSpanM)) break;
  }
  if (carries !== null && (fails === null || fails.spanM < carries.spanM)) fails = null;
  while (carries !== null && fails !== null && fails.spanM - carries.spanM > NEAR * fails.spanM) {
    const tried: SpanTried = yield* at((carries.spanM + fails.spanM) / 2);
    if (cannotCarry([tried.design]) === null) {
      carries = tried;
      walked.push(tried);
    } else fails = tried;
  }
  return {
    carries,
    fails,
    ownWeightHalfM: spanOfShare(walked, 0.5),
    ownWeight80M: spanOfShare(walked, 0.8),
  };
}

/** Where the share of own weight first passes a value, on a straight line between two spans that were worked out; null where it does not. */
function spanOfShare(walked: readonly SpanTried[], share: number): number | null {
  const i = walked.findIndex(({ design }) => design.ownWeightShare >= share);
  const [before, after] = [walked[i - 1], walked[i]];
  if (!before || !after) return null;
  const rise = after.design.ownWeightShare - before.design.ownWeightShare;
  return before.spanM + ((share - before.design.ownWeightShare) / rise) * (after.spanM - before.spanM);
}
