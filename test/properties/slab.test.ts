import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { quantityOf } from '../../lib/forms/common/measured.ts';
import { slab } from '../../lib/forms/slab/index.ts';
import { standardIds } from '../../lib/model/index.ts';
import { deck, slabTask } from '../forms/slab/cases.ts';

const units = fc
  .record({
    mainM: fc.double({ min: 6, max: 41, noNaN: true }),
    count: fc.integer({ min: 1, max: 5 }),
    widthM: fc.double({ min: 6, max: 22, noNaN: true }),
    over: fc.double({ min: 15, max: 40, noNaN: true }),
    standard: fc.constantFrom(...standardIds),
  })
  .map(({ mainM, count, widthM, over, standard }) => {
    const ends = count > 1;
    const spansM = Array.from({ length: count }, (_, i) =>
      ends && (i === 0 || i === count - 1) ? 0.8 * mainM : mainM,
    );
    const wide = { ...deck, widthM, carriagewayM: widthM - 1 };
    return slabTask(spansM, mainM / over, { standard, deck: wide });
  });

describe('slab.size() over its range', () => {
  it('returns finite figures, polygons and quantities, carries what it weighs, and warns of every limit passed', () => {
    fc.assert(
      fc.property(units, (task) => {
        const design = slab.size(task);
        for (const [name, value] of Object.entries(design.figures))
          expect(Number.isFinite(value), name).toBe(true);
        for (const { quantity } of design.lines) expect(quantity).toBeGreaterThanOrEqual(0);
        for (const shape of [...design.elevation, ...design.sections.flatMap(({ shapes }) => shapes)])
          for (const [x, z] of [...shape.points, ...(shape.holes ?? []).flat()])
            expect(Number.isFinite(x) && Number.isFinite(z)).toBe(true);
        const length = task.spansM.reduce((sum, span) => sum + span, 0);
        const gamma = task.standard === 'lm1' ? 25 : 23.563;
        const weight = gamma * quantityOf(design.lines, 'deck-concrete') + 33 * length;
        const borne = design.reactions.reduce((sum, { permanentKN }) => sum + permanentKN, 0);
        expect(borne / weight).toBeCloseTo(1, 3);
        const passed = design.checks.filter(({ utilisation }) => !(utilisation <= 1.0001)).length;
        expect(design.warnings).toHaveLength(passed + 1);
      }),
      { seed: 811, numRuns: 80 },
    );
  });

  it('looks the same from the other end', () => {
    fc.assert(
      fc.property(units, (task) => {
        const spansM = task.spansM.map((span, i) => span * (1 + 0.04 * i));
        const one = slab.size({ ...task, spansM });
        const other = slab.size({ ...task, spansM: [...spansM].reverse() });
        for (const item of ['deck-concrete', 'reinforcement', 'prestress'])
          expect(quantityOf(one.lines, item) / Math.max(1, quantityOf(other.lines, item))).toBeCloseTo(
            quantityOf(one.lines, item) > 1 ? 1 : 0,
            1,
          );
      }),
      { seed: 812, numRuns: 30 },
    );
  });
});
