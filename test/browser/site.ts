import { existsSync } from 'node:fs';
import { resolve } from 'node:path';
import { chromium, type Browser, type BrowserContext, type Page } from 'playwright-core';
import { build, preview, type PreviewServer } from 'vite';
import { findChromium } from '../../.config/chromium.mjs';

const root = resolve(import.meta.dirname, '../..');
const configFile = resolve(root, 'vite.config.ts');

/** What a page said or asked for that it should not have. */
export interface Heard {
  readonly console: string[];
  readonly elsewhere: string[];
}

/** The built site in a real browser. */
export interface Site {
  readonly address: string;
  /** A fresh page without memory of the others; everything it prints or asks for outside the site is heard. */
  open(path: string, size?: { width: number; height: number }): Promise<{ page: Page; heard: Heard }>;
  close(): Promise<void>;
}

const quiet = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
  // Lettering is as wide as on a screen, not rounded letter by letter.
  '--font-render-hinting=none',
];

/** A page lives for seconds in a test: what the last stage of the engine's compiler costs it does not give back. */
const shortLived = '--js-flags=--no-turbofan';

/**
 * Serves the built site (building it where nobody has yet), or one built elsewhere, and starts the browser.
 * @param isTimed the engine compiles as it does for a user: for a bench, not for tests
 */
export async function openSite(outDir = resolve(root, 'dist'), isTimed = false): Promise<Site> {
  if (!existsSync(resolve(outDir, 'option-study.html'))) {
    await build({ configFile, logLevel: 'silent', build: { outDir } });
  }
  const server: PreviewServer = await preview({
    configFile,
    logLevel: 'silent',
    build: { outDir },
    preview: { host: '127.0.0.1', port: 0 },
  });
  const address = server.resolvedUrls!.local[0]!;
  const browser: Browser = await chromium.launch({
    executablePath: await findChromium(),
    args: isTimed ? quiet : [...quiet, shortLived],
  });
  let last: BrowserContext | undefined;
  return {
    address,
    async open(path, size = { width: 1440, height: 900 }) {
      // One page at a time: those of earlier tests would go on working beside this one.
      await last?.close();
      last = await browser.newContext({ viewport: size });
      const page = await last.newPage();
      const heard: Heard = { console: [], elsewhere: [] };
      page.on('console', (message) => heard.console.push(`${message.type()}: ${message.text()}`));
      page.on('pageerror', (error) => heard.console.push(`error: ${error.message}`));
      page.on('request', (request) => {
        const url = request.url();
        if (!url.startsWith(address) && !/^(data|blob):/u.test(url)) heard.elsewhere.push(url);
      });
      await page.goto(new URL(path, address).href);
      return { page, heard };
    },
    async close() {
      await browser.close();
      await server.close();
    },
  };
}
