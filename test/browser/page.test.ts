import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join, resolve } from 'node:path';
import { chromium } from 'playwright-core';
import type { Browser, Locator, Page } from 'playwright-core';
import { build, preview } from 'vite';
import type { PreviewServer } from 'vite';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { findChromium } from '../../.config/chromium.mjs';
import type { Trial } from './pages/page.ts';

const root = resolve(import.meta.dirname, '../..');
/** The trial page is built: served file by file it takes seconds to load before each test. */
const outDir = mkdtempSync(join(tmpdir(), 'page-'));
let server: PreviewServer;
let browser: Browser;
let page: Page;

beforeAll(async () => {
  await build({
    root,
    configFile: false,
    logLevel: 'silent',
    publicDir: false,
    build: {
      outDir,
      emptyOutDir: true,
      target: 'es2022',
      assetsInlineLimit: 0,
      rolldownOptions: { input: resolve(root, 'test/browser/pages/page.html') },
    },
  });
  server = await preview({
    root,
    configFile: false,
    logLevel: 'silent',
    build: { outDir },
    preview: { port: 0, host: '127.0.0.1' },
  });
  browser = await chromium.launch({
    executablePath: await findChromium(),
    args: ['--no-sandbox', '--disable-gpu'],
  });
  page = await browser.newPage({ viewport: { width: 1440, height: 900 } });
});

afterAll(async () => {
  await browser.close();
  await server.close();
  rmSync(outDir, { recursive: true, force: true });
});

type Tried = Window & { readonly trial: Trial };
const frame = (): Promise<void> =>
  page.evaluate(
    () => new Promise<void>((done) => requestAnimationFrame(() => requestAnimationFrame(() => done()))),
  );
const field = (name: string): Locator => page.getByRole('spinbutton', { name });
const trial = <T>(ask: (trial: Trial) => T | Promise<T>): Promise<T> =>
  page.evaluate(`(${String(ask)})(window.trial)`);
const texts = (place: string): Promise<string[]> => page.locator(place).allTextContents();
const key = async (...names: string[]): Promise<void> => {
  for (const name of names) await page.keyboard.press(name);
  await frame();
};

beforeEach(async () => {
  await page.goto(new URL('/test/browser/pages/page.html', server.resolvedUrls!.local[0]).href);
  await page.waitForFunction(() => 'trial' in window);
  await trial((tried) => tried.answer());
  await frame();
});

describe('a cell on the page', () => {
  it('is drawn at most once a frame and only when what it shows has changed', async () => {
    const before = await trial(({ counts }) => ({ ...counts }));
    await trial(({ setDepth }) => {
      for (let i = 0; i < 20; i += 1) setDepth(3 + i / 100);
    });
    await frame();
    // The depth is no business of the crossing.
    expect(await trial(({ counts }) => counts.crossing)).toBe(before.crossing);
    await trial(({ setEnd }) => {
      for (let i = 1; i <= 20; i += 1) setEnd(1470 + i);
    });
    await frame();
    expect(await trial(({ counts }) => counts.crossing)).toBe(before.crossing + 1);
  });

  it('keeps the last drawing while it is worked out, with its time and what it waits for', async () => {
    await trial(({ setDepth }) => setDepth(3));
    await page.waitForSelector('[id="2+020"][data-state="pending"]');
    await page.waitForSelector('[id="3+010"][data-state="pending"]');
    expect(await texts('[id="2+020"] .body')).toEqual(['221 kg/m²']);
    const [steel = ''] = await texts('[id="2+020"] .status-words');
    expect(steel).toMatch(/^being worked out: 3 of 12, plates; drawn as of \d\d:\d\d:\d\d$/u);
    const [cost = ''] = await texts('[id="3+010"] .status-words');
    expect(cost).toMatch(/^waits for 2\+020; drawn as of/u);
    await trial((tried) => tried.answer());
    await page.waitForSelector('[id="3+010"][data-state="done"]');
    expect(await texts('[id="2+020"] .status-words')).toEqual(['']);
  });

  it('says a failure with a way on, holds the cells below, and recovers by that way', async () => {
    await trial(({ setDepth }) => setDepth(2));
    await trial((tried) => tried.fail('Own weight does not settle'));
    await page.waitForSelector('[id="2+020"][data-state="failed"]');
    expect(await texts('[id="2+020"] .failure')).toEqual(['Own weight does not settle.']);
    expect(await texts('[id="2+020"] .body')).toEqual(['221 kg/m²']);
    expect(await page.getAttribute('[id="3+020"]', 'data-state')).toBe('held');
    expect(await texts('[id="3+020"] .status-words')).toEqual([
      'held at the last good figures, because 2+020 has failed',
    ]);
    await page.getByRole('button', { name: 'Make it 2.60 deep' }).click();
    await trial((tried) => tried.answer());
    await page.waitForSelector('[id="3+020"][data-state="done"]');
    expect(await texts('[id="2+020"] .failure')).toEqual([]);
  });
});

