import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { quantityOf } from '../../lib/forms/common/measured.ts';
import { concreteBox } from '../../lib/forms/concrete-box/index.ts';
import { standardIds, type Design, type UnitTask } from '../../lib/model/index.ts';
import { boxTask, plainDeck, usualSpans } from '../forms/concrete-box/cases.ts';

const standard = fc.constantFrom(...standardIds);
const method = fc.constantFrom(...concreteBox.methods);
const mainM = fc.double({ min: 20, max: 100, noNaN: true });
const count = fc.integer({ min: 1, max: 5 });
const widthM = fc.double({ min: 8, max: 25, noNaN: true });
const over = fc.double({ min: 14, max: 30, noNaN: true });
const units = fc
  .record({ mainM, count, widthM, over, standard, method })
  .map((u) => boxTask(usualSpans(u.mainM, u.count), u.mainM / u.over, u));

/** Units well inside what is built: nothing past its limit, so that the tendons are what the forces ask for. */
const usualFrom = (leastM: number) =>
  fc
    .record({
      mainM: fc.double({ min: leastM, max: 60, noNaN: true }),
      count,
      widthM: fc.double({ min: 8, max: 18, noNaN: true }),
      over: fc.double({ min: 15, max: 19, noNaN: true }),
      standard,
      method,
    })
    .map((u) => boxTask(usualSpans(u.mainM, u.count), u.mainM / u.over, u));
const usual = usualFrom(30);

const strand = (design: Design): number => quantityOf(design.lines, 'prestress');
const concrete = (design: Design): number => quantityOf(design.lines, 'box-concrete');
const length = (task: UnitTask): number => task.spansM.reduce((sum, span) => sum + span, 0);
/** One strand more or fewer in every web, and the step of the drape. */
const step = (design: Design): number =>
  (strand(design) * design.figures.webs!) / design.figures.strandCount! + 0.02 * strand(design);

describe('concreteBox.size() over its range', () => {
  it('returns finite figures, polygons and quantities, and warns of every limit that is passed', () => {
    fc.assert(
      fc.property(units, (task) => {
        const design = concreteBox.size(task);
        for (const value of Object.values(design.figures)) expect(Number.isFinite(value)).toBe(true);
        for (const { quantity } of design.lines) expect(quantity).toBeGreaterThanOrEqual(0);
        for (const shape of [...design.elevation, ...design.sections.flatMap(({ shapes }) => shapes)])
          for (const [x, z] of [...shape.points, ...(shape.holes ?? []).flat()])
            expect(Number.isFinite(x) && Number.isFinite(z)).toBe(true);
        expect(design.limitingCheck.utilisation).toBe(
          Math.max(...design.checks.map(({ utilisation }) => utilisation)),
        );
        const passed = design.checks.filter(({ utilisation }) => !(utilisation <= 1.0001)).length;
        const assumed = task.method === 'falsework' ? 1 : 0;
        expect(design.warnings).toHaveLength(passed + assumed);
        expect(design.ownWeightShare).toBeGreaterThan(0);
        expect(design.ownWeightShare).toBeLessThan(1);
      }),
      { seed: 601, numRuns: 120 },
    );
  });

  it('carries what it weighs', () => {
    fc.assert(
      fc.property(units, (task) => {
        const design = concreteBox.size(task);
        const gamma = task.standard === 'lm1' ? 25 : 23.563;
        const weight = gamma * concrete(design) + task.deck.superimposedKNm * length(task);
        const sum = design.reactions.reduce((all, { permanentKN }) => all + permanentKN, 0);
        expect(sum / weight).toBeCloseTo(1, 3);
      }),
      { seed: 602, numRuns: 60 },
    );
  });

  it('is the same seen from the other end', () => {
    const uneven = fc
      .record({
        spansM: fc.array(fc.double({ min: 30, max: 50, noNaN: true }), { minLength: 2, maxLength: 4 }),
        standard,
        method: fc.constant('falsework' as const),
      })
      .map(({ spansM, ...rest }) => boxTask(spansM, 2.6, rest));
    fc.assert(
      fc.property(uneven, (task) => {
        const one = concreteBox.size(task);
        const other = concreteBox.size({ ...task, spansM: [...task.spansM].reverse() });
        expect(Math.abs(strand(one) - strand(other))).toBeLessThan(step(one));
        expect(concrete(other) / concrete(one)).toBeCloseTo(1, 2);
        const last = one.reactions.length - 1;
        one.reactions.forEach(({ permanentKN, trafficMaxKN }, j) => {
          expect(other.reactions[last - j]!.permanentKN / permanentKN).toBeCloseTo(1, 2);
          expect(other.reactions[last - j]!.trafficMaxKN / trafficMaxKN).toBeCloseTo(1, 2);
        });
      }),
      { seed: 603, numRuns: 25 },
    );
  });
});

