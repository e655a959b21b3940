import { z } from 'zod';
import json from '../../../data/forms/concrete-box.json';
import { cited, citedByStandard } from '../common/cited.ts';

const source = z.string().min(1);
const number = z.number();

const schema = z.object({
  layout: z.object({ overhangOverSpacing: number, mostWebSpacingM: number, source }),
  across: z.object({
    mostWebSpacingM: number,
    axisM: number,
    strandsPerTendon: number,
    closestM: number,
    clearOverThickness: number,
    mostThicknessM: number,
    source,
  }),
  webSlope: z.object({ most: number, bottomOverTop: number, source }),
  webLeastM: citedByStandard,
  webLeastLaunchedM: citedByStandard,
  webMostM: cited,
  bottomSlab: z.object({
    leastM: number,
    leastLaunchedM: number,
    clearOverThickness: number,
    mostM: number,
    mostOverDepth: number,
    source,
  }),
  pierZone: z.object({ overSpan: number, source }),
  stepM: cited,
  chamferM: cited,
  leastInnerM: cited,
  diaphragm: z.object({ pierM: number, endM: number, openingM2: number, barsKgM3: number, source }),
  blisters: z.object({ share: number, barsKgM3: number, source }),
  ductCoverM: cited,
  tendons: z.object({ sizes: z.array(z.object({ strands: number, ductM: number })).min(1), source }),
  tendonRows: z.object({ usualPerWeb: number, abreast: number, gapM: number, mostOverDepth: number, source }),
  strandAreaMm2: citedByStandard,
  jacking: citedByStandard,
  losses: z.object({
    frictionPerRad: number,
    wobbleRadPerM: number,
    seatingM: number,
    longTerm: number,
    source,
  }),
  strandSlack: cited,
  prestressSpread: citedByStandard,
  profile: z.object({ inflection: number, lowInEndSpan: number, source }),
  staggering: z.object({
    endOverInner: number,
    leastShare: number,
    runsOnOver: number,
    endsByOver: number,
    alikeFrom: number,
    source,
  }),
  serviceTensionMPa: citedByStandard,
  decompressedAroundDuctM: cited,
  compression: z.object({
    permanent: number,
    total: number,
    transfer: number,
    strengthAtTransfer: number,
    source,
  }),
  gradient: z.object({
    topWarmerK: number,
    topCoolerK: number,
    withTraffic: number,
    expansion1PerK: number,
    source,
  }),
  surfaceBarsM2PerM: cited,
  stirrupRatioMost: cited,
  shear: z.object({
    leverRatio: number,
    designCot: number,
    flattestCot: number,
    ductShare: z.object({ lm1: number, hl93: number }),
    source,
  }),
  launching: z.object({
    noseOverSpan: number,
    noseOverDeckWeight: number,
    noseOverDeckStiffness: number,
    yardOverSpan: number,
    tensionMPa: number,
    strengthShare: number,
    source,
  }),
  deflectionRatio: cited,
  bursting: z.object({ tieShare: number, stressMPa: number, lengthM: number, source }),
  assumedHeightM: cited,
});

/** Practical figures of concrete box decks, `data/forms/concrete-box.json`. */
export const boxData = schema.parse(json);
