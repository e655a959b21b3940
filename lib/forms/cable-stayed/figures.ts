import type { Descriptor } from '../../model/index.ts';
import { formManual, linesOf, spansOf } from '../common/formManual.ts';
import { slabCheckFigures } from '../common/slab/slabFigures.ts';
import { floorCheckFigures } from '../floor/floorFigures.ts';
import { cableCheckFigures } from './checkFigures.ts';

const manual = formManual('cable-stayed');
const { figure, sized, line } = manual;

const sum = (values: readonly number[]): number => values.reduce((total, value) => total + value, 0);
const ratio = (name: string, label: string, over: string, under: string, unit = ''): Descriptor =>
  figure(name, {
    label,
    unit,
    method: 'ratio',
    formula: 'first / second',
    inputs: (at) => ({ over: `${at.unit}/figures/${over}`, under: `${at.unit}/figures/${under}` }),
    compute: (v) => v.over / v.under,
  });
const mass = (name: string, label: string, what: string): Descriptor =>
  figure(name, {
    label,
    unit: 'kg',
    method: 'as measured',
    formula: 'strands x area x length x density of every stay',
    inputs: (at) => ({ line: linesOf(at, what) }),
    compute: (v) => sum(v.line),
  });

/** Cable-stayed deck: layout, stays, pylons and deck. */
export const cableFigures: readonly Descriptor[] = [
  sized(
    'mainSpanM',
    'main span',
    'm',
    'longest span between pylons, or from the pylon to the far end',
    'spans',
  ),
  sized('pylons', 'pylons', 'no', 'supports that carry one', 'spans'),
  figure('pylonHeightM', {
    label: 'highest anchor over the deck',
    unit: 'm',
    method: 'product',
    formula: 'height over main span of one or of two pylons x main span',
    inputs: (at) => ({
      ratio: `data/cable-stayed/pylonHeight/${at.design.figures['pylons'] === 2 ? 'overMainTwo' : 'overMainOne'}`,
      main: `${at.unit}/figures/mainSpanM`,
    }),
    compute: (v) => v.ratio * v.main,
  }),
  ratio('pylonHeightOverMain', 'height of the pylon over the main span', 'pylonHeightM', 'mainSpanM'),
  sized(
    'staySpacingM',
    'spacing of the stays along the deck',
    'm',
    'reach of the stays in equal steps near the spacing aimed at',
    'mainSpanM',
    'data/cable-stayed/staySpacingM/target',
    'data/cable-stayed/staySpacingM/overMain',
  ),
  sized(
    'planesM',
    'distance between the stay planes',
    'm',
    'deck width + two offsets',
    './task/deck/widthM',
    'data/cable-stayed/planeOffsetM',
  ),
  sized(
    'staysPerPlane',
    'stays of one plane',
    'no',
    'reach / spacing on either side of every pylon, and anchor stays',
    'mainSpanM',
    'staySpacingM',
    'data/cable-stayed/anchorStays/most',
  ),
  mass('hungStaysKg', 'stays that carry the deck', 'stays'),
  mass('anchorStaysKg', 'anchor stays', 'anchor stays'),
  ratio(
    'anchorOverHungStays',
    'anchor stays over the stays that carry the deck',
    'anchorStaysKg',
    'hungStaysKg',
  ),
  figure('stayKgM2', {
    label: 'stays per m2 of deck',
    unit: 'kg/m2',
    method: 'ratio',
    formula: 'all stays / (length x deck width)',
    inputs: (at) => ({
      stays: linesOf(at, 'stays', 'anchor stays'),
      spans: spansOf(at),
      width: `${at.unit}/task/deck/widthM`,
    }),
    compute: ({ stays, spans, width }) => sum(stays) / (sum(spans) * width),
  }),
  sized(
    'deckPushKN',
    'push of the stays in the deck at the pylon, lasting load',
    'kN',
    'sum of the level parts of the stays on one side',
    'permanentKNm',
    'pylonHeightM',
    'mainSpanM',
  ),
  sized(
    'pylonLegLengthM',
    'leg of the pylon along the road, at its foot',
    'm',
    'shortest in steps that holds compression and bending with the second order',
    'pylonHeightM',
    'permanentKNm',
    'data/cable-stayed/pylon/stepM',
  ),
  sized(
    'pylonLegWidthM',
    'leg of the pylon across the road, at its foot',
    'm',
    'share of its length and what wind across asks for',
    'pylonLegLengthM',
    'data/cable-stayed/pylon/widthOverLength',
  ),
  sized(
    'pylonWallM',
    'wall of the leg',
    'm',
    'share of its length, at least the least wall',
    'pylonLegLengthM',
    'data/cable-stayed/pylon/wallOverLength',
    'data/cable-stayed/pylon/leastWallM',
  ),
  sized(
    'pylonBarRatio',
    'bars of the leg over its concrete',
    '',
    'least ratio at which the leg holds',
    'pylonLegLengthM',
    'data/cable-stayed/pylon/barRatioLeast',
    'data/cable-stayed/pylon/barRatioMost',
  ),
  sized(
    'pylonTopMovementM',
    'movement of the pylon top under traffic',
    'm',
    'influence line of the plane frame x traffic',
    'pylonHeightM',
    'anchorStaysKg',
    'spans',
  ),
  sized(
    'permanentKNm',
    'lasting load of the deck',
    'kN/m',
    'edge girders + floor + superimposed load, both planes',
    'edgeGirderKgM2',
    'floorSteelKgM2',
    'slabM',
    './task/deck/superimposedKNm',
  ),
  figure('edgeGirderKgM2', {
    label: 'edge girders per m2 of deck',
    unit: 'kg/m2',
    method: 'ratio',
    formula: 'edge girders / (length x deck width)',
    inputs: (at) => ({
      girders: linesOf(at, 'edge girders'),
      spans: spansOf(at),
      width: `${at.unit}/task/deck/widthM`,
    }),
    compute: ({ girders, spans, width }) => sum(girders) / (sum(spans) * width),
  }),
  sized(
    'floorSteelKgM2',
    'cross-girders per m2 of deck',
    'kg/m2',
    'mass per m of deck / deck width',
    'planesM',
    './task/depthM',
    './task/deck/widthM',
    'data/cable-stayed/crossSpacingM',
  ),
  sized(
    'slabM',
    'mean thickness of the slab',
    'm',
    'least thickness between cross-girders at which its bars stay within a practical ratio',
    'data/cable-stayed/crossSpacingM',
    'data/slab/steelRatioMost',
  ),
  sized(
    'deflectionM',
    'deflection of the main span under traffic',
    'm',
    'influence line of deck, stays and pylons x traffic',
    'mainSpanM',
    'pylonHeightM',
    'hungStaysKg',
    'anchorStaysKg',
  ),
  line('slab', {
    label: 'slab',
    unit: 'm3',
    method: 'volume',
    formula: 'mean thickness x length x deck width',
    inputs: (at) => ({
      mean: `${at.unit}/figures/slabM`,
      spans: spansOf(at),
      width: `${at.unit}/task/deck/widthM`,
    }),
    compute: ({ mean, spans, width }) => mean * sum(spans) * width,
  }),
  ...cableCheckFigures,
  ...floorCheckFigures(manual),
  ...slabCheckFigures(manual, 'slabM'),
];
