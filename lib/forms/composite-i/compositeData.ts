import { z } from 'zod';
import json from '../../../data/forms/composite-i.json';
import { cited, citedByStandard } from '../common/cited.ts';

const source = z.string().min(1);
const number = z.number();
const fatigueVehicle = z.object({
  axlesKN: z.array(number),
  atM: z.array(number),
  allowance: number,
  loadFactor: number,
  categoryMPa: number,
  gammaM: number,
  source,
});

const schema = z.object({
  twin: z.object({ mostWidthM: number, overhangOverSpacing: number, source }),
  multi: z.object({ mostSpacingM: number, overhangOverSpacing: number, source }),
  leastGirderM: cited,
  flange: z.object({
    leastWidthM: number,
    mostWidthM: number,
    leastMm: number,
    widthOverThickness: number,
    topOverBottomWidth: number,
    leastWidthOverGirder: number,
    leastWidthOverBracing: number,
    source,
  }),
  outstandSlenderness: cited,
  web: z.object({
    leastMm: citedByStandard,
    mostHeightOverThickness: cited,
    mostMm: cited,
    along: z.object({
      fromM: number,
      mostHeightOverThickness: number,
      fromFlangeOverHeight: number,
      widthOverHeight: number,
      slenderness: number,
      source,
    }),
  }),
  haunch: z.object({
    parabolic: z.object({ over: number, power: number }),
    straight: z.object({ over: number, power: number }),
    fromSpanM: number,
    ratios: z.array(number),
    source,
  }),
  plateChangeKg: cited,
  leastPlateLengthM: cited,
  bracing: z.object({ mostM: number, mostOverFlangeWidthAtPiers: number, source }),
  casting: z.object({ constructionKNm2: number, loadFactor: number, source }),
  longTermRatio: cited,
  crackedShare: cited,
  shearLag: z.object({ endSpan: number, innerSpan: number, atSupport: number, eachSide: number, source }),
  barsOverPiers: citedByStandard,
  barsInSpans: citedByStandard,
  shrinkage: z.object({ strain: number, source }),
  temperature: z.object({
    topWarmerK: number,
    topCoolerK: number,
    expansion1PerK: number,
    withTraffic: z.object({ lm1: number, hl93: number }),
    source,
  }),
  bendingShear: z.object({ most: number, source }),
  fatigue: z.object({
    lm1: fatigueVehicle,
    hl93: fatigueVehicle,
    damage: z.object({
      spanStart: number,
      spanFall: number,
      spanLow: number,
      supportLow: number,
      supportRise: number,
      volume: number,
      spanMost: number,
      spanMostShort: number,
      supportMost: number,
      supportMostRise: number,
      source,
    }),
  }),
  launching: z.object({ noseOverSpan: number, noseOverDeckWeight: number, source }),
  post: z.object({ depthOverGirder: number, leverRatio: number, source }),
  crossGirder: z.object({
    depthOverSpacing: number,
    depthOverSpacingAtSupports: number,
    flangeForceShare: number,
    windKNm2: number,
    rolled: z.array(z.object({ name: z.string(), heightM: number, kgPerM: number, modulusCm3: number })),
    source,
  }),
  crossFrame: z.object({
    kgPerM: number,
    kgPerMAtSupports: number,
    mostGirderForFrameM: number,
    channelKgPerM: number,
    source,
  }),
  substringers: z.object({ fromSpanM: number, frameDepthOverGirder: number, strutShare: number, source }),
  stiffeners: z.object({
    widthBaseM: number,
    widthPerHeight: number,
    slenderness: number,
    leastMm: number,
    bearingStressShare: number,
    source,
  }),
  studs: z.object({ resistanceKN: number, kgEach: number, leastPerM2: number, source }),
  weldsAndBoltsShare: cited,
  secondaryPaintM2PerT: cited,
  pieceLengthM: cited,
});

/** Practical figures of composite I-girder decks, `data/forms/composite-i.json`. */
export const compositeData = schema.parse(json);
