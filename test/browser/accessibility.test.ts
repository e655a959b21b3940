import { readFileSync } from 'node:fs';
import type { Page } from 'playwright-core';
import { describe, expect, it } from 'vitest';
import { openSite } from './site.ts';
import { oneStudyPage, settled } from './studyPage.ts';

const axe = readFileSync('node_modules/axe-core/axe.min.js', 'utf8');

interface Found {
  readonly id: string;
  readonly impact: string | null;
  readonly nodes: { readonly target: unknown }[];
}

/** Serious faults of what is on the page, by the checker, which the test evaluates past the page's content policy. */
async function faultsOf(page: Page): Promise<unknown[]> {
  const found = await page
    .evaluate(async (source) => {
      (0, eval)(source);
      const checker = (window as unknown as { axe: { run(): Promise<{ violations: Found[] }> } }).axe;
      const { violations } = await checker.run();
      return violations.map(({ id, impact, nodes }) => ({
        id,
        impact,
        at: nodes.slice(0, 3).map((node) => node.target),
      }));
    }, axe)
    .catch((error: unknown) => [{ id: 'not run', impact: 'serious', at: [String(error)] }]);
  return found.filter(({ impact }) => impact === 'serious' || impact === 'critical');
}

it.each(['span-chart.html', 'index.html'])('%s has no serious fault of accessibility', async (path) => {
  const site = await openSite();
  const { page } = await site.open(path);
  await page.waitForSelector('.cell', { timeout: 60_000 });
  expect(await faultsOf(page)).toEqual([]);
  await site.close();
});

describe('the option study', () => {
  const study = oneStudyPage();

  it.each([400, 1440])('at %i px has no serious fault of accessibility', async (width) => {
    const { page } = study;
    await page.setViewportSize({ width, height: 900 });
    await settled(page);
    await page.locator('details.choices').evaluate((fold: HTMLDetailsElement) => (fold.open = true));
    // What is said of the study by those who read it: a note in the margin and a decision.
    await page.getByRole('button', { name: 'Record a decision' }).click();
    await page.getByRole('button', { name: 'Note to 11+010' }).click();
    await page.keyboard.type('Ask the board');
    await page.keyboard.press('Enter');
    await page.locator('.choices [role="spinbutton"]').first().scrollIntoViewIfNeeded();
    expect(await faultsOf(page)).toEqual([]);
  });

  it('what the Tab key comes to in a table pushed sideways is wholly on the screen, in a frame that is not cut', async () => {
    const { page } = study;
    await page.setViewportSize({ width: 400, height: 900 });
    await settled(page);
    await page.locator('.obstacles .fig').first().focus();
    for (let i = 0; i < 9; i += 1) {
      await page.keyboard.press('Tab');
      const found = await page.evaluate(() => {
        const [field, table] = [document.activeElement!, document.activeElement!.closest('.across')!];
        const [inner, outer] = [field.getBoundingClientRect(), table.getBoundingClientRect()];
        const { outlineStyle, outlineWidth } = getComputedStyle(field);
        return {
          name: field.getAttribute('aria-label'),
          left: inner.left - outer.left,
          right: outer.right - inner.right,
          frame: `${outlineStyle} ${outlineWidth}`,
        };
      });
      expect(found.name).toMatch(/obstacle 1/u);
      expect(found.frame).toBe('solid 2px');
      expect(Math.min(found.left, found.right), found.name!).toBeGreaterThanOrEqual(4);
    }
  });

  it('what is touched in a sentence is at least 24 px high on a hand-held screen', async () => {
    const { page } = study;
    const low = await page
      .locator('[id="1+010"] .fig, h1 ~ * .worked')
      .evaluateAll((all) =>
        all.filter((one) => one.getBoundingClientRect().height < 23.9).map((one) => one.outerHTML),
      );
    expect(low).toEqual([]);
  });
});
