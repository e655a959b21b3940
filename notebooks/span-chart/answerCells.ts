import {
  builtBucket,
  depthGuidance,
  formIds,
  guide,
  type FormId,
  type Guide,
  type GuideTask,
} from '../../lib/index.ts';
import type { Graph } from '../reactive/index.ts';
import { taskOf, type Question } from './question.ts';

/** How forms are listed: by family as everywhere, or best first. */
export type Order = 'family' | 'fit';

/** Forms in the order chosen. */
export const orderOf = (answer: Guide, order: Order): readonly FormId[] =>
  order === 'fit' ? answer.forms.map(({ form }) => form) : formIds;

/** What published notes add to the depths of a form. */
export interface Remark {
  readonly form: FormId;
  readonly note: string;
}

/** Notes on the depths of the forms that reach, in family order. */
function remarksOn({ forms }: Guide, task: GuideTask): readonly Remark[] {
  const reaching = new Set(forms.filter(({ status }) => status !== 'out').map(({ form }) => form));
  return formIds.flatMap((form) => {
    if (!reaching.has(form)) return [];
    const notes = new Set(depthGuidance(form, task).flatMap(({ note }) => note ?? []));
    return notes.size === 0 ? [] : [{ form, note: [...notes].join(' ') }];
  });
}

export type AnswerCells = ReturnType<typeof answerCells>;

/**
 * The cells behind the page: the question, how forms are listed, the answer, and what of it changes less often than the
 * span does, so that a moving figure draws no more than it must.
 */
export function answerCells(graph: Graph, question: Question) {
  const asked = graph.input('question', question);
  const order = graph.input<Order>('order', 'family');
  const answer = graph.cell('answer', { asked }, (v) => guide(taskOf(v.asked)));
  const bucket = graph.cell('bucket', { answer }, (v) => builtBucket(v.answer.span));
  const remarks = graph.cell('remarks', { asked, answer }, (v) => remarksOn(v.answer, taskOf(v.asked)), {
    equal: (a, b) => JSON.stringify(a) === JSON.stringify(b),
  });
  return { asked, order, answer, bucket, remarks };
}
