import { described, type At, type Descriptor } from '../model/index.ts';
import type { RoadEnd } from './approachEnd.ts';
import { proposedApproaches } from './innerApproach.ts';
import { curveRow } from './roadCurves.ts';
import { alongSupportsM, cosineOfSkew } from './skew.ts';

/** A figure of the site that is one of the brief, read on. */
const copied = (path: string, from: (at: At) => string, label: string, unit = ''): Descriptor =>
  described({
    path,
    label,
    unit,
    method: 'as given',
    formula: 'read from the brief',
    inputs: (at) => ({ given: from(at) }),
    compute: ({ given }) => given,
  });

/** Where the brief says what a soffit limit is measured from: a clearance, or else a flood. */
function limitBehind(
  at: At,
): { readonly clearance: string } | { readonly water: string; readonly known: boolean } {
  const { obstacles, waters } = at.study.brief;
  const cleared = obstacles.flatMap((obstacle, i) => (obstacle.clearance === null ? [] : [i]));
  const index = at.index('i');
  const obstacle = cleared[index];
  if (obstacle !== undefined) return { clearance: `brief/obstacles/${obstacle}/clearance` };
  const water = index - cleared.length;
  return { water: `brief/waters/${water}`, known: waters[water]?.floodLevelM !== 'unknown' };
}

function limitLevels(at: At): {
  readonly datum: string;
  readonly above: string;
  readonly afflux: readonly string[];
} {
  const behind = limitBehind(at);
  if ('clearance' in behind)
    return { datum: `${behind.clearance}/datumLevelM`, above: `${behind.clearance}/headroomM`, afflux: [] };
  return {
    datum: `${behind.water}/${behind.known ? 'floodLevelM' : 'levelM'}`,
    above: `${behind.water}/freeboardM`,
    afflux:
      behind.known &&
      at.study.brief.waters[Number(behind.water.split('/').at(-1))]?.allowedAffluxM !== 'unknown'
        ? [`${behind.water}/allowedAffluxM`]
        : [],
  };
}

const limitEnd = (at: At, end: 'from' | 'to'): string => {
  const behind = limitBehind(at);
  return 'clearance' in behind
    ? `${behind.clearance}/${end}M`
    : `${behind.water}/flood${end === 'from' ? 'From' : 'To'}M`;
};

/** Where the brief says something of a zone. */
const zoneInBrief = (at: At, what: 'fromM' | 'toM' | 'pierPremium'): string => {
  const barring = at.study.brief.obstacles.flatMap((obstacle, i) =>
    obstacle.supports === 'none' ? [] : [i],
  );
  return `brief/obstacles/${barring[at.index('i')]}/${what}`;
};

/** Ends of the barred stretches that run into one another under the main opening. */
function openingEnds(at: At, end: 'fromM' | 'toM'): string[] {
  const { zones, mainOpening } = at.appraisal.site;
  return zones.flatMap((zone, i) =>
    mainOpening !== null && zone.hard && zone.fromM <= mainOpening.toM && zone.toM >= mainOpening.fromM
      ? [`site/zones/${i}/${end}`]
      : [],
  );
}

const limitName = (at: At): string => at.appraisal.site.soffitLimits[at.index('i')]!.reason;
const zoneName = (at: At): string => at.appraisal.site.zones[at.index('i')]!.name;

/** Least radius of a vertical curve: as the brief gives it, or by the design speed. */
const curve = (kind: 'crest' | 'sag'): Descriptor[] => {
  const path = `site/roadCurves/${kind}RadiusM`;
  const label = `least radius of a ${kind}`;
  return [
    {
      ...copied(path, () => `brief/road/${kind}RadiusM`, label, 'm'),
      when: (at) => at.study.brief.road[`${kind}RadiusM`] !== 'unknown',
    },
    described({
      path,
      label,
      unit: 'm',
      method: 'by the design speed',
      formula:
        'R = 100 K: K metres of curve for each per cent of change in gradient, at the speed or the next above it',
      inputs: (at) => {
        const { brief } = at.study;
        const { designSpeedKmh } = brief.road;
        const row = curveRow(designSpeedKmh, brief.loading);
        return {
          K: `data/road/${brief.loading}/speeds/${row.id}/${kind}Curve`,
          speed: designSpeedKmh === 'unknown' ? 'data/road/unknownSpeedKmh' : 'brief/road/designSpeedKmh',
          asked: `brief/road/${kind}RadiusM`,
        };
      },
      compute: ({ K }) => 100 * K,
    }),
  ];
};

