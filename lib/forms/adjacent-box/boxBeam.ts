import type { SectionPoint } from '../../mechanics/index.ts';
import type { StandardId } from '../../model/index.ts';
import { beamShape, type BeamShape } from '../common/precast/beamShape.ts';
import { adjacentData } from './adjacentData.ts';

/** Box beam of a width and depth, m: plates and chamfers of its market, a key in each side. */
export function boxBeam(widthM: number, depthM: number, standard: StandardId): BeamShape {
  const { key, voidAxisM } = adjacentData.box;
  const { topM, bottomM, webM, chamferM: c } = adjacentData.box[standard];
  const b = widthM / 2;
  const mirrored = (right: readonly SectionPoint[]): SectionPoint[] => [
    ...right,
    ...[...right].reverse().map(([y, z]): SectionPoint => [-y, z]),
  ];
  const inner = b - webM;
  const up = depthM - topM;
  return beamShape(
    {
      name: `box ${(widthM * 1000).toFixed(0)} x ${(depthM * 1000).toFixed(0)}`,
      depthM,
      webM: 2 * webM,
      topWidthM: widthM,
      seats: [[-b, b]],
      acrossM: widthM,
      bottomWidthM: widthM,
      bottomFlangeM: bottomM,
      points: mirrored([
        [b, 0],
        [b, depthM - key.lowerM],
        [b - key.lowerRecessM, depthM - key.lowerM],
        [b - key.lowerRecessM, depthM - key.upperM],
        [b - key.upperRecessM, depthM - key.upperM],
        [b - key.upperRecessM, depthM],
      ]),
      holes: [
        mirrored([
          [inner - c, bottomM],
          [inner, bottomM + c],
          [inner, up - c],
          [inner - c, up],
        ]),
      ],
      voidAxisM: voidAxisM.value,
    },
    standard,
  );
}

/** Area of the void of a box beam, m2. */
export function voidM2({ holes }: BeamShape): number {
  const [hole = []] = holes;
  return Math.abs(
    hole.reduce((sum, [y0, z0], i) => {
      const [y1, z1] = hole[(i + 1) % hole.length]!;
      return sum + (y0 * z1 - y1 * z0) / 2;
    }, 0),
  );
}
