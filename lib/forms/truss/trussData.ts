import { z } from '../../zod.ts';
import raw from '../../../data/forms/truss.json' with { type: 'json' };

const sourced = <T extends z.ZodRawShape>(shape: T) => z.strictObject({ ...shape, source: z.string() });
const figure = sourced({ value: z.number() });
const resistance = sourced({
  yieldFactor: z.number().positive(),
  fractureFactor: z.number().positive(),
  bucklingFactor: z.number().positive(),
  ultimateMPa: z.number().positive(),
});

const schema = z.strictObject({
  note: z.string(),
  heightOverSpan: sourced({ least: z.number(), most: z.number() }),
  leastHeightM: figure,
  panelM: sourced({ least: z.number(), most: z.number() }),
  diagonalSlopeDeg: sourced({ least: z.number(), most: z.number() }),
  planeGapM: figure,
  memberWidth: sourced({ ofSpan: z.number(), leastM: z.number(), mostM: z.number(), stepM: z.number() }),
  memberDepthsM: sourced({ values: z.array(z.number().positive()) }),
  plateMm: sourced({ least: z.number(), most: z.number(), stepMm: z.number() }),
  mostPlateSlenderness: sourced({ box: z.number(), outstand: z.number() }),
  memberSlenderness: sourced({ compression: z.number(), tension: z.number() }),
  bucklingLength: sourced({ inPlane: z.number(), outOfPlane: z.number() }),
  netAreaRatio: figure,
  connectionShare: figure,
  resistance: z.strictObject({ lm1: resistance, hl93: resistance }),
  wind: sourced({
    pressureKNm2: z.number(),
    dragBothPlanes: z.number(),
    vehicleHeightM: z.number(),
    withTraffic: z.number(),
  }),
  bracing: sourced({
    slenderness: z.number(),
    areaOverRadius2: z.number(),
    leastAreaM2: z.number(),
    connectionShare: z.number(),
  }),
  pieceLengthM: figure,
  temporaryTowers: sourced({ freeSpanM: z.number() }),
  assumedHeightM: figure,
});

/** Practical figures of the truss, each with its source in `data/forms/truss.json`. */
export const trussData = schema.parse(raw);
