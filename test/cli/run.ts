import { spawnSync } from 'node:child_process';
import { readFileSync } from 'node:fs';
import { Refusal } from '../../lib/cli/refusal.ts';
import type { Said } from '../../lib/cli/said.ts';

/** What a command of the command line printed. */
export interface Printed {
  readonly out: string;
  readonly err: string;
  readonly code: number | null;
}

/** What a command says, asked in this process. */
export function answer(command: (argv: readonly string[]) => Said, line: string): Printed {
  try {
    const { out, notes = [], code = 0 } = command(line.split(' ').filter(Boolean));
    return { out, err: notes.join('\n'), code };
  } catch (error) {
    if (!(error instanceof Refusal)) throw error;
    return { out: '', err: error.message, code: 2 };
  }
}

const { scripts } = JSON.parse(readFileSync('package.json', 'utf8')) as { scripts: Record<string, string> };

/** Runs one of the commands of package.json as a user would, in one process instead of the four of npm and tsx. */
export function command(name: string, line: string): Printed {
  const [runner, ...words] = scripts[name]!.split(' ');
  if (runner !== 'tsx') throw new Error(`${name} is not a command run by tsx`);
  const { stdout, stderr, status } = spawnSync(
    process.execPath,
    ['--import', 'tsx', ...words, ...line.split(' ')],
    { encoding: 'utf8' },
  );
  return { out: stdout, err: stderr, code: status };
}
