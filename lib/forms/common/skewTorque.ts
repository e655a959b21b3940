/*
 * A box whose bearings stand on skew lines at its ends and square to the road at its piers. The two bearings of an end
 * allow it to turn about the line through them alone: as the span bends, its end cannot slope without twisting, by slope x
 * tan of the skew, against a pier that holds it. The torque of that twist is the same along the end span. Mechanics of a
 * beam (St Venant torsion, small movements, no warping), no source.
 */

/** A deck by its elements. */
export interface TwistedDeck {
  readonly elementM: ArrayLike<number>;
  /** Bending and twisting stiffness, kNm2. */
  readonly eiKNm2: ArrayLike<number>;
  readonly gjKNm2: ArrayLike<number>;
  /** Stations of the supports. */
  readonly supportAt: ArrayLike<number>;
}

/** Rotation of a held far end leaves an end moment three quarters of its flexibility; the least gives the most torque. */
const HELD_SHARE = 3 / 4;

/**
 * Torque that the skew of the ends brings into the first and the last span, kNm, of the sign of the slope: T = tan x slope
 * / (sum l / GJ + tan2 x flexibility of the end), as the torque comes with an end moment T tan that turns it back. A
 * single span has both its ends on skew lines. 0 in the spans between and on square supports.
 * @param momentKNm bending moments at the stations, those that come when the bearings are in place, sagging positive
 * @returns torque by span
 */
export function skewTorques(deck: TwistedDeck, momentKNm: ArrayLike<number>, skewDeg: number): number[] {
  const { supportAt } = deck;
  const spans = supportAt.length - 1;
  const out = new Array<number>(spans).fill(0);
  if (skewDeg === 0) return out;
  const tan = Math.tan((Math.abs(skewDeg) * Math.PI) / 180);
  const both = spans === 1;
  for (const span of new Set([0, spans - 1])) {
    const from = supportAt[span]!;
    const to = supportAt[span + 1]!;
    let lengthM = 0;
    for (let e = from; e < to; e++) lengthM += deck.elementM[e]!;
    let slope = 0;
    let turns = 0;
    let twists = 0;
    let x = 0;
    for (let e = from; e < to; e++) {
      const l = deck.elementM[e]!;
      const share = (x + l / 2) / lengthM;
      const near = both ? 1 : span === 0 ? 1 - share : share;
      slope += (((momentKNm[e]! + momentKNm[e + 1]!) / 2) * near * l) / deck.eiKNm2[e]!;
      turns += (near ** 2 * l) / deck.eiKNm2[e]!;
      twists += l / deck.gjKNm2[e]!;
      x += l;
    }
    out[span] = (tan * slope) / (twists + tan ** 2 * (both ? 1 : HELD_SHARE) * turns);
  }
  return out;
}

/** Characteristic torques of skew ends by span, kNm, of the sign of the slope: of lasting loads and of traffic. */
export interface SkewTorques {
  readonly lastingKNm: readonly number[];
  readonly trafficKNm: readonly number[];
}

/** On square supports. */
export const noSkew = (spansM: readonly number[]): SkewTorques => {
  const none = spansM.map(() => 0);
  return { lastingKNm: none, trafficKNm: none };
};

/**
 * Greatest design torque of skew ends, kNm: what lasts relieves no traffic.
 * @param factors partial factors of lasting loads and of traffic
 */
export const skewDesignKNm = (
  { lastingKNm, trafficKNm }: SkewTorques,
  factors: { readonly lasting: number; readonly traffic: number },
): number =>
  Math.max(
    ...lastingKNm.map((lasting, span) =>
      Math.max(
        factors.lasting * Math.abs(lasting),
        factors.lasting * Math.max(0, lasting) + factors.traffic * trafficKNm[span]!,
      ),
    ),
  );

/** Of a uniform load on an end span its end takes this much where the far end is held: what traffic presses a skew end by. */
export const END_SHARE = 3 / 8;

/** Torque that torques along the spans bring to each support, kNm: what changes there. */
export const atSupports = (bySpanKNm: readonly number[]): number[] =>
  Array.from({ length: bySpanKNm.length + 1 }, (_, j) =>
    Math.abs((bySpanKNm[j - 1] ?? 0) - (bySpanKNm[j] ?? 0)),
  );
