import { described, type At, type Descriptor, type Foundation } from '../model/index.ts';
import { flowAt, type FlowAt } from '../river/index.ts';
import { settingAt } from './setting.ts';
import { supportName } from './supportFigures.ts';

export const foundation = (steps: string): string =>
  `options/:option/supports/:support/foundations/:f/${steps}`;
export const foundationAt = (at: At): Foundation => at.support.foundations[at.index('f')]!;
export const footPath = (at: At): string => `${at.foot}/foundations/${at.name('f')}`;
export const onGround =
  (what: string) =>
  (at: At): string =>
    `${what}, ${supportName(at)} on ${foundationAt(at).ground.replace('-', ' ')}`;

const on =
  (what: string) =>
  (at: At): string =>
    `${what}, ${supportName(at)}`;
const support = (steps: string): string => `options/:option/supports/:support/${steps}`;
const groundFigure = (at: At, name: string): string =>
  `data/substructure/ground/${foundationAt(at).ground}/${name}`;
const footing = (name: string): string => `data/substructure/footing/${name}`;
const piles = (name: string): string => `data/substructure/piles/${name}`;
const scour = (name: string): string => `data/substructure/scour/${name}`;
const isSpread = (at: At): boolean => foundationAt(at).kind === 'spread';
const stratum = (at: At): string => `${footPath(at)}/bearingLevelM`;
const classPath = (at: At): string => `site/groundStretches/${at.support.stretch}/classes/${at.name('f')}`;
const followsGround = (at: At): boolean =>
  at.site.groundStretches[at.support.stretch]?.classes[at.index('f')]?.bearingDepthM !== undefined;

/** What a foundation is sized for. */
const loads = (at: At) =>
  ({
    permanent: `${at.foot}/permanentKN`,
    traffic: `${at.foot}/trafficKN`,
    along: `${at.foot}/articulation/alongKN`,
    across: `${at.foot}/articulation/acrossKN`,
    height: `${at.foot}/heightM`,
    framed:
      at.support.articulation.frame === undefined
        ? []
        : (['pushedKNm', 'turnedKNm'] as const).map((field) => `${at.foot}/articulation/frame/${field}`),
    building:
      at.support.articulation.buildingKNm === undefined ? [] : [`${at.foot}/articulation/buildingKNm`],
    struck: at.support.articulation.vesselKN === undefined ? [] : [`${at.foot}/articulation/vesselKN`],
    earthquake: at.site.seismic == null ? [] : ['site/seismic/groundAccelerationG'],
    shaft: [`${at.foot}/shaft/lengthM`, `${at.foot}/shaft/widthM`],
  }) as const;

/** Waters whose flood reaches a support: those it stands in, and on a flood plain all. */
const floods = (at: At): string[] => {
  const { site } = at;
  const x = at.support.chainageM;
  const onPlain = site.soffitLimits.some((one) => one.kind === 'flood' && x >= one.fromM && x <= one.toM);
  return site.waters.flatMap((water, i) =>
    water.floodLevelM !== null && (onPlain || (x >= water.fromM && x <= water.toM))
      ? [`site/waters/${i}/floodLevelM`]
      : [],
  );
};

/** The design flood at a support, where its flow is known. */
const flowOver = (at: At): FlowAt | null => flowAt(at.site, at.support.chainageM);

/** A figure of the river whose flood reaches a support. */
function riverOf(at: At, field: string): string[] {
  const water = flowOver(at)?.water;
  const index = (at.option.rivers ?? []).findIndex((river) => river.water === water);
  return index < 0 ? [] : [`${at.root}/rivers/${index}/${field}`];
}

/** What the brief gives of that river, where it does. */
function givenOf(at: At, field: 'siltFactor' | 'grainMm'): string[] {
  const water = flowOver(at)?.water;
  const given = water === undefined ? null : at.site.waters[water]!.river?.[field];
  return given == null ? [] : [`site/waters/${water}/river/${field}`];
}

const groundLine = (at: At): string[] => at.site.groundZ.map((_, i) => `site/groundZ/${i}`);

const pierScour = (name: string): string => `data/river/pierScour/${name}`;
const hec18 = {
  factor: pierScour('factor'),
  nose: pierScour('noseFactor'),
  bed: pierScour('bedFactor'),
  wide: pierScour('widthPower'),
  fast: pierScour('froudePower'),
  slow: pierScour('slowFroude'),
  mostSlow: pierScour('mostSlow'),
  mostFast: pierScour('mostFast'),
} as const;

