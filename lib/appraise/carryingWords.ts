import { carries } from '../forms/index.ts';
import type { Check, Design } from '../model/index.ts';

/** More checks past their limits than these are not listed. */
const MOST_LISTED = 3;

/** 'bending over the piers at 172 % of its limit (1.36e+6 of 791000 kNm)'. */
function words({ label, demand, capacity, unit, utilisation }: Check): string {
  const figure = (x: number): string => String(Number(x.toPrecision(3)));
  const share = Number.isFinite(utilisation)
    ? `${(100 * utilisation).toFixed(0)} % of its limit`
    : 'no capacity';
  return `${label} at ${share} (${figure(demand)} of ${figure(capacity)}${unit === '1' ? '' : ` ${unit}`})`;
}

/** Why a unit that cannot carry cannot: its checks past their limits, the worst first, and what its own weight takes. */
export function carryingWords({ checks, ownWeightShare }: Pick<Design, 'checks' | 'ownWeightShare'>): string {
  const failed = checks
    .filter(({ utilisation }) => !carries(utilisation))
    .sort((a, b) => (a.utilisation === b.utilisation ? 0 : b.utilisation - a.utilisation));
  const more = failed.length - MOST_LISTED;
  return [
    ...failed.slice(0, MOST_LISTED).map(words),
    ...(more > 0 ? [`${more} more past their limits`] : []),
    `own weight is ${(100 * ownWeightShare).toFixed(0)} % of the governing moment or force`,
  ].join('; ');
}
