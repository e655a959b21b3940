import type { At, Descriptor } from '../model/index.ts';
import { fact } from './factFigure.ts';

/** Odds of the grounds on which a foundation does not stand, and their overloads. */
const overloads = (at: At): { readonly odds: string[]; readonly overloads: string[] } => {
  const failing = at.option.supports.flatMap(({ foundations }, s) =>
    foundations.flatMap(({ overload = 1, odds }, f) =>
      overload > 1 && odds > 0 ? [`${at.root}/supports/${s}/foundations/${f}`] : [],
    ),
  );
  return {
    odds: failing.map((path) => `${path}/odds`),
    overloads: failing.map((path) => `${path}/overload`),
  };
};

/** What the rules are told of the supports. */
export const supportFactFigures: readonly Descriptor[] = [
  fact(
    'foundationlessOdds',
    'greatest odds of a ground on which nothing carries a support; once all stand, 0',
    (at) => ({ odds: overloads(at).odds }),
    ({ odds }) => Math.max(0, ...odds),
  ),
  fact(
    'foundationOverload',
    'greatest overload of a group of piles; once all stand, 1',
    (at) => ({ overloads: overloads(at).overloads }),
    ({ overloads: all }) => Math.max(1, ...all),
  ),
  fact(
    'thickestShaftM',
    'greatest of the piers; once there are none, 0',
    (at) => ({
      shafts: at.option.supports.flatMap(({ kind }, s) =>
        kind === 'pier' || kind === 'anchor-pier' ? [`${at.root}/supports/${s}/shaft/lengthM`] : [],
      ),
    }),
    ({ shafts }) => Math.max(0, ...shafts),
  ),
];
