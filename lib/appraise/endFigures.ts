import { described, type At, type Descriptor } from '../model/index.ts';

const ends = ['start', 'end'] as const;
type End = (typeof ends)[number];

const isKept = (at: At): boolean => at.study.options.kept.some(({ number }) => number === at.option.number);

/** What an abutment in a window was placed by. */
const placedBy = (at: At, end: End) => ({
  outermost: `site/${end}M`,
  innermost: `site/windows/${end === 'start' ? 'startLatestM' : 'endEarliestM'}`,
  stretches: at.site.zones.flatMap((_, i) => [`site/zones/${i}/fromM`, `site/zones/${i}/toM`]),
  clearances: at.site.soffitLimits.flatMap(({ kind }, i) =>
    kind === 'flood' ? [] : [`site/soffitLimits/${i}/fromM`, `site/soffitLimits/${i}/toM`],
  ),
  waters: at.site.waters.flatMap((_, i) => [`site/waters/${i}/fromM`, `site/waters/${i}/toM`]),
});

/** Where the abutments of an option stand in the windows of the brief, and what lies between them. */
export const endFigures: readonly Descriptor[] = [
  ...ends.map((end) =>
    described({
      path: `options/:option/${end}M`,
      label: `${end} of the bridge`,
      unit: 'm',
      method: (at) => (isKept(at) ? 'set by hand' : 'search over the window'),
      formula: (at) =>
        isKept(at)
          ? 'where it was kept, or as near as its window leaves it'
          : 'where deck, supports, abutments and the approaches over the whole crossing cost least together at mean rates; never past a stretch, a clearance or water that the fill would bury',
      inputs: (at) => placedBy(at, end),
    }),
  ),
  described({
    path: 'options/:option/lengthM',
    label: 'length of the bridge',
    unit: 'm',
    method: 'difference',
    formula: 'end of the bridge - start of the bridge',
    inputs: (at) => ({ end: at.ends.end, start: at.ends.start }),
    compute: ({ end, start }) => end - start,
  }),
];
