import { z } from '../../../zod.ts';
import json from '../../../../data/forms/spliced.json';
import { cited } from '../../common/cited.ts';

const source = z.string().min(1);
const number = z.number();

const schema = z.object({
  beam: z.object({ webM: number, mostDepthM: number, source }),
  splices: z.object({
    atOverSpan: number,
    leastPieces: number,
    lengthM: number,
    barsKgM3: number,
    source,
  }),
  tendons: z.object({ strands: number, most: number, ductM: number, pitchM: number, axisM: number, source }),
  stages: z.object({ firstShares: z.array(number).min(1), tensionMPa: number, source }),
  pierBarsRatio: cited,
  pierSolidOverDepth: cited,
  towers: z.object({ beamsEach: number, source }),
});

/** Practical figures of spliced beams, `data/forms/spliced.json`. */
export const splicedData = schema.parse(json);
