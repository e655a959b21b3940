import { methodNames, type Design, type MeasuredLine, type MethodId } from '../model/index.ts';
import { methodData } from './methodData.ts';

/** What the set-up of a method is called in the bill. */
export const setUpWords = (method: MethodId): string => `set-up for ${methodNames[method]}`;

/**
 * Fixed set-up of each method of construction used on the crossing, once however many units use it. A form that measures
 * the set-up of its own method is not measured again.
 */
export function methodLines(designs: readonly Design[]): MeasuredLine[] {
  const methods = new Set(designs.map((design) => design.task.method));
  for (const design of designs) {
    if (design.lines.some((line) => line.item === 'method-setup')) methods.delete(design.task.method);
  }
  return [...methods].map((method) => ({
    part: 'temporary-works',
    item: 'method-setup',
    quantity: methodData.methods[method].setups,
    what: setUpWords(method),
    how: `${methodData.methods[method].setups} times the set-up of a crane job`,
  }));
}
