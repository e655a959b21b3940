import { barDesignMPa } from '../common/bars.ts';
import { concreteShearMPa } from '../slab/slabShear.ts';
import { slabDeckData } from '../slab/slabDeckData.ts';
import { strengthCombinations } from './accidental.ts';
import { worstShear } from './combine.ts';
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
  const { shape, members, memberM } = model;
  const { nodes, sections, knees, walls, legTopM } = shape;
  const all = strengthCombinations(model, traffic, tendons?.parasitic ?? null);
  const { prestress } = model.standard.factors.uls;
  const bars = leastBars(model, faces);
  const parts = { deck: none(), walls: none() };
  for (let e = 0; e < memberM.length; e++) {
    const [start, end] = members[e]!;
    // Where deck and walls go through each other.
    if (walls.some(({ knee }) => start === knee || end === knee)) continue;
    const inDeck = e > knees[0] && e < knees[1];
    const part = inDeck ? parts.deck : parts.walls;
    const section = sections[start]!;
    const next = sections[end]!;
    const widthM = Math.min(section.innerWidthM, section.outerWidthM);
    const depthM = (section.depthM + next.depthM) / 2;
    const effectiveM = depthM - slabDeckData.bars.coverM - 0.02;
    const x = (nodes[start]![0] + nodes[end]![0]) / 2;
    const off = Math.min(...walls.map(({ xM }) => Math.abs(x - xM)));
    const near = inDeck && off - legTopM / 2 < effectiveM;
    const level = (node: number): number => (tendons ? tendons.levelM[node]! - sections[node]!.outerM : 0);
    const steady =
      inDeck && tendons ? (-prestress * tendons.forceKN * (level(end) - level(start))) / memberM[e]! : 0;
    const demandKN = Math.max(...all.map((one) => worstShear(one, e, steady)));
    const steelM2 = (bars[start]! + bars[end]!) / 2 + (inDeck && tendons ? tendons.areaM2 : 0);
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
