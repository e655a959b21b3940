/** Areas of an influence line above and below zero with the lengths they stand on. */
export interface LineAreas {
  positive: number;
  negative: number;
  positiveM: number;
  negativeM: number;
}

/**
 * Areas of the positive and negative parts of an element line, exact for its cubics; a change of sign inside an
 * element is found by three Newton steps from the chord.
 */
export function lineAreas(xM: ArrayLike<number>, line: Float64Array, out: LineAreas): void {
  out.positive = out.negative = out.positiveM = out.negativeM = 0;
  for (let e = 0; e < xM.length - 1; e++) {
    const h = xM[e + 1]! - xM[e]!;
    const v0 = line[4 * e]!;
    const s0 = line[4 * e + 1]! * h;
    const v1 = line[4 * e + 2]!;
    const s1 = line[4 * e + 3]! * h;
    const whole = h * ((v0 + v1) / 2 + (s0 - s1) / 12);
    if (v0 >= 0 && v1 >= 0) {
      out.positive += whole;
      if (whole > 0) out.positiveM += h;
    } else if (v0 <= 0 && v1 <= 0) {
      out.negative += whole;
      out.negativeM += h;
    } else {
      const t = root(v0, s0, v1, s1);
      const left = h * areaTo(t, v0, s0, v1, s1);
      const right = whole - left;
      if (v0 > 0) {
        out.positive += left;
        out.positiveM += t * h;
        out.negative += right;
        out.negativeM += (1 - t) * h;
      } else {
        out.negative += left;
        out.negativeM += t * h;
        out.positive += right;
        out.positiveM += (1 - t) * h;
      }
    }
  }
}

/** Integral of the cubic from 0 to t, per unit of element length. */
function areaTo(t: number, v0: number, s0: number, v1: number, s1: number): number {
  const t2 = t * t;
  const t3 = t2 * t;
  const t4 = t3 * t;
  return (
    v0 * (t - t3 + t4 / 2) +
    s0 * (t2 / 2 - (2 * t3) / 3 + t4 / 4) +
    v1 * (t3 - t4 / 2) +
    s1 * (t4 / 4 - t3 / 3)
  );
}

function root(v0: number, s0: number, v1: number, s1: number): number {
  let t = v0 / (v0 - v1);
  for (let i = 0; i < 3; i++) {
    const t2 = t * t;
    const value =
      v0 * (1 - 3 * t2 + 2 * t2 * t) +
      s0 * (t - 2 * t2 + t2 * t) +
      v1 * (3 * t2 - 2 * t2 * t) +
      s1 * (t2 * t - t2);
    const slope = (v1 - v0) * 6 * (t - t2) + s0 * (1 - 4 * t + 3 * t2) + s1 * (3 * t2 - 2 * t);
    if (slope === 0) return t;
    t = Math.min(1, Math.max(0, t - value / slope));
  }
  return t;
}
