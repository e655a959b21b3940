import { described, practice, type At, type Descriptor } from '../model/index.ts';
import { factDictionary } from '../rules/index.ts';
import { asIs, fact, factOf, factsOf } from './factFigure.ts';
import { methodFactFigures } from './methodFactFigures.ts';
import { PIER_HALF_WIDTH_M } from './requestFor.ts';
import { regradingFactFigures } from './regradingFigures.ts';
import { riverFactFigures } from './riverFactFigures.ts';
import { supportFactFigures } from './supportFactFigures.ts';
import { spansOf } from './askedTask.ts';
import { mainUnit } from './workOption.ts';

const main = (at: At): number => at.option.units.indexOf(mainUnit(at.option.units));
const design = (at: At): string => `${at.root}/designs/${main(at)}`;
const mainSpans = (at: At): string[] =>
  spansOf(mainUnit(at.option.units)).map((_, i) => `${design(at)}/task/spansM/${i}`);
const mainEnds = (at: At): { readonly from: string; readonly to: string } => {
  const supports = `${at.root}/units/${main(at)}/supportsM`;
  return { from: `${supports}/0`, to: `${supports}/${mainUnit(at.option.units).supportsM.length - 1}` };
};
const designFigure =
  (name: string) =>
  (at: At): { readonly figure: string } => ({ figure: `${design(at)}/figures/${name}` });
const everyDesign = (at: At, steps: string): string[] =>
  at.option.designs.map((_, u) => `${at.root}/designs/${u}/${steps}`);
const pieces = (at: At, field: string): string[] =>
  at.option.designs.flatMap(({ heaviestPiece }, u) =>
    heaviestPiece === null ? [] : [`${at.root}/designs/${u}/heaviestPiece/${field}`],
  );
const innerSupports = (at: At, steps: string): string[] =>
  at.option.supports.slice(1, -1).map((_, s) => `${at.root}/supports/${s + 1}/${steps}`);
const supports = (at: At): string[] => at.option.supports.map((_, s) => `${at.root}/supports/${s}/chainageM`);

const ratios = factDictionary.flatMap(({ id, ratioOf, addedToSecond = 0 }) =>
  ratioOf === undefined
    ? []
    : [
        fact(
          id,
          `${factOf(ratioOf[0]).label} / ${addedToSecond > 0 ? `(${factOf(ratioOf[1]).label} + ${addedToSecond} m)` : factOf(ratioOf[1]).label}`,
          (at) => ({ first: `${at.root}/facts/${ratioOf[0]}`, second: `${at.root}/facts/${ratioOf[1]}` }),
          ({ first, second }) => first / (second + addedToSecond),
        ),
      ],
);

/** Smaller end span over the span beside it. */
function endRatio(spans: readonly number[]): number {
  if (spans.length === 2) return Math.min(...spans) / Math.max(...spans);
  return Math.min(spans[0]! / spans[1]!, spans.at(-1)! / spans.at(-2)!);
}

/** Inner supports inside the hard or the soft stretches of the site. */
const standing = (id: string, formula: string, isHard: boolean): Descriptor =>
  fact(id, formula, (at) => ({
    supports: supports(at),
    zones: at.site.zones.flatMap(({ hard }, i) =>
      hard === isHard ? [`site/zones/${i}/fromM`, `site/zones/${i}/toM`] : [],
    ),
  }));

