import { described, type At, type Descriptor, type RiverCrossed } from '../model/index.ts';
import { riverFlows } from './riverFlow.ts';

const river = (field: string): string => `options/:option/rivers/:river/${field}`;
const riverOf = (at: At): RiverCrossed => at.option.rivers![at.index('river')]!;
const own = (at: At, field: string): string => `${at.root}/rivers/${at.name('river')}/${field}`;
const water = (at: At, field: string): string => `site/waters/${riverOf(at).water}/${field}`;
const given = (at: At, field: string): string => water(at, `river/${field}`);
const named =
  (what: string) =>
  (at: At): string =>
    `${what}, ${at.site.waters[riverOf(at).water]!.name}`;
const known = (at: At): boolean => riverFlows(at.site)[riverOf(at).water] != null;

/** What a section of the flood is integrated from. */
const section = (at: At, ends: 'river' | 'bridge') => ({
  ground: at.site.groundZ.map((_, i) => `site/groundZ/${i}`),
  level: water(at, 'floodLevelM'),
  ends: [
    given(at, 'floodFromM'),
    given(at, 'floodToM'),
    ...(ends === 'bridge' ? [at.ends.start, at.ends.end] : []),
  ],
  skew: 'site/skewDeg',
});

/** Places of the piers that stand in the flood of the river. */
const piersIn = (at: At): string[] => {
  const { floodFromM, floodToM } = at.site.waters[riverOf(at).water]!.river!;
  return at.option.supports.flatMap(({ kind, chainageM }, s) =>
    kind !== 'abutment' && chainageM >= floodFromM && chainageM <= floodToM
      ? [`${at.root}/supports/${s}`]
      : [],
  );
};

/** Thickness of each pier in the flood, and the ground it stands on. */
const pierInputs = (at: At) => ({
  thickness: piersIn(at).map((pier) => `${pier}/shaft/lengthM`),
  grounds: piersIn(at).map((pier) => `${pier}/groundLevelM`),
  level: water(at, 'floodLevelM'),
});

const unknown = (field: string, label: string, unit: string): Descriptor =>
  described({
    path: river(field),
    label: named(label),
    unit,
    method: 'not known',
    formula: 'waits for the flood level and for the flow or the velocity of the flood',
    inputs: (at) => ({
      level: water(at, 'floodLevelM'),
      flow: given(at, 'flowM3s'),
      velocity: given(at, 'velocityMs'),
    }),
  });

