import {
  described,
  type At,
  type Descriptor,
  type FigureKind,
  type Study,
  type Told,
} from '../model/index.ts';
import { isAssumed } from './assumed.ts';
import { parseStudy } from './readStudy.ts';
import { studyVersion } from './schema.ts';

/** A study that says nothing but what it must: what else is in it are presets of the tool. */
function presets(): Study {
  const read = parseStudy({
    format: 'spanledger-study',
    version: studyVersion,
    title: 'presets',
    brief: {
      crossing: {
        startM: 0,
        endM: 1,
        ground: [
          { chainageM: 0, levelM: 0 },
          { chainageM: 1, levelM: 0 },
        ],
      },
      road: { startLevelM: 0, endLevelM: 0 },
      deck: [{ kind: 'lane', widthM: 1 }],
    },
  });
  if (!read.ok) throw new RangeError('presets: expected a study of required fields to be read');
  return read.value;
}

let preset: Study | null = null;

function held(study: Study, path: string): unknown {
  return path
    .split('/')
    .reduce<unknown>(
      (holder, name) => (holder as Readonly<Record<string, unknown>> | undefined)?.[name],
      study,
    );
}

/** Typed, or as the tool sets it where nobody has: told by the value, as the file keeps no trace of it. */
function typedOrPreset(at: At): FigureKind {
  preset ??= presets();
  return held(at.study, at.path) === held(preset, at.path) ? 'preset' : 'typed';
}

/** Whether it was taken at the start of the study and nobody has confirmed it. */
const isStartValue = (at: At): boolean => isAssumed(at.study, at.path.replaceAll('/', '.'));

function typed(path: string, label: Told<string>, unit = '', kind: Told<FigureKind> = 'typed'): Descriptor {
  const kindAt = (at: At): FigureKind => {
    if (isStartValue(at)) return 'preset';
    return typeof kind === 'function' ? kind(at) : kind;
  };
  return described({
    path,
    label,
    unit,
    kind: kindAt,
    method(at) {
      if (isStartValue(at)) return 'preset: start value, not confirmed';
      return kindAt(at) === 'preset' ? 'preset, to be confirmed' : 'typed';
    },
    formula: 'as it stands in the study',
    sources: ['brief'],
  });
}

const obstacleOf = (at: At): string => at.study.brief.obstacles[at.index('i')]!.name;
const waterOf = (at: At): string => at.study.brief.waters[at.index('i')]!.name;
const confirmedOrPreset = (at: At): FigureKind =>
  at.study.brief.obstacles[at.index('i')]!.clearance?.confirmed === true ? 'typed' : 'preset';
const stretchOf = (at: At): string => `ground stretch ${at.index('i') + 1}`;
const oddsOf = (at: At): string => {
  const stretch = at.study.brief.groundStretches[at.index('i')]!;
  return `${stretchOf(at)}, ${stretch.classes[at.index('c')]!.ground.replace('-', ' ')}`;
};
/** Odds nobody has judged are those the tool gives to ground nobody has looked at. */
function judgedOrPreset(at: At): FigureKind {
  preset ??= presets();
  const shown = ({ brief }: Study, index: number): string =>
    JSON.stringify(brief.groundStretches[index]?.classes.map(({ ground, odds }) => [ground, odds]));
  return shown(at.study, at.index('i')) === shown(preset, 0) ? 'preset' : 'typed';
}
const stripOf = (at: At): string => `${at.study.brief.deck[at.index('i')]!.kind}, strip ${at.index('i') + 1}`;

