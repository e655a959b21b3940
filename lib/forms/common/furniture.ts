import type { DeckSpec, Shape } from '../../model/index.ts';

const kerbM = 0.12;
const parapetHeightM = 1.1;
const parapetThicknessM = 0.06;
const plinthM = 0.3;

/**
 * What stands on a deck, drawn in cross-section over the top of the structural slab (z = 0): surfacing, raised edge
 * strips (footway, verge, plinth) and parapets. x across the deck from its middle, m. For drawing only: the load of
 * these parts is in `deck.superimposedKNm`.
 */
export function deckFurniture(deck: DeckSpec): Shape[] {
  const half = deck.widthM / 2;
  const left = deck.carriagewayOffsetM - deck.carriagewayM / 2;
  const right = deck.carriagewayOffsetM + deck.carriagewayM / 2;
  const top = deck.surfacingM + kerbM;
  const shapes: Shape[] = [band('surfacing', 'surfacing', left, right, deck.surfacingM)];
  if (left > -half) shapes.push(band('edge strip', 'concrete', -half, left, top));
  if (right < half) shapes.push(band('edge strip', 'concrete', right, half, top));
  for (const side of [-1, 1] as const) {
    const x = side * (half - plinthM / 2);
    shapes.push({
      part: 'parapet',
      material: 'steel',
      kind: 'line',
      points: [
        [x, top],
        [x, top + parapetHeightM],
      ],
      thicknessM: parapetThicknessM,
    });
  }
  return shapes;
}

function band(part: string, material: Shape['material'], x1: number, x2: number, heightM: number): Shape {
  return {
    part,
    material,
    kind: 'polygon',
    points: [
      [x1, 0],
      [x2, 0],
      [x2, heightM],
      [x1, heightM],
    ],
  };
}
