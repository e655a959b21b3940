import type { AskedOf, Effect, Facts, FormId, Ruling } from '../model/index.ts';
import { fact as factById, rulesFor } from './book.ts';
import { evaluate, factValue } from './evaluate.ts';
import { flip } from './flip.ts';
import { cite, reasonOf, unknownReason } from './reason.ts';
import type { Rule } from './rule.ts';
import { verdictOf, wholeCondition } from './verdictOf.ts';
import { withRatios } from './withRatios.ts';

/**
 * Facts at the public door: every id is in the dictionary and every known value is of its kind.
 *
 * @throws RangeError naming the fact, what was expected and what was received
 */
export function checkFacts(facts: Facts): void {
  for (const id of Object.keys(facts)) {
    const value = factValue(facts, id);
    const { kind, values } = factById(id);
    if (value === 'unknown') continue;
    const expected = { number: 'number', text: 'string', boolean: 'boolean' }[kind];
    if (typeof value !== expected)
      throw new RangeError(`fact ${id}: expected a ${kind}, received ${String(value)}`);
    if (typeof value === 'string' && values?.includes(value) === false)
      throw new RangeError(`fact ${id}: expected one of ${values.join(', ')}, received ${value}`);
  }
}

/**
 * What one rule says: a ruling where it applies (or where its `otherwise` does), a 'to confirm' ruling that names
 * what is missing where that cannot be told, null where it is silent.
 *
 * @param facts ratios included, see `withRatios`
 */
export function rulingOf(rule: Rule, facts: Facts): Ruling | null {
  const verdict = verdictOf(rule, facts);
  if (verdict === null) return null;
  const { effect, template, node } = verdict;
  const because =
    template === null ? unknownReason(rule.title, node.missing.keys()) : reasonOf(template, node, facts);
  const turns = flip(wholeCondition(rule), facts);
  return {
    rule: rule.id,
    effect,
    because: [because],
    source: cite(rule.sources),
    ...(turns === undefined ? {} : { flip: turns }),
  };
}

/**
 * Rulings on a form, an arrangement or an option, in the order of the book, each rule asked once.
 *
 * For the complete rulings of an option ask all three points at once with all its facts together, `mainSpanM` being
 * the span it really has.
 *
 * @param askedOf one point of the pipeline or several
 * @param facts by id of `data/rules/facts.json`; what is not given is unknown
 * @throws RangeError for a fact that is not in the dictionary or not of its kind
 */
export function rulingsFor(
  askedOf: AskedOf | readonly AskedOf[],
  form: FormId,
  facts: Facts,
): readonly Ruling[] {
  checkFacts(facts);
  const all = withRatios(facts);
  return rulesFor(form, typeof askedOf === 'string' ? [askedOf] : askedOf)
    .map((rule) => rulingOf(rule, all))
    .filter((ruling) => ruling !== null);
}

/** A fact nobody knows yet and how much hangs on it. */
export interface MissingFact {
  readonly fact: string;
  readonly label: string;
  /** Places in undecided rules that ask for it, each counted by what the rule could do. */
  readonly weight: number;
}

/** What finding out is worth: a fact that may put an option out comes before one that may only favour it. */
const weightOf: Readonly<Record<Effect, number>> = { out: 4, caution: 2, 'to confirm': 1, 'in favour': 1 };

/**
 * Unknown facts that rules still hang on, the one that decides most first (equal weights by label).
 *
 * @throws RangeError as `rulingsFor`
 */
export function missingFacts(
  askedOf: AskedOf | readonly AskedOf[],
  form: FormId,
  facts: Facts,
): readonly MissingFact[] {
  checkFacts(facts);
  const all = withRatios(facts);
  const weights = new Map<string, number>();
  for (const rule of rulesFor(form, typeof askedOf === 'string' ? [askedOf] : askedOf)) {
    for (const [id, places] of evaluate(wholeCondition(rule), all).missing)
      weights.set(id, (weights.get(id) ?? 0) + places * weightOf[rule.effect]);
  }
  return [...weights]
    .map(([id, weight]) => ({ fact: id, label: factById(id).label, weight }))
    .sort((a, b) => b.weight - a.weight || a.label.localeCompare(b.label, 'en'));
}
