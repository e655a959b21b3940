import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { quantityOf } from '../../lib/forms/common/measured.ts';
import { cableStayed } from '../../lib/forms/cable-stayed/index.ts';
import { truss } from '../../lib/forms/truss/index.ts';
import type { DeckSpec, Design, StandardId } from '../../lib/model/index.ts';

const settings = { seed: 20260, numRuns: 40 };

function deckOf(carriagewayM: number): DeckSpec {
  return {
    widthM: carriagewayM + 2.5,
    carriagewayM,
    carriagewayOffsetM: 0,
    lanes: Math.max(1, Math.floor(carriagewayM / 3.5)),
    footwayM: 0,
    surfacingM: 0.09,
    superimposedKNm: 2.1 * carriagewayM + 12,
  };
}

const standard = fc.constantFrom<StandardId>('lm1', 'hl93');

function through(spanM: number, deck: DeckSpec, id: StandardId): Design {
  return truss.size({
    form: 'truss',
    spansM: [spanM],
    deck,
    standard: id,
    planRadiusM: Infinity,
    method: 'crane',
    depthM: 0.1 * deck.widthM + 0.4,
    clearUnderM: [9, 9],
  });
}

function stayed(main: number, side: number, deck: DeckSpec, id: StandardId): Design {
  return cableStayed.size({
    form: 'cable-stayed',
    spansM: [side * main, main, side * main],
    pylons: [1, 2],
    deck,
    standard: id,
    planRadiusM: Infinity,
    method: 'stay-cantilever',
    depthM: Math.max(1.6, 0.1 * deck.widthM + 0.4),
    clearUnderM: [10, 15, 15, 10],
  });
}

const allFinite = (design: Design): boolean =>
  design.lines.every(({ quantity }) => Number.isFinite(quantity) && quantity >= 0) &&
  design.checks.every(({ utilisation }) => Number.isFinite(utilisation)) &&
  Object.values(design.figures).every(Number.isFinite) &&
  design.elevation.every(({ points }) => points.every(([x, z]) => Number.isFinite(x) && Number.isFinite(z)));

describe('through trusses', () => {
  it('steel a square metre grows with span', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 45, max: 180, noNaN: true }),
        fc.double({ min: 6, max: 14, noNaN: true }),
        standard,
        (span, carriageway, id) => {
          const deck = deckOf(carriageway);
          const perM2 = (s: number): number => through(s, deck, id).figures['steelKgM2']!;
          expect(perM2(1.2 * span)).toBeGreaterThan(perM2(span));
        },
      ),
      settings,
    );
  });

  it('steel a metre grows with width, and a carriageway with one lane more carries more', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 45, max: 180, noNaN: true }),
        fc.double({ min: 6, max: 13, noNaN: true }),
        standard,
        (span, carriageway, id) => {
          const narrow = through(span, deckOf(carriageway), id);
          const wide = through(span, deckOf(carriageway + 3.7), id);
          const steel = (design: Design): number =>
            quantityOf(design.lines, 'truss-steel') + quantityOf(design.lines, 'plate-girder-steel');
          expect(steel(wide)).toBeGreaterThan(steel(narrow));
          expect(wide.reactions[0]!.trafficMaxKN).toBeGreaterThanOrEqual(
            narrow.reactions[0]!.trafficMaxKN - 1e-6,
          );
        },
      ),
      settings,
    );
  });

  it('every number is finite and every shape is drawn', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 20, max: 300, noNaN: true }),
        fc.double({ min: 3, max: 22, noNaN: true }),
        standard,
        (span, carriageway, id) => {
          expect(allFinite(through(span, deckOf(carriageway), id))).toBe(true);
        },
      ),
      settings,
    );
  });
});

describe('cable-stayed decks', () => {
  it('stays a square metre and pylon concrete grow with main span', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 120, max: 450, noNaN: true }),
        fc.double({ min: 8, max: 22, noNaN: true }),
        standard,
        (main, carriageway, id) => {
          const deck = deckOf(carriageway);
          const short = stayed(main, 0.4, deck, id);
          const long = stayed(1.25 * main, 0.4, deck, id);
          expect(long.figures['stayKgM2']!).toBeGreaterThan(short.figures['stayKgM2']!);
          expect(quantityOf(long.lines, 'pylon-concrete')).toBeGreaterThan(
            quantityOf(short.lines, 'pylon-concrete'),
          );
        },
      ),
      { ...settings, numRuns: 20 },
    );
  });

  it('a wider deck takes more stays, steel and slab', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 120, max: 450, noNaN: true }),
        fc.double({ min: 8, max: 18, noNaN: true }),
        standard,
        (main, carriageway, id) => {
          const narrow = stayed(main, 0.4, deckOf(carriageway), id);
          const wide = stayed(main, 0.4, deckOf(carriageway + 3.7), id);
          // On short spans the fatigue of a lorry on a stay falls with the width of the deck, so stays are counted from 200 m.
          const items = ['plate-girder-steel', 'deck-concrete', ...(main >= 200 ? ['stay-cable'] : [])];
          for (const item of items)
            expect(quantityOf(wide.lines, item)).toBeGreaterThan(quantityOf(narrow.lines, item));
        },
      ),
      { ...settings, numRuns: 20 },
    );
  });

  it('a shorter side span pulls its anchor pier up harder', () => {
    fc.assert(
      fc.property(fc.double({ min: 120, max: 450, noNaN: true }), standard, (main, id) => {
        const end = (side: number): number => stayed(main, side, deckOf(14), id).reactions[0]!.permanentKN;
        expect(end(0.35)).toBeLessThan(end(0.45));
      }),
      { ...settings, numRuns: 15 },
    );
  });

  it('lasting reactions hold up the lasting load, every number is finite', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 60, max: 600, noNaN: true }),
        fc.double({ min: 0.34, max: 0.46, noNaN: true }),
        fc.double({ min: 6, max: 26, noNaN: true }),
        standard,
        (main, side, carriageway, id) => {
          const design = stayed(main, side, deckOf(carriageway), id);
          expect(allFinite(design)).toBe(true);
          const held = design.reactions.reduce((sum, { permanentKN }) => sum + permanentKN, 0);
          expect(held / (design.figures['permanentKNm']! * main * (1 + 2 * side))).toBeCloseTo(1, 6);
        },
      ),
      { ...settings, numRuns: 25 },
    );
  });
});
