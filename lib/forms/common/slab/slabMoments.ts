import { loadStandard } from '../../../actions/index.ts';
import { superimposedOn } from '../superimposed.ts';
import type { SlabCase } from './slabCase.ts';
import { slabData } from './slabData.ts';
import { overhangTraffic, spanTraffic } from './slabTraffic.ts';

/** Characteristic moments of a slab per metre, kNm. */
export interface SlabMoments {
  readonly permanent: number;
  readonly superimposed: number;
  readonly traffic: number;
}

/** Middle of a barrier from the edge of the deck, m. */
const edgeArmM = 0.25;

/** Moments of a deck slab of a thickness, m: between its lines, at the root of its overhang, and over an inner line. */
export function slabMoments(slab: SlabCase): {
  readonly spanMoments: (thicknessM: number) => SlabMoments;
  readonly overhangMoments: (thicknessM: number) => SlabMoments;
  readonly innerRootMoments: (thicknessM: number) => SlabMoments;
  /** Thickness at the edge of the overhang, m. */
  readonly edgeM: number;
} {
  const standard = loadStandard(slab.standard);
  const surfacing = superimposedOn(slab.deck);
  const gamma = standard.unitWeights.concreteKNm3;
  const factor = slab.continuous ? slabData.continuity.value : 1;
  const span = slab.spacingM;
  const trafficSpan = spanTraffic(slab, standard);
  const trafficRoot = slab.overhangM > 0 ? overhangTraffic(slab, standard) : 0;
  const spanMoments = (t: number): SlabMoments => ({
    permanent: (factor * gamma * t * span * span) / 8,
    superimposed: (factor * surfacing.surfacingKNm2 * span * span) / 8,
    traffic: factor * trafficSpan,
  });
  const arm = Math.max(0, slab.overhangM - edgeArmM);
  const edgeM = Math.max(slabData.leastEdgeM.value, slabData.leastThicknessM[slab.standard]);
  return {
    spanMoments,
    overhangMoments: (t) => ({
      permanent: gamma * slab.overhangM ** 2 * (edgeM / 2 + (t - edgeM) / 6),
      superimposed: (surfacing.surfacingKNm2 * slab.overhangM ** 2) / 2 + (surfacing.edgesKNm / 2) * arm,
      traffic: trafficRoot,
    }),
    innerRootMoments: (t) =>
      slab.continuous ? spanMoments(t) : { permanent: 0, superimposed: 0, traffic: 0 },
    edgeM,
  };
}
