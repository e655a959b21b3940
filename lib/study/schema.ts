import { z } from '../zod.ts';
import {
  approachSidesKinds,
  formIds,
  gasMains,
  groundClassIds,
  methodIds,
  obstacleKinds,
  siteClasses,
  standardIds,
  stripKinds,
  tieIns,
  type FormId,
} from '../model/index.ts';
import { inOrder } from './assumed.ts';
import { fillGround } from './fillGround.ts';
import { asPriceDate, priceDateWords } from './priceDate.ts';

/** Version of the study file written by this tool. */
export const studyVersion = 2;

/** Largest chainage or level taken seriously, m: beyond it a figure is a slip of the keyboard. */
const FAR_M = 1e7;

const unknown = z.literal('unknown');
const text = z.string().max(20_000);
const name = z.string().min(1).max(500);
const chainage = z.number().min(-FAR_M).max(FAR_M);
const level = z.number().min(-12_000).max(9_000);
const width = z.number().positive().max(200);
const money = z.number().positive().max(1e13);
const optionNumber = z.int().min(1).max(100_000);
const form = z.enum(formIds);
const forms = z.array(form).max(formIds.length);
const orUnknown = <T extends z.ZodType>(schema: T) => z.union([unknown, schema]);

const crossing = z.strictObject({
  startM: chainage,
  endM: chainage,
  startLatestM: orUnknown(chainage).exactOptional(),
  endEarliestM: orUnknown(chainage).exactOptional(),
  ground: z
    .array(z.strictObject({ chainageM: chainage, levelM: level }))
    .min(2)
    .max(20_000),
  planRadiusM: z.union([unknown, z.literal('straight'), z.number().min(10).max(1e6)]).default('unknown'),
  skewDeg: orUnknown(z.number().min(-75).max(75)).default('unknown'),
  groundAccelerationG: orUnknown(z.number().min(0).max(2)).default('unknown'),
  siteClass: orUnknown(z.enum(siteClasses)).default('unknown'),
});

const road = z.strictObject({
  startLevelM: level,
  endLevelM: level,
  fixedEnd: z.enum(['start', 'end', 'both', 'none']).default('both'),
  mayRiseM: z.number().min(0).max(200).default(0),
  maxGradient: z.number().positive().max(0.25).default(0.06),
  fillSideSlope: z.number().min(0).max(10).default(2),
  designSpeedKmh: orUnknown(z.number().min(10).max(200)).default('unknown'),
  crestRadiusM: orUnknown(z.number().min(0).max(1e6)).default('unknown'),
  sagRadiusM: orUnknown(z.number().min(0).max(1e6)).default('unknown'),
  startTieIn: z.enum(tieIns).default('moves'),
  endTieIn: z.enum(tieIns).default('moves'),
  startApproachM: orUnknown(z.number().positive().max(5000)).default('unknown'),
  endApproachM: orUnknown(z.number().positive().max(5000)).default('unknown'),
  startGradient: orUnknown(z.number().min(-0.25).max(0.25)).exactOptional(),
  endGradient: orUnknown(z.number().min(-0.25).max(0.25)).exactOptional(),
  approachSides: z.enum(approachSidesKinds).default('slopes'),
});

const strip = z
  .strictObject({ kind: z.enum(stripKinds), widthM: width, ultimateWidthM: width.optional() })
  .transform((given) => ({ ...given, ultimateWidthM: given.ultimateWidthM ?? given.widthM }));

const clearance = z.strictObject({
  fromM: chainage,
  toM: chainage,
  datumLevelM: level,
  headroomM: z.number().positive().max(200),
  confirmed: z.boolean().default(false),
});

const obstacle = z.strictObject({
  kind: z.enum(obstacleKinds),
  name,
  fromM: chainage,
  toM: chainage,
  supports: z.enum(['hard', 'soft', 'none']),
  pierPremium: orUnknown(money).default('unknown'),
  clearance: clearance.nullable().default(null),
});

