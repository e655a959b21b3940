import { formModule } from '../forms/index.ts';
import type { FormId, MethodId, UnitTask, Variant } from '../model/index.ts';
import { depthBand, floorBand, haunchedDepthBands, midspanDepthBand, windowOf } from '../rules/index.ts';

/**
 * Band of structural depth under the road, m, that the rules give a form for its governing span.
 * A form that carries the road between two main members has its floor measured by the deck width; of one whose depth
 * varies, or is varied by choice, it is the depth at midspan. A span too short for the least depth that can be made
 * has that depth, deeper than its band: its rule says so.
 */
export function depthRange(
  form: FormId,
  method: MethodId,
  spansM: readonly number[],
  { deck, standard }: Pick<UnitTask, 'deck' | 'standard'>,
  { haunchRatio }: Variant = {},
): readonly [least: number, most: number] {
  const floor = floorBand(form);
  if (floor) return [floor[0] * deck.widthM, floor[1] * deck.widthM];
  const governing = Math.max(...spansM);
  const haunched = haunchRatio === undefined ? null : haunchedDepthBands(form);
  if (haunched !== null && haunchRatio !== undefined) {
    const { midspan, pier } = haunched;
    const shallowest = Math.max(midspan[0], pier[0] / haunchRatio);
    return [
      shallowest * governing,
      Math.max(shallowest, Math.min(midspan[1], pier[1] / haunchRatio)) * governing,
    ];
  }
  const band = midspanDepthBand(form) ?? depthBand(form, spansM.length > 1 ? 'continuous' : 'simple', method);
  const least = Math.max(
    band[0] * governing,
    windowOf(form, 'midspanDepthM', ['to confirm'])?.[0] ?? 0,
    formModule(form).leastDepthM?.({ deck, standard, spansM }) ?? 0,
  );
  return [least, Math.max(least, band[1] * governing)];
}
