import { describe, expect, it } from 'vitest';
import { figure, figurePaths } from '../../../lib/explain/index.ts';
import { quantityOf } from '../../../lib/forms/common/measured.ts';
import { crackWidthMm } from '../../../lib/forms/slab/crackedSection.ts';
import { slab } from '../../../lib/forms/slab/index.ts';
import { concreteShearMPa } from '../../../lib/forms/slab/slabShear.ts';
import { concrete } from '../../../lib/actions/index.ts';
import { itemOf } from '../../../lib/takeoff/index.ts';
import { lowFerry } from '../../appraise/studies.ts';
import { deck, slabTask } from './cases.ts';
import { answerTo } from '../../appraise/answerTo.ts';

const useOf = (design: ReturnType<typeof slab.size>, id: string): number =>
  design.checks.find((check) => check.id === id)!.utilisation;

describe('slab.size()', () => {
  it.each([
    [{ spansM: [] }, /spansM/u],
    [{ depthM: NaN }, /depthM/u],
    [{ deck: { ...deck, carriagewayM: 13 } }, /carriagewayM/u],
  ])('size(%o) says what is wrong', (change, message) => {
    expect(() => slab.size({ ...slabTask([12], 0.6), ...change })).toThrow(message);
  });

  it('is reinforced on short spans, prestressed on longer ones and voided where deep', () => {
    const short = slab.size(slabTask([12, 14, 12], 0.62));
    expect(quantityOf(short.lines, 'prestress')).toBe(0);
    expect(short.figures.voids).toBe(0);
    const long = slab.size(slabTask([24, 30, 24], 1.1));
    expect(quantityOf(long.lines, 'prestress')).toBeGreaterThan(0);
    expect(long.figures.voids).toBeGreaterThan(1);
    for (const design of [short, long])
      for (const { id, utilisation } of design.checks) expect(utilisation, id).toBeLessThanOrEqual(1);
  });

  it('measures only items of the bill, each with a quantity', () => {
    for (const task of [slabTask([12], 0.62), slabTask([24, 30, 24], 1.1)])
      for (const { item, quantity } of slab.size(task).lines) {
        expect(() => itemOf(item)).not.toThrow();
        expect(quantity).toBeGreaterThan(0);
      }
  });

  it('carries its weight: permanent reactions are the measured concrete and the superimposed load', () => {
    for (const task of [slabTask([12, 14, 12], 0.62), slabTask([24, 30, 24], 1.1)]) {
      const design = slab.size(task);
      const length = task.spansM.reduce((sum, span) => sum + span, 0);
      const sum = design.reactions.reduce((all, { permanentKN }) => all + permanentKN, 0);
      expect(sum / (25 * quantityOf(design.lines, 'deck-concrete') + 33 * length)).toBeCloseTo(1, 6);
    }
  });

  it('holds the moment of a simple reinforced span by hand: w L2 / 8 and the tandem at midspan over its strip', () => {
    const { figures, lines } = slab.size(slabTask([12], 0.6));
    const area = quantityOf(lines, 'deck-concrete') / 12;
    expect(figures.span1OwnKNm! / ((25 * area * 144) / 8)).toBeCloseTo(1, 6);
    // Two axles of 300 kN 1.2 m apart, one 0.3 m off the middle (the absolute greatest lies there): stations every 0.6 m.
    const line = 300 * (12 / 4) + 300 * (12 / 4 - 0.6);
    const traffic = (12 / figures.vehicleWidthM!) * line + (12 * figures.heaviestUniformKNm2! * 144) / 8;
    expect(figures.span1TrafficKNm! / traffic).toBeCloseTo(1, 3);
  });

  it('decompresses no simple prestressed span by hand: P (1 / A + e / W) against the moments in service', () => {
    const design = slab.size(slabTask([20], 0.85));
    const f = design.figures;
    const { areaM2, inertiaM4, centroidFromTopM, tendonForceKN, eccentricityMidspanM } = f;
    const e = eccentricityMidspanM!;
    // Concrete to 100 mm beyond the duct stays compressed; tendons count at 0.9 in service (EN 1992-1-1 5.10.9).
    const duct = 0.85 - 0.1 - (centroidFromTopM! + e);
    const down = Math.min(0.85 - centroidFromTopM!, e + duct + 0.1) / inertiaM4!;
    const vehicle = (12 / f.vehicleWidthM!) * (300 * 5 + 300 * 4.4);
    const uniform = (12 * f.heaviestUniformKNm2! * 400) / 8;
    const moment = f.span1OwnKNm! + (33 * 400) / 8 + 0.75 * vehicle + 0.4 * uniform;
    const stress = 0.9 * tendonForceKN! * (1 / areaM2! + e * down) - moment * down;
    expect(stress).toBeGreaterThan(-60);
    // A strand fewer in every tendon would not do.
    const fewer = 0.9 * tendonForceKN! * (1 - f.tendonCount! / f.strandCount!) * (1 / areaM2! + e * down);
    expect(fewer - moment * down).toBeLessThan(0);
  });

  it('lets a shallow slab fail with a warning instead of hiding it', () => {
    const design = slab.size(slabTask([14], 0.35));
    expect(design.limitingCheck.utilisation).toBeGreaterThan(1);
    expect(design.warnings.some((warning) => /with the heaviest practical bars/u.test(warning))).toBe(true);
  });

  it('measures falsework under the soffit', () => {
    const { lines } = slab.size(slabTask([12, 14, 12], 0.62, { clearUnderM: [6, 7, 8, 6] }));
    const volume = 12 * (12 * 6.5 + 14 * 7.5 + 12 * 7);
    expect(quantityOf(lines, 'falsework')).toBeCloseTo(volume, 6);
  });

  it('needs more concrete and steel under wider carriageways and longer spans, and fewer strands when deeper', () => {
    const strand = (depthM: number): number =>
      quantityOf(slab.size(slabTask([22], depthM)).lines, 'prestress');
    expect(strand(0.8)).toBeGreaterThan(strand(0.88));
    const bars = (spanM: number): number =>
      quantityOf(slab.size(slabTask([spanM], 0.6)).lines, 'reinforcement') / spanM;
    expect(bars(12)).toBeGreaterThan(bars(9));
    expect(useOf(slab.size(slabTask([12], 0.6)), 'deflection')).toBeGreaterThan(
      useOf(slab.size(slabTask([12], 0.7)), 'deflection'),
    );
  });
});

