/**
 * How the option study answers a hand: opens the built page in Chromium with each worked example, drags figures, a pier,
 * an edge of an obstacle and a depth for two seconds each with real moves of the mouse, and prints what came of it. Run on
 * a machine with nothing else to do, with names of examples for those alone:
 *
 *   npx tsx test/bench/page.ts [example ...]
 *
 * Aims: first stack within 2 s of opening, 30 updates a second or more while dragging, what is on the screen drawn within
 * 200 ms of the release (150 later), the rest soon after.
 */
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join, resolve } from 'node:path';
import type { Page } from 'playwright-core';
import { build } from 'vite';
import { exampleNames } from '../../notebooks/exampleNames.ts';
import { openSite } from '../browser/site.ts';

/** What one drag came to. */
interface Drag {
  readonly updates: number;
  readonly frames: number;
  readonly ms: number;
  readonly longestFrameMs: number;
  /** From the release until what is on the screen was drawn for the last time, and until everything was. */
  readonly visibleMs: number;
  readonly releaseMs: number;
}

/** Notes in the page when things are drawn; what it needs of the page is found when it is first called. */
interface Watch {
  readonly first: number;
  start: (station: string) => void;
  release: () => void;
  result: () => Promise<Drag>;
}
type Watched = Window & { readonly watched: Watch };

/** Runs in the page before anything else. */
function watchPage(): void {
  let first = 0;
  const opening = new MutationObserver(() => {
    if (first > 0 || !document.querySelector('[data-option]')) return;
    requestAnimationFrame(() => (first ||= performance.now()));
  });
  opening.observe(document, { childList: true, subtree: true });
  let updates = 0;
  let frames = 0;
  let began = 0;
  let ended = 0;
  let lastDrawn = 0;
  let lastVisible = 0;
  let longest = 0;
  let isDragging = false;
  /** A drawing is changed in place: new nodes, moved marks and other words all count. */
  const whatever = { childList: true, subtree: true, attributes: true, characterData: true };
  const watched: Watch = {
    get first() {
      return first;
    },
    start(station) {
      const shown = document.getElementById(station)!.querySelector('.body')!;
      updates = frames = longest = 0;
      isDragging = true;
      began = performance.now();
      let before = began;
      let isNew = false;
      // What is in hand follows the pointer by itself: what has been drawn anew counts.
      const isDrawn = ({ target }: MutationRecord): boolean =>
        !(target instanceof Element) || target.closest('.handle') === null;
      new MutationObserver((records) => (isNew ||= records.some(isDrawn))).observe(shown, whatever);
      const frame = (now: number): void => {
        if (!isDragging) return;
        longest = Math.max(longest, now - before);
        before = now;
        frames += 1;
        if (isNew) updates += 1;
        isNew = false;
        requestAnimationFrame(frame);
      };
      requestAnimationFrame(frame);
    },
    release() {
      isDragging = false;
      ended = lastDrawn = lastVisible = performance.now();
      // Which parts are on the screen is told by the browser: to ask for their places would lay the page out.
      const onScreen = new Set<Element>();
      const sight = new IntersectionObserver((entries) => {
        for (const { target, isIntersecting } of entries) {
          if (isIntersecting) onScreen.add(target);
          else onScreen.delete(target);
        }
      });
      const bodies = document.querySelectorAll('.section .body, .section .notes, header .live, h2 .live');
      const drawing = new MutationObserver((records) => {
        const isSeen = records.some(({ target }) => {
          const element = target instanceof Element ? target : target.parentElement;
          return onScreen.has(element?.closest('.body, .notes, .live') ?? document.body);
        });
        requestAnimationFrame(() => {
          lastDrawn = performance.now();
          if (isSeen) lastVisible = lastDrawn;
        });
      });
      for (const body of bodies) {
        sight.observe(body);
        drawing.observe(body, whatever);
      }
    },
    async result() {
      // A cell says only after 150 ms that it waits.
      const isSettled = (): boolean =>
        performance.now() - lastDrawn > 700 && document.querySelector('.cell[data-state="pending"]') === null;
      while (!isSettled()) await new Promise((resolve) => setTimeout(resolve, 50));
      return {
        updates,
        frames,
        ms: ended - began,
        longestFrameMs: longest,
        visibleMs: lastVisible - ended,
        releaseMs: lastDrawn - ended,
      };
    },
  };
  Object.assign(window, { watched });
}

/** Processor time that the page's own thread has used, ms: fair on a machine that does other things as well. */
async function busyMeter(page: Page): Promise<() => Promise<number>> {
  const session = await page.context().newCDPSession(page);
  await session.send('Performance.enable', { timeDomain: 'threadTicks' });
  return async () => {
    const { metrics } = await session.send('Performance.getMetrics');
    return 1000 * metrics.find(({ name }) => name === 'TaskDuration')!.value;
  };
}

