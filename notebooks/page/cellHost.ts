import { h } from '../html.ts';
import type { HtmlChild } from '../html.ts';
import type { Cell, Graph, Progress, State, Uses, Values } from '../reactive/index.ts';
import { clock } from './clock.ts';
import type { Frames } from './frames.ts';
import type { Hold } from './holding.ts';
import { lateness } from './lateness.ts';
import { renew } from './renew.ts';
import type { Rests } from './rests.ts';
import type { Sight } from './sight.ts';
import type { Way } from './refusal.ts';
import { waysOn } from './refusal.ts';
import type { StationState } from '../drawing/stationLine.ts';

/** The room a body has on the sheet. */
export interface Room {
  readonly widthPx: number;
  /** Height that a drawing may take on a printed sheet, px: one higher than that is given in parts; null on the screen. */
  readonly paperPx: number | null;
}

/** A part that stands as it is, or one drawn anew from the values of the cells whenever they have changed. */
export type Part<U extends Uses> = HtmlChild | ((values: Values<U>, room: Room) => HtmlChild);

/** A cell of the page. */
export interface CellSpec<U extends Uses> {
  /** Its chainage: '3+020'. */
  readonly station: string;
  /** What it is, in a word or two, for those who move by headings: 'Arrangements'. */
  readonly title: string;
  /** The cells of the graph it shows, by the name its parts know them under. */
  readonly shows: U;
  /** Slow cells its values are made from by and by: while they run it says so, and its drawing follows all the same. */
  readonly awaits?: readonly Cell<unknown>[];
  /** Cells that belong to this station although one further up shows them too. */
  readonly owns?: readonly Cell<unknown>[];
  /** Cells whose values are typed at this station: it shows them as they are typed, refused or not. */
  readonly typed?: readonly Cell<unknown>[];
  readonly body: Part<U>;
  readonly notes?: Part<U>;
  /** Body takes the note margin too; notes go below. */
  readonly wide?: boolean | ((values: Values<U>) => boolean);
  /** May run on over several printed sheets. */
  readonly long?: boolean;
}

/** A failure in words, with what can be done about it. */
export interface Explained {
  readonly words: string;
  readonly ways?: readonly Way[];
}

/** What a cell needs to know of its page. */
export interface HostPage {
  readonly graph: Graph;
  readonly frames: Frames;
  readonly explain: (error: unknown, station: string) => Explained;
  /** The station where a cell of the graph is to be looked for. */
  readonly homeOf: (cellName: string) => string | undefined;
  /** Where what is off the screen waits to be drawn. */
  readonly rests: Rests;
  readonly sight: Sight;
  /** Follows whether what is made from some cells is held because an entry is refused. */
  readonly followHold: (
    cells: readonly Cell<unknown>[],
    typed: readonly Cell<unknown>[],
    tell: () => void,
  ) => Hold;
  /** A cell has been drawn off the screen, where it is not laid out. */
  readonly drawnUnseen: (element: HTMLElement) => void;
  /** The station this one waits for, if any. */
  readonly waitsFor: (station: string) => string | undefined;
  /** The state of a station, or the place of something, has changed. */
  readonly changed: () => void;
}

export interface CellHost {
  readonly station: string;
  readonly title: string;
  readonly shows: readonly Cell<unknown>[];
  readonly owns: readonly Cell<unknown>[];
  readonly element: HTMLElement;
  /** The label whose middle is the place of the station. */
  readonly label: HTMLElement;
  /** Puts something into its margin, below the notes of its own. */
  readonly addToMargin: (child: HtmlChild) => void;
  readonly state: () => StationState;
  /** Begins to show: call once the element stands in the page. */
  readonly begin: () => void;
  /** Draws for a room of its own, as on paper, or for that on the screen again. */
  readonly setRoom: (room: Room | null) => void;
  readonly end: () => void;
}

/** A drawing that stands in a body for itself, not one in a table or a field. */
const ownDrawing = ':scope > svg.drawing, :scope > * > svg.drawing';

/** How far a slow run has come is said again after so long, ms: each word of it costs the page a frame. */
const SAY_EVERY_MS = 250;

/** What a cell says while an entry it depends on is refused. */
const refusedWords = 'held at the last valid study, because an entry it depends on is refused';

/** What a slow run says of itself: 'being worked out: 120 of 480, sizing spans'. */
const progressWords = (progress: Progress | undefined): string =>
  progress === undefined
    ? 'being worked out'
    : `being worked out: ${progress.done} of ${progress.of}, ${progress.what}`;

