import { plainQuest, trafficOnLine, type TrafficLoad } from '../../actions/index.ts';
import {
  beamTrack,
  coupleAt,
  lineBeam,
  momentLine,
  uniform,
  type BeamGeometry,
  type CoupleEffects,
  type Extremes,
  type LineBeam,
} from '../../mechanics/index.ts';
import { supportPositions } from '../common/supports.ts';
import { trafficOnBox, type BoxTraffic } from '../concrete-box/boxTraffic.ts';

/** The deck as its beams are made: stiffness 1 at midspan, from the first support. */
export type DeckGeometry = BeamGeometry & Required<Pick<BeamGeometry, 'eiKNm2' | 'extraStationsM'>>;

/** The deck on either side of a pier that keeps it from turning, its other supports letting it turn. */
export interface HeldPier {
  readonly support: number;
  readonly left: LineBeam;
  readonly right: LineBeam;
  /** A couple of 1 kNm on the joined deck over the pier, all supports letting it turn, its stiffness at midspan 1 kNm2. */
  readonly couple: CoupleEffects;
  /** Couple that turns it over the pier by one radian, of that deck, kNm. */
  readonly turnKNm: number;
  /** Couple that keeps it from turning under traffic, the most either way, kNm. */
  readonly trafficKNm: number;
}

/** Spans from one support to another as a beam of their own, built in at supports that are held. */
function pieceOf(geometry: DeckGeometry, from: number, to: number, held: readonly number[]): LineBeam {
  const x = supportPositions(geometry.spansM);
  const [fromM, toM] = [x[from]!, x[to]!];
  return lineBeam({
    ...geometry,
    spansM: geometry.spansM.slice(from, to),
    eiKNm2: (xM) => geometry.eiKNm2(Math.min(toM, fromM + xM)),
    extraStationsM: geometry.extraStationsM.filter((m) => m > fromM && m < toM).map((m) => m - fromM),
    fixedEnds: { start: held.includes(from), end: held.includes(to) },
  });
}

/** A pier that keeps the deck from turning: the couple that the two sides of it put into the pier, and their stiffness. */
export function heldPier(
  geometry: DeckGeometry,
  beam: LineBeam,
  support: number,
  load: TrafficLoad,
): HeldPier {
  const left = pieceOf(geometry, 0, support, [support]);
  const right = pieceOf(geometry, support, geometry.spansM.length, [support]);
  const station = beam.supportAt[support]!;
  const couple = coupleAt(beam, station);
  const atLeft = extremesAt(left, left.xM.length - 1, load);
  const atRight = extremesAt(right, 0, load);
  return {
    support,
    left,
    right,
    couple,
    turnKNm: 1 / couple.turnRad[station]!,
    // The two sides are loaded each where it is adverse: one hogs the more, the other the less.
    trafficKNm: Math.max(atLeft.max - atRight.min, atRight.max - atLeft.min),
  };
}

function extremesAt(beam: LineBeam, station: number, load: TrafficLoad): Extremes {
  const out: Extremes = { max: 0, min: 0 };
  trafficOnLine(load, beamTrack(beam), momentLine(beam, station), { ...plainQuest, hogging: true }, out);
  return out;
}

/** Couple that keeps the deck from turning over a pier under a load per metre, kN/m, of each span or of all, kNm. */
export function heldKNm({ left, right, support }: HeldPier, wKNm: number | readonly number[]): number {
  const part = (from: number, to?: number): number | readonly number[] =>
    typeof wKNm === 'number' ? wKNm : wKNm.slice(from, to);
  const { momentKNm: before } = uniform(left, part(0, support));
  const { momentKNm: after } = uniform(right, part(support));
  return before.at(-1)! - after[0]!;
}

/**
 * Traffic on a deck that its piers may hold fast against turning or not at all: at every station the worse of the deck that
 * turns freely over all its supports and of that built in at those that are held. However stiff the shafts turn out to be,
 * the deck lies between the two.
 */
export function betweenHeldAndFree(
  geometry: DeckGeometry,
  held: readonly number[],
  free: BoxTraffic,
): BoxTraffic {
  const ends = [0, ...held, geometry.spansM.length];
  const pieces = ends.slice(1).map((to, k) => trafficOnBox(pieceOf(geometry, ends[k]!, to, held), free.load));
  const worst = (values: (traffic: BoxTraffic) => Float64Array, worse: typeof Math.max): Float64Array => {
    const out = values(free).slice();
    let station = 0;
    for (const piece of pieces) {
      const own = values(piece);
      own.forEach((value, i) => {
        out[station + i] = worse(out[station + i]!, value);
      });
      station += own.length - 1;
    }
    return out;
  };
  return {
    ...free,
    most: {
      ...free.most,
      momentMaxKNm: worst(({ most }) => most.momentMaxKNm, Math.max),
      momentMinKNm: worst(({ most }) => most.momentMinKNm, Math.min),
      shearMaxKN: worst(({ most }) => most.shearMaxKN, Math.max),
      shearMinKN: worst(({ most }) => most.shearMinKN, Math.min),
    },
    service: {
      momentMaxKNm: worst(({ service }) => service.momentMaxKNm, Math.max),
      momentMinKNm: worst(({ service }) => service.momentMinKNm, Math.min),
    },
  };
}
