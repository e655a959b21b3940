import type { EvidenceLine } from './runEvidence.ts';

/** How the lines of one subject stand. */
export interface SubjectSummary {
  readonly subject: string;
  readonly compared: number;
  readonly within: number;
  readonly outside: number;
  readonly shownOnly: number;
  /** Greatest deviation among the lines that decide, relative. */
  readonly worstDeviation: number;
  /** Of all lines with a deviation, those shown only among them: the median, and the share within a quarter, 0 to 1. */
  readonly medianDeviation: number;
  readonly withinQuarter: number;
  /** The line that deviates most; null where no line has a deviation. */
  readonly worst: { readonly id: string; readonly deviation: number } | null;
}

/** The middle of some numbers; 0 of none. */
function median(values: readonly number[]): number {
  const rising = [...values].sort((a, b) => a - b);
  const half = rising.length / 2;
  return rising.length === 0 ? 0 : (rising[Math.ceil(half) - 1]! + rising[Math.floor(half)]!) / 2;
}

/** Counts by subject in the order in which subjects appear. */
export function summary(lines: readonly EvidenceLine[]): SubjectSummary[] {
  const subjects = [...new Set(lines.map((line) => line.subject))];
  return subjects.map((subject) => {
    const own = lines.filter((line) => line.subject === subject);
    const deciding = own.filter((line) => line.within !== null);
    const off = own.flatMap(({ id, deviation }) => (deviation === null ? [] : [{ id, deviation }]));
    const sizes = off.map(({ deviation }) => Math.abs(deviation));
    const most = Math.max(0, ...sizes);
    return {
      subject,
      compared: own.length,
      within: deciding.filter((line) => line.within === true).length,
      outside: deciding.filter((line) => line.within === false).length,
      shownOnly: own.length - deciding.length,
      worstDeviation: Math.max(0, ...deciding.map((line) => Math.abs(line.deviation ?? 0))),
      medianDeviation: median(sizes),
      withinQuarter: sizes.filter((size) => size <= 0.25).length / Math.max(1, sizes.length),
      worst: off.find(({ deviation }) => Math.abs(deviation) === most) ?? null,
    };
  });
}
