import type { Site } from '../model/index.ts';
import { substructureData } from './data.ts';
import { swayOf } from './framedShaft.ts';
import { settingAt } from './setting.ts';
import {
  gyration,
  leastThickness,
  sectionArea,
  shaftInertia,
  shaftPrice,
  shaftShapes,
  shaftWidth,
} from './sizeShaft.ts';

/** Whether a pier at a chainage is a leaf because water reaches it or traffic may strike it. */
export function leafAt(site: Site, chainageM: number): boolean {
  const { floodDepthM, impact } = settingAt(site, chainageM);
  return floodDepthM > 0 || impact !== null;
}

/** Thickness along the road, m, and inertia about the axis across it, m4, of a shaft. */
interface SlenderShaft {
  readonly lengthM: number;
  readonly inertiaM4: number;
}

/** A shaft as thick as its slenderness alone asks for, in the steps in which shafts are sized, of the shape that costs least. */
function slenderShaft(alongSupportsM: number, heightM: number, isLeaf: boolean, framed?: true): SlenderShaft {
  const { pier } = substructureData;
  const leafM = shaftWidth(alongSupportsM);
  const shafts = shaftShapes({ heightM, leaf: isLeaf, ...(framed && { framed }) }).map((shape) => {
    const { columns, hollow } = shape;
    const slender = (pier.effectiveLength * heightM) / (gyration(hollow) * pier.slenderness);
    const steps = Math.ceil(slender / pier.stepM - 1e-9);
    const lengthM = Math.max(leastThickness(shape, framed), steps * pier.stepM);
    const widthM = columns === 1 ? leafM : lengthM;
    return {
      lengthM,
      inertiaM4: columns * shaftInertia(lengthM, widthM, hollow),
      worthM2: shaftPrice(shape) * columns * sectionArea(lengthM, widthM, hollow),
    };
  });
  return shafts.reduce((best, one) => (one.worthM2 < best.worthM2 ? one : best));
}

/** Bending stiffness that cracks and creep leave a shaft, kNm2 (EN 1992-1-1 5.4(3), see the data file). */
export const crackedEI = (inertiaM4: number): number =>
  substructureData.concrete.modulusMPa * 1000 * substructureData.concrete.crackedShare * inertiaM4;

/**
 * Stiffness of a pier against its top moving along the road, kN per m: 3 E I / h^3 of a cantilever from a rigid
 * foundation, height in metres, under a deck so wide along its supports, m. Its shaft is as thick as its slenderness
 * alone asks for; cracks and creep leave it a share of its stiffness.
 */
export function pierStiffness(alongSupportsM: number, heightM: number, isLeaf: boolean): number {
  return (3 * crackedEI(slenderShaft(alongSupportsM, heightM, isLeaf).inertiaM4)) / heightM ** 3;
}

/** The same of a leaf that the deck is cast in with, kN per m: up to 12 E I / h^3. */
export function framedStiffness(alongSupportsM: number, heightM: number, deckTurnKNm: number): number {
  const eiKNm2 = crackedEI(slenderShaft(alongSupportsM, heightM, true, true).inertiaM4);
  return swayOf({ heightM, eiKNm2, deckTurnKNm });
}
