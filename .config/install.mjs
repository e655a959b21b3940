// Installs the packages of the lock file, only when the lock file has changed since the last time.
import { createHash } from 'node:crypto';
import { spawn, spawnSync } from 'node:child_process';
import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import { setPriority } from 'node:os';
import { resolve } from 'node:path';

export const root = resolve(import.meta.dirname, '..');

/** Runs a command in the project folder, its output shown; ends the process with its code when it fails. */
export function run(command, args, env = {}) {
  const result = spawnSync(command, args, { cwd: root, stdio: 'inherit', env: { ...process.env, ...env } });
  if (result.error) fail(`${command} could not be started: ${result.error.message}`);
  if (result.status !== 0) process.exit(result.status ?? 1);
}

/** Lets a process just begun, and all it begins, leave the processor to others: 0 not at all, 19 always. */
export function giveWay(child, givesWay) {
  if (givesWay > 0 && child.pid !== undefined) setPriority(child.pid, givesWay);
}

/** Runs commands beside each other; ends the process with the code of the first that fails, once all have ended. */
export async function runTogether(commands, givesWay = 0) {
  const codes = await Promise.all(
    commands.map(
      ([command, ...args]) =>
        new Promise((ended) => {
          const child = spawn(command, args, { cwd: root, stdio: 'inherit' });
          giveWay(child, givesWay);
          child.on('error', ({ message }) => fail(`${command} could not be started: ${message}`));
          child.on('close', (code) => ended(code ?? 1));
        }),
    ),
  );
  const failed = codes.find((code) => code !== 0);
  if (failed !== undefined) process.exit(failed);
}

export function fail(words) {
  process.stderr.write(`${words}\n`);
  process.exit(1);
}

export function install() {
  if (Number(process.versions.node.split('.')[0]) < 20)
    fail(`Node 20 or newer is needed, this is ${process.version}.`);
  const stamp = resolve(root, 'node_modules/.spanledger-lock');
  const lock = createHash('sha256')
    .update(readFileSync(resolve(root, 'package-lock.json')))
    .digest('hex');
  if (existsSync(stamp) && readFileSync(stamp, 'utf8') === lock) return;
  process.stdout.write('Installing packages (the lock file is new or has changed) ...\n');
  run('npm', ['ci', '--no-audit', '--no-fund', '--loglevel=error']);
  writeFileSync(stamp, lock);
}
