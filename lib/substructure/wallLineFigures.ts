import { described, type At, type Descriptor, type MeasuredLine } from '../model/index.ts';
import { cosineOfSkew } from '../site/index.ts';
import { supportName } from './supportFigures.ts';

const path = 'options/:option/supports/:support/lines/:line/quantity';
const lineOf = (at: At): MeasuredLine => at.support.lines[at.index('line')]!;
const label = (at: At): string => lineOf(at).what;
const wall = (name: string): string => `data/substructure/abutment/${name}`;

/** Whether a line is of an item and its words end so. */
const is =
  (item: string, ...endings: readonly string[]) =>
  (at: At): boolean => {
    const line = lineOf(at);
    return (
      line.item === item && (endings.length === 0 || endings.some((ending) => line.what.endsWith(ending)))
    );
  };

const isSpill = (at: At): boolean => at.support.abutment?.wall === 'spill-through';

/** Height that the walls retain, from their foot to the road, and the length of the wings at the side slope. */
const wings = (at: At) =>
  ({
    road: `${at.foot}/roadM`,
    foot: `${at.foot}/footM`,
    slope: 'site/road/fillSideSlope',
  }) as const;

/** Wings are longer on a skew; one that is not known is square. */
const skew = { skew: 'site/skewDeg' } as const;
const cosineOf = (skewDeg: number): number => cosineOfSkew(Number.isFinite(skewDeg) ? skewDeg : null);

/** Where the brief says of the soft stretch that a line is measured for. */
function softStretchOf(at: At): string {
  const { obstacles } = at.study.brief;
  const x = at.support.chainageM;
  const index = obstacles.findIndex(
    ({ supports, name, fromM, toM }) =>
      supports === 'soft' && x > fromM && x < toM && lineOf(at).what.endsWith(` in ${name}`),
  );
  return `brief/obstacles/${index}`;
}

const softStretch = (at: At) =>
  ({
    support: `${at.foot}/chainageM`,
    from: `${softStretchOf(at)}/fromM`,
    to: `${softStretchOf(at)}/toM`,
  }) as const;

