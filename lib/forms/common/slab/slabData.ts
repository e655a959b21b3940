import { z } from '../../../zod.ts';
import json from '../../../../data/forms/slab.json';
import { cited, citedByStandard } from '../cited.ts';

const patch = z.object({ alongM: z.number(), acrossM: z.number() });

const schema = z.object({
  leastThicknessM: citedByStandard,
  leastEdgeM: cited,
  mostThicknessM: cited,
  stepM: cited,
  spanOverThickness: cited,
  steelRatioMost: cited,
  steelRatioLeast: cited,
  barAxisM: cited,
  leverRatio: cited,
  distributionShare: cited,
  lapAndDetail: cited,
  continuity: cited,
  poisson: cited,
  cantileverStripM: z.object({ fixed: z.number(), perM: z.number(), source: z.string() }),
  wheelPatchM: z.object({ lm1: patch, hl93: patch, source: z.string() }),
  wheelFromKerbM: citedByStandard,
  wheelGapM: citedByStandard,
  serviceStressMPa: citedByStandard,
});

/** Practical figures of deck slabs, `data/forms/slab.json`. */
export const slabData = schema.parse(json);
