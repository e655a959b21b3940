import { erectionData } from './erectionData.ts';

/**
 * Length of deck that has to stand behind the abutment before the rest may reach over the first span, m: its weight about
 * the abutment is `tipping` times that of the deck ahead with its nose; never less than a bed and a half. Launched from the
 * end with the shorter span.
 *
 * @param spansM spans of the unit, m
 * @param material what the deck is of, which sets its nose
 */
export function launchYardNeeded(spansM: readonly number[], material: 'steel' | 'concrete'): number {
  const { tipping, leastBedM } = erectionData.launch;
  const { noseOverSpan, noseOverDeckWeight } = erectionData.launch[material];
  const noseM = noseOverSpan * Math.max(...spansM);
  const firstM = Math.min(spansM[0]!, spansM.at(-1)!);
  const bareM = Math.max(0, firstM - noseM);
  const overM = firstM - bareM;
  // Moments about the abutment for a deck of unit weight: deck ahead, and what of the nose hangs over the span.
  const ahead = bareM ** 2 / 2 + noseOverDeckWeight * overM * (bareM + overM / 2);
  return Math.max(leastBedM, Math.sqrt(2 * tipping * ahead));
}