/** Measured lines of a support above its foundation, from its own figures. */
export const wallLineFigures: readonly Descriptor[] = [
  described({
    path,
    when: is('bearing'),
    label,
    unit: 'MN',
    method: 'as sized',
    formula: 'design load of all bearings',
    inputs: (at) => ({ load: `${at.foot}/articulation/bearingMN` }),
    compute: ({ load }) => load,
  }),
  described({
    path,
    when: is('expansion-joint'),
    label,
    unit: 'm',
    method: 'product',
    formula: 'movement / movement of one element, rounded up, x length of the supports',
    inputs: (at) => ({
      movement: `${at.foot}/articulation/jointMovementMm`,
      element: 'data/substructure/movement/jointGroupMm',
      width: 'site/alongSupportsM',
    }),
    compute: ({ movement, element, width }) => Math.ceil(movement / element - 1e-9) * width,
  }),
  described({
    path,
    when: is('tie-down'),
    label,
    unit: 'MN',
    method: 'product',
    formula: 'design uplift x share of the tie-down / 1000',
    inputs: (at) => ({
      uplift: `${at.foot}/articulation/tieDownKN`,
      share: 'data/substructure/bearings/tieDownShare',
    }),
    compute: ({ uplift, share }) => (uplift * share) / 1000,
  }),
  described({
    path,
    when: is('water-access'),
    label,
    unit: 'no',
    method: 'count',
    formula: 'one platform for a support in water',
    inputs: (at) => ({ water: `${at.foot}/waterDepthM` }),
    compute: ({ water }) => (water > 0 ? 1 : 0),
  }),
  described({
    path,
    when: is('soft-stretch-support'),
    label,
    unit: 'no',
    method: 'count',
    formula: 'once for each soft stretch a support stands in; the brief names no sum',
    inputs: softStretch,
    value: () => 1,
  }),
  described({
    path,
    when: is('soft-stretch-sum'),
    label,
    unit: 'money',
    method: 'as given',
    formula: 'sum of the brief',
    inputs: (at) => ({ ...softStretch(at), sum: `${softStretchOf(at)}/pierPremium` }),
    compute: ({ sum }) => sum,
  }),
  described({
    path,
    when: is('abutment-concrete', 'bank seat', 'full height'),
    label,
    unit: 'm3',
    method: 'volume',
    formula: '(thickness x (seat - foot) + back wall x (road - seat)) x length of the supports',
    inputs: (at) => ({
      ...wings(at),
      seat: `${at.foot}/topLevelM`,
      thickness: `${at.foot}/shaft/lengthM`,
      backWall: wall('backWallM'),
      width: 'site/alongSupportsM',
    }),
    compute: (v) =>
      (v.thickness * Math.max(0, v.seat - v.foot) + Math.max(0, v.road - v.seat) * v.backWall) * v.width,
  }),
  described({
    path,
    when: is('abutment-concrete', 'spill-through'),
    label,
    unit: 'm3',
    method: 'volume',
    formula:
      'columns x side^2 x (foot of the beam - foot) + (beam thickness x its depth + back wall x (road - seat)) x length of the supports',
    inputs: (at) => ({
      ...wings(at),
      seat: `${at.foot}/topLevelM`,
      side: `${at.foot}/shaft/lengthM`,
      columns: `${at.foot}/shaft/columns`,
      beam: wall('seatBeamM'),
      least: wall('leastStemM'),
      backWall: wall('backWallM'),
      width: 'site/alongSupportsM',
    }),
    compute: (v) =>
      v.columns * v.side ** 2 * Math.max(0, v.seat - v.beam - v.foot) +
      (v.least * v.beam + Math.max(0, v.road - v.seat) * v.backWall) * v.width,
  }),
  described({
    path,
    when: is('fill', 'front slope'),
    label,
    unit: 'm3',
    method: 'volume',
    formula:
      'W (berm h + s h^2 / 2) + pi s^2 h^3 / 6: W along the supports, h from the ground to the foot of the beam, s side slope',
    inputs: (at) => ({
      seat: `${at.foot}/topLevelM`,
      beam: wall('seatBeamM'),
      ground: `${at.foot}/groundLevelM`,
      berm: wall('bermM'),
      slope: 'site/road/fillSideSlope',
      width: 'site/alongSupportsM',
    }),
    compute: (v) => {
      const h = Math.max(0, v.seat - v.beam - v.ground);
      return v.width * (v.berm * h + (v.slope * h * h) / 2) + (Math.PI * v.slope ** 2 * h ** 3) / 6;
    },
  }),
  described({
    path,
    when: (at) => isSpill(at) && is('abutment-concrete', 'wing walls')(at),
    label,
    unit: 'm3',
    method: 'volume',
    formula:
      'two wings: side slope x h / cos of the skew long, mean height x h high; h from the foot of the beam to the road',
    inputs: (at) => ({
      road: `${at.foot}/roadM`,
      seat: `${at.foot}/topLevelM`,
      beam: wall('seatBeamM'),
      slope: 'site/road/fillSideSlope',
      ...skew,
      mean: wall('wingMeanHeight'),
      thickness: wall('wingM'),
    }),
    compute: (v) => {
      const h = Math.max(0, v.road - (v.seat - v.beam));
      return (2 * v.slope * h * v.mean * h * v.thickness) / cosineOf(v.skew);
    },
  }),
  described({
    path,
    when: is('abutment-concrete', 'wing walls'),
    label,
    unit: 'm3',
    method: 'volume',
    formula: 'two wings: side slope x h / cos of the skew long, mean height x h high; h from foot to road',
    inputs: (at) => ({ ...wings(at), ...skew, mean: wall('wingMeanHeight'), thickness: wall('wingM') }),
    compute: (v) => {
      const h = Math.max(0, v.road - v.foot);
      return (2 * v.slope * h * v.mean * h * v.thickness) / cosineOf(v.skew);
    },
  }),
  described({
    path,
    when: is('footing-concrete', 'wing footings'),
    label,
    unit: 'm3',
    method: 'volume',
    formula: 'two footings: side slope x h / cos of the skew long, share of h wide; h from foot to road',
    inputs: (at) => ({
      ...wings(at),
      ...skew,
      share: wall('wingFootingWidth'),
      thickness: wall('wingFootingM'),
    }),
    compute: (v) => {
      const h = Math.max(0, v.road - v.foot);
      return (2 * v.slope * h * v.share * h * v.thickness) / cosineOf(v.skew);
    },
  }),
  described({
    path,
    when: is('reinforcement', 'wing footings'),
    label,
    unit: 'kg',
    method: 'product',
    formula: 'concrete x bars per m3',
    inputs: (at) => {
      const concrete = at.support.lines.findIndex(
        (line) => line.item === 'footing-concrete' && line.what === lineOf(at).what,
      );
      return {
        concrete: `${at.foot}/lines/${concrete}/quantity`,
        bars: 'data/substructure/footing/barsKgM3',
      };
    },
    compute: ({ concrete, bars }) => concrete * bars,
  }),
  described({
    path,
    when: is('reinforcement'),
    label,
    unit: 'kg',
    method: 'as sized',
    formula: (at) => `bars of the ${at.support.kind === 'abutment' ? 'walls' : 'shaft'}`,
    inputs: (at) => ({ bars: `${at.foot}/shaft/reinforcementKg` }),
    compute: ({ bars }) => bars,
  }),
  described({
    path,
    when: (at) => is('pier-concrete')(at) || is('hollow-pier-concrete')(at),
    label: (at) => `shaft, ${supportName(at)}`,
    unit: 'm3',
    method: 'as sized',
    formula: 'concrete of the shaft',
    inputs: (at) => ({ shaft: `${at.foot}/shaft/concreteM3` }),
    compute: ({ shaft }) => shaft,
  }),
];
