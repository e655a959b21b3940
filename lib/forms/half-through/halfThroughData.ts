import { z } from '../../zod.ts';
import json from '../../../data/forms/half-through.json';
import { cited } from '../common/cited.ts';

const sourced = <T extends z.ZodRawShape>(shape: T) =>
  z.strictObject({ ...shape, source: z.string().min(1) });
const impact = sourced({ forceKN: z.number(), heightM: z.number() });

const schema = z.strictObject({
  note: z.string(),
  reach: sourced({ leastM: z.number(), ofSpan: z.number(), gapM: z.number() }),
  crossSpacingM: sourced({ tried: z.array(z.number()).min(1) }),
  upstandM: cited,
  heights: sourced({ tried: z.number() }),
  flange: sourced({ leastWidthM: z.number(), leastMm: z.number(), widthOverThickness: z.number() }),
  outstandSlenderness: cited,
  web: sourced({
    leastMm: z.number(),
    mostMm: z.number(),
    mostHeightOverThickness: z.number(),
    shearShare: z.number(),
  }),
  plateChangeKg: cited,
  leastPlateLengthM: cited,
  posts: sourced({
    sections: z
      .array(
        z.strictObject({
          depthM: z.number(),
          webMm: z.number(),
          flangeWidthM: z.number(),
          flangeMm: z.number(),
        }),
      )
      .min(1),
  }),
  endFrames: sourced({ most: z.number(), share: z.number() }),
  imperfection: sourced({ short: z.number(), long: z.number(), shortUpTo: z.number() }),
  windKNm2: cited,
  impact: z.strictObject({ lm1: impact, hl93: impact }),
  kerb: sourced({ heightM: z.number(), widthM: z.number(), barsKgM3: z.number() }),
  bearingStressShare: cited,
  detailShare: cited,
  launching: sourced({ noseOverSpan: z.number(), noseOverDeckWeight: z.number() }),
  pieceLengthM: cited,
});

/** Practical figures of half-through decks, `data/forms/half-through.json`. */
export const halfThroughData = schema.parse(json);

/** One T-shaped post. */
export type PostSection = (typeof halfThroughData.posts.sections)[number];
