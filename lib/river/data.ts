import { z } from '../zod.ts';
import raw from '../../data/river.json';

const figure = z
  .object({ value: z.number(), unit: z.string(), source: z.string().min(1) })
  .transform((f) => f.value);

const schema = z.strictObject({
  about: z.string(),
  afflux: z.strictObject({ velocityDivisor: figure, restM: figure }),
  lacey: z.strictObject({
    widthFactor: figure,
    depthFactor: figure,
    siltFactor: figure,
    atPier: figure,
    atWall: figure,
  }),
  pierScour: z.strictObject({
    factor: figure,
    noseFactor: figure,
    bedFactor: figure,
    widthPower: figure,
    froudePower: figure,
    slowFroude: figure,
    mostSlow: figure,
    mostFast: figure,
  }),
});

/** Figures of `data/river.json`, checked once; every figure there carries its unit and its source. */
export const riverData = schema.parse(raw);
