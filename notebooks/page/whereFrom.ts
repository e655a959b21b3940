import { pathsOf } from '../drawing/asked.ts';
import { powers } from '../format.ts';
import { h } from '../html.ts';
import type { ChainView } from './chainView.ts';
import { chainView } from './chainView.ts';
import type { Ask } from './figureChain.ts';
import type { FigureWalk } from './figureWalk.ts';
import { figureWalk } from './figureWalk.ts';
import { valueWords } from './figureValue.ts';
import { frames, screenFrames } from './frames.ts';

export type { Ask } from './figureChain.ts';

/** The figures of a page that can be asked where they come from. */
export interface WhereFrom {
  /** The answers of an age, or null while there are none; `isPending` while newer ones are worked out. */
  readonly set: (ask: Ask | null, isPending: boolean) => void;
  readonly end: () => void;
}

/** A part of the page under which an answer opens: a cell, the head of the page, the title of a section. */
interface Host {
  readonly element: Element;
  readonly box: HTMLElement;
  readonly walk: FigureWalk | null;
  open: { readonly chain: ChainView; readonly asked: string } | null;
}

/** Pause in drawing after which figures are counted anew, ms. */
const PAUSE_MS = 150;

const FIGURES = '[data-figure]';

/** Where figures are not seen: told without asking what is laid out, which would lay out all that is off the screen. */
const FOLDED = 'details:not([open]), [hidden], .on-paper';

const isSeen = (element: Element): boolean => element.getClientRects().length > 0;

/** Where the answers of a part of the page stand: under its body, never over it. */
function putBox(element: Element, box: HTMLElement): void {
  if (element.matches('.cell')) element.querySelector(':scope > .body')?.after(box);
  else if (element.matches('h2')) element.after(box);
  else element.append(box);
}

const wordsOf = (figure: Element): string =>
  figure.closest('svg') !== null && !figure.matches('text') ? '' : figure.textContent.trim();

/**
 * Makes every `data-figure` of a sheet answer where it comes from: by click, or by Enter on it or on the action of its
 * cell. The answer opens under the cell as a chain that is walked down to what was typed and up to what uses it, and
 * keeps its place while the study is worked out anew.
 * @param stationOf the station where a figure is shown
 */
