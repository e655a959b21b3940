import { agreement, type Agreement } from './agreement.ts';
import type { EvidenceLine } from './runEvidence.ts';

/** How the lines of one subject stand. */
export interface SubjectSummary extends Agreement {
  readonly subject: string;
  readonly within: number;
  readonly outside: number;
  readonly shownOnly: number;
}

/** Counts by subject in the order in which subjects appear. */
export function summary(lines: readonly EvidenceLine[]): SubjectSummary[] {
  const subjects = [...new Set(lines.map((line) => line.subject))];
  return subjects.map((subject) => {
    const own = lines.filter((line) => line.subject === subject);
    return {
      subject,
      within: own.filter((line) => line.within === true).length,
      outside: own.filter((line) => line.within === false).length,
      shownOnly: own.filter((line) => line.within === null).length,
      ...agreement(own),
    };
  });
}
