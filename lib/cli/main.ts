import { Refusal } from './refusal.ts';
import type { Said } from './said.ts';

/** `main COMMAND ...`: each command is read only when it is asked for. */
type Command = (argv: readonly string[], say: (line: string) => void) => Said;
const commands: Readonly<Record<string, () => Promise<Command>>> = {
  appraise: async () => (await import('./appraise.ts')).appraiseCommand,
  evidence: async () => (await import('./evidence.ts')).evidenceCommand,
  explain: async () => (await import('./explain.ts')).explainCommand,
  guide: async () => (await import('./guide.ts')).guideCommand,
  size: async () => (await import('./size.ts')).sizeCommand,
};

const [name = '', ...argv] = process.argv.slice(2);
const load = commands[name];
if (load === undefined) {
  process.stderr.write(`command: expected one of ${Object.keys(commands).join(', ')}, received '${name}'\n`);
  process.exit(2);
}
try {
  const { out, notes = [], code = 0 } = (await load())(argv, (line) => process.stderr.write(`${line}\n`));
  process.stdout.write(out);
  for (const note of notes) process.stderr.write(`${note}\n`);
  process.exitCode = code;
} catch (error) {
  if (!(error instanceof Refusal)) throw error;
  process.stderr.write(`${error.message}\n`);
  process.exitCode = 2;
}
