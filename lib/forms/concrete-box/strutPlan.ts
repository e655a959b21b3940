import { boxData } from './boxData.ts';

/** Webs and strut lines across a deck, m. */
export interface StrutPlan {
  readonly cells: number;
  /** Between web axes at the top. */
  readonly spacingM: number;
  /** From the axis of an outer web to the line of the strut heads; 0 without struts. */
  readonly outM: number;
  /** From there to the edge of the deck. */
  readonly overhangM: number;
}

/** Height between foot and head of a strut in a box of some depth, m. */
export function strutRiseM(depthM: number): number {
  const { footAboveSoffitM, headBelowTopM } = boxData.struts;
  return Math.max(0, depthM - footAboveSoffitM - headBelowTopM);
}

/** Widest spacing of webs under a top slab with or without tendons across the deck, m. */
export function mostSpacingM(hasTendonsAcross: boolean): number {
  return hasTendonsAcross ? boxData.across.mostWebSpacingM : boxData.layout.mostWebSpacingM;
}

/** Fewest cells of a box whose width between its outer webs is given, webs at most `mostM` apart, m. */
export function cellsWithin(boxWidthM: number, mostM: number): Pick<StrutPlan, 'cells' | 'spacingM'> {
  const cells = Math.max(1, Math.ceil(boxWidthM / mostM - 1e-9));
  return { cells, spacingM: boxWidthM / cells };
}

/**
 * Fewest cells of a box with strutted wings: strut lines as far out as the next web would be, or as far as the depth lets
 * a strut of the least slope reach from the foot of a leaning web; overhangs in a fixed proportion to the web spacing. Where
 * the width of the box is given, strut lines share the wing out in that proportion as far as a strut reaches.
 */
export function strutPlan(
  widthM: number,
  depthM: number,
  hasTendonsAcross: boolean,
  boxWidthM?: number,
): StrutPlan {
  const share = boxData.layout.overhangOverSpacing;
  const mostM = mostSpacingM(hasTendonsAcross);
  const { leastRiseOverRun, headBelowTopM } = boxData.struts;
  const riseM = strutRiseM(depthM);
  const reachM = Math.max(0.5, riseM / leastRiseOverRun - boxData.webSlope.most * (riseM + headBelowTopM));
  if (boxWidthM !== undefined) {
    const wingM = (widthM - boxWidthM) / 2;
    const outM = Math.min(wingM / (1 + share), reachM);
    return { ...cellsWithin(boxWidthM, mostM), outM, overhangM: wingM - outM };
  }
  for (let cells = 1; ; cells++) {
    const evenM = widthM / (cells + 2 + 2 * share);
    const outM = Math.min(evenM, reachM);
    const spacingM = outM < evenM ? (widthM - 2 * outM) / (cells + 2 * share) : evenM;
    if (spacingM <= mostM + 1e-9) return { cells, spacingM, outM, overhangM: share * spacingM };
  }
}
