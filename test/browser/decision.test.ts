import type { Page } from 'playwright-core';
import { beforeEach, expect, it } from 'vitest';
import { exampleOf, oneStudyPage, settled } from './studyPage.ts';

const study = oneStudyPage(exampleOf(['composite-i', 'concrete-box']));
let page: Page;
beforeEach(() => {
  ({ page } = study);
});

const CELL = '[id="11+010"]';
const text = async (): Promise<string> => (await page.locator(`${CELL} .decision`).textContent()) ?? '';
const press = (name: string): Promise<void> => page.getByRole('button', { name, exact: true }).click();
const focused = (): Promise<string | null | undefined> =>
  page.evaluate(() => document.activeElement?.getAttribute('aria-label'));
const undoTitle = (): Promise<string | null> =>
  page.getByRole('button', { name: 'Undo', exact: true }).getAttribute('title');
async function type(label: string, words: string): Promise<void> {
  await page.locator(`[aria-label="${label}"]`).focus();
  await page.keyboard.press('Control+a');
  await page.keyboard.type(words);
  await page.keyboard.press('Enter');
}

it('a decision is drafted from the standing, edited in place, and each edit is one step of undo', async () => {
  expect(await text()).toContain('No decision has been recorded.');
  await press('Record a decision');
  await expect.poll(text).toContain('A draft, not issued.');
  expect(await text()).toContain('Option 1 has the lowest median cost');
  expect(await page.locator(`${CELL} .dropped-options tbody tr`).count()).toBe(
    (await page.locator('.ranking tbody tr').count()) - 1,
  );
  await type('why option 2 is not taken forward', 'One more joint to look after.');
  expect(await undoTitle()).toBe('Undo why option 2 is not taken forward');
  await press('Add a question');
  expect(await focused()).toMatch(/^open question \d+$/u);
  await page.keyboard.type('May the slip be closed for a season?');
  await page.keyboard.press('Enter');
  await page.locator('h1').click();
  await expect.poll(text).toContain('May the slip be closed for a season?');
  await page.getByRole('button', { name: 'Undo', exact: true }).click();
  await expect.poll(text).not.toContain('May the slip');
  const count = (): Promise<number> => page.locator(`${CELL} [aria-label^="reason "]`).count();
  const before = await count();
  await page.locator('[aria-label="reason 1"]').focus();
  await page.keyboard.press('Control+a');
  await page.keyboard.press('Delete');
  await page.keyboard.press('Enter');
  await expect.poll(count).toBe(before - 1);
  await page.locator('[aria-label="option taken forward"]').selectOption('2');
  await expect.poll(() => page.locator('[aria-label="why option 1 is not taken forward"]').count()).toBe(1);
  expect(await page.locator('[aria-label="why option 2 is not taken forward"]').count()).toBe(0);
});

it('is issued once it says who decided, is there after a reload and on paper, and says what has changed since', async () => {
  const fingerprint = await page.locator('.block tr:last-child td').textContent();
  await press('Record a decision');
  await expect.poll(text).toContain('A draft, not issued.');
  await press('Issue it');
  expect(await text()).toContain('Not issued: nobody is named who decided.');
  await type('who decided', 'A. Mason');
  await press('Issue it');
  await expect.poll(text).toContain(`fingerprint ${fingerprint ?? ''}.`);
  expect(await page.locator(`${CELL} [contenteditable]`).count()).toBe(0);
  await expect.poll(() => page.locator('nav .state').textContent()).toMatch(/^saved/u);
  await page.reload();
  await settled(page);
  await expect.poll(text).toMatch(/Decided by A\. Mason on .*; issued on /u);
  expect(await text()).not.toContain('Changed since');
  await page.emulateMedia({ media: 'print' });
  expect(await page.locator(`${CELL} .said-list`).first().isVisible()).toBe(true);
  expect(await page.getByRole('button', { name: 'Withdraw the issue' }).isVisible()).toBe(false);
  await page.emulateMedia({ media: null });
  const rate = page.locator('[role=spinbutton][aria-label^="steel rate"]');
  await rate.focus();
  await page.keyboard.press('Control+a');
  await page.keyboard.type('7');
  await page.keyboard.press('Enter');
  await page.locator('h1').click();
  await expect
    .poll(text, { timeout: 30_000 })
    .toMatch(
      new RegExp(
        `Changed since\\..*was ${fingerprint ?? ''} then and is [0-9a-f]{12} now\\. P50 of option 1 was`,
        'u',
      ),
    );
  await press('Withdraw the issue');
  await expect.poll(text).toContain('A draft, not issued.');
  await press('Take the decision out');
  await expect.poll(text).toContain('No decision has been recorded.');
  await page.getByRole('button', { name: 'Undo', exact: true }).click();
  await expect.poll(text).toContain('A draft, not issued.');
});
