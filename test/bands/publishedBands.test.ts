import { expect, it } from 'vitest';
import { publishedBands } from '../../lib/bands/publishedBands.ts';

it('publishedBands(composite-i, 60-80-60) holds 0.105 L^1.6 + 100 at the governing span, 216 kg/m2 (from memory)', () => {
  const { low, high } = publishedBands('composite-i', [60, 80, 60]).steel!;
  expect((low + high) / 2).toBeCloseTo(216.3, 0);
});

it('publishedBands(concrete-box, 100 m) spans both recalled laws, 0.75 and 0.80 m3/m2', () => {
  const { low, high } = publishedBands('concrete-box', [80, 100, 80]).concrete!;
  expect(low).toBeCloseTo(0.75 * 0.85, 6);
  expect(high).toBeCloseTo(0.8 * 1.15, 6);
});

it('publishedBands(form nobody has published for) is empty', () => {
  expect(publishedBands('slab', [12])).toEqual({});
});
