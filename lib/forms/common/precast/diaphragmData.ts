import { z } from '../../../zod.ts';

/**
 * Cross-walls of a precast deck: thicknesses over a pier, at the ends and within a span, m; how far apart those within a span
 * stand at most (none without it) and what share of the beam depth they have; their bars.
 */
export const diaphragmData = z.object({
  pierM: z.number(),
  endM: z.number(),
  withinM: z.number(),
  everyM: z.number().optional(),
  heightShare: z.number(),
  barsKgM3: z.number(),
  source: z.string().min(1),
});

export type DiaphragmData = z.infer<typeof diaphragmData>;
