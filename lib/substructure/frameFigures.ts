import { described, type At, type Descriptor, type ShaftInFrame } from '../model/index.ts';
import { deckMaterial } from './deckMaterial.ts';
import { pushedBy, turnedBy } from './framedShaft.ts';
import { holding, isShared, stiffnesses, stillPath } from './heldPaths.ts';
import { heldIn, unitsAt, type UnitAt } from './meetings.ts';
import { crackedEI } from './pierStiffness.ts';
import { shaftDuties } from './shaftDuties.ts';
import { shaftInertia } from './sizeShaft.ts';
import { soffitFormula, soffitInputs, soffitOver } from './soffitOver.ts';
import { supportName } from './supportFigures.ts';

const sum = (values: readonly number[]): number => values.reduce((total, value) => total + value, 0);
const support = (steps: string): string => `options/:option/supports/:support/${steps}`;
const frame = (field: keyof ShaftInFrame): string => support(`articulation/frame/${field}`);
const on =
  (what: string) =>
  (at: At): string =>
    `${what}, ${supportName(at)}`;
const pier = (name: string): string => `data/substructure/pier/${name}`;

/** Whether the deck is cast in with a pier. */
const isFramed = (at: At): boolean => at.support.articulation.frame !== undefined;

/** The unit that is cast in with any of its piers and rests on this support. */
const castInUnit = (at: At): UnitAt | undefined =>
  unitsAt(at).find(({ unit }) => at.option.designs[unit]!.castIn !== undefined);

/** Path of what the deck does at the pier of `:support`. */
function castInPath(at: At, field: string): string {
  const { unit, s, path } = castInUnit(at)!;
  const k = at.option.designs[unit]!.castIn!.findIndex((one) => one.support === s);
  return `${path}/castIn/${k}/${field}`;
}

/** Height of the shaft from its foot to the deck, and what holds its two ends. */
const shaftInputs = (at: At) =>
  ({
    top: `${at.foot}/topLevelM`,
    foot: `${at.foot}/footM`,
    ei: `${at.foot}/articulation/frame/eiKNm2`,
    deck: castInPath(at, 'deckTurnKNm'),
  }) as const;

const shaftOf = (v: {
  readonly top: number;
  readonly foot: number;
  readonly ei: number;
  readonly deck: number;
}) => ({ heightM: v.top - v.foot, eiKNm2: v.ei, deckTurnKNm: v.deck });

const slopeDeflection = 'slope deflection, statics of frames';