describe('the two lines', () => {
  it('pointing at a cell joins it to what it uses and what uses it on both lines', async () => {
    await page.hover('[id="2+010"] .body');
    await frame();
    expect(await texts('.station.joined')).toEqual(['1+020', '2+010', '2+020']);
    expect(await page.locator('.stations path[d*="C"]').count()).toBe(2);
    expect(await page.locator('.key-line circle').count()).toBe(2);
    await page.mouse.move(700, 20);
    await frame();
    expect(await texts('.station.joined')).toEqual([]);
    expect(await page.locator('.key-line circle').count()).toBe(0);
  });

  it('focus in a cell joins it as well, and nothing on the page moves for it', async () => {
    const top = (): Promise<number> =>
      page.locator('[id="1+010"]').evaluate((cell) => cell.getBoundingClientRect().top);
    const before = await top();
    await field('end, m').focus();
    await frame();
    expect(await texts('.station.joined')).toContain('1+010');
    expect(await top()).toBe(before);
  });

  it('the key line leads to the sections by keyboard', async () => {
    await page.getByRole('link', { name: '3 Cost and ranking' }).focus();
    await key('Enter');
    expect(new URL(page.url()).hash).toBe('#s3');
  });
});

describe('a figure in place', () => {
  const told = (): Promise<(readonly [string, unknown])[]> => trial((tried) => [...tried.told]);
  const drag = async (by: number, { release = true } = {}): Promise<void> => {
    await field('depth at midspan').scrollIntoViewIfNeeded();
    const box = (await field('depth at midspan').boundingBox())!;
    const [x, y] = [box.x + box.width / 2, box.y + box.height / 2];
    await page.mouse.move(x, y);
    await page.mouse.down();
    for (let i = 1; i <= 10; i += 1) await page.mouse.move(x + (by * i) / 10, y);
    if (release) await page.mouse.up();
    await frame();
  };

  it('dragged sideways tells every value and one change at the end, though its cell is drawn anew', async () => {
    await drag(60);
    const all = await told();
    expect(all.length).toBeGreaterThan(5);
    expect(all.filter(([kind]) => kind === 'change')).toEqual([['change', 2.8]]);
    expect(all.at(-1)).toEqual(['change', 2.8]);
    expect(await texts('[id="2+010"] .body p')).toEqual([
      expect.stringMatching(/^Depth at midspan 2\.80 m, one in 33/u),
    ]);
  });

  it('shows its scale while held, and Escape takes it back to where it was', async () => {
    await drag(60, { release: false });
    expect(await page.locator('[id="2+010"] .scale').count()).toBe(1);
    expect(await texts('[id="2+010"] .scale text')).toContain('was 2.30');
    await key('Escape');
    await page.mouse.up();
    expect((await told()).slice(-2)).toEqual([
      ['input', 2.3],
      ['change', 2.3],
    ]);
    expect(await page.locator('[id="2+010"] .scale').count()).toBe(0);
  });

  it('typed with a comma keeps focus and caret while its cell is drawn round it', async () => {
    await field('depth at midspan').click();
    await page.keyboard.type('2,5');
    await page.waitForTimeout(400);
    await frame();
    expect(await texts('[id="2+010"] .body p')).toEqual([expect.stringContaining('one in 37')]);
    await page.keyboard.type('5');
    expect(await field('depth at midspan').textContent()).toBe('2,55');
    await key('Enter');
    expect(await field('depth at midspan').textContent()).toBe('2.55');
    expect((await told()).filter(([kind]) => kind === 'change')).toEqual([['change', 2.55]]);
  });

  it('steps with the arrow keys: 1, with Shift 10, with Alt a tenth', async () => {
    await field('depth at midspan').focus();
    await key('ArrowUp', 'Shift+ArrowUp', 'Alt+ArrowDown', 'ArrowDown');
    const inputs = (await told()).map(([, value]) => value);
    expect(inputs).toEqual([2.4, 3.4, 3.39, 3.29]);
    await key('Enter');
    expect((await told()).at(-1)).toEqual(['change', 3.29]);
  });

  it('refuses a value against the limits with its reason and ways on, and keeps the last good one', async () => {
    const depth = field('depth at midspan');
    await depth.click();
    await page.keyboard.type('1.5');
    await key('Enter');
    expect(await depth.getAttribute('aria-invalid')).toBe('true');
    expect(await texts('[id="2+010"] .refusal .why')).toEqual([
      'Refused: at least 1.75 m, because the flange at the pier is at 100 % there. The last good value, 2.30, is kept.',
    ]);
    expect(await depth.getAttribute('aria-valuenow')).toBe('2.3');
    expect(await told()).toEqual([]);
    await page.getByRole('button', { name: 'Take 1.75' }).click();
    expect((await told()).at(-1)).toEqual(['change', 1.75]);
    expect(await depth.getAttribute('aria-invalid')).toBeNull();
  });

  it('takes ? for not known where that is an answer, and says so', async () => {
    const skew = field('skew');
    await skew.focus();
    await page.keyboard.type('?');
    await key('Enter');
    expect(await skew.textContent()).toBe('unknown');
    expect(await skew.getAttribute('aria-valuenow')).toBeNull();
    expect(await trial(({ draft }) => draft().brief.crossing.skewDeg)).toBe('unknown');
    await key('ArrowUp', 'Enter');
    expect(await trial(({ draft }) => draft().brief.crossing.skewDeg)).toBe(1);
  });

  it('shows a ratio in per cent and keeps it as a ratio', async () => {
    await field('steepest gradient').focus();
    await page.keyboard.type('5,5');
    await key('Enter');
    expect(await trial(({ draft }) => draft().brief.road.maxGradient)).toBe(0.055);
  });

  it('a choice in a sentence changes by keyboard', async () => {
    await page.getByRole('combobox', { name: 'load standard' }).focus();
    await key('ArrowDown');
    expect(await trial(({ draft }) => draft().brief.loading)).toBe('hl93');
  });
});

