import { z } from '../../zod.ts';
import json from '../../../data/forms/slab-deck.json';
import { cited } from '../common/cited.ts';

const source = z.string().min(1);
const number = z.number();

const schema = z.object({
  reinforced: z.object({ mostSpanM: number, source }),
  voids: z.object({
    fromDepthM: number,
    aboveM: number,
    belowM: number,
    ribM: number,
    edgeM: number,
    mostDiameterM: number,
    solidOverDepth: number,
    source,
  }),
  wings: z.object({
    fromDepthM: number,
    lengthPerDepth: number,
    mostM: number,
    mostOverWidth: number,
    edgeM: number,
    sideSlope: number,
    source,
  }),
  bars: z.object({
    coverM: number,
    sizesM: z.array(number).min(1),
    closestM: number,
    usualM: number,
    anchorDiameters: number,
    source,
  }),
  crack: z.object({
    widthMm: number,
    sigma: number,
    tensionStiffening: number,
    longTermModulusShare: number,
    source,
  }),
  cornerBars: z.object({ fromSkewDeg: number, reachShare: number, areaShare: number, source }),
  serviceStressShare: cited,
  strip: z.object({ endSpan: number, innerSpan: number, shearSpread: number, source }),
  equivalentStrip: z.object({
    oneM: number,
    onePer: number,
    moreM: number,
    morePer: number,
    longestM: number,
    widestOneM: number,
    widestMoreM: number,
    source,
  }),
  acrossShare: z.object({ perRootM: number, most: number, prestressMPa: number, source }),
  gradient: z.object({
    topWarmerK: number,
    topCoolerK: number,
    withTraffic: number,
    expansion1PerK: number,
    source,
  }),
  tendons: z.object({ usualM: number, closestM: number, source }),
  shear: z.object({
    crd: number,
    crdDivisor: number,
    axial: number,
    least: number,
    mostAxialShare: number,
    mostRatio: number,
    linkRatioMost: number,
    linkRatioLeast: number,
    leverRatio: number,
    designCot: number,
    source,
  }),
  shearAashto: z.object({
    perRootKsi: number,
    reinforced: number,
    prestressed: number,
    sizeTop: number,
    sizeBase: number,
    resistance: number,
    source,
  }),
  punching: z.object({
    plateM: number,
    eccentricity: number,
    unevenShare: number,
    closestM: number,
    usualM: number,
    linkedOverPlain: number,
    linkKgPerKN: number,
    aashtoPerRootKsi: number,
    source,
  }),
  lastingDeflection: z.object({ overSpan: number, creep: number, source }),
  surfaceBarsKgM3: cited,
});

/** Practical figures of slab bridges, `data/forms/slab-deck.json`. */
export const slabDeckData = schema.parse(json);
