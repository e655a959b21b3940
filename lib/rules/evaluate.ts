import type { Facts, FactValue } from '../model/index.ts';
import type { Between, Comparator, Comparison, Condition, FactComparison } from './rule.ts';

/** Three-valued truth: a condition that hangs on something nobody knows yet is unknown, not false. */
export type Truth = true | false | 'unknown';

interface Decoration {
  readonly truth: Truth;
  /** Unknown facts the truth still hangs on, with the number of places that ask for them. */
  readonly missing: ReadonlyMap<string, number>;
}

interface ComparisonDecoration extends Decoration {
  /** The fact's own value. */
  readonly received: FactValue;
  /** Numbers only: change of the fact that reaches the (nearest) limit; null where nothing can be measured. */
  readonly distance: number | null;
}

/** The condition's own tree, each node with its truth and what it rests on: the explanation is the evaluation. */
export type Evaluated =
  | (Comparison & ComparisonDecoration)
  | (FactComparison & ComparisonDecoration & { readonly limit: FactValue })
  | (Between & ComparisonDecoration)
  | ({ readonly all: readonly Evaluated[] } & Decoration)
  | ({ readonly any: readonly Evaluated[] } & Decoration)
  | ({ readonly not: Evaluated } & Decoration);

const nothing: ReadonlyMap<string, number> = new Map();

/**
 * The value of a fact; a fact that was not supplied, or that is not a number at all (NaN), is unknown.
 */
export function factValue(facts: Facts, id: string): FactValue {
  const value = facts[id];
  return value === undefined || Number.isNaN(value) ? 'unknown' : value;
}

function compare(left: FactValue, is: Comparator, right: FactValue): Truth {
  if (left === 'unknown' || right === 'unknown') return 'unknown';
  if (is === '=') return left === right;
  if (is === '!=') return left !== right;
  if (typeof left !== 'number' || typeof right !== 'number') return 'unknown';
  if (is === '<') return left < right;
  if (is === '<=') return left <= right;
  if (is === '>') return left > right;
  return left >= right;
}

/** Kleene's strong logic: settled as soon as one part is, unknown if the rest hangs on something unknown. */
function truthOfParts(parts: readonly Condition[], settling: boolean, facts: Facts): Truth {
  let truth: Truth = !settling;
  for (const part of parts) {
    const one = truthOf(part, facts);
    if (one === settling) return settling;
    if (one === 'unknown') truth = 'unknown';
  }
  return truth;
}

/**
 * Whether a condition holds on facts, and nothing else: most rules are silent, and that is known without their tree.
 *
 * @param facts values by fact id; absent, NaN and `'unknown'` are unknown
 */
export function truthOf(condition: Condition, facts: Facts): Truth {
  if ('all' in condition) return truthOfParts(condition.all, false, facts);
  if ('any' in condition) return truthOfParts(condition.any, true, facts);
  if ('not' in condition) {
    const truth = truthOf(condition.not, facts);
    return truth === 'unknown' ? 'unknown' : !truth;
  }
  const received = factValue(facts, condition.fact);
  if ('between' in condition) {
    const [least, most] = condition.between;
    return typeof received === 'number' ? received >= least && received <= most : 'unknown';
  }
  return compare(
    received,
    condition.is,
    'than' in condition ? factValue(facts, condition.than) : condition.value,
  );
}

function missingOf(
  ...named: readonly (readonly [id: string, value: FactValue])[]
): ReadonlyMap<string, number> {
  const missing = new Map<string, number>();
  for (const [id, value] of named) if (value === 'unknown') missing.set(id, 1);
  return missing;
}

function distanceTo(received: FactValue, limit: FactValue): number | null {
  if (typeof received !== 'number' || typeof limit !== 'number') return null;
  const change = limit - received;
  return Number.isFinite(change) ? change : null;
}

function sumOf(nodes: readonly Evaluated[]): ReadonlyMap<string, number> {
  const sum = new Map<string, number>();
  for (const node of nodes)
    for (const [fact, places] of node.missing) sum.set(fact, (sum.get(fact) ?? 0) + places);
  return sum;
}

/**
 * Evaluates a condition on facts and returns the same tree, decorated.
 *
 * Kleene's strong logic: `all` is false as soon as one part is false and unknown if the rest hangs on something
 * unknown; `any` is its mirror; `not` of unknown is unknown. A node whose truth is settled misses nothing.
 *
 * @param condition tree of comparisons
 * @param facts values by fact id; absent, NaN and `'unknown'` are unknown
 */
export function evaluate(condition: Condition, facts: Facts): Evaluated {
  const truth = truthOf(condition, facts);
  if ('all' in condition || 'any' in condition) {
    const isAll = 'all' in condition;
    const parts = (isAll ? condition.all : condition.any).map((part) => evaluate(part, facts));
    const decoration: Decoration = { truth, missing: truth === 'unknown' ? sumOf(parts) : nothing };
    return isAll ? { all: parts, ...decoration } : { any: parts, ...decoration };
  }
  if ('not' in condition) {
    const part = evaluate(condition.not, facts);
    return { not: part, truth, missing: part.missing };
  }
  const received = factValue(facts, condition.fact);
  if ('between' in condition) {
    const [least, most] = condition.between;
    const toLeast = distanceTo(received, least);
    const toMost = distanceTo(received, most);
    return {
      ...condition,
      received,
      truth,
      missing: missingOf([condition.fact, received]),
      distance:
        toLeast === null || toMost === null ? null : Math.abs(toLeast) <= Math.abs(toMost) ? toLeast : toMost,
    };
  }
  if ('than' in condition) {
    const limit = factValue(facts, condition.than);
    return {
      ...condition,
      received,
      limit,
      truth,
      missing: missingOf([condition.fact, received], [condition.than, limit]),
      distance: distanceTo(received, limit),
    };
  }
  return {
    ...condition,
    received,
    truth,
    missing: missingOf([condition.fact, received]),
    distance: distanceTo(received, condition.value),
  };
}
