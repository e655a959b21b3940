import {
  parseStudy,
  ratesFor,
  sentence,
  studyVersion,
  type StandardId,
  type Study,
  type Unknown,
} from '../../lib/index.ts';
import { fixed, listed } from '../format.ts';
import { withClearanceState } from '../option-study/brief/clearanceState.ts';
import type { Figure } from '../page/index.ts';
import { untaken } from './untaken.ts';

/** What a new study crosses; open ground is nothing in particular. */
export type Crossed = 'river' | 'railway' | 'road' | 'open';

/** What is known when a study is begun. Only the length has to be; what else is unknown takes a start value that is said. */
export interface Gaps {
  /** Empty: the study is named by its turn. */
  readonly title: string;
  readonly lanes: Figure;
  /** Width of the deck between its outer edges, m. */
  readonly widthM: Figure;
  readonly crossed: Crossed | Unknown;
  /** Between the abutments, m. */
  readonly lengthM: Figure;
  /** Stretch in the middle in which no support may stand, m; 0 where one may stand anywhere. */
  readonly barredM: Figure;
  /** Height to be kept clear over what is crossed, m. */
  readonly headroomM: Figure;
  /** Level of the road, m. */
  readonly roadLevelM: Figure;
  /** Height of the road above the water, rail, road or ground that is crossed, m. */
  readonly heightM: Figure;
  readonly loading: StandardId | Unknown;
  /** Money of the rate pack. */
  readonly budget: Figure;
}

/** A sentence in which nothing has been filled. */
export const emptyGaps: Gaps = {
  title: '',
  lanes: 'unknown',
  widthM: 'unknown',
  crossed: 'unknown',
  lengthM: 'unknown',
  barredM: 'unknown',
  headroomM: 'unknown',
  roadLevelM: 'unknown',
  heightM: 'unknown',
  loading: 'unknown',
  budget: 'unknown',
};

/** What stands in the sentence until somebody says something else: start values like those that the notice says. */
const usual: { readonly lanes: number; readonly crossed: Crossed; readonly loading: StandardId } = {
  lanes: 2,
  crossed: 'river',
  loading: 'lm1',
};

/** What is said of them, or what stands there until then. */
export const standingIn = ({ lanes, crossed, loading }: Gaps): typeof usual => ({
  lanes: lanes === 'unknown' ? usual.lanes : lanes,
  crossed: crossed === 'unknown' ? usual.crossed : crossed,
  loading: loading === 'unknown' ? usual.loading : loading,
});

/** A study begun, or why it cannot be yet. */
export type Begun =
  | { readonly ok: true; readonly study: Study; readonly taken: readonly string[] }
  | { readonly ok: false; readonly why: string };

// Start values. All of them common practice, no source: they stand until the site is known.
const BARRIER_M = 0.5;
const LANE_M = 3.5;
const LEAST_LANE_M = 2.5;
const SHOULDER_M = 1;
const ROAD_LEVEL_M = 100;
/** Height under the deck where nothing is asked for, m. */
const UNDER_DECK_M = 4;
/** Depth of a deck as a share of the opening, and the least, m: so high the road lies above the headroom. */
const DEPTH_OF_OPENING = 1 / 20;
const LEAST_DEPTH_M = 1.5;
/** How far a road whose height nobody has said may rise, m. */
const MAY_RISE_M = 2;
/** Depth of a river below its water, and height of its banks above it, m. */
const WATER_DEPTH_M = 2;
const BANK_M = 0.5;
/** Most height of an approach above the ground at its abutment, m. */
const APPROACH_M = 4;
/** Ground shown behind the abutments, m. */
const BEHIND_M = 20;
/** Side slopes of valley and bed, horizontal to vertical. */
const SLOPE = 2;

const names: Readonly<Record<Crossed, string>> = {
  river: 'the river',
  railway: 'the railway',
  road: 'the road below',
  open: 'the barred ground',
};

/** How wide what is crossed is taken to be while nobody has said, m: two tracks, two lanes with shoulders, a quarter of the way. */
function usualWidth(crossed: Crossed, lengthM: number): number {
  const usual = { railway: 12, road: 12, river: lengthM / 4, open: lengthM / 4 }[crossed];
  return Math.min(usual, lengthM / 2);
}

const toMillimetre = (metres: number): number => Number(metres.toFixed(3));

/** Strips of a deck with barriers at both edges, or null where its lanes would be too narrow. */
function deckOf(lanes: number, widthM: number): readonly { kind: string; widthM: number }[] | null {
  const between = widthM - 2 * BARRIER_M;
  const shoulderM = toMillimetre((between - lanes * LANE_M) / 2);
  const laneM = shoulderM >= 0 ? LANE_M : toMillimetre(between / lanes);
  if (laneM < LEAST_LANE_M) return null;
  const edge = { kind: 'barrier', widthM: BARRIER_M };
  const side = shoulderM > 0 ? [{ kind: 'shoulder', widthM: shoulderM }] : [];
  const carriageway = Array.from({ length: lanes }, () => ({ kind: 'lane', widthM: laneM }));
  return [edge, ...side, ...carriageway, ...side, edge];
}

