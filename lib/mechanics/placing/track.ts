import { elementAt } from '../beam/loadings.ts';

/** Axles that travel together, from the first to the last. */
export interface AxleGroup {
  /** Distance of each axle from the first, m, rising from 0. */
  readonly atM: readonly number[];
  readonly loadKN: readonly number[];
  /** True when all axles count wherever they stand; false when an axle that relieves is left out. */
  readonly whole: boolean;
}

/** Stations that loads travel along, with the placings of every axle group met so far. */
export interface Track {
  readonly xM: ArrayLike<number>;
  /** True when lines may have kinks at any station (trusses, hinged beams), false when only at their own section. */
  readonly kinked: boolean;
  readonly placings: Map<AxleGroup, Placings>;
}

/**
 * Positions of a group in which one of its axles stands on a station, with the cubic weights that read an influence
 * line under each axle. The first `swept` of them are in rising order and are tried for every line: all of them on a
 * kinked track, those of its heaviest axle on a smooth one. The rest serve lines with a peak at a known station.
 */
export interface Placings {
  readonly swept: number;
  /** Position of the first axle, m. */
  readonly positionM: Float64Array;
  /** For placing k and axle i, at k * axles + i: the first entry of its element in an element line. */
  readonly entry: Int32Array;
  /** Four weights for each of the same, at 4 * (k * axles + i); nil off the track; axle load included. */
  readonly weight: Float64Array;
  /** Placing in which axle i stands on station s, at i * stations + s. */
  readonly onStation: Int32Array;
  /** Sums of the line last summed: positive parts, negative parts; one and the same for a whole group. */
  readonly positive: Float64Array;
  readonly negative: Float64Array;
}

const kept = {
  kinked: new WeakMap<ArrayLike<number>, Track>(),
  smooth: new WeakMap<ArrayLike<number>, Track>(),
};

/**
 * The track along stations, which must not change afterwards: it is kept with them, so that lines on the same stations share
 * placings.
 * @throws RangeError when stations do not rise
 */
export function loadTrack(xM: ArrayLike<number>, kinked = true): Track {
  const tracks = kinked ? kept.kinked : kept.smooth;
  const known = tracks.get(xM);
  if (known) return known;
  for (let i = 1; i < xM.length; i++) {
    if (!(xM[i]! > xM[i - 1]!))
      throw new RangeError(`xM[${i}]: expected more than ${xM[i - 1]}, received ${xM[i]}`);
  }
  if (!(xM.length >= 2)) throw new RangeError(`xM: expected two stations or more, received ${xM.length}`);
  const made: Track = { xM, kinked, placings: new Map() };
  tracks.set(xM, made);
  return made;
}

/** The group running the other way. */
export function reversed(group: AxleGroup): AxleGroup {
  const last = group.atM[group.atM.length - 1]!;
  return {
    atM: group.atM.map((at) => last - at).reverse(),
    loadKN: [...group.loadKN].reverse(),
    whole: group.whole,
  };
}

/** Placings of a group on a track, made once. */
export function placingsOf(track: Track, group: AxleGroup): Placings {
  const known = track.placings.get(group);
  if (known) return known;
  const made = makePlacings(track, group);
  track.placings.set(group, made);
  return made;
}

function makePlacings({ xM, kinked }: Track, group: AxleGroup): Placings {
  const stations = xM.length;
  const axles = group.atM.length;
  const count = stations * axles;
  const first = Float64Array.from(
    { length: count },
    (_, key) => xM[key % stations]! - group.atM[Math.floor(key / stations)]!,
  );
  // Keys in the order of placings: on a smooth track those of the heaviest axle come first.
  const lead = group.loadKN.indexOf(Math.max(...group.loadKN));
  const swept = kinked ? count : stations;
  const order = Uint32Array.from({ length: count }, (_, k) => (k + lead * stations) % count);
  order.subarray(0, swept).sort((a, b) => first[a]! - first[b]!);

  const positionM = new Float64Array(count);
  const entry = new Int32Array(count * axles);
  const weight = new Float64Array(4 * count * axles);
  const onStation = new Int32Array(count);
  order.forEach((key, k) => {
    positionM[k] = first[key]!;
    onStation[key] = k;
    const station = key % stations;
    const reference = Math.floor(key / stations);
    for (let i = 0; i < axles; i++) {
      // The axle on the station stands exactly there, just to its right, whatever rounding says.
      const x = i === reference ? xM[station]! : first[key]! + group.atM[i]!;
      entry[k * axles + i] = weighAxle(xM, x, group.loadKN[i]!, weight, 4 * (k * axles + i));
    }
  });
  const positive = new Float64Array(count);
  const negative = group.whole ? positive : new Float64Array(count);
  return { swept, positionM, entry, weight, onStation, positive, negative };
}

/** Writes the weights of an axle at x from `offset`; returns the first entry of its element. Off the track: nil. */
export function weighAxle(
  xM: ArrayLike<number>,
  x: number,
  loadKN: number,
  weight: Float64Array,
  offset: number,
): number {
  if (!(x >= xM[0]! && x <= xM[xM.length - 1]!)) {
    weight.fill(0, offset, offset + 4);
    return 0;
  }
  const e = elementAt(xM, x);
  const h = xM[e + 1]! - xM[e]!;
  const t = (x - xM[e]!) / h;
  const t2 = t * t;
  const t3 = t2 * t;
  weight[offset] = loadKN * (1 - 3 * t2 + 2 * t3);
  weight[offset + 1] = loadKN * h * (t - 2 * t2 + t3);
  weight[offset + 2] = loadKN * (3 * t2 - 2 * t3);
  weight[offset + 3] = loadKN * h * (t3 - t2);
  return 4 * e;
}
