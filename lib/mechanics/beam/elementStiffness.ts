/**
 * End stiffnesses of beam elements whose bending stiffness varies along them, from their flexibilities:
 * f_aa = int (1-t)2/EI, f_bb = int t2/EI, f_ab = -int t(1-t)/EI over the element, inverted. Gauss points 3, so that the
 * integrals are exact where 1/EI is a cubic of x and never lose their sign. Prismatic: 4EI/h, 2EI/h, 4EI/h.
 */

/** Three numbers an element: k_aa, k_ab, k_bb in kNm per radian of its ends against the chord. */
export type EndStiffness = Float64Array;

const at = [0.5 - Math.sqrt(0.15), 0.5, 0.5 + Math.sqrt(0.15)] as const;
const share = [5 / 18, 8 / 18, 5 / 18] as const;

/** @throws RangeError where the stiffness is not above 0 */
export function endStiffness(xM: Float64Array, eiKNm2: ((xM: number) => number) | undefined): EndStiffness {
  const ei = eiKNm2 ?? ((): number => 1);
  const result = new Float64Array(3 * (xM.length - 1));
  for (let e = 0; e < xM.length - 1; e++) {
    const h = xM[e + 1]! - xM[e]!;
    let aa = 0;
    let ab = 0;
    let bb = 0;
    for (let g = 0; g < 3; g++) {
      const t = at[g]!;
      const x = xM[e]! + t * h;
      const value = ei(x);
      if (!(value > 0)) {
        throw new RangeError(`eiKNm2: expected more than 0 at x = ${x} m, received ${value}`);
      }
      const flexibility = (h * share[g]!) / value;
      aa += (1 - t) * (1 - t) * flexibility;
      ab -= t * (1 - t) * flexibility;
      bb += t * t * flexibility;
    }
    const det = aa * bb - ab * ab;
    result[3 * e] = bb / det;
    result[3 * e + 1] = -ab / det;
    result[3 * e + 2] = aa / det;
  }
  return result;
}
