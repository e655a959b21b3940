import type { Page } from 'playwright-core';
import { afterEach, beforeAll, describe, expect, it } from 'vitest';
import { exampleOf, middleOf, oneStudyPage, openAsFile, settled } from './studyPage.ts';

const study = oneStudyPage(exampleOf(['composite-i', 'concrete-box']));
let page: Page;
beforeAll(() => {
  ({ page } = study);
});

const CROSSING = '[id="1+020"]';
const STACK = '[id="3+020"]';

const handle = (key: string, cell = CROSSING) => page.locator(`${cell} [data-handle="${key}"]`);
const valueOf = async (key: string, cell = CROSSING): Promise<number> =>
  Number(await handle(key, cell).getAttribute('aria-valuenow'));
const textOf = (selector: string): Promise<string> =>
  page.locator(selector).evaluate((element) => element.textContent);
const undoIs = (what: string): Promise<unknown> =>
  page.waitForFunction(
    (words) => [...document.querySelectorAll('button')].some(({ title }) => title === words),
    what,
  );

/** Takes a handle with the mouse and moves it, without letting go. */
async function pull(key: string, dx: number, dy: number, cell = CROSSING): Promise<void> {
  const [x, y] = await middleOf(handle(key, cell).locator('.grip'));
  await page.mouse.move(x, y);
  await page.mouse.down();
  for (let step = 1; step <= 4; step += 1) await page.mouse.move(x + (dx * step) / 4, y + (dy * step) / 4);
}

/** Puts a finger on a handle and moves it, without lifting it; gives back what lifts it. */
async function touchPull(key: string, to: number, cell = CROSSING): Promise<() => Promise<void>> {
  const [x, y] = await middleOf(handle(key, cell).locator('.grip'));
  const devTools = await page.context().newCDPSession(page);
  const touch = (type: 'touchStart' | 'touchMove' | 'touchEnd', dx: number): Promise<unknown> =>
    devTools.send('Input.dispatchTouchEvent', {
      type,
      touchPoints: type === 'touchEnd' ? [] : [{ x: x + dx, y: y + dx / 4 }],
    });
  await touch('touchStart', 0);
  for (const part of [1, 2, 3]) await touch('touchMove', (to * part) / 3);
  return async () => {
    await touch('touchEnd', to);
    await devTools.detach();
  };
}

const changed = (key: string, from: number, cell = CROSSING): Promise<unknown> =>
  page.waitForFunction(
    ([selector, was]) => document.querySelector(selector!)?.getAttribute('aria-valuenow') !== was,
    [`${cell} [data-handle="${key}"]`, String(from)],
  );

describe.each([
  ['the crossing', CROSSING, `${CROSSING} .notes`],
  ['the stack', STACK, '[id="3+015"]'],
])('a pier dragged in %s', (_, cell, said) => {
  it('moves, shows its free stretch and the changed spans, costs follow, and it is one step of undo', async () => {
    const before = await valueOf('pier/1', cell);
    const price = await textOf(said);
    await pull('pier/1', 24, 0, cell);
    await changed('pier/1', before, cell);
    await page.waitForSelector(`${cell} .free path`);
    expect(await textOf(`${cell} svg`)).toMatch(/\(\+\d+\.\d\)/u);
    await page.waitForFunction(
      ([place, words]) => document.querySelector(place!)?.textContent !== words,
      [said, price],
    );
    await page.mouse.up();
    await settled(page);
    const after = await valueOf('pier/1', cell);
    expect(after).toBeGreaterThan(before + 3);
    expect(await page.locator(`${cell} .free`).count()).toBe(0);
    await undoIs('Undo moving a pier');
    // Off the screen it is drawn when the page is idle.
    await expect.poll(() => textOf('[id="3+010"]')).toContain('is kept by hand');
    await page.getByRole('button', { name: 'Undo', exact: true }).click();
    await settled(page);
    expect(await valueOf('pier/1', cell)).toBe(before);
    expect(await page.getByRole('button', { name: 'Undo', exact: true }).isDisabled()).toBe(true);
  });
});

