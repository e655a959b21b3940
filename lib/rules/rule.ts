import { z } from '../zod.ts';
import { families, formIds } from '../model/index.ts';

/** Comparators of a condition. Text and yes/no facts take `=` and `!=` only. */
const comparators = ['<', '<=', '>', '>=', '=', '!='] as const;
export type Comparator = (typeof comparators)[number];

/** A fact against a written limit. */
export interface Comparison {
  readonly fact: string;
  readonly is: Comparator;
  readonly value: number | string | boolean;
}

/** A fact against another fact of the same unit, e.g. a piece against what the road to site can take. */
export interface FactComparison {
  readonly fact: string;
  readonly is: Comparator;
  readonly than: string;
}

/** A numeric fact inside a band, both ends included. */
export interface Between {
  readonly fact: string;
  readonly between: readonly [least: number, most: number];
}

/** When a rule applies: a tree of comparisons. */
export type Condition =
  | Comparison
  | FactComparison
  | Between
  | { readonly all: readonly Condition[] }
  | { readonly any: readonly Condition[] }
  | { readonly not: Condition };

const factId = z.string().regex(/^[a-z][A-Za-z0-9]*$/);

const conditionSchema: z.ZodType<Condition> = z.lazy(() =>
  z.union([
    z.strictObject({
      fact: factId,
      is: z.enum(comparators),
      value: z.union([z.number(), z.string(), z.boolean()]),
    }),
    z.strictObject({ fact: factId, is: z.enum(comparators), than: factId }),
    z.strictObject({ fact: factId, between: z.tuple([z.number(), z.number()]) }),
    z.strictObject({ all: z.array(conditionSchema).min(1) }),
    z.strictObject({ any: z.array(conditionSchema).min(1) }),
    z.strictObject({ not: conditionSchema }),
  ]),
);

const askedOfSchema = z.enum(['form', 'arrangement', 'option']);
const effectSchema = z.enum(['out', 'caution', 'in favour', 'to confirm']);

/** What a rule is about; the status of an option reads the subject 'span'. */
export const subjects = [
  'span',
  'depth',
  'layout',
  'alignment',
  'clearance',
  'strength',
  'erection',
  'river',
  'access',
  'wind',
  'money',
] as const;
export type Subject = (typeof subjects)[number];

const exampleSchema = z.strictObject({
  given: z.record(factId, z.union([z.number(), z.string(), z.boolean()])),
  expect: z.enum(['applies', 'does not apply', 'unknown']),
});

/** A rule as it is written in `data/rules`. */
export const ruleSchema = z.strictObject({
  id: z.string().regex(/^[a-z][a-z0-9-]*$/),
  title: z.string().min(1),
  subject: z.enum(subjects),
  /** The points of the pipeline at which it is asked. */
  askedOf: z.array(askedOfSchema).min(1),
  /** Every form, or a list of forms and families. */
  forms: z.union([
    z.literal('all'),
    z.array(z.union([z.enum(formIds), z.strictObject({ family: z.enum(families) })])).min(1),
  ]),
  /** Where the rule has anything to say; left out = wherever it is asked. */
  when: conditionSchema.optional(),
  condition: conditionSchema,
  effect: effectSchema,
  /** `{fact}` prints a fact with its unit, `{limit:fact}` the limit it was held against, `{fact?one|more}` a word by its count. */
  reason: z.string().min(1),
  /** What is said where `when` holds and the condition does not; left out = nothing. */
  otherwise: z.strictObject({ effect: effectSchema, reason: z.string().min(1) }).optional(),
  sources: z.array(z.string()).min(1),
  /** Where sources disagree, or what was left aside. */
  note: z.string().optional(),
  examples: z.array(exampleSchema).min(2),
});
export type Rule = Readonly<z.infer<typeof ruleSchema>>;

/** A fact a rule may ask for, as it is written in `data/rules/facts.json`. */
export const factSchema = z.strictObject({
  id: factId,
  label: z.string().min(1),
  /** What exactly is meant, for whoever supplies it. */
  meaning: z.string().min(1),
  kind: z.enum(['number', 'text', 'boolean']),
  /** Empty for a bare number, a text or a yes/no. */
  unit: z.string(),
  askedOf: z.array(askedOfSchema).min(1),
  /** Numbers only: the finest change worth naming; limits are multiples of it. */
  step: z.number().positive().optional(),
  /** Numbers only: as a number, as one over (depth ratios), or in per cent. */
  shown: z.enum(['plain', 'one-over', 'percent']).optional(),
  /** Numbers only: where it is not given it is the first fact over the second (plus `addedToSecond`). */
  ratioOf: z.tuple([factId, factId]).optional(),
  addedToSecond: z.number().optional(),
  /** Text only: the values it may take. */
  values: z.array(z.string()).optional(),
});
export type Fact = Readonly<z.infer<typeof factSchema>>;

/** A work in the bibliography, as it is written in `data/sources.json`. */
export const sourceSchema = z.strictObject({
  id: z.string().regex(/^[a-z0-9][a-z0-9.-]*$/),
  text: z.string().min(1),
  /** True where the figure was read in the work itself, false where it is from memory. */
  read: z.boolean(),
  /** Not a work: worked out here, or common practice without a source. */
  origin: z.enum(['derived', 'practice']).optional(),
  note: z.string().optional(),
});
export type Source = Readonly<z.infer<typeof sourceSchema>>;
