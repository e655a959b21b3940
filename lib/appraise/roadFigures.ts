import { described, type At, type Descriptor, type Site } from '../model/index.ts';
import { roadLevelAt, type DepthAlong } from '../site/index.ts';
import { depthAt } from '../site/depthAlong.ts';
import { regradingFigures } from './regradingFigures.ts';
import { depthAlong } from './workOption.ts';

/** A clearance that the soffit touches, and where. */
interface Touch {
  readonly limit: number;
  readonly chainageM: number;
}

const ends = ['start', 'end'] as const;
type End = (typeof ends)[number];

const depthOf = (at: At): DepthAlong => depthAlong(at.site, at.option.units, at.option.designs);

/** Chainages at which a soffit limit may be decided: its ends within the crossing and the bends of the depth under it. */
function placesUnder(site: Site, limit: Site['soffitLimits'][number], depth: DepthAlong): number[] {
  const from = Math.max(limit.fromM, site.startM);
  const to = Math.min(limit.toM, site.endM);
  return from <= to ? [from, to, ...depth.xM.filter((x) => x > from && x < to)] : [];
}

const TOUCHES = 1e-6;

/** The clearance that holds the road up: the first at which the soffit touches inside the crossing; null where none does. */
function touchOn(at: At): Touch | null {
  const { site } = at;
  const { profile } = at.option;
  const depth = depthOf(at);
  for (const [i, limit] of site.soffitLimits.entries()) {
    const chainageM = placesUnder(site, limit, depth).find(
      (x) => Math.abs(roadLevelAt(profile, x) - depthAt(depth, x) - limit.levelM) < TOUCHES,
    );
    if (chainageM !== undefined) return { limit: i, chainageM };
  }
  return null;
}

const fixed = (at: At, end: End): boolean => {
  const { fixedEnd } = at.site.road;
  return fixedEnd === end || fixedEnd === 'both';
};

const riseOf = (at: At, end: End): number => at.option.profile[`${end}RiseM`];
const other = (end: End): End => (end === 'start' ? 'end' : 'start');

/** Whether the road between the ends of the crossing is one line: straight, or one arc from end to end. */
function oneLine(at: At): boolean {
  const { startM, endM } = at.appraisal.site;
  return at.option.profile.pieces.some(({ fromM, toM }) => fromM === startM && toM === endM);
}

/** What a road that touches a clearance is worked out from. */
function touchInputs(at: At) {
  const touch = touchOn(at)!;
  const over = `${at.root}/over/${touch.chainageM}`;
  return {
    limit: `site/soffitLimits/${touch.limit}/levelM`,
    depth: `${over}/depthM`,
    x: `${over}/chainageM`,
    start: 'site/road/startLevelM',
    end: 'site/road/endLevelM',
    from: 'site/startM',
    length: 'site/lengthM',
  } as const;
}

type TouchValues = { readonly [K in keyof ReturnType<typeof touchInputs>]: number };

/** Height that the proposed road lacks at the place that decides, m, and its distance from both ends. */
function shortage(v: TouchValues): { readonly shortM: number; readonly a: number; readonly b: number } {
  const a = v.x - v.from;
  const shortM = v.limit + v.depth - v.start - ((v.end - v.start) * a) / v.length;
  return { shortM, a, b: v.length - a };
}

/** Inputs of what is found by search. */
const searched = (at: At) => {
  const touch = touchOn(at);
  return {
    limits: touch === null ? [] : [`site/soffitLimits/${touch.limit}/levelM`],
    proposed: ['site/road/startLevelM', 'site/road/endLevelM'],
    mayRise: 'site/road/mayRiseM',
    steepest: 'site/road/maxGradient',
    crest: 'site/roadCurves/crestRadiusM',
  } as const;
};

