import type { Brief, Clearance, Obstacle, ObstacleKind } from '../../../lib/index.ts';

/** Whether an obstacle has an envelope to be kept clear, and who says so. */
export type ClearanceState = 'none' | 'preset' | 'confirmed';

/** Headroom taken until the authority has answered, m. Common practice, no source; always a preset to be confirmed. */
const presetHeadroomM: Readonly<Record<ObstacleKind, number>> = {
  river: 4,
  railway: 6,
  road: 5,
  bank: 2.5,
  utility: 2,
  heritage: 3,
};

export const clearanceState = ({ clearance }: Obstacle): ClearanceState =>
  clearance === null ? 'none' : clearance.confirmed ? 'confirmed' : 'preset';

/** Level an envelope is measured from until somebody types it: ordinary water, else the highest ground it lies over, m. */
function presetDatum({ crossing, waters }: Brief, { fromM, toM }: Obstacle): number {
  const water = waters.find((one) => one.fromM < toM && one.toM > fromM);
  if (water !== undefined) return water.levelM;
  const middleM = (fromM + toM) / 2;
  const inside = crossing.ground.filter(({ chainageM }) => chainageM >= fromM && chainageM <= toM);
  if (inside.length > 0) return Math.max(...inside.map(({ levelM }) => levelM));
  const away = (point: { readonly chainageM: number }): number => Math.abs(point.chainageM - middleM);
  return crossing.ground.reduce((best, point) => (away(point) < away(best) ? point : best)).levelM;
}

/** An obstacle with its envelope taken away, confirmed or not; one that had none is given a preset over its stretch. */
export function withClearanceState(brief: Brief, obstacle: Obstacle, state: ClearanceState): Obstacle {
  if (state === 'none') return { ...obstacle, clearance: null };
  const { fromM, toM } = obstacle;
  const given: Omit<Clearance, 'confirmed'> = obstacle.clearance ?? {
    fromM,
    toM,
    datumLevelM: presetDatum(brief, obstacle),
    headroomM: presetHeadroomM[obstacle.kind],
  };
  return { ...obstacle, clearance: { ...given, confirmed: state === 'confirmed' } };
}
