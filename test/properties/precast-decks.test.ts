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

it('size(task) of spliced precast-i is finite, over its range', () => {
  fc.assert(
    fc.property(
      fc.integer({ min: 51, max: 73 }),
      fc.integer({ min: 60, max: 100 }),
      fc.integer({ min: 1, max: 4 }),
      fc.integer({ min: 8, max: 20 }),
      fc.constantFrom('lm1' as const, 'hl93' as const),
      (spanM, percent, count, widthM, standard) => {
        const spansM = Array.from({ length: count }, (_, i) =>
          i > 0 && i < count - 1 ? spanM : count === 1 ? spanM : Math.max(51, (spanM * percent) / 100),
        );
        const design = formModule('precast-i').size({
          form: 'precast-i',
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
          method: 'crane',
          depthM: 0.042 * spanM,
        });
        expect(design.staging).toBeDefined();
        for (const { utilisation } of design.checks) expect(Number.isNaN(utilisation)).toBe(false);
        for (const line of design.lines) expect(line.quantity).toBeGreaterThanOrEqual(0);
        for (const value of Object.values(design.figures)) expect(Number.isFinite(value)).toBe(true);
        for (const { permanentKN } of design.reactions) expect(permanentKN).toBeGreaterThan(0);
      },
    ),
    { seed: 20261203, numRuns: 12 },
  );
});
