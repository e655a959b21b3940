import { described, methodIds, type At, type Descriptor, type MeasuredLine } from '../model/index.ts';
import { girderLines } from './girderLines.ts';
import { itemOf } from './items.ts';
import { setUpWords } from './methodLines.ts';

/** Where a line of an option was measured first: a unit, a support, or the crossing itself. */
type Origin = { readonly path: string } | { readonly crossing: string };

function originOf(at: At): Origin {
  let index = at.index('line');
  for (const [u, design] of at.option.designs.entries()) {
    if (index < design.lines.length) return { path: `${at.root}/designs/${u}/lines/${index}/quantity` };
    index -= design.lines.length;
  }
  for (const [s, support] of at.option.supports.entries()) {
    if (index < support.lines.length) return { path: `${at.root}/supports/${s}/lines/${index}/quantity` };
    index -= support.lines.length;
  }
  return { crossing: lineOf(at).what };
}

const lineOf = (at: At): MeasuredLine => at.option.lines[at.index('line')]!;
const label = (at: At): string => lineOf(at).what;
const unit = (at: At): string => itemOf(lineOf(at).item).unit;
const path = 'options/:option/lines/:line/quantity';

const crossing =
  (what: (words: string) => boolean) =>
  (at: At): boolean => {
    const origin = originOf(at);
    return 'crossing' in origin && what(origin.crossing);
  };
const isItem =
  (item: string) =>
  (at: At): boolean =>
    crossing(() => true)(at) && lineOf(at).item === item && lineOf(at).part !== 'approaches';

/** What the possessions of a railway hang on: the method of the unit above it, its pieces, and the railway itself. */
function possession(at: At) {
  const name = lineOf(at).what.replace('possessions of ', '');
  const { zones, soffitLimits } = at.site;
  const stretches = [
    ...zones.flatMap((zone, i) => (zone.kind === 'railway' && zone.name === name ? [`site/zones/${i}`] : [])),
    ...soffitLimits.flatMap((limit, i) =>
      limit.kind === 'railway' && limit.reason === name ? [`site/soffitLimits/${i}`] : [],
    ),
  ];
  const of = [...zones, ...soffitLimits].filter(
    (one) => one.kind === 'railway' && ('name' in one ? one.name : one.reason) === name,
  );
  const middle = (Math.min(...of.map(({ fromM }) => fromM)) + Math.max(...of.map(({ toM }) => toM))) / 2;
  const over = at.option.units.findIndex(({ supportsM }) => middle <= supportsM.at(-1)!);
  const design = at.option.designs[over]!;
  const lines = girderLines(design);
  const rule = `data/programme/methods/${design.task.method}/possessions`;
  const path = `${at.root}/designs/${over}`;
  return {
    base: `${rule}/base`,
    perPiece: `${rule}/perPiece`,
    margin: 'data/programme/railMarginM',
    from: stretches.map((one) => `${one}/fromM`),
    to: stretches.map((one) => `${one}/toM`),
    piece: design.heaviestPiece === null ? [] : [`${path}/heaviestPiece/lengthM`],
    girders: lines === undefined ? [] : [`${path}/figures/${lines.figure}`],
  };
}

type End = 'start' | 'end';

/** What walls of an approach or of a regrading are made of, from their face. */
const walls = (name: string, record: string): Descriptor[] => {
  const of = (ending: string) => crossing((what) => what === `${name}${ending}`);
  const face = (at: At) => ({ face: `${at.root}/profile/${record}/wallM2` }) as const;
  const data = 'data/substructure';
  const item = (name: string, ending: string) => (at: At) => of(ending)(at) && lineOf(at).item === name;
  const concrete = (at: At, name: string): string => {
    const { what } = lineOf(at);
    const line = at.option.lines.findIndex((one) => one.item === name && one.what === what);
    return `${at.root}/lines/${line}/quantity`;
  };
  return [
    described({
      path,
      when: item('abutment-concrete', ' walls'),
      label,
      unit,
      method: 'volume',
      formula: 'face of the walls x mean thickness of their stems',
      inputs: (at) => ({ ...face(at), thickness: `${data}/abutment/wingM` }),
      compute: (v) => v.face * v.thickness,
    }),
    described({
      path,
      when: item('footing-concrete', ' wall footings'),
      label,
      unit,
      method: 'volume',
      formula: 'face of the walls x width of their footings by height x thickness',
      inputs: (at) => ({
        ...face(at),
        share: `${data}/abutment/wingFootingWidth`,
        thickness: `${data}/abutment/wingFootingM`,
      }),
      compute: (v) => v.face * v.share * v.thickness,
    }),
    described({
      path,
      when: item('reinforcement', ' walls'),
      label,
      unit,
      method: 'product',
      formula: 'concrete x bars per m3',
      inputs: (at) => ({ concrete: concrete(at, 'abutment-concrete'), bars: `${data}/abutment/barsKgM3` }),
      compute: ({ concrete: volume, bars }) => volume * bars,
    }),
    described({
      path,
      when: item('reinforcement', ' wall footings'),
      label,
      unit,
      method: 'product',
      formula: 'concrete x bars per m3',
      inputs: (at) => ({ concrete: concrete(at, 'footing-concrete'), bars: `${data}/footing/barsKgM3` }),
      compute: ({ concrete: volume, bars }) => volume * bars,
    }),
  ];
};

