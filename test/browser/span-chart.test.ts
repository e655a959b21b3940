import type { Page } from 'playwright-core';
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import { openSite, type Heard, type Site } from './site.ts';

let site: Site;
beforeAll(async () => {
  site = await openSite();
});
afterAll(() => site.close());

const silent = (heard: Heard): void => {
  expect(heard.console).toEqual([]);
  expect(heard.elsewhere).toEqual([]);
};

/** Waits until every cell is drawn. */
const settled = (page: Page): Promise<unknown> =>
  page.waitForFunction(() => {
    const cells = [...document.querySelectorAll('.cell')];
    return cells.length > 0 && cells.every((cell) => cell.getAttribute('data-state') === 'done');
  });

/** Types a figure into the field of that name and leaves it with Enter. */
async function type(page: Page, name: string, value: string): Promise<void> {
  const field = page.getByRole('spinbutton', { name });
  await field.focus();
  await page.keyboard.press('Control+a');
  await page.keyboard.type(value);
  await page.keyboard.press('Enter');
}

const answer = (page: Page): Promise<string> => page.locator('.answer').innerText();
/** Words of a form's row in the first chart. */
const rowOf = (page: Page, form: string): Promise<string> =>
  page
    .locator('[id="1+020"] g.form')
    .filter({ hasText: form })
    .evaluate((row) => [...row.querySelectorAll('text')].map((text) => text.textContent).join(' | '));
const said = (page: Page, place: string, words: string): Promise<unknown> =>
  page.waitForFunction(
    ([where, what]) => document.querySelector(where!)?.textContent.includes(what!),
    [place, words],
  );

describe('span chart', () => {
  // One page for what can be taken back on it: opening one takes seconds.
  let page: Page;
  let heard: Heard;
  beforeAll(async () => {
    ({ page, heard } = await site.open('span-chart.html'));
    await settled(page);
  });
  afterEach(async () => {
    await page.getByRole('combobox', { name: 'order of the forms' }).selectOption('family');
    await page.getByRole('combobox', { name: 'line of the road' }).selectOption('straight');
    await type(page, 'clear opening', '60');
    await said(page, '.answer', 'asks for 63 m');
    await settled(page);
    silent(heard);
  });

  it('opens with an answer for 60 m, seventeen forms, and says nothing', async () => {
    expect(await answer(page)).toContain('asks for 63 m');
    expect(await answer(page)).toContain('Composite box, composite I and cantilever-built box are in');
    expect(await page.locator('[id="1+020"] g.form').count()).toBe(17);
    expect(await rowOf(page, 'Precast I')).toMatch(
      /possible \| 63.m is more than one piece of 50.m: pieces are spliced/u,
    );
    expect(await page.locator('[id="5+010"] li').count()).toBeGreaterThan(30);
    expect(await page.locator('body').innerText()).toContain('not for construction');
  });

  it('another opening changes the answer, the standings, the depths and what was built', async () => {
    const depths = await page.locator('[id="2+010"]').innerText();
    await type(page, 'clear opening', '217');
    await said(page, '.answer', 'asks for 220 m');
    await said(page, '#s4 .finding', '200 to 300 m');
    expect(await answer(page)).toMatch(/Cable-stayed, truss, .* are in/u);
    expect(await rowOf(page, 'Cable-stayed')).toContain('| in |');
    // The charts of the sources stand, and the asked span moves in each.
    const asked = page.locator('[id="3+010"] .limit text');
    expect(await asked.allTextContents()).toEqual(['220 m asked', '220 m asked', '220 m asked']);
    for (const line of await asked.all()) expect((await line.boundingBox())?.width).toBeGreaterThan(20);
    expect(await rowOf(page, 'Composite I')).toContain('| out |');
    expect(await page.locator('[id="2+010"]').innerText()).not.toBe(depths);
  });

  it('the road becomes straight or curved by choice, and the radius comes and goes with it', async () => {
    const radius = page.getByRole('spinbutton', { name: 'plan radius' });
    expect(await radius.isVisible()).toBe(false);
    await page.getByRole('combobox', { name: 'line of the road' }).selectOption('curved');
    expect(await radius.isVisible()).toBe(true);
    await said(page, '.block', 'radius 500 m');
    await page.getByRole('combobox', { name: 'line of the road' }).selectOption('straight');
    await said(page, '.block', 'straight');
  });

  it('forms are listed by fit on request, the best first, and the choice keeps the focus', async () => {
    const first = (): Promise<string> =>
      page
        .locator('[id="1+020"] g.form text')
        .first()
        .evaluate((text) => text.textContent);
    expect(await first()).toBe('Slab');
    const order = page.getByRole('combobox', { name: 'order of the forms' });
    await order.focus();
    await order.selectOption('fit');
    await page.waitForFunction(
      () => document.querySelector('[id="1+020"] g.form text')?.textContent === 'Composite box',
    );
    expect(await order.evaluate((field) => field === document.activeElement)).toBe(true);
  });

  it('a step of the opening changes the drawings of what hangs on the span, and no other', async () => {
    await page.evaluate(() => {
      for (const cell of document.querySelectorAll('.cell:has(svg)')) {
        const seen = new MutationObserver(() => cell.setAttribute('data-changed', ''));
        seen.observe(cell, { childList: true, characterData: true, subtree: true });
        for (const svg of cell.querySelectorAll('svg'))
          seen.observe(svg, { attributes: true, subtree: true });
      }
    });
    /** Stations of drawings in which nothing has changed since the page was opened. */
    const standing = (): Promise<string[]> =>
      page.evaluate(() =>
        [...document.querySelectorAll('.cell:has(svg):not([data-changed])')].map((cell) => cell.id),
      );
    const step = async (words: string): Promise<void> => {
      await page.getByRole('spinbutton', { name: 'clear opening' }).press('ArrowUp');
      await said(page, '[id="1+020"] .limit', words);
      await said(page, '[id="3+010"] .limit', words);
      await settled(page);
    };
    await step('64 m asked');
    expect(await standing()).toEqual(['4+010']);
    // The next bucket of what was built begins at 75 m.
    await type(page, 'clear opening', '71');
    await said(page, '[id="1+020"] .limit', '74 m asked');
    await settled(page);
    expect(await standing()).toEqual(['4+010']);
    await step('75 m asked');
    await said(page, '#s4 .finding', '75 to 100 m');
    expect(await standing()).toEqual([]);
  });
});

