import { described, type At, type Descriptor } from '../model/index.ts';
import { deckMaterial } from './deckMaterial.ts';
import { stillPath } from './heldPaths.ts';
import { depthPathAt, unitsAt, type UnitAt } from './meetings.ts';
import { supportName } from './supportFigures.ts';

const sum = (values: readonly number[]): number => values.reduce((total, value) => total + value, 0);
const support = (steps: string): string => `options/:option/supports/:support/${steps}`;
const on =
  (what: string) =>
  (at: At): string =>
    `${what}, ${supportName(at)}`;
const factor = (name: string): string => `data/substructure/factors/${name}`;

/** Spans on either side of a support in one unit. */
const spansBeside = (at: At, { s, path, unit }: UnitAt): string[] =>
  [s - 1, s]
    .filter((i) => i >= 0 && i < at.option.designs[unit]!.task.spansM.length)
    .map((i) => `${path}/task/spansM/${i}`);

/** What movement grows from: the fixed point and the material of every unit that rests here. */
const movementFigures = (at: At) => {
  const units = unitsAt(at);
  return {
    here: `${at.foot}/chainageM`,
    fixed: units.map(({ unit }) => stillPath(at, unit)),
    figures: units.flatMap(({ unit }) =>
      ['expansionPerK', 'rangeK', 'shorteningPerM'].map(
        (name) => `data/substructure/movement/${deckMaterial(at.option.designs[unit]!)}/${name}`,
      ),
    ),
  };
};

/** Vessels of the waters a support stands in, and their speeds. */
const vesselsAt = (at: At): { readonly tonnes: string[]; readonly speeds: string[] } => {
  const { waters } = at.site;
  const x = at.support.chainageM;
  const navigable = waters.flatMap(({ fromM, toM, river }, i) =>
    x >= fromM && x <= toM && (river?.vesselDwtT ?? 0) > 0 ? [`site/waters/${i}/river`] : [],
  );
  return {
    tonnes: navigable.map((river) => `${river}/vesselDwtT`),
    speeds: navigable.map((river) => `${river}/vesselSpeedMs`),
  };
};

/** What skew ends press on the bearings of a support, of every unit that rests here with an end span. */
const skewPresses = (at: At): string[] =>
  at.support.articulation.bearings === 0
    ? []
    : unitsAt(at).flatMap(({ unit, path, s }) => {
        const { skewPressKN, task } = at.option.designs[unit]!;
        const isOfEndSpan = s <= 1 || s >= task.spansM.length - 1;
        return skewPressKN === undefined || !isOfEndSpan ? [] : [`${path}/skewPressKN`];
      });

