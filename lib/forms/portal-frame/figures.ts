import type { At, Descriptor } from '../../model/index.ts';
import { formManual, linesOf, spansOf } from '../common/formManual.ts';
import { portalChecks } from './checkFigures.ts';
import { wallFigures } from './wallFigures.ts';

const { figure, sized } = formManual('portal-frame');

const sum = (values: readonly number[]): number => values.reduce((total, value) => total + value, 0);
const shape = (name: string): string => `data/portal-frame/shape/${name}`;
const frame = [
  'spans',
  './task/depthM',
  'kneeDepthM',
  'wallTopM',
  'wallFootM',
  'firstHeightM',
  'middleHeightM',
  'lastHeightM',
] as const;
const footing = [
  'data/portal-frame/foot/lengthOverHeight',
  'data/portal-frame/foot/leastLengthM',
  './task/deck/widthM',
] as const;
const onFeet = ['data/portal-frame/foot/stiffKNm3', ...footing] as const;
const onSoft = ['data/portal-frame/foot/softKNm3', ...footing] as const;
const heldAlong =
  'plane frame; a foot is held along by modulus of the ground x length x width, the length a share of the height of its wall';
const stiffFeet = `${heldAlong}, and against turning by modulus x width x length^3 / 12`;
const softFeet = `${heldAlong}, and turns freely`;
const deckBars = ['soffit along', 'top along', 'across', 'links', 'chairs and details'];
const walls = ['first wall', 'middle wall', 'last wall'];
const wallBars = walls.flatMap((wall) => [`${wall} upright`, `${wall} level`]);
const area = (at: At) => ({ spans: spansOf(at), width: `${at.unit}/task/deck/widthM` }) as const;
const ends = ['first', 'last'] as const;
const clear = (at: At): string[] =>
  at.design.task.clearUnderM?.map((_, s) => `${at.unit}/task/clearUnderM/${s}`) ?? [];

const statics = (
  name: string,
  label: string,
  unit: string,
  formula: string,
  feet: readonly string[],
): Descriptor => sized(name, label, unit, formula, ...frame, ...feet);

