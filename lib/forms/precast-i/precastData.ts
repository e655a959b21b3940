import { z } from 'zod';
import json from '../../../data/forms/precast-i.json';
import { cited, citedByStandard } from '../common/cited.ts';

const source = z.string().min(1);
const number = z.number();
const byStandard = z.object({ lm1: number, hl93: number });
const line = z.object({ base: number, perDepth: number });

const schema = z.object({
  layout: z.object({ leastSpacingM: number, mostSpacingM: number, overhangOverSpacing: number, source }),
  bulbTee: z.object({
    leastDepthM: number,
    mostDepthM: number,
    stepM: number,
    webM: number,
    bottomWidthM: line,
    bottomM: number,
    bottomTaper: number,
    topWidthM: line,
    topM: number,
    topTaperM: number,
    source,
  }),
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
    kind: z.object({ lm1: z.enum(['debonded', 'draped']), hl93: z.enum(['debonded', 'draped']) }),
    mostShare: byStandard,
    endOver: byStandard,
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
  diaphragm: z.object({
    pierM: number,
    endM: number,
    withinM: number,
    everyM: number,
    heightShare: number,
    barsKgM3: number,
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

/** Practical figures of precast beam decks, `data/forms/precast-i.json`. */
export const precastData = schema.parse(json);
