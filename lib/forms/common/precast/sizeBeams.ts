import { beamShear, type BeamShear } from './beamShear.ts';
import { pierContinuity, type PierContinuity } from './pierBars.ts';
import type { PrecastModel } from './precastModel.ts';
import { sizeStrands, type SpanStrands } from './sizeStrands.ts';

/** Strands and links by span, continuity by inner support. */
export interface SizedBeams {
  readonly strands: readonly SpanStrands[];
  readonly shears: readonly BeamShear[];
  readonly piers: readonly PierContinuity[];
}

/** Sizes the beams of every span; equal spans have equal strands. */
export function sizeBeams(model: PrecastModel): SizedBeams {
  const { spansM } = model.task;
  const known = new Map<number, SpanStrands>();
  const strands = spansM.map((spanM, span) => {
    const made = known.get(spanM) ?? sizeStrands(model, span);
    known.set(spanM, made);
    return made;
  });
  return {
    strands,
    shears: strands.map(({ plan }, span) => beamShear(model, span, plan)),
    piers: model.kind.spans === 'linked' ? [] : spansM.slice(1).map((_, i) => pierContinuity(model, i + 1)),
  };
}
