import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { quantityOf } from '../../lib/forms/common/measured.ts';
import { cantileverBox } from '../../lib/forms/cantilever-box/index.ts';
import { standardIds } from '../../lib/model/index.ts';
import { cantileverSpans, cantileverTask } from '../forms/cantilever-box/cases.ts';
import { plainDeck } from '../forms/composite-i/cases.ts';

const mainM = fc.double({ min: 50, max: 300, noNaN: true });
const units = fc
  .record({
    mainM,
    count: fc.integer({ min: 2, max: 5 }),
    widthM: fc.double({ min: 8, max: 22, noNaN: true }),
    over: fc.double({ min: 30, max: 50, noNaN: true }),
    standard: fc.constantFrom(...standardIds),
  })
  .map((u) => cantileverTask(cantileverSpans(u.mainM, u.count), Math.max(2, u.mainM / u.over), u));
const usual = fc
  .record({
    mainM: fc.double({ min: 60, max: 140, noNaN: true }),
    over: fc.double({ min: 30, max: 40, noNaN: true }),
  })
  .map((u) => cantileverTask(cantileverSpans(u.mainM), u.mainM / u.over));

describe('cantileverBox.size() over its range', () => {
  it('returns finite figures and shapes, carries its weight and warns of every limit that is passed', () => {
    fc.assert(
      fc.property(units, (task) => {
        const design = cantileverBox.size(task);
        for (const [name, value] of Object.entries(design.figures))
          expect(Number.isFinite(value), name).toBe(true);
        for (const shape of [...design.elevation, ...design.sections.flatMap(({ shapes }) => shapes)])
          for (const [x, z] of [...shape.points, ...(shape.holes ?? []).flat()])
            expect(Number.isFinite(x) && Number.isFinite(z)).toBe(true);
        const gamma = task.standard === 'lm1' ? 25 : 23.563;
        const lengthM = task.spansM.reduce((sum, span) => sum + span, 0);
        const weight = gamma * quantityOf(design.lines, 'box-concrete') + task.deck.superimposedKNm * lengthM;
        const carried = design.reactions.reduce((sum, { permanentKN }) => sum + permanentKN, 0);
        expect(carried / weight).toBeCloseTo(1, 2);
        const passed = design.checks.filter(({ utilisation }) => !(utilisation <= 1.0001)).length;
        expect(design.warnings.length).toBeGreaterThanOrEqual(passed + 2);
        expect(design.ownWeightShare).toBeGreaterThan(0);
        expect(design.ownWeightShare).toBeLessThan(1);
      }),
      { seed: 701, numRuns: 40 },
    );
  });

  it('takes more concrete and strand per m2 and more of its own weight with the span', () => {
    fc.assert(
      fc.property(usual, (task) => {
        const before = cantileverBox.size(task);
        const after = cantileverBox.size({
          ...task,
          spansM: task.spansM.map((span) => 1.2 * span),
          depthM: 1.2 * task.depthM,
        });
        fc.pre(before.limitingCheck.utilisation <= 1.0001);
        expect(after.figures.concreteM3M2!).toBeGreaterThan(before.figures.concreteM3M2!);
        expect(after.figures.strandKgM2!).toBeGreaterThan(before.figures.strandKgM2!);
        expect(after.ownWeightShare).toBeGreaterThan(before.ownWeightShare);
      }),
      { seed: 702, numRuns: 20 },
    );
  });

  it('takes more concrete and heavier travellers with the width', () => {
    fc.assert(
      fc.property(usual, (task) => {
        const before = cantileverBox.size(task);
        const after = cantileverBox.size({ ...task, deck: plainDeck(1.2 * task.deck.widthM) });
        expect(quantityOf(after.lines, 'box-concrete')).toBeGreaterThan(
          quantityOf(before.lines, 'box-concrete'),
        );
        expect(after.figures.heaviestSegmentKN! / after.figures.segmentM!).toBeGreaterThan(
          before.figures.heaviestSegmentKN! / before.figures.segmentM!,
        );
      }),
      { seed: 703, numRuns: 12 },
    );
  });
});
