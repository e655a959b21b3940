import type { At, Descriptor } from '../../model/index.ts';
import { figuresOf, formManual, linesOf, spansOf } from '../common/formManual.ts';
import { slabCheckFigures } from '../common/slab/slabFigures.ts';

const manual = formManual('composite-i');
const { figure, line, check } = manual;

const sum = (values: readonly number[]): number => values.reduce((total, value) => total + value, 0);
const numberIn = (at: At): string => /\d+/u.exec(at.name('figure'))?.[0] ?? '';
const plates = ['webs', 'top flanges', 'bottom flanges'] as const;
const otherSteel = ['cross-girders', 'bracing', 'stiffeners', 'shear studs', 'welds and bolts'] as const;
const area = (at: At) => ({ spans: spansOf(at), width: `${at.unit}/task/deck/widthM` }) as const;
/** Ratio of overhang to spacing, by the number of girders. */
const overhang = (at: At): string =>
  `data/composite-i/${at.design.figures['girders'] === 2 ? 'twin' : 'multi'}/overhangOverSpacing`;
const traffic = (at: At): string[] => figuresOf(at, 'laneVehicles', 'trafficUniformKNm');
const platesFrom =
  (where: string) =>
  (at: At): string[] =>
    figuresOf(at, `${where}TopFlangeM`, `${where}BottomFlangeM`, `${where}WebM`, 'girderHeightM');
const deepestPier = (at: At): number[] => at.design.task.spansM.slice(1).map((_, i) => i + 1);
const piers = (at: At, name: string): string[] =>
  deepestPier(at).map((pier) => `${at.unit}/figures/pier${pier}${name}`);
/** Yield of the steel of the standard. */
const grade = (at: At): string =>
  `data/materials/steel/${at.appraisal.site.standard === 'lm1' ? 'S355' : 'GR50'}/eMPa`;

const midPlates = (at: At) =>
  ({
    height: `${at.unit}/figures/girderHeightM`,
    topWidth: `${at.unit}/figures/topFlangeWidthM`,
    bottomWidth: `${at.unit}/figures/bottomFlangeWidthM`,
    top: `${at.unit}/figures/midspanTopFlangeM`,
    bottom: `${at.unit}/figures/midspanBottomFlangeM`,
    web: `${at.unit}/figures/midspanWebM`,
  }) as const;