describe('concreteBox.size() moves the right way', () => {
  const grows = (
    title: string,
    change: (task: UnitTask) => UnitTask,
    seen: (before: Design, after: Design) => void,
    seed: number,
    tasks = usual,
  ): void => {
    it(title, () => {
      fc.assert(
        fc.property(tasks, (task) => {
          const before = concreteBox.size(task);
          const after = concreteBox.size(change(task));
          fc.pre(before.limitingCheck.utilisation <= 1 && after.limitingCheck.utilisation <= 1);
          seen(before, after);
        }),
        { seed, numRuns: 40 },
      );
    });
  };

  const longer = (task: UnitTask): UnitTask => ({
    ...task,
    spansM: task.spansM.map((span) => 1.15 * span),
    depthM: 1.15 * task.depthM,
  });
  grows(
    'with the span at the same proportions: more concrete per m2, and more strand where most of the flanges works',
    longer,
    (before, after) => {
      expect(after.figures.concreteM3M2!).toBeGreaterThan(before.figures.concreteM3M2!);
      // On short spans less of the flanges works, which a longer span makes good: there the strand may fall.
      if (before.figures.workingWidthAtPiersM! > 0.5 * before.task.deck.widthM)
        expect(after.figures.strandKgM2!).toBeGreaterThan(before.figures.strandKgM2!);
    },
    611,
  );
  grows(
    'with spans of 40 m and more at the same proportions: more strand per m2',
    longer,
    (before, after) => {
      expect(after.figures.strandKgM2!).toBeGreaterThan(before.figures.strandKgM2!);
    },
    611,
    usualFrom(40),
  );

  grows(
    'with the depth: stiffer, and no more strand',
    (task) => ({ ...task, depthM: 1.1 * task.depthM }),
    (before, after) => {
      expect(after.figures.inertiaM4!).toBeGreaterThan(before.figures.inertiaM4!);
      expect(strand(after)).toBeLessThan(strand(before) + step(before));
    },
    612,
  );

  grows(
    'with the width: more concrete and bars, heavier on its supports',
    (task) => ({ ...task, deck: plainDeck(1.2 * task.deck.widthM) }),
    (before, after) => {
      expect(concrete(after)).toBeGreaterThan(concrete(before));
      expect(quantityOf(after.lines, 'reinforcement')).toBeGreaterThan(
        quantityOf(before.lines, 'reinforcement'),
      );
      after.reactions.forEach(({ permanentKN }, j) =>
        expect(permanentKN).toBeGreaterThan(before.reactions[j]!.permanentKN),
      );
    },
    613,
  );

  grows(
    'with lanes on the same deck: more traffic on the supports and no less strand',
    (task) => ({ ...task, deck: { ...task.deck, carriagewayM: 0.6 * task.deck.carriagewayM } }),
    (more, fewer) => {
      expect(strand(fewer)).toBeLessThan(strand(more) + step(more));
      more.reactions.forEach(({ trafficMaxKN }, j) =>
        expect(trafficMaxKN).toBeGreaterThanOrEqual(0.999 * fewer.reactions[j]!.trafficMaxKN),
      );
    },
    614,
  );

  grows(
    'with the superimposed load: no less strand',
    (task) => ({ ...task, deck: { ...task.deck, superimposedKNm: 2 * task.deck.superimposedKNm } }),
    (before, after) => expect(strand(after)).toBeGreaterThan(strand(before) - step(before)),
    615,
  );
});
