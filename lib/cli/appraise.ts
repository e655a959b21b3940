import { mkdirSync, writeFileSync } from 'node:fs';
import { resolve } from 'node:path';
import { appraise } from '../appraise.ts';
import { appraisalJson } from './appraisalJson.ts';
import { readFlags, refuse } from './flags.ts';
import { studyFile } from './studyFile.ts';

const flags = readFlags(['out', 'format'], process.argv.slice(2));
const [file] = flags.rest;
if (file === undefined || flags.rest.length > 1) {
  refuse([
    {
      code: 'missing',
      path: ['command line'],
      expected: 'one study file',
      received: flags.rest.length === 0 ? 'none' : `${flags.rest.length} files`,
      remedy: 'npm run --silent appraise -- STUDY.json',
    },
  ]);
}
const format = flags.values['format'] ?? 'json';
if (format !== 'json') {
  refuse([
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
const json = `${JSON.stringify(appraisalJson(appraise(study)), null, 2)}\n`;
const out = flags.values['out'];
if (out === undefined) {
  process.stdout.write(json);
} else {
  mkdirSync(out, { recursive: true });
  writeFileSync(resolve(out, 'appraisal.json'), json);
}
