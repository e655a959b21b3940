import { h } from '../html.ts';
import type { HtmlChild } from '../html.ts';
import type { Cell, Graph, State, Uses, Values } from '../reactive/index.ts';
import type { CellHost, CellSpec, Explained, Room } from './cellHost.ts';
import { cellHost } from './cellHost.ts';
import { clock } from './clock.ts';
import { exchange } from './exchange.ts';
import { followHold, neverHeld } from './holding.ts';
import { frames, screenFrames } from './frames.ts';
import { heights, type Heights } from './heights.ts';
import { lateness } from './lateness.ts';
import { isDragging } from './dragging.ts';
import { drawingActions } from './drawingFile.ts';
import { isUpright, runningFoot } from './paper.ts';
import { bringTabbedToSight } from './tabbedTo.ts';
import { rests as newRests } from './rests.ts';
import { sight as newSight } from './sight.ts';
import { saveTables } from './tableFile.ts';
import type { LineSection } from './stationLines.ts';
import { stationLines } from './stationLines.ts';
import type { Station } from './ties.ts';
import { homeOf, tiesOf } from './ties.ts';
import { whenIdle } from './whenIdle.ts';

/** The line above the title: names of the pages at the left, what can be done at the right. */
export interface BarSpec {
  readonly pages: readonly { readonly words: string; readonly href: string; readonly here?: boolean }[];
  /** E.g. 'saved 14:02 on this device' and actions. */
  readonly tools?: HtmlChild;
}

/** What stands above the sections: the page opens with its answer, then one thing to do. */
export interface HeadSpec {
  readonly title: HtmlChild;
  readonly answer?: HtmlChild;
  /** After the word Next. */
  readonly next?: HtmlChild;
  /** Title block: rows of name and value. */
  readonly block?: readonly (readonly [name: string, value: HtmlChild])[];
}

export interface PageSpec {
  readonly bar?: BarSpec;
  readonly head: HeadSpec;
  readonly sections: readonly LineSection[];
  /** Beside the key line; absent leaves the usual hint, false says nothing. */
  readonly hint?: HtmlChild;
  /** What stands at the foot of every printed sheet after the title, e.g. the reference of a study and its fingerprint. */
  readonly foot?: () => readonly string[];
  /** What is said of all that leaves the page, printed or as a file, before everything on it is there; '' once it is. */
  readonly unfinished?: () => string;
}

export interface SheetOptions {
  /** Puts a failure in words; the message of the error unless given. */
  readonly explain?: (error: unknown, station: string) => Explained;
  /** Slow cells for which only those wait that show them: the others draw what has come before. */
  readonly aside?: readonly Cell<unknown>[];
  /** Names of the inputs that keep an older value, because what was typed over it is refused. */
  readonly held?: Cell<readonly string[]>;
  /** What stands in the margin of a cell below the notes of its own, e.g. notes typed by whoever reads it. */
  readonly beside?: (station: string, stations: readonly string[]) => HtmlChild;
}

/** The page of a notebook: builders for its parts, all tied to one graph. */
export interface Sheet {
  /**
   * A run of text or a part of a page that follows the values of cells; for titles, answers, findings.
   * @param meanwhile what it says until the first values come
   */
  readonly live: <const U extends Uses>(
    uses: U,
    show: (values: Values<U>) => HtmlChild,
    meanwhile?: string,
  ) => HTMLElement;
  readonly cell: <const U extends Uses>(spec: CellSpec<U>) => CellHost;
  readonly section: (
    number: number,
    title: string,
    finding: HtmlChild,
    cells: readonly CellHost[],
  ) => LineSection;
  /** Puts the page together under `root` and begins to show it. */
  readonly mount: (root: Element, spec: PageSpec) => HTMLElement;
  /** Draws now what waits for the next frame. */
  readonly flush: () => void;
  /** Stops watching the graph; the page stays as it is. */
  readonly end: () => void;
}

/** Room on a sheet of one kind: its body, a wide body, and the height a drawing may take on it, px; 980 px are 259 m at 1:1000. */
interface Full {
  readonly body: number;
  readonly wide: number;
  readonly paperPx: number | null;
}
const FULL: Full = { body: 980, wide: 1224, paperPx: null };
/** A3 laid across. */
const ACROSS: Full = { ...FULL, paperPx: 960 };
/** A3 upright has no note margin, and its station band is as narrow as on a hand-held screen. */
const UPRIGHT: Full = { body: 980, wide: 980, paperPx: 1400 };

const roomOn = ({ element }: CellHost, { body, wide, paperPx }: Full): Room => ({
  widthPx: element.classList.contains('wide') ? wide : body,
  paperPx,
});

/** Whether everything has been drawn is asked again after so long, ms. */
const SKIP_ASK_MS = 300;

