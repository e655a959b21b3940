import { expect, it } from 'vitest';
import { formFacts } from '../../lib/appraise/facts.ts';
import { crossing } from '../substructure/crossing.ts';

it('formFacts(-50 degrees) is a skew of 50 for the rules; unknown stays unknown', () => {
  expect(formFacts({ ...crossing, skewDeg: -50 })['skewDeg']).toBe(50);
  expect(formFacts({ ...crossing, skewDeg: 0 })['skewDeg']).toBe(0);
  expect(formFacts({ ...crossing, skewDeg: null })['skewDeg']).toBe('unknown');
});
