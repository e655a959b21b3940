import type { Problem, Study } from '../model/index.ts';
import { survey } from '../site/index.ts';
import { between, choiceFaults } from './keptUnits.ts';

/**
 * Why options kept by hand cannot be made as they are now asked to be, at the places of their choices in the study. Of what
 * was asked before, nothing is said: where the brief has changed since, the option is dropped with its reasons.
 */
export function choiceProblems({ brief, options }: Study, before: Study): Problem[] {
  const asked = (variant: unknown): string => JSON.stringify(variant);
  const had = new Map(before.options.kept.map(({ number, variant }) => [number, asked(variant)]));
  const anew = options.kept.filter(
    ({ number, variant }) => variant !== undefined && asked(variant) !== had.get(number),
  );
  if (anew.length === 0) return [];
  const site = survey(brief);
  return anew.flatMap((kept) => {
    const units = between(site, kept.units);
    const place = ['options', 'kept', options.kept.indexOf(kept), 'variant'];
    return units === null
      ? []
      : choiceFaults(site, { ...kept, units }).map((fault) => ({
          ...fault,
          path: [...place, ...fault.path],
        }));
  });
}
