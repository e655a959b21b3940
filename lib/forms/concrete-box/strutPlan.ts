import { boxData } from './boxData.ts';

/** Webs and strut lines across a deck whose wings rest on struts, m. */
export interface StrutPlan {
  readonly cells: number;
  /** Between web axes at the top. */
  readonly spacingM: number;
  /** From the axis of an outer web to the line of the strut heads. */
  readonly outM: number;
  /** From there to the edge of the deck. */
  readonly overhangM: number;
}

/** Height between foot and head of a strut in a box of some depth, m. */
export function strutRiseM(depthM: number): number {
  const { footAboveSoffitM, headBelowTopM } = boxData.struts;
  return Math.max(0, depthM - footAboveSoffitM - headBelowTopM);
}

/**
 * Fewest cells of a box with strutted wings: strut lines as far out as the next web would be, or as far as the depth lets
 * a strut of the least slope reach from the foot of a leaning web; overhangs in a fixed proportion to the web spacing.
 */
export function strutPlan(widthM: number, depthM: number, hasTendonsAcross: boolean): StrutPlan {
  const { overhangOverSpacing: share, mostWebSpacingM } = boxData.layout;
  const mostM = hasTendonsAcross ? boxData.across.mostWebSpacingM : mostWebSpacingM;
  const { leastRiseOverRun, headBelowTopM } = boxData.struts;
  const riseM = strutRiseM(depthM);
  const reachM = Math.max(0.5, riseM / leastRiseOverRun - boxData.webSlope.most * (riseM + headBelowTopM));
  for (let cells = 1; ; cells++) {
    const evenM = widthM / (cells + 2 + 2 * share);
    const outM = Math.min(evenM, reachM);
    const spacingM = outM < evenM ? (widthM - 2 * outM) / (cells + 2 * share) : evenM;
    if (spacingM <= mostM + 1e-9) return { cells, spacingM, outM, overhangM: share * spacingM };
  }
}
