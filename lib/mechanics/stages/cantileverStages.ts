/** A balanced cantilever while it is built. */
export interface CantileverStage {
  /** Length of the finished arm, m. */
  readonly armM: number;
  /** Weight at a distance from the pier, kN/m. */
  readonly weightKNm: (fromPierM: number) => number;
  /** Traveller with its formwork at the tip, kN. */
  readonly travellerKN: number;
  /** Length of the segment that one arm may be ahead by, m. */
  readonly segmentM: number;
}

export interface CantileverMoments {
  /** Distances from the pier, m. */
  readonly fromPierM: Float64Array;
  /** Moment of the finished arm with the traveller at its tip (hogging, so negative), kNm. */
  readonly momentKNm: Float64Array;
  readonly shearKN: Float64Array;
  /** Moment the pier takes when one arm is a segment ahead, kNm. */
  readonly pierMomentKNm: number;
}

/**
 * Statics of a free cantilever. The arm is longest at the last stage, where every section has its greatest moment.
 * @throws RangeError when the arm is not longer than 0
 */
export function cantileverStages(stage: CantileverStage, stations = 40): CantileverMoments {
  const { armM, weightKNm, travellerKN, segmentM } = stage;
  if (!(armM > 0)) throw new RangeError(`armM: expected more than 0, received ${armM}`);
  const h = armM / stations;
  const fromPierM = Float64Array.from({ length: stations + 1 }, (_, i) => i * h);
  const momentKNm = new Float64Array(stations + 1);
  const shearKN = new Float64Array(stations + 1);
  let shear = travellerKN;
  let moment = 0;
  shearKN[stations] = shear;
  for (let i = stations - 1; i >= 0; i--) {
    const inner = weightKNm(fromPierM[i]!);
    const outer = weightKNm(fromPierM[i + 1]!);
    // The load runs straight over the slice: its lever about the inner end is h (inner + 2 outer) / 3 (inner + outer).
    moment -= shear * h + (h * h * (inner + 2 * outer)) / 6;
    shear += (h * (inner + outer)) / 2;
    momentKNm[i] = moment;
    shearKN[i] = shear;
  }
  const tip = weightKNm(armM - segmentM / 2) * segmentM;
  const pierMomentKNm = tip * (armM - segmentM / 2) + travellerKN * segmentM;
  return { fromPierM, momentKNm, shearKN, pierMomentKNm };
}
