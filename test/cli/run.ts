import { spawnSync } from 'node:child_process';
import { readFileSync } from 'node:fs';

/** What a command of the command line printed. */
export interface Printed {
  readonly out: string;
  readonly err: string;
  readonly code: number | null;
}

const { scripts } = JSON.parse(readFileSync('package.json', 'utf8')) as { scripts: Record<string, string> };

/** Runs one of the commands of package.json as a user would, in one process instead of the four of npm and tsx. */
export function command(name: string, ...args: string[]): Printed {
  const [runner, file, ...rest] = scripts[name]!.split(' ');
  if (runner !== 'tsx' || file === undefined) throw new Error(`${name} is not a command run by tsx`);
  const { stdout, stderr, status } = spawnSync(
    process.execPath,
    ['--import', 'tsx', file, ...rest, ...args],
    { encoding: 'utf8' },
  );
  return { out: stdout, err: stderr, code: status };
}
