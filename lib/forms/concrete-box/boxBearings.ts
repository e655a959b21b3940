import { trafficTorsion } from '../../actions/index.ts';
import type { Check, SupportReaction } from '../../model/index.ts';
import { check } from '../common/checks.ts';
import { noTwist, skewCases, type SkewTurning } from '../common/skewTurning.ts';
import { supportUpliftKN } from '../common/supportUplift.ts';
import { curveTorque } from '../composite-box/tubTorsion.ts';
import { boxData } from './boxData.ts';
import type { BoxModel } from './boxModel.ts';

/** What turns a deck over a support or over all of them about its middle, and what holds it. Characteristic. */
export interface Turning {
  /** Lasting reaction, kN, and torque of a curve in plan that goes with it, kNm, outwards positive. */
  readonly lastingKN: number;
  readonly outwardKNm: number;
  /** Torque of eccentric traffic, and of the traffic that may stand there while vehicles push outwards, kNm. */
  readonly trafficKNm: number;
  readonly besidePushKNm: number;
  /** Torque of the vehicles that push outwards on a curve, about the bearings, kNm. */
  readonly pushKNm: number;
  /** Torque of skew ends, either way; none where it is absent. */
  readonly skew?: SkewTurning;
}

/** A deck that stands on two bearings at some or all of its supports. */
export interface OnBearings {
  readonly model: Pick<BoxModel, 'beam' | 'task' | 'standard' | 'standardId' | 'superimposed' | 'traffic'>;
  /** Lasting moments of own weight at the stations, kNm. */
  readonly ownKNm: Float64Array;
  /** Depth of the box and width of its bottom over each support, m. */
  readonly depthM: readonly number[];
  readonly bottomWidthM: readonly number[];
  /** Whether each support is two bearings: not where the deck is cast in. */
  readonly onTwo: readonly boolean[];
  /** Of each support; none where it is absent. */
  readonly skew?: readonly SkewTurning[];
}

/** Distance of the two bearings under the box at a support, m. */
export function bearingsApart(bottomWidthM: number): number {
  return Math.max(0.5 * bottomWidthM, bottomWidthM - boxData.bearings.fromEdgesM);
}

/** Outward push of vehicles on a curve as a share of their weight. */
export function pushShare(standard: BoxModel['standardId'], radiusM: number): number {
  const { mostShare, radiusOfOneM, noneBeyondM } = boxData.centrifugal[standard];
  return radiusM > noneBeyondM ? 0 : Math.min(mostShare, radiusOfOneM / radiusM);
}

/**
 * Lasting torque that a curve in plan brings to each support, kNm, outwards positive: M / R along spans that are held
 * against turning at every support. Tendons are left out, as they are of the reactions.
 * @param momentKNm bending moments at the stations, sagging positive
 */
export function curveAtSupports(
  { beam, task }: Pick<BoxModel, 'beam' | 'task'>,
  momentKNm: Float64Array,
): number[] {
  const at = new Array<number>(task.spansM.length + 1).fill(0);
  task.spansM.forEach((spanM, span) => {
    const from = beam.supportAt[span]!;
    const to = beam.supportAt[span + 1]!;
    const torque = curveTorque(momentKNm.subarray(from, to + 1), spanM / (to - from), task.planRadiusM);
    at[span]! += torque[0]!;
    at[span + 1]! -= torque[torque.length - 1]!;
  });
  return at;
}

/** Turning of each support, vehicles of the heaviest row all over it and uniform loads on half of either span. */
function turningAt(
  { model, ownKNm, depthM, skew }: OnBearings,
  reactions: readonly SupportReaction[],
): Turning[] {
  const { task, standard, standardId, superimposed, traffic } = model;
  const { spansM, deck, planRadiusM } = task;
  const { heightM, withVehicle, withUniform } = boxData.centrifugal[standardId];
  const torsion = trafficTorsion(standardId, deck);
  const heaviestKN = Math.max(
    ...standard.vehicles.map((v) => v.axles.reduce((sum, axle) => sum + axle.loadKN, 0)),
  );
  const outwardKNm = curveAtSupports(
    model,
    ownKNm.map((own, i) => own + superimposed.momentKNm[i]!),
  );
  return reactions.map(({ permanentKN }, j) => {
    const besideM = ((spansM[j - 1] ?? 0) + (spansM[j] ?? 0)) / 2;
    const armM = depthM[j]! + deck.surfacingM + heightM;
    const vehicleKNm = torsion.vehicleTorqueKNm;
    const uniformKNm = (torsion.udlTorqueKNmPerM + torsion.footwayTorqueKNmPerM) * besideM;
    return {
      lastingKN: permanentKN,
      outwardKNm: outwardKNm[j]!,
      trafficKNm: vehicleKNm + uniformKNm,
      besidePushKNm: withVehicle * vehicleKNm + withUniform * uniformKNm,
      pushKNm: pushShare(standardId, planRadiusM) * traffic.load.vehicleFactor * heaviestKN * armM,
      ...(skew ? { skew: skew[j]! } : {}),
    };
  });
}

