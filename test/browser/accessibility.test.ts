import { readFileSync } from 'node:fs';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { openSite, type Site } from './site.ts';

let site: Site;
beforeAll(async () => {
  site = await openSite();
});
afterAll(() => site.close());

const axe = readFileSync('node_modules/axe-core/axe.min.js', 'utf8');

interface Found {
  readonly id: string;
  readonly impact: string | null;
  readonly nodes: { readonly target: unknown }[];
}

it.each([
  ['option-study.html', 1440],
  ['option-study.html', 400],
  ['span-chart.html', 1440],
  ['index.html', 1440],
])('%s at %i px has no serious fault of accessibility', async (path, width) => {
  const { page } = await site.open(path, { width, height: 900 });
  await page.waitForSelector(path.startsWith('option') ? '[data-option]' : '.cell', { timeout: 60_000 });
  // The checker is evaluated by the test, past the page's content policy.
  const faults = await page
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
  expect(faults.filter(({ impact }) => impact === 'serious' || impact === 'critical')).toEqual([]);
});