describe('a span chart of its own', () => {
  it('a tight curve puts straight forms out and says the radius', async () => {
    const { page, heard } = await site.open('span-chart.html?opening=177&radius=600');
    await settled(page);
    expect(await rowOf(page, 'Truss')).toContain('| possible |');
    await type(page, 'plan radius', '250');
    await page.waitForFunction(() =>
      [...document.querySelectorAll('[id="1+020"] g.form')].some((row) =>
        row.textContent.includes('a straight truss cannot carry a road tighter than 300'),
      ),
    );
    expect(await rowOf(page, 'Truss')).toContain('| out |');
    silent(heard);
  });

  it('limiting spans of the deck are worked out on wish, left off, marked in the chart and say where they come from', async () => {
    const { page, heard } = await site.open('span-chart.html');
    await settled(page);
    const cell = page.locator('[id="1+030"]');
    const row = (form: string): Promise<string> =>
      cell.locator('.reaches').getByRole('row', { name: form }).innerText();
    await page.getByRole('button', { name: 'Work all out: limiting spans of this deck' }).click();
    await cell.getByText('tries').first().waitFor();
    await page.getByRole('button', { name: 'Leave off: limiting spans of this deck' }).click();
    await expect.poll(() => cell.innerText()).not.toMatch(/waits|tries/u);
    await page.getByRole('button', { name: 'work it out: limiting span of this deck, Truss' }).click();
    await expect.poll(() => row('Truss')).toMatch(/\d{3}\s+end post/u);
    expect(await row('Cable-stayed')).toContain('work it out');
    await expect.poll(() => rowOf(page, 'Truss')).toMatch(/carries no more from \d+.m: end post/u);
    const span = cell.locator('.reaches').getByRole('row', { name: 'Truss' }).locator('.worked').first();
    expect(await page.locator('[id="1+020"] [data-figure="reach/truss/spanM"]').first().textContent()).toBe(
      `${await span.textContent()} m`,
    );
    await span.click();
    await cell.getByText('walk and halving').waitFor();
    // Another deck has limits of its own.
    await type(page, 'deck width', '20');
    await expect.poll(() => row('Truss')).toContain('work it out');
    expect(await page.locator('[id="1+020"] [data-figure^="reach"]').count()).toBe(0);
    silent(heard);
  });

  it('a length shorter than the opening is refused beside it and the last answer is kept', async () => {
    const { page, heard } = await site.open('span-chart.html');
    await settled(page);
    await type(page, 'length between abutments', '40');
    await page.getByText('both abutments stand outside the opening').waitFor();
    expect(await answer(page)).toContain('asks for 63 m');
    await page.getByRole('button', { name: 'Take 60' }).click();
    await said(page, '.answer', 'asks for 60 m');
    expect(await page.getByText('both abutments stand outside the opening').count()).toBe(0);
    silent(heard);
  });

  it('a question can be kept as an address, and a bad one is answered with what was wrong', async () => {
    const { page, heard } = await site.open('span-chart.html');
    await settled(page);
    await type(page, 'clear opening', '90');
    await type(page, 'length between abutments', '300');
    await page.waitForFunction(() => location.search.includes('length=300'));
    await page.reload();
    await settled(page);
    expect(await answer(page)).toContain('asks for 93 m');
    await page.goto(new URL('span-chart.html?opening=lots', site.address).href);
    await settled(page);
    expect(await page.locator('nav .state').innerText()).toContain("received 'lots'");
    expect(await answer(page)).toContain('asks for 63 m');
    silent(heard);
  });

  it('on a hand-held screen forms that are out are folded, nothing runs off, and unfolding stays', async () => {
    const { page, heard } = await site.open('span-chart.html', { width: 400, height: 800 });
    await settled(page);
    expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBe(400);
    const fold = page.locator('.folded');
    expect(await fold.evaluate((one: HTMLDetailsElement) => one.open)).toBe(false);
    await fold.locator('summary').click();
    await type(page, 'clear opening', '80');
    await said(page, '.answer', 'asks for 83 m');
    await page.waitForFunction(() => document.querySelector('.limit text')?.textContent.startsWith('83'));
    expect(await fold.evaluate((one: HTMLDetailsElement) => one.open)).toBe(true);
    silent(heard);
  });
});
