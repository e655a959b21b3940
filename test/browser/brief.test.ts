import { readFileSync } from 'node:fs';
import { resolve } from 'node:path';
import type { Locator, Page } from 'playwright-core';
import { beforeEach, describe, expect, it } from 'vitest';
import { exampleOf, oneStudyPage, settled } from './studyPage.ts';

const root = resolve(import.meta.dirname, '../..');
const study = oneStudyPage(exampleOf(['composite-i', 'concrete-box']));
let page: Page;
beforeEach(() => {
  ({ page } = study);
});

const field = (page: Page, name: string): Locator => page.locator(`[aria-label="${name}"]`);
async function type(page: Page, name: string, value: string): Promise<void> {
  await field(page, name).focus();
  await page.keyboard.press('Control+a');
  await page.keyboard.type(value);
  await page.keyboard.press('Enter');
}
const undo = async (page: Page): Promise<void> => {
  await page.locator('h1').click();
  await page.keyboard.press('Control+z');
};
const prose = (page: Page): Promise<string> =>
  page.locator('[id="1+010"] .prose').evaluate((part) => {
    const words = part.cloneNode(true) as Element;
    const lists = part.querySelectorAll('select');
    words.querySelectorAll('select').forEach((list, i) => {
      list.replaceWith(lists[i]!.selectedOptions[0]?.textContent ?? '');
    });
    return words.textContent.replace(/\u2009/gu, '');
  });
/** Pastes text into the field that holds the focus, as the keyboard would. */
const paste = (page: Page, text: string): Promise<void> =>
  page.evaluate((words) => {
    const clipboardData = new DataTransfer();
    clipboardData.setData('text/plain', words);
    const event = new ClipboardEvent('paste', { clipboardData, bubbles: true, cancelable: true });
    document.activeElement?.dispatchEvent(event);
  }, text);
/** Waits until the prose has some words. */
const reads = (page: Page, words: string): Promise<void> => expect.poll(() => prose(page)).toContain(words);
const focused = (page: Page): Promise<string | null | undefined> =>
  page.evaluate(() => document.activeElement?.getAttribute('aria-label'));

describe('the brief in prose', () => {
  it('takes the gradient of the existing road behind a fixed end, and the road is said to curve back to it', async () => {
    const label = 'gradient of the existing road behind the end, %';
    const road = (): Promise<string | null> => page.locator('[id="4+010"]').textContent();
    await reads(page, 'Behind the end, which stays, the existing road runs at a gradient that is not known.');
    await type(page, label, '2');
    await page.locator('h1').click();
    await reads(page, 'runs at 2.0 %, rising with the chainage; an unknown length of it may be regraded.');
    await page.locator('[id="4+010"]').scrollIntoViewIfNeeded();
    await expect.poll(road).toMatch(/takes a curve behind the abutment of \d+/u);
    await type(page, 'length of the end approach, m', '500');
    await page.locator('h1').click();
    await reads(page, '; 500 m of it may be regraded.');
    await undo(page);
    await undo(page);
    await reads(page, 'the existing road runs at a gradient that is not known.');
    await expect.poll(road).toContain('is not known: no curve is laid');
  });

  it('reads as it stands, and follows a choice, an unknown and its undoing', async () => {
    await reads(page, 'from chainage 1240 to 1470, on a straight line, 8° off square.');
    await field(page, 'line in plan').selectOption('curve');
    await type(page, 'plan radius, m', '400');
    await reads(page, 'on a curve of radius 400 m, 8° off square.');
    await type(page, 'flood level, m', '?');
    await page.locator('h1').click();
    await reads(page, 'floods to an unknown level; the soffit');
    await undo(page);
    await reads(page, 'floods to 10.90 once in 100 years; the soffit');
    await undo(page);
    await undo(page);
    await reads(page, 'on a straight line, 8° off square.');
  });

  it('Enter on a preset headroom confirms it, and the caution goes', async () => {
    const headroom = field(page, 'headroom over Low Ferry branch, single track, m');
    expect(await headroom.getAttribute('class')).toContain('preset');
    await headroom.focus();
    await page.keyboard.press('Enter');
    expect(await headroom.getAttribute('class')).toContain('typed');
    expect(await field(page, 'envelope over obstacle 1').inputValue()).toBe('confirmed');
    await page.waitForFunction(() => document.querySelector('[id="1+010"] .caution') === null);
    await undo(page);
    expect(await headroom.getAttribute('class')).toContain('preset');
  });

  it('a budget that is not known is said, and comes back with its price date', async () => {
    await type(page, 'budget, MEUR', '?');
    await page.locator('h1').click();
    await page.waitForFunction(() =>
      document.querySelector('[id="1+010"] .prose')?.textContent.includes('The budget is not given.'),
    );
    await type(page, 'budget, MEUR', '8.5');
    await page.locator('h1').click();
    await reads(page, 'The budget is 8.50 million EUR at 2026 Q1 prices, for: Bridge');
  });
});

