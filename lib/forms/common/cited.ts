import { z } from '../../zod.ts';

/** A practical figure with where it comes from, as it stands in `data/forms`. */
export const cited = z.object({ value: z.number(), source: z.string().min(1) });

/** A practical figure that differs between the load standards, with where it comes from. */
export const citedByStandard = z.object({ lm1: z.number(), hl93: z.number(), source: z.string().min(1) });
