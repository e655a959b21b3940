import type { Locator, Page } from 'playwright-core';
import { afterAll, afterEach, beforeAll, expect } from 'vitest';
import example from '../../data/examples/low-ferry.json' with { type: 'json' };
import { openSite, type Heard, type Site } from './site.ts';

/** A cell says only after 150 ms that it waits: what is seen before that may be of the study before. */
const SAYS_SO_MS = 250;

/**
 * Waits until the stack stands and nothing is being worked out: cells are done, or held where an entry is refused. The
 * page's own clock is waited for, which on a busy machine runs behind that of the test, and then what it draws next.
 */
export async function settled(page: Page): Promise<void> {
  await page.waitForSelector('[data-option]', { timeout: 60_000 });
  await page.evaluate((ms) => new Promise((resolve) => setTimeout(resolve, ms)), SAYS_SO_MS);
  do {
    await page.waitForFunction(allStand, undefined, { timeout: 60_000, polling: 100 });
    await page.evaluate(
      () => new Promise((resolve) => requestAnimationFrame(() => requestAnimationFrame(resolve))),
    );
  } while (!(await page.evaluate(allStand)));
}

/** Whether every cell of the page is done or held, run in the page. */
const allStand = (): boolean =>
  // Once all has been drawn, what is off the screen is not laid out any more.
  document.querySelector('.skips') !== null &&
  [...document.querySelectorAll('.cell')].every((cell) =>
    ['done', 'held'].includes(cell.getAttribute('data-state')!),
  );

/** From one look at a place to the next, ms. */
const LOOK_MS = 100;

/** Middle of an element on the screen, px, once it stands still: what comes on the screen is laid out only then. */
export async function middleOf(element: Locator): Promise<readonly [x: number, y: number]> {
  await element.scrollIntoViewIfNeeded();
  for (let before = ''; ;) {
    const { x, y, width, height } = (await element.boundingBox())!;
    const now = [x, y, width, height].join();
    if (now === before) return [x + width / 2, y + height / 2];
    before = now;
    await element.page().waitForTimeout(LOOK_MS);
  }
}

/** Takes back every change on the page, whatever still holds the focus. */
export async function takeBack(page: Page): Promise<void> {
  await page.emulateMedia({ media: null });
  await page.mouse.up();
  await page.locator('h1').click();
  const undo = page.getByRole('button', { name: 'Undo', exact: true });
  while (await undo.isEnabled()) await undo.click();
}

/** What a page may not say or ask for. */
export function silent(heard: Heard): void {
  expect(heard.console).toEqual([]);
  expect(heard.elsewhere).toEqual([]);
}

/** The first worked example with some forms only: where the hand is tried, two say as much as four and are worked out sooner. */
export const exampleOf = (forms: readonly string[]): object => ({
  ...example,
  options: { ...example.options, forms },
});

/** Opens a study as a file from the disk would be opened. */
export async function openAsFile(page: Page, study: object): Promise<void> {
  const chooser = page.waitForEvent('filechooser');
  await page.getByRole('button', { name: 'Open', exact: true }).click();
  const buffer = Buffer.from(JSON.stringify(study));
  await (await chooser).setFiles({ name: 'study.json', mimeType: 'application/json', buffer });
}

/**
 * Opens the option study, or a study of a test's own, once for all tests of a file, for working it out takes seconds. After
 * each test everything it changed is taken back, and the page must have been silent.
 */
export function oneStudyPage(study?: object): { readonly page: Page } {
  let site: Site;
  let page: Page;
  let heard: Heard;
  beforeAll(async () => {
    site = await openSite();
    ({ page, heard } = await site.open('option-study.html'));
    if (study !== undefined) {
      // What the page works out of its example meanwhile is given up.
      await openAsFile(page, study);
      await page.waitForURL(/study=/u);
    }
    await settled(page);
  });
  afterEach(async () => {
    await takeBack(page);
    await settled(page);
    silent(heard);
  });
  afterAll(() => site.close());
  return {
    get page() {
      return page;
    },
  };
}