describe('crackWidthMm()', () => {
  it('follows the steps of EN 1992-1-1 7.3.4 by hand', () => {
    const c35 = concrete('lm1', 35);
    const strip = { depthM: 0.6, effectiveM: 0.6 - 0.045 - 0.0125, barM: 0.025 };
    const area = (Math.PI * 0.025 ** 2) / 4 / 0.125;
    const width = crackWidthMm(strip, area, 500, 'lm1', c35);
    // n = 200 / (0.5 x 34.08) = 11.74, n As = 0.0461 m; x = -0.0461 + root(0.0461^2 + 2 x 0.0461 x 0.5425) = 0.1824 m;
    // sigma = 500 / (0.003927 x (0.5425 - 0.0608)) = 264 MPa; tied depth min(2.5 x 0.0575, (0.6 - 0.182) / 3) = 0.139 m;
    // rho = 0.0282; s = 3.4 x 45 + 0.17 x 25 / 0.0282 = 304 mm; 0.4 x 3.21 / 0.0282 x (1 + 5.87 x 0.0282) = 53 MPa;
    // strain = (264 - 53) / 200000 = 1.055e-3; width 0.32 mm.
    expect(width).toBeCloseTo(0.32, 2);
  });
});

describe('concreteShearMPa()', () => {
  it('is 0.12 k (100 rho fck)^1/3 and no less than 0.035 k^1.5 root fck', () => {
    const model = { standardId: 'lm1' as const, concrete: concrete('lm1', 35) };
    // d 0.5 m: k = 1.632; rho 1 %: 0.12 x 1.632 x 35^(1/3) = 0.641 MPa; no bars: 0.035 x 1.632^1.5 x root 35 = 0.432.
    expect(concreteShearMPa(model, 0.5, 0.01, { axialMPa: 0 })).toBeCloseTo(0.641, 3);
    expect(concreteShearMPa(model, 0.5, 0, { axialMPa: 0 })).toBeCloseTo(0.432, 3);
    expect(concreteShearMPa(model, 0.5, 0.01, { axialMPa: 2 })).toBeCloseTo(0.641 + 0.3, 3);
  });
});

it('appraise(study) with slabs explains every figure of theirs in its own words', { timeout: 60_000 }, () => {
  const study = lowFerry();
  const river = { fromM: 1344, toM: 1366 };
  const narrow = {
    ...study,
    brief: {
      ...study.brief,
      obstacles: study.brief.obstacles.map((one) =>
        one.kind === 'river' && one.supports === 'hard' ? { ...one, ...river } : one,
      ),
    },
    books: { ...study.books, draws: 1000 },
    options: { ...study.options, forms: ['slab' as const], kept: [] },
  };
  const context = { study: narrow, appraisal: answerTo(narrow) };
  expect(context.appraisal.options.length).toBeGreaterThan(0);
  const unsaid = figurePaths(context).filter((path) =>
    /its unit stands at the end of its name|^(demand|capacity) of the check '/u.test(
      figure(context, path).because.formula,
    ),
  );
  expect(unsaid).toEqual([]);
});
