import { describe, expect, it } from 'vitest';
import { evaluate, type Evaluated } from '../../lib/rules/index.ts';
import type { Condition } from '../../lib/rules/index.ts';
import type { Facts } from '../../lib/model/index.ts';

const T: Condition = { fact: 'skewDeg', is: '>', value: 10 };
const F: Condition = { fact: 'skewDeg', is: '<', value: 10 };
const U: Condition = { fact: 'planRadiusM', is: '<', value: 300 };
const facts: Facts = { skewDeg: 20, planRadiusM: 'unknown' };
const truth = (condition: Condition, given: Facts = facts) => evaluate(condition, given).truth;

/** The tree without its decoration. */
function bare(node: Evaluated): Condition {
  if ('all' in node) return { all: node.all.map(bare) };
  if ('any' in node) return { any: node.any.map(bare) };
  if ('not' in node) return { not: bare(node.not) };
  if ('between' in node) return { fact: node.fact, between: node.between };
  if ('than' in node) return { fact: node.fact, is: node.is, than: node.than };
  return { fact: node.fact, is: node.is, value: node.value };
}

describe('evaluate(condition, facts)', () => {
  it.each([
    ['<', 5, 6, true],
    ['<', 6, 6, false],
    ['<=', 6, 6, true],
    ['<=', 7, 6, false],
    ['>', 7, 6, true],
    ['>', 6, 6, false],
    ['>=', 6, 6, true],
    ['>=', 5, 6, false],
    ['=', 6, 6, true],
    ['=', 5, 6, false],
    ['!=', 5, 6, true],
    ['!=', 6, 6, false],
  ] as const)('[R1] compares: is %s, %d against %d gives %s', (is, received, value, expected) => {
    expect(truth({ fact: 'skewDeg', is, value }, { skewDeg: received })).toBe(expected);
    expect(
      truth(
        { fact: 'pieceLengthM', is, than: 'haulLengthM' },
        { pieceLengthM: received, haulLengthM: value },
      ),
    ).toBe(expected);
  });

  it.each([
    [29.9, false],
    [30, true],
    [91, true],
    [91.1, false],
  ])('[R1] a band includes both ends: %d gives %s', (mainSpanM, expected) => {
    expect(truth({ fact: 'mainSpanM', between: [30, 91] }, { mainSpanM })).toBe(expected);
  });

  it('[R1] text and yes/no compare by equality', () => {
    expect(truth({ fact: 'method', is: '=', value: 'launch' }, { method: 'launch' })).toBe(true);
    expect(truth({ fact: 'method', is: '!=', value: 'launch' }, { method: 'launch' })).toBe(false);
    expect(truth({ fact: 'haunched', is: '=', value: false }, { haunched: true })).toBe(false);
  });

  it.each([[undefined], ['unknown' as const], [NaN]])(
    '[R2] a fact that is %s is unknown, whatever the comparison',
    (value) => {
      const given: Facts = value === undefined ? {} : { planRadiusM: value };
      for (const is of ['<', '<=', '>', '>=', '=', '!='] as const)
        expect(truth({ fact: 'planRadiusM', is, value: 300 }, given)).toBe('unknown');
      expect(truth({ fact: 'planRadiusM', between: [0, 1e9] }, given)).toBe('unknown');
      expect(truth({ fact: 'skewDeg', is: '>', than: 'planRadiusM' }, { ...given, skewDeg: 1 })).toBe(
        'unknown',
      );
    },
  );

  it('[R3] all, any and not follow the three-valued tables', () => {
    const table = [
      [T, T, true, true],
      [T, F, false, true],
      [T, U, 'unknown', true],
      [F, T, false, true],
      [F, F, false, false],
      [F, U, false, 'unknown'],
      [U, T, 'unknown', true],
      [U, F, false, 'unknown'],
      [U, U, 'unknown', 'unknown'],
    ] as const;
    for (const [a, b, both, either] of table) {
      expect(truth({ all: [a, b] })).toBe(both);
      expect(truth({ any: [a, b] })).toBe(either);
    }
    expect(truth({ not: T })).toBe(false);
    expect(truth({ not: F })).toBe(true);
    expect(truth({ not: U })).toBe('unknown');
  });

  it('[R4] returns the same tree, decorated with truth, received value and distance', () => {
    const condition: Condition = {
      all: [
        T,
        { any: [F, { not: U }] },
        { fact: 'mainSpanM', between: [30, 91] },
        { fact: 'roadRiseM', is: '>', than: 'roadMayRiseM' },
      ],
    };
    const node = evaluate(condition, { ...facts, mainSpanM: 80, roadRiseM: 1.5, roadMayRiseM: 1 });
    expect(bare(node)).toEqual(condition);
    if (!('all' in node)) throw new Error('the tree lost its shape');
    expect(node.all[0]).toMatchObject({ truth: true, received: 20, distance: -10 });
    expect(node.all[2]).toMatchObject({ truth: true, received: 80, distance: 11 });
    expect(node.all[3]).toMatchObject({ truth: true, received: 1.5, limit: 1, distance: -0.5 });
  });

  it('[R4] nothing can be measured on a straight: the distance is null', () => {
    expect(evaluate(U, { planRadiusM: Infinity })).toMatchObject({ truth: false, distance: null });
  });

  it('[R5] a settled node misses nothing, an unknown one counts the places that ask', () => {
    expect([...evaluate({ all: [F, U] }, facts).missing]).toEqual([]);
    expect([...evaluate({ any: [T, U] }, facts).missing]).toEqual([]);
    expect([...evaluate({ all: [T, U, { not: U }] }, facts).missing]).toEqual([['planRadiusM', 2]]);
    const both = evaluate({ fact: 'pieceMassT', is: '>', than: 'haulMassT' }, {});
    expect([...both.missing.keys()]).toEqual(['pieceMassT', 'haulMassT']);
  });
});
