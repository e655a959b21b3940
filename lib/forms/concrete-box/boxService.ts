import type { BoxModel } from './boxModel.ts';
import type { SizedBox } from './sizeBox.ts';
import { serviceNeed } from './serviceNeed.ts';
import { needAlong } from './stationNeed.ts';

/** Draped force that service asks for with the drape found, and the force there is, kN. */
export function boxService(
  model: BoxModel,
  box: SizedBox,
): { readonly needKN: number; readonly forceKN: number } {
  const { sections, own, tendons } = box;
  const need = serviceNeed(model, sections, own, tendons.group, tendons.straightKN);
  return { needKN: needAlong(need, tendons), forceKN: tendons.forceKN };
}
