import type { BoxModel } from './boxModel.ts';
import type { SizedBox } from './sizeBox.ts';
import { serviceNeed } from './serviceNeed.ts';

/** Draped force that service asks for with the drape found, and the force there is, kN. */
export function boxService(
  model: BoxModel,
  box: SizedBox,
): { readonly needKN: number; readonly forceKN: number } {
  const { sections, own, tendons } = box;
  const demand = serviceNeed(model, sections, own, tendons.group, tendons.straightKN);
  return { needKN: demand(tendons), forceKN: tendons.forceKN };
}
