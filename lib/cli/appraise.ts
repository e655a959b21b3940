import { mkdirSync, writeFileSync } from 'node:fs';
import { resolve } from 'node:path';
import { appraise } from '../appraise.ts';
import { startValues, startValueWords } from '../study/index.ts';
import { appraisalJson } from './appraisalJson.ts';
import { readFlags } from './flags.ts';
import { refuse } from './refusal.ts';
import { jsonText, type Said } from './said.ts';
import { studyFile } from './studyFile.ts';

/** `appraise STUDY.json [--out DIR] [--format json]`: a whole study worked out, as JSON. */
export function appraiseCommand(argv: readonly string[]): Said {
  const { values, rest } = readFlags(['out', 'format'], argv, { words: true });
  const [file] = rest;
  if (file === undefined || rest.length > 1) {
    return refuse([
      {
        code: 'missing',
        path: ['command line'],
        expected: 'one study file',
        received: rest.length === 0 ? 'none' : `${rest.length} files`,
        remedy: 'npm run --silent appraise -- STUDY.json',
      },
    ]);
  }
  const { out, format = 'json' } = values;
  if (format !== 'json') {
    return refuse([
      {
        code: 'not-in-list',
        path: ['--format'],
        expected: 'json',
        received: format,
        remedy: 'leave --format out; other formats are not written yet',
      },
    ]);
  }
  const study = studyFile(file);
  const json = jsonText(appraisalJson(appraise(study), startValues(study)));
  const unconfirmed = startValueWords(study);
  const notes = unconfirmed === '' ? [] : [`${unconfirmed}.`];
  if (out === undefined) return { out: json, notes };
  mkdirSync(out, { recursive: true });
  writeFileSync(resolve(out, 'appraisal.json'), json);
  return { out: '', notes };
}
