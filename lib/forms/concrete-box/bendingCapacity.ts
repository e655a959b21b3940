import { barDesignMPa } from '../common/bars.ts';
import { materials, type Concrete, type LoadStandard } from '../../actions/index.ts';
import type { StandardId } from '../../model/index.ts';
import { boxData } from './boxData.ts';

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

/** What the strength of a section hangs on besides its steel and its face. */
export interface Strengths {
  readonly concrete: Concrete;
  readonly standardId: StandardId;
  readonly standard: LoadStandard;
}

/** Share of the effective depth that the stress block may fill while the steel still yields. */
const deepestBlock = 0.36;

/**
 * Design moment of resistance, kNm: strands and bars at their design strength against a rectangular stress block in the
 * flange and, past it, in the webs. More steel than the block can balance counts for nothing.
 */
export function bendingCapacity(model: Strengths, steel: TensionSteel, face: CompressedFace): number {
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
  return used * (depth - compressionDepth(model, face, used));
}

/** Depth of the middle of the stress block under a compression, m; see `bendingCapacity`. */
export function compressionDepth(
  model: Pick<Strengths, 'concrete'>,
  face: CompressedFace,
  forceKN: number,
): number {
  const fcd = model.concrete.fcdMPa * 1e3;
  const flangeKN = fcd * face.widthM * face.flangeM;
  if (!(forceKN > flangeKN)) return forceKN / (fcd * face.widthM) / 2;
  const inWebs = forceKN - flangeKN;
  const webM = face.flangeM + inWebs / (fcd * face.websM) / 2;
  return (flangeKN * (face.flangeM / 2) + inWebs * webM) / forceKN;
}

/** Depth of the stress block, m, that balances a design moment on a face of given width; the effective depth where none does. */
export function blockDepth(
  model: Pick<Strengths, 'concrete'>,
  momentKNm: number,
  effectiveM: number,
  widthM: number,
): number {
  const rest = effectiveM ** 2 - (2 * momentKNm) / (model.concrete.fcdMPa * 1e3 * widthM);
  return rest > 0 ? effectiveM - Math.sqrt(rest) : effectiveM;
}

/** Design strength of strand at the ultimate limit, MPa: proof stress over its divisor (EN); near its strength (AASHTO). */
export function strandDesignMPa(model: Pick<Strengths, 'standardId' | 'standard'>): number {
  const { proofMPa } = materials.strand[model.standardId];
  return proofMPa / model.standard.resistance.prestress;
}

/** Bars in both faces of a slab that help in bending, m2. */
export function faceBarsM2(widthM: number): number {
  return 2 * boxData.surfaceBarsM2PerM.value * widthM;
}
