import { described, type At, type Descriptor } from '../model/index.ts';

const path = (field: string): string => `options/:option/hundredMm/${field}`;

const measured = (field: 'fillM3' | 'wallM2', label: string, unit: string): Descriptor =>
  described({
    path: path(field),
    label,
    unit,
    method: 'worked out again',
    formula: 'approaches of the lowest road for a deck 100 mm deeper, less those of this one',
    inputs: (at) => ({
      now: ['start', 'end'].map((end) => `${at.root}/profile/approaches/${end}/${field}`),
      depths: at.option.designs.map((_, u) => `${at.root}/designs/${u}/depthM/midspan`),
      ...(field === 'fillM3' ? { mayRise: 'site/road/mayRiseM' } : {}),
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
  measured('fillM3', 'fill of the approaches for 100 mm of depth', 'm3'),
  measured('wallM2', 'retaining walls of the approaches for 100 mm of depth', 'm2'),
  described({
    path: path('amount'),
    when: (at) => at.option.profile.regrading !== undefined,
    label: 'price of 100 mm of depth, approaches',
    unit: (at: At) => at.study.books.currency,
    method: 'worked out again',
    formula:
      'lines of the approaches and of the regrading behind fixed ends at mean rates, with a deck 100 mm deeper less as it is',
    inputs: (at) => ({
      fill: `${at.root}/hundredMm/fillM3`,
      face: `${at.root}/hundredMm/wallM2`,
      curves: ['start', 'end'].flatMap((end) =>
        at.option.profile.regrading?.[end as 'start' | 'end']
          ? [`${at.root}/profile/regrading/${end}/lengthM`]
          : [],
      ),
      rates: ['fill', 'excavation', 'surfacing', 'parapet'].map(rate),
    }),
  }),
  described({
    path: path('amount'),
    label: 'price of 100 mm of depth, approaches',
    unit: (at: At) => at.study.books.currency,
    method: 'product',
    formula:
      'fill x its mean rate + face of walls x (stem, footing and their bars per m2 of face at mean rates)',
    inputs: (at) => ({
      fill: `${at.root}/hundredMm/fillM3`,
      fillRate: rate('fill'),
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
      v.face *
        (v.stem * (v.stemRate + v.stemBars * v.barRate) +
          v.footWidth * v.footDepth * (v.footRate + v.footBars * v.barRate)),
  }),
];
