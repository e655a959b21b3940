import { described, type At, type Descriptor } from '../model/index.ts';
import { endRatioWindow } from '../rules/index.ts';

const supportsOf = (at: At): readonly number[] => at.option.units[at.index('unit')]!.supportsM;
const isFirst = (at: At): boolean => at.index('s') === 0;
const isLast = (at: At): boolean => at.index('s') === supportsOf(at).length - 1;
const keptIndex = (at: At): number =>
  at.study.options.kept.findIndex((kept) => kept.number === at.option.number);

/** What decides a chainage that the search was free to choose. */
function searched(at: At): {
  readonly ends: string[];
  readonly opening: string[];
  readonly windows: string[];
} {
  const { form } = at.option.units[at.index('unit')]!;
  const both = (what: string): string[] => [`windows/${form}/${what}/least`, `windows/${form}/${what}/most`];
  return {
    ends: [at.ends.start, at.ends.end],
    opening: at.site.mainOpening === null ? [] : ['site/mainOpening/fromM', 'site/mainOpening/toM'],
    windows: [...both('span'), ...(endRatioWindow(form) === null ? [] : both('endRatio'))],
  };
}

const path = 'options/:option/units/:unit/supportsM/:s';
const label = (at: At): string => `chainage of support ${at.index('s') + 1} of unit ${at.index('unit') + 1}`;

/** Where the supports stand. */
export const arrangementFigures: readonly Descriptor[] = [
  described({
    path,
    when: (at) => keptIndex(at) >= 0,
    label,
    unit: 'm',
    method: 'set by hand',
    formula: 'kept where it was put',
    inputs: (at) => ({ kept: `kept/${keptIndex(at)}/units/${at.name('unit')}/supportsM/${at.name('s')}` }),
    compute: ({ kept }) => kept,
  }),
  described({
    path,
    when: (at) => isFirst(at) && at.index('unit') === 0,
    label,
    unit: 'm',
    method: 'as given',
    formula: (at) => (at.option.startM === undefined ? 'start of the crossing' : 'start of the bridge'),
    inputs: (at) => ({ start: at.ends.start }),
    compute: ({ start }) => start,
  }),
  described({
    path,
    when: (at) => isLast(at) && at.index('unit') === at.option.units.length - 1,
    label,
    unit: 'm',
    method: 'as given',
    formula: (at) => (at.option.endM === undefined ? 'end of the crossing' : 'end of the bridge'),
    inputs: (at) => ({ end: at.ends.end }),
    compute: ({ end }) => end,
  }),
  described({
    path,
    when: isFirst,
    label,
    unit: 'm',
    method: 'as given',
    formula: 'where the unit before it ends',
    inputs: (at) => {
      const before = at.index('unit') - 1;
      const last = at.option.units[before]!.supportsM.length - 1;
      return { end: `${at.root}/units/${before}/supportsM/${last}` };
    },
    compute: ({ end }) => end,
  }),
  described({
    path,
    label,
    unit: 'm',
    method: 'search',
    formula:
      'least cost of decks and supports on the cost table, every support clear of barred stretches, spans and end ratios within their windows',
    inputs: searched,
  }),
];