/** What an option does to the rivers it crosses. */
export const riverFigures: readonly Descriptor[] = [
  described({
    path: river('flowM3s'),
    when: known,
    label: named('flow of the design flood'),
    unit: 'm3/s',
    method: 'greater of two ways',
    formula: 'flow as given; velocity as given x area',
    inputs: (at) => {
      const has = at.site.waters[riverOf(at).water]!.river!;
      return {
        flow: has.flowM3s === null ? [] : [given(at, 'flowM3s')],
        velocity: has.velocityMs === null ? [] : [given(at, 'velocityMs')],
        area: own(at, 'areaM2'),
      };
    },
    compute: ({ flow, velocity, area }) => Math.max(flow[0] ?? 0, (velocity[0] ?? 0) * area),
  }),
  described({
    path: river('flowSpread'),
    when: known,
    label: named('flow found two ways, greater over smaller'),
    unit: '',
    method: 'ratio',
    formula: 'greater / smaller of flow as given and velocity x area; 1 where one of them is not known',
    inputs: (at) => ({
      flow: given(at, 'flowM3s'),
      velocity: given(at, 'velocityMs'),
      area: own(at, 'areaM2'),
    }),
    compute: ({ flow, velocity, area }) => {
      const [a, b] = [flow, velocity * area];
      return Number.isFinite(a) && Number.isFinite(b) ? Math.max(a, b) / Math.min(a, b) : 1;
    },
  }),
  described({
    path: river('velocityMs'),
    when: known,
    label: named('mean velocity of the flood before the bridge stands'),
    unit: 'm/s',
    method: 'ratio',
    formula: 'flow / area under the flood level',
    inputs: (at) => ({ flow: own(at, 'flowM3s'), area: own(at, 'areaM2') }),
    compute: ({ flow, area }) => flow / area,
  }),
  described({
    path: river('areaM2'),
    when: known,
    label: named('area under the flood level'),
    unit: 'm2',
    method: 'integral over the ground line',
    formula: 'flood level - ground over the whole flood, x cosine of the skew',
    inputs: (at) => section(at, 'river'),
  }),
  described({
    path: river('bridgeAreaM2'),
    when: known,
    label: named('area between the abutments'),
    unit: 'm2',
    method: 'integral over the ground line',
    formula: 'flood level - ground between the abutments, x cosine of the skew',
    inputs: (at) => section(at, 'bridge'),
  }),
  described({
    path: river('openingM2'),
    when: known,
    label: named('area left by the bridge'),
    unit: 'm2',
    method: 'difference',
    formula: 'area between the abutments - thickness x depth of every pier in the flood',
    inputs: (at) => ({ bridge: own(at, 'bridgeAreaM2'), ...pierInputs(at) }),
    compute: ({ bridge, thickness, grounds, level }) =>
      Math.max(
        0,
        thickness.reduce((left, one, i) => left - one * Math.max(0, level - grounds[i]!), bridge),
      ),
  }),
  described({
    path: river('affluxM'),
    when: known,
    label: named('afflux'),
    unit: 'm',
    method: "Molesworth's formula",
    formula: '(V^2 / 17.88 + 0.015) ((A / a)^2 - 1), V and A before the bridge stands, a the area left',
    inputs: (at) => ({
      velocity: own(at, 'velocityMs'),
      area: own(at, 'areaM2'),
      opening: own(at, 'openingM2'),
      divisor: 'data/river/afflux/velocityDivisor',
      rest: 'data/river/afflux/restM',
    }),
    compute: (v) => (v.velocity ** 2 / v.divisor + v.rest) * ((v.area / v.opening) ** 2 - 1),
    sources: ['afflux-report'],
  }),
  described({
    path: river('allowedAffluxM'),
    label: named('allowed afflux'),
    unit: 'm',
    method: 'as given',
    formula: 'read from the brief',
    inputs: (at) => ({ given: given(at, 'allowedAffluxM') }),
    compute: (v) => v.given,
  }),
  described({
    path: river('waterwayM'),
    when: known,
    label: named('waterway'),
    unit: 'm',
    method: 'difference',
    formula: 'width at flood level between the abutments x cosine of the skew - thickness of the piers in it',
    inputs: (at) => ({ ...section(at, 'bridge'), ...pierInputs(at) }),
  }),
  described({
    path: river('regimeWidthM'),
    when: known,
    label: named('regime width'),
    unit: 'm',
    method: 'formula of Lacey',
    formula: '4.8 sqrt(flow)',
    inputs: (at) => ({ flow: own(at, 'flowM3s'), factor: 'data/river/lacey/widthFactor' }),
    compute: ({ flow, factor }) => factor * Math.sqrt(flow),
    sources: ['lacey-1930'],
  }),
  described({
    path: river('freeboardM'),
    when: known,
    label: named('freeboard'),
    unit: 'm',
    method: 'difference, least along the flood',
    formula: 'soffit - flood level - afflux',
    inputs: (at) => ({
      road: [`${at.root}/profile/startLevelM`, `${at.root}/profile/endLevelM`],
      depth: `${at.root}/depthM/midspan`,
      level: water(at, 'floodLevelM'),
      afflux: own(at, 'affluxM'),
    }),
  }),
  described({
    path: river('freeboardNeededM'),
    label: named('freeboard needed'),
    unit: 'm',
    method: 'as given',
    formula: 'read from the brief',
    inputs: (at) => ({ given: given(at, 'freeboardM') }),
    compute: (v) => v.given,
  }),
  unknown('flowM3s', 'flow of the design flood', 'm3/s'),
  unknown('flowSpread', 'flow found two ways, greater over smaller', ''),
  unknown('velocityMs', 'mean velocity of the flood before the bridge stands', 'm/s'),
  unknown('areaM2', 'area under the flood level', 'm2'),
  unknown('bridgeAreaM2', 'area between the abutments', 'm2'),
  unknown('openingM2', 'area left by the bridge', 'm2'),
  unknown('affluxM', 'afflux', 'm'),
  unknown('waterwayM', 'waterway', 'm'),
  unknown('regimeWidthM', 'regime width', 'm'),
  unknown('freeboardM', 'freeboard', 'm'),
];
