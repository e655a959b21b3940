import type { Facts, Site, WorkedOption } from '../model/index.ts';

type Known = Record<string, Facts[string]>;

/**
 * What the regrading of the existing road behind fixed ends takes: its length and the length that may be regraded, m, of
 * the end where most is lacking, and whether the road is met again. Where one of two approaches is not known, it decides
 * unless too little is known to be free behind the other.
 */
export function regradingFacts({ road }: Pick<Site, 'road'>, { profile }: WorkedOption): Known {
  const ends = (['start', 'end'] as const).flatMap((end) => {
    const behind = profile.regrading?.[end];
    if (behind === undefined || !(behind.lengthM > 0)) return [];
    const freeM = road[`${end}ApproachM`];
    const { lengthM, comesBack } = behind;
    // What is not known stands between what is lacking and what is enough.
    const lackM = freeM === 'unknown' ? 0 : lengthM - freeM;
    return [{ lengthM, comesBack, freeM, lackM }];
  });
  if (ends.length === 0) return { regradingM: 0, regradingComesBack: true };
  const worst = ends.reduce((one, other) => (other.lackM > one.lackM ? other : one));
  return {
    regradingM: worst.lengthM,
    ...(worst.freeM === 'unknown' ? {} : { regradableM: worst.freeM }),
    regradingComesBack: ends.every(({ comesBack }) => comesBack),
  };
}
