import type { Page } from 'playwright-core';
import { beforeEach, expect, it } from 'vitest';
import { exampleOf, oneStudyPage, settled } from './studyPage.ts';

const study = oneStudyPage(exampleOf(['composite-i', 'concrete-box']));
let page: Page;
beforeEach(() => {
  ({ page } = study);
});

const CELL = '[id="10+015"]';
const rows = (): Promise<string[]> => page.locator(`${CELL} .priorities .words`).allTextContents();
const undoTitle = (): Promise<string | null> =>
  page.getByRole('button', { name: 'Undo', exact: true }).getAttribute('title');

it('a priority is added, named and weighed by keys alone, is there after a reload and on paper, and ranks nothing', async () => {
  const order = (): Promise<string[]> => page.locator('.ranking tbody tr .name').allTextContents();
  const before = await order();
  expect(await page.locator(`${CELL} .body`).textContent()).toContain('None are stated.');
  await page.getByRole('button', { name: 'Add a priority' }).focus();
  await page.keyboard.press('Enter');
  expect(await page.evaluate(() => document.activeElement?.getAttribute('aria-label'))).toBe(
    'priority new priority',
  );
  await page.keyboard.press('Control+a');
  await page.keyboard.type('short closure of the railway');
  await page.keyboard.press('Enter');
  await expect.poll(rows).toEqual(['short closure of the railway']);
  expect(await undoTitle()).toBe('Undo priority new priority');
  const weight = page.locator(`${CELL} [aria-label^="weight of short closure of the railway"]`);
  await weight.focus();
  await page.keyboard.press('Control+a');
  await page.keyboard.type('3');
  await page.keyboard.press('Enter');
  await page.locator('h1').click();
  expect(await weight.textContent()).toBe('3.0');
  expect(await page.locator(`${CELL} .body`).textContent()).toContain('does not use them');
  expect(await order()).toEqual(before);
  await expect.poll(() => page.locator('nav .state').textContent()).toMatch(/^saved/u);
  await page.reload();
  await settled(page);
  expect(await rows()).toEqual(['short closure of the railway']);
  expect(await weight.textContent()).toBe('3.0');
  await page.emulateMedia({ media: 'print' });
  expect(await weight.isVisible()).toBe(true);
  expect(await page.getByRole('button', { name: 'Add a priority' }).isVisible()).toBe(false);
  await page.emulateMedia({ media: null });
  await page.locator(`${CELL} .priorities .words`).focus();
  await page.keyboard.press('Control+a');
  await page.keyboard.press('Delete');
  await page.keyboard.press('Enter');
  await expect.poll(rows).toEqual([]);
  await page.getByRole('button', { name: 'Undo', exact: true }).click();
  await expect.poll(rows).toEqual(['short closure of the railway']);
});
