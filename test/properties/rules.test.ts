import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { methodIds, type Facts, type FactValue } from '../../lib/model/index.ts';
import {
  evaluate,
  factDictionary,
  flip,
  rules,
  wholeCondition,
  windowOf,
  type Condition,
} from '../../lib/rules/index.ts';
import { factsIn, limitsOn } from '../../lib/rules/limitsOn.ts';

const seed = 20260415;
const dictionary = new Map(factDictionary.map((fact) => [fact.id, fact]));

/** Values of one fact of a rule: round its limits, on them, far from them, and unknown. */
function valuesOf(id: string, condition: Condition): fc.Arbitrary<FactValue> {
  const { kind, step = 1, values = methodIds } = dictionary.get(id)!;
  if (kind === 'boolean') return fc.constantFrom<FactValue>(true, false, 'unknown');
  if (kind === 'text') return fc.constantFrom<FactValue>(...values, 'unknown');
  const limits = limitsOn(condition, id, {});
  const near = limits.length > 0 ? limits : [10 * step];
  return fc.oneof(
    {
      weight: 4,
      arbitrary: fc
        .tuple(fc.constantFrom(...near), fc.integer({ min: -3, max: 3 }))
        .map(([x, n]) => x + n * step),
    },
    {
      weight: 4,
      arbitrary: fc
        .tuple(fc.constantFrom(...near), fc.double({ min: 0, max: 4, noNaN: true }))
        .map(([x, k]) => x * k),
    },
    { weight: 1, arbitrary: fc.constant<FactValue>('unknown') },
  );
}

const factsFor = (condition: Condition): fc.Arbitrary<Facts> =>
  fc.record(Object.fromEntries(factsIn(condition).map((id) => [id, valuesOf(id, condition)])));

describe('flip(condition, facts) on every rule', () => {
  it.each(rules.map((rule) => [rule.id, wholeCondition(rule)] as const))(
    '[R12] %s: making the change turns it, and no smaller change of that number does',
    (_id, condition) => {
      let turned = 0;
      fc.assert(
        fc.property(factsFor(condition), fc.double({ min: 0.01, max: 0.99, noNaN: true }), (facts, part) => {
          const before = evaluate(condition, facts).truth;
          const change = flip(condition, facts);
          if (before === 'unknown') expect(change).toBeUndefined();
          if (change === undefined) return;
          turned += 1;
          expect(facts[change.fact]).toBe(change.from);
          expect(evaluate(condition, { ...facts, [change.fact]: change.to }).truth).toBe(!before);
          // Short of the last step before the flip nothing has turned yet.
          const { step = 0 } = dictionary.get(change.fact)!;
          const way = change.to - change.from;
          const short = Math.abs(way) - step * 1.001;
          if (short > 0) {
            const value = change.from + Math.sign(way) * short * part;
            expect(evaluate(condition, { ...facts, [change.fact]: value }).truth).toBe(before);
          }
        }),
        { seed, numRuns: 60 },
      );
      const movable = factsIn(condition).some((id) => dictionary.get(id)?.kind === 'number');
      if (movable) expect(turned).toBeGreaterThan(0);
    },
  );
});

const leaf: fc.Arbitrary<Condition> = fc.oneof(
  fc.record({
    fact: fc.constantFrom('mainSpanM', 'skewDeg', 'planRadiusM'),
    is: fc.constantFrom('<', '<=', '>', '>=', '=', '!='),
    value: fc.integer({ min: 0, max: 9 }),
  }),
  fc
    .tuple(
      fc.constantFrom('mainSpanM', 'skewDeg', 'planRadiusM'),
      fc.integer({ min: 0, max: 9 }),
      fc.integer({ min: 0, max: 9 }),
    )
    .map(([fact, a, b]): Condition => ({ fact, between: [Math.min(a, b), Math.max(a, b)] })),
);
const { tree } = fc.letrec<{ tree: Condition }>((tie) => ({
  tree: fc.oneof(
    { maxDepth: 4 },
    leaf,
    fc.array(tie('tree'), { minLength: 1, maxLength: 3 }).map((all) => ({ all })),
    fc.array(tie('tree'), { minLength: 1, maxLength: 3 }).map((any) => ({ any })),
    tie('tree').map((not) => ({ not })),
  ),
}));
const known = fc.record({
  mainSpanM: fc.integer({ min: 0, max: 9 }),
  skewDeg: fc.integer({ min: 0, max: 9 }),
  planRadiusM: fc.integer({ min: 0, max: 9 }),
});