/** The site as the later stages read it, figure by figure. */
export const siteFigures: readonly Descriptor[] = [
  copied('site/startM', () => 'brief/crossing/startM', 'start of the crossing', 'm'),
  copied('site/endM', () => 'brief/crossing/endM', 'end of the crossing', 'm'),
  described({
    path: 'site/lengthM',
    label: 'length of the crossing',
    unit: 'm',
    method: 'difference',
    formula: 'end chainage - start chainage',
    inputs: () => ({ end: 'brief/crossing/endM', start: 'brief/crossing/startM' }),
    compute: ({ end, start }) => end - start,
  }),
  ...(['startLatestM', 'endEarliestM'] as const).map((which) =>
    described({
      path: `site/windows/${which}`,
      label: `innermost place of the ${which === 'startLatestM' ? 'start' : 'end'} abutment`,
      unit: 'm',
      method: 'as given',
      formula: 'read from the brief; where it is not given, the end of the crossing',
      inputs: (at) => ({
        given: at.study.brief.crossing[which] === undefined ? [] : [`brief/crossing/${which}`],
        end: which === 'startLatestM' ? 'brief/crossing/startM' : 'brief/crossing/endM',
      }),
    }),
  ),
  copied(
    'site/seismic/groundAccelerationG',
    () => 'brief/crossing/groundAccelerationG',
    'design ground acceleration, share of gravity',
  ),
  described({
    path: 'site/seismic/siteClass',
    label: 'site class',
    unit: '',
    method: 'as given',
    formula: 'read from the brief',
    inputs: () => ({ given: 'brief/crossing/siteClass' }),
  }),
  copied(
    'site/groundX/:i',
    (at) => `brief/crossing/ground/${at.name('i')}/chainageM`,
    'chainage of a ground point',
    'm',
  ),
  copied('site/groundZ/:i', (at) => `brief/crossing/ground/${at.name('i')}/levelM`, 'ground level', 'm'),
  ...(['fromM', 'toM'] as const).map((end) =>
    described({
      path: `site/zones/:i/${end}`,
      label: (at) => `${end === 'fromM' ? 'start' : 'end'} of the stretch barred by ${zoneName(at)}`,
      unit: 'm',
      method: 'as given',
      formula: 'read from the brief',
      inputs: (at) => ({ given: zoneInBrief(at, end) }),
      compute: ({ given }) => given,
    }),
  ),
  described({
    path: 'site/zones/:i/pierPremium',
    label: (at) => `sum for a support in ${zoneName(at)}, ${at.study.books.currency}`,
    unit: '',
    method: 'as given',
    formula: 'read from the brief',
    inputs: (at) => ({ given: zoneInBrief(at, 'pierPremium') }),
    compute: ({ given }) => given,
  }),
  described({
    path: 'site/soffitLimits/:i/levelM',
    label: (at) => `lowest soffit: ${limitName(at)}`,
    unit: 'm',
    method: 'sum',
    formula: (at) =>
      'clearance' in limitBehind(at) ? 'level below + headroom' : 'water level + freeboard + allowed afflux',
    inputs: limitLevels,
    compute: ({ datum, above, afflux }) => datum + above + (afflux[0] ?? 0),
  }),
  ...(['from', 'to'] as const).map((end) =>
    described({
      path: `site/soffitLimits/:i/${end}M`,
      label: (at) => `${end === 'from' ? 'start' : 'end'} of the soffit limit: ${limitName(at)}`,
      unit: 'm',
      method: 'as given',
      formula: 'read from the brief',
      inputs: (at) => ({ given: limitEnd(at, end) }),
      compute: ({ given }) => given,
    }),
  ),
  ...(['fromM', 'toM', 'levelM', 'floodLevelM'] as const).map((field) =>
    copied(`site/waters/:i/${field}`, (at) => `brief/waters/${at.name('i')}/${field}`, 'water', 'm'),
  ),
  ...(
    [
      ['floodFromM', 'start of the flood', 'm'],
      ['floodToM', 'end of the flood', 'm'],
      ['freeboardM', 'freeboard', 'm'],
      ['flowM3s', 'design flood flow', 'm3/s'],
      ['velocityMs', 'mean velocity of the flood', 'm/s'],
      ['allowedAffluxM', 'allowed afflux', 'm'],
      ['grainMm', 'median grain of the bed', 'mm'],
      ['siltFactor', 'silt factor', ''],
      ['vesselDwtT', 'largest vessel', 't'],
      ['vesselSpeedMs', 'speed of the largest vessel', 'm/s'],
    ] as const
  ).map(([field, label, unit]) =>
    copied(`site/waters/:i/river/${field}`, (at) => `brief/waters/${at.name('i')}/${field}`, label, unit),
  ),
  copied(
    'site/groundStretches/:i/fromM',
    (at) => `brief/groundStretches/${at.name('i')}/fromM`,
    'start of a ground stretch',
    'm',
  ),
  copied(
    'site/groundStretches/:i/toM',
    (at) => `brief/groundStretches/${at.name('i')}/toM`,
    'end of a ground stretch',
    'm',
  ),
  ...(
    [
      ['odds', 'odds of a ground class', ''],
      ['bearingLevelM', 'bearing level of a ground class', 'm'],
      ['bearingDepthM', 'depth below the ground at which a ground class bears', 'm'],
    ] as const
  ).map(([field, label, unit]) =>
    copied(
      `site/groundStretches/:i/classes/:c/${field}`,
      (at) => `brief/groundStretches/${at.name('i')}/classes/${at.name('c')}/${field}`,
      label,
      unit,
    ),
  ),
  copied('site/road/startLevelM', () => 'brief/road/startLevelM', 'proposed road level at the start', 'm'),
  copied('site/road/endLevelM', () => 'brief/road/endLevelM', 'proposed road level at the end', 'm'),
  copied('site/road/mayRiseM', () => 'brief/road/mayRiseM', 'rise allowed at a free end', 'm'),
  copied('site/road/maxGradient', () => 'brief/road/maxGradient', 'steepest gradient'),
  copied('site/road/fillSideSlope', () => 'brief/road/fillSideSlope', 'side slope of fill'),
  copied('site/road/designSpeedKmh', () => 'brief/road/designSpeedKmh', 'design speed', 'km/h'),
  ...(['start', 'end'] as const).map((end) =>
    copied(
      `site/road/${end}ApproachM`,
      () => `brief/road/${end}ApproachM`,
      `length of the ${end} approach`,
      'm',
    ),
  ),
  ...(['start', 'end'] as const).map((end) =>
    copied(
      `site/road/${end}Gradient`,
      () => `brief/road/${end}Gradient`,
      `gradient of the existing road behind the ${end}`,
    ),
  ),
  ...curve('crest'),
  ...curve('sag'),
  ...(['site', 'options/:option'] as const).map((root) =>
    described({
      path: `${root}/proposedFill/:end`,
      label: (at) => `fill of the ${at.name('end')} approach with the road as proposed`,
      unit: 'm3',
      method: 'integration over the ground',
      formula: 'W h + s h^2 across with side slopes, W h between walls, summed along the approach',
      value: (at) => proposedApproaches(at.site)[at.name('end') as RoadEnd].fillM3,
      inputs: (at) => {
        const end = at.name('end');
        return {
          levels: ['site/road/startLevelM', 'site/road/endLevelM'],
          ground: `site/groundZ/${end === 'start' ? 0 : at.site.groundZ.length - 1}`,
          width: 'site/deck/widthM',
          slope: 'site/road/fillSideSlope',
          gradient: 'site/road/maxGradient',
          curves: ['site/roadCurves/crestRadiusM', 'site/roadCurves/sagRadiusM'],
          sides: 'brief/road/approachSides',
          abutment: at.ends[end as RoadEnd],
        } as const;
      },
    }),
  ),
  described({
    path: 'site/planRadiusM',
    label: 'plan radius',
    unit: 'm',
    method: 'as given',
    formula: 'read from the brief; a straight has an infinite radius',
    inputs: () => ({ given: 'brief/crossing/planRadiusM' }),
  }),
  copied('site/skewDeg', () => 'brief/crossing/skewDeg', 'skew of the supports', 'deg'),
  described({
    path: 'site/alongSupportsM',
    label: 'width of the deck along the supports',
    unit: 'm',
    method: 'quotient',
    formula: 'deck width / cos of the skew; square where the skew is not known',
    inputs: () => ({ width: 'site/deck/widthM', skew: 'site/skewDeg' }),
    value: (at) => alongSupportsM(at.site),
    compute: ({ width, skew }) => width / cosineOfSkew(Number.isFinite(skew) ? skew : null),
  }),
  described({
    path: 'site/mainOpening/fromM',
    label: 'start of the main opening',
    unit: 'm',
    method: 'widest barred stretch',
    formula: 'start of the first of the barred stretches that run into one another, within the crossing',
    inputs: (at) => ({ zones: openingEnds(at, 'fromM'), start: 'site/startM' }),
    compute: ({ zones, start }) => Math.max(start, Math.min(...zones)),
  }),
  described({
    path: 'site/mainOpening/toM',
    label: 'end of the main opening',
    unit: 'm',
    method: 'widest barred stretch',
    formula: 'end of the last of the barred stretches that run into one another, within the crossing',
    inputs: (at) => ({ zones: openingEnds(at, 'toM'), end: 'site/endM' }),
    compute: ({ zones, end }) => Math.min(end, Math.max(...zones)),
  }),
  described({
    path: 'site/mainOpening/widthM',
    label: 'main opening: widest stretch barred to supports',
    unit: 'm',
    method: 'difference',
    formula: 'end - start',
    inputs: () => ({ to: 'site/mainOpening/toM', from: 'site/mainOpening/fromM' }),
    compute: ({ to, from }) => to - from,
  }),
];