/** What the rules are asked with, fact by fact. */
export const factFigures: readonly Descriptor[] = [
  practice(
    'site/pierHalfWidth',
    PIER_HALF_WIDTH_M,
    'half the width of a pier beside a barred stretch',
    'm',
    'common-practice',
  ),
  described({
    path: 'site/mainSpanM',
    label: 'span that the widest barred stretch asks for',
    unit: 'm',
    method: 'sum',
    formula: 'clear opening + half a pier on either side',
    inputs: () => ({ clear: 'site/mainOpening/widthM', pier: 'practice/site/pierHalfWidth' }),
    compute: ({ clear, pier }) => clear + 2 * pier,
  }),
  fact(
    'mainSpanM',
    'longest span of the main unit',
    (at) => ({ spans: mainSpans(at) }),
    ({ spans }) => Math.max(...spans),
  ),
  asIs('deckWidthM', () => ({ width: 'site/deck/widthM' })),
  fact('planRadiusM', factOf('planRadiusM').meaning, () => ({ radius: 'site/planRadiusM' })),
  fact(
    'skewDeg',
    factOf('skewDeg').meaning,
    () => ({ skew: 'site/skewDeg' }),
    ({ skew }) => Math.abs(skew),
  ),
  fact('openSkewM', factOf('openSkewM').meaning, (at) => ({
    width: 'site/deck/widthM',
    skew: 'brief/crossing/skewDeg',
    crossed: [
      ...at.site.zones.map((_, i) => `site/zones/${i}/fromM`),
      ...at.site.waters.map((_, i) => `site/waters/${i}/fromM`),
    ],
  })),
  fact('continuity', 'continuous over inner supports, simple between two', (at) => ({
    spans: mainSpans(at),
  })),
  fact('method', 'method of construction of the option', (at) => ({ spans: mainSpans(at) })),
  fact(
    'endSpanRatio',
    'smaller end span / span beside it; of two spans the shorter / the longer',
    (at) => ({ spans: mainSpans(at) }),
    ({ spans }) => endRatio(spans),
  ),
  fact('pylons', 'pylons of the main unit', (at) => ({ spans: mainSpans(at) })),
  fact('sideSpanRatio', 'smaller side span / main span; with one pylon the shorter / the longer', (at) => ({
    spans: mainSpans(at),
  })),
  fact(
    'supportsInRiver',
    'inner supports that stand in water',
    (at) => ({ depths: innerSupports(at, 'waterDepthM') }),
    ({ depths }) => depths.filter((depth) => depth > 0).length,
  ),
  standing(
    'supportsBarred',
    'inner supports, each with half a pier, inside a stretch where none may stand',
    true,
  ),
  standing('supportsSoft', 'inner supports with their axis inside a stretch open at a price', false),
  fact('unitLengthM', 'end - start of the main unit', mainEnds, ({ from, to }) => to - from),
  fact('radiusConstant', 'a study has one radius for the whole crossing', () => ({
    radius: 'site/planRadiusM',
  })),
  fact(
    'haunched',
    'depth at the supports differs from that at midspan',
    (at) => ({
      support: `${design(at)}/depthM/support`,
      midspan: `${design(at)}/depthM/midspan`,
    }),
    ({ support, midspan }) => (support === midspan ? 0 : 1),
  ),
  ...(['falseworkOverRailway', 'falseworkOverWater'] as const).map((id) =>
    fact(id, factOf(id).meaning, (at) => ({
      ...mainEnds(at),
      stretches:
        id === 'falseworkOverWater'
          ? at.site.waters.flatMap((_, i) => [`site/waters/${i}/fromM`, `site/waters/${i}/toM`])
          : at.site.zones.flatMap(({ kind }, i) =>
              kind === 'railway' ? [`site/zones/${i}/fromM`, `site/zones/${i}/toM`] : [],
            ),
    })),
  ),
  ...(
    [
      ['falseworkHeightM', 'greatest height from ground to soffit under the main unit; 0 without falsework'],
      [
        'liftHeightM',
        'greatest height from ground or water to soffit under the main unit; 0 without a crane',
      ],
    ] as const
  ).map(([id, formula]) =>
    fact(id, formula, (at) => ({
      road: at.option.profile.pieces.map((_, i) => `${at.root}/profile/pieces/${i}/levelM`),
      depth: `${at.root}/depthM/midspan`,
      ground: at.option.supports.map((_, s) => `${at.root}/supports/${s}/groundLevelM`),
    })),
  ),
  fact('towersBarred', 'temporary towers of the main unit inside a barred stretch', (at) => ({
    ...mainEnds(at),
    stretches: at.site.zones.flatMap(({ hard }, i) =>
      hard ? [`site/zones/${i}/fromM`, `site/zones/${i}/toM`] : [],
    ),
  })),
  fact('waterUnderRatio', 'longest stretch of water under the main unit / its length', (at) => ({
    ...mainEnds(at),
    waters: at.site.waters.flatMap((_, i) => [`site/waters/${i}/fromM`, `site/waters/${i}/toM`]),
  })),
  fact('prestressed', 'strand is measured in the main unit', (at) => ({
    lines: at.option.designs[main(at)]!.lines.map((_, i) => `${design(at)}/lines/${i}/quantity`),
  })),
  asIs('supportDepthM', (at) => ({ depth: `${design(at)}/depthM/support` })),
  asIs('midspanDepthM', (at) => ({ depth: `${design(at)}/depthM/midspan` })),
  fact(
    'limitingUtilisation',
    'highest utilisation of all units',
    (at) => ({ all: everyDesign(at, 'limitingCheck/utilisation') }),
    ({ all }) => Math.max(...all),
  ),
  fact(
    'clearanceConfirmed',
    'every clearance has been confirmed by its authority',
    (at) => ({
      confirmed: at.study.brief.obstacles.flatMap(({ clearance }, i) =>
        clearance === null ? [] : [`brief/obstacles/${i}/clearance/confirmed`],
      ),
    }),
    ({ confirmed }) => (confirmed.every((one) => one === 1) ? 1 : 0),
  ),
  fact(
    'upliftKN',
    'greatest of -(permanent + least traffic) at the ends of the units, at least 0',
    (at) => {
      const ends = (field: string): string[] =>
        at.option.designs.flatMap(({ reactions }, u) =>
          [0, reactions.length - 1].map((s) => `${at.root}/designs/${u}/reactions/${s}/${field}`),
        );
      return { permanent: ends('permanentKN'), least: ends('trafficMinKN') };
    },
    ({ permanent, least }) => Math.max(0, ...permanent.map((one, i) => -(one + Math.min(0, least[i]!)))),
  ),
  fact(
    'pieceLengthM',
    'longest of the units',
    (at) => ({ pieces: pieces(at, 'lengthM') }),
    ({ pieces: all }) => Math.max(0, ...all),
  ),
  fact(
    'pieceMassT',
    'heaviest of the units',
    (at) => ({ pieces: pieces(at, 'massT') }),
    ({ pieces: all }) => Math.max(0, ...all),
  ),
  ...supportFactFigures,
  ...riverFactFigures,
  ...methodFactFigures,
  ...regradingFactFigures,
  asIs('haulLengthM', () => ({ given: 'brief/access/haulLengthM' })),
  asIs('haulMassT', () => ({ given: 'brief/access/haulMassT' })),
  {
    ...asIs('budgetChance', (at) => ({ chance: `standing/within/${at.option.number}` })),
    when: (at) => at.study.brief.budget !== 'unknown',
  },
  fact('budgetChance', 'not known without a budget', () => ({ budget: 'brief/budget' })),
  fact(
    'roadRiseM',
    'greater rise of the two ends',
    (at) => ({ rises: [`${at.root}/profile/startRiseM`, `${at.root}/profile/endRiseM`] }),
    ({ rises }) => Math.max(...rises),
  ),
  asIs('roadMayRiseM', () => ({ may: 'site/road/mayRiseM' })),
  asIs('gradient', (at) => ({ steepest: `${at.root}/profile/steepestGradient` })),
  asIs('maxGradient', () => ({ steepest: 'site/road/maxGradient' })),
  asIs('headroomSpareM', (at) => ({
    spare: `${at.root}/headroom${at.option.headroom === null ? '' : '/spareM'}`,
  })),
  ...(['trussHeightM', 'edgeGirderM', 'pylonHeightM', 'boxInnerHeightM'] as const).map((id) =>
    asIs(id, designFigure(id)),
  ),
  {
    ...fact(
      'pylonHeightRatio',
      'height of the pylon / twice the main span: one pylon reaches as far as half a span between two',
      (at) => ({ height: `${at.root}/facts/pylonHeightM`, main: `${at.root}/facts/mainSpanM` }),
      ({ height, main: span }) => height / (2 * span),
    ),
    when: (at) => mainUnit(at.option.units).pylons?.length === 1,
  },
  ...ratios,
  described({
    path: 'options/:option/facts/:fact',
    label: (at) => factOf(at.name('fact')).label,
    unit: (at) => factOf(at.name('fact')).unit,
    method: 'fact for the rules',
    formula: 'not known for this form',
    value: (at) => factsOf(at)[at.name('fact')] ?? 'unknown',
  }),
];
