import type { At, Descriptor } from '../model/index.ts';
import { centralAngle, chordOffset } from './curveFacts.ts';
import { asIs, fact, factOf } from './factFigure.ts';
import { bentUse, mostBent } from './supportFacts.ts';

/** Odds of the grounds on which a foundation does not stand, and their overloads. */
const overloads = (at: At): { readonly odds: string[]; readonly overloads: string[] } => {
  const failing = at.option.supports.flatMap(({ foundations }, s) =>
    foundations.flatMap(({ overload = 1, odds }, f) =>
      overload > 1 && odds > 0 ? [`${at.root}/supports/${s}/foundations/${f}`] : [],
    ),
  );
  return {
    odds: failing.map((path) => `${path}/odds`),
    overloads: failing.map((path) => `${path}/overload`),
  };
};

const ofSupports = (at: At, field: string): string[] =>
  at.option.supports.map((_, s) => `${at.root}/supports/${s}/${field}`);

/** A figure of the shaft in one with the deck that is bent most; nothing where there is none. */
const ofMostBent =
  (field: string) =>
  (at: At): { readonly worst: string[] } => {
    const worst = mostBent(at.option.supports);
    return { worst: worst === null ? [] : [`${at.root}/supports/${worst}/${field}`] };
  };

/** A fact of the longest span on the curve of the road; not known where the radius is not. */
const curved = (
  id: string,
  formula: string,
  compute: (spanM: number, radiusM: number) => number,
): readonly Descriptor[] => {
  const inputs = (at: At): { readonly span: string; readonly radius: string } => ({
    span: `${at.root}/facts/mainSpanM`,
    radius: 'site/planRadiusM',
  });
  return [
    {
      ...fact(id, formula, inputs, ({ span, radius }) => compute(span, radius)),
      when: (at) => at.site.planRadiusM !== null,
    },
    fact(id, `${formula}; waits for the radius`, inputs),
  ];
};

/** What the rules are told of the supports. */
export const supportFactFigures: readonly Descriptor[] = [
  fact(
    'foundationlessOdds',
    'greatest odds of a ground on which nothing carries a support; once all stand, 0',
    (at) => ({ odds: overloads(at).odds }),
    ({ odds }) => Math.max(0, ...odds),
  ),
  fact(
    'foundationOverload',
    'greatest overload of a group of piles; once all stand, 1',
    (at) => ({ overloads: overloads(at).overloads }),
    ({ overloads: all }) => Math.max(1, ...all),
  ),
  fact(
    'thickestShaftM',
    'greatest of the piers; once there are none, 0',
    (at) => ({
      shafts: at.option.supports.flatMap(({ kind }, s) =>
        kind === 'pier' || kind === 'anchor-pier' ? [`${at.root}/supports/${s}/shaft/lengthM`] : [],
      ),
    }),
    ({ shafts }) => Math.max(0, ...shafts),
  ),
  fact('seismicCounted', factOf('seismicCounted').meaning, () => ({
    given: 'brief/crossing/groundAccelerationG',
  })),
  asIs('groundAccelerationG', (at) => ({
    given:
      at.site.seismic == null ? 'brief/crossing/groundAccelerationG' : 'site/seismic/groundAccelerationG',
  })),
  fact('siteClassKnown', factOf('siteClassKnown').meaning, () => ({ given: 'brief/crossing/siteClass' })),
  ...(['pierHeightNext', 'pierHeightAll'] as const).map((id) =>
    fact(id, `${factOf(id).meaning} Only once a unit has two.`, (at) => ({
      heights: ofSupports(at, 'heightM'),
    })),
  ),
  fact(
    'vesselKN',
    'greatest of the supports; once none can be struck, 0',
    (at) => ({
      forces: at.option.supports.flatMap(({ articulation }, s) =>
        articulation.vesselKN === undefined ? [] : [`${at.root}/supports/${s}/articulation/vesselKN`],
      ),
    }),
    ({ forces }) => Math.max(0, ...forces),
  ),
  fact('vesselsKnown', factOf('vesselsKnown').meaning, (at) => ({
    vessels: at.study.brief.waters.map((_, i) => `brief/waters/${i}/vesselDwtT`),
    depths: ofSupports(at, 'waterDepthM'),
  })),
  fact(
    'tieDownKN',
    'greatest of the supports',
    (at) => ({ uplifts: ofSupports(at, 'articulation/tieDownKN') }),
    ({ uplifts }) => Math.max(0, ...uplifts),
  ),
  fact('integralAbutments', factOf('integralAbutments').meaning, (at) => ({
    bearings: ofSupports(at, 'articulation/bearings'),
  })),
  fact(
    'castInPiers',
    factOf('castInPiers').meaning,
    (at) => ({
      shafts: at.option.supports.flatMap(({ articulation: { frame } }, s) =>
        frame === undefined ? [] : [`${at.root}/supports/${s}/articulation/frame/designKNm`],
      ),
    }),
    ({ shafts }) => shafts.length,
  ),
  fact(
    'castInUse',
    'design moment / what carries it, of the shaft that is worst off; once none is in one with the deck, 0',
    (at) => ({
      ...ofMostBent('articulation/frame/designKNm')(at),
      carries: ofMostBent('articulation/frame/carriesKNm')(at).worst,
    }),
    ({ worst: [designKNm = 0], carries: [carriesKNm = 1] }) => bentUse({ designKNm, carriesKNm }),
  ),
  ...(
    [
      ['castInPushMm', 'articulation/frame/pushMm'],
      ['castInHeightM', 'heightM'],
    ] as const
  ).map(([id, field]) => fact(id, factOf(id).meaning, ofMostBent(field), ({ worst: [value = 0] }) => value)),
  ...curved('chordOffsetM', 'longest span^2 / (8 R)', chordOffset),
  ...curved('centralAngleDeg', 'longest span / R x 180 / pi', centralAngle),
];
