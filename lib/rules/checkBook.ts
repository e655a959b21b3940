import { limitsOn, factsIn } from './limitsOn.ts';
import { wholeCondition } from './verdictOf.ts';
import type { Condition, Fact, Rule, Source } from './rule.ts';
import { countedIn, namedIn } from './template.ts';

function comparisonsOf(
  condition: Condition,
): readonly Exclude<Condition, { all: unknown } | { any: unknown } | { not: unknown }>[] {
  if ('all' in condition) return condition.all.flatMap(comparisonsOf);
  if ('any' in condition) return condition.any.flatMap(comparisonsOf);
  if ('not' in condition) return comparisonsOf(condition.not);
  return [condition];
}

function faultOfComparison(
  node: ReturnType<typeof comparisonsOf>[number],
  facts: ReadonlyMap<string, Fact>,
): string | null {
  const left = facts.get(node.fact);
  if (left === undefined) return `unknown fact ${node.fact}`;
  if ('between' in node) {
    if (left.kind !== 'number') return `${node.fact} is not a number`;
    return node.between[0] <= node.between[1] ? null : `reversed band on ${node.fact}`;
  }
  if ('than' in node) {
    const right = facts.get(node.than);
    if (right === undefined) return `unknown fact ${node.than}`;
    return left.kind === right.kind && left.unit === right.unit
      ? null
      : `${node.fact} and ${node.than} differ in unit`;
  }
  const expected = { number: 'number', text: 'string', boolean: 'boolean' }[left.kind];
  if (typeof node.value !== expected) return `${node.fact} is held against a ${typeof node.value}`;
  if (left.kind !== 'number' && node.is !== '=' && node.is !== '!=') return `${node.fact} cannot be ordered`;
  if (typeof node.value === 'string' && left.values?.includes(node.value) === false)
    return `${node.fact} never is ${node.value}`;
  return null;
}

/** Limits stand on the fact's own step, so that the next value beside a limit is one step away. */
function faultOfLimits(rule: Rule, facts: ReadonlyMap<string, Fact>): string | null {
  for (const id of factsIn(wholeCondition(rule))) {
    const step = facts.get(id)?.step;
    for (const limit of limitsOn(wholeCondition(rule), id, {})) {
      if (step === undefined) return `${id} has a limit but no step`;
      const steps = limit / step;
      if (Math.abs(steps - Math.round(steps)) > 1e-6)
        return `limit ${limit} is not a multiple of the step of ${id}`;
    }
  }
  return null;
}

function faultOf(
  rule: Rule,
  facts: ReadonlyMap<string, Fact>,
  sources: ReadonlyMap<string, Source>,
): string | null {
  for (const node of comparisonsOf(wholeCondition(rule))) {
    const fault = faultOfComparison(node, facts);
    if (fault !== null) return fault;
  }
  const named = [...namedIn(rule.reason), ...namedIn(rule.otherwise?.reason ?? '')];
  const strangerInReason = named.find((id) => !facts.has(id));
  if (strangerInReason !== undefined) return `unknown fact ${strangerInReason} in the reason`;
  const uncounted = countedIn(`${rule.reason}${rule.otherwise?.reason ?? ''}`).find(
    (id) => facts.get(id)?.kind !== 'number',
  );
  if (uncounted !== undefined) return `${uncounted} is counted in the reason and is not a number`;
  const strangerInExample = rule.examples
    .flatMap(({ given }) => Object.keys(given))
    .find((id) => !facts.has(id));
  if (strangerInExample !== undefined) return `unknown fact ${strangerInExample} in an example`;
  const uncited = rule.sources.find((id) => !sources.has(id));
  if (uncited !== undefined) return `unknown source ${uncited}`;
  return faultOfLimits(rule, facts);
}

/**
 * Checks that rules, dictionary and bibliography agree: every fact and source is known, kinds and units match,
 * bands are not reversed, limits stand on the fact's step, and no id is used twice.
 *
 * @throws RangeError naming the rule and the fault
 */
export function checkBook(
  rules: readonly Rule[],
  facts: ReadonlyMap<string, Fact>,
  sources: ReadonlyMap<string, Source>,
): void {
  const seen = new Set<string>();
  for (const rule of rules) {
    const fault = seen.has(rule.id) ? 'id used twice' : faultOf(rule, facts, sources);
    if (fault !== null) throw new RangeError(`rule ${rule.id}: ${fault}`);
    seen.add(rule.id);
  }
}
