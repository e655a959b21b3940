import type { Appraisal } from '../../lib/index.ts';

/** JSON has no infinity; the radius of a straight is one. */
const INFINITE = 'Infinity';

/** An appraisal as text. */
export const writeAnswer = (appraisal: Appraisal): string =>
  JSON.stringify(appraisal, (_, value: unknown) => (value === Infinity ? INFINITE : value));

/** The appraisal behind a text of `writeAnswer`. */
export const readAnswer = (text: string): Appraisal =>
  JSON.parse(text, (_, value: unknown) => (value === INFINITE ? Infinity : value)) as Appraisal;
