import { readFileSync } from 'node:fs';
import type { Study } from '../model/index.ts';
import { readStudy } from '../study/index.ts';
import { refuse } from './refusal.ts';

/** The study of a file. @throws Refusal where the file cannot be read or holds no study, with the reasons */
export function studyFile(file: string): Study {
  let text: string;
  try {
    text = readFileSync(file, 'utf8');
  } catch (error) {
    return refuse([
      {
        code: 'missing',
        path: [file],
        expected: 'a study file that can be read',
        received: error instanceof Error ? error.message : String(error),
        remedy: 'check the path',
      },
    ]);
  }
  const read = readStudy(text);
  return read.ok ? read.value : refuse(read.problems);
}
