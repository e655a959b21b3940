import { lineAreas, lineBeam, momentLine, type LineBeam } from '../mechanics/index.ts';

/** Loads on a metre of a continuous deck, kN/m. */
export interface DeckLoads {
  /** Permanent load that is there before the spans are joined: it acts on simple spans. */
  readonly simpleKNm: number;
  /** Permanent load on the continuous deck. */
  readonly continuousKNm: number;
  /** Traffic, placed wherever it is adverse. */
  readonly trafficKNm: number;
}

/** Inner spans of the trial girder: the middle one feels nothing of the ends any more. */
const INNER = 5;
/** Lengths of an end span over an inner one that are tried; in between moments are read off straight lines. */
const RATIOS = [0.7, 0.75, 0.775, 0.8, 0.825, 0.85, 0.875, 0.9, 0.95, 1] as const;
/** End spans of 0.8 disturb the inner ones least. */
const CALM = RATIOS.indexOf(0.8);
/** Places a span: the greatest moment between two of them is at most 0.1 % greater. */
const PLACES = 36;

/** Moments at one place for a load of 1 kN/m, by how it acts; an inner span is 1 m long. */
interface Place {
  readonly simple: number;
  /** On the whole continuous girder, and where it makes the moment greater alone. */
  readonly whole: number;
  readonly adverse: number;
}

/** Places that decide the strength of the end span and of an inner span in the middle. */
interface Trial {
  readonly endSpan: readonly Place[];
  readonly firstPier: Place;
  readonly innerSpan: readonly Place[];
  readonly innerPier: Place;
}

function placeAt(beam: LineBeam, station: number, sags: boolean): Place {
  const areas = { positive: 0, negative: 0, positiveM: 0, negativeM: 0 };
  lineAreas(beam.xM, momentLine(beam, station), areas);
  const x = beam.xM[station]!;
  const ends = beam.supportAt.map((at) => beam.xM[at]!);
  const after = ends.findIndex((end) => end > x);
  const simple = sags ? ((x - ends[after - 1]!) * (ends[after]! - x)) / 2 : 0;
  const { positive, negative } = areas;
  return sags
    ? { simple, whole: positive + negative, adverse: positive }
    : { simple, whole: -positive - negative, adverse: -negative };
}

function trial(ratio: number): Trial {
  const inner = Array.from({ length: INNER }, () => 1);
  const beam = lineBeam({ spansM: [ratio, ...inner, ratio], stationsPerSpan: PLACES });
  const within = (span: number): Place[] => {
    const places: Place[] = [];
    for (let s = beam.supportAt[span]! + 1; s < beam.supportAt[span + 1]!; s += 1)
      places.push(placeAt(beam, s, true));
    return places;
  };
  const middle = (INNER + 1) / 2;
  return {
    endSpan: within(0),
    firstPier: placeAt(beam, beam.supportAt[1]!, false),
    innerSpan: within(middle),
    innerPier: placeAt(beam, beam.supportAt[middle]!, false),
  };
}

const trials: (Trial | undefined)[] = [];

const momentOf = ({ simpleKNm, continuousKNm, trafficKNm }: DeckLoads, place: Place): number =>
  simpleKNm * place.simple + continuousKNm * place.whole + trafficKNm * place.adverse;

/**
 * How many times as long as itself the inner span is that a span standing alone works like: at that ratio its w l^2 / 8 is
 * the sagging of an inner span far from the ends. 1 or more, about 1.4 to 1.5 for a girder that is continuous for all its
 * weight, near 1 for beams that are joined after they have been placed.
 */
export function aloneSpanWork(loads: DeckLoads): number {
  const { simpleKNm, continuousKNm, trafficKNm } = loads;
  const { innerSpan } = (trials[CALM] ??= trial(RATIOS[CALM]!));
  const sagging = Math.max(...innerSpan.map((place) => momentOf(loads, place)));
  return Math.max(1, Math.sqrt((simpleKNm + continuousKNm + trafficKNm) / 8 / sagging));
}

/**
 * How many times as long as itself the inner span is that an end span of a continuous girder works like: at that ratio
 * the greater of the sagging in the end span and the hogging over the first pier, each over what an inner span far from the
 * ends has, is 1. Moments by the line beam under even loads, traffic where it is adverse; 1 or more, about 1.2 to 1.3 for a
 * girder that is continuous for all its weight.
 */
export function endSpanWork(loads: DeckLoads): number {
  const moment = (place: Place): number => momentOf(loads, place);
  const most = (places: readonly Place[]): number => Math.max(...places.map(moment));
  /** What an end span needs over what an inner one does; grows with its length. */
  const useAt = (i: number): number => {
    const { endSpan, firstPier, innerSpan, innerPier } = (trials[i] ??= trial(RATIOS[i]!));
    const pier = moment(innerPier);
    return Math.max(most(endSpan) / most(innerSpan), pier > 0 ? moment(firstPier) / pier : 0);
  };
  let low = 0;
  let high = RATIOS.length - 1;
  let [below, above] = [useAt(low), useAt(high)];
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    const use = useAt(middle);
    if (use < 1) [low, below] = [middle, use];
    else [high, above] = [middle, use];
  }
  if (!(above > below)) return 1;
  const share = Math.min(1, Math.max(0, (1 - below) / (above - below)));
  return 1 / (RATIOS[low]! + share * (RATIOS[high]! - RATIOS[low]!));
}