const water = z
  .strictObject({
    name,
    fromM: chainage,
    toM: chainage,
    levelM: level,
    floodLevelM: orUnknown(level).default('unknown'),
    floodReturnYears: orUnknown(z.number().positive().max(100_000)).default('unknown'),
    freeboardM: z.number().min(0).max(50).default(1),
    floodFromM: chainage.optional(),
    floodToM: chainage.optional(),
    flowM3s: orUnknown(z.number().positive().max(1e6)).default('unknown'),
    velocityMs: orUnknown(z.number().positive().max(20)).default('unknown'),
    allowedAffluxM: orUnknown(z.number().min(0).max(10)).default('unknown'),
    grainMm: orUnknown(z.number().positive().max(1000)).default('unknown'),
    siltFactor: orUnknown(z.number().positive().max(50)).default('unknown'),
    vesselDwtT: orUnknown(z.number().min(0).max(1e6)).default('unknown'),
    vesselSpeedMs: orUnknown(z.number().positive().max(20)).default('unknown'),
  })
  .transform((given) => ({
    ...given,
    floodFromM: given.floodFromM ?? given.fromM,
    floodToM: given.floodToM ?? given.toM,
  }));

const groundOdds = z.strictObject({
  ground: z.enum(groundClassIds),
  bearingLevelM: level.optional(),
  bearingDepthM: z.number().min(0).max(500).optional(),
  odds: z.number().min(0).max(1),
});

const groundStretch = z.strictObject({
  fromM: chainage,
  toM: chainage,
  known: z.boolean().optional(),
  classes: orUnknown(z.array(groundOdds).min(1).max(20)),
});

const access = z.strictObject({
  haulLengthM: orUnknown(z.number().positive().max(1000)).default('unknown'),
  haulMassT: orUnknown(z.number().positive().max(1e5)).default('unknown'),
  crane: orUnknown(z.boolean()).default('unknown'),
  barge: orUnknown(z.boolean()).default('unknown'),
  craneMomentTm: orUnknown(z.number().positive().max(1e6)).default('unknown'),
  launchYardM: orUnknown(z.number().min(0).max(10_000)).default('unknown'),
});

const demands = z.strictObject({
  lanesKept: z.int().min(0).max(8).default(0),
  gasMain: z.enum(gasMains).default('none'),
});

const budget = z.strictObject({
  amount: money,
  priceDate: orUnknown(name.refine((words) => asPriceDate(words) === words, priceDateWords)),
  // Room for what version 1 wrote as the price date, which the step to version 2 puts here.
  includes: z.string().max(21_000).default(''),
});

const brief = z
  .strictObject({
    crossing,
    road,
    deck: z.array(strip).min(1).max(100),
    surfacingM: z.number().min(0).max(1).default(0.09),
    loading: z.enum(standardIds).default('lm1'),
    obstacles: z.array(obstacle).max(1000).default([]),
    waters: z.array(water).max(100).default([]),
    groundStretches: orUnknown(z.array(groundStretch).min(1).max(1000)).default('unknown'),
    access: access.prefault({}),
    demands: demands.prefault({}),
    budget: orUnknown(budget).default('unknown'),
  })
  .transform((given) => ({ ...given, groundStretches: fillGround(given.groundStretches, given.crossing) }));

const rate = z.number().min(0).max(1e9);
const books = z.strictObject({
  currency: z.string().min(1).max(10).default('EUR'),
  ratePack: name.default('demo-2026'),
  rates: z
    .array(z.strictObject({ item: name, p10: rate, p50: rate, p90: rate, reason: name }))
    .max(1000)
    .default([]),
  draws: z.int().min(100).max(1_000_000).default(10_000),
  seed: z.int().min(0).max(0xffff_ffff).default(20_260_101),
  unseparated: z.tuple([z.number().min(0).max(0.5), z.number().min(0.5).max(1)]).default([0.2, 0.8]),
});