describe('obstacles', () => {
  it('an obstacle is added, typed, drawn, taken out and brought back', async () => {
    await page.getByRole('button', { name: 'Add an obstacle' }).click();
    expect(await focused(page)).toBe('obstacle 4, name');
    await page.keyboard.press('Control+a');
    await page.keyboard.type('Mill lane');
    await page.keyboard.press('Enter');
    await type(page, 'obstacle 4, from, m', '1425');
    await type(page, 'obstacle 4, to, m', '1433');
    await field(page, 'obstacle 4, supports').selectOption('hard');
    await field(page, 'envelope over obstacle 4').selectOption('preset');
    expect(await field(page, 'obstacle 4, headroom, m').textContent()).toBe('5.00');
    await reads(page, 'No support may stand on Mill lane between 1425.0 and 1433.0, where');
    await page.waitForFunction(() =>
      document.querySelector('[id="1+020"] svg')?.textContent.includes('Mill lane'),
    );
    await page.getByRole('button', { name: 'take out Mill lane' }).focus();
    await page.keyboard.press('Enter');
    expect(await field(page, 'obstacle 4, name').count()).toBe(0);
    expect(await focused(page)).toMatch(/^take out /u);
    await undo(page);
    expect(await field(page, 'obstacle 4, name').textContent()).toBe('Mill lane');
  });

  it('a reversed stretch is said below its row, the last valid study is kept, and there is a way back', async () => {
    const drawn = await page.locator('[id="1+020"] svg').innerHTML();
    await type(page, 'obstacle 2, to, m', '1300');
    const told = page.locator('.obstacles .told:has(.why)');
    expect(await told.textContent()).toContain(
      'obstacle 2, to, m: Expected more than the start at 1325 m, not 1300 m.',
    );
    expect(await field(page, 'obstacle 2, to, m').getAttribute('aria-invalid')).toBe('true');
    await page.waitForTimeout(200);
    expect(await page.locator('[id="1+020"] svg').innerHTML()).toBe(drawn);
    await told.getByRole('button', { name: 'Back to 1 385.0' }).click();
    expect(await told.count()).toBe(0);
    expect(await field(page, 'obstacle 2, to, m').textContent()).toBe('1\u2009385.0');
  });
});

