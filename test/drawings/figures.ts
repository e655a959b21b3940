import type { DepthBandsInput } from '../../notebooks/charts/depthBands.ts';
import type { QuantityColumn, PublishedBand } from '../../notebooks/charts/quantityMarks.ts';
import type { ShareColumnsInput } from '../../notebooks/charts/shareColumns.ts';
import type { SourceSpansInput } from '../../notebooks/charts/sourceSpans.ts';
import type { SpanRow } from '../../notebooks/charts/spanChart.ts';
import type { Measure } from '../../notebooks/charts/tradeOffs.ts';
import type { Check } from '../../lib/model/index.ts';

/** Invented figures to try the charts with, beside the invented crossing of `fixture.ts`. */
export const spanRows: readonly SpanRow[] = [
  {
    form: 'slab',
    usual: [8, 22],
    possible: [5, 35],
    statistics: [6, 12, 25],
    bridges: 12,
    status: 'out',
    words: 'needs 63 m; slabs stop at 35 m',
    flip: 'possible at 35 m, 28 m shorter',
  },
  {
    form: 'portal-frame',
    usual: [10, 30],
    possible: [6, 50],
    status: 'out',
    words: 'stops at 50 m',
    flip: 'possible at 50 m',
  },
  {
    form: 'precast-i',
    usual: [20, 45],
    possible: [15, 75],
    statistics: [17, 31, 46],
    status: 'possible',
    words: 'one piece stops at 50 m; 63 m is spliced',
  },
  {
    form: 'precast-trough',
    usual: [18, 36],
    possible: [13, 44],
    status: 'out',
    words: 'stops at 44 m; in if the opening were 41 m',
  },
  { form: 'half-through', usual: [15, 40], possible: [10, 55], status: 'out', words: 'stops at 55 m' },
  {
    form: 'composite-i',
    usual: [35, 90],
    possible: [20, 130],
    statistics: [24, 48, 88],
    status: 'in',
    words: '28 m and 27 m inside its usual range',
  },
  { form: 'adjacent-box', usual: [12, 35], possible: [10, 45], status: 'out', words: 'stops at 45 m' },
  {
    form: 'composite-box',
    usual: [50, 110],
    possible: [36, 160],
    status: 'in',
    words: 'kept as variant 2a; pays only on a curve',
  },
  {
    form: 'concrete-box',
    usual: [30, 60],
    possible: [20, 75],
    status: 'out',
    words: 'no props in the river; launching ends at 60',
  },
  {
    form: 'cantilever-box',
    usual: [75, 150],
    possible: [60, 250],
    statistics: [60, 120, 230],
    status: 'in',
    words: '12 m below its usual range; goes to 100 m',
  },
  {
    form: 'steel-box',
    usual: [110, 220],
    possible: [70, 300],
    status: 'out',
    words: 'deck plate too dear below 100 m',
  },
  {
    form: 'truss',
    usual: [80, 250],
    possible: [45, 500],
    status: 'possible',
    words: '17 m below; sells 0.8 m of road level',
  },
  {
    form: 'tied-arch',
    usual: [80, 200],
    possible: [50, 300],
    statistics: [55, 140, 250],
    status: 'possible',
    words: '17 m below; sells 0.8 m of road level',
  },
  {
    form: 'deck-arch',
    usual: [90, 250],
    possible: [60, 420],
    status: 'out',
    words: 'no rise above the flood; ground unknown',
  },
  {
    form: 'extradosed',
    usual: [110, 200],
    possible: [80, 275],
    status: 'out',
    words: 'gains nothing below 80 m',
  },
  {
    form: 'cable-stayed',
    usual: [150, 500],
    possible: [90, 1100],
    status: 'possible',
    words: '27 m below; kept at the client’s wish',
  },
  { form: 'suspension', usual: [400, 1900], possible: [250, 2020], status: 'out', words: 'starts at 250 m' },
];

export const published: Readonly<Record<number, Partial<Record<QuantityColumn, PublishedBand>>>> = {
  1: { concrete: { low: 0.45, high: 0.65 }, bars: { low: 70, high: 95 }, strand: { low: 14, high: 25 } },
  2: { concrete: { low: 0.25, high: 0.32 }, steel: { low: 180, high: 250 }, bars: { low: 55, high: 75 } },
  3: { concrete: { low: 0.65, high: 0.9 }, bars: { low: 95, high: 130 }, strand: { low: 26, high: 45 } },
};

export const checks: readonly Check[] = [
  {
    id: 'bending-midspan',
    label: 'bending at midspan',
    demand: 51.6,
    capacity: 60,
    unit: 'MNm',
    utilisation: 0.86,
  },
  {
    id: 'bending-pier',
    label: 'bending at the piers',
    demand: 97,
    capacity: 100,
    unit: 'MNm',
    utilisation: 0.97,
  },
  { id: 'shear-pier', label: 'shear at the piers', demand: 7.8, capacity: 10, unit: 'MN', utilisation: 0.78 },
  {
    id: 'fatigue',
    label: 'fatigue, cross-girder weld',
    demand: 91,
    capacity: 100,
    unit: 'MPa',
    utilisation: 0.91,
  },
  { id: 'deflection', label: 'live deflection', demand: 88, capacity: 112, unit: 'mm', utilisation: 0.78 },
];

