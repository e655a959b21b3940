import { described, type At, type Descriptor } from '../model/index.ts';
import { levelOnRoad, onRoad, onRoadFormula } from '../site/onRoad.ts';
import { depthOver } from './depthOver.ts';
import { depthPathAt, unitsAt } from './meetings.ts';
import { soffitFormula, soffitInputs, soffitOver } from './soffitOver.ts';

const sum = (values: readonly number[]): number => values.reduce((total, value) => total + value, 0);

/** Name of a support as it is printed. */
export function supportName(at: At): string {
  const index = at.index('support');
  const { kind } = at.support;
  if (kind === 'abutment') return index === 0 ? 'start abutment' : 'end abutment';
  return `${kind.replace('-', ' ')} ${index}`;
}

/** The two surveyed points on either side of a support; null beyond the survey. */
function groundPoints(at: At): readonly [low: number, high: number] | null {
  const { groundX } = at.site;
  const high = groundX.findIndex((x) => x > at.support.chainageM);
  return high > 0 ? [high - 1, high] : null;
}

function watersAt(at: At): number[] {
  const x = at.support.chainageM;
  return at.site.waters.flatMap(({ fromM, toM }, i) => (x >= fromM && x <= toM ? [i] : []));
}

/** The unit and place a reaction of the support is read at. */
const reactions = (at: At, field: string): string[] =>
  unitsAt(at).map(({ path, s }) => `${path}/reactions/${s}/${field}`);

const support = (steps: string): string => `options/:option/supports/:support/${steps}`;
const on =
  (what: string) =>
  (at: At): string =>
    `${what}, ${supportName(at)}`;

/** Levels, heights and loads of a support. */
export const supportFigures: readonly Descriptor[] = [
  described({
    path: support('chainageM'),
    label: on('chainage'),
    unit: 'm',
    method: 'as arranged',
    formula: 'where the units are held',
    inputs: (at) => {
      const [first] = unitsAt(at);
      return { place: `${at.root}/units/${first!.unit}/supportsM/${first!.s}` };
    },
    compute: ({ place }) => place,
  }),
  described({
    path: support('groundLevelM'),
    when: (at) => groundPoints(at) !== null,
    label: on('ground level'),
    unit: 'm',
    method: 'straight line',
    formula: 'between the surveyed points on either side: z0 + (z1 - z0) (x - x0) / (x1 - x0)',
    inputs: (at) => {
      const points = groundPoints(at)!;
      return {
        x: `${at.foot}/chainageM`,
        chainages: points.map((i) => `site/groundX/${i}`),
        levels: points.map((i) => `site/groundZ/${i}`),
      };
    },
    compute: ({ x, chainages, levels }) =>
      levels[0]! + ((levels[1]! - levels[0]!) * (x - chainages[0]!)) / (chainages[1]! - chainages[0]!),
  }),
  described({
    path: support('groundLevelM'),
    label: on('ground level'),
    unit: 'm',
    method: 'last surveyed point',
    formula: 'level beyond the survey',
    inputs: (at) => ({ x: `${at.foot}/chainageM` }),
  }),
  described({
    path: support('deckDepthM'),
    when: (at) => unitsAt(at).every((one) => depthPathAt(at, one) !== null),
    label: on('structural depth over the support'),
    unit: 'm',
    method: 'deepest unit',
    formula: 'greatest depth of the units that rest here',
    value: (at) => Math.max(...unitsAt(at).map(({ unit, s }) => depthOver(at.option.designs[unit]!, s))),
    inputs: (at) => ({ depths: unitsAt(at).map((one) => depthPathAt(at, one)!) }),
    compute: ({ depths }) => Math.max(...depths),
  }),
  described({
    path: support('deckDepthM'),
    label: on('structural depth over the support'),
    unit: 'm',
    method: 'along the haunch',
    formula: 'read off the depth along the unit here; greatest of the units',
    value: (at) => Math.max(...unitsAt(at).map(({ unit, s }) => depthOver(at.option.designs[unit]!, s))),
    inputs: (at) => ({
      depths: unitsAt(at).flatMap(({ path }) => [`${path}/depthM/support`, `${path}/depthM/midspan`]),
    }),
  }),
  described({
    path: support('roadM'),
    label: on('road level'),
    unit: 'm',
    method: 'vertical alignment',
    formula: onRoadFormula,
    inputs: (at) => onRoad(at, at.support.chainageM, `${at.foot}/chainageM`),
    compute: (v) => levelOnRoad(v),
  }),
  described({
    path: support('topLevelM'),
    label: on('top of the support'),
    unit: 'm',
    method: 'difference',
    formula: `${soffitFormula} - height of the bearing`,
    inputs: (at) => ({ ...soffitInputs(at), bearing: 'data/substructure/bearings/heightM' }),
    compute: (v) => soffitOver(v) - v.bearing,
  }),
  described({
    path: support('heightM'),
    label: on('height over the ground'),
    unit: 'm',
    method: 'difference',
    formula: 'top of the support - ground level, at least 0',
    inputs: (at) => ({ top: `${at.foot}/topLevelM`, ground: `${at.foot}/groundLevelM` }),
    compute: ({ top, ground }) => Math.max(0, top - ground),
  }),
  described({
    path: support('waterDepthM'),
    label: on('depth of water'),
    unit: 'm',
    method: 'difference',
    formula: 'ordinary water level - bed level, at least 0; none on land',
    inputs: (at) => ({
      levels: watersAt(at).map((i) => `site/waters/${i}/levelM`),
      bed: `${at.foot}/groundLevelM`,
    }),
    compute: ({ levels, bed }) => Math.max(0, ...levels.map((level) => level - bed)),
  }),
  ...(['permanent', 'traffic'] as const).map((load) =>
    described({
      path: support(`${load}KN`),
      label: on(`${load} load`),
      unit: 'kN',
      method: 'sum',
      formula: 'reactions of the units that rest here',
      inputs: (at) => ({ reactions: reactions(at, load === 'permanent' ? 'permanentKN' : 'trafficMaxKN') }),
      compute: ({ reactions: all }) => sum(all),
    }),
  ),
  described({
    path: support('trafficLeastKN'),
    label: on('least traffic load'),
    unit: 'kN',
    method: 'sum',
    formula: 'least traffic reactions of the units that rest here; negative is uplift',
    inputs: (at) => ({ reactions: reactions(at, 'trafficMinKN') }),
    compute: ({ reactions: all }) => sum(all),
  }),
];
