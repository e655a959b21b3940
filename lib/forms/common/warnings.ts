import type { Check } from '../../model/index.ts';
import { carries } from './carries.ts';

/** A sentence for each check past its limit. `means` is what was tried to the end of its range: plates, tendons, slab. */
export function overLimit(checks: readonly Check[], means: string): string[] {
  return checks
    .filter(({ utilisation }) => !carries(utilisation))
    .map(({ label, utilisation }) => {
      const share =
        utilisation < Infinity ? `${(100 * utilisation).toFixed(0)} % of its limit` : 'no capacity left';
      return `${label[0]!.toUpperCase()}${label.slice(1)}: ${share} with the heaviest practical ${means}.`;
    });
}
