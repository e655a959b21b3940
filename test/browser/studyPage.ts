import type { Page } from 'playwright-core';
import { afterAll, afterEach, beforeAll, expect } from 'vitest';
import { openSite, type Heard, type Site } from './site.ts';

/** A cell says only after 150 ms that it waits: what is seen before that may be of the study before. */
const SAYS_SO_MS = 250;

/** Waits until the stack stands and nothing is being worked out. */
export async function settled(page: Page): Promise<void> {
  await page.waitForSelector('[data-option]', { timeout: 60_000 });
  await page.waitForTimeout(SAYS_SO_MS);
  await page.waitForFunction(
    () => [...document.querySelectorAll('.cell')].every((cell) => cell.getAttribute('data-state') === 'done'),
    undefined,
    { timeout: 60_000 },
  );
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

/**
 * Opens the option study once for all tests of a file, for working it out takes seconds. After each test everything it changed
 * is taken back, and the page must have been silent.
 */
export function oneStudyPage(): { readonly page: Page } {
  let site: Site;
  let page: Page;
  let heard: Heard;
  beforeAll(async () => {
    site = await openSite();
    ({ page, heard } = await site.open('option-study.html'));
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
