import type { Locator, Page } from 'playwright-core';
import { beforeEach, describe, expect, it } from 'vitest';
import { exampleOf, oneStudyPage, settled } from './studyPage.ts';

const study = oneStudyPage(exampleOf(['composite-i', 'concrete-box']));
let page: Page;
beforeEach(() => {
  ({ page } = study);
});

const CELL = '[id="1+030"]';
const notesOf = (cell: string): Promise<string[]> => page.locator(`${cell} .note`).allTextContents();
const focused = (): Promise<string | null | undefined> =>
  page.evaluate(() => document.activeElement?.getAttribute('aria-label'));
const undoButton = (): Locator => page.getByRole('button', { name: 'Undo', exact: true });

/** Types a note with the keyboard alone, from the action of its cell. */
async function note(action: string, words: string): Promise<void> {
  await page.getByRole('button', { name: action, exact: true }).focus();
  await page.keyboard.press('Enter');
  await page.keyboard.type(words);
  await page.keyboard.press('Enter');
  await page.locator('h1').click();
}

describe('a note against a cell', () => {
  it('is typed in its margin, is one step of undo, comes back, and goes when it is emptied', async () => {
    await page.getByRole('button', { name: 'Note to 1+030', exact: true }).focus();
    await page.keyboard.press('Enter');
    expect(await focused()).toBe('note to 1+030');
    await page.keyboard.type('Ask the drainage board');
    await page.keyboard.press('Enter');
    await page.keyboard.press('Tab');
    expect(await focused()).toBe('who wrote note to 1+030');
    await page.keyboard.type('A. Mason');
    await page.keyboard.press('Enter');
    await page.locator('h1').click();
    await expect.poll(() => notesOf(CELL)).toHaveLength(1);
    expect((await notesOf(CELL))[0]).toMatch(/^Ask the drainage board \d+ \p{L}+ \d{4} by A\. Mason$/u);
    expect(await undoButton().getAttribute('title')).toBe('Undo who wrote note to 1+030');
    await undoButton().click();
    expect(await undoButton().getAttribute('title')).toBe('Undo note to 1+030');
    await undoButton().click();
    await expect.poll(() => notesOf(CELL)).toEqual([]);
    await page.getByRole('button', { name: 'Redo', exact: true }).click();
    await expect.poll(() => notesOf(CELL)).toHaveLength(1);
    await page.locator('[aria-label="note to 1+030"]').focus();
    await page.keyboard.press('Control+a');
    await page.keyboard.press('Delete');
    await page.keyboard.press('Enter');
    await expect.poll(() => notesOf(CELL)).toEqual([]);
  });

  it('without words is none', async () => {
    await page.getByRole('button', { name: 'Note to 1+030', exact: true }).click();
    await expect.poll(() => notesOf(CELL)).toHaveLength(1);
    await page.locator('h1').click();
    await expect.poll(() => notesOf(CELL)).toEqual([]);
    expect(await undoButton().isDisabled()).toBe(true);
  });

  it('leaves the fingerprint and the answer as they are, is there after a reload, and on paper', async () => {
    const fingerprint = (): Promise<string | null> => page.locator('.block tr:last-child td').textContent();
    const before = await fingerprint();
    await note('Note to 7+020', 'Budget includes the eastern approach');
    await expect.poll(() => page.locator('nav .state').textContent()).toMatch(/^saved/u);
    await page.reload();
    await settled(page);
    const [said] = await notesOf('[id="7+020"]');
    expect(said).toContain('Budget includes the eastern approach');
    expect(await fingerprint()).toBe(before);
    await page.emulateMedia({ media: 'print' });
    const words = page.locator('[aria-label="note to 7+020"]');
    expect(await words.isVisible()).toBe(true);
    expect(await page.locator('[aria-label="Note to 7+020"]').isVisible()).toBe(false);
    // Nobody has said who wrote it: paper does not ask.
    expect(await page.locator('[aria-label="who wrote note to 7+020"]').isVisible()).toBe(false);
    await page.emulateMedia({ media: null });
    await words.focus();
    await page.keyboard.press('Control+a');
    await page.keyboard.press('Delete');
    await page.locator('h1').click();
    await expect.poll(() => notesOf('[id="7+020"]')).toEqual([]);
  });
});

describe('a note on an option', () => {
  it('stands under the ranking by the number of its option, which is chosen in its place', async () => {
    const ranking = '[id="10+010"]';
    await page.getByRole('button', { name: 'Note on an option', exact: true }).focus();
    await page.keyboard.press('Enter');
    await page.keyboard.type('Sunday work only');
    await page.keyboard.press('Enter');
    await page.locator('h1').click();
    await page.locator('[aria-label^="option of note to option"]').selectOption('option 2');
    await expect
      .poll(() => page.locator('[aria-label="note to option 2"]').textContent())
      .toBe('Sunday work only');
    expect(await notesOf(ranking)).toHaveLength(1);
    await undoButton().click();
    await expect.poll(() => page.locator('[aria-label="note to option 1"]').count()).toBe(1);
  });
});
