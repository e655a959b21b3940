import type { Facts, WorkedOption } from '../model/index.ts';

type Known = Record<string, Facts[string]>;

/** What is known of the supports of a worked option. */
export function supportFacts({ supports }: Pick<WorkedOption, 'supports'>): Known {
  const overloaded = supports.flatMap(({ foundations }) =>
    foundations.filter(({ overload = 1, odds }) => overload > 1 && odds > 0),
  );
  const shafts = supports.flatMap(({ kind, shaft }) =>
    kind === 'pier' || kind === 'anchor-pier' ? [shaft.lengthM] : [],
  );
  return {
    foundationlessOdds: Math.max(0, ...overloaded.map(({ odds }) => odds)),
    foundationOverload: Math.max(1, ...overloaded.map(({ overload = 1 }) => overload)),
    thickestShaftM: Math.max(0, ...shafts),
  };
}
