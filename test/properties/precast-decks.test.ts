import fc from 'fast-check';
import { expect, it } from 'vitest';
import { formModule } from '../../lib/forms/index.ts';

it.each(['precast-trough', 'adjacent-box'] as const)(
  'size(task) of %s is finite and mirrors with its spans, over its range',
  (form) => {
    fc.assert(
      fc.property(
        fc.array(fc.integer({ min: 12, max: 43 }), { minLength: 1, maxLength: 3 }),
        fc.integer({ min: 7, max: 26 }),
        fc.constantFrom('lm1' as const, 'hl93' as const),
        fc.integer({ min: 30, max: 62 }),
        (spansM, widthM, standard, perMille) => {
          const task = {
            form,
            spansM,
            deck: {
              widthM,
              carriagewayM: widthM - 1,
              carriagewayOffsetM: 0,
              lanes: 2,
              footwayM: 0,
              surfacingM: 0.09,
              superimposedKNm: 3 * widthM,
            },
            standard,
            planRadiusM: Infinity,
            method: 'crane' as const,
            depthM: (Math.max(...spansM) * perMille) / 1000,
          };
          const design = formModule(form).size(task);
          const back = formModule(form).size({ ...task, spansM: [...spansM].reverse() });
          for (const { utilisation } of design.checks) expect(Number.isNaN(utilisation)).toBe(false);
          for (const line of design.lines) expect(line.quantity).toBeGreaterThanOrEqual(0);
          for (const value of Object.values(design.figures)) expect(Number.isFinite(value)).toBe(true);
          design.lines.forEach(({ quantity }, i) => {
            expect(back.lines[i]!.quantity / Math.max(1, quantity)).toBeCloseTo(
              quantity / Math.max(1, quantity),
              2,
            );
          });
        },
      ),
      { seed: 20261202, numRuns: 15 },
    );
  },
);
