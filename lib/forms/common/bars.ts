import { z } from 'zod';
import json from '../../../data/forms/bars.json';
import type { StandardId } from '../../model/index.ts';
import { loadStandard } from '../../actions/index.ts';
import { cited, citedByStandard } from './cited.ts';

const data = z.object({ yieldMPa: citedByStandard, densityKgM3: cited }).parse(json);

/** Design strength of reinforcing bars under a standard, MPa: yield over its resistance divisor. */
export function barDesignMPa(standard: StandardId): number {
  return data.yieldMPa[standard] / loadStandard(standard).resistance.reinforcement;
}

/** Mass of bars, kg, of a steel area (m2) over a length (m). */
export function barKg(areaM2: number, lengthM = 1): number {
  return data.densityKgM3.value * areaM2 * lengthM;
}