/** Lines of one approach: its fill, its walls, and the road on the fill inside the crossing. */
const approach = (end: End): Descriptor[] => [
  described({
    path,
    when: crossing((what) => what === `${end} approach`),
    label,
    unit,
    method: 'as measured',
    formula: 'fill of the approach, integrated over the ground',
    inputs: (at) => ({ fill: `${at.root}/profile/approaches/${end}/fillM3` }),
    compute: ({ fill }) => fill,
  }),
  ...(['surfacing', 'parapet'] as const).map((id) =>
    described({
      path,
      when: (at) => crossing((what) => what.startsWith(`${end} approach road`))(at) && lineOf(at).item === id,
      label,
      unit,
      method: 'product',
      formula:
        id === 'surfacing'
          ? 'length on fill between the abutment and the end of the crossing x deck width'
          : 'two edges x length on fill between the abutment and the end of the crossing',
      inputs: (at) => ({
        outer: `site/${end}M`,
        abutment: at.ends[end],
        width: id === 'surfacing' ? ['site/deck/widthM'] : [],
      }),
      compute: ({ outer, abutment, width }) => Math.abs(abutment - outer) * (width[0] ?? 2),
    }),
  ),
  ...walls(`${end} approach`, `approaches/${end}`),
];

/** Lines of the regrading of the existing road behind a fixed end. */
const regrading = (end: End): Descriptor[] => {
  const name = `${end} regrading`;
  const behind = (at: At, field: string): string => `${at.root}/profile/regrading/${end}/${field}`;
  return [
    ...(['fill', 'excavation'] as const).map((id) =>
      described({
        path,
        when: (at) => crossing((what) => what === name)(at) && lineOf(at).item === id,
        label,
        unit,
        method: 'as measured',
        formula: 'between the regraded and the existing road',
        inputs: (at) => ({ volume: behind(at, id === 'fill' ? 'fillM3' : 'cutM3') }),
        compute: ({ volume }) => volume,
      }),
    ),
    ...(['surfacing', 'parapet'] as const).map((id) =>
      described({
        path,
        when: (at) => crossing((what) => what.startsWith(`${name}, `))(at) && lineOf(at).item === id,
        label,
        unit,
        method: 'product',
        formula: id === 'surfacing' ? 'length regraded x deck width' : 'two edges x length regraded',
        inputs: (at) => ({
          length: behind(at, 'lengthM'),
          width: id === 'surfacing' ? ['site/deck/widthM'] : [],
        }),
        compute: ({ length, width }) => length * (width[0] ?? 2),
      }),
    ),
    ...walls(name, `regrading/${end}`),
  ];
};

/** Lines of the take-off: where each was measured, and what the crossing itself asks for. */
export const lineFigures: readonly Descriptor[] = [
  described({
    path: 'options/:option/designs/:unit/lines/:line/quantity',
    label: (at) => at.design.lines[at.index('line')]!.what,
    unit: (at) => itemOf(at.design.lines[at.index('line')]!.item).unit,
    method: 'take-off',
    formula: (at) => at.design.lines[at.index('line')]!.how,
    inputs: (at) => ({
      spans: at.design.task.spansM.map((_, i) => `${at.unit}/task/spansM/${i}`),
      width: `${at.unit}/task/deck/widthM`,
      depth: `${at.unit}/task/depthM`,
    }),
  }),
  described({
    path,
    when: (at) => 'path' in originOf(at),
    label,
    unit,
    method: 'as measured',
    formula: (at) => lineOf(at).how,
    inputs: (at) => {
      const origin = originOf(at);
      return { measured: 'path' in origin ? origin.path : '' };
    },
    compute: ({ measured }) => measured,
  }),
  described({
    path,
    when: isItem('surfacing'),
    label,
    unit,
    method: 'product',
    formula: 'length x deck width',
    inputs: (at) => ({ length: at.ends.length, width: 'site/deck/widthM' }),
    compute: ({ length, width }) => length * width,
  }),
  described({
    path,
    when: isItem('parapet'),
    label,
    unit,
    method: 'product',
    formula: 'two edges x length',
    inputs: (at) => ({ length: at.ends.length }),
    compute: ({ length }) => 2 * length,
  }),
  ...approach('start'),
  ...approach('end'),
  ...regrading('start'),
  ...regrading('end'),
  described({
    path,
    when: isItem('rail-possession'),
    label,
    unit,
    method: 'simple rule',
    formula:
      'rounded up: possessions of the method + share x girder lines x pieces of each over the track and its margins',
    inputs: possession,
    compute: (v) => {
      const reach = Math.max(...v.to) - Math.min(...v.from) + 2 * v.margin;
      const pieces = v.piece.reduce(
        (all, length) => all + (v.girders[0] ?? 2) * Math.ceil(reach / length),
        0,
      );
      return Math.ceil(v.base + v.perPiece * pieces);
    },
  }),
  described({
    path,
    when: isItem('method-setup'),
    label,
    unit,
    method: 'figure of practice',
    formula: 'set-ups of the method, in set-ups of a crane job',
    inputs(at) {
      const method = methodIds.find((one) => setUpWords(one) === lineOf(at).what);
      return { setups: `data/programme/methods/${method!}/setups` };
    },
    compute: ({ setups }) => setups,
  }),
  described({
    path,
    when: isItem('site-setup'),
    label,
    unit,
    method: 'count',
    formula: 'once',
    value: (at) => lineOf(at).quantity,
  }),
  described({
    path,
    when: isItem('site-month'),
    label,
    unit,
    method: 'as planned',
    formula: 'likely months on site',
    inputs: (at) => ({ months: `${at.root}/months/p50` }),
    compute: ({ months }) => months,
  }),
];
