import { describe, expect, it } from 'vitest';
import { depthGuidance } from '../lib/depthGuidance.ts';
import { guide } from '../lib/guide.ts';
import { formIds, type FormId } from '../lib/model/index.ts';
import { source } from '../lib/rules/index.ts';

const named = (form: FormId, what: string) =>
  depthGuidance(form, { spanM: 60 }).find((one) => one.what === what)!;

describe('depthGuidance(form, {spanM, widthM, lengthM})', () => {
  it.each(formIds)('%s: every band is a ratio times the span or the width, with a known source', (form) => {
    const bands = depthGuidance(form, { spanM: 80, widthM: 14 });
    expect(bands.length).toBeGreaterThan(0);
    for (const { what, of, ratio, depthM, sources } of bands) {
      expect(ratio[0]).toBeLessThan(ratio[1]);
      const base = of === 'span' ? 80 : 14;
      expect(depthM[0], what).toBeCloseTo(ratio[0] * base, 9);
      expect(depthM[1], what).toBeCloseTo(ratio[1] * base, 9);
      for (const id of sources) expect(source(id).id).toBe(id);
    }
  });

  it('simple slabs: 0.030 of the span at least when prestressed (AASHTO table 2.5.2.6.3-1, read)', () => {
    expect(named('slab', 'depth').ratio[0]).toBe(0.03);
  });

  it('composite I-girders: 0.032 of a continuous span at least, 0.040 of a simple one (AASHTO table 2.5.2.6.3-1, read)', () => {
    const least = (lengthM: number): number =>
      depthGuidance('composite-i', { spanM: 60, lengthM }).find(({ what }) => what === 'depth')!.ratio[0];
    expect(least(150)).toBe(0.032);
    expect(least(65)).toBe(0.04);
  });

  it('composite I-girders may be haunched: bands of their own, after those of constant depth', () => {
    const bands = depthGuidance('composite-i', { spanM: 60, lengthM: 150 });
    expect(bands.map(({ what }) => what)).toEqual([
      'depth',
      'depth at the support of a haunched deck',
      'midspan depth of a haunched deck',
    ]);
  });

  it('haunched boxes tell support and midspan apart, and say what access needs', () => {
    const bands = depthGuidance('cantilever-box', { spanM: 63 });
    expect(bands.map(({ what }) => what)).toEqual(['depth at the support', 'midspan depth']);
    expect(bands[1]!.leastM).toBe(2.2);
    expect(depthGuidance('cantilever-box', { spanM: 140 })[1]!.leastM).toBeUndefined();
  });

  it('trusses give a height of the span and a floor of the width', () => {
    const bands = depthGuidance('truss', { spanM: 100, widthM: 13 });
    expect(bands.map(({ what, of }) => [what, of])).toEqual([
      ['truss height', 'span'],
      ['floor depth', 'deck width'],
    ]);
    expect(bands[1]!.depthM[0]).toBeCloseTo(1, 1);
  });

  it('launched concrete boxes are deeper, 1/17 to 1/14, and named so', () => {
    const launched = depthGuidance('concrete-box', { spanM: 50, lengthM: 200 }).find(
      ({ method }) => method === 'launch',
    )!;
    expect(1 / launched.ratio[0]).toBeCloseTo(17, 0);
    expect(1 / launched.ratio[1]).toBeCloseTo(14, 0);
  });

  it.each([40, 70, 120, 200])('the depths of guide({spanM: %d}) lie inside, to its 50 mm', (spanM) => {
    for (const { form, depthM } of guide({ spanM, widthM: 12 }).forms) {
      const bands = depthGuidance(form, { spanM, widthM: 12 });
      const under = bands.find(({ what }) => ['floor depth', 'midspan depth', 'depth'].includes(what))!;
      expect(depthM.midspan, form).toBeGreaterThanOrEqual(under.depthM[0] - 0.05);
      expect(depthM.midspan, form).toBeLessThanOrEqual(Math.max(under.depthM[1], under.leastM ?? 0) + 0.05);
    }
  });

  it.each([{ spanM: 0 }, { spanM: NaN }, { spanM: 50, widthM: -1 }])('refuses %o', (task) => {
    expect(() => depthGuidance('slab', task)).toThrow(/expected more than 0 m/u);
  });
});