/** How the deck is held at a support. */
export const articulationFigures: readonly Descriptor[] = [
  described({
    path: support('articulation/fixed'),
    label: on('holds the deck along the road'),
    unit: '',
    method: 'choice',
    formula:
      'support nearest the middle of the unit, of equals the lower, then the one in shallower water; with it those beside it, or none where rubber on all of them holds the deck, that leave smaller moments at the feet of the piers, the worst of them counted twice',
    inputs: (at) => ({
      all: unitsAt(at).flatMap(({ unit }) =>
        at.option.units[unit]!.supportsM.map((_, s) => `${at.root}/units/${unit}/supportsM/${s}`),
      ),
    }),
  }),
  described({
    path: support('abutment/integral'),
    label: on('deck cast into the abutment'),
    unit: '',
    method: 'limits of movement and skew',
    formula:
      'one unit of a slab, girder or box form, on bearings over its piers and pressed at its ends; movement from its middle and skew within their limits',
    inputs: (at) => ({
      ends: [at.ends.start, at.ends.end],
      skew: 'site/skewDeg',
      mostSkew: 'data/substructure/integral/mostSkewDeg',
      most: 'data/substructure/integral/mostMovementMm',
      ...movementFigures(at),
    }),
    sources: ['ba-42-96'],
  }),
  described({
    path: support('articulation/bearings'),
    when: (at) => at.support.abutment?.integral === true,
    label: on('bearings'),
    unit: 'no',
    method: 'count',
    formula: 'none, the deck is cast in',
    inputs: (at) => ({ integral: `${at.foot}/abutment/integral` }),
    compute: ({ integral }) => (integral === 1 ? 0 : NaN),
  }),
  described({
    path: support('articulation/bearingKind'),
    label: on('kind of bearings'),
    unit: '',
    method: 'choice',
    formula:
      'laminated rubber where movement / 2 / strain is low enough and each carries its load; else pots',
    inputs: (at) => ({
      load: `${at.foot}/articulation/bearingMN`,
      bearings: `${at.foot}/articulation/bearings`,
      strain: 'data/substructure/bearings/rubberStrain',
      tallest: 'data/substructure/bearings/mostRubberM',
      most: 'data/substructure/bearings/mostElastomericMN',
      ...movementFigures(at),
    }),
  }),
  described({
    path: support('articulation/vesselKN'),
    label: on('force of a vessel'),
    unit: 'kN',
    method: 'head-on impact',
    formula: '120 V sqrt(DWT), V speed in m/s or its preset, DWT in t',
    inputs: (at) => ({
      ...vesselsAt(at),
      factor: 'data/substructure/vessel/factor',
      preset: 'data/substructure/vessel/presetSpeedMs',
    }),
    compute: ({ tonnes, speeds, factor, preset }) =>
      Math.max(
        ...tonnes.map((one, i) => {
          const speed = speeds[i]!;
          return factor * (Number.isFinite(speed) ? speed : preset) * Math.sqrt(one);
        }),
      ),
    sources: ['AASHTO LRFD 3.14.8 (from memory)'],
  }),
  described({
    path: support('articulation/buildingKNm'),
    label: on('moment while the deck is cantilevered from it'),
    unit: 'kNm',
    method: 'as sized',
    formula: 'one arm a segment and its traveller ahead, and heavier by a share of its weight',
    inputs: (at) => ({ unbalanced: unitsAt(at).map(({ path }) => `${path}/figures/unbalancedMomentKNm`) }),
    compute: ({ unbalanced }) => Math.max(...unbalanced),
  }),
  described({
    path: support('articulation/bearings'),
    label: on('bearings'),
    unit: 'no',
    method: 'product',
    formula: 'units that rest here x bearings of a line',
    inputs: (at) => ({
      units: unitsAt(at).map(({ path, s }) => `${path}/reactions/${s}/permanentKN`),
      line: 'data/substructure/bearings/perLine',
    }),
    compute: ({ units, line }) => units.length * line,
  }),
  described({
    path: support('articulation/bearingMN'),
    label: (at) =>
      at.support.articulation.frame
        ? `design load of the deck, ${supportName(at)}`
        : `design load of all bearings, ${supportName(at)}`,
    unit: 'MN',
    method: 'factored sum',
    formula:
      '(gamma G x permanent + gamma Q x traffic x obtuse corner) / 1000, or without the corner and with what skew ends press, if that is more: on a skew all bearings are made like the one there',
    inputs: (at) => ({
      permanent: `${at.foot}/permanentKN`,
      traffic: `${at.foot}/trafficKN`,
      corners: unitsAt(at).flatMap(({ unit, path }) =>
        at.option.designs[unit]!.obtuseCorner === undefined ? [] : [`${path}/obtuseCorner`],
      ),
      twists: skewPresses(at),
      gammaG: factor('permanent'),
      gammaQ: factor('traffic'),
    }),
    compute: (v) => {
      const design = (corner: number): number =>
        Math.max(0, v.gammaG * v.permanent + v.gammaQ * corner * v.traffic);
      return Math.max(design(Math.max(1, ...v.corners)), design(1) + sum(v.twists)) / 1000;
    },
  }),
  described({
    path: support('articulation/acrossKN'),
    when: (at) => unitsAt(at).every((one) => depthPathAt(at, one) !== null),
    label: on('wind across'),
    unit: 'kN',
    method: 'product',
    formula: (at) =>
      `pressure x (structural depth + height of traffic) x half the spans beside it${at.support.kind === 'abutment' ? ' x share of wind beside traffic' : ''}`,
    inputs: (at) => {
      const units = unitsAt(at);
      return {
        pressure: 'data/substructure/wind/pressureKNm2',
        traffic: 'data/substructure/wind/trafficHeightM',
        // One depth for each span beside the support, in step with them.
        depths: units.flatMap((one) => spansBeside(at, one).map(() => depthPathAt(at, one)!)),
        spans: units.flatMap((one) => spansBeside(at, one)),
        share: at.support.kind === 'abutment' ? [factor('windWithTraffic')] : [],
      };
    },
    compute: (v) =>
      sum(v.spans.map((span, i) => (v.pressure * (v.depths[i]! + v.traffic) * span) / 2)) * (v.share[0] ?? 1),
  }),
  described({
    path: support('articulation/acrossKN'),
    label: on('wind across'),
    unit: 'kN',
    method: 'product',
    formula: 'pressure x (depth along the haunch + height of traffic) x half the spans beside it',
    inputs: (at) => ({
      pressure: 'data/substructure/wind/pressureKNm2',
      traffic: 'data/substructure/wind/trafficHeightM',
      depth: `${at.foot}/deckDepthM`,
      spans: unitsAt(at).flatMap((one) => spansBeside(at, one)),
    }),
  }),
  described({
    path: support('articulation/jointMovementMm'),
    when: (at) => at.support.articulation.jointMovementMm > 0,
    label: on('movement of the joint'),
    unit: 'mm',
    method: 'product',
    formula:
      '1000 x (expansion x range of temperature + shortening) x distance to the fixed support, of every unit that ends here',
    inputs: (at) => {
      const units = unitsAt(at);
      const movement = (name: string): string[] =>
        units.map(
          ({ unit }) => `data/substructure/movement/${deckMaterial(at.option.designs[unit]!)}/${name}`,
        );
      return {
        here: `${at.foot}/chainageM`,
        fixed: units.map(({ unit }) => stillPath(at, unit)),
        expansion: movement('expansionPerK'),
        range: movement('rangeK'),
        shortening: movement('shorteningPerM'),
      };
    },
    compute: (v) =>
      sum(
        v.fixed.map(
          (fixed, i) => (v.expansion[i]! * v.range[i]! + v.shortening[i]!) * Math.abs(v.here - fixed) * 1000,
        ),
      ),
  }),
  described({
    path: support('articulation/jointMovementMm'),
    label: on('movement of the joint'),
    unit: 'mm',
    method: 'no joint',
    formula: 'the deck runs through, is fixed here or cast in',
    inputs: (at) => ({ here: `${at.foot}/chainageM` }),
  }),
  described({
    path: support('articulation/tieDownKN'),
    label: on('design uplift'),
    unit: 'kN',
    method: 'factored sum',
    formula: '-(favourable factor x permanent + gamma Q x least traffic), where that is more than 0',
    inputs: (at) => ({
      permanent: `${at.foot}/permanentKN`,
      traffic: `${at.foot}/trafficLeastKN`,
      favourable: factor('favourable'),
      gammaG: factor('permanent'),
      gammaQ: factor('traffic'),
    }),
    compute: (v) =>
      Math.max(
        0,
        -((v.permanent >= 0 ? v.favourable : v.gammaG) * v.permanent + v.gammaQ * Math.min(0, v.traffic)),
      ),
  }),
];
