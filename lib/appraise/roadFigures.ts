import { described, type At, type Descriptor, type Site } from '../model/index.ts';
import { roadLevelAt, type DepthAlong } from '../site/index.ts';
import { depthAt } from '../site/depthAlong.ts';
import { depthAlong } from './workOption.ts';

/** One thing that holds the road line where it is. */
type Hold =
  | { readonly by: 'clearance'; readonly limit: number; readonly chainageM: number }
  | { readonly by: 'rise'; readonly end: 'start' | 'end' }
  | { readonly by: 'gradient'; readonly sign: 1 | -1 };

const depthOf = (at: At): DepthAlong => depthAlong(at.appraisal.site, at.option.units, at.option.designs);

/** Chainages at which a soffit limit may be decided: its ends within the crossing and the bends of the depth under it. */
function placesUnder(site: Site, limit: Site['soffitLimits'][number], depth: DepthAlong): number[] {
  const from = Math.max(limit.fromM, site.startM);
  const to = Math.min(limit.toM, site.endM);
  return from <= to ? [from, to, ...depth.xM.filter((x) => x > from && x < to)] : [];
}

const TOUCHES = 1e-6;

/**
 * What holds the ends of the road: the clearance at which the line touches, and where both ends are lifted a second
 * one, or the rise or the gradient that allows no more. Empty where the line touches nothing.
 */
function holdsOn(at: At): Hold[] {
  const { site } = at.appraisal;
  const { profile } = at.option;
  const depth = depthOf(at);
  const touched = site.soffitLimits.flatMap((limit, i): Hold[] =>
    placesUnder(site, limit, depth)
      .filter((x) => Math.abs(roadLevelAt(site, profile, x) - depthAt(depth, x) - limit.levelM) < TOUCHES)
      .map((chainageM) => ({ by: 'clearance', limit: i, chainageM })),
  );
  if (touched.length === 0) return [];
  if (profile.startRiseM === 0 || profile.endRiseM === 0) return touched.slice(0, 1);
  const apart = touched.filter(
    (hold) => hold.by === 'clearance' && hold.chainageM !== (touched[0] as { chainageM: number }).chainageM,
  );
  const most = site.road.mayRiseM;
  const second: Hold | undefined =
    Math.abs(Math.abs(profile.gradient) - site.road.maxGradient) < TOUCHES
      ? { by: 'gradient', sign: profile.gradient > 0 ? 1 : -1 }
      : Math.abs(profile.startRiseM - most) < TOUCHES
        ? { by: 'rise', end: 'start' }
        : Math.abs(profile.endRiseM - most) < TOUCHES
          ? { by: 'rise', end: 'end' }
          : apart[0];
  return second === undefined ? [] : [touched[0]!, second];
}

/** Inputs of a rise: what holds the line, and the proposed road. */
function riseInputs(at: At) {
  const holds = holdsOn(at).flatMap((hold) => (hold.by === 'clearance' ? [hold] : []));
  const over = (what: string): string[] => holds.map((hold) => `${at.root}/over/${hold.chainageM}/${what}`);
  return {
    limits: holds.map((hold) => `site/soffitLimits/${hold.limit}/levelM`),
    depths: over('depthM'),
    chainages: over('chainageM'),
    start: 'site/road/startLevelM',
    end: 'site/road/endLevelM',
    from: 'site/startM',
    length: 'site/lengthM',
    mayRise: 'site/road/mayRiseM',
    steepest: 'site/road/maxGradient',
  } as const;
}

/** Rises of both ends from what holds them: one or two straight conditions a x start + b x end = need. */
function risesOf(
  v: {
    readonly limits: readonly number[];
    readonly depths: readonly number[];
    readonly chainages: readonly number[];
    readonly start: number;
    readonly end: number;
    readonly from: number;
    readonly length: number;
    readonly mayRise: number;
    readonly steepest: number;
  },
  at: At,
): { readonly start: number; readonly end: number } {
  let clear = 0;
  const rows = holdsOn(at).map((hold): readonly [number, number, number] => {
    if (hold.by === 'rise') return hold.end === 'start' ? [1, 0, v.mayRise] : [0, 1, v.mayRise];
    if (hold.by === 'gradient') return [-1, 1, hold.sign * v.steepest * v.length - (v.end - v.start)];
    const share = (v.chainages[clear]! - v.from) / v.length;
    const need = v.limits[clear]! + v.depths[clear]! - v.start - share * (v.end - v.start);
    clear += 1;
    return [1 - share, share, need];
  });
  const [one, two] = rows;
  if (one === undefined) return { start: NaN, end: NaN };
  if (two === undefined) return { start: one[2] / one[0], end: one[2] / one[1] };
  const determinant = one[0] * two[1] - one[1] * two[0];
  return {
    start: (one[2] * two[1] - two[2] * one[1]) / determinant,
    end: (one[0] * two[2] - two[0] * one[2]) / determinant,
  };
}

