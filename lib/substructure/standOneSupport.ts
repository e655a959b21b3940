import type { Site, Support } from '../model/index.ts';
import { standAbutment } from './standAbutment.ts';
import { standIntegralWall } from './standIntegralWall.ts';
import { standPier } from './standPier.ts';
import type { SupportAsk } from './supportAsk.ts';

/**
 * One support with shaft or walls, articulation and a foundation for every ground class of its stretch.
 * The one way a support is sized, in an option and in the cost table alike. Loads in `ask` are characteristic, kN.
 * Throws a RangeError when a load is not a number.
 */
export function standOneSupport(site: Site, ask: SupportAsk): Support {
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
  return ask.kind === 'abutment' ? standAbutment(site, ask) : standPier(site, ask);
}
