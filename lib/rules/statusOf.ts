import type { AskedOf, Facts, Flip, FormId, Ruling, Status } from '../model/index.ts';
import { rule, rulesFor } from './book.ts';
import { nearestChange } from './flip.ts';
import type { Rule } from './rule.ts';
import { checkFacts } from './rulingsFor.ts';
import { verdictOf, wholeCondition } from './verdictOf.ts';
import { withRatios } from './withRatios.ts';

/**
 * Where rulings leave a form or an option: out = any ruling puts it out; in = inside the usual span band and no
 * caution; else possible. Points to confirm do not change it.
 */
export function statusOf(rulings: readonly Pick<Ruling, 'rule' | 'effect'>[]): Status {
  if (rulings.some(({ effect }) => effect === 'out')) return 'out';
  const usual = rulings.some(
    (ruling) => ruling.effect === 'in favour' && rule(ruling.rule).subject === 'span',
  );
  const caution = rulings.some(({ effect }) => effect === 'caution');
  return usual && !caution ? 'in' : 'possible';
}

/**
 * The nearest change of one known number after which the status that some rules leave is another.
 *
 * @param asked the rules that are asked
 * @param facts ratios included, see `withRatios`
 * @returns undefined where no single known number changes it
 */
export function statusChange(asked: readonly Rule[], facts: Facts): Flip | undefined {
  return nearestChange(asked.map(wholeCondition), facts, (changed) =>
    statusOf(
      asked.flatMap((entry) => {
        const verdict = verdictOf(entry, changed);
        return verdict === null ? [] : [{ rule: entry.id, effect: verdict.effect }];
      }),
    ),
  );
}

/**
 * The nearest change of one known number after which the status of a form or an option is another.
 *
 * @returns undefined where no single known number changes it
 * @throws RangeError as `rulingsFor`
 */
export function statusFlip(
  askedOf: AskedOf | readonly AskedOf[],
  form: FormId,
  facts: Facts,
): Flip | undefined {
  checkFacts(facts);
  return statusChange(rulesFor(form, typeof askedOf === 'string' ? [askedOf] : askedOf), withRatios(facts));
}