export function whereFrom(sheet: HTMLElement, stationOf: (path: string) => string | undefined): WhereFrom {
  const hosts = new Map<Element, Host>();
  const queue = frames(screenFrames.drawing);
  const listening = new AbortController();
  const { signal } = listening;
  let ask: Ask | null = null;
  let isPending = false;

  const figuresOf = (host: Element): Element[] => Array.from(host.querySelectorAll(FIGURES)).filter(isSeen);
  const hasFigures = (host: Element): boolean =>
    Array.from(host.querySelectorAll(FIGURES)).some((figure) => figure.closest(FOLDED) === null);

  const show = (): void => {
    if (ask === null) return;
    for (const { open } of hosts.values()) open?.chain.show(ask, isPending);
  };

  const mark = ({ element, open }: Host): void => {
    for (const one of element.querySelectorAll('.asked')) one.classList.remove('asked');
    if (open !== null)
      figuresOf(element)
        .find((one) => one.getAttribute('data-figure') === open.asked)
        ?.classList.add('asked');
  };

  const say = (figure: Element): string => {
    const paths = pathsOf(figure.getAttribute('data-figure')!);
    const words = wordsOf(figure);
    if (ask === null) return words;
    try {
      const names = paths.slice(0, 2).map((path) => {
        const found = ask!(path);
        const name = powers(found.label);
        return words === '' ? `${name} ${valueWords(found)}` : name;
      });
      return [
        ...(words === '' ? [] : [`${words}:`]),
        names.join(', '),
        ...(paths.length > 2 ? ['and more'] : []),
      ].join(' ');
    } catch {
      return words;
    }
  };

  const close = (host: Host): void => {
    if (host.open === null) return;
    const { chain } = host.open;
    const held = chain.element.contains(document.activeElement);
    const figure = host.element.querySelector<HTMLElement>('.asked');
    chain.element.remove();
    host.open = null;
    mark(host);
    if (!held) return;
    if (figure?.matches('[tabindex]') === true) figure.focus();
    else {
      host.walk?.focus();
      figure?.scrollIntoView({ block: 'nearest' });
    }
  };

  const open = (host: Host, figure: Element): void => {
    if (ask === null) return;
    const asked = figure.getAttribute('data-figure')!;
    const isSame = host.open?.asked === asked;
    host.open?.chain.element.remove();
    host.open = null;
    if (isSame) return mark(host);
    const chain = chainView({
      roots: pathsOf(asked),
      words: wordsOf(figure),
      stationOf,
      close: () => close(host),
    });
    host.open = { chain, asked };
    host.box.append(chain.element);
    chain.show(ask, isPending);
    mark(host);
    chain.focus();
    chain.element.scrollIntoView({ block: 'nearest' });
  };

  const hostOf = (element: Element): Host => {
    const known = hosts.get(element);
    if (known !== undefined) return known;
    const walk = element.matches('.cell')
      ? figureWalk({
          figures: () => figuresOf(element),
          hasFigures: () => hasFigures(element),
          say,
          ask: (figure) => open(host, figure),
        })
      : null;
    const box = h('div', { class: 'whence' }, walk?.element);
    const host: Host = { element, box, walk, open: null };
    putBox(element, box);
    hosts.set(element, host);
    return host;
  };

  /** The figure that an event means, and the part of the page it stands in. */
  const meant = ({ target }: Event): readonly [Host, Element] | null => {
    const figure = target instanceof Element ? target.closest(FIGURES) : null;
    const part = figure?.closest('.cell, h2, header') ?? null;
    return figure === null || part === null || ask === null ? null : [hostOf(part), figure];
  };

  const answer = (event: Event): void => {
    const found = meant(event);
    if (found === null) return;
    event.preventDefault();
    // A figure on a row that can be chosen is asked, and the row is left as it is.
    event.stopPropagation();
    open(...found);
  };
  sheet.addEventListener('click', answer, { capture: true, signal });
  sheet.addEventListener(
    'keydown',
    (event) => {
      const isFigure = event.target instanceof Element && event.target.matches(FIGURES);
      if (isFigure && (event.key === 'Enter' || event.key === ' ')) answer(event);
    },
    { signal },
  );

  const redrawn = new Set<Element>();
  let timer: ReturnType<typeof setTimeout> | undefined;
  /** What the keyboard can walk is found out once drawing has paused. */
  const walkAgain = (): void => {
    for (const cell of redrawn) hostOf(cell).walk?.update();
    redrawn.clear();
  };
  const markOpen = (): void => {
    for (const host of hosts.values()) if (host.open !== null) mark(host);
  };
  const drawn = new MutationObserver((records) => {
    const targets = new Set(records.map(({ target }) => target));
    const parts = new Set<Element>();
    for (const target of targets) {
      const part = target instanceof Element ? target.closest('.body, .notes, .live') : null;
      if (part !== null) parts.add(part);
    }
    if (parts.size === 0) return;
    for (const part of parts) {
      const cell = part.closest('.cell');
      if (cell !== null) redrawn.add(cell);
    }
    queue.request(markOpen);
    clearTimeout(timer);
    timer = setTimeout(walkAgain, PAUSE_MS);
  });
  drawn.observe(sheet, { childList: true, subtree: true });
  for (const cell of sheet.querySelectorAll('.cell')) redrawn.add(cell);
  walkAgain();

  return {
    set(next, pending) {
      ask = next ?? ask;
      isPending = pending;
      show();
    },
    end() {
      listening.abort();
      drawn.disconnect();
      clearTimeout(timer);
    },
  };
}
