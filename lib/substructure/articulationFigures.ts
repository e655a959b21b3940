import { described, type At, type Descriptor } from '../model/index.ts';
import { deckMaterial } from './deckMaterial.ts';
import { forceAlong, holdingForce, stillAt } from './heldAlong.ts';
import { depthPathAt, heldIn, onGround, unitsAt, type UnitAt } from './meetings.ts';
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

/** The units that this support holds along the road, alone or with others. */
const holding = (at: At): UnitAt[] =>
  unitsAt(at).filter(({ unit, s }) => heldIn(at, unit).stiffnessKNm[s]! > 0);

/** Whether more than one support of a unit holds it. */
const isShared = (at: At, unit: number): boolean =>
  heldIn(at, unit).stiffnessKNm.filter((k) => k > 0).length > 1;

/** Path of the chainage that stays where it is when a unit grows or shrinks. */
const stillPath = (at: At, unit: number): string => {
  const alone = heldIn(at, unit).stiffnessKNm.findIndex((k) => k > 0);
  return isShared(at, unit)
    ? `${at.root}/held/${unit}/stillM`
    : `${at.root}/units/${unit}/supportsM/${alone}`;
};

const stiffnesses = (at: At, unit: number): string[] =>
  heldIn(at, unit).stiffnessKNm.flatMap((k, s) => (k > 0 ? [`${at.root}/held/${unit}/stiffness/${s}`] : []));

const permanents = (at: At, { unit, path }: UnitAt, keep: (s: number) => boolean): string[] =>
  at.option.units[unit]!.supportsM.flatMap((_, s) => (keep(s) ? [`${path}/reactions/${s}/permanentKN`] : []));

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
      'one unit of a slab, girder or box form, pressed at its ends; movement from its middle and skew within their limits',
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
    label: on('design load of all bearings'),
    unit: 'MN',
    method: 'factored sum',
    formula: '(gamma G x permanent + gamma Q x traffic) / 1000',
    inputs: (at) => ({
      permanent: `${at.foot}/permanentKN`,
      traffic: `${at.foot}/trafficKN`,
      gammaG: factor('permanent'),
      gammaQ: factor('traffic'),
    }),
    compute: (v) => Math.max(0, v.gammaG * v.permanent + v.gammaQ * v.traffic) / 1000,
  }),
  described({
    path: support('articulation/alongKN'),
    when: (at) => unitsAt(at).length === 1 && holding(at).some(({ unit }) => isShared(at, unit)),
    label: on('force along the road'),
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
    path: support('articulation/alongKN'),
    when: (at) => holding(at).some(({ unit }) => isShared(at, unit)),
    label: on('force along the road'),
    unit: 'kN',
    method: 'shared by stiffness',
    formula: 'of the units that meet here: what their fixed points take together, or the greater on rubber',
    inputs: (at) => ({ forces: holding(at).map(({ unit }) => `${at.root}/held/${unit}/forceKN`) }),
  }),
  described({
    path: support('articulation/alongKN'),
    when: (at) => holding(at).length === 1 && at.site.standard === 'lm1',
    label: on('force along the road'),
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
    path: support('articulation/alongKN'),
    when: (at) => holding(at).length === 1,
    label: on('force along the road'),
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
    path: support('articulation/alongKN'),
    when: (at) => holding(at).length > 1,
    label: on('force along the road'),
    unit: 'kN',
    method: 'braking and friction',
    formula: 'braking and unbalanced friction of both units, whose fixed points meet here',
    inputs: (at) => ({ permanent: unitsAt(at).flatMap((one) => permanents(at, one, () => true)) }),
  }),
  described({
    path: support('articulation/alongKN'),
    label: on('force along the road'),
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
        width: 'site/deck/widthM',
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