describe('the ground line', () => {
  it('two pasted columns take its place and can be taken back; what cannot be read is refused with its line', async () => {
    const count = (): Promise<number> => page.locator('.point').count();
    expect(await count()).toBe(25);
    await field(page, 'ground point 3, level, m').focus();
    await paste(page, '1225\t18\n1300\t9,5\n1355\tdeep\n');
    expect(await page.locator('.pasted:not(:empty)').textContent()).toBe(
      "Nothing taken: line 3: level: 'deep' is not a figure. The 25 points stay as they are.",
    );
    await paste(page, 'ch\tlevel\r\n1225\t18\r\n1300\t9,5\r\n1355\t3,7\r\n1400\t9.8\r\n1490\t17\r\n');
    expect(await page.locator('.pasted:not(:empty)').textContent()).toContain(
      '5 points taken in place of 25; the headings',
    );
    await page.locator('h1').click();
    await page.waitForFunction(() => document.querySelectorAll('.point').length === 5);
    expect(await field(page, 'ground point 2, level, m').textContent()).toBe('9.50');
    // Ground at the start, 1240: 18 less 15 m of the fall of 8.5 in 75.
    await page.waitForFunction(() =>
      document.querySelector('[id="1+020"] svg')?.textContent.includes('ground16.30'),
    );
    await page.getByRole('button', { name: 'Take them back' }).click();
    expect(await count()).toBe(25);
  });

  it('a point is added after another and taken out again, by keyboard', async () => {
    await page.getByRole('button', { name: 'add a point after 1 240.0' }).focus();
    await page.keyboard.press('Enter');
    expect(await page.locator('.point').count()).toBe(26);
    expect(await field(page, 'ground point 3, chainage, m').textContent()).toBe('1\u2009245.0');
    await page.getByRole('button', { name: 'take out the point at 1 245.0' }).focus();
    await page.keyboard.press('Enter');
    expect(await page.locator('.point').count()).toBe(25);
  });
});

describe('the deck', () => {
  it('a strip is made wider, drawn so, exchanged, added, taken out and undone', async () => {
    const overall = (): Promise<string[]> =>
      page.locator('.deck-drawing > .strip-chain svg text').allTextContents();
    const kinds = (): Promise<string[]> =>
      page
        .locator('.deck-drawing > .strip-chain select')
        .evaluateAll((lists) => lists.map((list) => (list as HTMLSelectElement).value));
    expect(await overall()).toEqual(['12.50']);
    await type(page, 'width of strip 3, m', '3,75');
    expect(await overall()).toEqual(['12.75']);
    expect(await field(page, 'ultimate width of strip 3, m').textContent()).toBe('3.75');
    await field(page, 'kind of strip 7').selectOption('verge');
    await reads(page, 'A road of 2 lanes has to cross');
    await page.getByRole('button', { name: 'add a strip after strip 4' }).focus();
    await page.keyboard.press('Enter');
    expect((await kinds()).join(' ')).toBe('barrier shoulder lane lane lane shoulder barrier verge parapet');
    await reads(page, 'A road of 3 lanes');
    await page.getByRole('button', { name: 'take out strip 9' }).focus();
    await page.keyboard.press('Enter');
    expect(await focused(page)).toBe('take out strip 8');
    for (let i = 0; i < 4; i += 1) await undo(page);
    expect((await kinds()).join(' ')).toBe('barrier shoulder lane lane shoulder barrier footway parapet');
    expect(await overall()).toEqual(['12.50']);
  });

  it('the ultimate layout has widths of its own', async () => {
    await page.locator('.ultimate > summary').click();
    await type(page, 'ultimate width of strip 3, m', '4');
    expect(await page.locator('.ultimate svg text').allTextContents()).toEqual(['13.00 ultimate']);
    expect(await field(page, 'width of strip 3, m').textContent()).toBe('3.50');
  });

  it('a deck without a lane is said below it', async () => {
    await field(page, 'kind of strip 3').selectOption('verge');
    await field(page, 'kind of strip 4').selectOption('verge');
    expect(await page.locator('.deck-field > .refusal').textContent()).toContain('Add a lane.');
    await undo(page);
    expect(await page.locator('.deck-field > .refusal').textContent()).toBe('');
  });
});

