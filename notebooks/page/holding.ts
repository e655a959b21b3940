import type { Cell, Graph } from '../reactive/index.ts';

/** Follows whether something shows older figures than those typed, because what was typed is refused. */
export interface Hold {
  readonly isHeld: () => boolean;
  readonly end: () => void;
}

/** Names of the inputs that some cells are made from, by any number of steps. */
export function inputsOf(graph: Graph, cells: readonly Cell<unknown>[]): ReadonlySet<string> {
  const seen = new Set<Cell<unknown>>();
  const look = (cell: Cell<unknown>): void => {
    if (seen.has(cell)) return;
    seen.add(cell);
    for (const used of graph.uses(cell)) look(used);
  };
  for (const cell of cells) look(cell);
  return new Set([...seen].filter(({ kind }) => kind === 'input').map(({ name }) => name));
}

/**
 * Follows the inputs that some cells are made from, as the graph has them.
 * @param held names of the inputs that keep an older value, because what was typed over it is refused
 * @param typed cells whose values are shown as they are typed, refused or not: they hold nothing up here
 * @param tell called when it has become held, or is so no more
 */
export function followHold(
  graph: Graph,
  held: Cell<readonly string[]>,
  cells: readonly Cell<unknown>[],
  typed: readonly Cell<unknown>[],
  tell: () => void,
): Hold {
  const above = inputsOf(graph, cells);
  const shownAsTyped = new Set(typed.map(({ name }) => name));
  let isHeld = false;
  const end = graph.watch(held, (state) => {
    if (!('value' in state)) return;
    const was = isHeld;
    isHeld = state.value.some((name) => above.has(name) && !shownAsTyped.has(name));
    if (isHeld !== was) tell();
  });
  return { isHeld: () => isHeld, end };
}

/** Nothing is ever refused. */
export const neverHeld: Hold = { isHeld: () => false, end: () => undefined };
