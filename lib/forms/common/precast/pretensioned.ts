import { z } from '../../../zod.ts';
import json from '../../../../data/forms/pretensioned.json';
import { cited, citedByStandard } from '../cited.ts';

const source = z.string().min(1);
const number = z.number();
const byStandard = z.object({ lm1: number, hl93: number });
const relief = z.object({ mostShare: number, endOver: number });

const schema = z.object({
  haunchM: cited,
  wearingM: citedByStandard,
  strand: z.object({
    areaMm2: byStandard,
    pitchM: byStandard,
    axisM: byStandard,
    mostHeightShare: number,
    mostTop: number,
    jacking: byStandard,
    source,
  }),
  relief: z.object({
    debonded: relief,
    draped: relief,
    drapedTopM: number,
    transferDiameters: number,
    diameterM: byStandard,
    source,
  }),
  release: z.object({
    strength: byStandard,
    compression: byStandard,
    tensionRootMPa: byStandard,
    source,
  }),
  service: z.object({ tensionMPa: byStandard, compression: byStandard, spread: byStandard, source }),
  longTerm: z.object({
    creep: number,
    shrinkage: number,
    relaxation1000: number,
    humidity: number,
    relaxationMPa: number,
    source,
  }),
  temperature: z.object({
    topWarmerK: number,
    topCoolerK: number,
    expansion1PerK: number,
    withTraffic: byStandard,
    source,
  }),
  ultimate: z.object({ deepestBlock: number, stressFallK: number, source }),
  continuity: z.object({
    barAxisM: number,
    mostRatio: number,
    lengthOverSpan: number,
    crackingTimes: number,
    connectionLengthM: number,
    source,
  }),
  beamBars: z.object({ alongKgM3: number, leastLinksM2PerM: number, source }),
  haul: z.object({ lengthM: number, massT: number, source }),
  lifting: z.object({
    sweepOverLength: number,
    loopErrorM: number,
    camberOverLength: number,
    overhangShare: number,
    impact: number,
    leastSafety: number,
    source,
  }),
  proxy: z.object({ strandKgPerM3: number, source }),
});

/** Practical figures of pretensioned beams under a slab, `data/forms/pretensioned.json`. */
export const pretensioned = schema.parse(json);
