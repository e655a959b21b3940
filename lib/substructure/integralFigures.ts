import { described, type At, type Descriptor } from '../model/index.ts';
import { foundationAt } from './foundationFigures.ts';
import { unitsAt } from './meetings.ts';
import { soffitFormula, soffitInputs, soffitOver } from './soffitOver.ts';
import { supportName } from './supportFigures.ts';

const support = (steps: string): string => `options/:option/supports/:support/${steps}`;
const on =
  (what: string) =>
  (at: At): string =>
    `${what}, ${supportName(at)}`;
const abutment = (name: string): string => `data/substructure/abutment/${name}`;

/** Path of the wall in one with the deck that stands here; null where an abutment or a pier does. */
export function wallPath(at: At): string | null {
  for (const { unit, s, path } of unitsAt(at)) {
    const k = at.option.designs[unit]!.walls?.findIndex((wall) => wall.support === s) ?? -1;
    if (k >= 0) return `${path}/walls/${k}`;
  }
  return null;
}

const isIntegral = (at: At): boolean => wallPath(at) !== null;
/** A wall between two spans. */
const isMiddle = (at: At): boolean => isIntegral(at) && at.support.kind === 'pier';
const lineIs =
  (ending: string) =>
  (at: At): boolean =>
    isIntegral(at) && at.support.lines[at.index('line')]!.what.endsWith(ending);
/** Concrete of the wings; none of a wall between two spans. */
const wings = (at: At): string[] =>
  at.support.lines.flatMap(({ what }, i) =>
    what.endsWith('wing walls') ? [`${at.foot}/lines/${i}/quantity`] : [],
  );
const sum = (values: readonly number[]): number => values.reduce((total, value) => total + value, 0);

const none = (field: string, label: string, unit: string): Descriptor =>
  described({
    path: support(`articulation/${field}`),
    when: isIntegral,
    label: on(label),
    unit,
    method: 'by definition',
    formula: 'none: deck and wall are in one, no joint, by definition of the form',
    inputs: (at) => ({ wall: `${wallPath(at)!}/heightM` }),
    compute: () => 0,
  });

