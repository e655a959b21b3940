import type { MeasuredLine, Site } from '../model/index.ts';

/** Waterproofing and surfacing over the deck and a parapet along each edge. */
export function furnitureLines(site: Site): MeasuredLine[] {
  const { lengthM, deck } = site;
  return [
    {
      part: 'deck',
      item: 'surfacing',
      quantity: lengthM * deck.widthM,
      what: 'waterproofing and surfacing',
      how: `${lengthM} x ${deck.widthM} m`,
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
