import { described, type At, type Descriptor, type Strike } from '../../model/index.ts';
import { linesOf, spansOf } from '../common/formManual.ts';

/** Name of a wall: of two or of three. */
const nameOf = (at: At): string => {
  const wall = at.index('wall');
  return wall === 0 ? 'first' : wall === at.design.task.spansM.length ? 'last' : 'middle';
};
const isMiddle = (at: At): boolean => nameOf(at) === 'middle';
const sum = (values: readonly number[]): number => values.reduce((total, value) => total + value, 0);
const wallPath = (what: string): string => `options/:option/designs/:unit/walls/:wall/${what}`;
const wallWord = (at: At): string => `${nameOf(at)} wall`;

const loadOf = (at: At) => at.design.walls![at.index('wall')]!.loads[at.index('load')]!;

/** The feet on which the frame stands in a case of an earthquake. */
const feetWord = (at: At): string => `, ${at.index('k') === 0 ? 'stiff' : 'soft'} feet`;
const shapeOf = (at: At) => ({
  spans: spansOf(at),
  deck: `${at.unit}/task/depthM`,
  height: `${at.unit}/figures/${nameOf(at)}HeightM`,
});

/** A field of all that may strike a wall of the unit. */
const strikesOf = (at: At, field: keyof Strike): string[] =>
  (at.design.task.strikes ?? []).flatMap((strikes, s) =>
    strikes.map((_, k) => `${at.unit}/task/strikes/${s}/${k}/${field}`),
  );

