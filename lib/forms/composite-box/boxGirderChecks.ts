import type { Check, SupportReaction } from '../../model/index.ts';
import { check } from '../common/checks.ts';
import { girderChecks } from '../composite-i/girderChecks.ts';
import type { SizedGirder } from '../composite-i/sizeGirder.ts';
import { boxMiddles, type BoxGirderModel } from './boxGirderModel.ts';
import { compositeBoxData } from './compositeBoxData.ts';

/** Limit states of half a box as a girder, of its slab, and of the box on its bearings. */
export function boxGirderChecks(
  model: BoxGirderModel,
  girder: SizedGirder,
  reactions: readonly SupportReaction[],
): Check[] {
  return [...girderChecks(model, girder), bearing(model, reactions)];
}

/**
 * Uplift of one of two bearings under a box: eccentric traffic over both spans beside a support and curvature in plan,
 * less what that traffic presses at the least its torque needs (no load stands farther out than the outer lane), against
 * what lasting loads press. The worst support.
 */
function bearing(model: BoxGirderModel, reactions: readonly SupportReaction[]): Check {
  const { tubs, shape, torsion, standard, task } = model;
  const { uls } = standard.factors;
  const { spansM, deck } = task;
  const apartM = Math.max(0.5 * shape.bottomM, shape.bottomM - compositeBoxData.bearings.fromWebsM);
  // Diaphragms tie the boxes over the supports: their bearings share a torque by their distance from the middle.
  const arms = boxMiddles(tubs).flatMap((y) => [y - apartM / 2, y + apartM / 2]);
  const perKNm = Math.max(...arms) / arms.reduce((sum, arm) => sum + arm * arm, 0);
  const farthestM = (deck.carriagewayM - standard.lanes.widthM) / 2 + Math.abs(deck.carriagewayOffsetM);
  const perTrafficKNm = Math.max(0, perKNm - (farthestM > 0 ? 1 / (farthestM * tubs.count) : 0));
  const whole = tubs.boxes ** 2;
  const checks = reactions.map(({ permanentKN }, j) => {
    const besideM = ((spansM[j - 1] ?? 0) + (spansM[j] ?? 0)) / 2;
    const trafficKNm = uls.traffic * whole * (torsion.vehicleKNm + torsion.uniformKNmPerM * besideM);
    const lift = perTrafficKNm * trafficKNm + perKNm * tubs.boxes * torsion.curveAtKNm[j]!;
    return check(
      'bearing-uplift',
      'uplift of one of two bearings under a box',
      lift,
      (uls.permanentFavourable * permanentKN) / tubs.count,
      'kN',
    );
  });
  return checks.reduce((worst, next) => (next.utilisation > worst.utilisation ? next : worst));
}
