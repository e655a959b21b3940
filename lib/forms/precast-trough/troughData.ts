import { z } from '../../zod.ts';
import json from '../../../data/forms/precast-trough.json';
import { diaphragmData } from '../common/precast/diaphragmData.ts';

const source = z.string().min(1);
const number = z.number();
const relief = z.enum(['debonded', 'draped']);

const schema = z.object({
  layout: z.object({ leastSpacingM: number, mostSpacingM: number, source }),
  trough: z.object({
    leastDepthM: number,
    mostDepthM: number,
    stepM: number,
    bottomWidthM: number,
    bottomM: z.object({ base: number, perDepth: number }),
    webM: z.object({ lm1: number, hl93: number }),
    webSlope: number,
    filletM: number,
    flangeWidthM: number,
    flangeM: number,
    source,
  }),
  relief: z.object({ lm1: relief, hl93: relief, source }),
  diaphragm: diaphragmData,
  handling: z.object({ crossFall: number, impact: number, formworkKNm2: number, source }),
});

/** Practical figures of precast troughs, `data/forms/precast-trough.json`. */
export const troughData = schema.parse(json);
