import { spawnSync } from 'node:child_process';

/** What a command of the command line printed. */
export interface Printed {
  readonly out: string;
  readonly err: string;
  readonly code: number | null;
}

/** Runs one of the commands of package.json as a user would. */
export function command(name: string, ...args: string[]): Printed {
  const { stdout, stderr, status } = spawnSync('npm', ['run', '--silent', name, '--', ...args], {
    encoding: 'utf8',
  });
  return { out: stdout, err: stderr, code: status };
}
