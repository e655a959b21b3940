import { keyLine } from '../drawing/keyLine.ts';
import { stationLine } from '../drawing/stationLine.ts';
import type { StationMark } from '../drawing/stationLine.ts';
import type { Piece } from '../drawing/piece.ts';
import { redraw as redrawAs, toDom } from '../drawing/toDom.ts';
import { h } from '../html.ts';
import type { CellHost } from './cellHost.ts';
import { isDragging } from './dragging.ts';
import type { Frames } from './frames.ts';
import type { Ties } from './ties.ts';

/** A section as the lines see it. */
export interface LineSection {
  readonly number: number;
  readonly title: string;
  readonly element: HTMLElement;
  readonly hosts: readonly CellHost[];
}

export interface StationLines {
  /** The line beside the sheet, to be laid over its band. */
  readonly upright: HTMLElement;
  /** The line under the title. */
  readonly flat: HTMLElement;
  /** Draws both anew in the next frame. */
  readonly redraw: () => void;
  /** On paper nothing is pointed at. */
  readonly setPaper: (isPaper: boolean) => void;
  readonly end: () => void;
}

const pixels = (element: Element, property: string): number =>
  parseFloat(getComputedStyle(element).getPropertyValue(property));

/** Makes a line stand in its place, or changes the one that stands there. */
function drawIn(place: Element, piece: Piece): void {
  const drawn = place.firstElementChild;
  if (drawn === null || !redrawAs(drawn, piece)) place.replaceChildren(toDom(piece, document));
}

/**
 * Both lines of a page. Pointing at a cell, or having the focus in it, draws the spans to what it uses and to what
 * uses it on both. `ties` is asked anew each time something else is pointed at.
 */
export function stationLines(
  sheet: HTMLElement,
  sections: () => readonly LineSection[],
  ties: () => ReadonlyMap<string, Ties>,
  frames: Frames,
): StationLines {
  const upright = h('div', { class: 'stations-over', 'aria-hidden': 'true' });
  const flat = h('nav', { class: 'flat', 'aria-label': 'Sections of this page' });
  const listening = new AbortController();
  const { signal } = listening;
  let pointed: string | undefined;
  let focused: string | undefined;
  let joined: ({ readonly at: string } & Ties) | undefined;
  let drawnFlat = '';
  let drawnUpright = '';
  let isPaper = false;

  const hosts = (): CellHost[] => sections().flatMap((section) => section.hosts);

  /** How far below the top of its section the middle of each station was when it was last laid out, px. */
  const below = new WeakMap<CellHost, number>();
  const placeOf = (host: CellHost, sheetTop: number, sectionTop: number): number => {
    // To ask for the place of what is off the screen would lay it out.
    if (host.label.checkVisibility({ contentVisibilityAuto: true }) || !below.has(host)) {
      const { top, height } = host.label.getBoundingClientRect();
      below.set(host, top + height / 2 - sheetTop - sectionTop);
    }
    return sectionTop + below.get(host)!;
  };

  /** Stations and posts, px down from the top of the sheet, which itself is so far down the screen. */
  const marks = (sheetTop: number): StationMark[] =>
    sections().flatMap(({ number, element, hosts: cells }) => {
      const top = element.getBoundingClientRect().top - sheetTop;
      return [
        // The post stands level with the rule over the section.
        { name: String(number), y: top, post: true },
        ...cells.map((host) => ({
          name: host.station,
          y: placeOf(host, sheetTop, top),
          state: host.state(),
        })),
      ];
    });

  /** What the upright line is drawn from, read from the page. */
  const uprightNow = () => {
    const top = -sheet.getBoundingClientRect().top;
    return {
      heightPx: sheet.clientHeight,
      marks: marks(-top),
      ...(joined && { joined }),
      view: { top: Math.max(0, top), bottom: Math.min(sheet.clientHeight, top + window.innerHeight) },
      lineX: pixels(sheet, '--line'),
      bandPx: pixels(sheet, '--band'),
    };
  };
  const drawUpright = (input: ReturnType<typeof uprightNow>): void => {
    const said = JSON.stringify(input);
    if (said === drawnUpright) return;
    drawnUpright = said;
    drawIn(upright, stationLine(input));
  };

  const drawFlat = (widthPx: number): void => {
    const said = JSON.stringify([widthPx, joined, hosts().length]);
    if (widthPx === 0 || said === drawnFlat) return;
    drawnFlat = said;
    const piece = keyLine({
      sections: sections().map(({ number, title, element, hosts: cells }) => ({
        number,
        name: title,
        href: `#${element.id}`,
        stations: cells.map(({ station }) => station),
      })),
      widthPx,
      ...(joined && { joined }),
    });
    const held = flat.contains(document.activeElement) ? document.activeElement?.getAttribute('href') : null;
    flat.replaceChildren(toDom(piece, document));
    if (typeof held === 'string') flat.querySelector<SVGAElement>(`a[href="${held}"]`)?.focus();
  };

  const drawNow = (): void => {
    if (!sheet.isConnected) return;
    // All is read before anything is written: what is asked in between lays the page out once more.
    const input = uprightNow();
    const widthPx = flat.clientWidth;
    const near = new Set([...(joined?.uses ?? []), ...(joined?.usedBy ?? []), joined?.at]);
    for (const { station, label } of hosts()) label.classList.toggle('joined', near.has(station));
    drawUpright(input);
    drawFlat(widthPx);
  };
  /** Before the page has been laid out once, to ask for places would lay it out without its drawings. */
  let isLaidOut = false;
  const redraw = (): void => {
    if (isLaidOut) frames.request(drawNow);
  };

  const join = (): void => {
    const at = isPaper ? undefined : (pointed ?? focused);
    if (at === joined?.at) return;
    const tied = at === undefined ? undefined : ties().get(at);
    joined = at === undefined || tied === undefined ? undefined : { at, ...tied };
    redraw();
  };
  const stationAt = (target: EventTarget | null): string | undefined =>
    target instanceof Element ? target.closest('.cell')?.id : undefined;

  sheet.addEventListener(
    'pointerover',
    ({ target, pointerType }) => {
      // While something is dragged the pointer passes over cells it does not mean.
      if (pointerType === 'touch' || isDragging()) return;
      pointed = stationAt(target);
      join();
    },
    { signal },
  );
  sheet.addEventListener(
    'pointerleave',
    () => {
      pointed = undefined;
      join();
    },
    { signal },
  );
  sheet.addEventListener(
    'focusin',
    ({ target }) => {
      focused = stationAt(target);
      join();
    },
    { signal },
  );
  sheet.addEventListener(
    'focusout',
    () => {
      focused = undefined;
      join();
    },
    { signal },
  );
  window.addEventListener('scroll', () => joined && redraw(), { signal, passive: true });
  window.addEventListener('resize', redraw, { signal });
  const watcher = new ResizeObserver(() => {
    isLaidOut = true;
    redraw();
  });
  watcher.observe(sheet);

  return {
    upright,
    flat,
    redraw,
    setPaper(next) {
      isPaper = next;
      join();
    },
    end() {
      listening.abort();
      watcher.disconnect();
    },
  };
}
