import { h } from '../html.ts';

export interface WalkSpec {
  /** The figures of the cell that are seen, in page order. */
  readonly figures: () => readonly Element[];
  /** Whether there are any: sooner told than which. */
  readonly hasFigures: () => boolean;
  /** A figure in words. */
  readonly say: (figure: Element) => string;
  readonly ask: (figure: Element) => void;
}

/** One stop for the keyboard on which arrow keys walk the figures of a cell. */
export interface FigureWalk {
  readonly element: HTMLElement;
  /** The figures have been drawn anew. */
  readonly update: () => void;
  readonly focus: () => void;
}

const middle = (element: Element): readonly [x: number, y: number] => {
  const { left, right, top, bottom } = element.getBoundingClientRect();
  return [(left + right) / 2, (top + bottom) / 2];
};

/** The nearest figure above (-1) or below (1) another, px of height counting double; -1 where there is none. */
function nearest(figures: readonly Element[], at: number, way: 1 | -1): number {
  const [x, y] = middle(figures[at]!);
  let best = -1;
  let least = Infinity;
  figures.forEach((one, i) => {
    const [x1, y1] = middle(one);
    const down = (y1 - y) * way;
    if (down < 5) return;
    const far = 2 * down + Math.abs(x1 - x);
    if (far < least) [best, least] = [i, far];
  });
  return best;
}

/**
 * The action 'Where from?' under a cell. While it has the focus one figure of the cell is framed; left and right go to
 * the next, up and down to the nearest, Enter asks.
 */
export function figureWalk({ figures, hasFigures, say, ask }: WalkSpec): FigureWalk {
  let at = 0;
  let framed: Element | undefined;
  const said = h('span', { class: 'pointed-words', 'aria-live': 'polite' });
  const button = h('button', { type: 'button', class: 'action' }, 'Where from?');
  const element = h('p', { class: 'walk', hidden: true }, button, said);

  const frame = (): void => {
    framed?.classList.remove('pointed');
    framed = undefined;
    if (document.activeElement !== button) {
      said.textContent = '';
      return;
    }
    const list = figures();
    at = Math.min(at, list.length - 1);
    framed = list[at];
    if (framed === undefined) return;
    framed.classList.add('pointed');
    const words = `${say(framed)} (${String(at + 1)} of ${String(list.length)}; arrow keys, Enter)`;
    if (said.textContent !== words) said.textContent = words;
  };

  button.addEventListener('focus', frame);
  button.addEventListener('blur', frame);
  button.addEventListener('click', () => {
    const figure = figures()[at];
    if (figure !== undefined) ask(figure);
  });
  button.addEventListener('keydown', (event) => {
    const list = figures();
    const moves: Readonly<Record<string, () => number>> = {
      ArrowRight: () => at + 1,
      ArrowLeft: () => at - 1,
      ArrowDown: () => nearest(list, at, 1),
      ArrowUp: () => nearest(list, at, -1),
      Home: () => 0,
      End: () => list.length - 1,
    };
    const move = moves[event.key];
    if (move === undefined || list.length === 0 || event.altKey || event.ctrlKey || event.metaKey) return;
    event.preventDefault();
    const next = move();
    if (list[next] === undefined) return;
    at = next;
    frame();
    framed?.scrollIntoView({ block: 'nearest', inline: 'nearest' });
  });

  return {
    element,
    update() {
      element.toggleAttribute('hidden', !hasFigures());
      frame();
    },
    focus: () => button.focus({ preventScroll: true }),
  };
}
