import { mkdtempSync, readFileSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

/** File of the first worked example. */
export const example = 'data/examples/low-ferry.json';

/** The example with one change, as a file. */
export function changedExample(change: (study: Record<string, never>) => void): string {
  const study = JSON.parse(readFileSync(example, 'utf8')) as Record<string, never>;
  change(study);
  const file = join(mkdtempSync(join(tmpdir(), 'study-')), 'study.json');
  writeFileSync(file, JSON.stringify(study));
  return file;
}
