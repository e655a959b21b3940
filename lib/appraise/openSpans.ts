import { formModule } from '../forms/index.ts';
import type { FormId } from '../model/index.ts';
import { spanWindow } from '../rules/index.ts';

/**
 * Spans of a form that a crossing leaves open, m: those that published bands call possible and `size` can lay out, no longer
 * than the crossing. Undefined where the shortest of them is longer than the crossing.
 */
export function openSpans(form: FormId, lengthM: number): readonly [least: number, most: number] | undefined {
  const [least, most] = spanWindow(form).possible;
  const reach = Math.min(most, formModule(form).mostSpanM ?? Infinity, lengthM);
  return least <= reach ? [least, reach] : undefined;
}
