import { described, type At, type Descriptor, type Spread } from '../model/index.ts';
import type { Range } from './data.ts';
import { planProgramme, type Activity } from './planProgramme.ts';
import { supportWeeks } from './supportWeeks.ts';

const sum = (values: readonly number[]): number => values.reduce((total, value) => total + value, 0);

const point = (at: At): keyof Spread => at.name('point') as keyof Spread;
/** Which of quick, likely and slow a point of the months belongs to. */
const speeds: Readonly<Record<keyof Spread, keyof Range>> = { p10: 'low', p50: 'likely', p90: 'high' };
const speed = (at: At): keyof Range => speeds[point(at)];
/** Paths of a figure of the units that are put together on towers. */
const staged = (at: At, figure: 'splices' | 'tendonStages'): string[] =>
  at.option.designs.flatMap(({ staging }, u) =>
    staging ? [`${at.root}/designs/${u}/figures/${figure}`] : [],
  );
const data = (at: At, name: string): string => `data/programme/${name}/${speed(at)}`;
const weeks = 'data/programme/weeksPerMonth';

const activitiesOf = (at: At): readonly Activity[] =>
  planProgramme(at.site, at.option.designs, at.option.supports).activities;
const monthsOf =
  (id: Activity['id'], what: 'months' | 'startMonths') =>
  (at: At): number =>
    activitiesOf(at).find((activity) => activity.id === id)?.[what][point(at)] ?? 0;

const activity = (id: string, what: 'months' | 'startMonths'): string =>
  `options/:option/programme/${id}/${what}/:point`;
const of = (at: At, id: string, what: 'months' | 'startMonths'): string =>
  `${at.root}/programme/${id}/${what}/${point(at)}`;
const pace = (at: At): string => ({ low: 'quick', likely: 'likely', high: 'slow' })[speed(at)];

const methodsOf = (at: At): string[] => [...new Set(at.option.designs.map(({ task }) => task.method))];
const steelLines = (at: At): string[] =>
  at.option.designs.flatMap((design, u) =>
    design.lines.flatMap((line, i) =>
      line.item.endsWith('-steel') ? [`${at.root}/designs/${u}/lines/${i}/quantity`] : [],
    ),
  );

/** Foundation of a support in its likeliest ground. */
function likeliest(at: At): { readonly path: string; readonly index: number } {
  const { foundations } = at.support;
  let best = 0;
  foundations.forEach((one, i) => {
    if (one.odds > foundations[best]!.odds) best = i;
  });
  return { path: `${at.foot}/foundations/${best}`, index: best };
}

