import type { Facts } from '../model/index.ts';
import { factDictionary } from './book.ts';
import { factValue } from './evaluate.ts';

const ratios = factDictionary.filter((entry) => entry.ratioOf !== undefined);

/**
 * Adds the ratios of the dictionary (depth over span, span over width) to facts that hold their parts.
 * A ratio that is given is left as it is; one whose parts are unknown stays unknown.
 */
export function withRatios(facts: Facts): Facts {
  const all: Record<string, Facts[string]> = { ...facts };
  for (const { id, ratioOf, addedToSecond = 0 } of ratios) {
    if (ratioOf === undefined || facts[id] !== undefined) continue;
    const [first, second] = ratioOf.map((part) => factValue(facts, part));
    if (typeof first === 'number' && typeof second === 'number' && second + addedToSecond > 0)
      all[id] = first / (second + addedToSecond);
  }
  return all;
}