/**
 * A cell on the page: its station in the band, its body, its notes, and its state. It watches the cells it shows, draws
 * its parts anew at most once a frame and only when their values or its room have changed, and keeps the last good
 * drawing while it waits and after a failure.
 */
export function cellHost<const U extends Uses>(page: HostPage, spec: CellSpec<U>): CellHost {
  const { graph, frames } = page;
  const { station, title } = spec;
  const place = Number(station.replace('+', '.'));
  const label = h('a', { class: 'station', href: `#${station}` }, station);
  const body = h('div', { class: 'body' });
  const margin = h('aside', { class: 'notes', 'aria-label': `Notes to ${station}` });
  const notes = spec.notes === undefined ? null : h('div', { class: 'given' });
  if (notes !== null) margin.append(notes);
  const failure = h('div', { class: 'said', role: 'status' });
  const status = h('p', { class: 'status-words', role: 'status', id: `${station}-status` });
  const element = h(
    'div',
    {
      class: `cell${spec.wide === true ? ' wide' : ''}${spec.long === true ? ' long' : ''}`,
      id: station,
      role: 'group',
      'aria-label': `${station} ${title}`,
      'data-state': 'pending',
    },
    label,
    failure,
    body,
    notes === null ? null : margin,
    status,
  );

  let state: State<Values<U>> = { state: 'pending' };
  let progress: Progress | undefined;
  let drawn: { readonly values: Values<U>; readonly room: Room } | undefined;
  let drawnAt: Date | undefined;
  /** Width of the body as last observed: to ask for it between drawings would lay the whole page out each time. */
  let bodyPx = 0;
  /** Whether it is on the screen or about to be. */
  let isNear = true;
  let saidAt = -Infinity;
  let isOwed = false;
  let bodyError: unknown;
  /** Its size has changed, and with it the places of the stations below. */
  let isResized = false;
  const awaited = new Map<Cell<unknown>, State<unknown>>();
  /** Room it is drawn for instead of that on the screen. */
  let given: Room | null = null;
  const stops: (() => void)[] = [];
  let hold: Hold | undefined;

  /** What failed: its own values, or something they are made from by and by. */
  const failedState = () => [state, ...awaited.values()].find((one) => one.state === 'failed');
  const isWaiting = (): boolean => [state, ...awaited.values()].some((one) => one.state === 'pending');
  /** Whether what is drawn is not what its cells have come to. */
  const isBehind = (): boolean => 'value' in state && drawn?.values !== state.value;

  const stationState = (): StationState => {
    if (bodyError !== undefined) return 'failed';
    const failed = failedState();
    if (failed !== undefined) {
      const home = page.homeOf(failed.raisedBy) ?? station;
      return home === station ? 'failed' : 'held';
    }
    if (isBehind() && (!isNear || late.isLate())) return 'pending';
    if (isWaiting() && late.isLate()) return 'pending';
    return hold?.isHeld() === true ? 'held' : 'done';
  };

  const drawPart = (target: HTMLElement, part: Part<U>, values: Values<U>, room: Room): boolean => {
    if (typeof part !== 'function') return true;
    return renew(target, part(values, room));
  };

  const draw = (): void => {
    // Off the screen its width may never have been observed.
    if (!isNear) bodyPx ||= body.clientWidth;
    const widthPx = given?.widthPx ?? bodyPx;
    const values = 'value' in state ? state.value : undefined;
    if (values === undefined || widthPx === 0) return;
    if (typeof spec.wide === 'function') element.classList.toggle('wide', spec.wide(values));
    const room = { widthPx, paperPx: given?.paperPx ?? null };
    const isSame =
      drawn?.values === values && drawn.room.widthPx === widthPx && drawn.room.paperPx === room.paperPx;
    if (!isOwed && isSame) return;
    drawn = { values, room };
    drawnAt = new Date();
    try {
      const whole = drawPart(body, spec.body, values, room);
      const noted = notes === null || drawPart(notes, spec.notes, values, room);
      isOwed = !whole || !noted;
      element.classList.toggle('drawn', body.querySelector(ownDrawing) !== null);
      bodyError = undefined;
    } catch (error) {
      // A drawing that cannot be made is a failure of this cell like any other; the last one stays.
      bodyError = error;
      isOwed = false;
    }
  };

  const sayFailure = (): void => {
    const error = bodyError ?? failedState()?.error;
    const { words, ways = [] } = page.explain(error, station);
    failure.replaceChildren(h('p', { class: 'failure' }, words), ...waysOn(ways));
  };

  const pendingWords = (): string => {
    const other = progress === undefined ? page.waitsFor(station) : undefined;
    return other === undefined ? progressWords(progress) : `waits for ${other}`;
  };
  const heldWords = (): string => {
    const raisedBy = failedState()?.raisedBy;
    if (raisedBy === undefined) return refusedWords;
    const failed = page.homeOf(raisedBy);
    return `held at the last good figures${failed === undefined ? '' : `, because ${failed} has failed`}`;
  };

  const wordsOf = (now: StationState): string => {
    if (now !== 'held' && now !== 'pending') return '';
    if (now === 'held') return heldWords();
    const since = drawn === undefined || drawnAt === undefined ? '' : `; drawn as of ${clock(drawnAt)}`;
    return `${pendingWords()}${since}`;
  };
  const say = (now: StationState): void => {
    saidAt = performance.now();
    if (now === 'failed') sayFailure();
    else if (failure.firstChild !== null) failure.replaceChildren();
    const words = wordsOf(now);
    if (status.textContent !== words) status.textContent = words;
  };

  /** The time belongs to what is seen: the rest is drawn when the page has nothing better to do, and on paper. */
  const update = (): void => {
    if (isNear || given !== null) return drawAndSay();
    page.rests.put(drawAndSay, place);
    if (element.dataset['state'] !== stationState()) saySoFar();
  };
  const drawAndSay = (): void => {
    page.rests.drop(drawAndSay);
    draw();
    if (!isNear && given === null) page.drawnUnseen(element);
    late.set(isWaiting());
    saySoFar();
  };
  const saySoFar = (): void => {
    const now = stationState();
    const isSame = element.dataset['state'] === now;
    say(now);
    if (!isSame) {
      element.dataset['state'] = now;
      element.classList.toggle('pending', now === 'pending');
      element.classList.toggle('held', now === 'held');
      element.classList.toggle('failed', now === 'failed');
      element.setAttribute('aria-busy', String(now === 'pending'));
      // A refusal holds many cells at once and is told where it is made: each says so to those who come to it.
      status.setAttribute('aria-live', now === 'held' ? 'off' : 'polite');
      if (now === 'held') element.setAttribute('aria-describedby', status.id);
      else element.removeAttribute('aria-describedby');
    }
    // Telling the lines costs the page a layout.
    if (!isSame || isResized) page.changed();
    isResized = false;
  };
  const updateSoon = (): void => frames.request(update);
  const late = lateness(updateSoon);

  const show = (next: State<Values<U>>): void => {
    state = next;
    late.set(isWaiting() || isBehind());
    if (next.state !== 'pending') progress = undefined;
    updateSoon();
  };

  body.addEventListener('focusout', () => {
    if (isOwed) updateSoon();
  });

  return {
    station,
    title,
    shows: [...Object.values(spec.shows), ...(spec.awaits ?? [])],
    owns: spec.owns ?? [],
    element,
    label,
    addToMargin(child) {
      if (!margin.isConnected) status.before(margin);
      margin.append(...h('div', {}, child).childNodes);
    },
    state: stationState,
    begin() {
      const standing = (part: Part<U>): HtmlChild => (typeof part === 'function' ? null : part);
      body.append(...h('div', {}, standing(spec.body)).childNodes);
      notes?.append(...h('div', {}, standing(spec.notes)).childNodes);
      stops.push(graph.view(spec.shows, show));
      const awaits = spec.awaits ?? [];
      hold = page.followHold([...Object.values(spec.shows), ...awaits], spec.typed ?? [], updateSoon);
      stops.push(hold.end);
      for (const cell of [...Object.values(spec.shows), ...awaits]) {
        if (cell.kind !== 'slow') continue;
        const watch = (one: State<unknown>): void => {
          progress = one.state === 'pending' ? one.progress : undefined;
          if (awaits.includes(cell)) {
            const isNews = awaited.get(cell)?.state !== one.state;
            awaited.set(cell, one);
            late.set(isWaiting() || isBehind());
            if (isNews) updateSoon();
          }
          if (isNear && late.isLate() && performance.now() - saidAt > SAY_EVERY_MS) updateSoon();
        };
        stops.push(graph.watch(cell, watch));
      }
      const watcher = new ResizeObserver(() => {
        bodyPx = body.clientWidth;
        isResized = true;
        updateSoon();
      });
      watcher.observe(body);
      const sight = page.sight.watch(element, (next) => {
        isNear = next;
        if (!isNear) return;
        page.rests.look(place);
        updateSoon();
      });
      stops.push(
        () => watcher.disconnect(),
        sight,
        () => page.rests.drop(drawAndSay),
      );
    },
    setRoom(room) {
      given = room;
      updateSoon();
    },
    end() {
      late.end();
      for (const stop of stops) stop();
    },
  };
}
