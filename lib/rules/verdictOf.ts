import type { Effect, Facts } from '../model/index.ts';
import { evaluate, type Evaluated } from './evaluate.ts';
import type { Condition, Rule } from './rule.ts';

/** `when` and condition of a rule as one tree: where it is true the rule applies. */
export function wholeCondition(rule: Rule): Condition {
  return rule.when === undefined ? rule.condition : { all: [rule.when, rule.condition] };
}

/** What a rule comes to before it is put into words. */
export interface Verdict {
  readonly effect: Effect;
  /** Reason template, or null where something unknown decides. */
  readonly template: string | null;
  /** The whole condition, decorated. */
  readonly node: Evaluated;
}

/** The verdict of a rule on facts; null where it is silent. */
export function verdictOf(rule: Rule, facts: Facts): Verdict | null {
  const node = evaluate(wholeCondition(rule), facts);
  if (node.truth === 'unknown') return { effect: 'to confirm', template: null, node };
  if (node.truth) return { effect: rule.effect, template: rule.reason, node };
  const { otherwise, when } = rule;
  if (otherwise === undefined || (when !== undefined && evaluate(when, facts).truth !== true)) return null;
  return { effect: otherwise.effect, template: otherwise.reason, node };
}
