import type { Problem, ProblemCode } from '../model/index.ts';
import { placeWords } from './placeWords.ts';

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

/**
 * One problem as a sentence, its place in words: 'obstacle 2, clearance, headroom: expected more than 0 m, received -3 m.
 * Enter a larger value.'
 */
export const sentence = (problem: Problem): string => said(problem, '');

/** The same for those who have the file before them: its place in the file stands behind it. */
export function fileSentence(problem: Problem): string {
  const place = placeOf(problem.path);
  return said(problem, place === '' ? '' : ` (${place})`);
}

function said({ code, path, expected, received, unit, remedy }: Problem, where: string): string {
  const inUnit = unit === undefined ? '' : ` ${unit}`;
  const asked = `expected ${expected}${inUnit}, received ${received}${inUnit}`;
  return `${placeWords(path)}: ${asked}${where}. ${remedy === '' ? remedyFor(code) : remedy}.`;
}

/** All problems as sentences, in order. */
export function sentences(problems: readonly Problem[]): string[] {
  return problems.map(sentence);
}
