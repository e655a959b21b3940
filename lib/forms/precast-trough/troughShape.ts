import type { SectionPoint } from '../../mechanics/index.ts';
import type { StandardId } from '../../model/index.ts';
import { beamShape, type BeamShape } from '../common/precast/beamShape.ts';
import { troughData } from './troughData.ts';

/** Axis of a web under its flange from the middle of a trough, m. */
export function webAxisM(depthM: number, standard: StandardId): number {
  const { bottomWidthM, webSlope, flangeM, webM } = troughData.trough;
  return bottomWidthM / 2 + webSlope * (depthM - flangeM) - webM[standard] / 2;
}

/** Open trough of a depth, m: bottom slab, two leaning webs, a flange on each. */
export function troughShape(depthM: number, standard: StandardId): BeamShape {
  const d = troughData.trough;
  const web = d.webM[standard];
  const bottom = d.bottomM.base + d.bottomM.perDepth * depthM;
  const b = d.bottomWidthM / 2;
  const axis = webAxisM(depthM, standard);
  const under = depthM - d.flangeM;
  const half = d.flangeWidthM / 2;
  const inner = (z: number): number => b + d.webSlope * z - web;
  const right: SectionPoint[] = [
    [b, 0],
    [axis + web / 2, under],
    [axis + half, under],
    [axis + half, depthM],
    [axis - half, depthM],
    [axis - half, under],
    [axis - web / 2, under],
    [inner(bottom + d.filletM), bottom + d.filletM],
    [inner(bottom) - d.filletM, bottom],
  ];
  return beamShape(
    {
      name: `trough ${(depthM * 1000).toFixed(0)}`,
      depthM,
      webM: 2 * web,
      topWidthM: 2 * d.flangeWidthM,
      seats: [
        [-axis - half, -axis + half],
        [axis - half, axis + half],
      ],
      acrossM: 2 * (axis + half),
      bottomWidthM: d.bottomWidthM,
      bottomFlangeM: bottom,
      points: [...right, ...[...right].reverse().map(([y, z]): SectionPoint => [-y, z])],
      holes: [],
    },
    standard,
  );
}

const shapes = new Map<StandardId, readonly BeamShape[]>();

/** Troughs of a market, shallowest first. */
export function troughShapes(standard: StandardId): readonly BeamShape[] {
  const known = shapes.get(standard);
  if (known) return known;
  const { leastDepthM, mostDepthM, stepM } = troughData.trough;
  const steps = Math.round((mostDepthM - leastDepthM) / stepM);
  const made = Array.from({ length: steps + 1 }, (_, i) => troughShape(leastDepthM + i * stepM, standard));
  shapes.set(standard, made);
  return made;
}
