// Finds a Chromium for the browser tests, or installs one; a missing browser is a failure with a remedy, never a skip.
import { spawnSync } from 'node:child_process';
import { existsSync } from 'node:fs';
import { resolve } from 'node:path';
import { root } from './install.mjs';

// The shell without windows first: it opens a page in about half the time, for it draws no controls of a browser around it.
const usualPlaces = [
  '/usr/bin/chromium-headless-shell',
  '/usr/bin/chrome-headless-shell',
  '/usr/bin/chromium',
  '/usr/bin/chromium-browser',
  '/usr/bin/google-chrome',
  '/usr/bin/google-chrome-stable',
  '/snap/bin/chromium',
  '/Applications/Chromium.app/Contents/MacOS/Chromium',
  '/Applications/Google Chrome.app/Contents/MacOS/Google Chrome',
  'C:\\Program Files\\Google\\Chrome\\Application\\chrome.exe',
];

async function downloaded() {
  const { chromium } = await import('playwright-core');
  const path = chromium.executablePath();
  return existsSync(path) ? path : undefined;
}

function aptInstall() {
  if (process.platform !== 'linux' || process.getuid?.() !== 0 || !existsSync('/usr/bin/apt-get')) return;
  process.stdout.write('No Chromium found; installing it with apt-get ...\n');
  const quiet = {
    stdio: ['ignore', 'ignore', 'inherit'],
    env: { ...process.env, DEBIAN_FRONTEND: 'noninteractive' },
  };
  spawnSync('apt-get', ['update', '-qq'], quiet);
  for (const browser of ['chromium-headless-shell', 'chromium']) {
    const asked = ['install', '-y', '-qq', '--no-install-recommends', browser, 'fonts-dejavu-core'];
    if (spawnSync('apt-get', asked, quiet).status === 0) return;
  }
}

/** Path of a Chromium: the variable CHROMIUM, the usual places, apt-get when root, the browser installer, in this order. */
export async function findChromium() {
  const named = process.env.CHROMIUM;
  if (named) {
    if (existsSync(named)) return named;
    throw new Error(
      `CHROMIUM names ${named}, which does not exist. Name a Chromium, or unset it to have one found.`,
    );
  }
  const here = () => usualPlaces.find((place) => existsSync(place));
  let found = here() ?? (await downloaded());
  if (!found) {
    aptInstall();
    found = here();
  }
  if (!found) {
    process.stdout.write('Trying the browser installer of playwright-core ...\n');
    spawnSync(
      process.execPath,
      [resolve(root, 'node_modules/playwright-core/cli.js'), 'install', 'chromium'],
      {
        stdio: 'inherit',
      },
    );
    found = await downloaded();
  }
  if (!found) {
    throw new Error(
      'No Chromium could be found or installed. Install Chromium or Chrome and set CHROMIUM to its path, then run npm test again.',
    );
  }
  return found;
}
