import { z } from '../../zod.ts';
import json from '../../../data/forms/precast-i.json';
import { diaphragmData } from '../common/precast/diaphragmData.ts';

const source = z.string().min(1);
const number = z.number();
const line = z.object({ base: number, perDepth: number });
const relief = z.enum(['debonded', 'draped']);

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
  relief: z.object({ lm1: relief, hl93: relief, source }),
  diaphragm: diaphragmData,
});

/** Practical figures of precast I-beam decks, `data/forms/precast-i.json`. */
export const precastData = schema.parse(json);
