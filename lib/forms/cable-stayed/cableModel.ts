import {
  deflectionInfluence,
  lineBeam,
  momentInfluence,
  pointLoads,
  reactionInfluence,
  springInfluence,
  type Effects,
  type LineBeam,
} from '../../mechanics/index.ts';
import { supportPositions } from '../common/supports.ts';
import type { StayLayout } from './stayLayout.ts';

/** Stiffness of one plane: stays as EA/l, the edge girder and the pylon legs. */
export interface PlaneStiffness {
  /** EA / length of each stay of the layout, kN/m. */
  readonly stayKNPerM: readonly number[];
  readonly deckEiKNm2: number;
  /** Horizontal stiffness of each pylon leg at its top, kN/m. */
  readonly pylonKNPerM: readonly number[];
}

/** Influence lines of one plane under a unit load at the stations; stays pull positive, u is the pylon top towards the end. */
export interface CableModel {
  readonly layout: StayLayout;
  readonly beam: LineBeam;
  /** Movement of each pylon top, m per kN. */
  readonly topM: readonly Float64Array[];
  /** Kept by the model: read it, do not write to it. */
  stayLine(stay: number): Float64Array;
  momentLine(station: number): Float64Array;
  deflectionLine(station: number): Float64Array;
  /** Deck reaction of a support of the unit, upward, without what its stays bring; nil at a pylon, where the deck floats. */
  reactionLine(support: number): Float64Array;
  /** Station nearest to x; of two as near, the one nearer to `towardsM`. */
  stationAt(xM: number, towardsM: number): number;
}

/**
 * Deck as a line beam on springs at the stays and rigid supports at abutments and piers (it floats past the pylons), coupled with the horizontal movement of
 * the pylon tops that ties all stays of a pylon together (one unknown a pylon). Linear; the stays' sag is in their modulus.
 *
 * With the tops held, stay i works as a spring k sin2. A movement u of the top loads the deck with k sin cos at each stay;
 * equilibrium of the top gives u for a unit load anywhere, by reciprocity from the deflection under those loads.
 */
export function cableModel(
  spansM: readonly number[],
  layout: StayLayout,
  stiffness: PlaneStiffness,
): CableModel {
  const { stays, pylons } = layout;
  const { stayKNPerM, pylonKNPerM } = stiffness;
  const hung = stays.flatMap((stay, i) => (stay.anchor ? [] : [i]));
  const springOf = new Map(hung.map((i, order) => [i, order]));
  const rigidM = supportPositions(spansM).filter((_, j) => !pylons.some((pylon) => pylon.support === j));
  const rigidOf = (support: number): number =>
    support - pylons.filter((pylon) => pylon.support < support).length;
  // Springs are stations too, so lines have their peaks exactly and a station about every half bay.
  const stationsPerSpan = Math.min(
    160,
    Math.max(12, Math.ceil((1.3 * layout.lengthM) / pylons[0]!.spacingM / (rigidM.length - 1))),
  );
  const beam = lineBeam({
    spansM: rigidM.slice(1).map((x, j) => x - rigidM[j]!),
    eiKNm2: () => stiffness.deckEiKNm2,
    stationsPerSpan,
    springs: hung.map((i) => ({ xM: stays[i]!.deckM, kNPerM: stayKNPerM[i]! * stays[i]!.sine ** 2 })),
  });
  const towards = (i: number): number => stays[i]!.side * stayKNPerM[i]! * stays[i]!.sine * stays[i]!.cosine;
  const moved: Effects[] = pylons.map((_, p) =>
    pointLoads(
      beam,
      hung.filter((i) => stays[i]!.pylon === p).map((i) => ({ xM: stays[i]!.deckM, loadKN: towards(i) })),
    ),
  );
  const held = pylons.map((_, p) =>
    pylons.map((__, q) => {
      let sum = p === q ? pylonKNPerM[p]! : 0;
      stays.forEach((stay, i) => {
        if (stay.pylon !== p) return;
        if (p === q) sum += stayKNPerM[i]! * stay.cosine ** 2;
        if (!stay.anchor) sum -= towards(i) * moved[q]!.deflectionM[beam.springAt[springOf.get(i)!]!]!;
      });
      return sum;
    }),
  );
  const topM = solveTops(
    held,
    moved.map((effects) => effects.deflectionM),
  );
  const withTops = (line: Float64Array, factors: readonly number[]): Float64Array => {
    for (let p = 0; p < topM.length; p++) {
      const top = topM[p]!;
      const factor = factors[p]!;
      for (let j = 0; j < line.length; j++) line[j]! += factor * top[j]!;
    }
    return line;
  };
  const lines = new Map<number, Float64Array>();
  return {
    layout,
    beam,
    topM,
    stayLine(i) {
      const known = lines.get(i);
      if (known) return known;
      const stay = stays[i]!;
      const k = stayKNPerM[i]!;
      const spring = springOf.get(i);
      const line = spring === undefined ? new Float64Array(beam.xM.length) : springInfluence(beam, spring);
      for (let j = 0; j < line.length; j++) line[j] = line[j]! / stay.sine;
      withTops(
        line,
        moved.map((effects, p) => {
          const own = p === stay.pylon ? -stay.side * k * stay.cosine : 0;
          return own + (spring === undefined ? 0 : effects.springKN[spring]! / stay.sine);
        }),
      );
      lines.set(i, line);
      return line;
    },
    momentLine: (station) =>
      withTops(
        momentInfluence(beam, station),
        moved.map((effects) => effects.momentKNm[station]!),
      ),
    deflectionLine: (station) =>
      withTops(
        deflectionInfluence(beam, station),
        moved.map((effects) => effects.deflectionM[station]!),
      ),
    reactionLine(support) {
      if (pylons.some((pylon) => pylon.support === support)) return new Float64Array(beam.xM.length);
      return withTops(
        reactionInfluence(beam, rigidOf(support)),
        moved.map((effects) => effects.reactionKN[rigidOf(support)]!),
      );
    },
    stationAt(xM, towardsM) {
      const off = (j: number): number => Math.abs(beam.xM[j]! - xM);
      let best = 0;
      for (let j = 1; j < beam.xM.length; j++) {
        const gain = off(best) - off(j);
        const nearer = Math.abs(beam.xM[j]! - towardsM) < Math.abs(beam.xM[best]! - towardsM);
        if (gain > 1e-6 || (gain > -1e-6 && nearer)) best = j;
      }
      return best;
    },
  };
}

/** Solves the one or two equations of the pylon tops for every station. */
function solveTops(held: readonly (readonly number[])[], load: readonly Float64Array[]): Float64Array[] {
  if (held.length === 1) return [load[0]!.map((d) => d / held[0]![0]!)];
  const [[a, b], [c, d]] = held as [[number, number], [number, number]];
  const det = a * d - b * c;
  const [first, second] = load as [Float64Array, Float64Array];
  return [
    first.map((value, j) => (d * value - b * second[j]!) / det),
    second.map((value, j) => (a * value - c * first[j]!) / det),
  ];
}