const unit = z.strictObject({
  form,
  role: z.enum(['main', 'approach']),
  supportsM: z.array(chainage).min(2).max(5000),
  pylons: z.array(z.int().min(0).max(4999)).min(1).max(20).exactOptional(),
});

/** A way of making a unit that the search tries. */
const made = orUnknown(z.literal(true)).exactOptional();
/** One figure for each span of the main unit. */
const bySpan = z.array(z.number().min(0).max(1e5)).min(1).max(5000);
/**
 * How a unit is asked to be made: absent = without, 'unknown' = whichever costs least. What a form makes of it on its
 * spans is said where it is worked out; here only what can be no figure is refused.
 */
const variant = z.strictObject({
  haunchRatio: orUnknown(z.number().gt(1).max(4)).exactOptional(),
  substringers: made,
  transverse: made,
  struts: made,
  ribs: made,
  squareEnds: made,
  boxWidthM: width.exactOptional(),
  strengthMPa: z.number().positive().max(500).exactOptional(),
  light: z
    .strictObject({ densityKgM3: z.number().positive().max(1e4), middleM: bySpan.exactOptional() })
    .exactOptional(),
  ballastKNm: bySpan.exactOptional(),
  castInPiers: orUnknown(z.int().min(1).max(4998)).exactOptional(),
});

const options = z.strictObject({
  forms: forms.default([]),
  workOutAnyway: forms.default([] as FormId[]),
  register: z
    .array(
      z.strictObject({
        number: optionNumber,
        form,
        method: z.enum(methodIds),
        supports: z.int().min(2).max(5000),
      }),
    )
    .max(10_000)
    .default([]),
  kept: z
    .array(
      z.strictObject({
        number: optionNumber,
        form,
        method: z.enum(methodIds),
        units: z.array(unit).min(1).max(100),
        depthM: z.number().positive().max(100).nullable().default(null),
        variant: variant.exactOptional(),
        locked: z.array(z.int().min(1).max(4999)).max(5000).exactOptional(),
      }),
    )
    .max(1000)
    .default([]),
  reference: optionNumber.nullable().default(null),
});

const priorities = z.strictObject({
  weights: z.record(z.string().max(200), z.number().min(0).max(1e6)).default({}),
});
const note = z.strictObject({ about: name, text, author: text.default(''), date: text.default('') });
const issued = z.strictObject({
  date: text,
  fingerprint: z.string().regex(/^[0-9a-f]{64}$/u),
  currency: z.string().min(1).max(10),
  leader: optionNumber.nullable(),
  options: z
    .array(
      z.strictObject({
        number: optionNumber,
        form,
        status: z.enum(['in', 'possible', 'out']),
        p10: z.number(),
        p50: z.number(),
        p90: z.number(),
      }),
    )
    .min(1)
    .max(1000),
});
const decision = z.strictObject({
  option: optionNumber,
  reasons: z.array(text).max(1000).default([]),
  dropped: z
    .array(z.strictObject({ option: optionNumber, reason: text }))
    .max(1000)
    .default([]),
  questions: z.array(text).max(1000).default([]),
  dissent: text.default(''),
  author: text.default(''),
  date: text.default(''),
  issued: issued.nullable().default(null),
});

/** The study file, version `studyVersion`: strict keys, every default applied once; its output is `Study`. */
export const studySchema = z.strictObject({
  format: z.literal('spanledger-study'),
  version: z.literal(studyVersion),
  title: name,
  reference: text.default(''),
  notice: text.default(''),
  brief,
  assumed: z.array(z.string().max(200)).max(100_000).default([]).transform(inOrder),
  books: books.prefault({}),
  options: options.prefault({}),
  priorities: priorities.prefault({}),
  notes: z.array(note).max(10_000).default([]),
  decision: decision.nullable().default(null),
});