describe('a field of the study', () => {
  it('one go at it is one step of undo, and undo shows in the field', async () => {
    await field('end, m').focus();
    await key('ArrowUp', 'ArrowUp', 'ArrowUp', 'Enter');
    await key('Shift+ArrowUp', 'Enter');
    expect(await field('end, m').textContent()).toBe('1\u2009483');
    await page.getByRole('button', { name: 'Undo end' }).click();
    await frame();
    expect(await field('end, m').textContent()).toBe('1\u2009473');
    await page.getByRole('button', { name: 'Undo end' }).click();
    await frame();
    expect(await field('end, m').textContent()).toBe('1\u2009470');
  });

  it('Ctrl+Z undoes and Shift+Ctrl+Z redoes, but not while text is being typed', async () => {
    await field('end, m').focus();
    await key('ArrowUp', 'Enter', 'Control+z');
    expect(await field('end, m').textContent()).toBe('1\u2009470');
    await key('Control+Shift+z');
    expect(await field('end, m').textContent()).toBe('1\u2009471');
    await page.keyboard.type('1');
    await key('Control+z');
    expect(await trial(({ draft }) => draft().brief.crossing.endM)).toBe(1471);
  });

  it('a study that is not valid is said beside the field, the last valid one is kept, and there is a way back', async () => {
    await field('end, m').click();
    await page.keyboard.type('1200');
    await key('Enter');
    expect(await field('end, m').getAttribute('aria-invalid')).toBe('true');
    const [why = ''] = await texts('[id="1+010"] .refusal .why');
    expect(why).toContain('expected more than');
    expect(why).toContain('The last valid study is kept.');
    expect(await trial(({ valid }) => valid().brief.crossing.endM)).toBe(1470);
    await page.getByRole('button', { name: 'Back to 1 470' }).click();
    await frame();
    expect(await field('end, m').getAttribute('aria-invalid')).toBeNull();
    expect(await field('end, m').textContent()).toBe('1\u2009470');
  });
});