const fixed = (at: At, end: 'start' | 'end'): boolean => {
  const { fixedEnd } = at.appraisal.site.road;
  return fixedEnd === end || fixedEnd === 'both';
};

const rises = (end: 'start' | 'end'): Descriptor[] => {
  const path = `options/:option/profile/${end}RiseM`;
  const label = `rise of the road at the ${end}`;
  const riseOf = (at: At): number => at.option.profile[`${end}RiseM`];
  return [
    described({
      path,
      when: (at) => fixed(at, end),
      label,
      unit: 'm',
      method: 'as given',
      formula: 'this end of the road cannot move',
      inputs: () => ({ fixed: 'brief/road/fixedEnd' }),
    }),
    described({
      path,
      when: (at) => riseOf(at) > 0 && holdsOn(at).length > 0,
      label,
      unit: 'm',
      method: 'lowest line that clears',
      formula:
        'lowest soffit + construction depth = road level at the place that decides; share of the rise there by distance',
      inputs: riseInputs,
      compute: (v, at) => risesOf(v, at)[end],
    }),
    described({
      path,
      label,
      unit: 'm',
      method: 'lowest line that clears',
      formula: (at) =>
        riseOf(at) > 0
          ? 'no line clears everything: this one misses by least'
          : 'smallest sum of rises; none is needed here',
      inputs: () => ({
        mayRise: 'site/road/mayRiseM',
        limits: [],
      }),
    }),
  ];
};

const end = (which: 'start' | 'end'): Descriptor =>
  described({
    path: `options/:option/profile/${which}LevelM`,
    label: `road level at the ${which}`,
    unit: 'm',
    method: 'sum',
    formula: 'proposed level + rise',
    inputs: (at) => ({
      proposed: `site/road/${which}LevelM`,
      rise: `${at.root}/profile/${which}RiseM`,
    }),
    compute: ({ proposed, rise }) => proposed + rise,
  });

/** The road line of an option and the fill it adds. */
export const roadFigures: readonly Descriptor[] = [
  end('start'),
  end('end'),
  ...rises('start'),
  ...rises('end'),
  described({
    path: 'options/:option/profile/gradient',
    label: 'gradient of the road',
    unit: '',
    method: 'ratio',
    formula: '(level at the end - level at the start) / length',
    inputs: (at) => ({
      end: `${at.root}/profile/endLevelM`,
      start: `${at.root}/profile/startLevelM`,
      length: 'site/lengthM',
    }),
    compute: ({ end, start, length }) => (end - start) / length,
  }),
  described({
    path: 'options/:option/profile/addedFillM3',
    label: 'fill added by lifting the road',
    unit: 'm3',
    method: 'closed form',
    formula: 'both ends: (W (h1^2 - h0^2) / 2 + s (h1^3 - h0^3) / 3) / g, h0 and h1 heights before and after',
    inputs: (at) => ({
      width: 'site/deck/widthM',
      slope: 'site/road/fillSideSlope',
      gradient: 'site/road/maxGradient',
      proposed: ['site/road/startLevelM', 'site/road/endLevelM'],
      ground: [
        `${at.root}/supports/0/groundLevelM`,
        `${at.root}/supports/${at.option.supports.length - 1}/groundLevelM`,
      ],
      rise: [`${at.root}/profile/startRiseM`, `${at.root}/profile/endRiseM`],
    }),
    compute: (v) =>
      [0, 1].reduce((total, i) => {
        const before = v.proposed[i]! - v.ground[i]!;
        const h0 = Math.max(0, before);
        const h1 = Math.max(0, before + v.rise[i]!);
        return (
          total + ((v.width * (h1 ** 2 - h0 ** 2)) / 2 + (v.slope * (h1 ** 3 - h0 ** 3)) / 3) / v.gradient
        );
      }, 0),
  }),
];
