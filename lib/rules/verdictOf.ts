import type { Effect, Facts } from '../model/index.ts';
import { evaluate, truthOf, type Evaluated } from './evaluate.ts';
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

/** The verdict of a rule on facts; null where it is silent, as most are: that is known before any tree is decorated. */
export function verdictOf(rule: Rule, facts: Facts): Verdict | null {
  const { otherwise, when } = rule;
  const whole = wholeCondition(rule);
  const truth = truthOf(whole, facts);
  if (truth === 'unknown') return { effect: 'to confirm', template: null, node: evaluate(whole, facts) };
  if (truth) return { effect: rule.effect, template: rule.reason, node: evaluate(whole, facts) };
  if (otherwise === undefined || (when !== undefined && truthOf(when, facts) !== true)) return null;
  return { effect: otherwise.effect, template: otherwise.reason, node: evaluate(whole, facts) };
}
