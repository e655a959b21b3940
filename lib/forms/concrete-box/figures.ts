import type { At, Descriptor } from '../../model/index.ts';
import { acrossFigures } from './acrossFigures.ts';
import { formManual, linesOf, spansOf } from '../common/formManual.ts';
import { slabCheckFigures } from '../common/slab/slabFigures.ts';
import { boxCheckFigures } from './checkFigures.ts';
import { concreteFigures } from './concreteFigures.ts';
import { ribFigures } from './ribFigures.ts';
import { strutFigures } from './strutFigures.ts';
import { tendonFigures } from './tendonFigures.ts';

const manual = formManual('concrete-box');
const { figure, sized, line } = manual;

const sum = (values: readonly number[]): number => values.reduce((total, value) => total + value, 0);
const concrete = ['box', 'blisters and joints', 'diaphragms', 'ribs under the slab'] as const;
const bars = [
  'top slab across',
  'top slab along',
  'bottom slab',
  'stirrups',
  'webs along',
  'diaphragms',
  'blisters and anchorages',
  'bars of the struts',
  'bars along the heads of the struts',
  'bars of the ribs',
];
const strands = ['draped tendons', 'centred tendons for launching'];
const area = (at: At) => ({ spans: spansOf(at), width: `${at.unit}/task/deck/widthM` }) as const;
/** Lines of one item by their words: 'diaphragms' is both concrete and bars. */
const itemLines = (at: At, item: string, what: readonly string[]): string[] =>
  linesOf(at, ...what).filter((path) => at.design.lines[Number(path.split('/').at(-2))]!.item === item);

const concreteLines = (at: At): string[] => [
  ...itemLines(at, 'box-concrete', concrete),
  ...linesOf(at, 'box of lightweight concrete', 'struts under the wings'),
];

/** The width that is asked of the box, where one is; what strut heads lie beyond the webs, where it has them. */
const askedWidth = (at: At): string[] =>
  at.design.task.boxWidthM === undefined ? [] : [`${at.unit}/task/boxWidthM`];
const outOf = (at: At): string[] =>
  at.design.figures['strutsOutM'] === undefined ? [] : [`${at.unit}/figures/strutsOutM`];