/** What the foundations of a support have in common, and what each is for its own ground. */
export const foundationFigures: readonly Descriptor[] = [
  described({
    path: support('floodDepthM'),
    label: on('depth of the flood over the ground'),
    unit: 'm',
    method: 'difference',
    formula:
      'design flood level - ground level, at least the depth of ordinary water; 0 where no flood reaches',
    value: (at) => settingAt(at.site, at.support.chainageM).floodDepthM,
    inputs: (at) => ({
      floods: floods(at),
      ground: `${at.foot}/groundLevelM`,
      water: `${at.foot}/waterDepthM`,
    }),
    compute: ({ floods: levels, ground, water }) => Math.max(water, ...levels.map((level) => level - ground)),
  }),
  described({
    path: support('floodVelocityMs'),
    label: on('velocity of the flood'),
    unit: 'm/s',
    method: 'share of the flow',
    formula:
      'flow x depth^(2/3) / integral of depth^(5/3) between the abutments, square to the flow (Manning)',
    value: (at) => flowOver(at)?.velocityMs ?? null,
    inputs: (at) => ({
      flow: riverOf(at, 'flowM3s'),
      depth: `${at.foot}/floodDepthM`,
      ground: groundLine(at),
    }),
  }),
  described({
    path: support('laceyM'),
    label: on("Lacey's depth under the flood"),
    unit: 'm',
    method: 'product',
    formula: '1.34 (q^2 / f)^(1/3), q depth x velocity, f silt factor or 1.76 sqrt(d50)',
    value: (at) => flowOver(at)?.laceyM ?? null,
    inputs: (at) => ({
      depth: `${at.foot}/floodDepthM`,
      velocity: `${at.foot}/floodVelocityMs`,
      factor: 'data/river/lacey/depthFactor',
      perGrain: 'data/river/lacey/siltFactor',
      silt: givenOf(at, 'siltFactor'),
      grain: givenOf(at, 'grainMm'),
    }),
    compute: (v) => {
      const f = v.silt[0] ?? v.perGrain * Math.sqrt(v.grain[0] ?? NaN);
      return v.factor * Math.cbrt((v.depth * v.velocity) ** 2 / f);
    },
  }),
  described({
    path: support('pierScourM'),
    label: on('hole at the pier'),
    unit: 'm',
    method: 'equation of HEC-18',
    formula: '2 K1 K3 a^0.65 y^0.35 Fr^0.43, at most 2.4 a, or 3 a where Fr > 0.8; a thickness of the pier',
    inputs: (at) => ({
      depth: `${at.foot}/floodDepthM`,
      velocity: `${at.foot}/floodVelocityMs`,
      thickness: `${at.foot}/shaft/lengthM`,
      ...hec18,
    }),
    compute: (v) => {
      const froude = v.velocity / Math.sqrt(9.81 * v.depth);
      const hole = v.factor * v.nose * v.bed * v.depth * (v.thickness / v.depth) ** v.wide * froude ** v.fast;
      return Math.min(hole, (froude > v.slow ? v.mostFast : v.mostSlow) * v.thickness);
    },
  }),
  described({
    path: support('scourM'),
    when: (at) => flowOver(at) !== null,
    label: on('depth of scour'),
    unit: 'm',
    method: 'deeper of two',
    formula: (at) =>
      at.support.kind === 'abutment'
        ? "1.27 x Lacey's depth - depth of the flood, at least 0; preset where the bed is not known"
        : "2 x Lacey's depth - depth of the flood; or general scour, Lacey's depth - depth of the flood or a preset where the bed is not known, + the hole at the pier",
    inputs: (at) => {
      const wall = at.support.kind === 'abutment';
      const bed = flowOver(at)?.laceyM != null;
      return {
        flood: `${at.foot}/floodDepthM`,
        lacey: bed ? [`${at.foot}/laceyM`] : [],
        times: `data/river/lacey/${wall ? 'atWall' : 'atPier'}`,
        preset: scour(at.support.waterDepthM > 0 ? 'generalRiverM' : 'generalPlainM'),
        hole: wall ? [] : [`${at.foot}/pierScourM`],
      };
    },
    compute: ({ flood, lacey: [lacey], times, preset, hole: [hole = 0] }) =>
      Math.max(
        (lacey === undefined ? preset : Math.max(0, lacey - flood)) + hole,
        lacey === undefined ? 0 : times * lacey - flood,
      ),
  }),
  described({
    path: support('scourM'),
    label: on('depth of scour'),
    unit: 'm',
    method: 'general and local scour',
    formula:
      'general scour + 1.5 b tanh(y / b), b thickness across the flow, y flood depth; no local hole at a wall',
    inputs: (at) => ({
      flood: `${at.foot}/floodDepthM`,
      water: `${at.foot}/waterDepthM`,
      river: scour('generalRiverM'),
      plain: scour('generalPlainM'),
      local: scour('localFactor'),
      b: at.support.kind === 'abutment' ? [] : [`${at.foot}/shaft/lengthM`],
    }),
    compute: (v) => {
      if (!(v.flood > 0)) return 0;
      const general = v.water > 0 ? v.river : v.plain;
      return v.b.reduce((total, b) => total + v.local * b * Math.tanh(v.flood / b), general);
    },
  }),
  described({
    path: support('pitFromM'),
    label: on('level the pit is dug from'),
    unit: 'm',
    method: 'least of two levels',
    formula: (at) =>
      at.support.kind === 'abutment'
        ? 'ground, or lower where the walls reach down: foot of the walls + cover over the cap'
        : 'ground level',
    inputs: (at) => ({
      ground: `${at.foot}/groundLevelM`,
      foot: at.support.kind === 'abutment' ? [`${at.foot}/footM`] : [],
      cover: piles('capCoverM'),
    }),
    compute: ({ ground, foot, cover }) => Math.min(ground, ...foot.map((level) => level + cover)),
  }),
  described({
    path: foundation('bearingLevelM'),
    when: followsGround,
    label: onGround('level at which it bears'),
    unit: 'm',
    method: 'difference',
    formula: 'ground level - depth below the ground',
    inputs: (at) => ({ ground: `${at.foot}/groundLevelM`, depth: `${classPath(at)}/bearingDepthM` }),
    compute: ({ ground, depth }) => ground - depth,
  }),
  described({
    path: foundation('bearingLevelM'),
    label: onGround('level at which it bears'),
    unit: 'm',
    method: 'as along the stretch of ground',
    formula: 'bearing level of the class',
    inputs: (at) => ({ level: `${classPath(at)}/bearingLevelM` }),
    compute: ({ level }) => level,
  }),
  described({
    path: foundation('odds'),
    label: onGround('odds'),
    unit: '',
    method: 'as given',
    formula: 'odds that the stretch turns out to be this ground',
    inputs: (at) => ({ odds: `${classPath(at)}/odds` }),
    compute: ({ odds }) => odds,
  }),
  ...(['lengthM', 'widthM'] as const).map((side) =>
    described({
      path: foundation(`footing/${side}`),
      label: onGround(side === 'lengthM' ? 'length along the road' : 'width across the road'),
      unit: 'm',
      method: (at) => (isSpread(at) ? 'smallest plan that stands' : 'group with the least concrete'),
      formula: (at) =>
        isSpread(at)
          ? 'V / ((B - 2 e)(W - 2 f)) within the allowable pressure, e and f within a third, sliding within base friction'
          : 'corner pile V / n + M y / sum y^2 within shaft friction, base and concrete; cap around the rows at 3 diameters',
      inputs: (at) =>
        isSpread(at)
          ? { ...loads(at), ground: [groundFigure(at, 'allowableKPa'), footing('baseFriction')] }
          : {
              ...loads(at),
              ground: [groundFigure(at, 'shaftKPa'), groundFigure(at, 'baseKPa'), piles('spacing')],
            },
    }),
  ),
  described({
    path: foundation('footing/depthM'),
    when: isSpread,
    label: onGround('depth of the footing'),
    unit: 'm',
    method: 'one-way shear',
    formula:
      'a q / (q + v) + cover, at least the practical depth; a overhang, q design pressure, v shear strength without links',
    inputs: (at) => ({
      plan: [`${footPath(at)}/footing/lengthM`, `${footPath(at)}/footing/widthM`],
      shaft: [`${at.foot}/shaft/lengthM`, `${at.foot}/shaft/widthM`],
      allowable: groundFigure(at, 'allowableKPa'),
      factor: footing('designPressure'),
      shear: footing('shearKPa'),
      cover: footing('coverM'),
      least: footing('leastDepthM'),
    }),
    compute: (v) => {
      const overhang = Math.max(v.plan[0]! - v.shaft[0]!, v.plan[1]! - v.shaft[1]!) / 2;
      const q = v.factor * v.allowable;
      return Math.max(v.least, (overhang * q) / (q + v.shear) + v.cover);
    },
    sources: ['EN 1992-1-1 6.2.2 (from memory)'],
  }),
  described({
    path: foundation('footing/depthM'),
    label: onGround('depth of the pile cap'),
    unit: 'm',
    method: 'product',
    formula: 'diameters of the pile, at least the practical depth',
    inputs: (at) => ({
      diameter: `${footPath(at)}/piles/diameterM`,
      share: piles('capDepthDiameters'),
      least: piles('leastCapDepthM'),
    }),
    compute: ({ diameter, share, least }) => Math.max(least, share * diameter),
  }),
  described({
    path: foundation('footing/topLevelM'),
    when: isSpread,
    label: onGround('top of the footing'),
    unit: 'm',
    method: 'lowest of three levels',
    formula: 'underside + depth; underside at the least depth, in the bearing stratum and below scour',
    inputs: (at) => ({
      from: `${at.foot}/pitFromM`,
      least: groundFigure(at, 'leastDepthM'),
      stratum: stratum(at),
      into: groundFigure(at, 'intoStratumM'),
      scours: groundFigure(at, 'scours'),
      scour: `${at.foot}/scourM`,
      below: scour('embedmentM'),
      depth: `${footPath(at)}/footing/depthM`,
    }),
    compute: (v) =>
      Math.min(
        v.from - v.least,
        v.stratum - v.into,
        v.scours === 1 && v.scour > 0 ? v.from - v.scour - v.below : Infinity,
      ) + v.depth,
  }),
  described({
    path: foundation('footing/topLevelM'),
    label: onGround('top of the pile cap'),
    unit: 'm',
    method: 'difference',
    formula: 'level the pit is dug from - cover',
    inputs: (at) => ({ from: `${at.foot}/pitFromM`, cover: piles('capCoverM') }),
    compute: ({ from, cover }) => from - cover,
  }),
  ...(['count', 'diameterM'] as const).map((what) =>
    described({
      path: foundation(`piles/${what}`),
      label: onGround(what === 'count' ? 'piles' : 'diameter of the piles'),
      unit: what === 'count' ? 'no' : 'm',
      method: 'group with the least concrete',
      formula: 'diameters and rows tried in turn; concrete of piles and cap, and an allowance for each pile',
      inputs: (at) => ({ ...loads(at), perPile: piles('perPileM3'), safety: piles('safety') }),
    }),
  ),
  described({
    path: foundation('overload'),
    label: onGround('overload of the piles'),
    unit: '',
    method: 'least multiple, by halving',
    formula:
      'how many times its allowable load and its longest length a pile of the lightest group would need',
    inputs: (at) => ({ ...loads(at), stratum: stratum(at), safety: piles('safety') }),
  }),
  described({
    path: foundation('piles/toeLevelM'),
    label: onGround('level of the pile toes'),
    unit: 'm',
    method: 'length that the corner pile needs',
    formula: '(load x safety - base x area) / (shaft friction x perimeter) below the bearing level and scour',
    inputs: (at) => ({
      ...loads(at),
      piles: [`${footPath(at)}/piles/count`, `${footPath(at)}/piles/diameterM`],
      ground: [
        groundFigure(at, 'shaftKPa'),
        groundFigure(at, 'baseKPa'),
        groundFigure(at, 'socketDiameters'),
      ],
      stratum: stratum(at),
      scour: `${at.foot}/scourM`,
      safety: piles('safety'),
    }),
  }),
  described({
    path: foundation('piles/lengthM'),
    label: onGround('length of the piles'),
    unit: 'm',
    method: 'difference',
    formula: 'underside of the cap - toe',
    inputs: (at) => ({
      top: `${footPath(at)}/footing/topLevelM`,
      depth: `${footPath(at)}/footing/depthM`,
      toe: `${footPath(at)}/piles/toeLevelM`,
    }),
    compute: ({ top, depth, toe }) => top - depth - toe,
  }),
];
