import type { Decision, Study } from '../model/index.ts';
import { startValues, stillAssumed } from '../study/index.ts';
import { openStartValue } from './draftDecision.ts';

/** A draft without the drafted questions on start values that are none any more; an issued decision stays as it is. */
function answered(decision: Decision | null, names: readonly string[]): Decision | null {
  if (decision === null || decision.issued !== null || names.length === 0) return decision;
  const gone = names.map(openStartValue);
  return { ...decision, questions: decision.questions.filter((question) => !gone.includes(question)) };
}

/**
 * A study as an edit leaves it: start values that it changes are none any more unless it lists them itself, and what a
 * draft of the decision asked of them leaves the draft.
 */
export function afterEdit(before: Study, edited: Study): Study {
  if (before.assumed.length === 0) return edited;
  const listed = edited.assumed !== before.assumed;
  const after = listed ? edited : { ...edited, assumed: stillAssumed(before, edited) };
  const open = startValues(after);
  const settled = startValues(before).filter((name) => !open.includes(name));
  return { ...after, decision: answered(after.decision, settled) };
}
