import { trafficTorsion, type LoadStandard } from '../../actions/index.ts';
import { bredt, openTorsion, type Wall } from '../../mechanics/index.ts';
import type { UnitTask } from '../../model/index.ts';
import type { TubLayout, TubShape } from './tubShape.ts';

/** Poisson's ratios (EN 1993-1-1 3.2.6, EN 1992-1-1 3.1.3 uncracked, from memory). */
export const steelPoisson = 0.3;
const concretePoisson = 0.2;

/** Torsion of one box by its closed walls. */
export interface TubTorsion {
  readonly enclosedM2: number;
  /** Design torque along the unit, greatest of both signs, kNm, by element. */
  readonly torqueKNm: Float64Array;
  /** Greatest of them, and of what curvature in plan alone makes, kNm. */
  readonly mostKNm: number;
  readonly curveKNm: number;
  /** Torque that curvature brings to each support, kNm. */
  readonly curveAtKNm: readonly number[];
  /** Characteristic torque of the vehicles, kNm, and of uniform loads, kNm/m, on one box. */
  readonly vehicleKNm: number;
  readonly uniformKNmPerM: number;
}

/** Area enclosed by the middle lines: trapezoid from the bottom plate to the middle of the slab, m2. */
export function enclosedArea(shape: TubShape, slabM: number): number {
  return ((shape.topM + shape.bottomM) / 2) * (shape.heightM + slabM / 2);
}

/** Shear modulus of steel over that of concrete, for the ratio of their moduli: Poisson's ratio 0.3 and 0.2. */
export function shearRatioOf(modularRatio: number): number {
  return (modularRatio * (1 + concretePoisson)) / (1 + steelPoisson);
}

/** Walls of the closed box in steel: slab by its shear modulus, two webs, bottom plate. */
function closedWalls(
  shape: TubShape,
  slabM: number,
  shearRatio: number,
  webM: number,
  bottomM: number,
): Wall[] {
  return [
    { lengthM: shape.topM, thicknessM: slabM / shearRatio },
    { lengthM: shape.slant * (shape.heightM + slabM / 2), thicknessM: webM },
    { lengthM: shape.slant * (shape.heightM + slabM / 2), thicknessM: webM },
    { lengthM: shape.bottomM, thicknessM: bottomM },
  ];
}

/** Torsion constants, m4: of the closed box by Bredt, and of the same plates with the box cut open. */
export function tubConstants(
  shape: TubShape,
  slabM: number,
  shearRatio: number,
  webM: number,
  bottomM: number,
): { readonly closedM4: number; readonly openM4: number } {
  const walls = closedWalls(shape, slabM, shearRatio, webM, bottomM);
  const [slab, ...plates] = walls;
  return {
    closedM4: bredt(enclosedArea(shape, slabM), walls),
    openM4: openTorsion(plates) + (slab!.lengthM * slabM ** 3) / 3 / shearRatio,
  };
}

/**
 * Design torques of one box held against turning at every support: eccentric traffic as on a fork-ended span, and M / R
 * of a curve in plan from the design moments of the whole box. On several boxes arms and loads of one shrink with their
 * number; what is left goes to the boxes as vertical load.
 */
export function tubTorsion(
  task: UnitTask,
  standard: LoadStandard,
  layout: TubLayout,
  enclosedM2: number,
  momentKNm: Float64Array,
): TubTorsion {
  const whole = trafficTorsion(task.standard, task.deck);
  const share = 1 / layout.boxes ** 2;
  const vehicleKNm = share * whole.vehicleTorqueKNm;
  const uniformKNmPerM = share * (whole.udlTorqueKNmPerM + whole.footwayTorqueKNmPerM);
  const perSpan = (momentKNm.length - 1) / task.spansM.length;
  const torqueKNm = new Float64Array(momentKNm.length - 1);
  let curveKNm = 0;
  const curveAtKNm = new Array<number>(task.spansM.length + 1).fill(0);
  task.spansM.forEach((spanM, span) => {
    const from = span * perSpan;
    const lengthM = spanM / perSpan;
    const curve = curveTorque(momentKNm.subarray(from, from + perSpan + 1), lengthM, task.planRadiusM);
    curveAtKNm[span]! += Math.abs(curve[0]!);
    curveAtKNm[span + 1]! += Math.abs(curve[perSpan]!);
    for (let e = 0; e < perSpan; e++) {
      // Beyond the end of an element that is nearer to its support.
      const x = Math.min(e, perSpan - 1 - e) * lengthM;
      const rest = (spanM - x) / spanM;
      const traffic = vehicleKNm * rest + (uniformKNmPerM * spanM * rest ** 2) / 2;
      const bent = Math.max(Math.abs(curve[e]!), Math.abs(curve[e + 1]!));
      curveKNm = Math.max(curveKNm, bent);
      torqueKNm[from + e] = standard.factors.uls.traffic * traffic + bent;
    }
  });
  return {
    enclosedM2,
    torqueKNm,
    mostKNm: Math.max(...torqueKNm),
    curveKNm,
    curveAtKNm,
    vehicleKNm,
    uniformKNmPerM,
  };
}

/** Torque of M / R along a span whose ends are held against turning, kNm at its stations. */
export function curveTorque(momentKNm: Float64Array, lengthM: number, radiusM: number): Float64Array {
  const n = momentKNm.length;
  const torque = new Float64Array(n);
  if (!(radiusM < Infinity)) return torque;
  let first = 0;
  for (let i = 1; i < n; i++) {
    const per = ((momentKNm[i - 1]! + momentKNm[i]!) / 2 / radiusM) * lengthM;
    torque[i] = torque[i - 1]! - per;
    first += per * (1 - (i - 0.5) / (n - 1));
  }
  return torque.map((value) => value + first);
}
