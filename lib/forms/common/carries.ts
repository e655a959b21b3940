import type { Check, Design } from '../../model/index.ts';

/** Strands, bars and plates are whole: a check may stand at its limit to the last digit. */
const HOLDING = 1.0001;

/** Whether a check with this utilisation, demand over capacity, holds. */
export function carries(utilisation: number): boolean {
  return utilisation <= HOLDING;
}

/**
 * Why units cannot carry what is asked of them: of all their checks past their limits the worst; null where all hold. The
 * command line refuses by it, and the fact that the rule of strength reads comes from it.
 */
export function cannotCarry(designs: readonly Pick<Design, 'limitingCheck'>[]): Check | null {
  return designs
    .map(({ limitingCheck }) => limitingCheck)
    .filter(({ utilisation }) => !carries(utilisation))
    .reduce<Check | null>(
      (worst, one) => (worst && worst.utilisation >= one.utilisation ? worst : one),
      null,
    );
}
