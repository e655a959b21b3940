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
    await page.locator('.choices [role="spinbutton"]').first().scrollIntoViewIfNeeded();
    expect(await faultsOf(page)).toEqual([]);
  });
});
