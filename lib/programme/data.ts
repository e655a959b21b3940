import { z } from '../zod.ts';
import raw from '../../data/programme.json';
import { methodIds } from '../model/index.ts';

const source = z.string().min(1);
const figure = z.object({ value: z.number(), unit: z.string(), source }).transform((f) => f.value);
const range = z
  .strictObject({
    low: z.number().positive(),
    likely: z.number().positive(),
    high: z.number().positive(),
    unit: z.string(),
    source,
  })
  .transform(({ low, likely, high }): Range => ({ low, likely, high }));
const method = z.object({ fixed: range, deckM: range, startsAfter: figure });

const schema = z.object({
  weeksPerMonth: figure,
  crews: figure,
  establish: range,
  demobilise: range,
  footing: range,
  pileCap: range,
  pilesM: range,
  cofferdam: range,
  shaftM: range,
  pierTop: range,
  abutment: range,
  pylonM: range,
  steelLead: range,
  steelT: range,
  spliceRow: range,
  tendonStage: range,
  finishesM2: range,
  finishesFixed: range,
  methods: z.strictObject(
    Object.fromEntries(methodIds.map((id) => [id, method])) as Record<
      (typeof methodIds)[number],
      typeof method
    >,
  ),
});

/** Quick, likely and slow: weeks of an activity, or its output a week (then quick is the larger figure). */
export interface Range {
  readonly low: number;
  readonly likely: number;
  readonly high: number;
}

/** Durations and outputs of `data/programme.json`, checked once. */
export const programmeData = schema.parse(raw);