describe('at any width', () => {
  let size: { width: number; height: number };
  beforeAll(() => {
    size = page.viewportSize()!;
  });
  afterEach(async () => {
    await page.setViewportSize(size);
    await settled(page);
  });

  /** Sets a width of the window, and waits until the drawing of a cell is drawn for it. */
  async function atWidth(width: number, cell: string): Promise<void> {
    await page.setViewportSize({ width, height: 900 });
    await settled(page);
    await page.locator(cell).evaluate((element) => element.scrollIntoView());
    // A stack is drawn wider than its room by the bar of the reference.
    await page.waitForFunction((place) => {
      const drawing = document.querySelector(`${place} svg.drawing`);
      const room = drawing?.closest('.body')?.getBoundingClientRect().width ?? NaN;
      return Math.abs(Number(drawing?.getAttribute('width')) - room) <= 14;
    }, cell);
    await middleOf(handle('pier/1', cell).locator('.grip'));
  }

  it.each([
    [1440, CROSSING],
    [1440, STACK],
    [800, CROSSING],
    [800, STACK],
    [400, CROSSING],
    [400, STACK],
  ])('at %i px every handle of %s is hit in its own target of 24 px or more', async (width, cell) => {
    await atWidth(width, cell);
    const found = await page.evaluate((place) => {
      const wrong: string[] = [];
      const keys: string[] = [];
      for (const handle of document.querySelectorAll(`${place} [data-handle]`)) {
        const key = handle.getAttribute('data-handle')!;
        keys.push(key);
        const grip = handle.querySelector('.grip')!;
        grip.scrollIntoView({ block: 'center', inline: 'nearest' });
        const { left, right, top, bottom } = grip.getBoundingClientRect();
        if (Math.min(right - left, bottom - top) < 23.99) wrong.push(`${key} is small`);
        if (left < 0 || right > innerWidth) wrong.push(`${key} is off the screen`);
        for (const [x, y] of [
          [(left + right) / 2, (top + bottom) / 2],
          [left + 1, top + 1],
          [right - 1, bottom - 1],
        ] as const) {
          const hit = document.elementFromPoint(x, y)?.closest('[data-handle]');
          const other = hit?.getAttribute('data-handle') ?? 'nothing';
          if (other !== key) wrong.push(`${other} is hit for ${key}`);
        }
      }
      const { scrollWidth, clientWidth } = document.documentElement;
      return { wrong, keys, over: scrollWidth - clientWidth };
    }, cell);
    expect(found.wrong).toEqual([]);
    expect(found.over).toBe(0);
    for (const key of ['span/0', 'pier/1', 'depth']) expect(found.keys).toContain(key);
    if (cell === CROSSING)
      for (const key of ['obstacle/0/to', 'clearance/0', 'road/start', 'road/end'])
        expect(found.keys).toContain(key);
  });

  it('at 800 px a pier dragged in its row changes its span, in one step of undo', async () => {
    await atWidth(800, STACK);
    const [pier, span] = [await valueOf('pier/1', STACK), await valueOf('span/0', STACK)];
    await pull('pier/1', 12, 0, STACK);
    await changed('pier/1', pier, STACK);
    await page.waitForSelector(`${STACK} .free path`);
    await page.mouse.up();
    await settled(page);
    const moved = (await valueOf('pier/1', STACK)) - pier;
    expect(moved).toBeGreaterThan(3);
    expect((await valueOf('span/0', STACK)) - span).toBeCloseTo(moved, 6);
    await undoIs('Undo moving a pier');
    await page.getByRole('button', { name: 'Undo', exact: true }).click();
    await settled(page);
    expect(await valueOf('pier/1', STACK)).toBe(pier);
    expect(await page.getByRole('button', { name: 'Undo', exact: true }).isDisabled()).toBe(true);
  });

  it('at 400 px spans are typed in their row', async () => {
    await atWidth(400, STACK);
    const spans = [await valueOf('span/0', STACK), await valueOf('span/1', STACK)] as const;
    await handle('span/0', STACK).locator('.grip').click();
    await page.keyboard.type(String(spans[0] + 2));
    await page.keyboard.press('Enter');
    await changed('span/0', spans[0], STACK);
    await settled(page);
    expect(await valueOf('span/0', STACK)).toBe(spans[0] + 2);
    expect(await valueOf('span/1', STACK)).toBeCloseTo(spans[1] - 2, 6);
    await undoIs('Undo span');
  });

  it('at 400 px a finger drags a pier in its row', async () => {
    await atWidth(400, STACK);
    const before = await valueOf('pier/1', STACK);
    const lift = await touchPull('pier/1', 9, STACK);
    await changed('pier/1', before, STACK);
    await lift();
    await settled(page);
    expect(await valueOf('pier/1', STACK)).toBeGreaterThan(before + 3);
    await undoIs('Undo moving a pier');
  });
});

