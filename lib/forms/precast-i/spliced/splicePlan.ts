import { splicedData } from './splicedData.ts';

/** How the beams of a unit are cut into pieces. */
export interface SplicePlan {
  readonly longestM: number;
  /** Splices within each span: a row of towers stands under each of them. */
  readonly splices: readonly number[];
  /** Where they are, m from the first support. */
  readonly atM: readonly number[];
}

/**
 * Pieces over the piers reach to where the moment changes its sign; what lies between is cut into as many equal pieces as
 * the road asks for. A span by itself has three pieces at least.
 * @param mostM longest piece that can be hauled
 */
export function splicePlan(spansM: readonly number[], mostM: number): SplicePlan {
  const { atOverSpan, leastPieces } = splicedData.splices;
  const last = spansM.length - 1;
  const atM: number[] = [];
  const splices: number[] = [];
  let longestM = 0;
  let start = 0;
  spansM.forEach((spanM, span) => {
    const left = span > 0 ? atOverSpan * spanM : 0;
    const right = span < last ? atOverSpan * spanM : 0;
    const fieldM = spanM - left - right;
    const pieces = Math.max(last === 0 ? leastPieces : 1, Math.ceil(fieldM / mostM - 1e-9));
    const here = Array.from({ length: pieces + 1 }, (_, k) => left + (fieldM * k) / pieces).filter(
      (x) => x > 1e-6 && x < spanM - 1e-6,
    );
    atM.push(...here.map((x) => start + x));
    splices.push(here.length);
    longestM = Math.max(
      longestM,
      fieldM / pieces,
      span < last ? atOverSpan * (spanM + spansM[span + 1]!) : 0,
    );
    start += spanM;
  });
  return { longestM, splices, atM };
}
