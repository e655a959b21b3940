import { described, type At, type Descriptor, type Regrading } from '../model/index.ts';
import { fact } from './factFigure.ts';

type End = 'start' | 'end';

type Field = Exclude<keyof Regrading, 'kind' | 'comesBack'>;

const ends = ['start', 'end'] as const;
const endOf = (at: At): End => at.name('end') as End;
const of = (at: At): Regrading => at.option.profile.regrading![endOf(at)]!;
const own = (at: At, field: Field): string => `${at.root}/profile/regrading/${endOf(at)}/${field}`;

/** The piece of the road over the crossing that ends at the fixed end. */
function roadPiece(at: At): string {
  const { startM, endM } = at.appraisal.site;
  const { pieces } = at.option.profile;
  const index =
    endOf(at) === 'start'
      ? pieces.findIndex(({ fromM }) => fromM >= startM)
      : pieces.findLastIndex(({ toM }) => toM <= endM);
  return `${at.root}/profile/pieces/${index}`;
}

const what = (name: string) => (at: At) => `${name} behind the ${endOf(at)}`;
const path = (field: Field): string => `options/:option/profile/regrading/:end/${field}`;

/** What the shape of the regraded line hangs on. */
const shape = (at: At) =>
  ({
    change: own(at, 'gradientChange'),
    held: `site/road/${endOf(at)}Gradient`,
    curves: ['site/roadCurves/crestRadiusM', 'site/roadCurves/sagRadiusM'],
    steepest: 'site/road/maxGradient',
  }) as const;

const against = (at: At) =>
  ({
    ...shape(at),
    width: 'site/deck/widthM',
    slope: 'site/road/fillSideSlope',
    sides: 'brief/road/approachSides',
  }) as const;

/** How the existing road behind a fixed end is led back to its own line. */
export const regradingFigures: readonly Descriptor[] = [
  described({
    path: path('radiusM'),
    label: what('radius of the curve'),
    unit: 'm',
    method: 'least curve',
    formula: (at) =>
      `least radius of a ${of(at).kind}: the existing road falls ${of(at).kind === 'crest' ? 'more' : 'less'} steeply than the deck, going outward`,
    inputs: (at) => ({ least: `site/roadCurves/${of(at).kind}RadiusM` }),
    compute: ({ least }) => least,
  }),
  described({
    path: path('gradientChange'),
    label: what('change of gradient'),
    unit: '',
    method: 'difference',
    formula: '|gradient of the road over the crossing at this end - gradient of the existing road|',
    inputs: (at) => {
      const piece = roadPiece(at);
      const atEnd = endOf(at) === 'end';
      return {
        deck: `${piece}/gradient`,
        bend: atEnd ? [`${piece}/curvature1PerM`, `${piece}/fromM`, `${piece}/toM`] : [],
        held: `site/road/${endOf(at)}Gradient`,
      };
    },
    compute: ({ deck, bend: [bend = 0, from = 0, to = 0], held }) =>
      Math.abs(deck + bend * (to - from) - held),
  }),
  described({
    path: path('curveM'),
    label: what('curve'),
    unit: 'm',
    method: 'vertical curve',
    formula: 'radius x change of gradient',
    inputs: (at) => ({ radius: own(at, 'radiusM'), change: own(at, 'gradientChange') }),
    compute: ({ radius, change }) => radius * change,
  }),
  described({
    path: path('tangentM'),
    label: what('tangent of the curve'),
    unit: 'm',
    method: 'vertical curve',
    formula: 'half of the curve',
    inputs: (at) => ({ curve: own(at, 'curveM') }),
    compute: ({ curve }) => curve / 2,
  }),
  described({
    path: path('offsetM'),
    label: what('offset where the tangents of the curve meet'),
    unit: 'm',
    method: 'vertical curve',
    formula: 'T^2 / 2R = T x change of gradient / 4',
    inputs: (at) => ({ tangent: own(at, 'tangentM'), change: own(at, 'gradientChange') }),
    compute: ({ tangent, change }) => (tangent * change) / 4,
  }),
  described({
    path: path('apartM'),
    label: what('greatest height between regraded and existing road'),
    unit: 'm',
    method: 'vertical curve',
    formula:
      'R x change of gradient^2 / 2 = T x change of gradient, where the curve runs parallel to the road',
    inputs: (at) => ({ tangent: own(at, 'tangentM'), change: own(at, 'gradientChange') }),
    compute: ({ tangent, change }) => tangent * change,
  }),
  described({
    path: path('lengthM'),
    label: what('length of existing road regraded'),
    unit: 'm',
    method: 'shortest line back',
    formula: (at) =>
      of(at).comesBack
        ? 'the curve turns on past the gradient of the road by t and a curve of radius S the other way meets it: R (d + t) + S t with t = d sqrt(R / (R + S)), and a straight grade between them where that would be too steep'
        : 'the curve alone: the existing road is as steep as is allowed and is not met again',
    inputs: shape,
  }),
  ...(['fillM3', 'cutM3'] as const).map((field) =>
    described({
      path: path(field),
      label: what(field === 'fillM3' ? 'fill on the existing road' : 'cut in the existing road'),
      unit: 'm3',
      method: 'integration over the existing road',
      formula:
        'W h + s h^2 across with side slopes, W h between walls, h between regraded and existing road, summed along',
      inputs: against,
    }),
  ),
  described({
    path: path('wallM2'),
    label: what('walls of the regrading'),
    unit: 'm2',
    method: 'integration over the existing road',
    formula: '2 h summed along between walls; 0 with side slopes',
    inputs: against,
  }),
];

const lengths = (at: At): string[] =>
  ends.flatMap((end) =>
    at.option.profile.regrading?.[end] ? [`${at.root}/profile/regrading/${end}/lengthM`] : [],
  );

/** What the rules are asked with about it. */
export const regradingFactFigures: readonly Descriptor[] = [
  fact('regradingM', 'of the end where most length is lacking; 0 where no road is regraded', (at) => ({
    lengths: lengths(at),
  })),
  fact('regradableM', 'length of the approach at the end where most is lacking', () => ({
    approaches: ends.map((end) => `brief/road/${end}ApproachM`),
  })),
  fact('regradingComesBack', 'at every fixed end whose gradient is known', (at) => ({
    lengths: lengths(at),
    steepest: 'site/road/maxGradient',
  })),
];
