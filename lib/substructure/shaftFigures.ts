import { described, type AbutmentWall, type At, type Descriptor } from '../model/index.ts';
import { shaftDuties } from './shaftDuties.ts';
import { supportName } from './supportFigures.ts';

const support = (steps: string): string => `options/:option/supports/:support/${steps}`;
const on =
  (what: string) =>
  (at: At): string =>
    `${what}, ${supportName(at)}`;
const pier = (name: string): string => `data/substructure/pier/${name}`;
const wall = (name: string): string => `data/substructure/abutment/${name}`;

const isAbutment = (at: At): boolean => at.support.kind === 'abutment';
const wallOf = (at: At): AbutmentWall => at.support.abutment?.wall ?? 'full height';

/** Where the bars per m3 of an abutment stand, by its kind and whether the deck is cast in. */
export function abutmentBarsPath(at: At): string {
  const integral = at.support.abutment?.integral === true;
  const named = { 'bank seat': 'bankSeat', 'full height': 'fullHeight', 'spill-through': 'spillThrough' };
  if (wallOf(at) === 'spill-through' && !integral) return wall('spillThroughBarsKgM3');
  return wall(integral ? `${named[wallOf(at)]}IntegralBarsKgM3` : 'barsKgM3');
}

const isPylon = (at: At): boolean => at.support.kind === 'pylon';

/** Lines of the support itself by item: concrete or bars of its walls. */
const linesOf = (at: At, item: string): string[] =>
  at.support.lines.flatMap((line, i) => (line.item === item ? [`${at.foot}/lines/${i}/quantity`] : []));

const sum = (values: readonly number[]): number => values.reduce((total, value) => total + value, 0);

/** Levels and walls of an abutment that its own figures need, under one name each. */
const abutmentInputs = (at: At) =>
  ({
    road: `${at.foot}/roadM`,
    seat: `${at.foot}/topLevelM`,
    foot: `${at.foot}/footM`,
  }) as const;

