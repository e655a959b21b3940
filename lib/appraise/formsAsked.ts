import { sizeableForms } from '../forms/index.ts';
import type { FormId, Study } from '../model/index.ts';
import { outBecause } from './proposals.ts';
import { workbench } from './workbench.ts';

/** The forms that a study asks for, in the order in which their options are numbered. */
export const formsAsked = ({ options }: Study): readonly FormId[] =>
  options.forms.length > 0 ? options.forms : sizeableForms;

/** Forms that are searched before the first ranking: two can be compared. */
const FIRST = 2;

/**
 * The forms that a study asks for in parts, so that there is a ranking of the first while the others are searched. The parts
 * follow the order of the forms, for so an option has from the beginning the number that it keeps; each has as many forms
 * to search as all before it. Forms that are not searched cost no time and go with those before them.
 */
export function formsInParts(study: Study): readonly (readonly FormId[])[] {
  const bench = workbench(study);
  const parts: FormId[][] = [[]];
  let searched = 0;
  let full = FIRST;
  for (const form of formsAsked(study)) {
    const isSearched = outBecause(bench, form).length === 0;
    if (isSearched && searched === full) {
      parts.push([]);
      full *= 2;
    }
    if (isSearched) searched += 1;
    parts.at(-1)!.push(form);
  }
  return parts;
}
