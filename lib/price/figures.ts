import {
  described,
  type At,
  type BillPart,
  type Descriptor,
  type MeasuredLine,
  type Spread,
} from '../model/index.ts';
import { inText } from '../messages/index.ts';
import { itemOf } from '../takeoff/index.ts';
import { normalCdf } from './normal.ts';
import { ratesFor, z90, type Rates } from './rates.ts';

const rates = new WeakMap<object, Rates>();

/** Rates of the study, read once. */
function ratesOf(at: At): Rates {
  const { books } = at.study;
  const found = rates.get(books) ?? ratesFor(books);
  rates.set(books, found);
  return found;
}

const sum = (values: readonly number[]): number => values.reduce((total, value) => total + value, 0);

const money = (at: At): string => at.study.books.currency;
const itemWords = (at: At): string => inText(itemOf(at.name('item')).label);
const perUnit = (at: At): string => `${money(at)}/${itemOf(at.name('item')).unit}`;
const typedRate = (at: At) => at.study.books.rates.find(({ item }) => item === at.name('item'));
const rateOf = (at: At): Spread => {
  const { p10, p50, p90 } = ratesOf(at).rates.find(({ item }) => item === at.name('item'))!;
  return { p10, p50, p90 };
};

const pointWords: Readonly<Record<string, string>> = { p10: '10 % point', p50: 'median', p90: '90 % point' };
const point = (at: At): keyof Spread => at.name('point') as keyof Spread;
const percent = (at: At): string => `P${at.name('point').slice(1)}`;

/** Parts of the bill as they stand in a sentence. */
const partWords: Readonly<Record<BillPart, string>> = {
  deck: 'deck',
  'bearings-joints': 'bearings and joints',
  pylons: 'pylons',
  piers: 'piers',
  foundations: 'foundations',
  abutments: 'abutments',
  approaches: 'approaches',
  'river-works': 'river works',
  'temporary-works': 'temporary works',
  'traffic-management': 'traffic management',
  preliminaries: 'preliminaries',
};
const partOf = (at: At): BillPart => at.name('part') as BillPart;
const hasPart = (lines: readonly MeasuredLine[], part: BillPart): boolean =>
  lines.some((line) => line.part === part);

/** What one part of the bill is made of: lines of the option, and what is founded under each support. */
function itemsOf(at: At): { readonly lines: string[]; readonly founded: string[] } {
  const part = partOf(at);
  return {
    lines: at.option.lines.flatMap((line, i) => (line.part === part ? [`${at.root}/lines/${i}`] : [])),
    founded: at.option.supports.flatMap(({ foundations }, s) =>
      foundations.some(({ lines }) => hasPart(lines, part))
        ? [`${at.root}/supports/${s}/founded/${part}`]
        : [],
    ),
  };
}

/** Errors that the draws of a part carry: of the forms measured in it, of the ground, of the option itself. */
function errorsOf(at: At, part: BillPart): string[] {
  const units = at.option.lines.flatMap((line) =>
    line.part === part && line.unit !== undefined ? [line.unit] : [],
  );
  const forms = [...new Set(units.map((unit) => at.option.units[unit]!.form))];
  const onGround = at.option.supports.some(({ foundations }) =>
    foundations.some(({ lines }) => hasPart(lines, part)),
  );
  return [
    ...forms.map((form) => `data/drivers/modelError/${form}/sigma`),
    ...(onGround ? ['data/drivers/localGround/sigma'] : []),
    'data/drivers/optionError/sigma',
  ];
}

const partsOf = (at: At, keep: (part: BillPart) => boolean = () => true): string[] =>
  at.option.parts.flatMap(({ part }) => (keep(part) ? [`${at.root}/parts/${part}/p50`] : []));
const draws = { draws: 'books/draws', seed: 'books/seed' } as const;
const draw = (at: At): string => at.study.books.draws.toLocaleString('en').replaceAll(',', ' ');

const lineMoney = (path: string, lineAt: (at: At) => MeasuredLine): Descriptor =>
  described({
    path,
    label: (at) => `${lineAt(at).what}, ${inText(itemOf(lineAt(at).item).label)}`,
    unit: money,
    method: 'product',
    formula: 'quantity x mean rate',
    inputs: (at) => ({ quantity: `${at.path}/quantity`, rate: `rates/${lineAt(at).item}/mean` }),
    compute: ({ quantity, rate }) => quantity * rate,
  });

