import { expect, it } from 'vitest';
import type { Study } from '../../lib/index.ts';
import { lowFerry } from './studies.ts';
import { answerTo } from './answerTo.ts';

/** The worked example with composite girders alone and other access. */
const withAccess = (access: Partial<Study['brief']['access']>): Study => {
  const study = lowFerry();
  return {
    ...study,
    brief: { ...study.brief, access: { ...study.brief.access, ...access } },
    options: { ...study.options, forms: ['composite-i'] },
    books: { ...study.books, draws: 100 },
  };
};
const rulingsOf = (study: Study) =>
  answerTo(study).options.map(({ method, rulings }) => ({
    method,
    crane: rulings.find(({ rule }) => rule === 'crane-none')?.effect,
    railway: rulings.find(({ rule }) => rule === 'railway-possession')?.effect,
  }));

it('appraise(no crane) puts out what is set by crane; not knowing asks; a crane says nothing', () => {
  for (const [crane, effect] of [
    [false, 'out'],
    ['unknown', 'to confirm'],
    [true, undefined],
  ] as const)
    for (const { method, crane: said } of rulingsOf(withAccess({ crane })))
      expect(said).toBe(method === 'crane' ? effect : undefined);
});

it('appraise(over a railway) asks for possessions', () => {
  for (const { railway } of rulingsOf(withAccess({}))) expect(railway).toBe('to confirm');
});
