import { expect, it } from 'vitest';
import { brakingForce, jointMovement, unbalancedFriction, windOnDeck } from '../../lib/substructure/loads.ts';
import { crossing } from './crossing.ts';

it('brakingForce(lm1, L) is 360 + 2.7 L, at most 900 kN (EN 1991-2 4.4.1)', () => {
  expect(brakingForce('lm1', 100, crossing.deck)).toBeCloseTo(630, 9);
  expect(brakingForce('lm1', 200, crossing.deck)).toBeCloseTo(900, 9);
  expect(brakingForce('lm1', 500, crossing.deck)).toBe(900);
});

it('brakingForce(hl93, L) is the greater of 25 % of the truck and 5 % of truck and lane (AASHTO LRFD 3.6.4)', () => {
  // 72 kip truck = 320 to 325 kN: 25 % = 81 kN; 5 % of truck and 9.34 kN/m passes it beyond 139 m.
  expect(brakingForce('hl93', 50, crossing.deck)).toBeCloseTo(81.25, 6);
  expect(brakingForce('hl93', 300, crossing.deck)).toBeCloseTo(0.05 * (325 + 9.34 * 300), 6);
});

it('jointMovement(material, L) lies in the published bands per metre', () => {
  // About 0.5 mm/m each way for composite decks, 0.4 to 0.9 mm/m for prestressed with shortening (from memory):
  // both ways together about 1.0 and up to 1.3 mm/m.
  expect(jointMovement('composite', 100)).toBeGreaterThan(80);
  expect(jointMovement('composite', 100)).toBeLessThan(120);
  expect(jointMovement('prestressed', 100)).toBeGreaterThan(jointMovement('composite', 100));
  expect(jointMovement('prestressed', 100)).toBeLessThan(130);
  expect(jointMovement('composite', 0)).toBe(0);
});

it('unbalancedFriction(left, right) uses a = 1 up to four bearings: the whole friction of the heavier side', () => {
  expect(unbalancedFriction([1000], [4000])).toBeCloseTo(0.03 * 4000, 9);
});

it('unbalancedFriction(left, right) with many bearings lets the lighter side relieve (EN 1337-1 6.2, a = 0.5)', () => {
  const left = Array<number>(3).fill(1000);
  const right = Array<number>(3).fill(2000);
  // 12 bearings: 0.03 (0.75 x 6000 - 0.25 x 3000) = 112.5 kN.
  expect(unbalancedFriction(left, right)).toBeCloseTo(112.5, 9);
  expect(unbalancedFriction(right, left)).toBeCloseTo(112.5, 9);
});

it('windOnDeck(depth, length) grows with the length it belongs to', () => {
  expect(windOnDeck(2.5, 60)).toBeCloseTo(2 * windOnDeck(2.5, 30), 9);
});
