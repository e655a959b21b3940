import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { quantityOf } from '../../lib/forms/common/measured.ts';
import { steelBox } from '../../lib/forms/steel-box/index.ts';
import { standardIds, type UnitTask } from '../../lib/model/index.ts';
import { steelBoxTask } from '../forms/steel-box/cases.ts';

const units = fc
  .record({
    mainM: fc.double({ min: 60, max: 260, noNaN: true }),
    count: fc.integer({ min: 1, max: 4 }),
    widthM: fc.double({ min: 8, max: 30, noNaN: true }),
    over: fc.double({ min: 20, max: 45, noNaN: true }),
    standard: fc.constantFrom(...standardIds),
    method: fc.constantFrom('balanced-cantilever' as const, 'launch' as const),
    planRadiusM: fc.constantFrom(Infinity, 400),
  })
  .map(({ mainM, count, over, ...rest }) => {
    const spansM = Array.from({ length: count }, (_, i) =>
      count > 1 && (i === 0 || i === count - 1) ? 0.8 * mainM : mainM,
    );
    return steelBoxTask(spansM, mainM / over, rest);
  });

const kgPerM = (task: UnitTask): number =>
  quantityOf(steelBox.size(task).lines, 'orthotropic-steel') /
  task.spansM.reduce((sum, span) => sum + span, 0);

describe('steelBox.size() over its range', () => {
  it('returns finite figures, polygons and quantities, and warns of every limit that is passed', () => {
    fc.assert(
      fc.property(units, (task) => {
        const design = steelBox.size(task);
        for (const [name, value] of Object.entries(design.figures))
          expect(Number.isFinite(value), name).toBe(true);
        for (const { quantity } of design.lines) expect(quantity).toBeGreaterThanOrEqual(0);
        for (const shape of [...design.elevation, ...design.sections.flatMap(({ shapes }) => shapes)])
          for (const [x, z] of shape.points) expect(Number.isFinite(x) && Number.isFinite(z)).toBe(true);
        const over = design.checks.filter(({ utilisation }) => !(utilisation <= 1.0001)).length;
        expect(design.warnings.length).toBeGreaterThanOrEqual(over);
        expect(design.depthM.midspan).toBe(task.depthM);
        expect(design.depthM.support).toBeGreaterThanOrEqual(task.depthM);
      }),
      { seed: 831, numRuns: 30 },
    );
  });

  it('needs more steel on a longer span at the same slenderness, and on a wider deck', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 60, max: 200, noNaN: true }),
        fc.double({ min: 9, max: 26, noNaN: true }),
        fc.constantFrom(...standardIds),
        (mainM, widthM, standard) => {
          const steel = (L: number, w: number): number =>
            kgPerM(steelBoxTask([0.8 * L, L, 0.8 * L], L / 28, { standard, widthM: w }));
          const here = steel(mainM, widthM);
          expect(steel(1.2 * mainM, widthM)).toBeGreaterThan(here);
          expect(steel(mainM, 1.2 * widthM)).toBeGreaterThan(here);
        },
      ),
      { seed: 832, numRuns: 10 },
    );
  });

  it('changes by no more than a step of plate from one span to the next', () => {
    const steel = Array.from({ length: 29 }, (_, k) => {
      const L = 60 + 5 * k;
      return kgPerM(steelBoxTask([0.8 * L, L, 0.8 * L], L / 28));
    });
    // Five metres more are 2 to 8 % of span; 2 mm of 12 on all plates were 15 %.
    for (let k = 1; k < steel.length; k++) {
      expect(steel[k]! / steel[k - 1]!).toBeGreaterThan(0.98);
      expect(steel[k]! / steel[k - 1]!).toBeLessThan(1.08);
    }
  });
});
