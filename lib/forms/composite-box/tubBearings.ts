import { trafficOnDeck } from '../../actions/index.ts';
import type { Check, SupportReaction } from '../../model/index.ts';
import { check } from '../common/checks.ts';
import type { SkewTorques } from '../common/skewTorque.ts';
import { skewCases, skewTurnings } from '../common/skewTurning.ts';
import { boxMiddles, type BoxGirderModel } from './boxGirderModel.ts';
import { compositeBoxData } from './compositeBoxData.ts';

/**
 * What a torque of the whole deck puts on the outermost of its bearings at a support, kN per kNm. Diaphragms tie the boxes
 * over the supports: their bearings share a torque by their distance from the middle.
 */
export function bearingPerKNm({ tubs, shape }: Pick<BoxGirderModel, 'tubs' | 'shape'>): number {
  const apartM = Math.max(0.5 * shape.bottomM, shape.bottomM - compositeBoxData.bearings.fromWebsM);
  const arms = boxMiddles(tubs).flatMap((y) => [y - apartM / 2, y + apartM / 2]);
  return Math.max(...arms) / arms.reduce((sum, arm) => sum + arm * arm, 0);
}

/**
 * Uplift of one of two bearings under a box: eccentric traffic over both spans beside a support, curvature in plan and skew
 * ends, less what that traffic presses at the least, by its torque (no load stands farther out than the outer lane) or by
 * what slopes the ends, against what lasting loads press. What lasts on skew ends goes in without a factor, as the load
 * that presses is the one that twists. The worst support.
 */
export function bearingUplift(
  model: BoxGirderModel,
  reactions: readonly SupportReaction[],
  skew: SkewTorques,
): Check {
  const { tubs, torsion, standard, standardId, task } = model;
  const { uls } = standard.factors;
  const { spansM, deck } = task;
  const perKNm = bearingPerKNm(model);
  const farthestM = (deck.carriagewayM - standard.lanes.widthM) / 2 + Math.abs(deck.carriagewayOffsetM);
  const perFarthestM = farthestM > 0 ? 1 / farthestM : 0;
  const perTrafficKNm = perKNm - perFarthestM / tubs.count;
  const whole = tubs.boxes ** 2;
  const turnings = skewTurnings(skew, spansM, trafficOnDeck(standardId, deck).udlKNm);
  const checks = reactions.map(({ permanentKN }, j) => {
    const besideM = ((spansM[j - 1] ?? 0) + (spansM[j] ?? 0)) / 2;
    const trafficKNm = uls.traffic * whole * (torsion.vehicleKNm + torsion.uniformKNmPerM * besideM);
    const lifts = skewCases(turnings[j]!).map((twist) => {
      const beyondKN = Math.max(0, uls.traffic * twist.pressKN - perFarthestM * trafficKNm);
      const moving =
        perTrafficKNm * trafficKNm + perKNm * uls.traffic * twist.trafficKNm - beyondKN / tubs.count;
      return Math.max(0, moving) + perKNm * twist.lastingKNm;
    });
    return check(
      'bearing-uplift',
      'uplift of one of two bearings under a box',
      Math.max(...lifts) + perKNm * tubs.boxes * torsion.curveAtKNm[j]!,
      (uls.permanentFavourable * permanentKN) / tubs.count,
      'kN',
    );
  });
  return checks.reduce((worst, next) => (next.utilisation > worst.utilisation ? next : worst));
}
