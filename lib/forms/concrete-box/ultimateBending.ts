import { bendingCapacity, faceBarsM2, type TensionSteel } from './bendingCapacity.ts';
import { boxData } from './boxData.ts';
import type { OwnWeight } from './boxLoads.ts';
import type { BoxModel } from './boxModel.ts';
import type { SectionsAlong } from './sectionsAlong.ts';
import { betweenZeros, workingWidthM } from './shearLag.ts';
import { ultimateMoments } from './ultimateMoments.ts';

/** Ultimate bending where it is used most. */
export interface BendingUse {
  readonly use: number;
  readonly demandKNm: number;
  readonly capacityKNm: number;
  readonly station: number;
}

/** Tendons as ultimate bending sees them: areas m2 and draped force kN of the heaviest span; level, parasitic moment of unit force and share of the strands along the deck. */
export interface UltimateSteel {
  readonly draped: number;
  readonly forceKN: number;
  readonly straight: number;
  readonly depthM: Float64Array;
  readonly parasiticM: Float64Array;
  readonly share: Float64Array;
}

/** Ultimate bending at every station, parasitic moment of the tendons included. */
export function ultimateBending(
  model: BoxModel,
  sections: SectionsAlong,
  own: OwnWeight,
  steel: UltimateSteel,
): [sag: BendingUse, hog: BendingUse] {
  const { down, up } = ultimateMoments(model, own);
  const { layout, task } = model;
  const widthM = workingWidthM(layout, betweenZeros(task.spansM).inSpanM);
  const top = { widthM, flangeM: layout.slab.meanM };
  const bars = [faceBarsM2(sections.span.bottomWidthM), faceBarsM2(task.deck.widthM)] as const;
  const nil: BendingUse = { use: 0, demandKNm: 0, capacityKNm: 1, station: 0 };
  let sag = nil;
  let hog = nil;
  for (let i = 0; i < sections.areaM2.length; i++) {
    const parasitic = model.standard.factors.uls.prestress * steel.forceKN * steel.parasiticM[i]!;
    const sagging = down[i]! + parasitic;
    const hogging = up[i]! - parasitic;
    const websM = layout.webs * sections.webM[i]!;
    const slabs = task.depthM - boxData.ductCoverM.value;
    const tension = (fromFaceM: number, barM2: number) =>
      mixed(steel.draped * steel.share[i]!, steel.straight, fromFaceM, slabs, barM2, task.depthM);
    if (sagging > 0) {
      const capacityKNm = bendingCapacity(model, tension(steel.depthM[i]!, bars[0]), { ...top, websM });
      sag = worse(sag, sagging, capacityKNm, i);
    }
    if (hogging > 0) {
      const capacityKNm = bendingCapacity(model, tension(task.depthM - steel.depthM[i]!, bars[1]), {
        widthM: sections.span.bottomWidthM,
        flangeM: sections.bottomM[i]!,
        websM,
      });
      hog = worse(hog, hogging, capacityKNm, i);
    }
  }
  return [sag, hog];
}

function worse(known: BendingUse, demandKNm: number, capacityKNm: number, station: number): BendingUse {
  const use = capacityKNm > 0 ? demandKNm / capacityKNm : Infinity;
  return use > known.use ? { use, demandKNm, capacityKNm, station } : known;
}

/** Draped strands at their level, half of the centred ones near the tension face, bars in that face. */
function mixed(
  draped: number,
  straight: number,
  drapedDepthM: number,
  farM: number,
  barM2: number,
  depthM: number,
): TensionSteel {
  const far = straight / 2;
  const strandM2 = draped + far;
  return {
    strandM2,
    strandDepthM: strandM2 > 0 ? (draped * drapedDepthM + far * farM) / strandM2 : depthM,
    barM2,
    barDepthM: depthM - boxData.ductCoverM.value / 2,
  };
}
