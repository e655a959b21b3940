import type { Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import example from '../../data/examples/low-ferry.json' with { type: 'json' };
import { openSite, type Heard, type Site } from './site.ts';
import { middleOf, openAsFile } from './studyPage.ts';

let site: Site;
let page: Page;
let heard: Heard;

beforeAll(async () => {
  site = await openSite();
  ({ page, heard } = await site.open('option-study.html'));
  await standing(page);
});
afterAll(() => site.close());

async function standing(of: Page): Promise<void> {
  await of.waitForSelector('[id="1+020"] [data-handle="pier/1"]', { state: 'attached', timeout: 60_000 });
}
/** Waits until the brief stands: what a study says is there before anything is worked out. */
const briefed = (of: Page): Promise<unknown> => field(of, 'no-pier width').waitFor({ timeout: 60_000 });
const field = (of: Page, name: string) => of.locator(`[role=spinbutton][aria-label^="${name},"]`).first();
const shown = async (of: Page, name: string): Promise<string | null> => field(of, name).textContent();
async function type(of: Page, name: string, value: string): Promise<void> {
  await field(of, name).focus();
  await of.keyboard.press('Control+a');
  await of.keyboard.type(value);
  await of.keyboard.press('Enter');
}
const bar = (of: Page): Promise<string | null> => of.locator('.bar .state').textContent();
const says = (of: Page, words: string): Promise<unknown> =>
  of.waitForFunction((text) => document.querySelector('.bar .state')?.textContent.includes(text), words, {
    polling: 100,
  });
/** Waits until every change to the study on the page has been saved; what another was left with waits until it is opened. */
const allSaved = (of: Page): Promise<unknown> =>
  of.waitForFunction(
    () => {
      const id = new URLSearchParams(location.search).get('study');
      return id !== null && localStorage.getItem(`spanledger.unsaved.${id}`) === null;
    },
    undefined,
    { polling: 100 },
  );
/** Waits until the page may be changed. */
const mayChange = (of: Page): Promise<unknown> =>
  of.waitForFunction(() => !document.querySelector('.sheet')!.classList.contains('read-only'), undefined, {
    polling: 100,
  });

describe('a study on the device', () => {
  it('is not lost when the page is loaded again at once after a change, before it has been saved', async () => {
    await type(page, 'no-pier width', '64');
    await page.reload();
    await briefed(page);
    expect(await shown(page, 'no-pier width')).toBe('64.0');
    // Saved on leaving or after: the journal is empty, and the study on the device has it.
    await allSaved(page);
    await page.reload();
    await briefed(page);
    expect(await shown(page, 'no-pier width')).toBe('64.0');
  });

  it('comes back as it was typed, with what is refused in it, and the last valid one under Undo', async () => {
    const fromOf = (of: Page) => of.locator('[id="1+030"] [role=spinbutton][aria-label*="from"]').first();
    const before = await fromOf(page).textContent();
    await fromOf(page).focus();
    await page.keyboard.press('Control+a');
    await page.keyboard.type('1300');
    await page.keyboard.press('Enter');
    await page.waitForSelector('[id="1+030"] [aria-invalid=true]', { state: 'attached' });
    await type(page, 'no-pier width', '70');
    await says(page, 'as typed, with what is refused');
    await page.reload();
    await briefed(page);
    expect(await shown(page, 'no-pier width')).toBe('70.0');
    await page.waitForSelector('[id="1+030"] [aria-invalid=true]', { state: 'attached' });
    await page.getByRole('button', { name: 'Undo', exact: true }).click();
    expect(await fromOf(page).textContent()).toBe(before);
    expect(await page.locator('[aria-invalid=true]').count()).toBe(0);
    expect(await shown(page, 'no-pier width')).toBe('64.0');
    await allSaved(page);
  });

  it('is not lost when the tab is killed while a pier is in hand', async () => {
    const grip = page.locator('[id="1+020"] [data-handle="pier/1"] .grip');
    const [x, y] = await middleOf(grip);
    await page.mouse.move(x, y);
    await page.mouse.down();
    await page.mouse.move(x + 20, y, { steps: 4 });
    const value = (): Promise<string | null> =>
      page.locator('[id="1+020"] [data-handle="pier/1"]').getAttribute('aria-valuenow');
    await page.waitForTimeout(400);
    const [dragged, address] = [await value(), page.url()];
    const context = page.context();
    const killer = await context.newCDPSession(page);
    void killer.send('Page.crash').catch(() => undefined);
    await page.waitForEvent('crash');
    await page.close();
    page = await context.newPage();
    page.on('console', (message) => heard.console.push(message.text()));
    await page.goto(address);
    await standing(page);
    await page.waitForFunction(() =>
      document.querySelector('[id="3+010"]')?.textContent.includes('kept by hand'),
    );
    expect(await value()).toBe(dragged);
    await allSaved(page);
  });

  it('is read only in a second tab, which says so, and can be taken over', async () => {
    const second = await page.context().newPage();
    second.on('console', (message) => heard.console.push(message.text()));
    await second.goto(page.url());
    await briefed(second);
    await says(second, 'Read only: another tab has this study open.');
    const before = await shown(second, 'no-pier width');
    await type(second, 'no-pier width', '90');
    expect(await shown(second, 'no-pier width')).toBe(before);
    // What the first tab changes last is there when the second takes over.
    await page.bringToFront();
    await type(page, 'no-pier width', '66');
    await second.bringToFront();
    await second.getByRole('button', { name: 'Work on it here' }).click();
    await says(page, 'Read only');
    await mayChange(second);
    expect(await shown(second, 'no-pier width')).toBe('66.0');
    await type(second, 'no-pier width', '67');
    await says(second, 'saved');
    // The first may go on once the second is closed, from where that has left it.
    await allSaved(second);
    await second.close();
    await page.bringToFront();
    await mayChange(page);
    expect(await shown(page, 'no-pier width')).toBe('67.0');
    expect(await bar(page)).not.toContain('Read only');
    expect(heard.console).toEqual([]);
  });
});

describe('a study from a file', () => {
  it('is a study of its own; the one before it is kept as it was left, and the page says where', async () => {
    const [first, before] = [page.url(), await shown(page, 'no-pier width')];
    await type(page, 'no-pier width', '71');
    await openAsFile(page, { ...example, title: 'A file from elsewhere' });
    const note = page.locator('.opened');
    await note.getByRole('link', { name: 'River Wend crossing at Low Ferry' }).waitFor();
    expect(await note.textContent()).toBe(
      'Opened as a study of its own, with an Undo of its own. River Wend crossing at Low Ferry is kept on the shelf as it was left. ',
    );
    expect(await page.locator('h1').textContent()).toBe('A file from elsewhere');
    expect(await page.getByRole('button', { name: 'Undo', exact: true }).isDisabled()).toBe(true);
    expect(page.url()).not.toBe(first);
    await type(page, 'no-pier width', '58');
    expect(await note.textContent()).toBe('');
    await allSaved(page);
    await page.goto(first);
    await briefed(page);
    expect(await shown(page, 'no-pier width')).toBe('71.0');
    await type(page, 'no-pier width', before!);
    await allSaved(page);
  });
});

describe('a drawing', () => {
  it('is saved as SVG in true size, without its handles', async () => {
    const cell = page.locator('[id="1+020"]');
    await cell.scrollIntoViewIfNeeded();
    const [download] = await Promise.all([
      page.waitForEvent('download'),
      cell.getByRole('button', { name: /^save as SVG/u }).click(),
    ]);
    expect(download.suggestedFilename()).toBe('1-020-crossing.svg');
    let text = '';
    for await (const piece of await download.createReadStream()) text += String(piece);
    const scale = Number(/data-scale="(\d+)"/u.exec(text)![1]);
    const [, widthMm, , widthPx] = /width="([\d.]+)mm" height="([\d.]+)mm" viewBox="0 0 ([\d.]+)/u.exec(
      text,
    )!;
    // One pixel of the drawing is 1/96 inch on paper, at the scale it says.
    expect(Number(widthMm)).toBeCloseTo((Number(widthPx) * 25.4) / 96, 2);
    expect(scale).toBe(1000);
    expect(text).not.toContain('data-handle');
    expect(text).toContain('1:1000 at A3');
    // Lettered as on the page wherever it is opened: upright, and italic for names of waters.
    const faces = text.match(
      /@font-face \{[^}]*src: url\("data:font\/woff2;base64,[\w+/=]{20000,}"\)[^}]*\}/gu,
    )!;
    expect(faces.map((face) => /font-style: (\w+)/u.exec(face)![1])).toEqual(['normal', 'italic']);
  });

  it('is printed alone, on A4 at its scale and on Letter too; a stack is cut between its rows', async () => {
    await page.evaluate(() => {
      Object.assign(window, { printed: [] as unknown[] });
      window.print = () => {
        const parts = [...document.querySelectorAll('.alone-sheet')].map((sheet) => ({
          words: sheet.querySelector('p')!.textContent,
          width: Number(sheet.querySelector('svg')!.getAttribute('width')),
          height: Number(sheet.querySelector('svg')!.getAttribute('height')),
          texts: [...sheet.querySelectorAll('svg text')].map((text) => text.textContent),
        }));
        (window as unknown as { printed: unknown[] }).printed.push(parts);
        dispatchEvent(new Event('afterprint'));
      };
    });
    await page
      .locator('[id="1+020"]')
      .getByRole('button', { name: /^print on A4/u })
      .click();
    await page
      .locator('[id="1+020"]')
      .getByRole('button', { name: /^on Letter/u })
      .click();
    await page
      .locator('[id="3+020"]')
      .getByRole('button', { name: /^print on A4/u })
      .click();
    const printed = await page.evaluate(
      () =>
        (
          window as unknown as {
            printed: { words: string; width: number; height: number }[][];
          }
        ).printed,
    );
    expect(printed[0]).toHaveLength(1);
    expect(printed[0]![0]!.words).toContain('1:1000 on A4; the scale bar rules.');
    // Across the sheet with 10 mm free on both sides.
    expect(printed[0]![0]!.width).toBeLessThanOrEqual(((297 - 20) / 25.4) * 96);
    expect(printed[1]![0]!.width).toBeLessThanOrEqual(((279.4 - 20) / 25.4) * 96);
    expect(printed[2]!.length).toBeGreaterThan(1);
    expect(printed[2]![0]!.words).toMatch(/part 1 of \d; about 1:\d+ on A4, reduced from 1:1000/u);
    for (const { height } of printed[2]!) expect(height).toBeLessThanOrEqual(((210 - 24) / 25.4) * 96 - 40);
    expect(await page.locator('.alone-print').count()).toBe(0);
  });

  it('goes on paper as on a full sheet from a narrow screen, and no hand is spoken of there', async () => {
    await page.setViewportSize({ width: 400, height: 800 });
    const cell = page.locator('[id="1+020"]');
    const drawn = () => cell.locator('svg.drawing').first().getAttribute('width');
    await page.waitForFunction(
      () => Number(document.querySelector('[id="1+020"] svg.drawing')!.getAttribute('width')) < 400,
    );
    const before = await drawn();
    expect(await cell.locator('svg .band').count()).toBe(0);
    await cell.getByRole('button', { name: /^print on A4/u }).click();
    const onPaper = await page.evaluate(() =>
      (window as unknown as { printed: { words: string; texts: string[] }[][] }).printed.at(-1)!,
    );
    expect(onPaper[0]!.words).toContain('1:1000 on A4');
    expect(onPaper[0]!.texts).toContain('spare');
    expect(await drawn()).toBe(before);
    await page.evaluate(() => dispatchEvent(new Event('beforeprint')));
    expect(await cell.locator('.notes').textContent()).not.toContain('dragged');
    await page.evaluate(() => dispatchEvent(new Event('afterprint')));
  });
});
