import { appraise } from '../appraise.ts';
import { figure } from '../explain/index.ts';
import { readFlags } from './flags.ts';
import { refuse } from './refusal.ts';
import { jsonText, type Said } from './said.ts';
import { studyFile } from './studyFile.ts';

/** `explain STUDY.json PATH ...`: where figures come from, as JSON; a path is e.g. `options/1/cost/p50`. */
export function explainCommand(argv: readonly string[]): Said {
  const [file, ...paths] = readFlags([], argv, { words: true }).rest;
  if (file === undefined || paths.length === 0) {
    return refuse([
      {
        code: 'missing',
        path: ['command line'],
        expected: 'a study file and the paths of figures',
        received: file === undefined ? 'nothing' : 'no path',
        remedy: 'npm run --silent explain -- STUDY.json options/1/cost/p50',
      },
    ]);
  }
  const study = studyFile(file);
  const context = { study, appraisal: appraise(study) };
  const figures = paths.map((path) => {
    try {
      return figure(context, path);
    } catch (error) {
      if (!(error instanceof RangeError)) throw error;
      return refuse([
        {
          code: 'not-in-list',
          path: [path],
          expected: 'a figure of the study, its options or its standing',
          received: path,
          remedy: 'give a path such as options/1/cost/p50, site/deck/widthM or rates/reinforcement',
        },
      ]);
    }
  });
  return { out: jsonText(figures.length === 1 ? figures[0] : figures) };
}
