import { barDesignMPa } from '../common/bars.ts';
import { concreteShearMPa } from '../slab/slabShear.ts';
import { slabDeckData } from '../slab/slabDeckData.ts';
import { combinations, worstShear } from './combine.ts';
import type { FaceBars } from './frameBars.ts';
import type { FrameModel } from './frameModel.ts';
import type { FrameTendons } from './frameTendons.ts';
import type { FrameTraffic } from './frameTraffic.ts';

/** Shear of one part where it is used most, with its links. */
export interface PartShear {
  readonly demandKN: number;
  /** With the most links that can be placed, or of the concrete alone where that is more, kN. */
  readonly capacityKN: number;
  /** Greatest shear over what the concrete alone carries. */
  readonly aloneUse: number;
  readonly linksM3: number;
}

/** Shear of the deck, from an effective depth off the walls, and of the walls: the concrete alone, or links. */
export function frameShear(
  model: FrameModel,
  traffic: FrameTraffic,
  tendons: FrameTendons | null,
  faces: readonly FaceBars[],
): { readonly deck: PartShear; readonly walls: PartShear } {
  const { shape, memberM } = model;
  const { nodes, sections, knees, spanM, legTopM } = shape;
  const all = combinations(model, traffic, 'ultimate', tendons?.parasitic ?? null);
  const { prestress } = model.standard.factors.uls;
  const bars = leastBars(model, faces);
  const parts = { deck: none(), walls: none() };
  for (let e = 0; e < memberM.length; e++) {
    if (e === knees[0] - 1 || e === knees[0] || e === knees[1] - 1 || e === knees[1]) continue;
    const inDeck = e > knees[0] && e < knees[1];
    const part = inDeck ? parts.deck : parts.walls;
    const section = sections[e]!;
    const next = sections[e + 1]!;
    const widthM = Math.min(section.innerWidthM, section.outerWidthM);
    const depthM = (section.depthM + next.depthM) / 2;
    const effectiveM = depthM - slabDeckData.bars.coverM - 0.02;
    const x = (nodes[e]![0] + nodes[e + 1]![0]) / 2;
    const near = inDeck && Math.min(x, spanM - x) - legTopM / 2 < effectiveM;
    const level = (node: number): number => (tendons ? tendons.levelM[node]! - sections[node]!.outerM : 0);
    const steady =
      inDeck && tendons ? (-prestress * tendons.forceKN * (level(e + 1) - level(e))) / memberM[e]! : 0;
    const demandKN = Math.max(...all.map((one) => worstShear(one, e, steady)));
    const steelM2 = (bars[e]! + bars[e + 1]!) / 2 + (inDeck && tendons ? tendons.areaM2 : 0);
    const alone =
      1e3 *
      widthM *
      effectiveM *
      concreteShearMPa(model, effectiveM, steelM2 / (widthM * effectiveM), {
        axialMPa: inDeck && tendons ? tendons.forceKN / section.areaM2 / 1e3 : 0,
      });
    const { leverRatio, designCot, linkRatioMost, linkRatioLeast } = slabDeckData.shear;
    const perRatioKN = widthM * leverRatio * effectiveM * barDesignMPa(model.standardId) * 1e3 * designCot;
    const capacityKN = Math.max(alone, linkRatioMost * perRatioKN);
    if (!near) {
      part.aloneUse = Math.max(part.aloneUse, demandKN / alone);
      if (demandKN * part.capacityKN > part.demandKN * capacityKN) {
        part.demandKN = demandKN;
        part.capacityKN = capacityKN;
      }
    }
    if (demandKN > alone) {
      const ratio = Math.min(linkRatioMost, Math.max(linkRatioLeast, demandKN / perRatioKN));
      part.linksM3 += ratio * widthM * memberM[e]! * depthM;
    }
  }
  return parts;
}

const none = () => ({ demandKN: 0, capacityKN: 1, aloneUse: 0, linksM3: 0 });

/** Bars of the face that has fewer, at every node, m2: which face is in tension changes along the frame. */
function leastBars({ shape: { nodes } }: FrameModel, faces: readonly FaceBars[]): Float64Array {
  const out = new Float64Array(nodes.length).fill(Infinity);
  for (const face of faces)
    face.nodes.forEach((node, i) => {
      out[node] = Math.min(out[node]!, face.placedM2[i]!);
    });
  return out.map((area) => (area < Infinity ? area : 0));
}
