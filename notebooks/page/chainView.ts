import { h } from '../html.ts';
import { canOpen, chainLines } from './chainTable.ts';
import type { Ask, ChainRow } from './figureChain.ts';
import { chainRows, rootKey, rowAbove } from './figureChain.ts';

export interface ChainSpec {
  /** Paths of the figures that were asked; several where what is printed was made of several. */
  readonly roots: readonly string[];
  /** What is printed, e.g. '5.0 to 8.3'. */
  readonly words: string;
  /** The station where a figure is shown. */
  readonly stationOf: (path: string) => string | undefined;
  readonly close: () => void;
}

/** The answer to one question, open under its cell. */
export interface ChainView {
  readonly element: HTMLElement;
  /** Shows the figures of an age, with the lines that were open kept; says so while newer ones are worked out. */
  readonly show: (ask: Ask, isPending: boolean) => void;
  readonly focus: () => void;
}

const PENDING = 'Being worked out; these are the figures before the change.';

/**
 * The chain of a figure: lines that open on what they came from and on what uses them. Up and down go from line to line,
 * right opens and goes in, left closes and goes out, Enter opens and closes, Escape closes the chain.
 */
export function chainView({ roots, words, stationOf, close }: ChainSpec): ChainView {
  // What was made of several figures lists them first; a single one is told in full at once.
  const open = new Set(roots.length === 1 ? roots.map(rootKey) : []);
  let current = rootKey(roots[0]!);
  let rows: readonly ChainRow[] = [];
  let ask: Ask | undefined;

  const lines = h('tbody');
  const status = h('p', { class: 'status-words', role: 'status' });
  const made = roots.length === 1 ? '' : `made of ${String(roots.length)} figures`;
  const sentence = [words, made].filter((one) => one !== '').join(', ');
  const title = `Where from? ${sentence}`;
  const element = h(
    'div',
    { class: 'answer-chain', role: 'group', 'aria-label': title },
    h(
      'p',
      { class: 'title' },
      h('b', {}, 'Where from?'),
      h('span', { class: 'words' }, sentence),
      h('button', { type: 'button', class: 'action', onclick: close }, 'Close'),
    ),
    h('table', { class: 'chain', role: 'treegrid', 'aria-label': title }, lines),
    status,
  );

  const lineOf = (key: string): HTMLElement | null => lines.querySelector(`[data-row="${CSS.escape(key)}"]`);

  const draw = (): void => {
    if (ask === undefined) return;
    const held = lines.contains(document.activeElement);
    rows = chainRows(ask, roots, open);
    if (!rows.some(({ key }) => key === current)) current = rows[0]!.key;
    lines.replaceChildren(...chainLines(rows, stationOf, current));
    if (held) lineOf(current)?.focus({ preventScroll: true });
  };

  const goTo = (row: ChainRow | undefined): void => {
    if (row === undefined) return;
    current = row.key;
    for (const line of Array.from(lines.children)) {
      const stop = line.getAttribute('data-row') === current ? '0' : '-1';
      for (const one of [line, ...Array.from(line.querySelectorAll('a'))]) one.setAttribute('tabindex', stop);
    }
    lineOf(current)?.focus();
  };

  const turn = (row: ChainRow): void => {
    if (!canOpen(row)) return;
    if (row.isOpen) open.delete(row.key);
    else open.add(row.key);
    const at = rows.indexOf(row);
    draw();
    // The head of a long list gives way to what it stood for.
    if (!rows.some(({ key }) => key === row.key)) goTo(rows[at]);
  };

  const rowAt = (target: EventTarget | null): ChainRow | undefined => {
    const key = target instanceof Element ? target.closest('tr')?.getAttribute('data-row') : null;
    return rows.find((row) => row.key === key);
  };

  lines.addEventListener('click', ({ target }) => {
    const row = rowAt(target);
    if (row === undefined || (target as Element).closest('a') !== null) return;
    goTo(row);
    turn(row);
  });
  lines.addEventListener('keydown', (event) => {
    const row = rowAt(event.target);
    if (row === undefined || event.altKey || event.ctrlKey || event.metaKey) return;
    const at = rows.indexOf(row);
    const isLink = (event.target as Element).matches('a');
    const acts: Readonly<Record<string, () => void>> = {
      ArrowDown: () => goTo(rows[at + 1]),
      ArrowUp: () => goTo(rows[at - 1]),
      Home: () => goTo(rows[0]),
      End: () => goTo(rows.at(-1)),
      ArrowRight: () => (row.isOpen ? goTo(rows[at + 1]) : turn(row)),
      ArrowLeft: () => (row.isOpen ? turn(row) : goTo(rows[rowAbove(rows, at)])),
      ...(isLink ? {} : { Enter: () => turn(row), ' ': () => turn(row) }),
    };
    const act = acts[event.key];
    if (act === undefined) return;
    event.preventDefault();
    act();
  });
  element.addEventListener('keydown', (event) => {
    if (event.key !== 'Escape') return;
    event.preventDefault();
    event.stopPropagation();
    close();
  });

  return {
    element,
    show(next, isPending) {
      const isSame = next === ask;
      ask = next;
      if (!isSame) draw();
      element.classList.toggle('pending', isPending);
      const said = isPending ? PENDING : '';
      if (status.textContent !== said) status.textContent = said;
    },
    focus: () => lineOf(current)?.focus({ preventScroll: true }),
  };
}
