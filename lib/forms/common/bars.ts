import type { StandardId } from '../../model/index.ts';
import { loadStandard, materials } from '../../actions/index.ts';

/** Design strength of reinforcing bars under a standard, MPa: yield over its resistance divisor. */
export function barDesignMPa(standard: StandardId): number {
  return materials.reinforcement[standard].yieldMPa / loadStandard(standard).resistance.reinforcement;
}

/** Mass of bars, kg, of a steel area (m2) over a length (m). */
export function barKg(areaM2: number, lengthM = 1): number {
  return materials.steelDensityKgM3 * areaM2 * lengthM;
}
