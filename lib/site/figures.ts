import { described, type At, type Descriptor, type StripKind } from '../model/index.ts';
import { CROSSFALL } from './constructionDepth.ts';
import { BARRIER_LINE_KN_M, carriage, FOOTWAY_KN_M2, raised, railed, SURFACING_KN_M3 } from './deckSpec.ts';

const sum = (values: readonly number[]): number => values.reduce((total, value) => total + value, 0);

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

/** A figure of practice written in the code of the site. */
const practice = (name: string, value: number, label: string, unit: string, source: string): Descriptor =>
  described({
    path: `practice/site/${name}`,
    label,
    unit,
    kind: 'preset',
    method: 'figure of practice',
    formula: 'taken as it is',
    value: () => value,
    sources: [source],
  });

const strips = (at: At, kinds?: ReadonlySet<StripKind>): string[] =>
  at.study.brief.deck.flatMap((strip, i) =>
    kinds === undefined || kinds.has(strip.kind) ? [`brief/deck/${i}/widthM`] : [],
  );

/** Strips from the left edge to the first and to the last lane or shoulder. */
function toCarriageway(at: At): { readonly left: string[]; readonly inside: string[] } {
  const { deck } = at.study.brief;
  const first = deck.findIndex((strip) => carriage.has(strip.kind));
  const last = deck.findLastIndex((strip) => carriage.has(strip.kind));
  const widths = (from: number, to: number): string[] =>
    deck.slice(from, to).map((_, i) => `brief/deck/${from + i}/widthM`);
  return { left: widths(0, first), inside: widths(first, last + 1) };
}

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

function limitLevels(at: At): { readonly datum: string; readonly above: string } {
  const behind = limitBehind(at);
  if ('clearance' in behind)
    return { datum: `${behind.clearance}/datumLevelM`, above: `${behind.clearance}/headroomM` };
  return {
    datum: `${behind.water}/${behind.known ? 'floodLevelM' : 'levelM'}`,
    above: `${behind.water}/freeboardM`,
  };
}

const limitEnd = (at: At, end: 'from' | 'to'): string => {
  const behind = limitBehind(at);
  return 'clearance' in behind
    ? `${behind.clearance}/${end}M`
    : `${behind.water}/flood${end === 'from' ? 'From' : 'To'}M`;
};

const zoneEnd = (at: At, end: 'fromM' | 'toM'): string => {
  const barring = at.study.brief.obstacles.flatMap((obstacle, i) =>
    obstacle.supports === 'none' ? [] : [i],
  );
  return `brief/obstacles/${barring[at.index('i')]}/${end}`;
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
      inputs: (at) => ({ given: zoneEnd(at, end) }),
      compute: ({ given }) => given,
    }),
  ),
  described({
    path: 'site/soffitLimits/:i/levelM',
    label: (at) => `lowest soffit: ${limitName(at)}`,
    unit: 'm',
    method: 'sum',
    formula: (at) => ('clearance' in limitBehind(at) ? 'level below + headroom' : 'water level + freeboard'),
    inputs: limitLevels,
    compute: ({ datum, above }) => datum + above,
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
  ...(['odds', 'bearingLevelM'] as const).map((field) =>
    copied(
      `site/groundStretches/:i/classes/:c/${field}`,
      (at) => `brief/groundStretches/${at.name('i')}/classes/${at.name('c')}/${field}`,
      field === 'odds' ? 'odds of a ground class' : 'bearing level of a ground class',
      field === 'odds' ? '' : 'm',
    ),
  ),
  copied('site/road/startLevelM', () => 'brief/road/startLevelM', 'proposed road level at the start', 'm'),
  copied('site/road/endLevelM', () => 'brief/road/endLevelM', 'proposed road level at the end', 'm'),
  copied('site/road/mayRiseM', () => 'brief/road/mayRiseM', 'rise allowed at a free end', 'm'),
  copied('site/road/maxGradient', () => 'brief/road/maxGradient', 'steepest gradient'),
  copied('site/road/fillSideSlope', () => 'brief/road/fillSideSlope', 'side slope of fill'),
  described({
    path: 'site/deck/widthM',
    label: 'deck width',
    unit: 'm',
    method: 'sum',
    formula: 'sum of the strips',
    inputs: (at) => ({ all: strips(at) }),
    compute: ({ all }) => sum(all),
  }),
  described({
    path: 'site/deck/carriagewayM',
    label: 'width between kerbs',
    unit: 'm',
    method: 'sum',
    formula: 'lanes + shoulders',
    inputs: (at) => ({ road: strips(at, carriage) }),
    compute: ({ road }) => sum(road),
  }),
  described({
    path: 'site/deck/carriagewayOffsetM',
    label: 'middle of the carriageway from the middle of the deck',
    unit: 'm',
    method: 'difference',
    formula: 'strips left of it + half its stretch - half the deck width',
    inputs: (at) => ({ ...toCarriageway(at), width: 'site/deck/widthM' }),
    compute: ({ left, inside, width }) => (inside.length > 0 ? sum(left) + sum(inside) / 2 - width / 2 : 0),
  }),
  described({
    path: 'site/deck/lanes',
    label: 'marked lanes',
    unit: 'no',
    method: 'count',
    formula: 'strips that are lanes',
    inputs: (at) => ({ lanes: strips(at, new Set<StripKind>(['lane'])) }),
    compute: ({ lanes }) => lanes.length,
  }),
  described({
    path: 'site/deck/footwayM',
    label: 'width of footways',
    unit: 'm',
    method: 'sum',
    formula: 'strips that are footways',
    inputs: (at) => ({ footways: strips(at, new Set<StripKind>(['footway'])) }),
    compute: ({ footways }) => sum(footways),
  }),
  copied('site/deck/surfacingM', () => 'brief/surfacingM', 'surfacing', 'm'),
  described({
    path: 'site/deck/superimposedKNm',
    label: 'superimposed dead load',
    unit: 'kN/m',
    method: 'sum of products',
    formula:
      'surfacing x its weight x width between kerbs + footways and verges x their build-up + barrier lines x their weight',
    inputs: (at) => ({
      surfacing: 'site/deck/surfacingM',
      weight: `practice/site/surfacing-${at.appraisal.site.standard}`,
      road: 'site/deck/carriagewayM',
      raised: strips(at, raised),
      build: 'practice/site/footway',
      railed: strips(at, railed),
      line: 'practice/site/barrier',
    }),
    compute: (v) => v.surfacing * v.weight * v.road + v.build * sum(v.raised) + v.line * v.railed.length,
  }),
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
  practice(
    'surfacing-lm1',
    SURFACING_KN_M3.lm1,
    'weight of surfacing',
    'kN/m3',
    'EN 1991-1-1 table A.6 (from memory)',
  ),
  practice(
    'surfacing-hl93',
    SURFACING_KN_M3.hl93,
    'weight of surfacing',
    'kN/m3',
    'AASHTO LRFD table 3.5.1-1 (from memory)',
  ),
  practice('footway', FOOTWAY_KN_M2, 'build-up of footways and verges', 'kN/m2', 'common-practice'),
  practice('barrier', BARRIER_LINE_KN_M, 'barrier or parapet with its plinth', 'kN/m', 'common-practice'),
  practice('crossfall', CROSSFALL, 'crossfall of the carriageway to both sides', '', 'common-practice'),
];