const usualHint = 'Point at a cell: solid spans come from what it uses, dashed ones go to what uses it.';

const messageOf = (error: unknown): Explained => ({
  words: error instanceof Error ? error.message : String(error),
});

const bar = ({ pages, tools }: BarSpec): HTMLElement =>
  h(
    'nav',
    { 'aria-label': 'Pages' },
    h(
      'div',
      { class: 'bar' },
      h('span', { class: 'wordmark' }, 'Spanledger'),
      pages.map(({ words, href, here }) => h('a', { href, 'aria-current': here === true && 'page' }, words)),
      h('span', { class: 'apart' }),
      tools,
    ),
  );

const titleBlock = (rows: NonNullable<HeadSpec['block']>): HTMLElement =>
  h(
    'table',
    { class: 'block', 'aria-label': 'Title block' },
    h(
      'tbody',
      {},
      rows.map(([name, value]) => h('tr', {}, h('th', { scope: 'row' }, name), h('td', {}, value))),
    ),
  );

const head = ({ title, answer, next, block }: HeadSpec): HTMLElement =>
  h(
    'header',
    {},
    h('h1', {}, title),
    answer !== undefined && h('p', { class: 'answer' }, answer),
    next !== undefined && h('p', { class: 'next' }, h('b', {}, 'Next:'), ' ', next),
    block !== undefined && titleBlock(block),
  );

/**
 * A page on which cells of a graph are shown. Build cells and sections in page order, then mount them once.
 * Sections get the ids 's1', 's2' ..., cells the id of their station.
 */
