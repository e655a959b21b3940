import { z } from '../../zod.ts';
import json from '../../../data/forms/plates.json';
import type { StandardId } from '../../model/index.ts';
import { cited } from './cited.ts';

const data = z
  .object({
    thicknessMm: z.object({ values: z.array(z.number()).min(1), source: z.string() }),
    mostMm: z.object({ lm1: z.number(), hl93: z.number(), source: z.string() }),
    widthStepM: cited,
  })
  .parse(json);

/** Rolled plate thicknesses, mm, rising; `data/forms/plates.json`. */
export const plateThicknessesMm: readonly number[] = data.thicknessMm.values;

/** Thickest flange plate used under a standard, m. */
export function thickestPlateM(standard: StandardId): number {
  return data.mostMm[standard] / 1000;
}

/** Next rolled thickness at or above `thicknessM`, m; what is asked when it is past the series. */
export function roundPlateUp(thicknessM: number): number {
  const mm = thicknessM * 1000 - 1e-6;
  for (const rolled of plateThicknessesMm) if (rolled >= mm) return rolled / 1000;
  return thicknessM;
}

/** Width rounded up to the step of `data/forms/plates.json`, m. */
export function roundWidthUp(widthM: number): number {
  const step = data.widthStepM.value;
  return Math.ceil(widthM / step - 1e-6) * step;
}
