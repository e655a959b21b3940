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
    off: rulings.find(({ rule }) => rule === 'crane-off-water')?.effect,
    afloat: rulings.find(({ rule }) => rule === 'pick-from-water')?.effect,
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

it('appraise(no crane on land, barges) sets from the water what stands beside it, and puts out what does not', () => {
  const study = withAccess({ crane: false, barge: true });
  // The spans over the railway lie 35 m and more from the river at its ordinary level.
  for (const { method, crane, off, afloat } of rulingsOf(study))
    if (method === 'crane') expect([crane, off, afloat]).toEqual([undefined, 'out', undefined]);
  const wide: Study = {
    ...study,
    brief: { ...study.brief, waters: study.brief.waters.map((one) => ({ ...one, fromM: 1265, toM: 1445 })) },
  };
  const said = rulingsOf(wide).filter(({ method }) => method === 'crane');
  expect(said.length).toBeGreaterThan(0);
  for (const { crane, off, afloat } of said)
    expect([crane, off, afloat]).toEqual([undefined, undefined, 'caution']);
  // Nobody knows of barges: neither out nor settled.
  for (const { method, crane } of rulingsOf(withAccess({ crane: false, barge: 'unknown' })))
    if (method === 'crane') expect(crane).toBe('to confirm');
});
