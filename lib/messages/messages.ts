import type { Problem, ProblemCode } from '../model/index.ts';

/** What to do about a problem, where its maker has nothing more exact to say. */
const remedies: Readonly<Record<ProblemCode, string>> = {
  'not-json': 'Open the file in a text editor and check brackets, commas and quotes, or save the study again',
  'too-large': 'Remove what does not belong to the study and try again',
  'wrong-format': 'Choose a study file written by this tool',
  'newer-version': 'Open it with the version of the tool that wrote it, or a later one',
  missing: 'Add it',
  'wrong-type': 'Write it as it is expected, without quotes round numbers',
  'unknown-key': 'Remove it or correct its spelling',
  'not-in-list': 'Choose one of the values listed',
  'too-small': 'Enter a larger value',
  'too-large-value': 'Enter a smaller value',
  reversed: 'Exchange the two values or correct one of them',
  outside: 'Move it inside the range',
  'does-not-sum': 'Change one of the shares so that they add up',
  refused: 'Change the value',
};

/** The general remedy for a kind of problem, without a full stop. */
export function remedyFor(code: ProblemCode): string {
  return remedies[code];
}

/** A path as it is printed: `brief.obstacles[1].headroomM`; empty for the study itself. */
export function placeOf(path: readonly (string | number)[]): string {
  return path.reduce<string>(
    (place, key) => (typeof key === 'number' ? `${place}[${key}]` : place === '' ? key : `${place}.${key}`),
    '',
  );
}

const unitSuffix = /(?<=[a-z])(M|T|Deg|KNm|KN|KNM2|Kg|KgM3|M2|M3|MPa)$/u;

/** Trade word for the field a problem is about: `headroomM` becomes 'headroom', `toM` of a zone stays 'to'. */
function subjectOf(path: readonly (string | number)[]): string {
  const last = path.at(-1);
  if (last === undefined) return 'study';
  if (typeof last === 'number') return `${subjectOf(path.slice(0, -1))}, entry ${last + 1}`;
  return last
    .replace(unitSuffix, '')
    .replace(/^--/u, '')
    .replace(/(?<=[a-z0-9])[A-Z]/gu, (capital) => ` ${capital.toLowerCase()}`);
}

/**
 * One problem as a sentence: 'headroom: expected more than 0 m, received -3 m (brief.obstacles[1].clearance.headroomM).
 * Enter a larger value.'
 */
export function sentence(problem: Problem): string {
  const unit = problem.unit === undefined ? '' : ` ${problem.unit}`;
  const place = placeOf(problem.path);
  const where = place === '' ? '' : ` (${place})`;
  const remedy = problem.remedy === '' ? remedyFor(problem.code) : problem.remedy;
  return `${subjectOf(problem.path)}: expected ${problem.expected}${unit}, received ${problem.received}${unit}${where}. ${remedy}.`;
}

/** All problems as sentences, in order. */
export function sentences(problems: readonly Problem[]): string[] {
  return problems.map(sentence);
}