/** Composite I-girders: layout, statics and plates of one girder, and the steel of the deck. */
export const compositeFigures: readonly Descriptor[] = [
  figure('girders', {
    label: 'girders',
    unit: 'no',
    method: 'layout',
    formula: 'two up to the widest deck of a twin, else by the widest spacing; or as asked',
    inputs: (at) => ({
      width: `${at.unit}/task/deck/widthM`,
      twin: 'data/composite-i/twin/mostWidthM',
      multi: 'data/composite-i/multi/mostSpacingM',
    }),
  }),
  figure('spacingM', {
    label: 'spacing of the girders',
    unit: 'm',
    method: 'layout',
    formula: 'deck width / (girders - 1 + 2 x overhang over spacing)',
    inputs: (at) => ({
      width: `${at.unit}/task/deck/widthM`,
      girders: `${at.unit}/figures/girders`,
      ratio: overhang(at),
    }),
    compute: ({ width, girders, ratio }) => width / (girders - 1 + 2 * ratio),
  }),
  figure('girderHeightM', {
    label: 'height of the girder over both flanges',
    unit: 'm',
    method: 'difference',
    formula: 'structural depth - slab over the girder, at least the least girder',
    inputs: (at) => ({
      depth: `${at.unit}/task/depthM`,
      slab: `${at.unit}/figures/slabAtGirderM`,
      least: 'data/composite-i/leastGirderM',
    }),
    compute: ({ depth, slab, least }) => Math.max(least, depth - slab),
  }),
  figure('slabMeanM', {
    label: 'mean thickness of the slab',
    unit: 'm',
    method: 'slab across the deck',
    formula: 'concrete / deck width, haunches over a quarter of the spacing, overhangs tapered',
    inputs: (at) => ({ spacing: figuresOf(at, 'spacingM'), width: [`${at.unit}/task/deck/widthM`] }),
  }),
  figure('slabAtGirderM', {
    label: 'slab over the girder',
    unit: 'm',
    method: 'slab across the deck',
    formula:
      'least thickness in steps at which the bars of the overhang and over the girder stay within a practical ratio',
    inputs: (at) => ({
      spacing: figuresOf(at, 'spacingM'),
      limits: ['data/slab/steelRatioMost', 'data/slab/stepM'],
    }),
  }),
  figure('modularRatio', {
    label: 'ratio of moduli for short loads',
    unit: '',
    method: 'ratio',
    formula: 'E of steel / Ecm of the slab',
    inputs: (at) => ({
      steel: grade(at),
      slab: `data/materials/concreteDefaultMPa/${at.appraisal.site.standard}/slab`,
    }),
  }),
  figure('curvatureFactor', {
    label: 'what curvature in plan adds to the outer girder',
    unit: '',
    method: 'V-load method',
    formula: '1 + n Le^2 / (pi^2 C R D); 1 on a straight',
    inputs: (at) => ({
      radius: [`${at.unit}/task/planRadiusM`],
      girders: figuresOf(at, 'girders', 'spacingM'),
      spans: spansOf(at),
    }),
    sources: ['V-load method (from memory)'],
  }),
  figure('laneVehicles', {
    label: 'vehicles on the girder that carries most',
    unit: '',
    method: 'traffic across the deck',
    formula:
      'lever rule of the lanes at their worst place (distribution factors under AASHTO LRFD), in vehicles',
    inputs: (at) => ({
      spacing: figuresOf(at, 'girders', 'spacingM'),
      road: ['site/deck/carriagewayM', 'site/deck/carriagewayOffsetM'],
    }),
    sources: [],
  }),
  figure('trafficUniformKNm', {
    label: 'uniform traffic on the girder that carries most',
    unit: 'kN/m',
    method: 'traffic across the deck',
    formula: 'lane loads over the influence line across the deck',
    inputs: (at) => ({
      spacing: figuresOf(at, 'girders', 'spacingM'),
      road: ['site/deck/carriagewayM', 'site/deck/carriagewayOffsetM'],
    }),
  }),
  ...(['top', 'bottom'] as const).map((side) =>
    figure(`${side}FlangeWidthM`, {
      label: `width of the ${side} flange`,
      unit: 'm',
      method: 'sizing',
      formula: 'one width along the girder, by girder height, bracing and thickest plate',
      inputs: (at) => ({
        height: figuresOf(at, 'girderHeightM'),
        limits: ['data/composite-i/flange/leastWidthM', 'data/composite-i/flange/mostWidthM'],
      }),
    }),
  ),
  ...(
    [
      ['TopFlangeM', 'top flange'],
      ['BottomFlangeM', 'bottom flange'],
      ['WebM', 'web'],
    ] as const
  ).flatMap(([key, word]) => [
    figure(`midspan${key}`, {
      label: `${word} in the middle of the longest span`,
      unit: 'm',
      method: 'sizing',
      formula: 'thinnest plate on the market that passes every check there',
      inputs: (at) => ({ moment: figuresOf(at, 'sagDesignKNm', 'girderHeightM'), traffic: traffic(at) }),
    }),
    figure(new RegExp(`^pier\\d+${key}$`, 'u'), {
      label: (at) => `${word} at pier ${numberIn(at)}`,
      unit: 'm',
      method: 'sizing',
      formula: 'thicker plate of the two beside the pier',
      inputs: (at) => ({
        effects: figuresOf(
          at,
          `pier${numberIn(at)}HogDesignKNm`,
          `pier${numberIn(at)}ShearDesignKN`,
          'girderHeightM',
        ),
      }),
    }),
  ]),
  figure('midspanSteelAreaM2', {
    label: 'steel area of the girder in the middle of the longest span',
    unit: 'm2',
    method: 'section',
    formula: 'top flange + bottom flange + web',
    inputs: midPlates,
    compute: (v) => v.topWidth * v.top + v.bottomWidth * v.bottom + (v.height - v.top - v.bottom) * v.web,
  }),
  figure('midspanSteelInertiaM4', {
    label: 'inertia of the steel girder in the middle of the longest span',
    unit: 'm4',
    method: 'section',
    formula: 'sum A (z - zs)^2 + own inertias of the three plates',
    inputs: midPlates,
    compute: (v) => {
      const web = v.height - v.top - v.bottom;
      const parts = [
        { area: v.topWidth * v.top, at: v.height - v.top / 2, high: v.top },
        { area: v.bottomWidth * v.bottom, at: v.bottom / 2, high: v.bottom },
        { area: web * v.web, at: v.bottom + web / 2, high: web },
      ];
      const centroid = sum(parts.map((part) => part.area * part.at)) / sum(parts.map((part) => part.area));
      return sum(parts.map((part) => part.area * ((part.at - centroid) ** 2 + part.high ** 2 / 12)));
    },
  }),
  figure('midspanCompositeInertiaM4', {
    label: 'inertia of girder and slab in the middle of the longest span, short loads',
    unit: 'm4',
    method: 'section',
    formula: 'steel girder and effective slab / ratio of moduli, about their common axis',
    inputs: (at) => ({ ...midPlates(at), slab: figuresOf(at, 'slabMeanM', 'modularRatio', 'spacingM') }),
  }),
  figure(/^pier\d+CrackedInertiaM4$/u, {
    label: (at) => `inertia of girder and bars at pier ${numberIn(at)}, slab cracked`,
    unit: 'm4',
    method: 'section',
    formula: 'steel girder and bars of the effective slab, about their common axis',
    inputs: (at) => ({
      plates: platesFrom(`pier${numberIn(at)}`)(at),
      bars: [`data/composite-i/barsOverPiers/${at.appraisal.site.standard}`],
    }),
  }),
  figure('sagDesignKNm', {
    label: 'greatest design moment in the spans, one girder',
    unit: 'kNm',
    method: 'greatest of the spans',
    formula: 'greatest of the spans',
    inputs: (at) => ({
      spans: figuresOf(at, ...at.design.task.spansM.map((_, i) => `span${i + 1}SagDesignKNm`)),
    }),
    compute: ({ spans }) => Math.max(...spans),
  }),
  figure(/^span\d+SagDesignKNm$/u, {
    label: (at) => `design moment in span ${numberIn(at)}, one girder`,
    unit: 'kNm',
    method: 'continuous beam, built in stages',
    formula:
      'gamma G (steel and wet slab on the steel) + gamma G (superimposed on the composite girder) + gamma Q traffic',
    inputs: (at) => ({ spans: spansOf(at), traffic: traffic(at), slab: figuresOf(at, 'slabMeanM') }),
  }),
  figure(/^pier\d+HogDesignKNm$/u, {
    label: (at) => `design moment at pier ${numberIn(at)}, one girder`,
    unit: 'kNm',
    method: 'continuous beam, built in stages',
    formula: 'gamma G permanent + shrinkage + gamma Q traffic',
    inputs: (at) => ({
      parts: figuresOf(at, `pier${numberIn(at)}PermanentKNm`, `pier${numberIn(at)}TrafficKNm`),
    }),
  }),
  figure(/^pier\d+ShearDesignKN$/u, {
    label: (at) => `design shear beside pier ${numberIn(at)}, one girder`,
    unit: 'kN',
    method: 'continuous beam, built in stages',
    formula: 'gamma G permanent + gamma Q traffic, the greater side',
    inputs: (at) => ({ spans: spansOf(at), traffic: traffic(at) }),
  }),
  figure(/^pier\d+PermanentKNm$/u, {
    label: (at) => `permanent moment at pier ${numberIn(at)}, one girder, characteristic`,
    unit: 'kNm',
    method: 'continuous beam, built in stages',
    formula: 'steel and wet slab on the steel girder + superimposed on the composite one',
    inputs: (at) => ({
      spans: spansOf(at),
      loads: [`${at.unit}/task/deck/superimposedKNm`, ...figuresOf(at, 'slabMeanM', 'plateKgM2')],
    }),
  }),
  figure(/^pier\d+TrafficKNm$/u, {
    label: (at) => `traffic moment at pier ${numberIn(at)}, one girder, characteristic`,
    unit: 'kNm',
    method: 'influence line',
    formula: 'area of the influence line x uniform load + vehicles at their worst place',
    inputs: (at) => ({ spans: spansOf(at), traffic: traffic(at) }),
  }),
  figure('studs', {
    label: 'shear studs',
    unit: 'no',
    method: 'longitudinal shear',
    formula: 'sum along the girders of the greater of V S / I / resistance of a stud, and the least number',
    inputs: (at) => ({
      girders: figuresOf(at, 'girders', 'midspanCompositeInertiaM4'),
      stud: ['data/composite-i/studs/resistanceKN', 'data/composite-i/studs/leastPerM2'],
    }),
  }),
  figure('steelKgM2', {
    label: 'structural steel per m2 of deck',
    unit: 'kg/m2',
    method: 'ratio',
    formula: 'steel lines of the unit / (length x deck width)',
    inputs: (at) => ({ lines: linesOf(at, ...plates, ...otherSteel), ...area(at) }),
    compute: ({ lines, spans, width }) => sum(lines) / (sum(spans) * width),
  }),
  figure('plateKgM2', {
    label: 'webs and flanges per m2 of deck',
    unit: 'kg/m2',
    method: 'ratio',
    formula: '(webs + flanges) / (length x deck width)',
    inputs: (at) => ({ lines: linesOf(at, ...plates), ...area(at) }),
    compute: ({ lines, spans, width }) => sum(lines) / (sum(spans) * width),
  }),
  line('deck slab', {
    label: 'deck slab',
    unit: 'm3',
    method: 'volume',
    formula: 'mean thickness x length x deck width',
    inputs: (at) => ({ mean: `${at.unit}/figures/slabMeanM`, ...area(at) }),
    compute: ({ mean, spans, width }) => mean * sum(spans) * width,
  }),
  line('shear studs', {
    label: 'shear studs',
    unit: 'kg',
    method: 'product',
    formula: 'studs x mass of one',
    inputs: (at) => ({ studs: `${at.unit}/figures/studs`, each: 'data/composite-i/studs/kgEach' }),
    compute: ({ studs, each }) => studs * each,
  }),
  line('welds and bolts', {
    label: 'welds and bolts',
    unit: 'kg',
    method: 'share',
    formula: 'share x (webs + flanges + cross-girders or bracing + stiffeners)',
    inputs: (at) => ({
      share: 'data/composite-i/weldsAndBoltsShare',
      steel: linesOf(at, ...plates, 'cross-girders', 'bracing', 'stiffeners'),
    }),
    compute: ({ share, steel }) => share * sum(steel),
  }),
  ...check('casting', {
    demand:
      'M / W of the steel girder under steel, wet slab and working load, raised by 1 / chi of the flange between bracings',
    capacity: 'yield of the plate',
    demandFrom: (at) => figuresOf(at, 'slabMeanM', 'girderHeightM', 'topFlangeWidthM'),
    capacityFrom: (at) => [grade(at)],
    sources: ['EN 1991-1-6 table 4.2, EN 1993-2 6.3.4.2 (from memory)'],
  }),
  ...check('bending-spans', {
    demand: 'sum over the stages of M (z - zs) / I at the flanges, greatest in the spans',
    capacity: 'yield of the plate',
    demandFrom: (at) => figuresOf(at, 'sagDesignKNm', 'midspanSteelInertiaM4', 'midspanCompositeInertiaM4'),
    capacityFrom: (at) => [grade(at), ...figuresOf(at, 'midspanBottomFlangeM')],
    sources: ['EN 1994-2 6.2.1.5 (from memory)'],
  }),
  ...check('bending-piers', {
    demand:
      'sum over the stages of M (z - zs) / I, slab cracked; compressed flange raised by 1 / chi between bracings',
    capacity: 'yield of the plate',
    demandFrom: (at) => [...piers(at, 'HogDesignKNm'), ...piers(at, 'CrackedInertiaM4')],
    capacityFrom: (at) => [grade(at), ...piers(at, 'BottomFlangeM')],
    sources: ['EN 1994-2 6.2.1.5, EN 1993-2 6.3.4.2 (from memory)'],
  }),
  ...check('service-stress', {
    demand: 'characteristic stress of the bottom flange over the stages, with shrinkage',
    capacity: 'yield of the plate',
    demandFrom: (at) => figuresOf(at, 'sagDesignKNm', 'midspanCompositeInertiaM4'),
    capacityFrom: (at) => [grade(at)],
    sources: ['EN 1994-2 7.2 (from memory)'],
  }),
  ...check('fatigue', {
    demand: 'stress range of the equivalent moment range at the flanges',
    capacity: 'range of the detail / its factor',
    demandFrom: (at) => [...traffic(at), ...figuresOf(at, 'midspanCompositeInertiaM4')],
    capacityFrom: (at) => [`data/composite-i/fatigue/${at.appraisal.site.standard}/categoryMPa`],
    sources: ['EN 1993-1-9 (from memory)'],
  }),
  ...check('shear', {
    demand: 'gamma G permanent + gamma Q traffic, one girder, at the worst place',
    capacity: 'shear buckling of the web between stiffeners',
    demandFrom: (at) => [...piers(at, 'ShearDesignKN'), ...spansOf(at)],
    capacityFrom: (at) => figuresOf(at, 'midspanWebM', 'girderHeightM'),
    sources: ['EN 1993-1-5 5 (from memory)'],
  }),
  ...check('bending-shear', {
    demand: 'M / Mpl + (1 - Mf / Mpl) (2 V / Vb - 1)^2 at the piers',
    capacity: '1',
    demandFrom: (at) => [...piers(at, 'HogDesignKNm'), ...piers(at, 'ShearDesignKN')],
    capacityFrom: () => [],
    sources: ['EN 1993-1-5 7.1 (from memory)'],
  }),
  ...check('deflection', {
    demand: 'traffic deflection in the middle of the worst span, influence line of the composite girder',
    capacity: 'span / limit of the standard',
    demandFrom: (at) => [...traffic(at), ...figuresOf(at, 'midspanCompositeInertiaM4')],
    capacityFrom: (at) => [...spansOf(at), `data/${at.appraisal.site.standard}/deflection/limitRatio`],
  }),
  ...check('launching', {
    demand: 'gamma G x moment of the bare girder over the longest span just before the nose lands / W',
    capacity: 'yield of the plate',
    demandFrom: (at) => [
      ...spansOf(at),
      'data/composite-i/launching/noseOverSpan',
      ...linesOf(at, ...plates),
    ],
    capacityFrom: (at) => [grade(at)],
  }),
  ...check('girder-depth', {
    demand: 'least height of a plate girder',
    capacity: 'structural depth - slab over the girder',
    demandFrom: () => ['data/composite-i/leastGirderM'],
    capacityFrom: (at) => [`${at.unit}/task/depthM`, ...figuresOf(at, 'slabAtGirderM')],
  }),
  ...slabCheckFigures(manual, 'slabMeanM'),
];
