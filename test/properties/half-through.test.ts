import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { halfThrough } from '../../lib/forms/half-through/index.ts';
import type { DeckSpec, Design, StandardId } from '../../lib/model/index.ts';

const settings = { seed: 20261, numRuns: 25 };
const standard = fc.constantFrom<StandardId>('lm1', 'hl93');
const deckOf = (carriagewayM: number): DeckSpec => ({
  widthM: carriagewayM + 2,
  carriagewayM,
  carriagewayOffsetM: 0,
  lanes: 2,
  footwayM: 0,
  surfacingM: 0.09,
  superimposedKNm: 2.1 * carriagewayM + 12,
});
const sized = (spansM: readonly number[], deck: DeckSpec, id: StandardId, radiusM = Infinity): Design =>
  halfThrough.size({
    form: 'half-through',
    spansM,
    deck,
    standard: id,
    planRadiusM: radiusM,
    method: 'crane',
    depthM: 0.1 * deck.widthM + 0.1,
  });
const plates = (design: Design): number => design.figures['girderKgM2']!;

describe('half-through girders', () => {
  it('webs and flanges a square metre grow with the span', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 16, max: 70, noNaN: true }),
        fc.double({ min: 7, max: 12, noNaN: true }),
        standard,
        (span, carriageway, id) => {
          const deck = deckOf(carriageway);
          // A plate step is at most about 4 % of the steel; a tenth more span is worth more than that.
          expect(plates(sized([1.15 * span], deck, id))).toBeGreaterThan(
            plates(sized([span], deck, id)) * 1.02,
          );
        },
      ),
      settings,
    );
  });

  it('every figure is a number, steel grows on a curve, and symmetrical spans give symmetrical reactions', () => {
    fc.assert(
      fc.property(fc.double({ min: 18, max: 55, noNaN: true }), standard, (span, id) => {
        const deck = deckOf(8);
        const straight = sized([0.8 * span, span, 0.8 * span], deck, id);
        expect(Object.values(straight.figures).every(Number.isFinite)).toBe(true);
        expect(straight.lines.every(({ quantity }) => quantity >= 0 && Number.isFinite(quantity))).toBe(true);
        const [first, , , last] = straight.reactions;
        expect(first!.permanentKN).toBeCloseTo(last!.permanentKN, 3);
        // Short girders of least plates stay as they are, and another height may save a plate step.
        const curved = sized([0.8 * span, span, 0.8 * span], deck, id, 300);
        expect(plates(curved)).toBeGreaterThan(0.96 * plates(straight));
      }),
      settings,
    );
  });
});
