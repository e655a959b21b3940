import fc from 'fast-check';
import { expect, it } from 'vitest';
import { precastI } from '../../lib/forms/precast-i/index.ts';

it('precastI.size(task) is finite and mirrors with its spans, over its range', () => {
  fc.assert(
    fc.property(
      fc.array(fc.integer({ min: 10, max: 50 }), { minLength: 1, maxLength: 4 }),
      fc.integer({ min: 7, max: 26 }),
      fc.constantFrom('lm1' as const, 'hl93' as const),
      fc.integer({ min: 40, max: 65 }),
      (spansM, widthM, standard, perMille) => {
        const task = {
          form: 'precast-i' as const,
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
        const design = precastI.size(task);
        const back = precastI.size({ ...task, spansM: [...spansM].reverse() });
        for (const { utilisation } of design.checks) expect(Number.isNaN(utilisation)).toBe(false);
        for (const line of design.lines) expect(line.quantity).toBeGreaterThanOrEqual(0);
        for (const value of Object.values(design.figures)) expect(Number.isFinite(value)).toBe(true);
        // Links are what is left of the shear past the concrete: a few parts in 100,000 of the traffic grow in them.
        design.lines.forEach(({ quantity }, i) => {
          expect(back.lines[i]!.quantity / Math.max(1, quantity)).toBeCloseTo(
            quantity / Math.max(1, quantity),
            2,
          );
        });
        const ends = [design.reactions[0]!.permanentKN, back.reactions.at(-1)!.permanentKN] as const;
        // Both ends weigh the same whichever way the unit is read.
        expect(ends[0] / ends[1]).toBeCloseTo(1, 6);
      },
    ),
    { seed: 20261201, numRuns: 40 },
  );
});