/** Months on site and the activities they are made of. Quick, likely and slow run together: one driver of productivity. */
export const programmeFigures: readonly Descriptor[] = [
  described({
    path: 'options/:option/months/:point',
    label: (at) => `months on site, ${pace(at)}`,
    unit: 'months',
    range: (at) => at.option.months,
    method: 'programme',
    formula: 'start of demobilisation + demobilisation',
    inputs: (at) => ({
      start: of(at, 'demobilise', 'startMonths'),
      months: of(at, 'demobilise', 'months'),
    }),
    compute: ({ start, months }) => start + months,
  }),
  described({
    path: activity('demobilise', 'startMonths'),
    label: (at) => `start of demobilisation, ${pace(at)}`,
    unit: 'months',
    method: 'programme',
    formula: 'start of the finishes + finishes',
    value: monthsOf('demobilise', 'startMonths'),
    inputs: (at) => ({ start: of(at, 'finishes', 'startMonths'), months: of(at, 'finishes', 'months') }),
    compute: ({ start, months }) => start + months,
  }),
  described({
    path: activity('finishes', 'startMonths'),
    label: (at) => `start of the finishes, ${pace(at)}`,
    unit: 'months',
    method: 'programme',
    formula: 'latest of: start of the deck + deck, establishment + supports, steel',
    value: monthsOf('finishes', 'startMonths'),
    inputs: (at) => ({
      start: of(at, 'deck', 'startMonths'),
      deck: of(at, 'deck-work', 'months'),
      establish: of(at, 'establish', 'months'),
      supports: of(at, 'supports', 'months'),
      steel: steelLines(at).length > 0 ? [of(at, 'steel', 'months')] : [],
    }),
    compute: (v) => Math.max(v.start + v.deck, v.establish + v.supports, ...v.steel),
  }),
  described({
    path: activity('finishes', 'months'),
    label: (at) => `finishes, ${pace(at)}`,
    unit: 'months',
    method: 'output',
    formula: '(fixed weeks + length x deck width / output) / weeks a month',
    value: monthsOf('finishes', 'months'),
    inputs: (at) => ({
      fixed: data(at, 'finishesFixed'),
      length: at.ends.length,
      width: 'site/deck/widthM',
      output: data(at, 'finishesM2'),
      weeks,
    }),
    compute: (v) => (v.fixed + (v.length * v.width) / v.output) / v.weeks,
  }),
  ...(['establish', 'demobilise'] as const).map((id) =>
    described({
      path: activity(id, 'months'),
      label: (at) => `${id === 'establish' ? 'site establishment' : 'demobilisation'}, ${pace(at)}`,
      unit: 'months',
      method: 'figure of practice',
      formula: 'weeks / weeks a month',
      value: monthsOf(id, 'months'),
      inputs: (at) => ({ fixed: data(at, id), weeks }),
      compute: (v) => v.fixed / v.weeks,
    }),
  ),
  described({
    path: activity('deck', 'startMonths'),
    label: (at) => `start of the deck, ${pace(at)}`,
    unit: 'months',
    method: 'programme',
    formula: 'later of: establishment + share of the supports x supports, half the steel',
    value: monthsOf('deck', 'startMonths'),
    inputs: (at) => ({
      establish: of(at, 'establish', 'months'),
      share: methodsOf(at).map((method) => `data/programme/methods/${method}/startsAfter`),
      supports: of(at, 'supports', 'months'),
      steel: steelLines(at).length > 0 ? [of(at, 'steel', 'months')] : [],
    }),
    compute: (v) =>
      Math.max(v.establish + Math.max(...v.share) * v.supports, ...v.steel.map((months) => months / 2)),
  }),
  described({
    path: activity('deck-work', 'months'),
    label: (at) => `work on the deck, ${pace(at)}`,
    unit: 'months',
    method: 'output',
    formula:
      '(fixed weeks of each method + length of each unit / output of its method + splices and tendon stages) / weeks a month',
    inputs: (at) => ({
      fixed: methodsOf(at).map((method) => data(at, `methods/${method}/fixed`)),
      from: at.option.units.map((_, u) => `${at.root}/units/${u}/supportsM/0`),
      to: at.option.units.map((unit, u) => `${at.root}/units/${u}/supportsM/${unit.supportsM.length - 1}`),
      output: at.option.designs.map(({ task }) => data(at, `methods/${task.method}/deckM`)),
      splices: staged(at, 'splices'),
      stages: staged(at, 'tendonStages'),
      row: data(at, 'spliceRow'),
      stage: data(at, 'tendonStage'),
      weeks,
    }),
    compute: (v) =>
      (sum(v.fixed) +
        sum(v.output.map((output, i) => (v.to[i]! - v.from[i]!) / output)) +
        v.row * sum(v.splices) +
        v.stage * sum(v.stages)) /
      v.weeks,
  }),
  described({
    path: activity('steel', 'months'),
    label: (at) => `steel in the shop, ${pace(at)}`,
    unit: 'months',
    method: 'output',
    formula: '(lead weeks + steel / 1000 / output) / weeks a month',
    value: monthsOf('steel', 'months'),
    inputs: (at) => ({
      lead: data(at, 'steelLead'),
      steel: steelLines(at),
      output: data(at, 'steelT'),
      weeks,
    }),
    compute: (v) => (v.lead + sum(v.steel) / 1000 / v.output) / v.weeks,
  }),
  described({
    path: activity('supports', 'months'),
    label: (at) => `foundations, piers and abutments, ${pace(at)}`,
    unit: 'months',
    method: 'crews side by side',
    formula: 'greater of: weeks of all supports / crews, weeks of the longest; / weeks a month',
    value: monthsOf('supports', 'months'),
    inputs: (at) => ({
      each: at.option.supports.map((_, s) => `${at.root}/supports/${s}/weeks/${point(at)}`),
      crews: 'data/programme/crews',
      weeks,
    }),
    compute: (v) => Math.max(sum(v.each) / v.crews, ...v.each) / v.weeks,
  }),
  described({
    path: 'options/:option/supports/:support/weeks/:point',
    label: (at) => `weeks of support ${at.index('support') + 1}, ${pace(at)}`,
    unit: 'weeks',
    method: 'output of one crew',
    formula: (at) =>
      `foundation in its likeliest ground, cofferdam in water, then ${
        at.support.kind === 'abutment'
          ? 'the abutment'
          : at.support.kind === 'pylon'
            ? 'the pylon by its height over the ground'
            : 'height / output + pier top'
      }`,
    value: (at) => supportWeeks(at.support, at.option.designs, speed(at)),
    inputs: (at) => {
      const { path, index } = likeliest(at);
      const foundation = at.support.foundations[index]!;
      const wet = foundation.lines.some((line) => line.item === 'cofferdam');
      const piled = foundation.piles !== null;
      const { kind } = at.support;
      return {
        fixed: [
          ...(wet ? [data(at, 'cofferdam')] : []),
          data(at, piled ? 'pileCap' : 'footing'),
          ...(kind === 'abutment' ? [data(at, 'abutment')] : kind === 'pylon' ? [] : [data(at, 'pierTop')]),
        ],
        piles: piled ? [`${path}/piles/count`, `${path}/piles/lengthM`] : [],
        pilesOutput: data(at, 'pilesM'),
        height: kind === 'abutment' ? [] : [`${at.foot}/heightM`],
        pylon: kind === 'pylon' ? [`${at.foot}/overDeckM`] : [],
        output: data(at, kind === 'pylon' ? 'pylonM' : 'shaftM'),
      };
    },
    compute: (v) =>
      sum(v.fixed) +
      (v.piles.length === 2 ? (v.piles[0]! * v.piles[1]!) / v.pilesOutput : 0) +
      (sum(v.height) + sum(v.pylon)) / v.output,
  }),
  described({
    path: 'options/:option/supports/:support/overDeckM',
    label: 'height of the pylon over the deck',
    unit: 'm',
    method: 'read off the elevation',
    formula: 'highest point drawn over the road',
    value: (at) =>
      Math.max(
        0,
        ...at.option.designs
          .filter(({ task }) => (task.pylons?.length ?? 0) > 0)
          .flatMap(({ elevation }) => elevation.flatMap((shape) => shape.points.map(([, z]) => z))),
      ),
    inputs: (at) => ({
      spans: at.option.designs.flatMap(({ task }, u) =>
        task.spansM.map((_, i) => `${at.root}/designs/${u}/task/spansM/${i}`),
      ),
    }),
  }),
];
