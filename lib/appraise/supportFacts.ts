import type { Facts, ShaftInFrame, Site, Support, Unit, WorkedOption } from '../model/index.ts';

type Known = Record<string, Facts[string]>;

/** Heights of the inner piers of each unit, m, in order. */
export function pierHeights(units: readonly Unit[], supports: readonly Support[]): number[][] {
  return units.map(({ supportsM }) =>
    supports
      .filter(({ chainageM, kind }) => kind !== 'abutment' && supportsM.slice(1, -1).includes(chainageM))
      .map(({ heightM }) => heightM),
  );
}

/** Least ratio of the lower to the higher of two heights; 1 where neither stands. */
const ratio = (a: number, b: number): number => (Math.max(a, b) > 0 ? Math.min(a, b) / Math.max(a, b) : 1);

/** Design moment of a shaft in one with the deck over what it carries. */
export const bentUse = ({ designKNm, carriesKNm }: Pick<ShaftInFrame, 'designKNm' | 'carriesKNm'>): number =>
  designKNm / carriesKNm;

/** The support whose shaft in one with the deck is bent most beside what it carries; null where there is none. */
export function mostBent(supports: readonly Support[]): number | null {
  const uses = supports.map(({ articulation: { frame } }) => (frame ? bentUse(frame) : 0));
  const most = Math.max(...uses);
  return most > 0 ? uses.indexOf(most) : null;
}

/** Piers that the deck is cast in with, and the one that is bent most. */
function castInFacts(supports: readonly Support[]): Known {
  const worst = mostBent(supports);
  const { articulation: { frame } = {}, heightM = 0 } = worst === null ? {} : supports[worst]!;
  return {
    castInPiers: supports.filter(({ articulation }) => articulation.frame !== undefined).length,
    castInUse: frame ? bentUse(frame) : 0,
    castInPushMm: frame?.pushMm ?? 0,
    castInHeightM: heightM,
  };
}

/** What is known of the supports of a worked option. */
export function supportFacts(
  { seismic, waters }: Pick<Site, 'seismic' | 'waters'>,
  { supports, units }: Pick<WorkedOption, 'supports' | 'units'>,
): Known {
  const overloaded = supports.flatMap(({ foundations }) =>
    foundations.filter(({ overload = 1, odds }) => overload > 1 && odds > 0),
  );
  const piers = supports.filter(({ kind }) => kind === 'pier' || kind === 'anchor-pier');
  const heights = pierHeights(units, supports);
  const inWater = supports.filter(({ waterDepthM }) => waterDepthM > 0);
  return {
    ...castInFacts(supports),
    foundationlessOdds: Math.max(0, ...overloaded.map(({ odds }) => odds)),
    foundationOverload: Math.max(1, ...overloaded.map(({ overload = 1 }) => overload)),
    thickestShaftM: Math.max(0, ...piers.map(({ shaft }) => shaft.lengthM)),
    seismicCounted: seismic != null,
    groundAccelerationG: seismic?.groundAccelerationG ?? 'unknown',
    siteClassKnown: seismic?.siteClass != null,
    pierHeightNext: Math.min(1, ...heights.flatMap((h) => h.slice(1).map((one, i) => ratio(one, h[i]!)))),
    pierHeightAll: Math.min(
      1,
      ...heights.map((h) => (h.length > 0 ? ratio(Math.min(...h), Math.max(...h)) : 1)),
    ),
    vesselKN: Math.max(0, ...supports.map(({ articulation }) => articulation.vesselKN ?? 0)),
    vesselsKnown: inWater.every(({ chainageM: x }) =>
      waters.every(({ fromM, toM, river }) => x < fromM || x > toM || (river?.vesselDwtT ?? null) !== null),
    ),
    tieDownKN: Math.max(0, ...supports.map(({ articulation }) => articulation.tieDownKN)),
    integralAbutments: supports.filter(
      ({ kind, articulation }) => kind === 'abutment' && articulation.bearings === 0,
    ).length,
  };
}
