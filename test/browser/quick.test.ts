import { beforeAll, describe, expect, it } from 'vitest';
import type { Page } from 'playwright-core';
import { middleOf, oneStudyPage, settled } from './studyPage.ts';

const study = oneStudyPage();
let page: Page;
beforeAll(() => {
  ({ page } = study);
});

const crossingNote = (): Promise<string | null> =>
  page.locator('[id="1+020"] .notes').evaluate((notes) => notes.textContent);
const held = 'supports and depths are held';
const ranking = (): Promise<string[]> =>
  page.locator('.ranking tbody tr').evaluateAll((rows) => rows.map((row) => row.textContent));

/** Takes hold of the figure of a name and moves it, without letting go. */
async function pull(name: string, byPx: number): Promise<void> {
  const [x, y] = await middleOf(page.locator(`[role=spinbutton][aria-label^="${name},"]`).first());
  await page.mouse.move(x, y);
  await page.mouse.down();
  for (let step = 1; step <= 4; step += 1) await page.mouse.move(x + (byPx * step) / 4, y);
}

/** What the page shows in the first moment in which the reference is held, all read at once. */
const whileHeld = async (): Promise<{ road: string; rates: string; ranking: string[] }> => {
  const seen = await page.waitForFunction((words) => {
    const text = (selector: string): string => document.querySelector(selector)?.textContent ?? '';
    if (!text('[id="1+020"] .notes').includes(words) && !text('[id="7+005"] .notes').includes(words))
      return null;
    return {
      road: [...document.querySelectorAll('[id="1+020"] .band > g')]
        .map((row) => row.textContent)
        .find((row) => row.startsWith('road'))!,
      rates: text('[id="7+005"] .notes'),
      ranking: [...document.querySelectorAll('.ranking tbody tr')].map((row) => row.textContent),
    };
  }, held);
  return (await seen.jsonValue())!;
};

describe('while a figure is dragged', () => {
  it('headroom over the railway: the road follows at once, the order waits and says so', async () => {
    const before = await page.locator('[id="1+020"] .band > g', { hasText: /^road/u }).textContent();
    const order = await ranking();
    await pull('headroom over Low Ferry branch, single track', 48);
    const seen = await whileHeld();
    expect(seen.road).not.toBe(before);
    expect(seen.ranking).toEqual(order);
    await page.mouse.up();
    await page.waitForFunction(
      (words) => !document.querySelector('[id="1+020"] .notes')?.textContent.includes(words),
      held,
    );
    await settled(page);
  });

  it('steel rate: the price of the reference follows beside the rate, and the whole is one step of undo', async () => {
    const note = (): Promise<string | null> => page.locator('[id="7+005"] .notes').textContent();
    const before = await note();
    await pull('steel rate', 60);
    expect((await whileHeld()).rates).not.toBe(before);
    await page.mouse.up();
    await settled(page);
    await page.keyboard.press('Escape');
    await page.getByRole('button', { name: 'Undo' }).click();
    await page.waitForFunction(
      (words) => document.querySelector('[id="7+005"] .notes')?.textContent === words,
      before,
    );
    expect(await page.getByRole('button', { name: 'Undo' }).isDisabled()).toBe(true);
  });

  it('no-pier width over a pier: the arrangement is said to be forbidden, and the search finds another', async () => {
    await pull('no-pier width', 60);
    await page.waitForFunction(() =>
      document
        .querySelector('[id="1+020"] .notes')
        ?.textContent.includes('Not as it stands. The reference: support in a barred stretch: River Wend'),
    );
    await page.mouse.up();
    await page.waitForFunction(
      () => !document.querySelector('[id="1+020"] .notes')?.textContent.includes('Not as it stands'),
    );
    expect(await crossingNote()).toMatch(/^Option \d+, the reference: /u);
  });
});
