/**
 * Stiffness along a beam that is constant within each element, as the beam mesh asks for it.
 * A moving index finds the element: the mesh asks from left to right.
 * @param elementM length of each element, m
 * @param eiKNm2 stiffness of each element, kNm2
 */
export function steppedStiffness(
  elementM: ArrayLike<number>,
  eiKNm2: ArrayLike<number>,
): (xM: number) => number {
  let e = 0;
  let endM = elementM[0]!;
  let atM = 0;
  return (xM) => {
    if (xM < atM) {
      e = 0;
      endM = elementM[0]!;
    }
    atM = xM;
    while (xM > endM && e < eiKNm2.length - 1) endM += elementM[++e]!;
    return eiKNm2[e]!;
  };
}
