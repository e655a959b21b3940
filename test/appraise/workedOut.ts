import { appraise, memory, type Appraisal, type Study } from '../../lib/index.ts';
import { workedExample, type ExampleName } from '../../notebooks/examples.ts';

/** What was worked out for one test serves the others that run beside it. */
export const kept = memory();

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

const answers = new Map<ExampleName, Appraisal>();

/** A worked example worked out, once for all tests of a process. */
export function workedOut(name: ExampleName): Appraisal {
  const known = answers.get(name);
  if (known !== undefined) return known;
  const answer = appraise(exampleStudy(name), kept);
  answers.set(name, answer);
  return answer;
}
