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
