import { z } from '../zod.ts';

/**
 * What a comparison can say of the tool: `mechanics` are forces, stresses, loads and section properties of theory, of a
 * reference table or of a worked example; `designed` and `built` are quantities or leading dimensions of a designed
 * example and of a built bridge; `law` is a rule of thumb, from memory or of our own working, only reported against.
 */
export const evidenceKinds = ['mechanics', 'designed', 'built', 'law'] as const;
export type EvidenceKind = (typeof evidenceKinds)[number];

const scalar = z.union([z.number(), z.string(), z.boolean()]);

/** One comparison with something outside the project: a case, its inputs and the values published for it. */
export const evidenceRow = z.strictObject({
  id: z.string().min(1),
  /** What it is about, printed as a heading: 'mechanics', 'loads', 'sections', 'cables' or the id of a form. */
  subject: z.string().min(1),
  kind: z.enum(evidenceKinds),
  title: z.string().min(1),
  /** Name of the calculation in `lib/evidence/cases` that works out ours. */
  case: z.string().min(1),
  inputs: z.record(z.string(), z.union([scalar, z.array(z.union([scalar, z.array(scalar)]))])),
  /** Published values by figure of the case. Ours is always worked out, never stored. */
  published: z
    .record(z.string(), z.number())
    .refine((values) => Object.keys(values).length > 0, 'expected a value'),
  unit: z.string(),
  /** Relative tolerance, or null where the row is shown but decides nothing (scope unclear, other era). */
  tolerance: z.number().positive().nullable(),
  /** Absolute tolerance besides, for values printed to few digits or near zero. */
  absolute: z.number().positive().optional(),
  /** What the published value covers and what it leaves out. */
  scope: z.string(),
  /** Id in `data/sources.json`. */
  source: z.string(),
  /** True when the value was read in the source, false when it is from memory or worked out independently. */
  read: z.boolean(),
  note: z.string().optional(),
  /** Why ours deviates, written after a check by hand. The worst case of a subject and every case outside its tolerance need one. */
  cause: z.string().min(1).optional(),
});

export type EvidenceRow = z.infer<typeof evidenceRow>;

/** A file of `data/evidence`. */
export const evidenceFile = z.strictObject({ rows: z.array(evidenceRow) });
