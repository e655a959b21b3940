import { formIds, guide, type FormId, type Guide } from '../../lib/index.ts';
import type { Graph } from '../reactive/index.ts';
import { taskOf, type Question } from './question.ts';

/** How forms are listed: by family as everywhere, or best first. */
export type Order = 'family' | 'fit';

/** Forms in the order chosen. */
export const orderOf = (answer: Guide, order: Order): readonly FormId[] =>
  order === 'fit' ? answer.forms.map(({ form }) => form) : formIds;

export type AnswerCells = ReturnType<typeof answerCells>;

/** The cells behind the page: the question, how forms are listed, and the answer. */
export function answerCells(graph: Graph, question: Question) {
  const asked = graph.input('question', question);
  const order = graph.input<Order>('order', 'family');
  const answer = graph.cell('answer', { asked }, (v) => guide(taskOf(v.asked)));
  return { asked, order, answer };
}