/** Shafts of piers, legs of pylons and walls of abutments. */
export const shaftFigures: readonly Descriptor[] = [
  described({
    path: support('abutment/wall'),
    label: on('kind of abutment'),
    unit: '',
    method: 'cheapest that fits',
    formula:
      'bank seat where the road is little above the ground, else full height; spill-through where its slope meets nothing',
    inputs: (at) => ({
      road: `${at.foot}/roadM`,
      ground: `${at.foot}/groundLevelM`,
      flood: `${at.foot}/floodDepthM`,
      bankSeat: wall('bankSeatUpToM'),
      slope: 'site/road/fillSideSlope',
      berm: wall('bermM'),
    }),
  }),
  described({
    path: support('footM'),
    when: isAbutment,
    label: on('level of the foot of the walls'),
    unit: 'm',
    method: 'least of two levels',
    formula: 'seat - depth of its beam; under a wall or columns at most ground - cover over the cap',
    inputs: (at) => ({
      road: `${at.foot}/roadM`,
      seat: `${at.foot}/topLevelM`,
      ground: `${at.foot}/groundLevelM`,
      wall: `${at.foot}/abutment/wall`,
      beam: wall('seatBeamM'),
      cover: 'data/substructure/piles/capCoverM',
    }),
    compute: (v, at) => Math.min(v.seat - v.beam, wallOf(at) === 'bank seat' ? Infinity : v.ground - v.cover),
  }),
  described({
    path: support('footM'),
    label: on('level of the foot of the shaft'),
    unit: 'm',
    method: 'difference',
    formula: 'ground - cover over the cap',
    inputs: (at) => ({ ground: `${at.foot}/groundLevelM`, cover: 'data/substructure/piles/capCoverM' }),
    compute: ({ ground, cover }) => ground - cover,
  }),
  described({
    path: support('shaft/lengthM'),
    when: isAbutment,
    label: on('mean thickness of the stem, or side of its columns'),
    unit: 'm',
    method: 'common practice by height',
    formula:
      'bank seat: least thickness; wall: mean of the least and of the foot, a share of the retained height; columns: a share of it, at least the least',
    inputs: (at) => ({
      ...abutmentInputs(at),
      wall: `${at.foot}/abutment/wall`,
      least: wall('leastStemM'),
      perHeight: wall('stemPerHeight'),
      leastColumn: wall('leastColumnM'),
      columnPerHeight: wall('columnPerHeight'),
    }),
    compute: (v, at) => {
      if (wallOf(at) === 'bank seat') return v.least;
      if (wallOf(at) === 'spill-through')
        return Math.max(v.leastColumn, v.columnPerHeight * Math.max(0, v.road - v.foot));
      return (v.least + Math.max(v.least, v.perHeight * Math.max(0, v.road - v.foot))) / 2;
    },
  }),
  described({
    path: support('shaft/widthM'),
    when: isAbutment,
    label: on('width of the walls'),
    unit: 'm',
    method: 'as wide as the deck',
    formula: 'width of the deck along the supports',
    inputs: () => ({ deck: 'site/alongSupportsM' }),
    compute: ({ deck }) => deck,
  }),
  described({
    path: support('shaft/lengthM'),
    when: isPylon,
    label: on('length of a leg along the road'),
    unit: 'm',
    method: 'figure of practice',
    formula: 'plan of one leg at its foot',
    inputs: () => ({ leg: 'data/substructure/pylon/legLengthM' }),
    compute: ({ leg }) => leg,
  }),
  described({
    path: support('shaft/widthM'),
    when: isPylon,
    label: on('width over the legs'),
    unit: 'm',
    method: 'sum',
    formula: 'deck width + room for the legs beside it',
    inputs: () => ({ deck: 'site/deck/widthM', beyond: 'data/substructure/pylon/legsBeyondDeckM' }),
    compute: ({ deck, beyond }) => deck + beyond,
  }),
  described({
    path: support('shaft/lengthM'),
    label: on('thickness of the shaft'),
    unit: 'm',
    method: 'thinnest that passes',
    formula: 'axial stress, slenderness and bending at the foot, in steps; bars by published ratio',
    inputs: shaftDuties,
  }),
  described({
    path: support('shaft/widthM'),
    label: on('width of the shaft'),
    unit: 'm',
    method: 'greater of two',
    formula: 'share of the width of the deck along the supports, under the bearings, and the least width',
    inputs: () => ({
      deck: 'site/alongSupportsM',
      share: pier('leafWidthShare'),
      least: pier('leastLeafWidthM'),
    }),
    compute: ({ deck, share, least }) => Math.max(least, share * deck),
  }),
  described({
    path: support('shaft/columns'),
    label: on('columns'),
    unit: 'no',
    method: 'choice',
    formula: (at) =>
      isAbutment(at)
        ? 'one wall; columns under the beam of a spill-through abutment by their spacing, at least two'
        : isPylon(at)
          ? 'two legs'
          : 'one leaf in a flood or beside traffic, two columns with a head elsewhere, or one hollow shaft, where it is high enough for that and that costs less',
    inputs: (at) => ({
      height: `${at.foot}/heightM`,
      flood: `${at.foot}/floodDepthM`,
      price: pier('hollowPrice'),
      from: pier('hollowFromM'),
    }),
  }),
  described({
    path: support('shaft/concreteM3'),
    when: isAbutment,
    label: on('concrete of the walls'),
    unit: 'm3',
    method: 'sum',
    formula: 'stem or columns with their beam + back wall + wing walls',
    inputs: (at) => ({ walls: linesOf(at, 'abutment-concrete') }),
    compute: ({ walls }) => sum(walls),
  }),
  described({
    path: support('shaft/reinforcementKg'),
    when: isAbutment,
    label: on('bars of the walls'),
    unit: 'kg',
    method: 'product',
    formula: 'concrete x bars per m3',
    inputs: (at) => ({ concrete: `${at.foot}/shaft/concreteM3`, bars: abutmentBarsPath(at) }),
    compute: ({ concrete, bars }) => concrete * bars,
  }),
  ...(['concreteM3', 'reinforcementKg'] as const).map((what) =>
    described({
      path: support(`shaft/${what}`),
      when: isPylon,
      label: on(what === 'concreteM3' ? 'concrete under the pylon' : 'bars under the pylon'),
      unit: what === 'concreteM3' ? 'm3' : 'kg',
      method: 'measured with the form',
      formula: 'pylons are measured with the unit that hangs from them',
    }),
  ),
  ...(['concreteM3', 'reinforcementKg'] as const).map((what) =>
    described({
      path: support(`shaft/${what}`),
      label: on(what === 'concreteM3' ? 'concrete of the shaft' : 'bars of the shaft'),
      unit: what === 'concreteM3' ? 'm3' : 'kg',
      method: 'volume',
      formula: (at) => {
        const volume =
          at.support.shaft.columns === 2
            ? '2 x side^2 x (height - head) + head x side x width'
            : 'section x height';
        return what === 'concreteM3'
          ? `${volume}, height from the foot to the bearings`
          : `${volume}, each x its bars per m3`;
      },
      inputs: (at) => ({
        top: `${at.foot}/topLevelM`,
        foot: `${at.foot}/footM`,
        length: `${at.foot}/shaft/lengthM`,
        width: `${at.foot}/shaft/widthM`,
        columns: `${at.foot}/shaft/columns`,
        head: pier('headDepthM'),
        wall: pier('wallM'),
        leafBars: pier('leafBarsKgM3'),
        columnBars: pier('columnBarsKgM3'),
        hollowBars: pier('hollowBarsKgM3'),
        headBars: 'data/substructure/footing/barsKgM3',
      }),
      compute: (v, at) => {
        const height = Math.max(0, v.top - v.foot);
        const perM3 = (bars: number): number => (what === 'concreteM3' ? 1 : bars);
        if (v.columns === 2) {
          return (
            2 * v.length ** 2 * Math.max(0, height - v.head) * perM3(v.columnBars) +
            v.head * v.length * v.width * perM3(v.headBars)
          );
        }
        const hollow = at.support.shaft.hollow === true;
        const inside = hollow ? Math.max(0, v.length - 2 * v.wall) * Math.max(0, v.width - 2 * v.wall) : 0;
        return (v.length * v.width - inside) * height * perM3(hollow ? v.hollowBars : v.leafBars);
      },
    }),
  ),
];
