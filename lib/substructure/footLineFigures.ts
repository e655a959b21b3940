import { described, type At, type Descriptor, type MeasuredLine } from '../model/index.ts';
import { foundationAt, footPath } from './foundationFigures.ts';
import { abutmentBarsPath } from './shaftFigures.ts';
import { shaftBarsBy } from './sizeShaft.ts';

const path = 'options/:option/supports/:support/foundations/:f/lines/:line/quantity';
const lineOf = (at: At): MeasuredLine => foundationAt(at).lines[at.index('line')]!;
const label = (at: At): string => `${lineOf(at).what}, on ${foundationAt(at).ground.replace('-', ' ')}`;
const pit = (name: string): string => `data/substructure/pit/${name}`;

/** Whether a line is of an item and its words end so. */
const is =
  (item: string, ending = '') =>
  (at: At): boolean =>
    lineOf(at).item === item && lineOf(at).what.endsWith(ending);

const isReinforcement = is('reinforcement');

/** The line of concrete beside a line of bars: the same piece, measured in m3. */
function concreteOf(at: At): string {
  const { what } = lineOf(at);
  const index = foundationAt(at).lines.findIndex(
    (line) => line.item !== 'reinforcement' && line.what === what,
  );
  return `${footPath(at)}/lines/${index}/quantity`;
}

/** Bars per m3 of a piece, by what it is part of. */
function barsOf(at: At): string {
  const { what } = lineOf(at);
  if (what.endsWith('piles')) return 'data/substructure/piles/barsKgM3';
  if (!what.endsWith('shaft below ground')) return 'data/substructure/footing/barsKgM3';
  if (at.support.kind === 'abutment') return abutmentBarsPath(at);
  const { shaft, articulation } = at.support;
  return `data/substructure/pier/${shaftBarsBy(shaft, articulation.frame !== undefined)}`;
}

/** Level of water that can reach the pit: ordinary level of the water here, on a flood plain of the first water. */
function watersAt(at: At): string[] {
  const { waters, soffitLimits } = at.site;
  const x = at.support.chainageM;
  const onPlain = soffitLimits.some((one) => one.kind === 'flood' && x >= one.fromM && x <= one.toM);
  const reaching = waters.flatMap((water, i) => (onPlain || (x >= water.fromM && x <= water.toM) ? [i] : []));
  return reaching.slice(0, 1).map((i) => `site/waters/${i}/levelM`);
}

/** Plan of the pit and its levels. */
const pitInputs = (at: At) =>
  ({
    length: `${footPath(at)}/footing/lengthM`,
    width: `${footPath(at)}/footing/widthM`,
    depth: `${footPath(at)}/footing/depthM`,
    top: `${footPath(at)}/footing/topLevelM`,
    from: `${at.foot}/pitFromM`,
    room: pit('workingSpaceM'),
    water: watersAt(at),
    freeboard: pit('freeboardM'),
    seal: pit('sealShare'),
    toe: pit('toeShare'),
  }) as const;

interface Pit {
  readonly lengthM: number;
  readonly widthM: number;
  readonly depthM: number;
  readonly headM: number;
  readonly sealM: number;
  readonly retainedM: number;
}

/** The pit from its levels: plan with working space, depth, head of water, concrete seal and height of the sheets. */
function pitOf(v: {
  readonly length: number;
  readonly width: number;
  readonly depth: number;
  readonly top: number;
  readonly from: number;
  readonly room: number;
  readonly water: readonly number[];
  readonly freeboard: number;
  readonly seal: number;
}): Pit {
  const underside = v.top - v.depth;
  const [water = -Infinity] = v.water;
  const headM = water - underside;
  const sealM = v.seal * headM;
  return {
    lengthM: v.length + 2 * v.room,
    widthM: v.width + 2 * v.room,
    depthM: Math.max(0, v.from - underside),
    headM,
    sealM,
    retainedM: Math.max(water + v.freeboard, v.from) - underside + sealM,
  };
}

