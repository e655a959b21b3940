import type { Material, Shape } from '../../model/index.ts';
import { depthAt, type DepthAlong } from './depthAlong.ts';

/**
 * Face of a deck in elevation: the polygon between `fromDepthM` below the top of the slab and the soffit that
 * follows the depth law. `x` along the unit, m; `z` from the top of the structural slab, m, down negative.
 */
export function deckFace(part: string, material: Material, along: DepthAlong, fromDepthM = 0): Shape {
  const points: [number, number][] = [];
  const n = along.xM.length;
  points.push([along.xM[0]!, -fromDepthM], [along.xM[n - 1]!, -fromDepthM]);
  for (let i = n - 1; i >= 0; i--) points.push([along.xM[i]!, -along.depthM[i]!]);
  return { part, material, kind: 'polygon', points };
}

/** Strip that lies `aboveSoffitM` to `aboveSoffitM + thicknessM` above the soffit: a bottom flange seen from the side. */
export function soffitLine(part: string, material: Material, along: DepthAlong, thicknessM: number): Shape {
  const points = along.xM.map((x, i): [number, number] => [x, -along.depthM[i]! + thicknessM / 2]);
  return { part, material, kind: 'line', points, thicknessM };
}

/** Faint upright at `xM` over the depth from `fromDepthM` to the soffit: stiffener, cross-girder, joint, diaphragm. */
export function upright(
  part: string,
  material: Material,
  along: DepthAlong,
  xM: number,
  fromDepthM: number,
  thicknessM: number,
): Shape {
  const points: [number, number][] = [
    [xM, -fromDepthM],
    [xM, -depthAt(along, xM)],
  ];
  return { part, material, kind: 'line', points, thicknessM, faint: true };
}