/** Piers that the deck is cast in with: these stand before what is said of others. */
export const frameFigures: readonly Descriptor[] = [
  described({
    path: support('articulation/fixed'),
    when: (at) => castInUnit(at) !== undefined,
    label: on('holds the deck along the road'),
    unit: '',
    method: 'as asked',
    formula:
      'the piers that the deck is cast in with hold it: so many neighbours about the middle of the unit',
    inputs: (at) => ({ asked: `${castInUnit(at)!.path}/task/castInPiers` }),
  }),
  described({
    path: support('articulation/bearings'),
    when: isFramed,
    label: on('bearings'),
    unit: 'no',
    method: 'count',
    formula: 'none, the deck is cast in with the pier',
    inputs: (at) => ({ asked: `${castInUnit(at)!.path}/task/castInPiers` }),
    compute: ({ asked }) => (asked > 0 ? 0 : NaN),
  }),
  described({
    path: support('articulation/alongKN'),
    when: isFramed,
    label: on('force along the road'),
    unit: 'kN',
    method: 'shared by stiffness',
    formula: (at) =>
      isShared(at, holding(at)[0]!.unit)
        ? 'braking and friction of the unit x stiffness here / that of all piers it is cast in with'
        : 'braking and friction of the unit, all of it on the one pier it is cast in with',
    inputs: (at) => {
      const { unit, s } = castInUnit(at)!;
      return {
        force: `${at.root}/held/${unit}/forceKN`,
        own: `${at.root}/held/${unit}/stiffness/${s}`,
        all: stiffnesses(at, unit),
      };
    },
    compute: ({ force, own, all }) => (force * own) / sum(all),
  }),
  described({
    path: 'options/:option/held/:unit/stiffness/:s',
    when: (at) => at.design.castIn !== undefined,
    label: (at) => `stiffness along the road of support ${at.index('s') + 1} of unit ${at.index('unit') + 1}`,
    unit: 'kN/m',
    method: 'slope deflection',
    formula:
      'up to 12 E I / h^3, less by how the deck turns: the shaft that its slenderness asks for, with what cracks and creep leave of its stiffness; rigid foundation',
    value: (at) => heldIn(at, at.index('unit')).stiffnessKNm[at.index('s')]!,
    inputs: (at) => {
      const s = at.index('s');
      const x = at.option.units[at.index('unit')]!.supportsM[s];
      const here = at.option.supports.findIndex(({ chainageM }) => chainageM === x);
      const k = at.design.castIn!.findIndex((one) => one.support === s);
      return {
        level: `${at.root}/supports/${here}/topLevelM`,
        ground: `${at.root}/supports/${here}/groundLevelM`,
        deck: `${at.unit}/castIn/${k}/deckTurnKNm`,
        width: 'site/deck/widthM',
        modulus: 'data/substructure/concrete/modulusMPa',
        share: 'data/substructure/concrete/crackedShare',
        slenderness: pier('slenderness'),
      };
    },
  }),
  described({
    path: support('topLevelM'),
    when: isFramed,
    label: on('top of the support'),
    unit: 'm',
    method: 'difference',
    formula: `${soffitFormula}: the soffit, with no bearings under it`,
    inputs: soffitInputs,
    compute: soffitOver,
  }),
  described({
    path: support('shaft/lengthM'),
    when: isFramed,
    label: on('thickness of the shaft'),
    unit: 'm',
    method: 'thinnest that passes',
    formula:
      'axial stress, slenderness as it stands free until the deck is joined, and bending at foot and top with what the deck moves and turns, in steps; a thicker shaft draws more of that, so where none passes the one that is least beyond what it carries',
    inputs: (at) => ({
      ...shaftDuties(at),
      push: `${at.foot}/articulation/frame/pushMm`,
      turned: ['deckTurnKNm', 'laidKNm', 'trafficKNm'].map((field) => castInPath(at, field)),
    }),
  }),
  described({
    path: support('shaft/columns'),
    when: isFramed,
    label: on('columns'),
    unit: 'no',
    method: 'choice',
    formula: 'one leaf, or one hollow shaft above the height for these, in one with the box',
    inputs: (at) => ({ height: `${at.foot}/heightM`, hollow: pier('framedHollowAboveM') }),
  }),
  ...(['concreteM3', 'reinforcementKg'] as const).map((what) =>
    described({
      path: support(`shaft/${what}`),
      when: isFramed,
      label: on(what === 'concreteM3' ? 'concrete of the shaft' : 'bars of the shaft'),
      unit: what === 'concreteM3' ? 'm3' : 'kg',
      method: 'volume',
      formula: `section x height from the foot to the deck${what === 'concreteM3' ? '' : ' x bars per m3 of shafts that the deck bends'}`,
      inputs: (at) => ({
        top: `${at.foot}/topLevelM`,
        foot: `${at.foot}/footM`,
        length: `${at.foot}/shaft/lengthM`,
        width: `${at.foot}/shaft/widthM`,
        wall: pier('wallM'),
        leafBars: pier('framedLeafBarsKgM3'),
        hollowBars: pier('framedHollowBarsKgM3'),
      }),
      compute: (v, at) => {
        const height = Math.max(0, v.top - v.foot);
        const hollow = at.support.shaft.hollow === true;
        const inside = hollow ? Math.max(0, v.length - 2 * v.wall) * Math.max(0, v.width - 2 * v.wall) : 0;
        const perM3 = what === 'concreteM3' ? 1 : hollow ? v.hollowBars : v.leafBars;
        return (v.length * v.width - inside) * height * perM3;
      },
    }),
  ),
  described({
    path: frame('eiKNm2'),
    label: on('bending stiffness of the shaft along the road'),
    unit: 'kNm2',
    method: 'product',
    formula:
      'E x I x what cracks and creep leave: movements bend cracked and creeping sections, with the moments they then have (EN 1992-1-1 5.4(3))',
    inputs: (at) => ({
      top: `${at.foot}/topLevelM`,
      foot: `${at.foot}/footM`,
      length: `${at.foot}/shaft/lengthM`,
      width: `${at.foot}/shaft/widthM`,
      wall: pier('wallM'),
      modulus: 'data/substructure/concrete/modulusMPa',
      share: 'data/substructure/concrete/crackedShare',
    }),
    compute: (v, at) => crackedEI(shaftInertia(v.length, v.width, at.support.shaft.hollow === true)),
    sources: ['EN 1992-1-1 5.4(3) (from memory)'],
  }),
  described({
    path: frame('pushMm'),
    label: on('movement of the deck over the shaft from where it was cast'),
    unit: 'mm',
    method: 'product',
    formula:
      '1000 x (expansion x range of temperature / 2 + shortening) x distance to the point that stays; joints and bearings have the whole range',
    inputs: (at) => {
      const { unit } = castInUnit(at)!;
      const of = (name: string): string =>
        `data/substructure/movement/${deckMaterial(at.option.designs[unit]!)}/${name}`;
      return {
        here: `${at.foot}/chainageM`,
        still: stillPath(at, unit),
        expansion: of('expansionPerK'),
        range: of('rangeK'),
        shortening: of('shorteningPerM'),
      };
    },
    compute: (v) => 1000 * ((v.expansion * v.range) / 2 + v.shortening) * Math.abs(v.here - v.still),
  }),
  described({
    path: frame('stillM'),
    label: on('point that stays when the deck over the shaft moves'),
    unit: 'm',
    method: 'as held',
    formula:
      'the pier, where the deck is cast in with it alone; else the centre of stiffness of those it is cast in with',
    inputs: (at) => ({ still: stillPath(at, castInUnit(at)!.unit) }),
    compute: ({ still }) => still,
  }),
  described({
    path: frame('cooledMm'),
    label: on('movement of the deck over the shaft as it cools'),
    unit: 'mm',
    method: 'product',
    formula: '1000 x expansion x range of temperature / 2 x distance to the point that stays',
    inputs: (at) => {
      const of = (name: string): string =>
        `data/substructure/movement/${deckMaterial(at.option.designs[castInUnit(at)!.unit]!)}/${name}`;
      return {
        here: `${at.foot}/chainageM`,
        still: `${at.foot}/articulation/frame/stillM`,
        expansion: of('expansionPerK'),
        range: of('rangeK'),
      };
    },
    compute: (v) => ((1000 * v.expansion * v.range) / 2) * Math.abs(v.here - v.still),
  }),
  described({
    path: frame('pushedKNm'),
    label: on('moment at the foot of the shaft from that movement'),
    unit: 'kNm',
    method: 'slope deflection',
    formula:
      '6 E I push / h^2 x (K + 2 E I / h) / (K + 4 E I / h), K of the deck against turning: 6 E I push / h^2 under a rigid deck, 3 under one that turns freely',
    inputs: (at) => ({ ...shaftInputs(at), push: `${at.foot}/articulation/frame/pushMm` }),
    compute: (v) => pushedBy(shaftOf(v), v.push / 1000).footKNm,
    sources: [slopeDeflection],
  }),
  described({
    path: frame('turnedKNm'),
    label: on('moment at the top of the shaft from what is laid on the deck and from traffic'),
    unit: 'kNm',
    method: 'distributed by stiffness',
    formula:
      '(couple of what is laid + of traffic) x 4 E I / h / (K + 4 E I / h); what creep turns is left out, for the weight of the arms and their tendons turn the deck opposite ways',
    inputs: (at) => ({
      ...shaftInputs(at),
      laid: castInPath(at, 'laidKNm'),
      traffic: castInPath(at, 'trafficKNm'),
    }),
    compute: (v) => turnedBy(shaftOf(v), v.laid + v.traffic).topKNm,
    sources: [slopeDeflection],
  }),
  described({
    path: frame('designKNm'),
    label: on('design moment along the road of the shaft in one with the deck'),
    unit: 'kNm',
    method: 'worst end and combination',
    formula:
      'gamma x (braking and friction, what the deck turns) + movement with its own factor, at foot or top, each in its worse direction; or one arm ahead while the deck is built, held by the shaft alone',
    inputs: (at) => ({
      along: `${at.foot}/articulation/alongKN`,
      pushed: `${at.foot}/articulation/frame/pushedKNm`,
      turned: `${at.foot}/articulation/frame/turnedKNm`,
      building:
        at.support.articulation.buildingKNm === undefined ? [] : [`${at.foot}/articulation/buildingKNm`],
      gammaQ: 'data/substructure/factors/traffic',
      imposed: 'data/substructure/factors/imposed',
    }),
  }),
  described({
    path: frame('carriesKNm'),
    label: on('moment that the shaft carries there'),
    unit: 'kNm',
    method: 'section in bending',
    formula:
      'N t (1 - N / (A fcd)) / 2 + half of the vertical bars x fyd x 0.8 t, N permanent; at the foot with its own weight',
    inputs: (at) => ({
      permanent: `${at.foot}/permanentKN`,
      concrete: `${at.foot}/shaft/concreteM3`,
      bars: `${at.foot}/shaft/reinforcementKg`,
      thickness: `${at.foot}/shaft/lengthM`,
      share: pier('verticalShare'),
    }),
  }),
  ...(
    [
      ['heightM', 'height of the shaft', 'm'],
      ['eiKNm2', 'bending stiffness of the shaft', 'kNm2'],
      ['shortenedM', 'movement of the deck over the shaft as it shortens', 'm'],
      ['cooledM', 'movement of the deck over the shaft as it cools', 'm'],
    ] as const
  ).map(([field, label, unit]) =>
    described({
      path: `options/:option/designs/:unit/task/shafts/:k/${field}`,
      label: (at) =>
        `${label} under support ${at.design.task.shafts![at.index('k')]!.support + 1} of the unit`,
      unit,
      method: 'as it stands',
      formula:
        'of the shafts that stand under the deck while it is sized without their restraint, heights to 0.1 m and movements to 1 mm; towards the end of the unit positive',
      inputs: (at) => ({
        at: `${at.root}/units/${at.name('unit')}/supportsM/${at.design.task.shafts![at.index('k')]!.support}`,
        asked: `${at.unit}/task/castInPiers`,
        depth: `${at.unit}/task/depthM`,
        road: ['site/road/startLevelM', 'site/road/endLevelM'],
      }),
    }),
  ),
  ...(
    [
      [
        'deckTurnKNm',
        'couple that turns the deck by one radian over the pier',
        'kNm',
        'sum of both sides built in at the pier, the other supports letting the deck turn; inertia varying',
        'pierInertiaM4',
        'inertiaM4',
      ],
      [
        'laidKNm',
        'couple that keeps the deck from turning over the pier under what is laid on it',
        'kNm',
        'moments of the two sides built in at the pier, one less the other',
        'pierInertiaM4',
      ],
      [
        'trafficKNm',
        'couple that keeps the deck from turning over the pier under traffic',
        'kNm',
        'greatest moment of one side built in at the pier less the least of the other, on influence lines; other piers turn freely: on the safe side',
        'pierInertiaM4',
      ],
    ] as const
  ).map(([field, label, unit, formula, ...names]) =>
    described({
      path: `options/:option/designs/:unit/castIn/:k/${field}`,
      label: (at) => `${label}, support ${at.design.castIn![at.index('k')]!.support + 1} of the unit`,
      unit,
      method: 'beam statics',
      formula,
      inputs: (at) => ({
        spans: at.design.task.spansM.map((_, i) => `${at.unit}/task/spansM/${i}`),
        stiffness: names.map((name) => `${at.unit}/figures/${name}`),
        laid: field === 'laidKNm' ? [`${at.unit}/task/deck/superimposedKNm`] : [],
      }),
    }),
  ),
];