/** What a wall in one with the deck hands to its foundation and to the bill. */
export const wallFigures: readonly Descriptor[] = [
  described({
    path: wallPath('footM'),
    label: (at) => `thickness at the foot, ${wallWord(at)}`,
    unit: 'm',
    method: 'as sized',
    formula: 'thickness of the walls at their foot; of one between two spans as on top',
    inputs: (at) => ({ foot: `${at.unit}/figures/${isMiddle(at) ? 'wallTopM' : 'wallFootM'}` }),
    compute: ({ foot }) => foot,
  }),
  described({
    path: wallPath('heightM'),
    label: (at) => `top of the slab to top of the foundation, ${wallWord(at)}`,
    unit: 'm',
    method: 'as sized',
    formula: 'height of the frame at this end',
    inputs: (at) => ({ height: `${at.unit}/figures/${nameOf(at)}HeightM` }),
    compute: ({ height }) => height,
  }),
  described({
    path: wallPath('movementMm'),
    when: isMiddle,
    label: 'movement of the deck at the middle wall',
    unit: 'mm',
    method: 'product',
    formula: 'movement of each end x difference of the spans / length: the deck grows from its middle',
    inputs: (at) => ({ movement: `${at.unit}/figures/movementMm`, spans: spansOf(at) }),
    compute: ({ movement, spans }) => (movement * Math.abs(spans[0]! - spans[1]!)) / sum(spans),
  }),
  described({
    path: wallPath('movementMm'),
    label: (at) => `movement of the deck at the ${wallWord(at)}`,
    unit: 'mm',
    method: 'as sized',
    formula: 'movement of each end',
    inputs: (at) => ({ movement: `${at.unit}/figures/movementMm` }),
    compute: ({ movement }) => movement,
  }),
  ...(['concreteM3', 'reinforcementKg'] as const).map((what) =>
    described({
      path: wallPath(what),
      label: (at) => `${what === 'concreteM3' ? 'concrete' : 'bars'} of the ${wallWord(at)}`,
      unit: what === 'concreteM3' ? 'm3' : 'kg',
      method: 'sum of the bill',
      formula: 'its measured lines',
      inputs: (at) => ({
        lines: linesOf(
          at,
          ...(what === 'concreteM3' ? [wallWord(at)] : [`${wallWord(at)} upright`, `${wallWord(at)} level`]),
        ),
      }),
      compute: ({ lines }) => sum(lines),
    }),
  ),
  ...(
    [
      ['verticalKN', 'vertical load', 'kN'],
      ['alongKN', 'thrust, towards the span', 'kN'],
      ['momentKNm', 'moment, towards the span', 'kNm'],
    ] as const
  ).map(([field, label, unit]) =>
    described({
      path: wallPath(`loads/:load/${field}`),
      label: (at) => `${label} on the foundation, ${wallWord(at)}, combination ${at.index('load') + 1}`,
      unit,
      method: 'frame on stiff and on soft feet',
      formula: (at) =>
        loadOf(at).struck
          ? 'own weight + superimposed load + fill at rest + a wall of the frame struck, either way, its head held by the deck; no traffic'
          : 'own weight + superimposed load + fill (at rest, least, or K*) + temperature and shrinkage + surcharge + traffic, with or without braking that all walls share by stiffness, characteristic, as they go together',
      inputs: (at) => ({
        spans: spansOf(at),
        deck: `${at.unit}/task/depthM`,
        height: `${at.unit}/figures/${nameOf(at)}HeightM`,
        superimposed: `${at.unit}/task/deck/superimposedKNm`,
        pressed: [`${at.unit}/figures/pressedEarth`, `${at.unit}/figures/pressedEarthSoft`],
        rest: 'data/portal-frame/earth/restPressure',
        active: 'data/portal-frame/earth/activePressure',
        warmer: 'data/portal-frame/temperature/warmerK',
        colder: 'data/portal-frame/temperature/colderK',
        struck: loadOf(at).struck
          ? [`${at.unit}/walls/${at.index('wall')}/loads/${at.index('load')}/struck/alongKN`]
          : [],
      }),
    }),
  ),
  ...(
    [
      ['verticalKN', 'vertical load', 'kN'],
      ['alongKN', 'thrust, towards the span', 'kN'],
      ['momentKNm', 'moment, towards the span', 'kNm'],
    ] as const
  ).flatMap(([field, label, unit]) => [
    described({
      path: wallPath(`quake/:k/rest/${field}`),
      label: (at) => `${label} that rests on the foundation in an earthquake, ${wallWord(at)}${feetWord(at)}`,
      unit,
      method: 'plane frame',
      formula: 'own weight + superimposed load + restraint of the prestress + fill at rest, without traffic',
      inputs: (at) => ({
        ...shapeOf(at),
        superimposed: `${at.unit}/task/deck/superimposedKNm`,
        pressure: 'data/portal-frame/earth/restPressure',
      }),
    }),
    described({
      path: wallPath(`quake/:k/along/${field}`),
      label: (at) => `${label} of an earthquake along the road, ${wallWord(at)}${feetWord(at)}`,
      unit,
      method: 'plane frame',
      formula: 'a share of all permanent weight along the road, which the walls share by stiffness',
      inputs: (at) => ({ ...shapeOf(at), force: `${at.unit}/figures/quakeKN` }),
    }),
  ]),
  described({
    path: wallPath('quake/:k/acrossKN'),
    label: (at) => `force of an earthquake across the road, ${wallWord(at)}${feetWord(at)}`,
    unit: 'kN',
    method: 'product',
    formula: 'share of the weight x (own weight of the wall and what rests on it)',
    inputs: (at) => ({ ...shapeOf(at), share: `${at.unit}/task/quakeShare` }),
  }),
  described({
    path: wallPath('quake/:k/acrossAboveM'),
    label: (at) => `height of that force over the foundation, ${wallWord(at)}${feetWord(at)}`,
    unit: 'm',
    method: 'mean by weight',
    formula: 'the deck at its top, the wall at the middle of its own weight',
    inputs: (at) => ({ ...shapeOf(at), concrete: `${at.unit}/walls/${at.index('wall')}/concreteM3` }),
  }),
  ...(
    [
      ['alongKN', 'force along the road', 'kN'],
      ['acrossKN', 'force across the road', 'kN'],
      ['aboveGroundM', 'height above ground', 'm'],
    ] as const
  ).map(([field, label, unit]) =>
    described({
      path: wallPath(`loads/:load/struck/${field}`),
      label: (at) => `${label} of what strikes a wall, ${wallWord(at)}, combination ${at.index('load') + 1}`,
      unit,
      method: 'as given',
      formula:
        field === 'acrossKN' ? 'of what may strike this wall; 0 at the others' : 'of what may strike a wall',
      inputs: (at) => ({ strikes: strikesOf(at, field) }),
    }),
  ),
];
