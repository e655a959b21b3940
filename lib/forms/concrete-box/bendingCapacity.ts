import { barDesignMPa } from '../common/bars.ts';
import { materials } from '../../actions/index.ts';
import { boxData } from './boxData.ts';
import type { BoxModel } from './boxModel.ts';

/** Strands of a section in bending: their area, m2, and depth from the compressed face, m. */
export interface TensionSteel {
  readonly strandM2: number;
  readonly strandDepthM: number;
  readonly barM2: number;
  readonly barDepthM: number;
}

/** Compressed face: flange width and thickness, and all webs together, m. */
export interface CompressedFace {
  readonly widthM: number;
  readonly flangeM: number;
  readonly websM: number;
}

/** Share of the effective depth that the stress block may fill while the steel still yields. */
const deepestBlock = 0.36;

/**
 * Design moment of resistance, kNm: strands and bars at their design strength against a rectangular stress block in the
 * flange and, past it, in the webs. More steel than the block can balance counts for nothing.
 */
export function bendingCapacity(model: BoxModel, steel: TensionSteel, face: CompressedFace): number {
  const fcd = model.concrete.fcdMPa * 1e3;
  const prestressed = steel.strandM2 * strandDesignMPa(model) * 1e3;
  const barred = steel.barM2 * barDesignMPa(model.standardId) * 1e3;
  const force = prestressed + barred;
  if (!(force > 0)) return 0;
  const depth = (prestressed * steel.strandDepthM + barred * steel.barDepthM) / force;
  const blockM = Math.max(0, deepestBlock * depth);
  const flange = Math.min(face.flangeM, blockM);
  const most = fcd * (face.widthM * flange + face.websM * (blockM - flange));
  const used = Math.min(force, most);
  const inFlange = Math.min(used, fcd * face.widthM * face.flangeM);
  const inWebs = used - inFlange;
  const flangeArm = inFlange / (fcd * face.widthM) / 2;
  const webArm = face.flangeM + (face.websM > 0 ? inWebs / (fcd * face.websM) / 2 : 0);
  return used * depth - inFlange * flangeArm - inWebs * webArm;
}

/** Design strength of strand at the ultimate limit, MPa: proof stress over its divisor (EN); near its strength (AASHTO). */
export function strandDesignMPa(model: BoxModel): number {
  const { proofMPa } = materials.strand[model.standardId];
  return proofMPa / model.standard.resistance.prestress;
}

/** Bars in both faces of a slab that help in bending, m2. */
export function faceBarsM2(widthM: number): number {
  return 2 * boxData.surfaceBarsM2PerM.value * widthM;
}