export function sheet(
  graph: Graph,
  { explain = messageOf, aside = [], beside, held }: SheetOptions = {},
): Sheet {
  const queue = frames(screenFrames.drawing);
  const element = h('main', { class: 'sheet' });
  const stops: (() => void)[] = [];
  let sections: readonly LineSection[] = [];
  let known: readonly Station[] = [];
  let sizes: Heights | undefined;

  const hosts = (): CellHost[] => sections.flatMap((section) => section.hosts);
  /** Found out once: stations and cells stay what they are. */
  let tied: ReturnType<typeof tiesOf> | undefined;
  const ties = () => (tied ??= tiesOf(known, (cell) => graph.uses(cell)));
  const lines = stationLines(element, () => sections, ties, queue);

  const isBusy = (): boolean =>
    graph
      .cells()
      .some((cell) => cell.kind === 'slow' && !aside.includes(cell) && graph.state(cell).state === 'pending');
  const rests = newRests({ isFree: () => !isDragging() && !isBusy(), whenIdle, later: setTimeout });
  const sight = newSight();

  const page = {
    graph,
    frames: queue,
    explain,
    rests,
    sight,
    followHold: (cells: readonly Cell<unknown>[], typed: readonly Cell<unknown>[], tell: () => void) =>
      held === undefined ? neverHeld : followHold(graph, held, cells, typed, tell),
    drawnUnseen: (cell: HTMLElement) => sizes?.changed(cell.closest<HTMLElement>('.section')!),
    homeOf: (cellName: string) => homeOf(cellName, known, (cell) => graph.uses(cell)),
    waitsFor(station: string) {
      const above = new Set(ties().get(station)?.uses);
      return hosts().find((host) => above.has(host.station) && host.state() !== 'done')?.station;
    },
    changed: lines.redraw,
  };

  /** Runs of text that follow cells, each as it is brought up to date. */
  const runs: (() => void)[] = [];
  const onPaper = (): void => {
    const full = isUpright() ? UPRIGHT : ACROSS;
    lines.setPaper(true);
    for (const draw of runs) draw();
    for (const host of hosts()) host.setRoom(roomOn(host, full));
    queue.flush();
  };
  const onScreen = (): void => {
    lines.setPaper(false);
    for (const host of hosts()) host.setRoom(null);
    queue.flush();
  };
  /** Takes something from a cell as it is drawn on the full sheet, however narrow the screen. */
  const onFullSheet =
    (host: CellHost) =>
    <T>(take: () => T): T => {
      host.setRoom(roomOn(host, FULL));
      queue.flush();
      const taken = take();
      host.setRoom(null);
      queue.flush();
      return taken;
    };

  return {
    live(uses, show, meanwhile) {
      const part = h('span', { class: 'live' }, meanwhile);
      let state: State<Values<typeof uses>> = { state: 'pending' };
      let shown: unknown;
      let drawnAt: Date | undefined;
      /** Whether it is on the screen or about to be: elsewhere it rests like a drawing. */
      let isNear = true;
      const update = (): void => (isNear ? draw() : rests.put(draw, Infinity));
      const updateSoon = (): void => queue.request(update);
      const late = lateness(updateSoon);
      const draw = (): void => {
        rests.drop(draw);
        if (state.state === 'failed' && shown === undefined) part.replaceChildren();
        if ('value' in state && state.value !== shown) {
          shown = exchange(part, h('span', {}, show(state.value))) ? state.value : undefined;
          drawnAt = new Date();
        }
        mark();
      };
      /** Marks what is older than the page round it, and says so. */
      const mark = (): void => {
        const isHeld = state.state === 'ready' && hold.isHeld();
        part.classList.toggle('pending', state.state === 'failed' || late.isLate());
        part.classList.toggle('held', isHeld);
        part.setAttribute('aria-busy', String(late.isLate()));
        delete part.dataset['older'];
        // Until its first values come it says something of its own.
        if (drawnAt === undefined) return;
        if (isHeld) part.dataset['older'] = 'held';
        else if (late.isLate()) part.dataset['older'] = `being worked out; as of ${clock(drawnAt)}`;
      };
      const hold = page.followHold(Object.values(uses), [], updateSoon);
      part.addEventListener('focusout', updateSoon);
      runs.push(draw);
      stops.push(
        graph.view(uses, (next) => {
          state = next;
          late.set(next.state === 'pending');
          updateSoon();
        }),
        sight.watch(part, (next) => {
          isNear = next;
          if (isNear) updateSoon();
        }),
        () => rests.drop(draw),
        late.end,
        hold.end,
      );
      return part;
    },

    cell: (spec) => cellHost(page, spec),

    section(number, title, finding, cells) {
      const post = h('span', { class: 'post' }, number);
      const name = h(
        'span',
        { class: 'name' },
        title,
        finding !== null && finding !== undefined && h('span', { class: 'finding' }, finding),
      );
      const section = h(
        'section',
        { class: 'section', id: `s${number}`, 'aria-labelledby': `s${number}-title` },
        h('h2', { id: `s${number}-title` }, post, ' ', name),
        cells.map((host) => host.element),
      );
      return { number, title, element: section, hosts: cells };
    },

    mount(root, spec) {
      const { unfinished = () => '' } = spec;
      saveTables(element, unfinished);
      ({ sections } = spec);
      known = hosts().map(({ station, shows, owns }) => ({ name: station, shows, owns }));
      const { hint = usualHint } = spec;
      element.append(
        ...(spec.bar === undefined ? [] : [bar(spec.bar)]),
        head(spec.head),
        h('div', { class: 'key' }, hint !== false && h('p', { class: 'hint' }, hint), lines.flat),
        ...sections.map((section) => section.element),
        lines.upright,
      );
      /** The title, of one that is changed in place without what is said beside it. */
      const heading = (): string => {
        const title = element.querySelector('h1');
        return (title?.querySelector('.fig') ?? title)?.textContent ?? '';
      };
      for (const host of hosts()) {
        const { element: cell } = host;
        cell
          .querySelector(':scope > .body')
          ?.after(drawingActions(cell, heading, onFullSheet(host), unfinished));
      }
      if (beside !== undefined) {
        const stations = known.map(({ name }) => name);
        for (const host of hosts()) host.addToMargin(beside(host.station, stations));
      }
      root.append(element);
      sizes = heights(
        sections.map((section) => section.element),
        rests,
      );
      stops.push(sizes.end);
      for (const host of hosts()) {
        host.begin();
        stops.push(host.end);
      }
      // Once everything has been drawn its height is known, and what is off the screen need not be laid out any more.
      let asking: ReturnType<typeof setTimeout> | undefined;
      let frame = 0;
      const skip = (): void => {
        if (hosts().some((host) => host.element.dataset['state'] === 'pending'))
          asking = setTimeout(() => rests.put(skip, Infinity), SKIP_ASK_MS);
        // What was drawn last is laid out in the next frame, and its height seen at the end of it.
        else {
          frame = requestAnimationFrame(() => {
            frame = requestAnimationFrame(() => element.classList.add('skips'));
          });
        }
      };
      stops.push(
        () => clearTimeout(asking),
        () => cancelAnimationFrame(frame),
        () => rests.drop(skip),
      );
      skip();
      const { foot = () => [] } = spec;
      const stopFoot = runningFoot(() => [heading(), ...foot(), unfinished()]);
      window.addEventListener('beforeprint', onPaper);
      window.addEventListener('afterprint', onScreen);
      stops.push(lines.end, stopFoot, bringTabbedToSight(), () => {
        window.removeEventListener('beforeprint', onPaper);
        window.removeEventListener('afterprint', onScreen);
      });
      return element;
    },

    flush: queue.flush,

    end() {
      for (const stop of stops.splice(0)) stop();
    },
  };
}
