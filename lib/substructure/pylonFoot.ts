import type { Design } from '../model/index.ts';
import { substructureData } from './data.ts';
import type { SupportAsk } from './supportAsk.ts';

/**
 * What stands on the foundation of a pylon, from its form's own lines and drawing: weight of one pylon, its height above
 * its foot and the plan of its legs. `roadAboveGroundM` is the height of the road over the ground, m.
 */
export function pylonFoot(design: Design, roadAboveGroundM: number): NonNullable<SupportAsk['pylon']> {
  const count = Math.max(1, design.task.pylons?.length ?? 1);
  const concreteM3 = design.lines.reduce(
    (sum, line) => (line.item === 'pylon-concrete' ? sum + line.quantity : sum),
    0,
  );
  const top = Math.max(0, ...design.elevation.flatMap((shape) => shape.points.map(([, z]) => z)));
  const { legLengthM, legsBeyondDeckM } = substructureData.pylon;
  return {
    weightKN: (concreteM3 / count) * substructureData.concrete.weightKNm3,
    heightM: top + Math.max(0, roadAboveGroundM),
    lengthM: legLengthM,
    widthM: design.task.deck.widthM + legsBeyondDeckM,
  };
}
