import type { PierShaft } from '../model/index.ts';
import type { Combo } from './combos.ts';
import { resultantAt } from './combos.ts';
import { substructureData } from './data.ts';

/** What a pier shaft has to do. */
export interface ShaftTask {
  /** Height from the top of the foundation to the bearings, m. */
  readonly heightM: number;
  readonly footLevelM: number;
  readonly deckWidthM: number;
  /** True where it stands in water or may be struck: one wall instead of two columns. */
  readonly leaf: boolean;
  /** Loads at bearing level; the shaft's own weight is added here. */
  readonly combos: readonly Combo[];
  /** Largest design vertical load, kN. */
  readonly designVerticalKN: number;
  /** Permanent vertical load, kN: the axial force that helps in bending. */
  readonly permanentKN: number;
}

const thickest = 8;

/**
 * Sizes a pier shaft by axial stress, slenderness and bending at its foot: the thinnest in steps that passes all three.
 * One leaf where struck or in water, two columns with a head elsewhere, a hollow shaft above 30 m. Bars by published ratios.
 * Returns dimensions along (length) and across (width) the road, m, concrete in m3 and bars in kg.
 * A shaft that would be thicker than 8 m is returned at 8 m: its height is far outside the tool's range.
 */
export function sizeShaft(task: ShaftTask): PierShaft {
  const pier = substructureData.pier;
  const hollow = task.heightM > pier.hollowAboveM;
  const leaf = task.leaf || hollow;
  const widthM = Math.max(pier.leastLeafWidthM, pier.leafWidthShare * task.deckWidthM);
  let t = leaf ? pier.leastLeafM : pier.leastColumnM;
  while (t < thickest && !passes(task, t, leaf ? widthM : t, leaf ? 1 : 2, hollow))
    t = round1(t + pier.stepM);
  const columns = leaf ? 1 : 2;
  const head = leaf ? 0 : pier.headDepthM * t * widthM;
  const heightM = leaf ? task.heightM : Math.max(0, task.heightM - pier.headDepthM);
  const area = sectionArea(t, leaf ? widthM : t, hollow) * columns;
  const concreteM3 = area * heightM + head;
  const ratio = hollow ? pier.hollowBarsKgM3 : leaf ? pier.leafBarsKgM3 : pier.columnBarsKgM3;
  const headRatio = substructureData.footing.barsKgM3;
  return {
    lengthM: t,
    widthM,
    columns,
    concreteM3,
    reinforcementKg: area * heightM * ratio + head * headRatio,
  };
}

/** Radius of gyration over thickness: 1 / sqrt(12) of a solid shaft, about 0.4 of a thin hollow wall. */
export const gyration = (hollow: boolean): number => (hollow ? 0.4 : 1 / Math.sqrt(12));

/** Concrete area of one shaft or column, m2. */
export function sectionArea(lengthM: number, widthM: number, hollow: boolean): number {
  if (!hollow) return lengthM * widthM;
  const wall = 2 * substructureData.pier.wallM;
  return lengthM * widthM - Math.max(0, lengthM - wall) * Math.max(0, widthM - wall);
}

function passes(task: ShaftTask, t: number, width: number, columns: number, hollow: boolean): boolean {
  const { pier, concrete, factors } = substructureData;
  const area = sectionArea(t, width, hollow);
  const fcdKPa = concrete.fcdMPa * 1000;
  const ownKN = area * columns * task.heightM * concrete.weightKNm3;
  const axial = (task.designVerticalKN + factors.permanent * ownKN) / (area * columns * fcdKPa);
  if (axial > pier.axialShare) return false;
  if ((pier.effectiveLength * task.heightM) / (gyration(hollow) * t) > pier.slenderness) return false;
  const ratio = hollow ? pier.hollowBarsKgM3 : columns === 1 ? pier.leafBarsKgM3 : pier.columnBarsKgM3;
  const steelM2 = (area * ratio * pier.verticalShare) / steelKgM3;
  const normalKN = Math.max(0, task.permanentKN + ownKN) / columns;
  const along = bendingCapacity(area, t, steelM2, normalKN);
  const across = bendingCapacity(area, width, steelM2, normalKN);
  return task.combos.every((combo) => {
    const foot = resultantAt(combo, task.footLevelM);
    // Two columns joined by a head work as a frame across the road: each bends half the storey height.
    const acrossShare = columns === 2 ? 1 / 4 : 1;
    return (
      (combo.ultimate * foot.momentAlongKNm) / columns <= along &&
      combo.ultimate * foot.momentAcrossKNm * acrossShare <= across
    );
  });
}

/**
 * Bending capacity of a rectangular wall or column, kNm: axial force on the stress block plus half the vertical bars
 * on a lever of 0.8 of the depth. Area in m2, depth in m, steel in m2, axial force in kN.
 */
export function bendingCapacity(areaM2: number, depthM: number, steelM2: number, normalKN: number): number {
  const { fcdMPa, fydMPa } = substructureData.concrete;
  const share = Math.min(1, normalKN / (areaM2 * fcdMPa * 1000));
  return (normalKN * depthM * (1 - share)) / 2 + (steelM2 / 2) * fydMPa * 1000 * 0.8 * depthM;
}

const steelKgM3 = 7850;
const round1 = (value: number): number => Math.round(value * 10) / 10;
