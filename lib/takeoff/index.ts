export { approachLines } from './approachLines.ts';
export { furnitureLines } from './furnitureLines.ts';
export { girderLines } from './girderLines.ts';
export { itemOf, items, type Item } from './items.ts';
export { methodLines } from './methodLines.ts';
export { measure } from './measure.ts';
export { perM2, quantitiesOf, splitQuantities } from './quantitiesOf.ts';
