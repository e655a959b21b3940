import { bendingCapacity, compressionDepth } from '../concrete-box/bendingCapacity.ts';
import { wallFaces } from './frameBars.ts';
import { weightAboveM } from './frameFeet.ts';
import type { FrameModel } from './frameModel.ts';
import type { SizedFrame } from './sizeFrame.ts';

/** Centroid of the half of evenly spread bars that is in tension, from the pressed edge of a wall: share of its width. */
const PULLED_BARS_AT = 0.75;

/** Bending of a wall in its own plane, as a cantilever off its footing. Its level bars carry the shear many times over. */
interface InPlane {
  readonly demandKNm: number;
  readonly capacityKNm: number;
}

/** Permanent load on the footing of a wall, kN. */
function weightOn({ cases }: FrameModel, wall: number): number {
  const { own, superimposed } = cases[0]!;
  return own.feet[wall]!.verticalKN + superimposed.feet[wall]!.verticalKN;
}

/** What the foot of a wall carries in its own plane with half of its upright bars and its weight with that of the deck, kNm. */
function capacityAtFoot(model: FrameModel, { faces }: SizedFrame, wall: number): number {
  const { name, footM, foot } = model.shape.walls[wall]!;
  const { widthM } = model.task.deck;
  const ids = wallFaces(name);
  const barM2 = faces
    .filter(({ id }) => ids.includes(id))
    .reduce((sum, { nodes, placedM2 }) => sum + placedM2[nodes.indexOf(foot)]!, 0);
  const plane = { widthM: footM, flangeM: widthM, websM: footM };
  const steel = { barM2: barM2 / 2, barDepthM: PULLED_BARS_AT * widthM, strandM2: 0, strandDepthM: 0 };
  const weightKN = weightOn(model, wall);
  return (
    bendingCapacity(model, steel, plane) + weightKN * (widthM / 2 - compressionDepth(model, plane, weightKN))
  );
}

/** A wall struck across the road by a vessel, without what the deck would hold of it. Null where nothing strikes one so. */
export function struckAcross(model: FrameModel, sized: SizedFrame): InPlane | null {
  const { shape, task } = model;
  const demands = shape.walls.flatMap(({ struck, heightM }, w) =>
    struck.map((node, k) => task.strikes![w]![k]!.acrossKN * (heightM + shape.nodes[node]![1])),
  );
  const demandKNm = Math.max(0, ...demands);
  if (!(demandKNm > 0)) return null;
  const middle = shape.walls.findIndex(({ name }) => name === 'middle');
  return { demandKNm, capacityKNm: capacityAtFoot(model, sized, middle) };
}

/** The wall that an earthquake across the road uses most: it takes its own weight and what rests on it. Null without one. */
export function shakenAcross(model: FrameModel, sized: SizedFrame): InPlane | null {
  const { quakeShare = 0 } = model.task;
  if (!(quakeShare > 0)) return null;
  return model.shape.walls
    .map((_, wall): InPlane => {
      const weightKN = weightOn(model, wall);
      return {
        demandKNm: quakeShare * weightKN * weightAboveM(model, wall, weightKN),
        capacityKNm: capacityAtFoot(model, sized, wall),
      };
    })
    .reduce((a, b) => (b.demandKNm * a.capacityKNm > a.demandKNm * b.capacityKNm ? b : a));
}
