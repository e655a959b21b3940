import type { Facts } from '../model/index.ts';
import { factValue } from './evaluate.ts';
import type { Condition } from './rule.ts';

/**
 * The numbers at which a condition can change its truth when one numeric fact moves and the others stay, rising,
 * each once. Between two of them the truth is constant: that is what makes windows and flips exact.
 *
 * @param condition tree of comparisons
 * @param fact id of the fact that moves
 * @param facts the others; needed where the limit is itself a fact
 */
export function limitsOn(condition: Condition, fact: string, facts: Facts): readonly number[] {
  const found = new Set<number>();
  const visit = (node: Condition): void => {
    if ('all' in node) node.all.forEach(visit);
    else if ('any' in node) node.any.forEach(visit);
    else if ('not' in node) visit(node.not);
    else if ('between' in node) {
      if (node.fact === fact) node.between.forEach((limit) => found.add(limit));
    } else if ('than' in node) {
      const other = node.fact === fact ? node.than : node.than === fact ? node.fact : null;
      const limit = other === null ? 'unknown' : factValue(facts, other);
      if (typeof limit === 'number' && Number.isFinite(limit)) found.add(limit);
    } else if (node.fact === fact && typeof node.value === 'number') found.add(node.value);
  };
  visit(condition);
  return [...found].sort((a, b) => a - b);
}

/** Ids of the facts a condition names, each once, in the order in which it names them. */
export function factsIn(condition: Condition): readonly string[] {
  const found = new Set<string>();
  const visit = (node: Condition): void => {
    if ('all' in node) node.all.forEach(visit);
    else if ('any' in node) node.any.forEach(visit);
    else if ('not' in node) visit(node.not);
    else {
      found.add(node.fact);
      if ('than' in node) found.add(node.than);
    }
  };
  visit(condition);
  return [...found];
}
