import { loadStandard, materials } from '../../actions/index.ts';
import { slabData } from '../common/slab/slabData.ts';
import type { PrecastModel } from '../common/precast/precastModel.ts';
import { adjacentData } from './adjacentData.ts';

/** A grouted key between two boxes and the tie across it, per m of joint. */
export interface ShearKey {
  readonly shearKNm: number;
  readonly tieKNm: number;
  /** What key and tie hold at the greatest tie, kN/m. */
  readonly mostKNm: number;
  /** Strand of the tie along the joint, m2 per m. */
  readonly strandM2PerM: number;
}

/**
 * Shear that the axles of the heaviest vehicle beside a joint send across it (half of each wheel, spread at 45 degrees over a
 * beam width), held by cohesion of the grout and by friction under the tie (EN 1992-1-1 6.2.5, from memory). The tie is at
 * least the usual one.
 */
export function shearKey({ standardId, layout }: PrecastModel): ShearKey {
  const { key, box } = adjacentData;
  const standard = loadStandard(standardId);
  const patchM = slabData.wheelPatchM[standardId].alongM + layout.spacingM;
  const [adjustment = 1] = standard.lanes.adjustment.vehicle;
  const worst = Math.max(
    ...standard.vehicles.map(({ axles }) =>
      Math.max(
        ...axles.flatMap((first, i) =>
          axles.slice(i).map((_, more) => {
            const group = axles.slice(i, i + more + 1);
            const apart = group[group.length - 1]!.atM - first.atM;
            return group.reduce((sum, axle) => sum + axle.loadKN, 0) / (patchM + Math.abs(apart));
          }),
        ),
      ),
    ),
  );
  const shearKNm = (standard.factors.uls.traffic * adjustment * (1 + standard.dynamicAllowance) * worst) / 4;
  const grout = key.cohesion * key.designTensionMPa * 1e3 * box.key.lowerM;
  const most = key.mostTieMPa * 1e3 * key.touchM;
  const tieKNm = Math.min(most, Math.max(key.leastTieKNm, (shearKNm - grout) / key.friction));
  return {
    shearKNm,
    tieKNm,
    mostKNm: grout + key.friction * most,
    strandM2PerM: tieKNm / 1e3 / (key.tieStressShare * materials.strand[standardId].ultimateMPa),
  };
}
