import { z } from '../../zod.ts';
import json from '../../../data/forms/portal-frame.json';

const source = z.string().min(1);
const number = z.number();
const factors = z.object({
  temperature: number,
  shrinkage: number,
  braking: number,
  vehicleWithBraking: number,
  uniformWithBraking: number,
  source,
});

const schema = z.object({
  note: source,
  reinforced: z.object({ mostSpanM: number, source }),
  shape: z.object({
    kneeOverMidspan: number,
    haunchShare: number,
    legOverKnee: number,
    footOverTop: number,
    leastLegM: number,
    stepM: number,
    source,
  }),
  leg: z.object({
    belowGroundM: number,
    leastOverSpan: number,
    leastM: number,
    assumedClearM: number,
    source,
  }),
  foot: z.object({
    lengthOverHeight: number,
    leastLengthM: number,
    stiffKNm3: number,
    softKNm3: number,
    source,
  }),
  earth: z.object({
    fillKNm3: number,
    restPressure: number,
    activePressure: number,
    passivePressure: number,
    surchargeKPa: number,
    softFactor: number,
    stiffFactor: number,
    power: number,
    movedAtMiddle: number,
    source,
  }),
  temperature: z.object({
    expansion1PerK: number,
    warmerK: number,
    colderK: number,
    topWarmerK: number,
    topCoolerK: number,
    source,
  }),
  shrinkage: z.object({ strain: number, relaxed: number, source }),
  cracked: z.object({ share: number, source }),
  factors: z.object({ lm1: factors, hl93: factors }),
  service: z.object({ frequentTemperature: number, characteristicTemperature: number, source }),
  tendons: z.object({ kneeTopM: number, lowFromSoffitM: number, inflection: number, source }),
  wallAcross: z.object({ ratio: number, source }),
  bars: z.object({ layers: number, source }),
});

/** Practical figures of portal frames, `data/forms/portal-frame.json`. */
export const portalData = schema.parse(json);
