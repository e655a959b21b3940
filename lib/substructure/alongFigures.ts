import { described, type At, type Descriptor } from '../model/index.ts';
import { deckMaterial } from './deckMaterial.ts';
import { forceAlong, holdingForce, stillAt } from './heldAlong.ts';
import { holding, isShared, permanents, stiffnesses, stillPath } from './heldPaths.ts';
import { heldIn, onGround, unitsAt, type UnitAt } from './meetings.ts';
import { supportName } from './supportFigures.ts';

const sum = (values: readonly number[]): number => values.reduce((total, value) => total + value, 0);
const path = 'options/:option/supports/:support/articulation/alongKN';
const label = (at: At): string => `force along the road, ${supportName(at)}`;

/**
 * Unbalanced friction of the sliding bearings on either side of a fixed point, from their permanent loads:
 * adverse mu (1 + a) / 2 on the side with more, relieving mu (1 - a) / 2 on the other.
 */
function friction(left: readonly number[], right: readonly number[], perLine: number, mu: number): number {
  const pressed = (all: readonly number[]): number => sum(all.map((one) => Math.max(0, one)));
  const n = (left.length + right.length) * perLine;
  const a = n <= 4 ? 1 : n < 10 ? (16 - n) / 12 : 0.5;
  const more = Math.max(pressed(left), pressed(right));
  const less = Math.min(pressed(left), pressed(right));
  return (mu * (1 + a) * more) / 2 - (mu * (1 - a) * less) / 2;
}