/** Where a wall is in one with the deck: these speak before those of abutments. */
export const integralFigures: readonly Descriptor[] = [
  described({
    path: support('topLevelM'),
    when: isIntegral,
    label: on('soffit at the wall'),
    unit: 'm',
    method: 'difference',
    formula: soffitFormula,
    inputs: soffitInputs,
    compute: soffitOver,
  }),
  described({
    path: support('footM'),
    when: isIntegral,
    label: on('level of the foot of the wall'),
    unit: 'm',
    method: 'difference',
    formula:
      'road level - surfacing - crossfall x width between kerbs / 2 - height of the wall with the deck',
    inputs: (at) => ({
      road: `${at.foot}/roadM`,
      surfacing: 'site/deck/surfacingM',
      crossfall: 'practice/site/crossfall',
      kerbs: 'site/deck/carriagewayM',
      height: `${wallPath(at)!}/heightM`,
    }),
    compute: (v) => v.road - v.surfacing - (v.crossfall * v.kerbs) / 2 - v.height,
  }),
  described({
    path: support('shaft/lengthM'),
    when: isIntegral,
    label: on('thickness at the foot of the wall'),
    unit: 'm',
    method: 'as sized',
    formula: 'thickness of the wall of the frame',
    inputs: (at) => ({ foot: `${wallPath(at)!}/footM` }),
    compute: ({ foot }) => foot,
  }),
  described({
    path: support('shaft/widthM'),
    when: isMiddle,
    label: on('width of the wall'),
    unit: 'm',
    method: 'as given',
    formula: 'width of the deck along the supports',
    inputs: () => ({ width: 'site/alongSupportsM' }),
    compute: ({ width }) => width,
  }),
  described({
    path: support('pitFromM'),
    when: isMiddle,
    label: on('level the pit is dug from'),
    unit: 'm',
    method: 'least of two levels',
    formula: 'ground, or lower where the wall reaches down: foot of the wall + cover over the cap',
    inputs: (at) => ({
      ground: `${at.foot}/groundLevelM`,
      foot: `${at.foot}/footM`,
      cover: 'data/substructure/piles/capCoverM',
    }),
    compute: (v) => Math.min(v.ground, v.foot + v.cover),
  }),
  described({
    path: support('shaft/concreteM3'),
    when: isIntegral,
    label: on('concrete of the walls'),
    unit: 'm3',
    method: 'sum',
    formula: 'wall of the frame + wings at an end',
    inputs: (at) => ({ wall: `${wallPath(at)!}/concreteM3`, wings: wings(at) }),
    compute: (v) => sum(v.wings) + v.wall,
  }),
  described({
    path: support('shaft/reinforcementKg'),
    when: isIntegral,
    label: on('bars of the walls'),
    unit: 'kg',
    method: 'sum',
    formula: 'bars of the wall of the frame + wings at an end x bars per m3',
    inputs: (at) => ({
      wall: `${wallPath(at)!}/reinforcementKg`,
      wings: wings(at),
      perM3: abutment('barsKgM3'),
    }),
    compute: (v) => v.wall + sum(v.wings) * v.perM3,
  }),
  none('bearings', 'bearings', 'no'),
  none('bearingMN', 'design load of all bearings', 'MN'),
  none('jointMovementMm', 'movement of the joint', 'mm'),
  none('tieDownKN', 'design uplift', 'kN'),
  described({
    path: support('articulation/fixed'),
    when: isIntegral,
    label: on('holds the deck along the road'),
    unit: '',
    method: 'by definition',
    formula: 'deck and wall are in one',
    inputs: (at) => ({ wall: `${wallPath(at)!}/heightM` }),
  }),
  described({
    path: support('articulation/alongKN'),
    when: isIntegral,
    label: on('force along the road'),
    unit: 'kN',
    method: 'greatest of the combinations',
    formula: 'thrust of the frame on its foundation, either way, while nothing strikes it',
    inputs: (at) => {
      const path = wallPath(at)!;
      const { unit, s } = unitsAt(at).find((one) => path.startsWith(one.path))!;
      const wall = at.option.designs[unit]!.walls!.find((one) => one.support === s)!;
      return {
        thrust: wall.loads.flatMap(({ struck }, k) => (struck ? [] : [`${path}/loads/${k}/alongKN`])),
      };
    },
    compute: ({ thrust }) => Math.max(...thrust.map(Math.abs)),
  }),
  described({
    path: support('lines/:line/quantity'),
    when: lineIs(' wings'),
    label: on('bars of the wings'),
    unit: 'kg',
    method: 'product',
    formula: 'concrete of the wings x bars per m3',
    inputs: (at) => ({ wings: wings(at), perM3: abutment('barsKgM3') }),
    compute: (v) => sum(v.wings) * v.perM3,
  }),
  described({
    path: support('foundations/:f/lines/:line/quantity'),
    when: (at) => {
      const { item, what } = foundationAt(at).lines[at.index('line')]!;
      return isIntegral(at) && item === 'reinforcement' && what.endsWith('shaft below ground');
    },
    label: (at) => `bars of the wall below its foot, ${supportName(at)}`,
    unit: 'kg',
    method: 'product',
    formula: 'concrete x bars per m3 of the wall above',
    inputs: (at) => {
      const { lines } = foundationAt(at);
      const { what } = lines[at.index('line')]!;
      const concrete = lines.findIndex((line) => line.what === what && line.item !== 'reinforcement');
      const path = wallPath(at)!;
      return {
        concrete: `${at.foot}/foundations/${at.name('f')}/lines/${concrete}/quantity`,
        bars: `${path}/reinforcementKg`,
        wall: `${path}/concreteM3`,
      };
    },
    compute: (v) => (v.concrete * v.bars) / v.wall,
  }),
];
