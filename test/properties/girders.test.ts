import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { quantityOf } from '../../lib/forms/common/measured.ts';
import { compositeI } from '../../lib/forms/composite-i/index.ts';
import { standardIds, type Design, type UnitTask } from '../../lib/model/index.ts';
import { girderTask, plainDeck } from '../forms/composite-i/cases.ts';

const steelOf = (design: Design): number => quantityOf(design.lines, 'plate-girder-steel');
const steelKgM2 = (task: UnitTask): number =>
  steelOf(compositeI.size(task)) / (task.deck.widthM * task.spansM.reduce((sum, span) => sum + span, 0));

const standard = fc.constantFrom(...standardIds);
const mainM = fc.double({ min: 25, max: 85, noNaN: true });
const side = fc.double({ min: 0.6, max: 1, noNaN: true });
const widthM = fc.double({ min: 8, max: 25, noNaN: true });
const slenderness = fc.double({ min: 18, max: 27, noNaN: true });
const units = fc
  .tuple(mainM, side, fc.integer({ min: 1, max: 4 }), widthM, slenderness, standard)
  .map(([main, ratio, count, width, over, id]) => {
    const spans =
      count === 1 ? [main] : [ratio * main, ...Array.from({ length: count - 2 }, () => main), ratio * main];
    return girderTask(spans, Math.max(1.1, Math.max(...spans) / over), { widthM: width, standard: id });
  });

describe('compositeI.size() over its range', () => {
  it('returns finite figures, polygons and quantities, and a limiting check that is the highest', () => {
    fc.assert(
      fc.property(units, (task) => {
        const design = compositeI.size(task);
        for (const value of Object.values(design.figures)) expect(Number.isFinite(value)).toBe(true);
        for (const line of design.lines) expect(line.quantity).toBeGreaterThanOrEqual(0);
        for (const { shapes } of design.sections)
          for (const { points } of shapes)
            for (const [x, z] of points) expect(Number.isFinite(x) && Number.isFinite(z)).toBe(true);
        const highest = Math.max(...design.checks.map((check) => check.utilisation));
        expect(design.limitingCheck.utilisation).toBe(highest);
        expect(design.warnings.length > 0).toBe(highest > 1.0001);
        expect(design.ownWeightShare).toBeGreaterThanOrEqual(0);
        expect(design.ownWeightShare).toBeLessThanOrEqual(1);
      }),
      { seed: 501, numRuns: 60 },
    );
  });

  it('carries its permanent load: reactions sum to the weights that were measured', () => {
    fc.assert(
      fc.property(units, (task) => {
        const design = compositeI.size(task);
        const concrete = task.standard === 'lm1' ? 25 : 23.563;
        const lengthM = task.spansM.reduce((sum, span) => sum + span, 0);
        // Forms that stay under the slab are part of the formwork that is measured, and weigh 15 psf.
        const formsKNm2 = task.standard === 'lm1' ? 0 : 0.72;
        const weight =
          formsKNm2 * task.deck.widthM * lengthM +
          steelOf(design) * 9.81e-3 +
          quantityOf(design.lines, 'deck-concrete') * concrete +
          task.deck.superimposedKNm * lengthM;
        const sum = design.reactions.reduce((all, reaction) => all + reaction.permanentKN, 0);
        expect(sum / weight).toBeGreaterThan(0.995);
        expect(sum / weight).toBeLessThan(1.005);
      }),
      { seed: 502, numRuns: 40 },
    );
  });

  it('takes more steel per m2 for longer spans at the same slenderness', () => {
    // Below about 30 m the damage factor of lorries falls with the span as fast as moments rise: the curve is flat there.
    const from30 = fc.double({ min: 30, max: 80, noNaN: true });
    fc.assert(
      fc.property(from30, side, slenderness, standard, (main, ratio, over, id) => {
        const at = (spanM: number): number =>
          steelKgM2(girderTask([ratio * spanM, spanM, ratio * spanM], spanM / over, { standard: id }));
        // A plate step is worth up to about 3 % of the steel: spans a quarter apart are beyond it.
        expect(at(1.25 * main)).toBeGreaterThan(at(main));
      }),
      { seed: 503, numRuns: 25 },
    );
  });

  it('takes more steel in all for a wider deck on the same number of girders', () => {
    fc.assert(
      fc.property(fc.double({ min: 8, max: 13, noNaN: true }), mainM, standard, (width, main, id) => {
        const at = (w: number): number =>
          steelOf(compositeI.size(girderTask([main, main], main / 23, { widthM: w, standard: id })));
        expect(at(width + 1.9)).toBeGreaterThan(at(width) * 0.99);
      }),
      { seed: 504, numRuns: 25 },
    );
  });

  it('takes less steel the deeper it is, up to the depth at which webs outgrow the flanges', () => {
    fc.assert(
      fc.property(mainM, standard, (main, id) => {
        const steel = [34, 30, 26.5].map((over) =>
          steelKgM2(girderTask([0.8 * main, main, 0.8 * main], Math.max(1.1, main / over), { standard: id })),
        );
        expect(steel[1]!).toBeLessThanOrEqual(steel[0]! * 1.005);
        expect(steel[2]!).toBeLessThanOrEqual(steel[1]! * 1.02);
      }),
      { seed: 505, numRuns: 20 },
    );
  });

  it('never gets lighter with more load: lanes on a wider carriageway, superimposed load, the heavier standard', () => {
    fc.assert(
      fc.property(mainM, fc.double({ min: 10, max: 60, noNaN: true }), (main, addedKNm) => {
        const deck = plainDeck(12);
        const spans = [0.8 * main, main, 0.8 * main];
        const at = (changes: Partial<UnitTask>): number => steelKgM2(girderTask(spans, main / 23, changes));
        const plain = at({});
        expect(at({ deck: { ...deck, superimposedKNm: deck.superimposedKNm + addedKNm } })).toBeGreaterThan(
          plain * 0.995,
        );
        expect(at({ deck: { ...deck, carriagewayM: 8, lanes: 2 } })).toBeLessThan(plain * 1.005);
        expect(at({ standard: 'hl93' })).toBeLessThan(plain);
      }),
      { seed: 506, numRuns: 20 },
    );
  });

  it('moves without a jump: 2 % more span never changes the steel by more than a plate step', () => {
    fc.assert(
      fc.property(mainM, slenderness, standard, (main, over, id) => {
        const at = (spanM: number): number =>
          steelKgM2(girderTask([0.8 * spanM, spanM, 0.8 * spanM], spanM / over, { standard: id }));
        const before = at(main);
        const after = at(1.02 * main);
        // Steel grows about as span to the 1.3: 2.6 %; plate steps and bracing bays add up to 6 %.
        expect(after / before).toBeGreaterThan(0.94);
        expect(after / before).toBeLessThan(1.09);
      }),
      { seed: 507, numRuns: 40 },
    );
  });
});
