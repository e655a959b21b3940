import type { DeckSpec, FormId, MethodId } from '../model/index.ts';
import { depthBand, floorBand } from '../rules/index.ts';

/**
 * Band of structural depth under the road, m, that the rules give a form for its governing span.
 * A form that carries the road between two main members has its floor measured by the deck width.
 */
export function depthRange(
  form: FormId,
  method: MethodId,
  spansM: readonly number[],
  deck: DeckSpec,
): readonly [least: number, most: number] {
  const floor = floorBand(form);
  if (floor) return [floor[0] * deck.widthM, floor[1] * deck.widthM];
  const governing = Math.max(...spansM);
  const band = depthBand(form, spansM.length > 1 ? 'continuous' : 'simple', method);
  return [band[0] * governing, band[1] * governing];
}
