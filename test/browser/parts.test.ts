import { readFile } from 'node:fs/promises';
import type { Page } from 'playwright-core';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { openSite, type Site } from './site.ts';
import { settled, silent } from './studyPage.ts';

let site: Site;
beforeAll(async () => {
  site = await openSite();
});
afterAll(() => site.close());

/** Begins a study of a crossing of which only the length is known. */
async function begin(page: Page, lengthM: number): Promise<void> {
  await page.getByRole('spinbutton', { name: 'length between the abutments' }).fill(String(lengthM));
  await page.keyboard.press('Enter');
  await page.getByRole('button', { name: 'Work it out' }).click();
  await page.waitForURL(/option-study\.html\?study=/u);
}

/** Numbers and forms of the ranking, and what the page says of it, all at one moment. */
interface Seen {
  readonly ranked: string[];
  readonly notes: string;
  readonly state: string;
  readonly decision: string;
}

it('a new study has a ranking of the first forms while the others are searched, which says so', async () => {
  const { page, heard } = await site.open('index.html');
  await begin(page, 230);
  const answer = page.locator('.answer');
  await answer.filter({ hasText: 'still to come' }).waitFor();
  expect(await answer.innerText()).toMatch(
    /^Of 13 forms \d+ are done so far and \d+ still to come\. Option \d+, /u,
  );
  await page.locator('[id="10+010"]').scrollIntoViewIfNeeded();
  const saving = page.waitForEvent('download');
  const handle = await page.waitForFunction(
    (): Seen | null => {
      const cell = document.querySelector<HTMLElement>('[id="10+010"]')!;
      const ranked = [...cell.querySelectorAll('tbody tr')].map(
        (row) => row.querySelector('[aria-label^="option"]')?.getAttribute('aria-label') ?? '',
      );
      const notes = cell.textContent;
      if (ranked.length === 0 || !notes.includes('Still to come') || cell.dataset['state'] !== 'pending')
        return null;
      document.querySelector<HTMLElement>('[id="8+010"] [aria-label^="save as SVG"]')!.click();
      return {
        ranked,
        notes,
        state: cell.dataset['state'],
        decision: document.querySelector<HTMLElement>('[id="11+010"] .decision')!.innerText,
      };
    },
    undefined,
    { timeout: 60_000, polling: 30 },
  );
  const part = (await handle.jsonValue())!;
  expect(part.notes).toMatch(/Still to come, and not in the order yet: .*cable-stayed/iu);
  expect(part.decision).toContain('No decision has been recorded; the options are being worked out.');
  const file = await saving;
  expect(file.suggestedFilename()).toBe('8-010-programme-so-far.svg');
  expect(await readFile(await file.path(), 'utf8')).toMatch(/Of 13 forms \d+ are done so far/u);

  await settled(page);
  await page.locator('h1').scrollIntoViewIfNeeded();
  await expect.poll(() => answer.innerText()).toMatch(/^Option \d+, .* comes out at /u);
  expect(await page.locator('main').innerText()).not.toMatch(/still to come/iu);
  const whole = await page
    .locator('[id="10+010"] tbody tr [aria-label^="option"]')
    .evaluateAll((marks) => marks.map((mark) => mark.getAttribute('aria-label')));
  // Every option keeps its number, and those that were there stand in the same order.
  expect(part.ranked.length).toBeLessThan(whole.length);
  expect(whole.filter((one) => part.ranked.includes(one!))).toEqual(part.ranked);
  await page.getByRole('button', { name: 'Record a decision' }).waitFor();
  silent(heard);
});

it('an edit gives up what is still to come and the next answer is of the study as it is', async () => {
  const { page, heard } = await site.open('index.html');
  await begin(page, 230);
  await page.locator('.answer', { hasText: 'still to come' }).waitFor();
  const end = page.locator('[id="1+010"] [aria-label="end, m"]');
  await end.focus();
  await page.keyboard.press('Control+a');
  await page.keyboard.type('90');
  await page.keyboard.press('Enter');
  await settled(page);
  expect(await page.locator('.answer').innerText()).toMatch(/^Option \d+, .* comes out at /u);
  expect(await page.locator('[id="1+020"]').textContent()).toContain('90');
  expect(await page.locator('.cell.failed').count()).toBe(0);
  silent(heard);
});