/** Concrete box: section and quantities of the whole deck, its tendons, its checks. */
export const boxFigures: readonly Descriptor[] = [
  sized(
    'cells',
    'cells of the box',
    'no',
    'as few as keep the webs within their practical spacing, which is wider where tendons run across the slab or ribs carry it; struts carry the wings in their stead where it has them',
    './task/deck/widthM',
    './task/boxWidthM?',
    'data/concrete-box/layout/mostWebSpacingM',
    'data/concrete-box/across/mostWebSpacingM',
    'data/concrete-box/ribs/mostWebSpacingM',
    'data/concrete-box/layout/overhangOverSpacing',
  ),
  figure('webs', {
    label: 'webs of the box',
    unit: 'no',
    method: 'sum',
    formula: 'cells + 1',
    inputs: (at) => ({ cells: `${at.unit}/figures/cells` }),
    compute: ({ cells }) => cells + 1,
  }),
  figure('webSpacingM', {
    label: 'spacing of the webs',
    unit: 'm',
    method: 'layout',
    formula:
      'width asked of the box / cells; where none is, deck width, less twice what strut heads lie beyond the webs / (cells + 2 x overhang over spacing)',
    inputs: (at) => ({
      asked: askedWidth(at),
      width: `${at.unit}/task/deck/widthM`,
      out: outOf(at),
      cells: `${at.unit}/figures/cells`,
      ratio: 'data/concrete-box/layout/overhangOverSpacing',
    }),
    compute: ({ asked, width, out, cells, ratio }) =>
      asked.length > 0 ? sum(asked) / cells : (width - 2 * sum(out)) / (cells + 2 * ratio),
  }),
  figure('overhangM', {
    label: 'overhang beyond the outer web, or beyond its strut heads',
    unit: 'm',
    method: 'layout',
    formula: '(deck width - cells x spacing of the webs) / 2, less what strut heads lie beyond the webs',
    inputs: (at) => ({
      width: `${at.unit}/task/deck/widthM`,
      out: outOf(at),
      cells: `${at.unit}/figures/cells`,
      spacing: `${at.unit}/figures/webSpacingM`,
    }),
    compute: ({ width, out, cells, spacing }) => (width - cells * spacing) / 2 - sum(out),
  }),
  ...(
    [
      ['topSlabMidM', 'top slab between the webs'],
      ['topSlabRootM', 'top slab over the webs'],
    ] as const
  ).map(([name, label]) =>
    sized(
      name,
      label,
      'm',
      'least thickness in steps at which its bars stay within a practical ratio, or its tendons within the closest',
      'webSpacingM',
      'overhangM',
      'data/slab/steelRatioMost',
      'data/slab/stepM',
    ),
  ),
  sized(
    'webM',
    'web in the spans',
    'm',
    'one column of ducts between two layers of bars; thicker in steps by shear and room for tendons',
    'spans',
    './task/depthM',
    'span*TrafficKNm',
    'data/concrete-box/webLeastM/:standard',
  ),
  sized(
    'webAtSupportsM',
    'web at the supports',
    'm',
    'thicker in steps until struts and stirrups of the outer web take shear and torsion',
    'spans',
    './task/depthM',
    'pier*TrafficKNm',
    'data/concrete-box/stirrupRatioMost',
  ),
  sized(
    'bottomSlabM',
    'bottom slab in the spans',
    'm',
    'two layers of bars and its clear span',
    'webSpacingM',
    'data/concrete-box/bottomSlab/leastM',
    'data/concrete-box/bottomSlab/clearOverThickness',
  ),
  sized(
    'bottomSlabAtPiersM',
    'bottom slab at the piers',
    'm',
    'thicker in steps until compression and bending over the piers hold',
    'spans',
    './task/depthM',
    'pier*TrafficKNm',
    'bottomSlabM',
    'data/concrete-box/compression/total',
  ),
  sized(
    'boxInnerHeightM',
    'clear height inside the box at the piers',
    'm',
    'depth - top slab - bottom slab',
    './task/depthM',
    'bottomSlabAtPiersM',
    'topSlabMidM',
  ),
  ...(
    [
      ['areaM2', 'area of the section in the spans', 'm2', 'webM', 'bottomSlabM'],
      ['inertiaM4', 'inertia of the section in the spans', 'm4', 'webM', 'bottomSlabM'],
      ['centroidFromTopM', 'centroid of the section in the spans below the top', 'm', 'webM', 'bottomSlabM'],
      ['pierAreaM2', 'area of the section at the piers', 'm2', 'webAtSupportsM', 'bottomSlabAtPiersM'],
      ['pierInertiaM4', 'inertia of the section at the piers', 'm4', 'webAtSupportsM', 'bottomSlabAtPiersM'],
    ] as const
  ).map(([name, label, unit, web, bottom]) =>
    sized(
      name,
      label,
      unit,
      'polygon of the outline less its cells',
      './task/depthM',
      './task/deck/widthM',
      'webSpacingM',
      'topSlabMidM',
      'topSlabRootM',
      web,
      bottom,
    ),
  ),
  sized(
    'enclosedAreaM2',
    'area enclosed by the middle lines of the box',
    'm2',
    'mean width x height between the middles of the slabs',
    'webSpacingM',
    './task/depthM',
    'topSlabMidM',
    'bottomSlabM',
  ),
  sized(
    'webTrafficShare',
    'share of the traffic shear that the outer web takes',
    '',
    'bending and torsion of the lanes at their worst place',
    'webs',
    'enclosedAreaM2',
    'site/deck/carriagewayOffsetM',
    'site/deck/carriagewayM',
  ),
  sized(
    'bearingsApartM',
    'distance of the two bearings under the box',
    'm',
    'width of the soffit, less what they stand inside its edges, at least half of it',
    'webSpacingM',
    'cells',
    './task/depthM',
    'data/concrete-box/bearings/fromEdgesM',
  ),
  ...tendonFigures,
  sized(
    'endDiaphragmKN',
    'weight of an end diaphragm',
    'kN',
    'inside of the box less the opening x thickness x weight of concrete',
    './task/depthM',
    'data/concrete-box/diaphragm/endM',
    'data/concrete-box/diaphragm/openingM2',
  ),
  sized(
    'skewTorqueKNm',
    'torque of skew ends, design',
    'kNm',
    'tan of the skew x slope of the end / (sum l / GJ + tan^2 x flexibility of the end)',
    'spans',
    './task/skewDeg?',
    'inertiaM4',
    'enclosedAreaM2',
    'tendonForceKN',
  ),
  sized(
    'skewBearingKN',
    'what skew ends shift from the acute bearing to the obtuse',
    'kN',
    'torque of skew ends / distance of the bearings',
    'skewTorqueKNm',
    'bearingsApartM',
  ),
  sized(
    'shearDesignKN',
    'greatest design shear of the deck',
    'kN',
    'gamma G permanent + gamma Q traffic - shear carried by the tendons; traffic of a skew deck at its obtuse corner',
    './task/skewDeg?',
    'span*OwnKNm',
    'span*TrafficKNm',
    'tendonForceKN',
  ),
  figure('concreteM3M2', {
    label: 'concrete per m2 of deck',
    unit: 'm3/m2',
    method: 'ratio',
    formula: '(box + blisters and joints + diaphragms + struts or ribs) / (length x deck width)',
    inputs: (at) => ({ lines: concreteLines(at), ...area(at) }),
    compute: ({ lines, spans, width }) => sum(lines) / (sum(spans) * width),
  }),
  figure('barsKgM3', {
    label: 'bars per m3 of concrete',
    unit: 'kg/m3',
    method: 'ratio',
    formula: 'all bars / all concrete',
    inputs: (at) => ({
      bars: itemLines(at, 'reinforcement', bars),
      concrete: concreteLines(at),
    }),
    compute: (v) => sum(v.bars) / sum(v.concrete),
  }),
  figure('strandKgM2', {
    label: 'strand per m2 of deck',
    unit: 'kg/m2',
    method: 'ratio',
    formula: 'tendons / (length x deck width)',
    inputs: (at) => ({ lines: linesOf(at, ...strands), ...area(at) }),
    compute: ({ lines, spans, width }) => sum(lines) / (sum(spans) * width),
  }),
  line('blisters and joints', {
    label: 'blisters and joints',
    unit: 'm3',
    method: 'share',
    formula: 'share x box',
    inputs: (at) => ({
      share: 'data/concrete-box/blisters/share',
      box: linesOf(at, 'box', 'box of lightweight concrete'),
    }),
    compute: ({ share, box }) => share * sum(box),
  }),
  ...boxCheckFigures,
  ...slabCheckFigures(manual, 'topSlabMidM'),
  ...acrossFigures(manual),
  ...concreteFigures(manual),
  ...strutFigures(manual),
  ...ribFigures(manual),
];
