import { appraise, askedOf } from '../../lib/index.ts';
import { exampleNames } from '../exampleNames.ts';
import { workedExample } from '../examples.ts';
import { writeAnswer } from './answerText.ts';

/** Works out the examples of the shelf: while the pages are built, by the code they are built with. */
export const workExamples = (): { readonly name: string; readonly text: string }[] =>
  exampleNames.map((name) => ({ name, text: writeAnswer(appraise(askedOf(workedExample(name)))) }));
