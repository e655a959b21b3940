import { splicedData } from './splicedData.ts';

/** How the beams of a unit are cut into pieces. */
export interface SplicePlan {
  readonly longestM: number;
  /** Splices within each span: a row of towers stands under each of them. */
  readonly splices: readonly number[];
  /** Where they are, m from the first support. */
  readonly atM: readonly number[];
}

/** How far a piece over the pier at either end of a span reaches into it, m; 0 at an abutment and in spans of one piece. */
export function pierReachM(
  spansM: readonly number[],
  span: number,
  mostM: number,
): readonly [left: number, right: number] {
  const spanM = spansM[span]!;
  if (spanM <= mostM) return [0, 0];
  const reach = splicedData.splices.atOverSpan * spanM;
  return [span > 0 ? reach : 0, span < spansM.length - 1 ? reach : 0];
}

/**
 * Spans that the road takes in one piece are one piece, joined to the next over the piers. In longer ones a piece over the
 * pier reaches to where the moment changes its sign (over both sides where both are long), and what lies between is cut into
 * as many equal pieces as the road asks for. A span by itself has three pieces at least.
 * @param mostM longest piece that can be hauled
 */
export function splicePlan(spansM: readonly number[], mostM: number): SplicePlan {
  const { leastPieces } = splicedData.splices;
  const last = spansM.length - 1;
  const atM: number[] = [];
  const splices: number[] = [];
  let longestM = 0;
  let start = 0;
  let before = 0;
  spansM.forEach((spanM, span) => {
    const [left, right] = pierReachM(spansM, span, mostM);
    const fieldM = spanM - left - right;
    const pieces = Math.max(last === 0 ? leastPieces : 1, Math.ceil(fieldM / mostM - 1e-9));
    const here = Array.from({ length: pieces + 1 }, (_, k) => left + (fieldM * k) / pieces).filter(
      (x) => x > 1e-6 && x < spanM - 1e-6,
    );
    atM.push(...here.map((x) => start + x));
    splices.push(here.length);
    longestM = Math.max(longestM, fieldM / pieces, before + left);
    before = right;
    start += spanM;
  });
  return { longestM, splices, atM };
}
