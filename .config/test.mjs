// npm test: install when needed, types, lint, unit (layer rules among them) and published checks, browser; ends with a plain count.
import { spawnSync } from 'node:child_process';
import { mkdirSync, readFileSync } from 'node:fs';
import { resolve } from 'node:path';
import { install, root, runTogether } from './install.mjs';

install();
const started = performance.now();
const { findChromium } = await import('./chromium.mjs');
const chromium = await findChromium();

await runTogether([
  ['npm', 'run', '--silent', 'types'],
  ['npm', 'run', '--silent', 'lint'],
  ['npx', 'vite', 'build', '--logLevel', 'warn'],
]);

mkdirSync(resolve(root, '.cache'), { recursive: true });
let passed = 0;
let failed = 0;
let broken = false;
for (const project of ['unit', 'browser']) {
  const file = resolve(root, `.cache/${project}.json`);
  const outcome = spawnSync(
    'npx',
    ['vitest', 'run', '--project', project, '--reporter=dot', '--reporter=json', `--outputFile.json=${file}`],
    { cwd: root, stdio: 'inherit', env: { ...process.env, CHROMIUM: chromium, TZ: 'UTC' } },
  );
  const report = JSON.parse(readFileSync(file, 'utf8'));
  passed += report.numPassedTests;
  failed += report.numFailedTests;
  if (outcome.status !== 0) broken = true;
}
process.stdout.write(`Tests took ${Math.round((performance.now() - started) / 1000)} s.\n`);
process.stdout.write(`${passed} passed, ${failed} failed\n`);
process.exit(broken || failed > 0 || passed === 0 ? 1 : 0);
