import type { EvidenceLine } from './runEvidence.ts';

/** How far ours is from what is published, over some lines. Deviations and shares are relative, 0 to 1. */
export interface Agreement {
  /** Cases (rows of the data) and figures compared; a case may publish several. */
  readonly cases: number;
  readonly figures: number;
  /** Median of the absolute deviations of the figures. */
  readonly medianDeviation: number;
  /** Share of the figures within 25 % and within 30 %. */
  readonly withinQuarter: number;
  readonly withinThirty: number;
  /** The figure that deviates most, with its cause where one is written; null where no line has a deviation. */
  readonly worst: Worst | null;
}

/** The figure that deviates most. */
export interface Worst {
  readonly id: string;
  readonly figure: string;
  readonly deviation: number;
  readonly cause: string | null;
}

/** The middle of some numbers; 0 of none. */
function median(values: readonly number[]): number {
  const rising = [...values].sort((a, b) => a - b);
  const half = rising.length / 2;
  return rising.length === 0 ? 0 : (rising[Math.ceil(half) - 1]! + rising[Math.floor(half)]!) / 2;
}

/** Share of deviations no greater than a limit; 0 of none. */
export function shareWithin(lines: readonly EvidenceLine[], limit: number): number {
  const sizes = deviations(lines);
  return sizes.filter((size) => size <= limit).length / Math.max(1, sizes.length);
}

/** Over all lines with a deviation, those that are shown only among them. */
export function agreement(lines: readonly EvidenceLine[]): Agreement {
  return {
    cases: new Set(lines.map((line) => line.id)).size,
    figures: lines.length,
    medianDeviation: median(deviations(lines)),
    withinQuarter: shareWithin(lines, 0.25),
    withinThirty: shareWithin(lines, 0.3),
    worst: worstOf(lines),
  };
}

function deviations(lines: readonly EvidenceLine[]): number[] {
  return lines.flatMap(({ deviation }) => (deviation === null ? [] : [Math.abs(deviation)]));
}

function worstOf(lines: readonly EvidenceLine[]): Worst | null {
  const most = Math.max(0, ...deviations(lines));
  const line = lines.find(({ deviation }) => deviation !== null && Math.abs(deviation) === most);
  if (line === undefined || line.deviation === null) return null;
  const { id, figure, deviation, cause = null } = line;
  return { id, figure, deviation, cause };
}
