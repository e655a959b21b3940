import { described, type At, type Descriptor, type HundredMm } from '../model/index.ts';

type Quantity = Exclude<keyof HundredMm, 'amount'>;

const path = (field: keyof HundredMm): string => `options/:option/hundredMm/${field}`;

const ends = ['start', 'end'] as const;

/** Figures of the regraded road behind the fixed ends where one is regraded. */
const behind = (at: At, field: string): string[] =>
  ends.flatMap((end) =>
    at.option.profile.regrading?.[end] ? [`${at.root}/profile/regrading/${end}/${field}`] : [],
  );

/** What it adds; `approach` and `regraded` are what the roads on either side of the abutments have of it. */
const measured = (
  field: Quantity,
  label: string,
  unit: string,
  { approach, regraded }: { readonly approach?: string; readonly regraded: string },
): Descriptor =>
  described({
    path: path(field),
    label: `${label} for 100 mm of depth`,
    unit,
    method: 'worked out again',
    formula: `${approach ? 'approaches and regrading behind fixed ends' : 'regrading behind fixed ends'}, of the lowest road for a deck 100 mm deeper less of this one`,
    inputs: (at) => ({
      now: [
        ...(approach ? ends.map((end) => `${at.root}/profile/approaches/${end}/${approach}`) : []),
        ...behind(at, regraded),
      ],
      depths: at.option.designs.map((_, u) => `${at.root}/designs/${u}/depthM/midspan`),
      mayRise: 'site/road/mayRiseM',
    }),
  });

const rate = (item: string): string => `rates/${item}/mean`;

/** What 100 mm more of construction depth does to the approaches. */
export const hundredMmFigures: readonly Descriptor[] = [
  described({
    path: 'options/:option/hundredMm',
    label: 'price of 100 mm of depth',
    unit: '',
    method: 'no road',
    formula: 'no limit of the brief would be kept: no road clears with a deck 100 mm deeper',
  }),
  measured('fillM3', 'fill', 'm3', { approach: 'fillM3', regraded: 'fillM3' }),
  measured('cutM3', 'cut in the existing road', 'm3', { regraded: 'cutM3' }),
  measured('wallM2', 'retaining walls', 'm2', { approach: 'wallM2', regraded: 'wallM2' }),
  measured('surfacingM2', 'surfacing of the existing road', 'm2', { regraded: 'lengthM' }),
  measured('parapetM', 'edges of the existing road', 'm', { regraded: 'lengthM' }),
  described({
    path: path('amount'),
    label: 'price of 100 mm of depth, approaches',
    unit: (at: At) => at.study.books.currency,
    method: 'product',
    formula:
      'fill, cut, surfacing and edges x their mean rates + face of walls x (stem, footing and their bars per m2 of face at mean rates)',
    inputs: (at) => ({
      fill: `${at.root}/hundredMm/fillM3`,
      fillRate: rate('fill'),
      cut: `${at.root}/hundredMm/cutM3`,
      cutRate: rate('excavation'),
      surfacing: `${at.root}/hundredMm/surfacingM2`,
      surfacingRate: rate('surfacing'),
      parapet: `${at.root}/hundredMm/parapetM`,
      parapetRate: rate('parapet'),
      face: `${at.root}/hundredMm/wallM2`,
      stem: 'data/substructure/abutment/wingM',
      footWidth: 'data/substructure/abutment/wingFootingWidth',
      footDepth: 'data/substructure/abutment/wingFootingM',
      stemBars: 'data/substructure/abutment/barsKgM3',
      footBars: 'data/substructure/footing/barsKgM3',
      stemRate: rate('abutment-concrete'),
      footRate: rate('footing-concrete'),
      barRate: rate('reinforcement'),
    }),
    compute: (v) =>
      v.fill * v.fillRate +
      v.cut * v.cutRate +
      v.surfacing * v.surfacingRate +
      v.parapet * v.parapetRate +
      v.face *
        (v.stem * (v.stemRate + v.stemBars * v.barRate) +
          v.footWidth * v.footDepth * (v.footRate + v.footBars * v.barRate)),
  }),
];
