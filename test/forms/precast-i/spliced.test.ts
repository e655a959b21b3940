import { describe, expect, it } from 'vitest';
import { loadStandard } from '../../../lib/actions/index.ts';
import { quantityOf } from '../../../lib/forms/common/measured.ts';
import { precastI } from '../../../lib/forms/precast-i/index.ts';
import { splicePlan } from '../../../lib/forms/precast-i/spliced/splicePlan.ts';
import type { StandardId, UnitTask } from '../../../lib/model/index.ts';
import { foot } from './cases.ts';

function task(spansM: readonly number[], depthM: number, standard: StandardId = 'hl93'): UnitTask {
  return {
    form: 'precast-i',
    spansM,
    deck: {
      widthM: 12,
      carriagewayM: 11,
      carriagewayOffsetM: 0,
      lanes: 2,
      footwayM: 0,
      surfacingM: 0.09,
      superimposedKNm: 33,
    },
    standard,
    planRadiusM: Infinity,
    method: 'crane',
    depthM,
    clearUnderM: spansM.map(() => 12).concat(12),
  };
}

describe('splicePlan(spansM, mostM)', () => {
  it('cuts a continuous unit beside its piers: 0.22 of 60 m, and once more where an end is too long', () => {
    const { longestM, splices, atM } = splicePlan([55, 60, 55], 50);
    expect(splices).toEqual([1, 2, 1]);
    // 55 - 12.1; 55 + 13.2; 55 + 46.8; 115 + 12.1.
    [42.9, 68.2, 101.8, 127.1].forEach((x, i) => expect(atM[i]).toBeCloseTo(x, 9));
    expect(longestM).toBeCloseTo(42.9, 9);
    expect(splicePlan([48, 60, 48], 30).splices).toEqual([2, 3, 2]);
  });

  it('leaves spans whole that the road takes', () => {
    const { longestM, splices, atM } = splicePlan([48, 60, 48], 50);
    expect(splices).toEqual([0, 2, 0]);
    [61.2, 94.8].forEach((x, i) => expect(atM[i]).toBeCloseTo(x, 9));
    expect(longestM).toBe(48);
  });

  it('cuts a span by itself in three, never at midspan', () => {
    expect(splicePlan([60], 50).atM).toEqual([20, 40]);
  });
});

describe('precastI.size(task) past the length of the road', () => {
  it('holds every check over three spans of 190, 240 and 190 ft with beams of constant depth', () => {
    // Spans worked out for such beams under HL-93: Parchure, Texas A&M University 2013 (abstract read).
    const design = precastI.size(task([190 * foot, 240 * foot, 190 * foot], 2.8));
    expect(design.warnings).toEqual([]);
    expect(design.figures['tendons']).toBeLessThanOrEqual(4);
    expect(design.heaviestPiece!.lengthM).toBeLessThanOrEqual(50);
  });

  it('is spliced only where a span is longer than what is hauled', () => {
    const whole = precastI.size(task([50, 50], 2.4));
    const cut = precastI.size(task([50, 51, 50], 2.4));
    expect(whole.staging).toBeUndefined();
    expect(quantityOf(whole.lines, 'temporary-tower')).toBe(0);
    expect(cut.staging).toEqual({ splices: 2, stages: 2 });
    expect(quantityOf(cut.lines, 'temporary-tower')).toBeGreaterThan(0);
    expect(quantityOf(cut.lines, 'prestress')).toBeGreaterThan(0);
  });

  it('stands on its supports with all of its weight; what tendons shift between them adds up to nothing', () => {
    const asked = task([45, 60, 50], 2.5);
    const { lines, reactions } = precastI.size(asked);
    const m3 = quantityOf(lines, 'precast-concrete') + quantityOf(lines, 'deck-concrete');
    const down = reactions.reduce((sum, { permanentKN }) => sum + permanentKN, 0);
    const { concreteKNm3 } = loadStandard('hl93').unitWeights;
    expect(down / (concreteKNm3 * m3 + 33 * 155)).toBeCloseTo(1, 9);
  });

  it('needs more tendons for longer spans and fewer for deeper beams', () => {
    const strands = (spanM: number, depthM: number): number =>
      precastI.size({ ...task([0.8 * spanM, spanM, 0.8 * spanM], depthM), girders: 6 }).figures[
        'tendonStrands'
      ]!;
    expect(strands(64, 2.6)).toBeGreaterThan(strands(56, 2.6));
    expect(strands(60, 2.5)).toBeGreaterThan(strands(60, 2.75));
  });

  it('builds towers by the height under its spans and says where that is unknown', () => {
    const spans = [48, 60, 48];
    const low = precastI.size(task(spans, 2.5));
    const high = precastI.size({ ...task(spans, 2.5), clearUnderM: [22, 22, 22, 22] });
    const tower = (design: typeof low): number => quantityOf(design.lines, 'temporary-tower');
    expect(tower(high) / tower(low)).toBeCloseTo(22 / 12, 9);
    const { clearUnderM, ...unknown } = task(spans, 2.5);
    expect(clearUnderM).toHaveLength(4);
    expect(precastI.size(unknown).warnings.join()).toMatch(/Height under the deck unknown/u);
  });

  it('says that a long span by itself is past its limits', () => {
    const { limitingCheck, warnings } = precastI.size(task([72], 2.75, 'lm1'));
    expect(limitingCheck.utilisation).toBeGreaterThan(1);
    expect(warnings.length).toBeGreaterThan(0);
  });
});