export const depthPoints = Array.from({ length: 20 }, (_, index) => {
  const depthM = 1.7 + index * 0.1;
  const lift = Math.max(0, depthM - 2.72);
  return { depthM, cost: (9.7 + 0.55 * (depthM - 2.35) ** 2 + 0.75 * lift) * 1e6 };
});

const spread = (p10: number, p50: number, p90: number): { p10: number; p50: number; p90: number } => ({
  p10,
  p50,
  p90,
});
export const measures: readonly Measure[] = [
  {
    name: 'Programme, months',
    places: 0,
    values: {
      1: spread(17, 20, 24),
      2: spread(14, 17, 21),
      3: spread(20, 24, 29),
      4: spread(16, 19, 24),
      5: spread(23, 28, 36),
      6: spread(17, 20, 25),
    },
  },
  {
    name: 'Depth at the railway, m',
    places: 2,
    values: {
      1: spread(2.75, 2.75, 2.75),
      2: spread(2.3, 2.3, 2.3),
      3: spread(2.85, 2.85, 2.85),
      4: spread(1.9, 1.9, 1.9),
      5: spread(1.6, 1.6, 1.6),
      6: spread(1.9, 1.9, 1.9),
    },
  },
  {
    name: 'Carbon to opening, t per m²',
    places: 1,
    values: {
      1: spread(1.7, 2.1, 2.7),
      2: spread(1.5, 1.9, 2.5),
      3: spread(1.8, 2.3, 3),
      4: spread(1.5, 1.9, 2.6),
      5: spread(1.9, 2.5, 3.4),
      6: spread(1.6, 2, 2.7),
    },
  },
];

export const depthForms: DepthBandsInput['forms'] = [
  {
    form: 'half-through',
    bands: [
      {
        what: 'edge girder depth',
        depthM: [3.5, 5.2],
        ratio: '1/18 to 1/12 of the span',
        isUnderRoad: false,
        sources: [{ number: 9, read: false }],
      },
      {
        what: 'floor depth',
        depthM: [0.9, 1.6],
        ratio: '1/14 to 1/8 of the deck width',
        takenM: 1.2,
        isUnderRoad: true,
        sources: [{ number: 9, read: false }],
      },
    ],
  },
  {
    form: 'cantilever-box',
    bands: [
      {
        what: 'depth at the support',
        depthM: [3.2, 3.9],
        ratio: '1/20 to 1/16 of the span',
        takenM: 3.5,
        isUnderRoad: false,
        sources: [
          { number: 24, read: true },
          { number: 25, read: false },
        ],
      },
      {
        what: 'midspan depth',
        depthM: [1.3, 2.1],
        ratio: '1/50 to 1/30 of the span; at least 2.20 m for access and inspection inside the box',
        takenM: 2.2,
        isUnderRoad: true,
        sources: [{ number: 24, read: true }],
      },
    ],
  },
];

export const sourceForms: SourceSpansInput['forms'] = [
  {
    form: 'slab',
    usual: [8, 22],
    spans: [
      { fromM: 6, toM: 15, of: 'reinforced or prestressed', source: { number: 1, read: true } },
      { fromM: null, toM: 18, source: { number: 2, read: true } },
      { fromM: 14, toM: 26, of: 'prestressed', source: { number: 3, read: false } },
    ],
  },
  {
    form: 'composite-box',
    usual: [40, 95],
    spans: [
      { fromM: 37, toM: null, of: 'advantageous from here', source: { number: 4, read: true } },
      { fromM: 50, toM: 150, source: { number: 5, read: false } },
    ],
  },
];

const column = (fromM: number, toM: number, count: number, percent: Record<string, number>) => ({
  fromM,
  toM,
  count,
  percent,
  doubted: fromM === 100 ? ['steel-i'] : [],
});
const columns = [
  column(0, 30, 1200, { slab: 31.5, 'steel-i': 12, tee: 4.2 }),
  column(30, 50, 3400, { slab: 0.3, 'steel-i': 38 }),
  column(50, 100, 2200, { 'steel-i': 71.2, tee: 0.8 }),
  column(100, 200, 240, { 'steel-i': 22 }),
];
export const shares: Omit<ShareColumnsInput, 'widthPx'> = {
  classes: [
    { id: 'slab', words: 'slab', form: 'slab' },
    { id: 'tee', words: 'tee', form: null },
    { id: 'steel-i', words: 'steel I-girder', form: 'composite-i' },
  ],
  buckets: columns,
  asked: columns[2]!,
};
