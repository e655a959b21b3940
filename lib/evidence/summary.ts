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
}

/** Counts by subject in the order in which subjects appear. */
export function summary(lines: readonly EvidenceLine[]): SubjectSummary[] {
  const subjects = [...new Set(lines.map((line) => line.subject))];
  return subjects.map((subject) => {
    const own = lines.filter((line) => line.subject === subject);
    const deciding = own.filter((line) => line.within !== null);
    return {
      subject,
      compared: own.length,
      within: deciding.filter((line) => line.within === true).length,
      outside: deciding.filter((line) => line.within === false).length,
      shownOnly: own.length - deciding.length,
      worstDeviation: Math.max(0, ...deciding.map((line) => Math.abs(line.deviation ?? 0))),
    };
  });
}