/** Force along the road on each support, and how units are held along it. */
export const alongFigures: readonly Descriptor[] = [
  described({
    path,
    when: (at) => unitsAt(at).length === 1 && holding(at).some(({ unit }) => isShared(at, unit)),
    label,
    unit: 'kN',
    method: 'shared by stiffness',
    formula:
      'braking and friction of the unit x stiffness here / that of all that hold it, + stiffness x half of 1000 x (expansion x range of temperature + shortening) x distance to the point that stays',
    inputs: (at) => {
      const [{ unit, s }] = holding(at) as [UnitAt];
      const of = (name: string): string =>
        `data/substructure/movement/${deckMaterial(at.option.designs[unit]!)}/${name}`;
      return {
        force: `${at.root}/held/${unit}/forceKN`,
        own: `${at.root}/held/${unit}/stiffness/${s}`,
        all: stiffnesses(at, unit),
        here: `${at.foot}/chainageM`,
        still: stillPath(at, unit),
        expansion: of('expansionPerK'),
        range: of('rangeK'),
        shortening: of('shorteningPerM'),
      };
    },
    compute: (v) =>
      holdingForce(
        v.force,
        v.own,
        sum(v.all),
        (v.expansion * v.range + v.shortening) * Math.abs(v.here - v.still) * 1000,
      ),
  }),
  described({
    path,
    when: (at) => holding(at).some(({ unit }) => isShared(at, unit)),
    label,
    unit: 'kN',
    method: 'shared by stiffness',
    formula: 'of the units that meet here: what their fixed points take together, or the greater on rubber',
    inputs: (at) => ({ forces: holding(at).map(({ unit }) => `${at.root}/held/${unit}/forceKN`) }),
  }),
  described({
    path,
    when: (at) => holding(at).length === 1 && at.site.standard === 'lm1',
    label,
    unit: 'kN',
    method: 'braking and friction',
    formula:
      'braking of the unit, 360 + 2.7 L up to 900 kN, + unbalanced friction: mu (1 + a) / 2 on the heavier side less mu (1 - a) / 2 on the lighter',
    inputs: (at) => {
      const [held] = holding(at);
      return {
        spans: at.option.designs[held!.unit]!.task.spansM.map((_, i) => `${held!.path}/task/spansM/${i}`),
        base: 'data/substructure/braking/lm1/baseKN',
        perM: 'data/substructure/braking/lm1/perMKN',
        cap: 'data/substructure/braking/lm1/capKN',
        left: permanents(at, held!, (s) => s < held!.s),
        right: permanents(at, held!, (s) => s > held!.s),
        line: 'data/substructure/bearings/perLine',
        mu: 'data/substructure/friction/coefficient',
      };
    },
    compute: (v) => Math.min(v.cap, v.base + v.perM * sum(v.spans)) + friction(v.left, v.right, v.line, v.mu),
    sources: ['EN 1991-2 4.4.1, EN 1337-1 6.2 (from memory)'],
  }),
  described({
    path,
    when: (at) => holding(at).length === 1,
    label,
    unit: 'kN',
    method: 'braking and friction',
    formula:
      'braking: the greater of a share of the truck and of truck with lane load, on the lanes of one direction, + unbalanced friction of the sliding bearings',
    inputs: (at) => {
      const [held] = holding(at);
      const braking = (name: string): string => `data/substructure/braking/hl93/${name}`;
      return {
        spans: at.option.designs[held!.unit]!.task.spansM.map((_, i) => `${held!.path}/task/spansM/${i}`),
        lanes: 'site/deck/lanes',
        truckShare: braking('truckShare'),
        trainShare: braking('trainShare'),
        truck: braking('truckKN'),
        lane: braking('laneKNm'),
        left: permanents(at, held!, (s) => s < held!.s),
        right: permanents(at, held!, (s) => s > held!.s),
        line: 'data/substructure/bearings/perLine',
        mu: 'data/substructure/friction/coefficient',
      };
    },
    compute: (v) =>
      Math.max(v.truckShare * v.truck, v.trainShare * (v.truck + v.lane * sum(v.spans))) *
        Math.max(1, Math.ceil(v.lanes / 2)) +
      friction(v.left, v.right, v.line, v.mu),
    sources: ['AASHTO LRFD 3.6.4, EN 1337-1 6.2 (from memory)'],
  }),
  described({
    path,
    when: (at) => holding(at).length > 1,
    label,
    unit: 'kN',
    method: 'braking and friction',
    formula: 'braking and unbalanced friction of both units, whose fixed points meet here',
    inputs: (at) => ({ permanent: unitsAt(at).flatMap((one) => permanents(at, one, () => true)) }),
  }),
  described({
    path,
    label,
    unit: 'kN',
    method: 'friction',
    formula: 'friction x permanent load of the sliding bearings, the greater of the units that meet',
    inputs: (at) => ({
      permanent: unitsAt(at).flatMap((one) => permanents(at, one, (s) => s === one.s)),
      mu: 'data/substructure/friction/coefficient',
    }),
    compute: ({ permanent, mu }) => Math.max(...permanent.map((one) => mu * Math.max(0, one))),
  }),
  described({
    path: 'options/:option/held/:unit/forceKN',
    label: (at) => `braking and unbalanced friction of unit ${at.index('unit') + 1}`,
    unit: 'kN',
    method: 'braking and friction',
    formula:
      'braking of the unit + unbalanced friction of its supports that slide: mu (1 + a) / 2 on the heavier side less mu (1 - a) / 2 on the lighter',
    value: (at) => forceAlong(onGround(at, at.index('unit')), heldIn(at, at.index('unit'))),
    inputs: (at) => {
      const unit = at.index('unit');
      const { standard } = at.site;
      const names =
        standard === 'lm1'
          ? ['baseKN', 'perMKN', 'capKN']
          : ['truckShare', 'trainShare', 'truckKN', 'laneKNm'];
      return {
        spans: at.design.task.spansM.map((_, i) => `${at.unit}/task/spansM/${i}`),
        braking: names.map((name) => `data/substructure/braking/${standard}/${name}`),
        lanes: 'site/deck/lanes',
        sliding: permanents(at, { unit, s: 0, path: at.unit }, (s) => heldIn(at, unit).stiffnessKNm[s] === 0),
        line: 'data/substructure/bearings/perLine',
        mu: 'data/substructure/friction/coefficient',
      };
    },
    sources: (at) => [
      at.site.standard === 'lm1'
        ? 'EN 1991-2 4.4.1, EN 1337-1 6.2 (from memory)'
        : 'AASHTO LRFD 3.6.4, EN 1337-1 6.2 (from memory)',
    ],
  }),
  described({
    path: 'options/:option/held/:unit/stillM',
    label: (at) => `point of unit ${at.index('unit') + 1} that stays when the deck grows or shrinks`,
    unit: 'm',
    method: 'centre of stiffness',
    formula: 'sum of chainage x stiffness / sum of stiffness, of the supports that hold the unit',
    value: (at) => heldIn(at, at.index('unit')).stillM,
    inputs: (at) => {
      const unit = at.index('unit');
      return {
        places: heldIn(at, unit).stiffnessKNm.flatMap((k, s) =>
          k > 0 ? [`${at.root}/units/${unit}/supportsM/${s}`] : [],
        ),
        stiffness: stiffnesses(at, unit),
      };
    },
    compute: ({ places, stiffness }) => stillAt(places, stiffness),
  }),
  described({
    path: 'options/:option/held/:unit/stiffness/:s',
    label: (at) => `stiffness along the road of support ${at.index('s') + 1} of unit ${at.index('unit') + 1}`,
    unit: 'kN/m',
    method: 'cantilever and rubber',
    formula: (at) =>
      heldIn(at, at.index('unit')).afloat
        ? '1 / (h^3 / 3 E I + height of the rubber / G A): its area by the load, its height by the movement; an abutment is rigid'
        : '3 E I / h^3, h from the foundation to the bearings: the shaft that its slenderness asks for, with what cracks and creep leave of its stiffness; rigid foundation',
    value: (at) => heldIn(at, at.index('unit')).stiffnessKNm[at.index('s')]!,
    inputs: (at) => {
      const { afloat } = heldIn(at, at.index('unit'));
      const bearings = (...names: string[]): string[] =>
        names.map((name) => `data/substructure/bearings/${name}`);
      const support = at.option.supports.findIndex(
        ({ chainageM }) => chainageM === at.option.units[at.index('unit')]!.supportsM[at.index('s')],
      );
      return {
        level: `${at.root}/supports/${support}/topLevelM`,
        ground: `${at.root}/supports/${support}/groundLevelM`,
        width: 'site/alongSupportsM',
        modulus: 'data/substructure/concrete/modulusMPa',
        share: 'data/substructure/concrete/crackedShare',
        slenderness: 'data/substructure/pier/slenderness',
        load: afloat
          ? [
              `${at.unit}/reactions/${at.name('s')}/permanentKN`,
              `${at.unit}/reactions/${at.name('s')}/trafficMaxKN`,
            ]
          : [],
        rubber: afloat ? bearings('rubberShearMPa', 'rubberPressureMPa', 'leastRubberM', 'rubberStrain') : [],
      };
    },
  }),
];
