import { describe, expect, it } from 'vitest';
import { formsAsked, formsInParts, workbench } from '../../lib/index.ts';
import { outBecause } from '../../lib/appraise/proposals.ts';
import { begun, emptyGaps } from '../../notebooks/shelf/newStudy.ts';
import { lowFerry } from './studies.ts';

function newStudy(lengthM: number) {
  const made = begun({ ...emptyGaps, lengthM });
  if (!made.ok) throw new Error(made.why);
  return made.study;
}

describe('formsInParts(study)', () => {
  it.each([12, 60, 230, 900])(
    'has every form asked for once and in order, each part as many to search as all before it: %i m',
    (lengthM) => {
      const study = newStudy(lengthM);
      const bench = workbench(study);
      const parts = formsInParts(study);
      expect(parts.flat()).toEqual(formsAsked(study));
      const searched = parts.map(
        (forms) => forms.filter((form) => outBecause(bench, form).length === 0).length,
      );
      searched.slice(0, -1).reduce((before, here) => {
        expect(here).toBe(before === 0 ? 2 : before);
        return before + here;
      }, 0);
      expect(searched.at(-1)).toBeGreaterThan(0);
    },
  );

  it('is one part where two forms or fewer are asked for', () => {
    const study = lowFerry();
    const options = { ...study.options, forms: ['truss', 'composite-i'] as const };
    expect(formsInParts({ ...study, options })).toEqual([['truss', 'composite-i']]);
  });
});
