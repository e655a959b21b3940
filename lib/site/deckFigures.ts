import { described, practice, type At, type Descriptor, type StripKind } from '../model/index.ts';
import { CROSSFALL } from './constructionDepth.ts';
import { BARRIER_LINE_KN_M, carriage, FOOTWAY_KN_M2, raised, railed, SURFACING_KN_M3 } from './deckSpec.ts';

const sum = (values: readonly number[]): number => values.reduce((total, value) => total + value, 0);

const strips = (at: At, kinds?: ReadonlySet<StripKind>): string[] =>
  at.study.brief.deck.flatMap((strip, i) =>
    kinds === undefined || kinds.has(strip.kind) ? [`brief/deck/${i}/widthM`] : [],
  );

/** Strips from the left edge to the first and to the last lane or shoulder. */
function toCarriageway(at: At): { readonly left: string[]; readonly inside: string[] } {
  const { deck } = at.study.brief;
  const first = deck.findIndex((strip) => carriage.has(strip.kind));
  const last = deck.findLastIndex((strip) => carriage.has(strip.kind));
  const widths = (from: number, to: number): string[] =>
    deck.slice(from, to).map((_, i) => `brief/deck/${from + i}/widthM`);
  return { left: widths(0, first), inside: widths(first, last + 1) };
}

/** The deck as the structure sees it, from its strips. */
export const deckFigures: readonly Descriptor[] = [
  described({
    path: 'site/deck/widthM',
    label: 'deck width',
    unit: 'm',
    method: 'sum',
    formula: 'sum of the strips',
    inputs: (at) => ({ all: strips(at) }),
    compute: ({ all }) => sum(all),
  }),
  described({
    path: 'site/deck/ultimateWidthM',
    label: 'deck width in the ultimate layout',
    unit: 'm',
    method: 'sum',
    formula: 'sum of the strips in the ultimate layout',
    inputs: (at) => ({ all: at.study.brief.deck.map((_, i) => `brief/deck/${i}/ultimateWidthM`) }),
    compute: ({ all }) => sum(all),
  }),
  described({
    path: 'site/deck/carriagewayM',
    label: 'width between kerbs',
    unit: 'm',
    method: 'sum',
    formula: 'lanes + shoulders',
    inputs: (at) => ({ road: strips(at, carriage) }),
    compute: ({ road }) => sum(road),
  }),
  described({
    path: 'site/deck/carriagewayOffsetM',
    label: 'middle of the carriageway from the middle of the deck',
    unit: 'm',
    method: 'difference',
    formula: 'strips left of it + half its stretch - half the deck width',
    inputs: (at) => ({ ...toCarriageway(at), width: 'site/deck/widthM' }),
    compute: ({ left, inside, width }) => (inside.length > 0 ? sum(left) + sum(inside) / 2 - width / 2 : 0),
  }),
  described({
    path: 'site/deck/lanes',
    label: 'marked lanes',
    unit: 'no',
    method: 'count',
    formula: 'strips that are lanes',
    inputs: (at) => ({ lanes: strips(at, new Set<StripKind>(['lane'])) }),
    compute: ({ lanes }) => lanes.length,
  }),
  described({
    path: 'site/deck/footwayM',
    label: 'width of footways',
    unit: 'm',
    method: 'sum',
    formula: 'strips that are footways',
    inputs: (at) => ({ footways: strips(at, new Set<StripKind>(['footway'])) }),
    compute: ({ footways }) => sum(footways),
  }),
  described({
    path: 'site/deck/surfacingM',
    label: 'surfacing',
    unit: 'm',
    method: 'as given',
    formula: 'read from the brief',
    inputs: () => ({ given: 'brief/surfacingM' }),
    compute: ({ given }) => given,
  }),
  described({
    path: 'site/deck/superimposedKNm',
    label: 'superimposed dead load',
    unit: 'kN/m',
    method: 'sum of products',
    formula:
      'surfacing x its weight x width between kerbs + footways and verges x their build-up + barrier lines x their weight',
    inputs: (at) => ({
      surfacing: 'site/deck/surfacingM',
      weight: `practice/site/surfacing-${at.site.standard}`,
      road: 'site/deck/carriagewayM',
      raised: strips(at, raised),
      build: 'practice/site/footway',
      railed: strips(at, railed),
      line: 'practice/site/barrier',
    }),
    compute: (v) => v.surfacing * v.weight * v.road + v.build * sum(v.raised) + v.line * v.railed.length,
  }),
  practice(
    'site/surfacing-lm1',
    SURFACING_KN_M3.lm1,
    'weight of surfacing',
    'kN/m3',
    'EN 1991-1-1 table A.6 (from memory)',
  ),
  practice(
    'site/surfacing-hl93',
    SURFACING_KN_M3.hl93,
    'weight of surfacing',
    'kN/m3',
    'AASHTO LRFD table 3.5.1-1 (from memory)',
  ),
  practice('site/footway', FOOTWAY_KN_M2, 'build-up of footways and verges', 'kN/m2', 'common-practice'),
  practice(
    'site/barrier',
    BARRIER_LINE_KN_M,
    'barrier or parapet with its plinth',
    'kN/m',
    'common-practice',
  ),
  practice('site/crossfall', CROSSFALL, 'crossfall of the carriageway to both sides', '', 'common-practice'),
];
