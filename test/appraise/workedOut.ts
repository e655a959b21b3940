import type { Appraisal, Study } from '../../lib/index.ts';
import type { ExampleName } from '../../notebooks/exampleNames.ts';
import { workedExample } from '../../notebooks/examples.ts';
import { answerTo } from './answerTo.ts';

const studies = new Map<ExampleName, Study>();

/** A worked example on a thousand draws: quantities and drawings do not depend on how many there are. */
export function exampleStudy(name: ExampleName): Study {
  const known = studies.get(name);
  if (known !== undefined) return known;
  const whole = workedExample(name);
  const study = { ...whole, books: { ...whole.books, draws: 1000 } };
  studies.set(name, study);
  return study;
}

/** A worked example worked out. */
export const workedOut = (name: ExampleName): Appraisal => answerTo(exampleStudy(name));
