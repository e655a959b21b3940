import { effect, untracked } from '@preact/signals-core';
import type { State } from './cell.ts';
import { isCurrent } from './life.ts';
import { lastGood } from './outcome.ts';
import type { Node } from './node.ts';

/** What the cell has to show: pending whenever its outcome no longer answers to the newest inputs. */
export function stateOf<T>(node: Node<T>): State<T> {
  const { outcome, life } = node.mark.value;
  const good = lastGood(outcome);
  const kept = good && { value: good.value };
  if (outcome.kind === 'none' || !isCurrent(life)) {
    const progress = node.progress.value;
    return { state: 'pending', ...kept, ...(progress && { progress }) };
  }
  if (outcome.kind === 'good') return { state: 'ready', value: outcome.value };
  return { state: 'failed', error: outcome.error, raisedBy: outcome.raisedBy, ...kept };
}

/** Hands `show` the state now and whenever it has changed; returns the way to stop. */
export function showing<T>(node: Node<T>, show: (state: State<T>) => void): () => void {
  let shown: readonly unknown[] = [];
  return effect(() => {
    const { outcome, life } = node.mark.value;
    const seen = [outcome, isCurrent(life), node.progress.value];
    if (seen.every((part, i) => i in shown && part === shown[i])) return;
    shown = seen;
    untracked(() => show(stateOf(node)));
  });
}
