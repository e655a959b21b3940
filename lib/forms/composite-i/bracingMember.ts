import { materials } from '../../actions/index.ts';
import type { StandardId } from '../../model/index.ts';
import { compositeData } from './compositeData.ts';

/** Mass of the lightest equal angle that is stocky enough as a strut of a length between its joints, kg/m. */
export function strutKgPerM(lengthM: number, standard: StandardId): number {
  const { slenderness, gyrationOverLeg, legOverThickness } = compositeData.bracingMember;
  const legM = lengthM / slenderness[standard] / gyrationOverLeg;
  const thicknessM = legM / legOverThickness;
  return materials.steelDensityKgM3 * thicknessM * (2 * legM - thicknessM);
}

/** Gusset plate at the end of an equal angle of a mass, kg/m. */
export function gussetKg(angleKgPerM: number): number {
  const { legs, thicknessM } = compositeData.gusset;
  const { legOverThickness: n } = compositeData.bracingMember;
  const { steelDensityKgM3 } = materials;
  const legM = Math.sqrt(angleKgPerM / steelDensityKgM3 / ((2 - 1 / n) / n));
  return steelDensityKgM3 * thicknessM * (legs * legM) ** 2;
}
