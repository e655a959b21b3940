import { lineBeam } from '../beam/lineBeam.ts';
import { stepped, uniform } from '../beam/loadings.ts';

/** A deck cast or placed span by span, each stage reaching past its support. */
export interface SpanBySpan {
  readonly spansM: readonly number[];
  readonly wKNm: number;
  /** Joint beyond the support as a share of the next span, 0 to 0.3. */
  readonly jointShare: number;
  readonly stationsPerSpan?: number;
}

export interface StagedMoments {
  readonly xM: Float64Array;
  /** Self-weight moments locked in by the stages. */
  readonly builtKNm: Float64Array;
  /** Moments had the deck been struck in one go. */
  readonly atOnceKNm: Float64Array;
}

/**
 * Adds up the stages: stage i sets a fresh piece of weight w, from the last joint to the next, on the beam of all spans
 * up to i with its overhang.
 * @throws RangeError for a joint outside 0 to 0.3 of the span
 */
export function spanBySpan(deck: SpanBySpan): StagedMoments {
  const { spansM, wKNm, jointShare, stationsPerSpan = 20 } = deck;
  if (!(jointShare >= 0 && jointShare <= 0.3)) {
    throw new RangeError(`jointShare: expected 0 to 0.3, received ${jointShare}`);
  }
  const whole = lineBeam({ spansM, stationsPerSpan });
  const builtKNm = new Float64Array(whole.xM.length);
  let from = 0;
  let reach = 0;
  spansM.forEach((span, i) => {
    reach += span;
    const next = spansM[i + 1];
    const overhang = next === undefined ? 0 : jointShare * next;
    const beam = lineBeam({
      spansM: spansM.slice(0, i + 1),
      overhangsM: { end: overhang },
      extraStationsM: [from],
      stationsPerSpan,
    });
    const load = Float64Array.from({ length: beam.xM.length - 1 }, (_, e) =>
      (beam.xM[e]! + beam.xM[e + 1]!) / 2 > from ? wKNm : 0,
    );
    const effects = stepped(beam, load);
    for (let s = 0; s < builtKNm.length; s++)
      builtKNm[s]! += valueAt(beam.xM, effects.momentKNm, whole.xM[s]!);
    from = reach + overhang;
  });
  return { xM: whole.xM, builtKNm, atOnceKNm: uniform(whole, wKNm).momentKNm };
}

/**
 * Moments after creep: built + (at once - built) phi / (1 + 0.8 phi) with the final creep factor phi (ageing
 * coefficient 0.8; common practice, from memory).
 */
export function creepRedistributed(staged: StagedMoments, creepFactor: number): Float64Array {
  const share = creepFactor / (1 + 0.8 * creepFactor);
  return staged.builtKNm.map((built, i) => built + (staged.atOnceKNm[i]! - built) * share);
}

function valueAt(xM: Float64Array, values: Float64Array, x: number): number {
  const last = xM.length - 1;
  if (x > xM[last]!) return 0;
  let i = 1;
  while (i < last && xM[i]! < x) i++;
  const t = (x - xM[i - 1]!) / (xM[i]! - xM[i - 1]!);
  return values[i - 1]! + t * (values[i]! - values[i - 1]!);
}
