import { describe, expect, it } from 'vitest';
import { builtBucket, builtShares, builtSpans } from '../../lib/bands/builtSpans.ts';
import { formIds } from '../../lib/model/index.ts';

/**
 * US National Bridge Inventory 2024 (public domain), main spans of bridges of 152 m and more built since 1980, m, with
 * the quartiles that the data do not keep: form, count, P5, P25, P50, P75, P95, counted from the records.
 */
const counted = [
  ['slab', 264, 6, 9, 12, 18, 41],
  ['precast-i', 6405, 20, 29, 35, 40, 49],
  ['composite-i', 4264, 29, 44, 55, 70, 94],
  ['composite-box', 429, 40, 52, 66, 76, 97],
  ['concrete-box', 1096, 24, 41, 52, 63, 83],
  ['cantilever-box', 291, 34, 49, 68, 97, 163],
  ['truss', 59, 65, 124, 183, 224, 278],
  ['tied-arch', 59, 73, 131, 165, 217, 278],
  ['deck-arch', 25, 38, 48, 73, 127, 210],
  ['cable-stayed', 49, 157, 206, 274, 354, 457],
  ['suspension', 7, 185, 286, 381, 557, 816],
] as const;

describe('builtSpans(form)', () => {
  it.each(counted)('%s: %d bridges, as counted from the record', (form, count, p5, p25, p50, p75, p95) => {
    const built = builtSpans(form)!;
    expect([built.count, built.p5, built.p50, built.p95]).toEqual([count, p5, p50, p95]);
    expect(built.source).toBe('nbi-2024');
    expect(p25).toBeGreaterThanOrEqual(built.p5);
    expect(p25).toBeLessThanOrEqual(built.p50);
    expect(p75).toBeGreaterThanOrEqual(built.p50);
    expect(p75).toBeLessThanOrEqual(built.p95);
  });

  it('is silent on forms the record does not tell apart', () => {
    expect(formIds.filter((form) => builtSpans(form) === null)).toEqual([
      'portal-frame',
      'precast-trough',
      'half-through',
      'adjacent-box',
      'steel-box',
      'extradosed',
    ]);
  });
});

describe('builtShares', () => {
  it('buckets follow each other without a gap from 0 m', () => {
    const { buckets } = builtShares;
    expect(buckets.map(({ fromM }) => fromM)).toEqual([0, ...buckets.slice(0, -1).map(({ toM }) => toM)]);
  });

  it('shares name known forms and come to at most 100 %, rounding aside', () => {
    const ids = new Set(builtShares.classes.map(({ id }) => id));
    for (const { percent, doubted, fromM } of builtShares.buckets) {
      for (const id of [...Object.keys(percent), ...doubted]) expect(ids, id).toContain(id);
      const sum = Object.values(percent).reduce((all, one) => all + one, 0);
      expect(sum, `from ${fromM} m`).toBeGreaterThan(85);
      expect(sum, `from ${fromM} m`).toBeLessThan(100.5);
    }
  });

  /**
   * The same records counted the other way round, per form over the buckets (per cent of each form's own stock): 45.2 %
   * of 4264 steel I-girders span 50 to 75 m, 50.9 % of 6405 precast ones 30 to 40 m, 36.7 % of 49 stayed 300 to 500 m.
   */
  it.each([
    ['steel-i', 50, 45.2, 4264],
    ['precast-i', 30, 50.9, 6405],
    ['prestressed-box', 50, 46.2, 1096],
    ['stayed', 300, 36.7, 49],
    ['truss', 200, 28.8, 59],
  ])(
    '%s from %d m: %d %% of %d gives the same bridges, to what rounding hides',
    (id, fromM, percent, stock) => {
      const bucket = builtShares.buckets.find((one) => one.fromM === fromM)!;
      const here = ((bucket.percent[id] ?? 0) / 100) * bucket.count;
      // Both shares are printed to 0.1 %, so each hides half of that.
      expect(Math.abs(here - (percent / 100) * stock)).toBeLessThan(0.0005 * (bucket.count + stock));
    },
  );
});

describe('builtBucket(spanM)', () => {
  it('takes the lower end into a bucket and leaves the upper to the next', () => {
    expect(builtBucket(50)?.fromM).toBe(50);
    expect(builtBucket(49.9)?.fromM).toBe(40);
    expect(builtBucket(63)?.count).toBe(3114);
  });
  it('is silent beyond 500 m, where five bridges were built', () => {
    expect(builtBucket(500)).toBeNull();
  });
});
