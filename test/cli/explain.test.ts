import { expect, it } from 'vitest';
import { command } from './run.ts';

it('explain(study, options/1/cost) prints value, formula and inputs; a path without a figure is refused', () => {
  const printed = command('explain', 'data/examples/low-ferry.json', 'options/1/cost');
  expect(printed.code).toBe(0);
  expect(printed.out).toContain('draws');
  const wrong = command('explain', 'data/examples/low-ferry.json', 'options/1/colour');
  expect(wrong.code).toBe(2);
  expect(wrong.err).toMatch(/expected .*received/);
}, 60_000);
