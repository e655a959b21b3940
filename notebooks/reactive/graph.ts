import { batch, untracked } from '@preact/signals-core';
import type { Cell, Equal, Input, Policy, SlowRun, State, Uses, Values } from './cell.ts';
import { fastNode } from './fastNode.ts';
import type { AnyRun } from './fastNode.ts';
import { blankNode, putMark } from './node.ts';
import type { Node } from './node.ts';
import { showing, stateOf } from './show.ts';
import { slowNode } from './slowNode.ts';
import type { AnySlowRun } from './slowNode.ts';

/** A graph of cells; `SPEC.md` states the rules G1 to G15 it keeps. */
export type Graph = ReturnType<typeof graph>;

interface Options<T> {
  /** When a new value counts as the old one; `Object.is` unless given. */
  readonly equal?: Equal<T>;
}

/**
 * An empty graph. Define cells in page order, set inputs, and watch cells or views; see `SPEC.md` for the rules.
 * Everything throws an `Error` naming cell and remedy when used against the rules (a name used twice, a cell of
 * another graph, a change from inside a run, any change after `dispose`).
 */
export function graph() {
  const nodes = new Map<string, Node<unknown>>();
  const views = new Set<Node<unknown>>();
  const stops = new Set<() => void>();
  const staged = new Map<Node<unknown>, unknown>();
  let age = 0;
  let held = 0;
  let passDue = false;
  let passing = false;
  let disposed = false;
  let waiting: (() => void)[] = [];

  /** One pass: what is set since the last gets one new age, then every cell is brought to it in definition order. */
  const pass = (publish?: () => void): void => {
    passDue = false;
    passing = true;
    try {
      batch(() => {
        try {
          publish?.();
          if (staged.size > 0) age += 1;
          for (const [node, value] of staged) {
            putMark(node, { kind: 'good', value }, { since: age, until: Infinity });
          }
          staged.clear();
          for (const node of nodes.values()) node.advance();
          for (const view of views) view.advance();
        } finally {
          passing = false;
        }
      });
    } finally {
      release();
    }
  };

  const passSoon = (): void => {
    if (passDue) return;
    passDue = true;
    queueMicrotask(() => {
      if (passDue) pass();
    });
  };

  const isIdle = (): boolean => !passDue && [...nodes.values()].every((node) => !node.isBusy());

  const release = (): void => {
    if (!isIdle()) return;
    const released = waiting;
    waiting = [];
    for (const resolve of released) resolve();
  };

  /** Refuses what only somebody outside a run may do, and only before the end. */
  const checkOpen = (what: string): void => {
    if (disposed)
      throw new Error(`${what}: expected a graph in use, received a disposed one; make a new graph`);
    if (passing)
      throw new Error(`${what}: not allowed inside a run, which may read only what it uses; pass it in`);
  };

  const nodeOf = <T>(cell: Cell<T>): Node<T> => {
    const node = nodes.get(cell.name);
    if (node !== cell)
      throw new Error(`cell '${cell.name}': expected a cell of this graph; define it here first`);
    return node as Node<T>;
  };

  const nodesOf = (uses: Uses): Record<string, Node<unknown>> =>
    Object.fromEntries(Object.entries(uses).map(([key, cell]) => [key, nodeOf(cell)]));

  const checkName = (name: string): void => {
    checkOpen(`cell '${name}'`);
    if (nodes.has(name))
      throw new Error(`cell '${name}': expected a new name, received one in use; choose another`);
  };

  const add = <N extends Node<unknown>>(node: N): N => {
    nodes.set(node.name, node);
    passSoon();
    return node;
  };

  const stoppable = (stop: () => void): (() => void) => {
    const once = (): void => {
      if (stops.delete(once)) stop();
    };
    stops.add(once);
    return once;
  };

  return {
    /** Defines a cell whose value is set from outside. */
    input<T>(name: string, value: T, { equal = Object.is }: Options<T> = {}): Input<T> {
      checkName(name);
      const node = add(blankNode(name, 'input', [], equal));
      putMark(node, { kind: 'good', value }, { since: 0, until: Infinity });
      return node;
    },

    /** Defines a cell worked out on the spot from the cells it uses. */
    cell<const U extends Uses, T>(
      name: string,
      uses: U,
      run: (values: Values<U>) => T,
      { equal = Object.is }: Options<T> = {},
    ): Cell<T> {
      checkName(name);
      return add(fastNode(name, nodesOf(uses), run as AnyRun<T>, equal));
    },

    /** Defines a cell worked out elsewhere, one run at a time; its policy says what a newer wish does to a run. */
    slow<const U extends Uses, T>(
      name: string,
      uses: U,
      run: (values: Values<U>, run: SlowRun) => T | PromiseLike<T>,
      { policy, equal = Object.is }: Options<T> & { readonly policy: Policy },
    ): Cell<T> {
      checkName(name);
      return add(slowNode(name, nodesOf(uses), run as AnySlowRun<T>, { policy, equal }, pass));
    },

    /** Sets an input; the pass follows at the end of the turn, or of the batch. */
    set<T>(input: Input<T>, value: NoInfer<T>): void {
      checkOpen(`set '${input.name}'`);
      const node = nodeOf(input);
      const { outcome } = node.mark.peek();
      if (outcome.kind === 'good' && node.equal(outcome.value, value)) staged.delete(node);
      else staged.set(node, value);
      if (staged.size > 0) passSoon();
    },

    /** Runs `change` and then, without waiting for the end of the turn, the one pass for all it has set. */
    batch<T>(change: () => T): T {
      checkOpen('batch');
      held += 1;
      try {
        return change();
      } finally {
        held -= 1;
        if (held === 0 && passDue) pass();
      }
    },

    /** Resolves once no pass is due and no live run remains; failures are states, so it never rejects. */
    settled(): Promise<void> {
      return isIdle() ? Promise.resolve() : new Promise((resolve) => waiting.push(resolve));
    },

    /** What the cell has to show as of the last pass. */
    state<T>(cell: Cell<T>): State<T> {
      if (passing) checkOpen(`state '${cell.name}'`);
      const node = nodeOf(cell);
      return untracked(() => stateOf(node));
    },

    /** Hands `show` the cell's state now and after every pass that changed it; returns the way to stop. */
    watch<T>(cell: Cell<T>, show: (state: State<T>) => void): () => void {
      checkOpen(`watch '${cell.name}'`);
      return stoppable(showing(nodeOf(cell), show));
    },

    /**
     * Hands `show` the values of several cells, always of one age: until all have come to a newer one together, the
     * last they had together stay, marked as pending. Returns the way to stop.
     */
    view<const U extends Uses>(cells: U, show: (state: State<Values<U>>) => void): () => void {
      checkOpen('view');
      const node = fastNode('view', nodesOf(cells), (values) => values as Values<U>, Object.is);
      node.advance();
      views.add(node);
      const stop = showing(node, show);
      return stoppable(() => {
        stop();
        views.delete(node);
      });
    },

    /** All cells in definition order. */
    cells(): readonly Cell<unknown>[] {
      return [...nodes.values()];
    },

    /** The cells it uses, in the order its definition names them. */
    uses(cell: Cell<unknown>): readonly Cell<unknown>[] {
      return nodeOf(cell).uses;
    },

    /** The cells that use it, in definition order. */
    usedBy(cell: Cell<unknown>): readonly Cell<unknown>[] {
      const node = nodeOf(cell);
      return [...nodes.values()].filter((other) => other.uses.includes(node));
    },

    /** Aborts every run, stops every watch and view, and refuses changes from here on; states stay readable. */
    dispose(): void {
      if (disposed) return;
      checkOpen('dispose');
      disposed = true;
      passDue = false;
      staged.clear();
      for (const stop of [...stops]) stop();
      for (const node of nodes.values()) node.abort();
      release();
    },
  };
}