describe('words in place', () => {
  it('are kept with Enter, given up with Escape, refused when too long, and undone', async () => {
    const title = page.getByRole('textbox', { name: 'title' });
    await title.click();
    await key('Control+End');
    await page.keyboard.type(' by the old mill');
    await key('Escape');
    expect(await title.textContent()).toBe('River Wend crossing at Low Ferry');
    await key('Control+End');
    await page.keyboard.type(', second study');
    await key('Enter');
    expect(await trial(({ draft }) => draft().title)).toBe('River Wend crossing at Low Ferry, second study');
    await page.keyboard.type(' of the crossing of the river and the railway');
    await key('Enter');
    expect(await texts('[id="1+010"] .refusal .why')).toEqual([
      expect.stringContaining('at most 60 characters'),
    ]);
    await trial(({ undo }) => undo());
    await frame();
    expect(await title.textContent()).toBe('River Wend crossing at Low Ferry');
  });

  it('sentences follow how many there are of a kind, and their fields stay in step', async () => {
    const level = (number: number): Locator => field(`level ${number}`);
    expect(await page.getByRole('textbox', { name: /^water/u }).count()).toBe(1);
    await trial(({ addWater }) => addWater());
    expect(await page.getByRole('textbox', { name: 'water 2' }).textContent()).toBe('Mill stream');
    await level(2).focus();
    await page.keyboard.type('6,5');
    await key('Enter');
    expect(await trial(({ draft }) => draft().brief.waters.map(({ levelM }) => levelM))).toEqual([7.2, 6.5]);
    await trial(({ undo }) => undo());
    expect(await level(2).textContent()).toBe('7.20');
    await trial(({ undo }) => undo());
    await page.getByRole('link', { name: '1+010' }).focus();
    await frame();
    expect(await page.getByRole('textbox', { name: /^water/u }).count()).toBe(1);
  });
});

describe('the device', () => {
  it('keeps a study across openings, and a second page that saved meanwhile is not written over', async () => {
    expect(await trial(({ device }) => device())).toEqual({
      saved: [1, 2],
      title: 'Second',
      refused: ['refused'],
      listed: ['Second'],
    });
  });
});

describe('access', () => {
  it('axe finds nothing serious on the page, also with a refusal and a failure on it', async () => {
    await field('depth at midspan').click();
    await page.keyboard.type('1');
    await key('Enter');
    await trial(({ setEnd }) => setEnd(1480));
    await trial((tried) => tried.fail('Own weight does not settle'));
    await page.waitForSelector('[data-state="failed"]');
    await page.evaluate(readFileSync(resolve(root, 'node_modules/axe-core/axe.min.js'), 'utf8'));
    const found = await page.evaluate(async () => {
      const { axe } = window as unknown as Tried & { axe: typeof import('axe-core') };
      const { violations } = await axe.run();
      return violations.map(({ id, impact, nodes }) => [id, impact, nodes[0]?.html]);
    });
    expect(found.filter(([, impact]) => impact === 'serious' || impact === 'critical')).toEqual([]);
  });
});
