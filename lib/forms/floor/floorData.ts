import { z } from '../../zod.ts';
import raw from '../../../data/forms/floor.json' with { type: 'json' };

const figure = z.strictObject({ value: z.number(), source: z.string() });

const schema = z.strictObject({
  note: z.string(),
  stringerSpacingM: z.strictObject({ most: z.number(), source: z.string() }),
  stringerDepthOverSpan: z.strictObject({ value: z.number(), leastM: z.number(), source: z.string() }),
  webSlenderness: figure,
  leastWebMm: figure,
  leastFlangeMm: figure,
  mostFlangeMm: figure,
  flangeWidthM: z.strictObject({
    least: z.number(),
    most: z.number(),
    overDepth: z.number(),
    source: z.string(),
  }),
  castingStress: figure,
  detailShare: figure,
  edgeArmM: figure,
  construction: z.strictObject({ kNm2: z.number(), source: z.string() }),
  modularLong: figure,
  deflectionOverSpan: figure,
});

/** Practical figures of floors between two main planes, each with its source in `data/forms/floor.json`. */
export const floorData = schema.parse(raw);
