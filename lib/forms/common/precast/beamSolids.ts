import { diaphragmsWithin } from './beamMoments.ts';
import type { PrecastModel } from './precastModel.ts';

/** Concrete that fills a beam of a span at its ends and cross-walls, cast with it, m3; 0 where walls are cast in place. */
export function beamSolidsM3(model: PrecastModel, spanM: number): number {
  const { crossWalls, diaphragm } = model.kind;
  const { endBlockM, ofBeamM2 } = crossWalls(model);
  if (endBlockM === undefined) return 0;
  return ofBeamM2 * (2 * endBlockM + diaphragmsWithin(model, spanM) * diaphragm.withinM);
}
