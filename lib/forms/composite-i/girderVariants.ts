import type { DeckSpec, MethodId, Variant } from '../../model/index.ts';
import { compositeData } from './compositeData.ts';

/**
 * Ways of making a unit besides straight girders under a plain slab: haunched where its spans are continuous and long enough
 * and it is not slid over its piers; substringers where the spans are long and the deck is too wide for three girders
 * without; both together.
 */
export function girderVariants(
  spansM: readonly number[],
  deck: DeckSpec,
  method: MethodId,
): readonly Variant[] {
  const { haunch, substringers, twin, multi } = compositeData;
  const longestM = Math.max(...spansM);
  const mayHaunch = spansM.length > 1 && longestM >= haunch.fromSpanM && method !== 'launch';
  const haunched: Variant[] = mayHaunch ? haunch.ratios.map((haunchRatio) => ({ haunchRatio })) : [];
  const threeM = (2 + 2 * multi.overhangOverSpacing) * multi.mostSpacingM;
  const isWide = deck.widthM > Math.max(twin.mostWidthM, threeM);
  if (!(isWide && longestM >= substringers.fromSpanM)) return haunched;
  return [
    ...haunched,
    { substringers: true },
    ...haunched.map((variant): Variant => ({ ...variant, substringers: true })),
  ];
}
