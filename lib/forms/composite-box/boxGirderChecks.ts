import type { Check, SupportReaction } from '../../model/index.ts';
import { girderChecks } from '../composite-i/girderChecks.ts';
import type { SizedGirder } from '../composite-i/sizeGirder.ts';
import type { SkewTorques } from '../common/skewTorque.ts';
import type { BoxGirderModel } from './boxGirderModel.ts';
import { bearingUplift } from './tubBearings.ts';

/** Limit states of half a box as a girder, of its slab, and of the boxes on their bearings. */
export function boxGirderChecks(
  model: BoxGirderModel,
  girder: SizedGirder,
  reactions: readonly SupportReaction[],
  skew: SkewTorques,
): Check[] {
  return [...girderChecks(model, girder), bearingUplift(model, reactions, skew)];
}
