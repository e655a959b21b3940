import type { Equal } from './cell.ts';
import { isLived } from './life.ts';
import type { Outcome } from './outcome.ts';
import { failure, outcomeOf } from './outcome.ts';
import type { Node } from './node.ts';
import { blankNode, carriedLife, failureAbove, isMadeFrom, lookUp, putMark, valuesAbove } from './node.ts';

export type AnyRun<T> = (values: Record<string, unknown>) => T;

/** A cell that is worked out on the spot, as soon as all it uses are of one age and one of them has changed. */
export function fastNode<T>(
  name: string,
  uses: Readonly<Record<string, Node<unknown>>>,
  run: AnyRun<T>,
  equal: Equal<T>,
): Node<T> {
  const keys = Object.keys(uses);
  const node = blankNode(name, 'cell', Object.values(uses), equal);
  let used: readonly Outcome<unknown>[] | undefined;

  const advance = (): void => {
    const above = lookUp(node.uses);
    const { outcome, life } = node.mark.peek();
    if (!isLived(above.life) || isMadeFrom(used, above)) {
      putMark(node, outcome, carriedLife(life, used, above));
      return;
    }
    used = above.outcomes;
    const failed = failureAbove(above);
    const next = failed
      ? failure(outcome, failed.error, failed.raisedBy)
      : outcomeOf(name, outcome, () => notPromised(run(valuesAbove(keys, above))), equal);
    putMark(node, next, above.life);
  };
  return { ...node, advance };
}

/** The value itself; a promise is refused, because nothing below could wait for it. */
function notPromised<T>(value: T): T {
  if (value instanceof Promise) {
    throw new TypeError('expected a value, received a promise: define the cell with slow() to wait for it');
  }
  return value;
}
