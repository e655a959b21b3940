// npm test: install when needed, types, lint, unit (layer rules among them) and published checks, browser; ends with a plain count.
import { spawn } from 'node:child_process';
import { existsSync, mkdirSync, readFileSync, rmSync } from 'node:fs';
import { resolve } from 'node:path';
import { fail, giveWay, install, root, runTogether } from './install.mjs';

install();
const started = performance.now();
const { findChromium } = await import('./chromium.mjs');
const chromium = await findChromium();

/**
 * How readily unit tests and checks leave a processor to the others, 0 not at all, 19 always: browser tests come one after another and
 * decide how long the whole takes, and a page kept waiting is not the page a user has.
 */
const GIVES_WAY = 10;

/** Runs the tests of one project; what it says is held back until it has ended, so that two do not talk at once. */
function runProject(project, givesWay = 0) {
  const file = resolve(root, `.cache/${project}.json`);
  // What an earlier run has left must not speak for this one.
  rmSync(file, { force: true });
  const args = ['run', '--project', project, '--reporter=dot', '--reporter=json'];
  return new Promise((ended) => {
    const runner = resolve(root, 'node_modules/vitest/vitest.mjs');
    const child = spawn(process.execPath, [runner, ...args, `--outputFile.json=${file}`], {
      cwd: root,
      env: { ...process.env, CHROMIUM: chromium, TZ: 'UTC' },
    });
    giveWay(child, givesWay);
    const said = [];
    child.stdout.on('data', (data) => said.push(data));
    child.stderr.on('data', (data) => said.push(data));
    // A check that fails ends everything: no tests go on behind it.
    process.on('exit', () => child.kill());
    child.on('error', ({ message }) => fail(`vitest could not be started: ${message}`));
    child.on('close', (code) => {
      process.stdout.write(Buffer.concat(said));
      if (!existsSync(file)) fail(`The ${project} tests ended without a result (code ${code}).`);
      const { numPassedTests: passed, numFailedTests: failed } = JSON.parse(readFileSync(file, 'utf8'));
      ended({ passed, failed, broken: code !== 0 });
    });
  });
}

mkdirSync(resolve(root, '.cache'), { recursive: true });
process.stdout.write('Unit tests, and beside them types, lint, build and browser tests ...\n');
// Unit tests need nothing of the others; browser tests need what is built, and take longest in a row.
const unit = runProject('unit', GIVES_WAY);
const checked = runTogether(
  [
    ['npm', 'run', '--silent', 'types'],
    ['npm', 'run', '--silent', 'lint'],
  ],
  GIVES_WAY,
);
await runTogether([['npx', 'vite', 'build', '--logLevel', 'warn']]);
const outcomes = await Promise.all([unit, runProject('browser')]);
await checked;
const passed = outcomes.reduce((sum, one) => sum + one.passed, 0);
const failed = outcomes.reduce((sum, one) => sum + one.failed, 0);
const broken = outcomes.some((one) => one.broken);
process.stdout.write(`Tests took ${Math.round((performance.now() - started) / 1000)} s.\n`);
process.stdout.write(`${passed} passed, ${failed} failed\n`);
process.exit(broken || failed > 0 || passed === 0 ? 1 : 0);