describe('by hand', () => {
  it('Escape while a pier is dragged takes it back, and nothing is left to undo', async () => {
    const before = await valueOf('pier/1');
    await pull('pier/1', 20, 0);
    await changed('pier/1', before);
    await page.keyboard.press('Escape');
    await page.mouse.up();
    await settled(page);
    expect(await valueOf('pier/1')).toBe(before);
    expect(await page.getByRole('button', { name: 'Undo', exact: true }).isDisabled()).toBe(true);
  });

  it('a pier in the river is shown with the reason, and stays when it is let go', async () => {
    const middle = await page.evaluate(() => {
      const barred = document.querySelector('[id="1+020"] .barred path')!.getBoundingClientRect();
      return barred.left + barred.width / 2;
    });
    const box = (await handle('pier/2').locator('.grip').boundingBox())!;
    await pull('pier/2', middle - box.x - box.width / 2 - 30, 0);
    await page.waitForFunction(() =>
      document.querySelector('[id="1+020"] svg')?.textContent.includes('P2 may not stand here: River Wend'),
    );
    await page.mouse.up();
    await settled(page);
    expect(await textOf(`${CROSSING} svg`)).toContain('P2 may not stand here: River Wend');
    expect(await textOf(`${CROSSING} .notes`)).toContain('Not as it stands.');
    expect(await textOf(`${STACK} .row.reference`)).toContain('reference, out');
  });

  it('arrow keys step a pier, Shift by more, Escape takes the whole go back', async () => {
    const before = await valueOf('pier/1');
    await handle('pier/1').focus();
    await page.keyboard.press('ArrowRight');
    await page.keyboard.press('ArrowRight');
    await page.waitForFunction(
      ([selector, value]) => document.querySelector(selector!)?.getAttribute('aria-valuenow') === value,
      [`${CROSSING} [data-handle="pier/1"]`, String(before + 1)],
    );
    await page.keyboard.press('Shift+ArrowLeft');
    await page.waitForFunction(
      ([selector, value]) => document.querySelector(selector!)?.getAttribute('aria-valuenow') === value,
      [`${CROSSING} [data-handle="pier/1"]`, String(before - 4)],
    );
    await page.keyboard.press('Escape');
    await settled(page);
    expect(await valueOf('pier/1')).toBe(before);
    expect(await page.getByRole('button', { name: 'Undo', exact: true }).isDisabled()).toBe(true);
    expect(await page.evaluate(() => document.activeElement?.getAttribute('data-handle'))).toBe('pier/1');
  });

  it('a span is typed over in its dimension; one that cannot be is refused with the reason', async () => {
    const before = await valueOf('span/0', STACK);
    await handle('span/0', STACK).locator('.grip').click();
    await page.keyboard.type(String(before + 2));
    await page.keyboard.press('Enter');
    await changed('span/0', before, STACK);
    expect(await valueOf('span/0', STACK)).toBe(before + 2);
    await settled(page);
    await handle('span/0', STACK).locator('.grip').click();
    await page.keyboard.type('900');
    await page.keyboard.press('Enter');
    await page.waitForFunction(() =>
      document.querySelector('[id="3+020"] .hand-said')?.textContent.includes('refused, between'),
    );
    expect(await valueOf('span/0', STACK)).toBe(before + 2);
  });

  it('a locked pier is not moved, by mouse or keys, and is freed again', async () => {
    const before = await valueOf('pier/1');
    await page.getByRole('button', { name: 'Lock P1' }).click();
    await page.waitForSelector(`${CROSSING} .handle.locked`);
    await settled(page);
    await pull('pier/1', 24, 0);
    await page.mouse.up();
    await handle('pier/1').focus();
    await page.keyboard.press('ArrowRight');
    await settled(page);
    expect(await valueOf('pier/1')).toBe(before);
    expect(await textOf(`${CROSSING} .hand-said`)).toContain('Locked');
    await page.keyboard.press('l');
    await page.waitForSelector(`${CROSSING} .handle.locked`, { state: 'detached' });
    await settled(page);
  });

  it('a double click between two piers adds one, Delete removes it, each in one step of undo', async () => {
    const piers = () => page.locator(`${CROSSING} [data-handle^="pier/"]`);
    const before = await piers().count();
    await page.locator(`${CROSSING} svg`).first().scrollIntoViewIfNeeded();
    const box = (await page.locator(`${CROSSING} [data-bay="span/0"]`).boundingBox())!;
    await page.mouse.dblclick(box.x + box.width * 0.4, box.y + box.height - 8);
    await page.waitForFunction(
      ([selector, count]) => document.querySelectorAll(selector as string).length === count,
      [`${CROSSING} [data-handle^="pier/"]`, before + 1] as const,
    );
    await settled(page);
    await undoIs('Undo adding a pier');
    // Off the screen it is drawn when the page is idle.
    await expect.poll(() => textOf('[id="3+010"]')).toContain('is kept by hand');
    expect(await valueOf('pier/1')).toBeLessThan(await valueOf('pier/2'));
    await handle('pier/1').focus();
    await page.keyboard.press('Delete');
    await page.waitForFunction(
      ([selector, count]) => document.querySelectorAll(selector as string).length === count,
      [`${CROSSING} [data-handle^="pier/"]`, before] as const,
    );
    await settled(page);
    await undoIs('Undo removing a pier');
    await page.getByRole('button', { name: 'Undo', exact: true }).click();
    await settled(page);
    expect(await piers().count()).toBe(before + 1);
    await page.getByRole('button', { name: 'Undo', exact: true }).click();
    await settled(page);
    expect(await piers().count()).toBe(before);
    expect(await page.getByRole('button', { name: 'Undo', exact: true }).isDisabled()).toBe(true);
  });

  it('two lengths typed as a sum part a span; those that do not make it up are refused', async () => {
    const spans = () => page.locator(`${STACK} [data-handle^="span/"]`);
    const before = await spans().count();
    const whole = await valueOf('span/0', STACK);
    await handle('span/0', STACK).locator('.grip').click();
    await page.keyboard.type(`20 + ${String(whole - 18)}`);
    await page.keyboard.press('Enter');
    await page.waitForFunction(() =>
      document.querySelector('[id="3+020"] .hand-said')?.textContent.includes('must make up'),
    );
    await handle('span/0', STACK).locator('.grip').click();
    await page.keyboard.type(`20 + ${String(whole - 20)}`);
    await page.keyboard.press('Enter');
    await page.waitForFunction(
      ([selector, count]) => document.querySelectorAll(selector as string).length === count,
      [`${STACK} [data-handle^="span/"]`, before + 1] as const,
    );
    await settled(page);
    expect(await valueOf('span/0', STACK)).toBe(20);
    await undoIs('Undo adding a pier');
  });

  it('a finger on a handle drags it and does not scroll the page', async () => {
    const before = await valueOf('pier/1');
    const grip = handle('pier/1').locator('.grip');
    await grip.scrollIntoViewIfNeeded();
    expect(await grip.evaluate((element) => getComputedStyle(element).touchAction)).toBe('none');
    expect(
      await page
        .locator(`${CROSSING} svg`)
        .first()
        .evaluate((element) => getComputedStyle(element).touchAction),
    ).toBe('auto');
    const scrolled = await page.evaluate(() => window.scrollY);
    const lift = await touchPull('pier/1', 24);
    await changed('pier/1', before);
    await lift();
    await settled(page);
    expect(await valueOf('pier/1')).toBeGreaterThan(before + 3);
    expect(await page.evaluate(() => window.scrollY)).toBe(scrolled);
    await undoIs('Undo moving a pier');
  });

  it.each([
    ['obstacle/1/to', 16, 0, '1+030'],
    ['clearance/0', 0, -10, '1+030'],
    ['road/start', 0, -10, '1+010'],
  ])('%s is dragged, and the brief follows', async (key, dx, dy, station) => {
    const before = await valueOf(key);
    const brief = await textOf(`[id="${station}"] .body`);
    await pull(key, dx, dy);
    await changed(key, before);
    await page.mouse.up();
    await settled(page);
    expect(await valueOf(key)).not.toBe(before);
    expect(await textOf(`[id="${station}"] .body`)).not.toBe(brief);
  });

  it('on a narrow sheet the barred stretch is taken by its bracket: ends dragged and stepped, width typed', async () => {
    const size = page.viewportSize()!;
    await page.setViewportSize({ width: 400, height: 800 });
    await page.waitForSelector(`${CROSSING} [data-handle="width/1"]`, { state: 'attached' });
    await settled(page);
    const [from, to] = [await valueOf('obstacle/1/from'), await valueOf('obstacle/1/to')];
    await pull('obstacle/1/to', 6, 0);
    await changed('obstacle/1/to', to);
    await page.mouse.up();
    await settled(page);
    const wide = await valueOf('width/1');
    expect(wide).toBeGreaterThan(to - from + 2);
    await handle('obstacle/1/from').focus();
    await page.keyboard.press('ArrowLeft');
    await changed('obstacle/1/from', from);
    await page.keyboard.press('Enter');
    expect(await valueOf('obstacle/1/from')).toBe(from - 0.5);
    await settled(page);
    await handle('width/1').focus();
    await page.keyboard.type('64');
    await page.keyboard.press('Enter');
    await changed('width/1', wide + 0.5);
    expect(await valueOf('width/1')).toBe(64);
    expect(await textOf('[id="1+010"] .body')).toContain('64.0');
    await page.setViewportSize(size);
    await settled(page);
  });

  it('a depth is dragged and held; the study can be left to find it again', async () => {
    const before = await valueOf('depth');
    const pxM = Number(await handle('depth').getAttribute('data-down'));
    await pull('depth', 0, 10);
    await changed('depth', before);
    await page.mouse.up();
    await settled(page);
    const after = await valueOf('depth');
    // Levels move by a quarter of what the pointer does, on multiples of five centimetres.
    const geared = before + 0.25 * 10 * pxM;
    expect(after).toBeCloseTo(Math.round(geared / 0.05) * 0.05, 6);
    await page.getByRole('button', { name: 'Depth of least cost' }).click();
    await changed('depth', after);
    await settled(page);
    expect(await valueOf('depth')).toBeCloseTo(before, 1);
    await page.getByRole('button', { name: 'Give it back to the search' }).click();
    await page.waitForFunction(() =>
      document.querySelector('[id="3+010"]')?.textContent.includes('as the search proposed it'),
    );
  });

  it('a choice of the form is asked for, refused with the reason, undone and given back', async () => {
    const cell = page.locator('[id="3+010"]');
    const row = page.locator(`${STACK} [data-option]`, { hasText: 'Concrete box' }).first();
    await row.click({ position: { x: 200, y: 10 } });
    await cell.getByText('(Concrete box), the reference').waitFor();
    await settled(page);
    await cell.locator('summary').click();
    const width = cell.getByRole('spinbutton', { name: 'width of the box between its outer webs, m' });
    const asked = 'Asked of it: box 6.20 m wide between its webs.';
    const type = async (text: string): Promise<void> => {
      await width.focus();
      await page.keyboard.type(text);
      await page.keyboard.press('Enter');
    };
    expect(await width.textContent()).toBe('as its cells ask');
    await width.focus();
    await page.keyboard.press('ArrowUp');
    await cell.getByText('Asked of it').waitFor();
    await page.keyboard.press('Escape');
    await undoIs('Undo reference');
    await cell.getByText('as the search proposed it').waitFor();
    expect(await width.textContent()).toBe('as its cells ask');
    await type('6.2');
    await cell.getByText(asked).waitFor();
    await settled(page);
    expect(await textOf(`${STACK} .row.reference`)).toContain('box 6.20 m wide between its webs');
    await undoIs('Undo width of the box between its outer webs');
    await cell.locator('td [data-figure$="variant/boxWidthM"]').click();
    await cell.getByText('width of the box, asked for the option').waitFor();
    await page.keyboard.press('Escape');

    await type('40');
    await cell.getByText(/Expected 2\.5 to 11\.\d+ m, not 40 m/u).waitFor();
    expect(await width.getAttribute('aria-invalid')).toBe('true');
    await settled(page);
    expect(await textOf('[id="3+010"]')).toContain(asked);
    await page.getByRole('button', { name: 'Undo', exact: true }).click();
    expect(await width.textContent()).toBe('6.20');
    expect(await width.getAttribute('aria-invalid')).toBeNull();

    await cell
      .getByRole('button', {
        name: 'give back width of the box between its outer webs to what the form finds',
      })
      .click();
    await cell.getByText(asked).waitFor({ state: 'detached' });
    expect(await width.textContent()).toBe('as its cells ask');
    // Off the screen it is drawn when the page is idle.
    await expect.poll(() => textOf('[id="3+010"]')).toContain('is kept by hand');
  });

  it('a form that a rule puts out is worked out anyway, and left out again', async () => {
    await openAsFile(page, exampleOf(['composite-i', 'slab']));
    await page.waitForFunction(() =>
      document.querySelector('[id="3+020"]')?.textContent.includes('work it out anyway'),
    );
    await settled(page);
    await page.locator(`${STACK} summary`, { hasText: 'arrangements dropped' }).click();
    const ask = page.locator(`${STACK} button`, { hasText: 'work it out anyway' }).first();
    const name = (await ask.getAttribute('aria-label'))!.split(':')[0]!;
    await ask.click();
    await page.waitForFunction(
      (form) => document.querySelector('[id="3+020"]')?.textContent.includes(`${form} is worked out`),
      name,
    );
    await settled(page);
    await page.locator(`${STACK} button`, { hasText: 'leave it out again' }).first().click();
    await page.waitForFunction(
      (form) => !document.querySelector('[id="3+020"]')?.textContent.includes(`${form} is worked out`),
      name,
    );
  });
});

