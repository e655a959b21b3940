import type { UnitTask } from '../../model/index.ts';
import { fact, windowOf } from '../../rules/index.ts';
import { slabDeckData } from './slabDeckData.ts';

/**
 * Optional minimum depth, m, of a slab over its longest span: AASHTO LRFD table 2.5.2.6.3-1, as the rules of the form have it,
 * (S + 3.048) times a ratio for reinforced slabs and a share of the span for prestressed ones. On short spans it is more than
 * the published band of depths, and deflection asks for it.
 */
export function leastDepthM({ spansM }: Pick<UnitTask, 'spansM'>): number {
  const spanM = Math.max(...spansM);
  const prestressed = spanM > slabDeckData.reinforced.mostSpanM;
  const given = { prestressed, continuity: spansM.length > 1 ? 'continuous' : 'simple' };
  const ratio = prestressed ? 'depthRatio' : 'slabDepthRatio';
  const [least] = windowOf('slab', ratio, ['to confirm'], given)!;
  return least * (spanM + (fact(ratio).addedToSecond ?? 0));
}