describe('evaluate(condition, facts) on random trees', () => {
  it('[R3] what is settled with a fact unknown stays so whatever the fact turns out to be', () => {
    fc.assert(
      fc.property(
        tree,
        known,
        fc.constantFrom('mainSpanM', 'skewDeg', 'planRadiusM'),
        (condition, facts, hidden) => {
          const early = evaluate(condition, { ...facts, [hidden]: 'unknown' });
          const { truth } = evaluate(condition, facts);
          expect(truth).not.toBe('unknown');
          if (early.truth !== 'unknown') expect(truth).toBe(early.truth);
          else expect([...early.missing.keys()]).toEqual([hidden]);
        },
      ),
      { seed, numRuns: 400 },
    );
  });

  it('[R3] not(all) is any(not), with unknown facts as well', () => {
    fc.assert(
      fc.property(fc.array(tree, { minLength: 1, maxLength: 3 }), known, (parts, facts) => {
        const given: Facts = { ...facts, skewDeg: 'unknown' };
        expect(evaluate({ not: { all: parts } }, given).truth).toBe(
          evaluate({ any: parts.map((not) => ({ not })) }, given).truth,
        );
      }),
      { seed, numRuns: 200 },
    );
  });

  it('[R11] a flip is found exactly where trying every value of every fact finds one, and none is nearer', () => {
    fc.assert(
      fc.property(tree, known, (condition, facts) => {
        const before = evaluate(condition, facts).truth;
        const change = flip(condition, facts);
        let nearest = Infinity;
        for (const [id, from] of Object.entries(facts)) {
          const { step = 1 } = dictionary.get(id)!;
          let own = Infinity;
          for (let n = Math.round(-1 / step); n <= Math.round(10 / step); n += 1) {
            const to = Number((n * step).toPrecision(12));
            if (
              evaluate(condition, { ...facts, [id]: to }).truth !== before &&
              Math.abs(to - from) < Math.abs(own - from)
            )
              own = to;
          }
          if (own !== Infinity)
            nearest = Math.min(nearest, Math.abs(own - from) / Math.max(Math.abs(own), Math.abs(from)));
        }
        if (change === undefined) expect(nearest).toBe(Infinity);
        else
          expect(
            Math.abs(change.to - change.from) / Math.max(Math.abs(change.to), Math.abs(change.from)),
          ).toBeCloseTo(nearest, 9);
      }),
      { seed, numRuns: 200 },
    );
  });
});

describe('windowOf(form, fact, effects) on every numeric fact', () => {
  it('[R14] inside the window no barring rule holds for certain', () => {
    for (const form of ['composite-i', 'truss', 'cable-stayed', 'suspension', 'slab'] as const)
      for (const { id, kind } of factDictionary) {
        if (kind !== 'number') continue;
        const window = windowOf(form, id, ['out']);
        if (window === null) continue;
        const [least, most] = [Math.max(window[0], -1e6), Math.min(window[1], 1e6)];
        for (const value of [least, (least + most) / 2, most])
          for (const rule of rules.filter(
            ({ effect, forms }) => effect === 'out' && forms !== 'all' && forms.includes(form),
          ))
            if (factsIn(rule.condition).includes(id))
              expect(
                evaluate(wholeCondition(rule), { [id]: value }).truth,
                `${rule.id} at ${value}`,
              ).not.toBe(true);
      }
  });
});