/** The deck on all its supports at once: one row of vehicles on it. Skew ends turn it opposite ways and add up to nothing. */
function together(all: readonly Turning[], vehicleKNm: number, withVehicle: number): Turning {
  const sum = (pick: (one: Turning) => number): number => all.reduce((total, one) => total + pick(one), 0);
  const spare = all.length - 1;
  return {
    lastingKN: sum((one) => one.lastingKN),
    outwardKNm: sum((one) => one.outwardKNm),
    trafficKNm: sum((one) => one.trafficKNm) - spare * vehicleKNm,
    besidePushKNm: sum((one) => one.besidePushKNm) - spare * withVehicle * vehicleKNm,
    pushKNm: Math.max(...all.map((one) => one.pushKNm)),
  };
}

/**
 * Design moments about the bearings of one side, kNm: what turns the deck over them and what holds it. Traffic that makes
 * a torque presses at least so much that it stands no farther out than the outer lane, and a curve carries what it presses
 * as far out as the lasting load; traffic that twists skew ends presses them, and may be away. The worse of the two sides,
 * with vehicles pushing outwards and without.
 */
export function turnedOver(
  turning: Turning,
  apartM: number,
  farthestM: number,
  factors: { readonly favourable: number; readonly traffic: number },
): { readonly overKNm: number; readonly heldKNm: number } {
  const { lastingKN, outwardKNm, trafficKNm, besidePushKNm, pushKNm } = turning;
  const { skew = noTwist } = turning;
  const offM = lastingKN > 0 ? outwardKNm / lastingKN : 0;
  const cases = [1, -1].flatMap((side) => skewCases(skew).map((twist) => ({ side, twist })));
  const sides = cases.map(({ side, twist }) => {
    const net = (torqueKNm: number): number =>
      torqueKNm +
      twist.trafficKNm +
      Math.max(farthestM > 0 ? torqueKNm / farthestM : 0, twist.pressKN) * (side * offM - apartM / 2);
    const push = side > 0 ? pushKNm : 0;
    const moving = Math.max(0, net(trafficKNm), net(besidePushKNm) + push);
    const lasting = side * outwardKNm;
    return {
      overKNm: factors.favourable * (Math.max(0, lasting) + twist.lastingKNm) + factors.traffic * moving,
      heldKNm: factors.favourable * ((lastingKN * apartM) / 2 + Math.max(0, -lasting)),
    };
  });
  return sides.reduce((worst, next) =>
    next.overKNm * worst.heldKNm > worst.overKNm * next.heldKNm ? next : worst,
  );
}

/**
 * Uplift of one of two bearings at the worst support, and overturning of the deck about the bearings of one side. A support
 * that is pulled up as a whole is held down, so its bearings cannot lift one by one; a deck that is cast in anywhere cannot
 * be overturned about bearings.
 */
export function bearingChecks(on: OnBearings, reactions: readonly SupportReaction[]): Check[] {
  const { model, onTwo } = on;
  const { deck } = model.task;
  const { uls } = model.standard.factors;
  const factors = { favourable: uls.permanentFavourable, traffic: uls.traffic };
  const apartM = on.bottomWidthM.map(bearingsApart);
  const farthestM = (deck.carriagewayM - model.standard.lanes.widthM) / 2 + Math.abs(deck.carriagewayOffsetM);
  const all = turningAt(on, reactions);
  const uplifts = all.flatMap((turning, j) => {
    if (!onTwo[j] || supportUpliftKN(reactions[j]!, uls) > 0) return [];
    const { overKNm, heldKNm } = turnedOver(turning, apartM[j]!, farthestM, factors);
    return check(
      'bearing-uplift',
      'uplift of one of two bearings under the box',
      overKNm / apartM[j]!,
      heldKNm / apartM[j]!,
      'kN',
    );
  });
  const worst = uplifts.toSorted((a, b) => b.utilisation - a.utilisation).slice(0, 1);
  if (!onTwo.every(Boolean)) return worst;
  const { vehicleTorqueKNm } = trafficTorsion(model.standardId, deck);
  const whole = together(all, vehicleTorqueKNm, boxData.centrifugal[model.standardId].withVehicle);
  const { overKNm, heldKNm } = turnedOver(whole, Math.min(...apartM), farthestM, factors);
  return [
    ...worst,
    check('overturning', 'overturning about the bearings of one side', overKNm, heldKNm, 'kNm'),
  ];
}