const rises = (end: End): Descriptor[] => {
  const path = `options/:option/profile/${end}RiseM`;
  const label = `rise of the road at the ${end}`;
  const method = 'lowest road that clears';
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
      when: (at) =>
        riseOf(at, end) > 0 && riseOf(at, other(end)) === 0 && oneLine(at) && touchOn(at) !== null,
      label,
      unit: 'm',
      method,
      formula:
        'height that the proposed road lacks at the place that decides, less that of the crest there (a b / 2R), by its share of the distance',
      inputs: (at) => ({
        ...touchInputs(at),
        radius: at.option.profile.crestRadiusM === null ? [] : [`${at.root}/profile/crestRadiusM`],
      }),
      compute: ({ radius, ...v }) => {
        const { shortM, a, b } = shortage(v);
        const [R] = radius;
        return (shortM - (R === undefined ? 0 : (a * b) / (2 * R))) / ((end === 'start' ? b : a) / v.length);
      },
    }),
    described({
      path,
      label,
      unit: 'm',
      method,
      formula: (at) =>
        riseOf(at, end) > 0
          ? 'as little as the clearance, the gradients and the crest allow; shared between free ends so that their fill is least'
          : 'none is needed here',
      inputs: searched,
    }),
  ];
};

const level = (end: End): Descriptor =>
  described({
    path: `options/:option/profile/${end}LevelM`,
    label: `road level at the ${end}`,
    unit: 'm',
    method: 'sum',
    formula: 'proposed level + rise',
    inputs: (at) => ({
      proposed: `site/road/${end}LevelM`,
      rise: `${at.root}/profile/${end}RiseM`,
    }),
    compute: ({ proposed, rise }) => proposed + rise,
  });

const crestPath = 'options/:option/profile/crestRadiusM';
const crestLabel = 'radius of the crest between the abutments';

const crest: readonly Descriptor[] = [
  described({
    path: crestPath,
    when: (at) => at.option.profile.easedFor !== undefined,
    label: crestLabel,
    unit: 'm',
    method: 'cheapest of the lowest road and those that spare a curve',
    formula: (at) =>
      `length / (2 x |gradient of the existing road behind the ${at.option.profile.easedFor!} - mean gradient|), at least the least radius: sharper than the clearances ask for, as the regrading it spares costs more than the height`,
    inputs: (at) => ({
      held: `site/road/${at.option.profile.easedFor!}Gradient`,
      mean: `${at.root}/profile/gradient`,
      length: 'site/lengthM',
      least: 'site/roadCurves/crestRadiusM',
    }),
    compute: ({ held, mean, length, least }) => Math.max(least, length / (2 * Math.abs(held - mean))),
  }),
  described({
    path: crestPath,
    when: (at) => riseOf(at, 'start') + riseOf(at, 'end') === 0 && oneLine(at) && touchOn(at) !== null,
    label: crestLabel,
    unit: 'm',
    method: 'flattest that clears',
    formula:
      'a b / (2 x height that the straight road lacks at the place that decides), a and b from the ends',
    inputs: (at) => ({ ...touchInputs(at), least: 'site/roadCurves/crestRadiusM' }),
    compute: ({ least, ...v }) => {
      const { shortM, a, b } = shortage(v);
      return Math.max(least, (a * b) / (2 * shortM));
    },
  }),
  described({
    path: crestPath,
    label: crestLabel,
    unit: 'm',
    method: 'flattest that clears',
    formula: (at) =>
      at.option.profile.crestRadiusM === null
        ? 'the road runs straight'
        : 'as flat as the clearances allow between ends at these levels, no sharper than the least radius',
    inputs: searched,
  }),
];

const pieceFields = {
  fromM: ['start', 'm'],
  toM: ['end', 'm'],
  levelM: ['level at the start', 'm'],
  gradient: ['gradient at the start', ''],
  curvature1PerM: ['change of gradient per metre', '1/m'],
} as const;

/** The road piece by piece: each follows from the levels at the abutments, the crest between them and the least curves. */
const pieces = (Object.keys(pieceFields) as (keyof typeof pieceFields)[]).map((field) =>
  described({
    path: `options/:option/profile/pieces/:piece/${field}`,
    label: (at) => `${pieceFields[field][0]} of stretch ${at.index('piece') + 1} of the road`,
    unit: pieceFields[field][1],
    method: 'vertical alignment',
    formula: (at) => {
      const { startM, endM } = at.appraisal.site;
      const piece = at.option.profile.pieces[at.index('piece')]!;
      const isFixed = fixed(at, piece.fromM < startM ? 'start' : 'end');
      return piece.fromM >= startM && piece.toM <= endM
        ? 'between the abutments: straight, or over the crest that their levels leave room for'
        : isFixed
          ? 'regraded existing road: tangent at the abutment, through a curve past the gradient of the road and a curve back onto it'
          : 'approach: tangent at the abutment, over a crest to the limiting gradient, through a sag to the ground or the tie-in';
    },
    inputs: (at) => ({
      levels: ends.map((end) => `${at.root}/profile/${end}LevelM`),
      crest: at.option.profile.crestRadiusM === null ? [] : [`${at.root}/profile/crestRadiusM`],
      least: ['site/roadCurves/crestRadiusM', 'site/roadCurves/sagRadiusM'],
      steepest: 'site/road/maxGradient',
    }),
  }),
);

