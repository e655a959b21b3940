import type { LoadStandard } from '../../actions/index.ts';
import type { SupportReaction } from '../../model/index.ts';

/**
 * How much a deck pulls up a whole support at the ultimate limit state, kN, negative where it presses on it: permanent load
 * with the factor that is worse for it, traffic where it lifts.
 */
export function supportUpliftKN(
  { permanentKN, trafficMinKN }: SupportReaction,
  { permanent, permanentFavourable, traffic }: LoadStandard['factors']['uls'],
): number {
  return -(permanentKN * (permanentKN < 0 ? permanent : permanentFavourable) + traffic * trafficMinKN);
}
