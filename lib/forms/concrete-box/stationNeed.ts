import type { Drape } from './leastForce.ts';
import type { TendonLine, TendonLines } from './tendonLine.ts';

/** Draped tendons at one station, as `TendonLine` has them along the deck. */
export interface TendonAt {
  readonly depthM: number;
  readonly eccentricityM: number;
  readonly parasiticM: number;
  readonly share: number;
}

/** Draped force that a limit asks for at a station where the tendons lie so, kN; Infinity where none will do. */
export type StationNeed = (i: number, at: TendonAt) => number;

/** Draped force that a limit asks for along a line of the tendons, kN. */
export function needAlong(need: StationNeed, line: TendonLine): number {
  let most = 0;
  for (let i = 0; i < line.share.length; i++) {
    const at = {
      depthM: line.depthM[i]!,
      eccentricityM: line.eccentricityM[i]!,
      parasiticM: line.parasiticM[i]!,
      share: line.share[i]!,
    };
    most = Math.max(most, need(i, at));
  }
  return most;
}

/**
 * Draped force that limits ask for by drape, kN; one that is `enough` or more is said as soon as that is known. Each limit
 * is first asked about the station at which it ruled a drape out last: nearly always that rules out the next one too, which
 * lies beside it, and the rest of its line need not be known.
 */
export function drapeNeed(
  lines: TendonLines,
  needs: readonly StationNeed[],
): (drape: Drape, enough: number) => number {
  const { share } = lines;
  const n = share.length;
  const last = needs.map(() => 0);
  const at = { depthM: 0, eccentricityM: 0, parasiticM: 0, share: 0 };
  const go = (drape: Drape, i: number): void => {
    at.depthM = lines.depthM(drape, i);
    at.eccentricityM = lines.eccentricityM(drape, i);
    at.parasiticM = lines.parasiticM(drape, i);
    at.share = share[i]!;
  };
  return (drape, enough) => {
    let most = 0;
    for (let k = 0; k < needs.length; k++) {
      go(drape, last[k]!);
      most = Math.max(most, needs[k]!(last[k]!, at));
      if (most >= enough) return most;
    }
    for (let i = 0; i < n; i++) {
      go(drape, i);
      for (let k = 0; k < needs.length; k++) {
        most = Math.max(most, needs[k]!(i, at));
        if (most >= enough) {
          last[k] = i;
          return most;
        }
      }
    }
    return most;
  };
}
