import { expect, it } from 'vitest';
import { arrangementFacts, formFacts } from '../../lib/appraise/facts.ts';
import { rulingsFor } from '../../lib/rules/index.ts';
import { crossing } from '../substructure/crossing.ts';

it('formFacts(-50 degrees) is a skew of 50 for the rules; unknown stays unknown', () => {
  expect(formFacts({ ...crossing, skewDeg: -50 })['skewDeg']).toBe(50);
  expect(formFacts({ ...crossing, skewDeg: 0 })['skewDeg']).toBe(0);
  expect(formFacts({ ...crossing, skewDeg: null })['skewDeg']).toBe('unknown');
});

it('an unknown skew over an obstacle is a question to be settled, with what it would add; a known one is none', () => {
  const option = {
    method: 'crane',
    units: [{ form: 'composite-i', supportsM: [crossing.startM, crossing.endM], role: 'main' }],
  } as const;
  const zone = { fromM: 10, toM: 20, kind: 'road', name: 'lane', hard: true } as const;
  const deck = { ...crossing.deck, widthM: 12 };
  const said = (skewDeg: number | null, zones: readonly (typeof zone)[]): string[] => {
    const facts = arrangementFacts({ ...crossing, deck, waters: [], zones, skewDeg }, option);
    return rulingsFor('option', 'composite-i', facts)
      .filter(({ rule }) => rule === 'skew-left-open')
      .flatMap(({ effect, because }) => [effect, ...because]);
  };
  const [effect, words] = said(null, [zone]);
  expect(effect).toBe('to confirm');
  // By hand: 12 / cos 30 degrees - 12 = 12 / 0.8660 - 12 = 1.9 m.
  expect(words).toMatch(/worked out square; at thirty degrees .* 1\.9 m longer/);
  expect(said(0, [zone])).toEqual([]);
  expect(said(12, [zone])).toEqual([]);
  expect(said(null, [])).toEqual([]);
});