interface Valley {
  readonly lengthM: number;
  readonly fromM: number;
  readonly toM: number;
  readonly roadM: number;
  /** Level of the water, rail, road or ground that is crossed, m. */
  readonly datumM: number;
  readonly isRiver: boolean;
}

/** A ground line as it is sketched before a survey: a flat valley between sloped sides, with the bed of a river in it. */
function sketch({ lengthM, fromM, toM, roadM, datumM, isRiver }: Valley) {
  const floorM = datumM + (isRiver ? BANK_M : 0);
  const topM = roadM - Math.min(APPROACH_M, (roadM - datumM) / 2);
  const runM = Math.min(SLOPE * (topM - floorM), 0.9 * fromM);
  const bedRunM = Math.min(SLOPE * (WATER_DEPTH_M + BANK_M), (toM - fromM) / 3);
  const bedM = datumM - WATER_DEPTH_M;
  const line: (readonly [chainageM: number, levelM: number])[] = [
    [-BEHIND_M, topM],
    [0, topM],
    [runM, floorM],
    ...(isRiver
      ? ([
          [fromM, floorM],
          [fromM + bedRunM, bedM],
          [toM - bedRunM, bedM],
          [toM, floorM],
        ] as const)
      : []),
    [lengthM - runM, floorM],
    [lengthM, topM],
    [lengthM + BEHIND_M, topM],
  ];
  /** How far the water stands inside the edges of the bed, m. */
  const edgeM = (bedRunM * BANK_M) / (WATER_DEPTH_M + BANK_M);
  return {
    ground: line.map(([chainageM, levelM]) => ({
      chainageM: toMillimetre(chainageM),
      levelM: toMillimetre(levelM),
    })),
    water: { fromM: toMillimetre(fromM + edgeM), toM: toMillimetre(toM - edgeM), levelM: datumM },
  };
}

/** Paths of everything in a new study that nobody has said: what `taken` says, and what stood in the sentence untouched. */
function assumedOf({ brief }: Study, gaps: Gaps): string[] {
  const { deck, obstacles, waters } = brief;
  const isOpen = gaps.crossed === 'open';
  const isBarred = gaps.barredM !== 'unknown' && gaps.barredM > 0;
  /** Whether a level follows from a road or a height that nobody has said. */
  const isLevelTaken = gaps.roadLevelM === 'unknown' || gaps.heightM === 'unknown';
  const under = (path: string, keys: readonly string[]): string[] => keys.map((key) => `${path}.${key}`);
  return [
    ...deck.map((_, i) => `brief.deck.${i}.widthM`),
    ...deck.flatMap(({ kind }, i) =>
      gaps.lanes === 'unknown' && kind === 'lane' ? [`brief.deck.${i}.kind`] : [],
    ),
    ...(gaps.loading === 'unknown' ? ['brief.loading'] : []),
    'brief.crossing.ground',
    ...(gaps.roadLevelM === 'unknown' ? under('brief.road', ['startLevelM', 'endLevelM']) : []),
    ...(gaps.heightM === 'unknown' ? under('brief.road', ['fixedEnd', 'mayRiseM']) : []),
    ...obstacles.flatMap(({ clearance }, i) => [
      ...(gaps.crossed === 'unknown' ? [`brief.obstacles.${i}.kind`] : []),
      ...(isBarred ? [] : under(`brief.obstacles.${i}`, ['fromM', 'toM'])),
      ...(gaps.barredM === 'unknown' && !isOpen ? [`brief.obstacles.${i}.supports`] : []),
      ...(clearance === null
        ? []
        : under(`brief.obstacles.${i}.clearance`, [
            ...(isBarred ? [] : ['fromM', 'toM']),
            ...(isLevelTaken ? ['datumLevelM'] : []),
            ...(gaps.headroomM === 'unknown' ? ['headroomM'] : []),
          ])),
    ]),
    ...waters.flatMap((_, i) =>
      under(`brief.waters.${i}`, [
        'fromM',
        'toM',
        'floodFromM',
        'floodToM',
        ...(isLevelTaken ? ['levelM'] : []),
      ]),
    ),
  ].sort();
}

/**
 * A study of one's own from what is known of a crossing; what is not known stays unknown where the study allows it, and
 * otherwise takes a usual start value, which `taken` and the notice of the study say and its list of start values marks.
 * @param titles those of the studies that are there
 */
