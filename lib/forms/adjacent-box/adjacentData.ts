import { z } from '../../zod.ts';
import json from '../../../data/forms/adjacent-box.json';
import { cited } from '../common/cited.ts';
import { diaphragmData } from '../common/precast/diaphragmData.ts';

const source = z.string().min(1);
const number = z.number();
const byStandard = z.object({ lm1: number, hl93: number });
const plates = z.object({
  depthsM: z.array(number).min(1),
  topM: number,
  bottomM: number,
  webM: number,
  chamferM: number,
  source,
});
const relief = z.enum(['debonded', 'draped']);

const schema = z.object({
  layout: z.object({ leastWidthM: number, mostWidthM: byStandard, jointM: number, source }),
  box: z.object({
    lm1: plates,
    hl93: plates,
    key: z.object({
      upperM: number,
      lowerM: number,
      upperRecessM: number,
      lowerRecessM: number,
      source,
    }),
    voidAxisM: cited,
  }),
  topping: z.object({ lm1: number, hl93: number, meshRatio: number, source }),
  relief: z.object({ lm1: relief, hl93: relief, source }),
  diaphragm: diaphragmData,
  endBlockM: cited,
  link: z.object({ ratio: number, lengthOverSpan: number, source }),
  key: z.object({
    cohesion: number,
    friction: number,
    designTensionMPa: number,
    leastTieKNm: number,
    tieStressShare: number,
    mostTieMPa: number,
    touchM: number,
    source,
  }),
});

/** Practical figures of adjacent box beams, `data/forms/adjacent-box.json`. */
export const adjacentData = schema.parse(json);
