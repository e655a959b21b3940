import { describe, expect, it } from 'vitest';
import { steelBox } from '../../../lib/forms/steel-box/index.ts';
import { sizeSteelBox } from '../../../lib/forms/steel-box/sizeSteelBox.ts';
import { stiffEnough } from '../../../lib/forms/steel-box/stiffEnough.ts';
import { elementsPerSpan, steelBoxModel } from '../../../lib/forms/steel-box/steelBoxModel.ts';
import { steelBoxTask } from './cases.ts';

const shallow = steelBoxTask([120, 160, 120], 160 / 48);
const model = steelBoxModel(shallow, 8, true);
const { plates, effects } = sizeSteelBox(model, null);
const middle = 1.5 * elementsPerSpan;
/** A box of plates as thin as they come, with the deflections that the sized one has. */
const thin = {
  ...plates,
  deckM: plates.deckM.map(() => model.deckM),
  bottomM: plates.bottomM.map(() => 0.012),
};

describe('stiffEnough(model, effects, now, strong, aim)', () => {
  it('returns the plates that are strong enough where they are stiff enough', () => {
    expect(stiffEnough(model, effects, plates, plates, 1.05)).toBe(plates);
  });

  it('thickens where load and unit load bend the span most, and not where the moments turn', () => {
    const { bottomM } = stiffEnough(model, effects, plates, thin, 0.97);
    expect(bottomM[middle]!).toBeGreaterThan(0.03);
    // A beam with haunches over its piers turns its moments at about a quarter of the span.
    const turning = Math.min(...bottomM.subarray(elementsPerSpan, middle));
    expect(turning).toBe(0.012);
  });

  it('fills up the weaker flange before both grow alike', () => {
    const areas = (aim: number): readonly [deck: number, bottom: number] => {
      const { deckM, bottomM } = stiffEnough(model, effects, plates, thin, aim);
      return [
        shallow.deck.widthM * (deckM[middle]! + model.rib.areaM2 / 0.6),
        bottomM[middle]! * model.layout.topM,
      ];
    };
    const least = shallow.deck.widthM * (model.deckM + model.rib.areaM2 / 0.6);
    const [deck, bottom] = areas(2);
    expect(deck).toBeCloseTo(least, 9);
    expect(bottom).toBeLessThan(deck);
    const [stiffDeck, stiffBottom] = areas(1.6);
    expect(stiffDeck).toBeGreaterThan(least);
    expect(stiffBottom / stiffDeck).toBeCloseTo(1, 2);
  });

  it('asks for more the less a span may give', () => {
    const at = (aim: number): number =>
      stiffEnough(model, effects, plates, thin, aim).bottomM.reduce((sum, m) => sum + m, 0);
    expect(at(0.8)).toBeGreaterThan(at(0.97));
    expect(at(0.97)).toBeGreaterThan(at(1.2));
  });
});

it.each([
  [120, 48],
  [160, 42],
  [200, 40],
])(
  'steelBox.size() holds the deflection of a shallow box over %d m, L / %d deep, with plates',
  (span, ratio) => {
    const design = steelBox.size(steelBoxTask([0.75 * span, span, 0.75 * span], span / ratio));
    expect(design.limitingCheck.utilisation).toBeLessThanOrEqual(1.0001);
  },
);
