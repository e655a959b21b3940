import { describe, expect, it } from 'vitest';
import { guide } from '../lib/guide.ts';
import { formIds } from '../lib/model/index.ts';
import { spanWindow } from '../lib/rules/index.ts';

const rank = { in: 0, possible: 1, out: 2 } as const;
const form = (answer: ReturnType<typeof guide>, id: string) => answer.forms.find((one) => one.form === id)!;

describe('guide({spanM, widthM, lengthM, radiusM})', () => {
  it.each([8, 30, 60, 120, 250, 600, 1500])(
    '%d m: answers for every form once, best first, each with its reason',
    (spanM) => {
      const { forms } = guide({ spanM });
      expect([...forms.map((one) => one.form)].sort()).toEqual([...formIds].sort());
      const ranks = forms.map(({ status }) => rank[status]);
      expect(ranks).toEqual([...ranks].sort((a, b) => a - b));
      for (const one of forms) {
        expect(one.because.length, one.form).toBeGreaterThan(0);
        expect(one.sources.length, one.form).toBeGreaterThan(0);
        expect(one.depthM.support).toBeGreaterThanOrEqual(one.depthM.midspan);
        expect(one.depthM.midspan).toBeGreaterThan(0);
      }
    },
  );

  it.each([
    [12, 'slab'],
    [30, 'precast-i'],
    [52, 'composite-i'],
    [66, 'composite-box'],
    [100, 'cantilever-box'],
    [183, 'truss'],
    [250, 'cable-stayed'],
    [700, 'suspension'],
  ] as const)('%d m: %s is in', (spanM, id) => {
    expect(form(guide({ spanM }), id).status).toBe('in');
  });

  it('making the change that is named brings the status that is named', () => {
    for (const spanM of [15, 45, 95, 180, 400])
      for (const one of guide({ spanM, radiusM: 800 }).forms) {
        expect(one.flip?.becomes, one.form).not.toBe(one.status);
        if (one.flip?.fact === 'mainSpanM')
          expect(form(guide({ spanM: one.flip.to, radiusM: 800 }), one.form).status, one.form).toBe(
            one.flip.becomes,
          );
        if (one.flip?.fact === 'planRadiusM')
          expect(form(guide({ spanM, radiusM: one.flip.to }), one.form).status, one.form).toBe(
            one.flip.becomes,
          );
      }
  });

  it('depths lie inside the published bands, to 50 mm', () => {
    // Composite girders, simple: 0.040 to 0.050 of 60 m; floor of a truss: 1/13 to 1/7 of 12 m, the span does not matter.
    const { depthM } = form(guide({ spanM: 60 }), 'composite-i');
    expect(depthM.midspan).toBeGreaterThan(2.4);
    expect(depthM.midspan).toBeLessThan(3.0);
    for (const spanM of [100, 200]) {
      const floor = form(guide({ spanM }), 'truss').depthM;
      expect(floor.midspan).toBeGreaterThan(12 / 13);
      expect(floor.midspan).toBeLessThan(12 / 7);
    }
    // Haunched box: pier 1/20 to 1/16, midspan 1/50 to 1/30 of 120 m.
    const haunched = form(guide({ spanM: 120 }), 'cantilever-box').depthM;
    expect(haunched.support).toBeGreaterThan(6);
    expect(haunched.support).toBeLessThan(7.5);
    expect(haunched.midspan).toBeGreaterThan(2.4);
    expect(haunched.midspan).toBeLessThan(4);
  });

  it('a curve brings cautions, and puts straight forms out', () => {
    expect(form(guide({ spanM: 60, radiusM: 200 }), 'composite-i').status).toBe('possible');
    expect(form(guide({ spanM: 180, radiusM: 250 }), 'truss').status).toBe('out');
  });

  it('a length that leaves room for side spans makes the unit continuous, and shallower', () => {
    const alone = form(guide({ spanM: 60 }), 'composite-i').depthM.midspan;
    expect(form(guide({ spanM: 60, lengthM: 150 }), 'composite-i').depthM.midspan).toBeLessThan(alone);
    expect(form(guide({ spanM: 60, lengthM: 70 }), 'composite-i').depthM.midspan).toBe(alone);
  });

  it('a length without room for side spans is a caution for stayed decks', () => {
    expect(form(guide({ spanM: 250, lengthM: 300 }), 'cable-stayed').status).toBe('possible');
    expect(form(guide({ spanM: 250, lengthM: 500 }), 'cable-stayed').status).toBe('in');
  });

  it('says of a form between usual and longest where it stands', () => {
    const { usual, possible } = spanWindow('composite-i');
    const between = (usual[1] + possible[1]) / 2;
    expect(form(guide({ spanM: between }), 'composite-i').because.join()).toMatch(
      /outside the usual 30 to 91 m/,
    );
  });

  it.each([
    [{ spanM: 0 }, /spanM: expected more than 0 m/],
    [{ spanM: NaN }, /spanM/],
    [{ spanM: 50, widthM: -1 }, /widthM/],
    [{ spanM: 50, lengthM: 40 }, /at least the span of 50 m/],
  ])('refuses %o', (task, message) => {
    expect(() => guide(task)).toThrow(message);
  });
});