/** Stretches of the road between the abutments. */
const between = (at: At, field: string): string[] => {
  const { startM, endM } = at.appraisal.site;
  return at.option.profile.pieces.flatMap(({ fromM, toM }, i) =>
    fromM >= startM && toM <= endM ? [`${at.root}/profile/pieces/${i}/${field}`] : [],
  );
};

const approachFields = {
  lengthM: ['length', 'm', 'from the abutment to where the road meets the ground, or to its tie-in'],
  fillM3: ['fill', 'm3', 'W h + s h^2 across with side slopes, W h between walls, summed along the approach'],
  wallM2: [
    'face of the retaining walls',
    'm2',
    '2 h summed along an approach between walls; 0 with side slopes',
  ],
} as const;

const approaches = (Object.keys(approachFields) as (keyof typeof approachFields)[]).map((field) =>
  described({
    path: `options/:option/profile/approaches/:end/${field}`,
    label: (at) => `${approachFields[field][0]} of the ${at.name('end')} approach`,
    unit: approachFields[field][1],
    method: 'integration over the ground',
    formula: (at) => {
      const as = fixed(at, at.name('end') as End)
        ? ', along the road as proposed, which cannot move here'
        : '';
      return `${approachFields[field][2]}${as}; ground beyond the survey taken as level`;
    },
    inputs: (at) => {
      const end = at.name('end') as End;
      const { groundZ } = at.site;
      return {
        level: fixed(at, end) ? `site/road/${end}LevelM` : `${at.root}/profile/${end}LevelM`,
        ground: `${at.root}/supports/${end === 'start' ? 0 : at.option.supports.length - 1}/groundLevelM`,
        beyond: `site/groundZ/${end === 'start' ? 0 : groundZ.length - 1}`,
        width: 'site/deck/widthM',
        slope: 'site/road/fillSideSlope',
        gradient: 'site/road/maxGradient',
        curves: ['site/roadCurves/crestRadiusM', 'site/roadCurves/sagRadiusM'],
        sides: 'brief/road/approachSides',
        tieIn: `brief/road/${end}TieIn`,
        reach: `brief/road/${end}ApproachM`,
        abutment: at.option.startM === undefined ? [] : [at.ends[end], `site/${end}M`],
      } as const;
    },
  }),
);

/** The road of an option, its approaches and what they take. */
export const roadFigures: readonly Descriptor[] = [
  level('start'),
  level('end'),
  ...rises('start'),
  ...rises('end'),
  described({
    path: 'options/:option/profile/gradient',
    label: 'gradient of the road from abutment to abutment',
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
    path: 'options/:option/profile/steepestGradient',
    label: 'steepest gradient between the abutments',
    unit: '',
    method: 'greatest',
    formula: 'gradients at both ends of each stretch, either way',
    inputs: (at) => ({
      gradients: between(at, 'gradient'),
      bends: between(at, 'curvature1PerM'),
      from: between(at, 'fromM'),
      to: between(at, 'toM'),
    }),
    compute: ({ gradients, bends, from, to }) =>
      Math.max(
        ...gradients.flatMap((gradient, i) => [
          Math.abs(gradient),
          Math.abs(gradient + bends[i]! * (to[i]! - from[i]!)),
        ]),
      ),
  }),
  ...crest,
  ...pieces,
  ...approaches,
  ...regradingFigures,
  described({
    path: 'options/:option/profile/addedFillM3',
    label: 'fill of the approaches over that of the proposed road',
    unit: 'm3',
    method: 'difference',
    formula: 'start and end: fill of the approach - fill with the road as proposed',
    inputs: (at) => ({
      fill: ends.map((end) => `${at.root}/profile/approaches/${end}/fillM3`),
      proposed: ends.map((end) =>
        at.option.startM === undefined ? `site/proposedFill/${end}` : `${at.root}/proposedFill/${end}`,
      ),
    }),
    compute: ({ fill, proposed }) => fill[0]! - proposed[0]! + (fill[1]! - proposed[1]!),
  }),
];