/** Rates and what they come to: lines, parts of the bill, options. */
export const priceFigures: readonly Descriptor[] = [
  described({
    path: 'rates/:item/mean',
    label: (at) => `mean rate, ${itemWords(at)}`,
    unit: perUnit,
    method: 'mean of two half-lognormals',
    formula:
      'P50 (exp(a^2 / 2) Phi(-a) + exp(b^2 / 2) Phi(b)), a = ln(P50 / P10) / 1.2816, b = ln(P90 / P50) / 1.2816',
    range: rateOf,
    inputs: (at) => ({
      p10: `rates/${at.name('item')}/p10`,
      p50: `rates/${at.name('item')}/p50`,
      p90: `rates/${at.name('item')}/p90`,
    }),
    compute: ({ p10, p50, p90 }) => {
      const a = Math.log(p50 / p10) / z90;
      const b = Math.log(p90 / p50) / z90;
      return p50 * (Math.exp((a * a) / 2) * normalCdf(-a) + Math.exp((b * b) / 2) * normalCdf(b));
    },
  }),
  described({
    path: 'rates/:item/:point',
    when: (at) => at.name('point') in pointWords,
    label: (at) => `rate, ${itemWords(at)}, ${pointWords[at.name('point')]}`,
    unit: perUnit,
    kind: (at) => (typedRate(at) ? 'typed' : 'preset'),
    range: rateOf,
    method: (at) => (typedRate(at) ? 'typed' : 'schedule of rates'),
    formula: (at) => {
      const typed = typedRate(at);
      if (typed) return `typed over the schedule: ${typed.reason}`;
      const { pack } = ratesOf(at);
      const tenders = pack.rates.find(({ item }) => item === at.name('item'))!.tenders;
      return `${tenders} tenders, ${pack.priceDate}, ${pack.place}; ${pack.title}`;
    },
    sources: (at) => (typedRate(at) ? ['brief'] : [ratesOf(at).pack.source]),
  }),
  lineMoney('options/:option/lines/:line', (at) => at.option.lines[at.index('line')]!),
  lineMoney(
    'options/:option/supports/:support/foundations/:f/lines/:line',
    (at) => at.support.foundations[at.index('f')]!.lines[at.index('line')]!,
  ),
  described({
    path: 'options/:option/supports/:support/foundations/:f/founded/:part',
    label: (at) =>
      `${partWords[partOf(at)]} of support ${at.index('support') + 1} on ${at.support.foundations[at.index('f')]!.ground.replace('-', ' ')}`,
    unit: money,
    method: 'sum',
    formula: (at) =>
      hasPart(at.support.foundations[at.index('f')]!.lines, partOf(at))
        ? 'lines of the foundation at mean rates'
        : 'none is measured on this ground',
    inputs: (at) => ({
      lines: at.support.foundations[at.index('f')]!.lines.flatMap((line, i) =>
        line.part === partOf(at) ? [`${at.foot}/foundations/${at.name('f')}/lines/${i}`] : [],
      ),
    }),
    compute: ({ lines }) => sum(lines),
  }),
  described({
    path: 'options/:option/supports/:support/founded/:part',
    label: (at) => `${partWords[partOf(at)]} of support ${at.index('support') + 1}`,
    unit: money,
    method: 'mean over its ground',
    formula: 'sum of odds of the ground x cost on it at mean rates',
    inputs: (at) => {
      const of = at.support.foundations.map((_, f) => `${at.foot}/foundations/${f}`);
      return {
        odds: of.map((path) => `${path}/odds`),
        costs: of.map((path) => `${path}/founded/${partOf(at)}`),
      };
    },
    compute: ({ odds, costs }) => sum(costs.map((cost, i) => odds[i]! * cost)),
  }),
  described({
    path: 'options/:option/parts/:part/p50',
    label: (at) => `${partWords[partOf(at)]}, median`,
    unit: money,
    method: (at) => `median of ${draw(at)} draws`,
    formula: (at) =>
      `P50 of sum (quantity x drawn rate) x errors drawn with it${
        errorsOf(at, partOf(at)).some((path) => path.includes('localGround'))
          ? '; under every support the foundation of the ground drawn'
          : ''
      }${at.name('part') === 'preliminaries' ? '; months drawn between quick and slow' : ''}`,
    inputs: (at) => {
      const part = partOf(at);
      const months = part === 'preliminaries' ? [`${at.root}/months/p10`, `${at.root}/months/p90`] : [];
      return { ...itemsOf(at), errors: errorsOf(at, part), months, ...draws };
    },
  }),
  described({
    path: 'options/:option/cost/:point',
    label: (at) => `cost of option ${at.option.number}, ${pointWords[at.name('point')]}`,
    unit: money,
    range: (at) => at.option.cost,
    method: (at) => `${point(at) === 'p50' ? 'median' : percent(at)} of ${draw(at)} draws`,
    formula: (at) =>
      `${percent(at)} of the draws of the sum of ${at.option.parts.length} parts; medians of parts do not add up to it`,
    inputs: (at) => ({ parts: partsOf(at), ...draws }),
  }),
  described({
    path: 'options/:option/quartiles/:end',
    label: (at) =>
      `cost of option ${at.option.number}, ${at.index('end') === 0 ? 'lower' : 'upper'} quartile`,
    unit: money,
    range: (at) => at.option.cost,
    method: (at) => `quartile of ${draw(at)} draws`,
    formula: (at) =>
      `P${at.index('end') === 0 ? 25 : 75} of the draws of the sum of ${at.option.parts.length} parts`,
    inputs: (at) => ({ parts: partsOf(at), ...draws }),
  }),
  described({
    path: 'options/:option/pricePerM2/withApproaches',
    label: 'price per m2 of deck with the approaches',
    unit: (at) => `${money(at)}/m2`,
    method: 'ratio',
    formula: 'median cost / deck area',
    inputs: (at) => ({ cost: `${at.root}/cost/p50`, area: `${at.root}/deckAreaM2` }),
    compute: ({ cost, area }) => cost / area,
  }),
  described({
    path: 'options/:option/pricePerM2/withoutApproaches',
    label: 'price per m2 of deck without the approaches',
    unit: (at) => `${money(at)}/m2`,
    method: (at) => `median of ${draw(at)} draws / deck area`,
    formula: 'P50 of the draws of every part but the approaches / deck area',
    inputs: (at) => ({
      parts: partsOf(at, (part) => part !== 'approaches'),
      area: `${at.root}/deckAreaM2`,
      ...draws,
    }),
  }),
];
