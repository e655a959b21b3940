import { resolve } from 'node:path';
import { chromium } from 'playwright-core';
import type { Browser, Page } from 'playwright-core';
import { createServer } from 'vite';
import type { ViteDevServer } from 'vite';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { findChromium } from '../../.config/chromium.mjs';
import type { ask } from './pages/worker.ts';

let server: ViteDevServer;
let browser: Browser;
let page: Page;

beforeAll(async () => {
  const root = resolve(import.meta.dirname, '../..');
  server = await createServer({
    root,
    configFile: false,
    logLevel: 'silent',
    server: { port: 0, host: '127.0.0.1' },
  });
  await server.listen();
  browser = await chromium.launch({
    executablePath: await findChromium(),
    args: ['--no-sandbox', '--disable-gpu'],
  });
  page = await browser.newPage();
  await page.goto(new URL('/test/browser/pages/worker.html', server.resolvedUrls!.local[0]).href);
  await page.waitForFunction(() => 'ask' in window);
});

afterAll(async () => {
  await browser.close();
  await server.close();
});

type Asked = Window & { readonly ask: typeof ask };

describe('the worker in a browser', () => {
  it('slices of about 8 ms tell progress between them, and the result moves over', async () => {
    const { told, length } = await page.evaluate(() => (window as unknown as Asked).ask.whole());
    expect(length).toBe(40);
    expect(told.length).toBeGreaterThanOrEqual(3);
    expect(told).toEqual([...told].sort((a, b) => a - b));
  });

  it('work that was given up stops within a slice and leaves the worker to others', async () => {
    const asked = await page.evaluate(() => (window as unknown as Asked).ask.afterAbort());
    expect(asked.reason).toBe('AbortError');
    expect(asked.before).toBeLessThan(1000);
    expect(asked.stepsAfter).toBe(40);
    // One slice of 8 ms under way, and room for a busy machine; the long work would have taken 20 s.
    expect(asked.waitedMs).toBeLessThan(200);
  });
});
