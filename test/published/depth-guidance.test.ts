import { describe, expect, it } from 'vitest';
import type { Facts, FormId } from '../../lib/model/index.ts';
import { rulingsFor, windowOf } from '../../lib/rules/index.ts';

/**
 * AASHTO LRFD Bridge Design Specifications, 8th ed. 2017, table 2.5.2.6.3-1, optional minimum overall depths
 * (read from a scan; some digits settled from memory). Depths below are the table's formulas worked out by hand:
 * span in feet, depth in feet.
 */
const foot = 0.3048;
const reinforced: Facts = { prestressed: false };
const prestressed: Facts = { prestressed: true };

const table: readonly (readonly [
  what: string,
  form: FormId,
  measure: string,
  given: Facts,
  continuity: 'simple' | 'continuous',
  spanFt: number,
  depthFt: number,
])[] = [
  // 1.2 (S + 10) / 30 and (S + 10) / 30
  ['reinforced slab', 'slab', 'slabDepthRatio', reinforced, 'simple', 25, 1.4],
  ['reinforced slab', 'slab', 'slabDepthRatio', reinforced, 'simple', 40, 2.0],
  ['reinforced slab', 'slab', 'slabDepthRatio', reinforced, 'continuous', 20, 1.0],
  ['reinforced slab', 'slab', 'slabDepthRatio', reinforced, 'continuous', 35, 1.5],
  // 0.030 L and 0.027 L
  ['prestressed slab', 'slab', 'depthRatio', prestressed, 'simple', 50, 1.5],
  ['prestressed slab', 'slab', 'depthRatio', prestressed, 'continuous', 100, 2.7],
  // 0.045 L and 0.040 L
  ['cast in place box', 'concrete-box', 'depthRatio', {}, 'simple', 160, 7.2],
  ['cast in place box', 'concrete-box', 'depthRatio', {}, 'continuous', 200, 8.0],
  ['precast I-girder', 'precast-i', 'depthRatio', {}, 'simple', 120, 5.4],
  ['precast I-girder', 'precast-i', 'depthRatio', {}, 'continuous', 120, 4.8],
  // 0.030 L and 0.025 L
  ['adjacent box beam', 'adjacent-box', 'depthRatio', {}, 'simple', 100, 3.0],
  ['adjacent box beam', 'adjacent-box', 'depthRatio', {}, 'continuous', 100, 2.5],
  // overall 0.040 L and 0.032 L
  ['composite I-girder, overall', 'composite-i', 'depthRatio', {}, 'simple', 150, 6.0],
  ['composite I-girder, overall', 'composite-i', 'depthRatio', {}, 'continuous', 250, 8.0],
  // 0.100 L
  ['truss', 'truss', 'trussHeightRatio', {}, 'simple', 400, 40],
  ['truss', 'truss', 'trussHeightRatio', {}, 'continuous', 400, 40],
];

describe('optional minimum depths of AASHTO LRFD table 2.5.2.6.3-1', () => {
  it.each(table)(
    '%s (%s): %s %o %s of %d ft needs %d ft',
    (_what, form, measure, given, continuity, spanFt, depthFt) => {
      const least = windowOf(form, measure, ['to confirm'], { ...given, continuity })![0];
      const spanM = spanFt * foot + (measure === 'slabDepthRatio' ? 3.048 : 0);
      // Ratios are kept to four decimals: 1/30 as 0.0333 is 0.1 % low.
      expect(Math.abs(least * spanM - depthFt * foot) / (depthFt * foot)).toBeLessThan(0.0011);
    },
  );

  it.each(table)(
    '%s (%s): 2 %% less is to be confirmed, 1 %% more is not (%s, %o, %s, %d ft)',
    (_what, form, measure, given, continuity, spanFt, depthFt) => {
      const depthM = depthFt * foot;
      const part = measure === 'trussHeightRatio' ? 'trussHeightM' : 'supportDepthM';
      const rulings = (share: number) =>
        rulingsFor('option', form, {
          ...given,
          continuity,
          mainSpanM: spanFt * foot,
          [part]: share * depthM,
          midspanDepthM: share * depthM,
        }).filter(
          ({ rule, flip }) =>
            rule.includes('-optional-depth') && rule.endsWith(continuity) && flip !== undefined,
        );
      const short = rulings(0.98);
      expect(short).toHaveLength(1);
      expect(short[0]).toMatchObject({ effect: 'to confirm' });
      expect(short[0]!.source).toContain('table 2.5.2.6.3-1');
      expect(rulings(1.01)).toEqual([]);
    },
  );

  it('slabs: 0.54 ft and 6.5 in, 165 mm, are kept as 170 mm', () => {
    expect(windowOf('slab', 'midspanDepthM', ['to confirm'])![0]).toBe(0.17);
    expect(0.54 * foot).toBeCloseTo(0.165, 3);
  });
});
