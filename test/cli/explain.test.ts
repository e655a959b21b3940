import { expect, it } from 'vitest';
import { explainCommand } from '../../lib/cli/explain.ts';
import { changedExample } from './exampleFile.ts';
import { answer } from './run.ts';

it('explain(study, options/1/cost) prints value, formula and inputs; a path without a figure is refused', () => {
  const file = changedExample((study) =>
    Object.assign(study['options']!, { forms: ['composite-i'], workOutAnyway: [] }),
  );
  const printed = answer(explainCommand, `${file} options/1/cost`);
  expect(printed.code).toBe(0);
  expect(printed.out).toContain('draws');
  const wrong = answer(explainCommand, `${file} options/1/colour`);
  expect(wrong.code).toBe(2);
  expect(wrong.err).toMatch(/expected .*received/);
});

it('explain(study, path) says of a start value that nobody has confirmed it, and of others nothing', () => {
  const file = changedExample((study) => {
    Object.assign(study['options']!, { forms: ['composite-i'], workOutAnyway: [] });
    Object.assign(study, { assumed: ['brief.deck.2.widthM'] });
  });
  const printed = answer(explainCommand, `${file} brief/deck/2/widthM brief/deck/3/widthM`);
  expect(JSON.parse(printed.out)).toMatchObject([
    { kind: 'preset', because: { method: 'preset: start value, not confirmed' } },
    { kind: 'typed', because: { method: 'typed' } },
  ]);
});
