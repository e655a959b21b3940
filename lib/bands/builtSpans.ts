import { z } from '../zod.ts';
import raw from '../../data/built-spans.json';
import { formIds, type FormId } from '../model/index.ts';

const percent = z.number().min(0).max(100);
const schema = z.strictObject({
  note: z.string(),
  spans: z.array(
    z.strictObject({
      form: z.enum(formIds),
      recordedAs: z.string(),
      scope: z.string(),
      count: z.int().positive(),
      p5: z.number().positive(),
      p50: z.number().positive(),
      p95: z.number().positive(),
      source: z.string(),
    }),
  ),
  shares: z.strictObject({
    source: z.string(),
    classes: z.array(z.strictObject({ id: z.string(), words: z.string(), form: z.enum(formIds).nullable() })),
    buckets: z.array(
      z.strictObject({
        fromM: z.number().min(0),
        toM: z.number().positive(),
        count: z.int().positive(),
        percent: z.record(z.string(), percent),
        doubted: z.array(z.string()),
      }),
    ),
  }),
});

const data = schema.parse(raw);

/** Main spans of built bridges that the record counts under one form, m. */
export type BuiltSpans = Readonly<(typeof data)['spans'][number]>;

/** A form as the record names it, and ours where they are the same thing or nearly so. */
export type BuiltClass = Readonly<(typeof data)['shares']['classes'][number]>;

/**
 * Bridges whose longest span lies from `fromM` to less than `toM`, and the share of each recorded form among them, per
 * cent. Forms that are absent have none; `doubted` names shares that rest mostly on miscoded records.
 */
export type BuiltBucket = Readonly<(typeof data)['shares']['buckets'][number]>;

const byForm: ReadonlyMap<FormId, BuiltSpans> = new Map(data.spans.map((entry) => [entry.form, entry]));

/** 5, 50 and 95 % of the main spans built of a form, m; null where the record does not tell the form apart. */
export const builtSpans = (form: FormId): BuiltSpans | null => byForm.get(form) ?? null;

/** What was built at which span, by rising span. Source: `nbi-2024`. */
export const builtShares: {
  readonly classes: readonly BuiltClass[];
  readonly buckets: readonly BuiltBucket[];
} = data.shares;

/** The bucket a span falls in; null beyond the last, where too few were built to count. */
export const builtBucket = (spanM: number): BuiltBucket | null =>
  data.shares.buckets.find(({ fromM, toM }) => spanM >= fromM && spanM < toM) ?? null;
