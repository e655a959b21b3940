import type { MeasuredLine, Site, Support } from '../model/index.ts';
import { standAbutment } from './standAbutment.ts';
import { standIntegralWall } from './standIntegralWall.ts';
import { standPier } from './standPier.ts';
import type { SupportAsk } from './supportAsk.ts';

/**
 * One support with shaft or walls, articulation and a foundation for every ground class of its stretch.
 * The one way a support is sized, in an option and in the cost table alike. Loads in `ask` are characteristic, kN.
 * `costOf` chooses between kinds of abutment; left out, the least concrete is taken.
 * Throws a RangeError when a load is not a number.
 */
export function standOneSupport(
  site: Site,
  ask: SupportAsk,
  costOf: (lines: readonly MeasuredLine[]) => number = concreteOf,
): Support {
  for (const key of [
    'chainageM',
    'roadLevelM',
    'soffitLevelM',
    'permanentKN',
    'trafficKN',
    'alongKN',
    'acrossKN',
  ] as const) {
    if (!Number.isFinite(ask[key])) {
      throw new RangeError(
        `${ask.name}, ${key}: expected a number, received ${ask[key]}; check the design of the deck`,
      );
    }
  }
  if (ask.integral) return standIntegralWall(site, ask, ask.integral);
  return ask.kind === 'abutment' ? standAbutment(site, ask, costOf) : standPier(site, ask);
}

/** Concrete of measured lines, m3. */
const concreteOf = (lines: readonly MeasuredLine[]): number =>
  lines.reduce(
    (sum, { item, quantity }) => (item.endsWith('concrete') || item === 'bored-pile' ? sum + quantity : sum),
    0,
  );