/** Measured lines of a foundation for one ground class, from its plan and levels. */
export const footLineFigures: readonly Descriptor[] = [
  described({
    path,
    when: is('bored-pile'),
    label,
    unit: 'm3',
    method: 'volume',
    formula: 'n x length x pi d^2 / 4',
    inputs: (at) => ({
      n: `${footPath(at)}/piles/count`,
      length: `${footPath(at)}/piles/lengthM`,
      d: `${footPath(at)}/piles/diameterM`,
    }),
    compute: ({ n, length, d }) => (n * length * Math.PI * d * d) / 4,
  }),
  described({
    path,
    when: is('footing-concrete', 'seal'),
    label,
    unit: 'm3',
    method: 'volume',
    formula: 'plan of the pit x share of the head of water',
    inputs: pitInputs,
    compute: (v) => {
      const { lengthM, widthM, sealM } = pitOf(v);
      return lengthM * widthM * sealM;
    },
  }),
  described({
    path,
    when: is('footing-concrete'),
    label,
    unit: 'm3',
    method: 'volume',
    formula: 'length x width x depth',
    inputs: (at) => ({
      length: `${footPath(at)}/footing/lengthM`,
      width: `${footPath(at)}/footing/widthM`,
      depth: `${footPath(at)}/footing/depthM`,
    }),
    compute: ({ length, width, depth }) => length * width * depth,
  }),
  described({
    path,
    when: isReinforcement,
    label,
    unit: 'kg',
    method: 'product',
    formula: 'concrete x bars per m3',
    inputs: (at) => ({ concrete: concreteOf(at), bars: barsOf(at) }),
    compute: ({ concrete, bars }) => concrete * bars,
  }),
  described({
    path,
    when: is('excavation'),
    label,
    unit: 'm3',
    method: 'volume',
    formula:
      'open cut h (a b + s h (a + b) + 4/3 (s h)^2); between sheets, where water stands over the underside, a b (h + seal)',
    inputs: (at) => ({ ...pitInputs(at), slope: pit('slope') }),
    compute: (v) => {
      const { lengthM: a, widthM: b, depthM: h, headM, sealM } = pitOf(v);
      if (headM > v.freeboard) return a * b * (h + sealM);
      const s = v.slope * h;
      return h * (a * b + s * (a + b) + (4 / 3) * s * s);
    },
  }),
  described({
    path,
    when: is('cofferdam'),
    label,
    unit: 'm2',
    method: 'area',
    formula: 'circumference of the pit x height retained x (1 + share below)',
    inputs: pitInputs,
    compute: (v) => {
      const { lengthM, widthM, retainedM } = pitOf(v);
      return 2 * (lengthM + widthM) * retainedM * (1 + v.toe);
    },
  }),
  described({
    path,
    when: is('scour-protection'),
    label,
    unit: 'm3',
    method: 'volume',
    formula: 'depth of stone x area round the shaft, twice its thickness wide',
    inputs: (at) => ({
      length: `${at.foot}/shaft/lengthM`,
      width: `${at.foot}/shaft/widthM`,
      deep: pit('protectionM'),
      reach: pit('protectionReach'),
    }),
    compute: (v) => {
      const reach = v.reach * v.length;
      return v.deep * ((v.length + 2 * reach) * (v.width + 2 * reach) - v.length * v.width);
    },
  }),
  described({
    path,
    label,
    unit: 'm3',
    method: 'volume',
    formula:
      'section of the shaft x (foot of its own lines - top of the foundation), taken off where the foundation reaches higher',
    inputs: (at) => ({
      foot: `${at.foot}/footM`,
      top: `${footPath(at)}/footing/topLevelM`,
      length: `${at.foot}/shaft/lengthM`,
      width: `${at.foot}/shaft/widthM`,
      columns: `${at.foot}/shaft/columns`,
      wall: 'data/substructure/pier/wallM',
    }),
    compute: (v, at) => {
      const width = v.columns > 1 ? v.length : v.width;
      const inside = at.support.shaft.hollow
        ? Math.max(0, v.length - 2 * v.wall) * Math.max(0, width - 2 * v.wall)
        : 0;
      return (v.length * width - inside) * v.columns * (v.foot - v.top);
    },
  }),
];