describe('an abutment with a window', () => {
  beforeAll(async () => {
    const study = exampleOf(['composite-i']) as { brief: { crossing: object } };
    const crossing = { ...study.brief.crossing, endEarliestM: 1452 };
    await openAsFile(page, { ...study, brief: { ...study.brief, crossing } });
    await page.waitForSelector(`${CROSSING} [data-handle="abutment/end"]`, { state: 'attached' });
    await settled(page);
  });

  it('is dragged; spans, road and cost follow, and it is one step of undo', async () => {
    expect(await handle('abutment/start').count()).toBe(0);
    const before = await valueOf('abutment/end');
    const said = await textOf(`${CROSSING} .notes`);
    const to = before > 1460 ? -20 : 20;
    await pull('abutment/end', to, 0);
    await changed('abutment/end', before);
    await page.waitForSelector(`${CROSSING} .free path`);
    expect(await textOf(`${CROSSING} svg`)).toMatch(/\([+−]\d+\.\d\)/u);
    await page.waitForFunction(
      ([place, words]) => document.querySelector(place!)?.textContent !== words,
      [`${CROSSING} .notes`, said],
    );
    await page.mouse.up();
    await settled(page);
    const after = await valueOf('abutment/end');
    expect(Math.sign(after - before)).toBe(Math.sign(to));
    expect((await textOf(`${CROSSING} .band`)).replace(/\u2009/gu, '')).toContain(String(after));
    await undoIs('Undo moving an abutment');
    await page.getByRole('button', { name: 'Undo', exact: true }).click();
    await settled(page);
    expect(await valueOf('abutment/end')).toBe(before);
    expect(await page.getByRole('button', { name: 'Undo', exact: true }).isDisabled()).toBe(true);
  });

  it('is stepped with the arrow keys as far as its window goes, and refused beyond with the window', async () => {
    await handle('abutment/end').focus();
    for (let step = 0; step < 5; step += 1) await page.keyboard.press('Shift+ArrowLeft');
    await page.waitForFunction(
      (selector) => document.querySelector(selector)?.getAttribute('aria-valuenow') === '1452',
      `${CROSSING} [data-handle="abutment/end"]`,
    );
    await page.keyboard.press('Enter');
    await page.keyboard.press('Enter');
    await page.keyboard.type('1440');
    await page.keyboard.press('Enter');
    await page.waitForFunction(
      (place) => document.querySelector(place)?.textContent.includes('refused, between 1\u2009452.0 and'),
      `${CROSSING} .hand-said`,
    );
    expect(await valueOf('abutment/end')).toBe(1452);
    await handle('abutment/end').focus();
    await page.keyboard.press('Delete');
    expect(await textOf(`${CROSSING} .hand-said`)).toContain('only a pier can be removed');
  });
});