/** Portal frames: shape, statics on both kinds of feet, thrust and movement, steel, checks, walls. */
export const portalFigures: readonly Descriptor[] = [
  sized(
    'kneeDepthM',
    'depth of the deck at the walls',
    'm',
    'share of the depth at midspan, at least the least of the published band',
    './task/depthM',
    'spans',
    shape('kneeOverMidspan'),
  ),
  sized(
    'wallTopM',
    'thickness of the walls under the deck',
    'm',
    'share of the knee, in steps',
    'kneeDepthM',
    shape('legOverKnee'),
  ),
  sized(
    'wallFootM',
    'thickness of the walls at the foot',
    'm',
    'share of the top, in steps',
    'wallTopM',
    shape('footOverTop'),
  ),
  ...(['first', 'middle', 'last'] as const).map((end) =>
    figure(`${end}HeightM`, {
      label: `top of the slab to top of the foundation, ${end} wall`,
      unit: 'm',
      method: 'greater of two',
      formula:
        'height under the deck + depth at midspan + cover of the footing; at least the shortest wall that is not too stiff + knee',
      inputs: (at) => ({
        clear: clear(at).filter((_, i, all) => i === { first: 0, middle: 1, last: all.length - 1 }[end]),
        depth: `${at.unit}/task/depthM`,
        knee: `${at.unit}/figures/kneeDepthM`,
        spans: spansOf(at),
        assumed: 'data/portal-frame/leg/assumedClearM',
        below: 'data/portal-frame/leg/belowGroundM',
        least: 'data/portal-frame/leg/leastM',
        share: 'data/portal-frame/leg/leastOverSpan',
      }),
      compute: (v) =>
        Math.max(
          Math.max(v.least, v.share * Math.max(...v.spans)) + v.knee,
          (v.clear[0] ?? v.assumed) + v.depth + v.below,
        ),
    }),
  ),
  sized(
    'wingM',
    'length of each wing',
    'm',
    'grows with the depth past the one of a plain slab, to the longest',
    './task/depthM',
    './task/deck/widthM',
    'data/slab-deck/wings/fromDepthM',
  ),
  statics('kneeOwnKNm', 'own-weight moment at the knee, stiff feet', 'kNm', stiffFeet, onFeet),
  statics('kneeOwnSoftKNm', 'own-weight moment at the knee, soft feet', 'kNm', softFeet, onSoft),
  statics('midspanOwnKNm', 'own-weight moment at midspan, stiff feet', 'kNm', stiffFeet, onFeet),
  statics('midspanOwnSoftKNm', 'own-weight moment at midspan, soft feet', 'kNm', softFeet, onSoft),
  statics(
    'middleOwnKNm',
    'own-weight moment over the middle wall, on the side of the last span, stiff feet',
    'kNm',
    stiffFeet,
    onFeet,
  ),
  statics(
    'middleOwnSoftKNm',
    'own-weight moment over the middle wall, on the side of the last span, soft feet',
    'kNm',
    softFeet,
    onSoft,
  ),
  figure('middleStruckKN', {
    label: 'greatest force along the road that may strike the middle wall',
    unit: 'kN',
    method: 'greatest',
    formula: 'of vehicles, trains and vessels within reach',
    inputs: (at) => ({
      strikes: (at.design.task.strikes![1] ?? []).map((_, k) => `${at.unit}/task/strikes/1/${k}/alongKN`),
    }),
    compute: ({ strikes }) => Math.max(...strikes),
    sources: ['EN 1991-1-7 tables 4.1 and 4.4, AASHTO LRFD 3.14 (from memory)'],
  }),
  statics(
    'middleStruckKNm',
    'greatest moment of that force alone in the middle wall, its foot on the ground and its head held by the deck',
    'kNm',
    'plane frame, the worse of stiff and soft feet',
    ['middleStruckKN', ...onFeet, 'data/portal-frame/foot/softKNm3'],
  ),
  figure('quakeKN', {
    label: 'force of an earthquake along the road',
    unit: 'kN',
    method: 'product',
    formula: 'share of the weight x permanent load of all walls',
    inputs: (at) => ({
      share: `${at.unit}/task/quakeShare`,
      permanent: at.design.reactions.map((_, s) => `${at.unit}/reactions/${s}/permanentKN`),
    }),
    compute: ({ share, permanent }) => share * sum(permanent),
    sources: ['EN 1998-2 4.1.6 and 5.5 (from memory)'],
  }),
  statics(
    'quakeWallKNm',
    'greatest moment of that force alone in a wall',
    'kNm',
    'plane frame, deck and walls drawn by their weight, the worse of stiff and soft feet',
    ['quakeKN', ...onFeet, 'data/portal-frame/foot/softKNm3'],
  ),
  statics('thrustOwnKN', 'own-weight thrust outwards, stiff feet', 'kN', stiffFeet, onFeet),
  statics('thrustOwnSoftKN', 'own-weight thrust outwards, soft feet', 'kN', softFeet, onSoft),
  ...(
    [
      ['kneeDesignKNm', 'design moment of the deck where its top bars are used most'],
      ['midspanDesignKNm', 'design moment of the deck where its soffit bars are used most'],
    ] as const
  ).map(([name, label]) =>
    sized(
      name,
      label,
      'kNm',
      'worst of both kinds of feet, every action where it adds',
      ...frame,
      './task/deck/superimposedKNm',
      'pressedEarth',
      'vehicleWidthM',
    ),
  ),
  ...(
    [
      ['pressedEarth', 'stiffFactor', 'on rock'],
      ['pressedEarthSoft', 'softFactor', 'on soil'],
    ] as const
  ).map(([name, factor, where]) =>
    figure(name, {
      label: `pressure of fill pressed by the warm deck, K*, ${where}`,
      unit: '',
      method: 'ratcheting of the fill',
      formula: 'K0 + Kp (C x share x expansion x range x length / 2 / H)^power, H the lower outer wall',
      inputs: (at) => ({
        rest: 'data/portal-frame/earth/restPressure',
        passive: 'data/portal-frame/earth/passivePressure',
        factor: `data/portal-frame/earth/${factor}`,
        share: 'data/portal-frame/earth/movedAtMiddle',
        power: 'data/portal-frame/earth/power',
        expansion: 'data/portal-frame/temperature/expansion1PerK',
        warmer: 'data/portal-frame/temperature/warmerK',
        colder: 'data/portal-frame/temperature/colderK',
        spans: spansOf(at),
        heights: ends.map((end) => `${at.unit}/figures/${end}HeightM`),
      }),
      compute: (v) => {
        const moved = v.share * v.expansion * (v.warmer + v.colder) * (sum(v.spans) / 2);
        return v.rest + v.passive * ((v.factor * moved) / Math.min(...v.heights)) ** v.power;
      },
      sources: ['PD 6694-1 9.4, BA 42/96 (from memory)'],
    }),
  ),
  ...(
    [
      ['thrustOutMostKN', 'greatest thrust outwards on a foundation', -1],
      ['thrustInMostKN', 'greatest push inwards on a foundation', 1],
    ] as const
  ).map(([name, label, sign]) =>
    figure(name, {
      label,
      unit: 'kN',
      method: 'greatest of the combinations',
      formula: 'of the outer walls, characteristic; 0 where none pushes that way',
      inputs: (at) => ({
        loads: at.design.walls!.flatMap(({ loads }, w, all) =>
          w === 0 || w === all.length - 1
            ? loads.map((_, k) => `${at.unit}/walls/${w}/loads/${k}/alongKN`)
            : [],
        ),
      }),
      compute: ({ loads }) => Math.max(0, ...loads.map((one) => sign * one)),
    }),
  ),
  figure('movementMm', {
    label: 'movement of each end, warm to cold, with shrinkage',
    unit: 'mm',
    method: 'product',
    formula: '1000 x (expansion x range of temperature + shrinkage) x length / 2',
    inputs: (at) => ({
      expansion: 'data/portal-frame/temperature/expansion1PerK',
      warmer: 'data/portal-frame/temperature/warmerK',
      colder: 'data/portal-frame/temperature/colderK',
      shrinkage: 'data/portal-frame/shrinkage/strain',
      spans: spansOf(at),
    }),
    compute: (v) => ((v.expansion * (v.warmer + v.colder) + v.shrinkage) * sum(v.spans) * 1e3) / 2,
  }),
  sized(
    'vehicleWidthM',
    'width of deck that carries a vehicle in bending',
    'm',
    'moment of one vehicle on a beam / greatest moment per metre of the plate with its lanes; AASHTO: equivalent strip',
    'spans',
    './task/depthM',
    './task/deck/widthM',
    './task/deck/carriagewayM',
    'data/slab-deck/strip/innerSpan',
  ),
  sized(
    'barsLowM2PerM',
    'bars along in the soffit, most',
    'm2/m',
    'ultimate moment and, without tendons, cracks',
    ...frame,
    'midspanDesignKNm',
  ),
  sized(
    'barsKneeM2PerM',
    'bars along in the top, most',
    'm2/m',
    'ultimate moment and, without tendons, cracks',
    ...frame,
    'kneeDesignKNm',
  ),
  figure('concreteM3M2', {
    label: 'concrete of deck and walls per m2 of deck',
    unit: 'm3/m2',
    method: 'ratio',
    formula: '(deck + walls) / (length x deck width)',
    inputs: (at) => ({ lines: linesOf(at, 'frame deck', ...walls), ...area(at) }),
    compute: ({ lines, spans, width }) => sum(lines) / (sum(spans) * width),
  }),
  figure('deckConcreteM3M2', {
    label: 'concrete of the deck per m2 of deck',
    unit: 'm3/m2',
    method: 'ratio',
    formula: 'deck / (length x deck width)',
    inputs: (at) => ({ lines: linesOf(at, 'frame deck'), ...area(at) }),
    compute: ({ lines, spans, width }) => sum(lines) / (sum(spans) * width),
  }),
  figure('barsKgM3', {
    label: 'bars per m3 of concrete of the deck',
    unit: 'kg/m3',
    method: 'ratio',
    formula: 'bars of the deck / its concrete',
    inputs: (at) => ({ bars: linesOf(at, ...deckBars), concrete: linesOf(at, 'frame deck') }),
    compute: (v) => sum(v.bars) / sum(v.concrete),
  }),
  figure('wallBarsKgM3', {
    label: 'bars per m3 of concrete of the walls',
    unit: 'kg/m3',
    method: 'ratio',
    formula: 'bars of the walls / their concrete',
    inputs: (at) => ({ bars: linesOf(at, ...wallBars), concrete: linesOf(at, ...walls) }),
    compute: (v) => sum(v.bars) / sum(v.concrete),
  }),
  sized(
    'tendonCount',
    'tendons side by side',
    'no',
    'at their usual distance; closer where the strands ask for it',
    'strandCount',
    'data/slab-deck/tendons/usualM',
  ),
  sized(
    'strandCount',
    'strands',
    'no',
    'force that service asks for / lasting force of a strand, rounded up',
    'tendonForceKN',
    'lastingStressMPa',
  ),
  sized(
    'tendonForceKN',
    'lasting force of the tendons',
    'kN',
    'fewest strands with which service and strength hold',
    ...frame,
    'kneeOwnKNm',
    'midspanOwnSoftKNm',
  ),
  sized(
    'lastingStressMPa',
    'stress of the strands after all losses',
    'MPa',
    'jacking stress less friction, shortening, creep and relaxation',
    'spans',
    './task/depthM',
    'data/concrete-box/losses/longTerm',
  ),
  figure('strandKgM2', {
    label: 'strand per m2 of deck',
    unit: 'kg/m2',
    method: 'ratio',
    formula: 'tendons / (length x deck width)',
    inputs: (at) => ({ strand: linesOf(at, 'tendons'), ...area(at) }),
    compute: (v) => sum(v.strand) / (sum(v.spans) * v.width),
  }),
  sized(
    'kneeParasiticKNm',
    'parasitic moment of the tendons at the knee',
    'kNm',
    'restraint of the shortening and bending of the deck by the walls',
    ...frame,
    'tendonForceKN',
  ),
  sized(
    'thrustLostShare',
    'share of the tendon force that the walls hold back',
    '',
    'restraint of the shortening of the deck / lasting force',
    ...frame,
    'tendonForceKN',
  ),
  ...portalChecks,
  ...wallFigures,
];
