import { describe, expect, it } from 'vitest';
import { slab } from '../../../lib/forms/slab/index.ts';
import type { Design, UnitTask } from '../../../lib/model/index.ts';
import { girderTask } from '../composite-i/cases.ts';

const at = (spansM: readonly number[], skew: Partial<UnitTask>): Design =>
  slab.size({ ...girderTask(spansM, 0.8, skew), form: 'slab', method: 'falsework' });
const corners = ({ lines }: Design): number =>
  lines.find(({ what }) => what === 'top at the obtuse corners')?.quantity ?? 0;

describe('top bars at the obtuse corners of a slab', () => {
  it('are three quarters of the bars of midspan both ways over a fifth of the span, at two corners', () => {
    const design = at([12], { skewDeg: 30 });
    const { demand } = design.checks.find(({ id }) => id === 'bending-spans')!;
    // By hand: soffit 10.17 m between the wings, bars of 32 mm 0.739 m deep, lever 0.9 of it, 500 / 1.15 = 434.8 MPa, laps
    // 15 %: As = M / (b z fyd) per m; 2 corners x 2 ways x 0.75 As x 2.4 m x 2.4 m x 7,850 kg/m3. 13,025 kNm give 691 kg.
    expect(design.figures['soffitWidthM']).toBeCloseTo(10.17, 2);
    const perM = demand / (10.17 * 0.9 * 0.739 * 434.8e3);
    const handKg = 2 * 2 * 0.75 * perM * 2.4 ** 2 * 7850 * 1.15;
    expect(corners(design) / handKg).toBeGreaterThan(0.99);
    expect(corners(design) / handKg).toBeLessThan(1.01);
  });

  it('lie at the ends of a prestressed and of a continuous slab too', () => {
    expect(corners(at([18], { skewDeg: 30 }))).toBeGreaterThan(0);
    expect(corners(at([14, 18, 14], { skewDeg: 30 }))).toBeGreaterThan(0);
  });

  it('are left out on square supports and on a slight skew', () => {
    expect([0, 10, 19].map((skewDeg) => corners(at([12], { skewDeg })))).toEqual([0, 0, 0]);
    expect(corners(at([12], { skewDeg: 20 }))).toBeGreaterThan(0);
  });
});