describe('an entry', () => {
  const stateOf = (station: string): Promise<string | null> =>
    page.locator(`[id="${station}"]`).getAttribute('data-state');
  const older = (within: string): Promise<string | null> =>
    page.locator(`${within} .live:not(:empty)`).last().getAttribute('data-older');
  /** Pieces of the station line that are dotted. */
  const dotted = (): Promise<number> => page.locator('svg.stations path[stroke-dasharray="1.4 3.2"]').count();

  it('that is refused holds what hangs on it, in marks and in words, and nothing else, until it is mended', async () => {
    const asTyped = ['1+010', '1+030', '1+040', '2+020', '10+015', '10+030'];
    const all = await page.locator('.cell').evaluateAll((cells) => cells.map(({ id }) => id));
    expect(await dotted()).toBe(0);
    await type(page, 'obstacle 2, to, m', '1300');
    await expect.poll(() => stateOf('10+020')).toBe('held');
    for (const station of all)
      expect([station, await stateOf(station)]).toEqual([
        station,
        asTyped.includes(station) ? 'done' : 'held',
      ]);
    // The line is dotted down to each of them.
    await expect.poll(dotted).toBeGreaterThanOrEqual(all.length - asTyped.length);
    const described = await page.locator('[id="3+020"]').getAttribute('aria-describedby');
    expect(await page.locator(`[id="${described}"]`).textContent()).toBe(
      'held at the last valid study, because an entry it depends on is refused',
    );
    expect(await page.locator(`[id="${described}"]`).getAttribute('aria-live')).toBe('off');
    await page.evaluate(() => scrollTo(0, 0));
    await expect.poll(() => older('.answer')).toBe('held');
    await type(page, 'obstacle 2, to, m', '1385');
    await settled(page);
    expect(await dotted()).toBe(0);
    expect(await page.locator('[id="3+020"]').getAttribute('aria-describedby')).toBeNull();
    await expect.poll(() => older('.answer')).toBeNull();
  });

  it('that is taken marks the answer above as older until that of the new site has come', async () => {
    await page.evaluate(() => scrollTo(0, 0));
    await type(page, 'end, m', '1480');
    await page.evaluate(() => scrollTo(0, 0));
    await expect.poll(() => older('.answer'), { interval: 30 }).toMatch(/^being worked out; as of \d\d:/u);
    await settled(page);
    await expect.poll(() => older('.answer')).toBeNull();
  });
});

describe('the ground', () => {
  it('says what the odds leave open, keeps the last valid study, and gives the rest where asked', async () => {
    await type(page, 'stretch 1, class 1, odds, %', '40');
    const sum = page.locator('.stretch-block').first().locator('.sum');
    expect(await sum.textContent()).toContain('The odds add up to 90 %: 10 % are missing.');
    await sum.getByRole('button', { name: 'Give them to gravel' }).click();
    expect(await sum.textContent()).toBe('');
    expect(await field(page, 'stretch 1, class 1, odds, %').textContent()).toBe('50');
  });

  it('a stretch is said not to be known, split, and its ends stay together', async () => {
    await page.getByRole('button', { name: 'stretch 2: not known' }).focus();
    await page.keyboard.press('Enter');
    expect(await page.locator('.stretch-block').nth(1).locator('tr.fields').count()).toBe(4);
    await page.getByRole('button', { name: 'stretch 1: split' }).focus();
    await page.keyboard.press('Enter');
    expect(await page.locator('.stretch-block').count()).toBe(5);
    await type(page, 'stretch 1, to, m', '1250');
    expect(await field(page, 'stretch 2, from, m').textContent()).toBe('1\u2009250');
  });
});

describe('access', () => {
  it('axe finds nothing serious in the brief, also with problems in it', async () => {
    await type(page, 'obstacle 2, to, m', '1300');
    await type(page, 'stretch 1, class 1, odds, %', '40');
    await page.evaluate(readFileSync(resolve(root, 'node_modules/axe-core/axe.min.js'), 'utf8'));
    const found = await page.evaluate(async () => {
      const { axe } = window as unknown as { axe: typeof import('axe-core') };
      const { violations } = await axe.run('#s1');
      return violations.map(({ id, impact, nodes }) => [id, impact, nodes[0]?.html]);
    });
    expect(found.filter(([, impact]) => impact === 'serious' || impact === 'critical')).toEqual([]);
  });
});

describe('small screens', () => {
  it('nothing of the brief widens the page at 1024 and 400', async () => {
    for (const width of [1024, 400]) {
      await page.setViewportSize({ width, height: 900 });
      await page.waitForFunction((px) => document.documentElement.clientWidth === px, width);
      await settled(page);
      expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBeLessThanOrEqual(width);
    }
    await page.setViewportSize({ width: 1440, height: 900 });
  });
});
