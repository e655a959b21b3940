import type { Appraisal } from '../../lib/index.ts';

/** JSON has no word for infinity, the radius of a straight; a figure too large to be held is read as one. */
const INFINITE = '1e999';
/** Stands for it until the text is whole. */
const WORD = 'Infinity';

/** An appraisal as text. */
export const writeAnswer = (appraisal: Appraisal): string =>
  JSON.stringify(appraisal, (_, value: unknown) => (value === Infinity ? WORD : value)).replaceAll(
    `"${WORD}"`,
    INFINITE,
  );

/** The appraisal behind a text of `writeAnswer`. */
export const readAnswer = (text: string): Appraisal => JSON.parse(text) as Appraisal;
