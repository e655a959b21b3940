import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { quantityOf } from '../../lib/forms/common/measured.ts';
import { compositeBox } from '../../lib/forms/composite-box/index.ts';
import { standardIds } from '../../lib/model/index.ts';
import { tubTask } from '../forms/composite-box/cases.ts';

const units = fc
  .record({
    mainM: fc.double({ min: 30, max: 130, noNaN: true }),
    count: fc.integer({ min: 1, max: 4 }),
    widthM: fc.double({ min: 8, max: 24, noNaN: true }),
    over: fc.double({ min: 18, max: 32, noNaN: true }),
    standard: fc.constantFrom(...standardIds),
    planRadiusM: fc.constantFrom(Infinity, 250, 800),
  })
  .map(({ mainM, count, over, ...rest }) => {
    const spansM = Array.from({ length: count }, (_, i) =>
      count > 1 && (i === 0 || i === count - 1) ? 0.8 * mainM : mainM,
    );
    return tubTask(spansM, mainM / over, rest);
  });

describe('compositeBox.size() over its range', () => {
  it('returns finite figures, polygons and quantities, and warns of every limit that is passed', () => {
    fc.assert(
      fc.property(units, (task) => {
        const design = compositeBox.size(task);
        for (const [name, value] of Object.entries(design.figures))
          expect(Number.isFinite(value), name).toBe(true);
        for (const { quantity } of design.lines) expect(quantity).toBeGreaterThan(0);
        for (const shape of [...design.elevation, ...design.sections.flatMap(({ shapes }) => shapes)])
          for (const [x, z] of shape.points) expect(Number.isFinite(x) && Number.isFinite(z)).toBe(true);
        expect(design.warnings).toHaveLength(
          design.checks.filter(({ utilisation }) => !(utilisation <= 1.0001)).length,
        );
        expect(design.figures.closedOverOpen).toBeGreaterThan(10);
      }),
      { seed: 821, numRuns: 40 },
    );
  });

  // Moments that are nothing, over the abutments above all, are so to rounding only: no steel may hang on their sign.
  it('does not jump when its loads change by a millionth', () => {
    fc.assert(
      fc.property(fc.double({ min: 40, max: 110, noNaN: true }), (mainM) => {
        const task = tubTask([0.8 * mainM, mainM, 0.8 * mainM], mainM / 25);
        const steel = (share: number): number => {
          const { lines } = compositeBox.size({
            ...task,
            deck: { ...task.deck, superimposedKNm: share * task.deck.superimposedKNm },
          });
          return quantityOf(lines, 'plate-girder-steel');
        };
        for (const share of [1 + 1e-6, 1 - 1e-6])
          expect(Math.abs(steel(share) / steel(1) - 1)).toBeLessThan(1e-4);
      }),
      { seed: 823, numRuns: 20 },
    );
  });

  it('needs more steel on a longer span at the same slenderness', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 40, max: 90, noNaN: true }),
        fc.constantFrom(...standardIds),
        (mainM, standard) => {
          const steel = (L: number): number => {
            const { lines } = compositeBox.size(tubTask([0.8 * L, L, 0.8 * L], L / 25, { standard }));
            return quantityOf(lines, 'plate-girder-steel') / L;
          };
          expect(steel(1.15 * mainM)).toBeGreaterThan(steel(mainM));
        },
      ),
      { seed: 822, numRuns: 12 },
    );
  });
});
