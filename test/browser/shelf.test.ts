import { readFile } from 'node:fs/promises';
import type { Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { openSite, type Site } from './site.ts';
import { exampleOf, settled, silent } from './studyPage.ts';

let site: Site;
beforeAll(async () => {
  site = await openSite();
});
afterAll(() => site.close());

const rows = (page: Page): Promise<string[]> => page.locator('.study .title').allTextContents();

/** Opens a file from the shelf and comes back to the shelf. */
async function bring(page: Page, title: string): Promise<void> {
  const study = exampleOf(['composite-i', 'concrete-box']);
  const chooser = page.waitForEvent('filechooser');
  await page.getByRole('button', { name: 'Open a file' }).click();
  await (
    await chooser
  ).setFiles({
    name: 'study.json',
    mimeType: 'application/json',
    buffer: Buffer.from(JSON.stringify({ ...study, title })),
  });
  await page.waitForURL(/option-study\.html\?study=/u);
  await page.goto(new URL('index.html', site.address).href);
  await page.locator('.study').first().waitFor();
}

/** Whether the sentence of a new study has been filled and waits. */
const waits = (page: Page): Promise<boolean> =>
  page.evaluate(() => localStorage.getItem('spanledger.new-study') !== null);

describe('shelf', () => {
  it('without a study shows the worked example with its crossing, the cautions and the way on', async () => {
    const { page, heard } = await site.open('index.html');
    await page.getByText('No study lies here yet').waitFor();
    expect(await page.locator('.answer').innerText()).toMatch(/^No study lies on this device yet/u);
    const scale = page.locator('[id="3+010"] .elevation');
    expect(await scale.getAttribute('data-scale')).toBe('2500');
    expect(await page.locator('body').innerText()).toContain('not for construction');
    expect(await page.getByRole('link', { name: 'open a worked example' }).getAttribute('href')).toBe(
      './option-study.html',
    );
    silent(heard);
  });

  it('begins a study from its length alone, ranks it, and keeps it under its own name beside its duplicate', async () => {
    const { page, heard } = await site.open('index.html');
    const begin = page.getByRole('button', { name: 'Work it out' });
    await page.getByText('gap 4, the length between the abutments').waitFor();
    expect(await begin.isDisabled()).toBe(true);
    await page.getByRole('textbox', { name: 'name of the crossing' }).fill('Kelder crossing');
    await page.getByRole('spinbutton', { name: 'length between the abutments' }).fill('48');
    await page.keyboard.press('Enter');
    await page.getByText('Taken until it is known').waitFor();
    await page.getByRole('combobox', { name: 'what is crossed' }).selectOption('railway');
    // Half filled, it waits while the shelf is left.
    await page.goto(new URL('span-chart.html', site.address).href);
    await page.goto(new URL('index.html', site.address).href);
    expect(await page.getByRole('textbox', { name: 'name of the crossing' }).textContent()).toBe(
      'Kelder crossing',
    );
    expect(await page.getByRole('spinbutton', { name: 'length between the abutments' }).textContent()).toBe(
      '48.0',
    );
    expect(await page.getByRole('combobox', { name: 'what is crossed' }).inputValue()).toBe('railway');
    await page.getByRole('combobox', { name: 'what is crossed' }).selectOption('river');
    await page.locator('.new-study .elevation').waitFor();
    await begin.click();
    await page.waitForURL(/option-study\.html\?study=/u);
    await page.locator('.answer', { hasText: 'are being worked out' }).waitFor();
    await settled(page);
    expect(await page.locator('h1').textContent()).toBe('Kelder crossing');
    expect(await waits(page)).toBe(false);
    expect(await page.locator('.answer').innerText()).toMatch(/^Option \d+, .* comes out at /u);
    expect(await page.locator('[data-option]').count()).toBeGreaterThan(2);
    expect(await page.locator('[id="1+010"]').innerText()).toContain('Taken at the start');

    await page.goto(new URL('index.html', site.address).href);
    await page.getByRole('button', { name: 'Duplicate Kelder crossing' }).click();
    await page.waitForFunction(() => document.querySelectorAll('.study').length === 2);
    expect(await rows(page)).toEqual(['Kelder crossing, copy', 'Kelder crossing']);
    silent(heard);
  });

  it('marks the start values of a study begun from its length until they are changed or confirmed', async () => {
    const { page, heard } = await site.open('index.html');
    await page.getByRole('spinbutton', { name: 'length between the abutments' }).fill('48');
    await page.keyboard.press('Enter');
    await page.getByRole('button', { name: 'Work it out' }).click();
    await page.waitForURL(/option-study\.html\?study=/u);
    const field = (name: string) => page.locator(`[id="1+010"] [aria-label="${name}"]`);
    const [level, standard] = [field('road level at the start, m'), field('load standard')];
    /** Underline and words of a field. */
    const mark = async (one: typeof level): Promise<string> => {
      const line = await one.evaluate((element) => getComputedStyle(element).borderBottomStyle);
      const words = (await one.getAttribute('aria-description')) ?? '';
      return `${line}${words.includes('start value, not confirmed') ? ', not confirmed' : ''}`;
    };
    const unconfirmed = page.locator('[id="1+010"] .unconfirmed');
    const counts = (count: number): Promise<void> =>
      expect.poll(() => unconfirmed.textContent()).toMatch(new RegExp(`^${count} start values not`, 'u'));
    await counts(11);
    expect(await mark(level)).toBe('dotted, not confirmed');
    expect(await mark(standard)).toBe('dotted, not confirmed');
    expect(await mark(field('end, m'))).toBe('solid');
    expect(await mark(page.locator('[aria-label="ground point 2, level, m"]'))).toBe('dotted, not confirmed');

    // Changed at one end only, the level of the road has a start value still.
    await level.focus();
    await page.keyboard.press('Control+a');
    await page.keyboard.type('101.5');
    await page.keyboard.press('Enter');
    expect(await mark(level)).toBe('solid');
    await counts(11);
    // Left as it is, Enter confirms it; a choice has a word for it below.
    await field('road level at the end, m').focus();
    await page.keyboard.press('Enter');
    expect(await mark(field('road level at the end, m'))).toBe('solid');
    await counts(10);
    await standard.focus();
    await page.getByRole('button', { name: 'confirm load standard' }).click();
    expect(await mark(standard)).toBe('solid');
    await counts(9);
    await page.getByRole('button', { name: 'confirm the ground line as it stands' }).click();
    await counts(8);
    const undo = page.getByRole('button', { name: 'Undo', exact: true });
    await undo.click();
    await undo.click();
    await counts(10);
    expect(await mark(standard)).toBe('dotted, not confirmed');

    await page.locator('.state', { hasText: 'saved' }).waitFor();
    await page.reload();
    await counts(10);
    expect(await mark(level)).toBe('solid');
    expect(await level.textContent()).toBe('101.50');
    expect(await mark(standard)).toBe('dotted, not confirmed');
    await page.emulateMedia({ media: 'print' });
    expect(await mark(standard)).toBe('dotted, not confirmed');
    expect(await unconfirmed.isVisible()).toBe(true);
    silent(heard);
  });

  it('leads to a study that is worked out', async () => {
    const { page, heard } = await site.open('index.html');
    await page.getByRole('link', { name: 'open a worked example' }).click();
    await settled(page);
    silent(heard);
  });

  it('names the pages the same everywhere', async () => {
    const { page, heard } = await site.open('index.html');
    const names = async (): Promise<string[]> => page.locator('nav .bar > a').allTextContents();
    for (const [name, title] of [
      ['Span chart', 'Span chart'],
      ['Shelf', 'Shelf'],
      ['Option study', 'River Wend crossing at Low Ferry'],
    ] as const) {
      await page.getByRole('link', { name, exact: true }).first().click();
      await page.getByRole('heading', { level: 1, name: title }).waitFor();
      expect(await names()).toEqual(['Shelf', 'Option study', 'Span chart']);
      expect(await page.locator('nav [aria-current=page]').allTextContents()).toEqual([name]);
    }
    silent(heard);
  });

  it('a study from a file lies on the shelf, can be removed and put back, and saved as a file again', async () => {
    const { page, heard } = await site.open('index.html');
    await page.getByText('No study lies here yet').waitFor();
    await bring(page, 'Mill Lane over the bypass');
    await bring(page, 'Kelder viaduct');
    expect(await rows(page)).toEqual(['Kelder viaduct', 'Mill Lane over the bypass']);
    expect(await page.locator('.next').innerText()).toContain('open Kelder viaduct');
    expect(await page.locator('.study .elevation').first().getAttribute('data-scale')).toBe('5000');

    await page.getByRole('button', { name: 'Remove Kelder viaduct' }).click();
    await page.getByText('Kelder viaduct has been removed').waitFor();
    expect(await rows(page)).toEqual(['Mill Lane over the bypass']);
    await page.getByRole('button', { name: 'Put Kelder viaduct back' }).click();
    await page.waitForFunction(() => document.querySelectorAll('.study').length === 2);
    expect(await page.getByText('has been removed').count()).toBe(0);

    const saving = page.waitForEvent('download');
    await page.getByRole('button', { name: 'Save Kelder viaduct as a file' }).click();
    const file = await saving;
    expect(file.suggestedFilename()).toBe('wen-07-kelder-viaduct.spanledger.json');
    expect(JSON.parse(await readFile(await file.path(), 'utf8'))).toMatchObject({ title: 'Kelder viaduct' });
    silent(heard);
  });

  it('a file that is no study is refused with the reason and nothing is kept', async () => {
    const { page, heard } = await site.open('index.html');
    await page.getByText('No study lies here yet').waitFor();
    const chooser = page.waitForEvent('filechooser');
    await page.getByRole('button', { name: 'Open a file' }).click();
    await (
      await chooser
    ).setFiles({ name: 'x.json', mimeType: 'application/json', buffer: Buffer.from('{"a":') });
    await page.waitForFunction(() =>
      document.querySelector('nav .state')?.textContent.startsWith('Not opened.'),
    );
    await page.reload();
    await page.getByText('No study lies here yet').waitFor();
    silent(heard);
  });
});
