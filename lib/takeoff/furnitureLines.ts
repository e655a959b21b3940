import type { MeasuredLine, Site } from '../model/index.ts';

/** Waterproofing and surfacing over the deck and a parapet along each edge. */
export const furnitureLines = ({ lengthM, deck }: Site): MeasuredLine[] =>
  furnitureOver(lengthM, deck.widthM);

/** The same over a length and a width, m. */
export function furnitureOver(lengthM: number, widthM: number): MeasuredLine[] {
  return [
    {
      part: 'deck',
      item: 'surfacing',
      quantity: lengthM * widthM,
      what: 'waterproofing and surfacing',
      how: `${lengthM} x ${widthM} m`,
    },
    {
      part: 'deck',
      item: 'parapet',
      quantity: 2 * lengthM,
      what: 'parapets',
      how: `two edges, ${lengthM} m`,
    },
  ];
}
