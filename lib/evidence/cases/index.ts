import type { EvidenceCase } from '../caseInputs.ts';
import { precastBeam } from './precastBeam.ts';
import { sizedForm } from './sizedForm.ts';
import { continuousBeam, influenceOrdinates, patternedBeam } from './beams.ts';
import { parabola, stayModulus, stayVolumes } from './cables.ts';
import { distributionFactors, girderMoments, lm1OnGirder } from './girderDecks.ts';
import {
  girderWithSlab,
  hollowSection,
  profiledGirder,
  rolledSection,
  stackedPlates,
  threePlates,
} from './sections.ts';
import {
  axlesOnSimpleSpan,
  hl93SimpleSpan,
  hl93TwoSpans,
  lm1SimpleSpan,
  truckOrLane,
} from './simpleSpans.ts';

/** Calculations that evidence rows name. */
export const evidenceCases: Readonly<Record<string, EvidenceCase>> = {
  'continuous beam': continuousBeam,
  'patterned beam': patternedBeam,
  'influence ordinates': influenceOrdinates,
  'axles on a simple span': axlesOnSimpleSpan,
  'truck or lane': truckOrLane,
  'HL-93 simple span': hl93SimpleSpan,
  'HL-93 two spans': hl93TwoSpans,
  'LM1 simple span': lm1SimpleSpan,
  'LM1 on a girder': lm1OnGirder,
  'distribution factors': distributionFactors,
  'girder moments': girderMoments,
  'profiled girder': profiledGirder,
  'girder with slab': girderWithSlab,
  'stacked plates': stackedPlates,
  'rolled section': rolledSection,
  'three plates': threePlates,
  'hollow section': hollowSection,
  parabola,
  'stay modulus': stayModulus,
  'stay volumes': stayVolumes,
  'precast beam as laid out': precastBeam,
  'sized form': sizedForm,
};
