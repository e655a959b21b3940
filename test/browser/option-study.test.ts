import type { Page } from 'playwright-core';
import { describe, expect, it } from 'vitest';
import { oneStudyPage, settled } from './studyPage.ts';
import { lookThrough, touching } from './touching.ts';

const study = oneStudyPage();

/** Types a figure into the field of that name and leaves it with Enter. */
async function type(page: Page, name: string, value: string): Promise<void> {
  const field = page.locator(`[role=spinbutton][aria-label^="${name},"]`).first();
  await field.focus();
  await page.keyboard.press('Control+a');
  await page.keyboard.type(value);
  await page.keyboard.press('Enter');
}

/** Rows of the ranking as text. */
const ranking = (page: Page): Promise<string[]> =>
  page.locator('.ranking tbody tr').evaluateAll((rows) => rows.map((row) => row.textContent));

describe('option study', () => {
  it('opens without a study on the worked example, fully worked out, and says nothing', async () => {
    const { page } = study;
    expect(await page.locator('h1').textContent()).toBe('River Wend crossing at Low Ferry');
    expect(await page.locator('.answer').textContent()).toMatch(/comes out at .* M€, between/u);
    const drawn = await page.locator('#\\33 \\+020 [data-option]').count();
    expect(drawn).toBeGreaterThanOrEqual(4);
    expect(await ranking(page)).toHaveLength(drawn);
    expect(await page.locator('body').textContent()).toContain('Demo rates');
    expect(await page.locator('body').textContent()).toContain('not for construction');
  });

  it('a wider barred stretch lengthens the span, and everything follows', async () => {
    const { page } = study;
    const before = await ranking(page);
    await type(page, 'no-pier width', '80');
    await page.waitForFunction(() => document.querySelector('#s2')?.textContent.includes('83 m asks'));
    // Girders and boxes with 83 to 85 m lie within 1 % of each other: either may lead.
    await page.waitForFunction(() =>
      /\b8[345](\.\d)?\b/u.test(document.querySelector('.ranking tbody tr')?.textContent ?? ''),
    );
    expect(await ranking(page)).not.toEqual(before);
  });

  it('dearer steel moves the concrete box ahead of the composite girders', async () => {
    const { page } = study;
    const first = (rows: string[]): string => rows[0]!;
    expect(first(await ranking(page))).toContain('Composite I');
    await type(page, 'steel rate', '7');
    await page.waitForFunction(() =>
      document.querySelector('.ranking tbody tr')?.textContent.includes('Concrete box'),
    );
    // The answer is off the screen by then and follows when the page is idle.
    await page.locator('.answer', { hasText: /^Option \d+, concrete box/u }).waitFor();
  });

  // Up to about 1.5 m more is taken up by the crest, the ends staying where they are.
  it('more headroom over the railway lifts the road', async () => {
    const { page } = study;
    const level = (): Promise<string | null> => page.locator('#s4 .finding').textContent();
    const before = await level();
    await type(page, 'headroom over Low Ferry branch, single track', '7.5');
    await page.waitForFunction(
      (words) => document.querySelector('#s4 .finding')?.textContent !== words,
      before,
    );
    await settled(page);
    expect(await level()).toMatch(/rises/u);
  });

  it('a refused figure keeps the last good study and says what was expected', async () => {
    const { page } = study;
    const before = await ranking(page);
    await type(page, 'headroom over Low Ferry branch, single track', '-3');
    await page.waitForFunction(() => document.querySelector('#s1')?.textContent.includes('at least'));
    expect(await ranking(page)).toEqual(before);
  });

  it('an edit can be undone, is saved on the device and opens again', async () => {
    const { page } = study;
    await type(page, 'no-pier width', '70');
    await page.waitForFunction(() => location.search.includes('study='));
    await page.reload();
    await settled(page);
    expect(await page.locator('#s2').textContent()).toContain('73 m asks');
  });

  it('title and reference are changed where they stand; the tab, the file and undo follow', async () => {
    const { page } = study;
    const rename = async (name: string, words: string): Promise<void> => {
      await page.getByRole('textbox', { name }).fill(words);
      await page.keyboard.press('Enter');
    };
    await rename('title of the study', 'Wend bridge, option B');
    await rename('reference of the study', 'WEN 08');
    await page.waitForFunction(() => document.title === 'Wend bridge, option B · Spanledger');
    const saving = page.waitForEvent('download');
    await page.getByRole('button', { name: 'Save as file' }).click();
    expect((await saving).suggestedFilename()).toBe('wen-08-wend-bridge-option-b.spanledger.json');

    await rename('title of the study', ' ');
    await page.locator('h1 .refusal', { hasText: 'The last valid study is kept' }).waitFor();
    expect(await page.title()).toBe('Wend bridge, option B · Spanledger');
    await page.getByRole('button', { name: "Back to 'Wend bridge, option B'" }).click();
    await page.waitForFunction(
      () => document.querySelector('h1 .fig')?.textContent === 'Wend bridge, option B',
    );
    expect(await page.locator('h1').textContent()).toBe('Wend bridge, option B');
  });

  it('asks the span chart for the opening and the deck of the study', async () => {
    const { page } = study;
    const width = page.locator('[role=spinbutton][aria-label^="no-pier width,"]').first();
    const asked = `./span-chart.html?opening=${(await width.getAttribute('aria-valuenow')) ?? ''}&pier=3&width=12.5&length=230`;
    const link = page.locator('[id="2+010"] a[href^="./span-chart.html"]');
    await expect.poll(() => link.getAttribute('href')).toBe(asked);
  });

  it('a form is asked for and left out again; what is not asked for is listed as dropped', async () => {
    const { page } = study;
    const cell = page.locator('[id="2+020"]');
    const dropped = page.locator('[id="3+020"], [id="3+010"]').locator('tr', { hasText: 'not asked for' });
    const before = await dropped.count();
    expect(before).toBeGreaterThan(0);
    await cell.getByRole('button', { name: 'Composite box: ask for it' }).click();
    await cell.getByRole('button', { name: 'Composite box: leave it out' }).waitFor();
    await page
      .locator('.ranking tbody tr', { hasText: 'Composite box' })
      .first()
      .waitFor({ state: 'attached' });
    await settled(page);
    expect(await dropped.count()).toBe(before - 1);
    await cell.getByRole('button', { name: 'Composite box: leave it out' }).click();
    await page.waitForFunction(
      () => !document.querySelector('.ranking tbody')?.textContent.includes('Composite box'),
    );
  });

  it('a click on an elevation makes it the reference everywhere', async () => {
    const { page } = study;
    const row = page.locator('[data-option]').nth(3);
    const number = await row.getAttribute('data-option');
    await row.click({ position: { x: 60, y: 20 } });
    await page.waitForFunction(
      (n) => document.querySelector('#s5 .finding')?.textContent.startsWith(`Option ${n} `),
      number,
    );
  });
});

