import type { Study } from '../model/index.ts';
import { startValueAt, startValues, stillAssumed } from '../study/index.ts';
import { openStartValue } from './draftDecision.ts';

/**
 * The study with what a draft of its decision asked of start values that are none any more taken out, and with the names of
 * the others as they are now. What people have written over stays, and so does an issued decision.
 */
function answered(before: Study, after: Study): Study {
  const { decision } = after;
  if (decision === null || decision.issued !== null) return after;
  const open = startValues(after);
  const renamed = new Map(
    after.assumed
      .filter((path) => before.assumed.includes(path))
      .map((path) => [startValueAt(before, path), startValueAt(after, path)]),
  );
  const asked = new Map(
    startValues(before).map((name) => [
      openStartValue(name),
      open.includes(name) ? name : (renamed.get(name) ?? null),
    ]),
  );
  const questions = decision.questions.flatMap((question) => {
    const name = asked.get(question);
    if (name === undefined) return [question];
    return name === null ? [] : [openStartValue(name)];
  });
  return { ...after, decision: { ...decision, questions } };
}

/**
 * A study as an edit leaves it: start values that it changes are none any more unless it lists them itself, and a draft of
 * the decision asks only of those that are left.
 */
export function afterEdit(before: Study, edited: Study): Study {
  if (before.assumed.length === 0) return edited;
  const isListed = edited.assumed !== before.assumed;
  return answered(before, isListed ? edited : { ...edited, assumed: stillAssumed(before, edited) });
}