export function begun(gaps: Gaps, titles: readonly string[] = []): Begun {
  const { lengthM, barredM, headroomM, budget } = gaps;
  const { lanes, crossed, loading } = standingIn(gaps);
  if (lengthM === 'unknown') return { ok: false, why: 'the length between the abutments is not given' };
  const taken: string[] = [];
  const or = (given: Figure, start: number, words: (value: string) => string, places = 2): number => {
    if (given !== 'unknown') return given;
    taken.push(words(fixed(start, places)));
    return start;
  };

  const usualDeckM = lanes * LANE_M + 2 * (SHOULDER_M + BARRIER_M);
  const deckM = or(gaps.widthM, usualDeckM, (m) => `a deck ${m} m wide`);
  const deck = deckOf(lanes, deckM);
  if (deck === null) {
    const leastM = fixed(lanes * LEAST_LANE_M + 2 * BARRIER_M, 1);
    return {
      ok: false,
      why: `a deck ${fixed(deckM, 2)} m wide holds no ${lanes} lanes: expected at least ${leastM} m, ${LEAST_LANE_M} m a lane between barriers of ${BARRIER_M} m`,
    };
  }

  const isStretch = crossed !== 'open' || headroomM !== 'unknown' || (barredM !== 'unknown' && barredM > 0);
  const isBarred = barredM !== 'unknown' && barredM > 0;
  const stretchM = isBarred ? barredM : usualWidth(crossed, lengthM);
  if (!(stretchM <= lengthM - 2)) {
    return {
      ok: false,
      why: `no support may stand in ${fixed(stretchM, 1)} m of it: expected at most ${fixed(lengthM - 2, 1)} m, so that both abutments stand clear of it`,
    };
  }
  if (isStretch && !isBarred) {
    const may = barredM === 'unknown' && crossed !== 'open' ? ', where a support may stand at a price' : '';
    taken.push(`${names[crossed]} ${fixed(stretchM, 1)} m wide${may}`);
  }
  const fromM = toMillimetre((lengthM - stretchM) / 2);
  const toM = toMillimetre(fromM + stretchM);

  const roadM = or(gaps.roadLevelM, ROAD_LEVEL_M, (m) => `the road at level ${m}`);
  const clearM = headroomM === 'unknown' ? UNDER_DECK_M : headroomM;
  const depthM = Math.max(LEAST_DEPTH_M, stretchM * DEPTH_OF_OPENING);
  const aboveM = Math.ceil(2 * (clearM + depthM)) / 2;
  const heightM = or(
    gaps.heightM,
    aboveM,
    (m) => `the road ${m} m above what it crosses, free to rise by ${MAY_RISE_M} m`,
    1,
  );
  const datumM = toMillimetre(roadM - heightM);
  const isRiver = crossed === 'river';
  const { ground, water } = sketch({ lengthM, fromM, toM, roadM, datumM, isRiver });
  taken.push(isRiver ? `valley, banks and a bed ${WATER_DEPTH_M} m under water` : 'the slopes of the ground');

  const obstacle = {
    kind: crossed === 'open' ? 'bank' : crossed,
    name: names[crossed],
    fromM,
    toM,
    supports: isBarred ? 'hard' : barredM === 'unknown' && crossed !== 'open' ? 'soft' : 'none',
    clearance: headroomM === 'unknown' ? null : { fromM, toM, datumLevelM: datumM, headroomM },
  };
  const title = gaps.title.trim();
  const parsed = parseStudy({
    format: 'spanledger-study',
    version: studyVersion,
    title: title === '' ? untaken('New crossing', titles) : title,
    brief: {
      crossing: { startM: 0, endM: lengthM, ground },
      road: {
        startLevelM: roadM,
        endLevelM: roadM,
        ...(gaps.heightM === 'unknown' && { fixedEnd: 'none', mayRiseM: MAY_RISE_M }),
      },
      deck,
      loading,
      obstacles: isStretch ? [obstacle] : [],
      waters: isRiver ? [{ name: names.river, ...water }] : [],
    },
  });
  if (!parsed.ok) return { ok: false, why: parsed.problems.map(sentence).join(' ') };
  const study = withBudget(withPresetHeadroom(parsed.value), budget);
  const [first] = study.brief.obstacles;
  if (first?.clearance && headroomM === 'unknown') {
    taken.push(`${fixed(first.clearance.headroomM, 1)} m clear over ${first.name}`);
  }
  const notice = `Taken at the start, because nothing was said of it: ${listed(taken)}. Usual values, no source; correct them as the site becomes known.`;
  return { ok: true, study: { ...study, notice, assumed: assumedOf(study, gaps) }, taken };
}

/** A railway or a road whose headroom nobody has said is given the preset that is to be confirmed. */
function withPresetHeadroom(study: Study): Study {
  const { brief } = study;
  const obstacles = brief.obstacles.map((one) =>
    one.clearance === null && (one.kind === 'railway' || one.kind === 'road')
      ? withClearanceState(brief, one, 'preset')
      : one,
  );
  return { ...study, brief: { ...brief, obstacles } };
}

/** The study with its budget at the prices of its own rates. */
function withBudget(study: Study, amount: Figure): Study {
  if (amount === 'unknown') return study;
  const { priceDate } = ratesFor(study.books).pack;
  return { ...study, brief: { ...study.brief, budget: { amount, priceDate, includes: '' } } };
}