/** Half of the way that things are dragged, px. */
const REACH_PX = 30;

/** What is dragged: by a selector, in a cell. */
interface Grip {
  readonly name: string;
  readonly selector: string;
  readonly station: string;
  /** It is dragged up and down. */
  readonly isLevel?: boolean;
}

const figure = (name: string, station: string): Grip => ({
  name,
  selector: `[role=spinbutton][aria-label^="${name},"]`,
  station,
});
const handle = (name: string, key: string, station: string, isLevel = false): Grip => ({
  name,
  selector: `[id="${station}"] [data-handle${key}] .grip`,
  station,
  isLevel,
});

const grips: readonly Grip[] = [
  figure('no-pier width', '1+020'),
  figure('steel rate', '7+005'),
  handle('pier in the stack', '="pier/1"', '3+020'),
  handle('pier on the crossing', '="pier/1"', '1+020'),
  handle('edge of an obstacle', '^="obstacle/"', '1+020'),
  handle('depth in the stack', '="depth"', '3+020', true),
];

/** Drags something to and fro for two seconds, and says what its cell and the page did; null where there is no such thing. */
async function drag(
  page: Page,
  { selector, station, isLevel = false }: Grip,
): Promise<(Drag & { readonly busyMs: number }) | null> {
  const busy = await busyMeter(page);
  const field = page.locator(selector).first();
  if ((await field.count()) === 0) return null;
  // An answer that comes while the next thing is dragged would be counted with it.
  await page.waitForFunction(() => document.querySelector('.cell[data-state="pending"]') === null);
  await field.scrollIntoViewIfNeeded();
  await page.waitForTimeout(200);
  const box = (await field.boundingBox())!;
  const x = box.x + box.width / 2;
  const y = box.y + box.height / 2;
  /** So far from where it was taken, px. */
  const move = (px: number): Promise<void> => page.mouse.move(isLevel ? x : x + px, isLevel ? y + px : y);
  await move(0);
  await page.mouse.down();
  await page.evaluate((at) => (window as unknown as Watched).watched.start(at), station);
  const before = await busy();
  const start = Date.now();
  const moves: Promise<void>[] = [];
  for (let step = 1; Date.now() - start < 2000; step += 1) {
    // Out and back, as a mouse would tell it: every 8 ms, whether or not the page has kept up.
    moves.push(move(REACH_PX * (1 - Math.cos(step / 15)) + (step % 2)));
    await new Promise((resolve) => setTimeout(resolve, 8));
  }
  await Promise.all(moves);
  const busyMs = (await busy()) - before;
  await move(REACH_PX);
  await page.evaluate(() => (window as unknown as Watched).watched.release());
  await page.mouse.up();
  return { ...(await page.evaluate(() => (window as unknown as Watched).watched.result())), busyMs };
}

const asked = process.argv.slice(2);
const outDir = mkdtempSync(join(tmpdir(), 'spanledger-'));
const configFile = resolve(import.meta.dirname, '../../vite.config.ts');
await build({ configFile, logLevel: 'silent', build: { outDir } });
const site = await openSite(outDir, true);
try {
  for (const example of asked.length > 0 ? asked : exampleNames) {
    const { page, heard } = await site.open('about:blank');
    // The runner of this script names functions by a helper that the page does not have.
    await page.addInitScript('globalThis.__name = (named) => named');
    await page.addInitScript(watchPage);
    await page.goto(new URL(`option-study.html?example=${example}`, site.address).href);
    await page.waitForFunction(() => (window as unknown as Watched).watched.first > 0);
    const first = await page.evaluate(() => (window as unknown as Watched).watched.first);
    console.log(`${example}: first stack ${first.toFixed(0)} ms after opening`);
    // The workers begin at the first sign of a hand.
    await page.mouse.move(700, 400);
    await page.waitForTimeout(4000);
    for (const grip of grips) {
      const dragged = await drag(page, grip);
      if (dragged === null) {
        console.log(`  ${grip.name}: there is none`);
        continue;
      }
      const { updates, frames, ms, longestFrameMs, visibleMs, releaseMs, busyMs } = dragged;
      const figures = [
        `${((1000 * updates) / ms).toFixed(0)} updates a second of ${((1000 * frames) / ms).toFixed(0)} frames`,
        `${(busyMs / Math.max(1, updates)).toFixed(0)} ms of the page's thread each`,
        `longest frame ${longestFrameMs.toFixed(0)} ms`,
        `on the screen drawn ${visibleMs.toFixed(0)} ms after release`,
        `all drawn ${releaseMs.toFixed(0)} ms`,
      ];
      console.log(`  ${grip.name}: ${figures.join(', ')}`);
    }
    if (heard.console.length > 0) console.log(`  the page said: ${heard.console.join('; ')}`);
    await page.context().close();
  }
} finally {
  await site.close();
  rmSync(outDir, { recursive: true });
}