it('says how the depth was chosen and where depths end, each depth once', async () => {
  const { page } = study;
  const cell = page.locator('[id="4+020"]');
  await cell.scrollIntoViewIfNeeded();
  const notes = (): Promise<string> => cell.locator('.notes').innerText();
  await expect.poll(notes).toContain('the shallowest found within 1 % of the least cost');
  await expect
    .poll(notes)
    .toMatch(/no further than the published band for its spans: \d\.\d\d to \d\.\d\d m/u);
  const depths = await cell.locator('details.behind tbody tr > :first-child').allTextContents();
  expect(depths.length).toBeGreaterThan(2);
  expect(new Set(depths).size).toBe(depths.length);
});

it('the crossing keeps its band of figures at 720, as at 1440 magnified twice, with the least spare in it', async () => {
  const { page } = study;
  const spare = (): Promise<string[]> =>
    page.locator('[id="1+020"] svg .band [font-weight="600"]').allTextContents();
  await page.locator('[id="1+020"]').scrollIntoViewIfNeeded();
  const least = (await spare()).at(-1);
  expect(least).toMatch(/^\d+\.\d\d$/u);
  await page.setViewportSize({ width: 720, height: 450 });
  await page.waitForFunction(() => document.querySelector('[id="1+020"] svg.drawing')!.clientWidth < 700);
  await page.locator('[id="1+020"]').scrollIntoViewIfNeeded();
  await expect.poll(async () => (await spare()).at(-1)).toBe(least);
  await page.setViewportSize({ width: 1440, height: 900 });
});

it('no lettering touches other or leaves its sheet at 1024, 720 and 400', async () => {
  const { page } = study;
  for (const width of [1024, 720, 400]) {
    await page.setViewportSize({ width, height: 900 });
    await page.waitForFunction((px) => document.documentElement.clientWidth === px, width);
    await settled(page);
    await page.evaluate(lookThrough);
    await settled(page);
    expect(await page.evaluate(touching)).toEqual([]);
  }
  await page.setViewportSize({ width: 1440, height: 900 });
});

it('a table behind a chart is saved as CSV with plain figures', async () => {
  const { page } = study;
  const table = page.locator('#s7 details.behind').first();
  await table.locator('summary').click();
  const [download] = await Promise.all([page.waitForEvent('download'), table.locator('button.csv').click()]);
  const stream = await download.createReadStream();
  let text = '';
  for await (const piece of stream) text += String(piece);
  const [head, ...rows] = text.trim().split('\n');
  expect(head).toContain(',');
  expect(rows.length).toBeGreaterThanOrEqual(4);
  expect(text).not.toMatch(/[\u2009\u2212]/u);
});
