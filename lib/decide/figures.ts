import { described, type At, type Descriptor } from '../model/index.ts';

const cost = (option: string | number): string => `options/${option}/cost/p50`;
const draws = { draws: 'books/draws', seed: 'books/seed' } as const;

/** Options in the order of their median cost, as they are compared. */
const order = (at: At): number[] => at.appraisal.options.map(({ number }) => number);
/** Odds are counted of an option against those after it; none has odds against itself. */
const isBefore = (at: At, first: string, second: string): boolean => {
  const place = (name: string): number => order(at).indexOf(at.index(name));
  return place(first) >= 0 && place(first) < place(second);
};
const oddsLabel = (at: At): string =>
  `odds that option ${at.name('a')} is cheaper than option ${at.name('b')}`;

/** Where the options stand. */
export const standingFigures: readonly Descriptor[] = [
  described({
    path: 'standing/odds/:a/:b',
    when: (at) => isBefore(at, 'a', 'b'),
    label: oddsLabel,
    unit: '',
    method: 'count of draws',
    formula: 'draws in which it is cheaper / all draws, on the same draws for both; equal draws count half',
    inputs: (at) => ({ costs: [cost(at.name('a')), cost(at.name('b'))], ...draws }),
  }),
  described({
    path: 'standing/odds/:a/:b',
    when: (at) => isBefore(at, 'b', 'a'),
    label: oddsLabel,
    unit: '',
    method: 'difference',
    formula: '1 - odds of the other',
    inputs: (at) => ({ other: `standing/odds/${at.name('b')}/${at.name('a')}` }),
    compute: ({ other }) => 1 - other,
  }),
  described({
    path: 'standing/within/:option',
    label: (at) => `chance that option ${at.name('option')} stays within the budget`,
    unit: '',
    method: 'count of draws',
    formula: 'draws that cost no more than the budget / all draws',
    inputs: (at) => ({ budget: 'brief/budget/amount', cost: cost(at.name('option')), ...draws }),
  }),
  described({
    path: 'standing/leader',
    label: 'option that leads',
    unit: '',
    method: 'lowest median',
    formula: 'lowest median cost of the options that no rule puts out',
    inputs: (at) => ({
      costs: order(at).map(cost),
      status: order(at).map((number) => `options/${number}/status`),
    }),
  }),
  described({
    path: 'standing/groups/:group',
    label: (at) => `options that cannot be separated, group ${at.index('group') + 1}`,
    unit: '',
    method: 'pairs by odds',
    formula: 'run in order of cost in which the odds of every pair lie between the two limits',
    value: (at) => at.appraisal.standing.groups[at.index('group')]?.join(', ') ?? null,
    inputs: (at) => {
      const group = at.appraisal.standing.groups[at.index('group')] ?? [];
      return {
        odds: group.flatMap((a, i) => group.slice(i + 1).map((b) => `standing/odds/${a}/${b}`)),
        limits: ['books/unseparated/0', 'books/unseparated/1'],
      };
    },
  }),
];