/** What the study itself says: brief, books and options kept by hand. Chains of explanations end here. */
export const studyFigures: readonly Descriptor[] = [
  typed('brief/crossing/startM', 'start of the crossing', 'm'),
  typed('brief/crossing/endM', 'end of the crossing', 'm'),
  typed('brief/crossing/startLatestM', 'innermost place of the start abutment', 'm'),
  typed('brief/crossing/endEarliestM', 'innermost place of the end abutment', 'm'),
  typed('brief/crossing/ground/:i/chainageM', (at) => `chainage of ground point ${at.index('i') + 1}`, 'm'),
  typed('brief/crossing/ground/:i/levelM', (at) => `level of ground point ${at.index('i') + 1}`, 'm'),
  typed('brief/crossing/planRadiusM', 'plan radius', 'm'),
  typed('brief/crossing/skewDeg', 'skew of the supports', 'deg'),
  typed('brief/crossing/groundAccelerationG', 'design ground acceleration, share of gravity'),
  typed('brief/crossing/siteClass', 'site class'),
  typed('brief/road/startLevelM', 'proposed road level at the start', 'm'),
  typed('brief/road/endLevelM', 'proposed road level at the end', 'm'),
  typed('brief/road/fixedEnd', 'end of the road that cannot move', '', typedOrPreset),
  typed('brief/road/mayRiseM', 'rise allowed at a free end', 'm', typedOrPreset),
  typed('brief/road/maxGradient', 'steepest gradient', '', typedOrPreset),
  typed('brief/road/fillSideSlope', 'side slope of fill, horizontal to vertical', '', typedOrPreset),
  typed('brief/road/designSpeedKmh', 'design speed', 'km/h'),
  typed('brief/road/crestRadiusM', 'least radius of a crest', 'm'),
  typed('brief/road/sagRadiusM', 'least radius of a sag', 'm'),
  ...(['start', 'end'] as const).flatMap((end) => [
    typed(`brief/road/${end}TieIn`, `tie-in of the road behind the ${end}`, '', typedOrPreset),
    typed(`brief/road/${end}ApproachM`, `reach of the road behind the ${end}`, 'm'),
    typed(`brief/road/${end}Gradient`, `gradient of the existing road behind the ${end}`),
  ]),
  typed('brief/road/approachSides', 'sides of the approaches', '', typedOrPreset),
  typed('brief/deck/:i/kind', (at) => `kind of strip ${at.index('i') + 1}`),
  typed('brief/deck/:i/widthM', (at) => `width of ${stripOf(at)}`, 'm'),
  typed('brief/deck/:i/ultimateWidthM', (at) => `width in the ultimate layout of ${stripOf(at)}`, 'm'),
  typed('brief/surfacingM', 'surfacing', 'm', typedOrPreset),
  typed('brief/loading', 'load standard', '', typedOrPreset),
  typed('brief/obstacles/:i/fromM', (at) => `start of ${obstacleOf(at)}`, 'm'),
  typed('brief/obstacles/:i/toM', (at) => `end of ${obstacleOf(at)}`, 'm'),
  typed('brief/obstacles/:i/supports', (at) => `supports in ${obstacleOf(at)}`),
  typed(
    'brief/obstacles/:i/pierPremium',
    (at) => `sum for a support in ${obstacleOf(at)}, ${at.study.books.currency}`,
  ),
  typed('brief/obstacles/:i/clearance/fromM', (at) => `start of the clearance over ${obstacleOf(at)}`, 'm'),
  typed('brief/obstacles/:i/clearance/toM', (at) => `end of the clearance over ${obstacleOf(at)}`, 'm'),
  typed('brief/obstacles/:i/clearance/datumLevelM', (at) => `level of ${obstacleOf(at)}`, 'm'),
  typed(
    'brief/obstacles/:i/clearance/headroomM',
    (at) => `headroom over ${obstacleOf(at)}`,
    'm',
    confirmedOrPreset,
  ),
  typed('brief/obstacles/:i/clearance/confirmed', (at) => `headroom over ${obstacleOf(at)} confirmed`),
  typed('brief/waters/:i/fromM', (at) => `start of ${waterOf(at)}`, 'm'),
  typed('brief/waters/:i/toM', (at) => `end of ${waterOf(at)}`, 'm'),
  typed('brief/waters/:i/levelM', (at) => `ordinary level of ${waterOf(at)}`, 'm'),
  typed('brief/waters/:i/floodLevelM', (at) => `flood level of ${waterOf(at)}`, 'm'),
  typed('brief/waters/:i/floodReturnYears', (at) => `return period of the flood of ${waterOf(at)}`, 'years'),
  typed(
    'brief/waters/:i/freeboardM',
    (at) => `freeboard over ${waterOf(at)}`,
    'm',
    (at) => (at.study.brief.waters[at.index('i')]!.freeboardM === 1 ? 'preset' : 'typed'),
  ),
  typed('brief/waters/:i/floodFromM', (at) => `start of the flood plain of ${waterOf(at)}`, 'm'),
  typed('brief/waters/:i/floodToM', (at) => `end of the flood plain of ${waterOf(at)}`, 'm'),
  typed('brief/waters/:i/flowM3s', (at) => `flow of the design flood of ${waterOf(at)}`, 'm3/s'),
  typed('brief/waters/:i/velocityMs', (at) => `mean velocity of the flood of ${waterOf(at)}`, 'm/s'),
  typed('brief/waters/:i/allowedAffluxM', (at) => `afflux allowed on ${waterOf(at)}`, 'm'),
  typed('brief/waters/:i/grainMm', (at) => `median grain of the bed of ${waterOf(at)}`, 'mm'),
  typed('brief/waters/:i/siltFactor', (at) => `silt factor of ${waterOf(at)}`),
  typed('brief/waters/:i/vesselDwtT', (at) => `largest vessel on ${waterOf(at)}`, 't'),
  typed('brief/waters/:i/vesselSpeedMs', (at) => `speed of the largest vessel on ${waterOf(at)}`, 'm/s'),
  typed('brief/groundStretches/:i/fromM', (at) => `start of ${stretchOf(at)}`, 'm'),
  typed('brief/groundStretches/:i/toM', (at) => `end of ${stretchOf(at)}`, 'm'),
  typed('brief/groundStretches/:i/known', (at) => `${stretchOf(at)} known from a borehole`),
  typed('brief/groundStretches/:i/classes/:c/odds', (at) => `odds of ${oddsOf(at)}`, '', judgedOrPreset),
  typed(
    'brief/groundStretches/:i/classes/:c/bearingLevelM',
    (at) => `bearing level of ${oddsOf(at)}`,
    'm',
    judgedOrPreset,
  ),
  typed(
    'brief/groundStretches/:i/classes/:c/bearingDepthM',
    (at) => `depth below the ground at which it bears, ${oddsOf(at)}`,
    'm',
    judgedOrPreset,
  ),
  typed('brief/access/haulLengthM', 'longest piece that reaches the site', 'm'),
  typed('brief/access/haulMassT', 'heaviest piece that reaches the site', 't'),
  typed('brief/access/crane', 'cranes can stand on site'),
  typed('brief/access/barge', 'barges can be used'),
  typed('brief/access/craneMomentTm', 'load moment of the largest crane that can stand on site', 'tm'),
  typed('brief/access/launchYardM', 'level ground in line behind an abutment', 'm'),
  typed('brief/demands/lanesKept', 'lanes kept in use beside the works', 'no', typedOrPreset),
  typed('brief/demands/gasMain', 'gas main on the deck', '', typedOrPreset),
  typed('brief/budget', 'budget'),
  described({
    path: 'brief/budget/amount',
    label: 'budget',
    unit: (at) => at.study.books.currency,
    kind: 'typed',
    method: 'typed',
    formula: (at) => {
      const { budget } = at.study.brief;
      return budget === 'unknown'
        ? 'not given'
        : `prices of ${budget.priceDate === 'unknown' ? 'an unknown date' : budget.priceDate}; ${budget.includes}`;
    },
    sources: ['brief'],
  }),
  typed('books/draws', 'draws of the cost simulation', 'no', typedOrPreset),
  typed('books/seed', 'seed of the draws', '', typedOrPreset),
  typed(
    'books/unseparated/:end',
    (at) => `${at.index('end') === 0 ? 'least' : 'most'} odds of options that cannot be separated`,
    '',
    typedOrPreset,
  ),
  typed('kept/:i/depthM', 'depth typed for the option', 'm'),
  typed('kept/:i/variant/haunchRatio', 'depth over the piers over that at midspan, typed for the option', ''),
  ...(
    [
      ['boxWidthM', 'width of the box', 'm'],
      ['strengthMPa', 'strength of the concrete', 'MPa'],
      ['light/densityKgM3', 'oven-dry density of the lightweight concrete', 'kg/m3'],
      ['light/middleM/:s', 'length of lightweight concrete about the middle of span *', 'm'],
      ['ballastKNm/:s', 'ballast of span *', 'kN/m'],
      ['castInPiers', 'piers that the deck is cast in with', 'no'],
    ] as const
  ).map(([steps, label, unit]) =>
    typed(
      `kept/:i/variant/${steps}`,
      (at) =>
        `${steps.endsWith(':s') ? label.replace('*', String(at.index('s') + 1)) : label}, asked for the option`,
      unit,
    ),
  ),
  typed(
    'kept/:i/units/:unit/supportsM/:s',
    (at) => `chainage of support ${at.index('s') + 1}, set by hand`,
    'm',
  ),
];
