import { caseInputs, type EvidenceCase } from './caseInputs.ts';
import type { EvidenceKind, EvidenceRow } from './evidenceRow.ts';

/** One published value beside ours. */
export interface EvidenceLine {
  readonly id: string;
  readonly subject: string;
  readonly kind: EvidenceKind;
  readonly title: string;
  readonly figure: string;
  readonly unit: string;
  readonly published: number;
  readonly ours: number;
  /** (ours - published) / |published|; null when the published value is 0. */
  readonly deviation: number | null;
  readonly tolerance: number | null;
  /** null where the row decides nothing. */
  readonly within: boolean | null;
  readonly scope: string;
  readonly source: string;
  readonly read: boolean;
  readonly note?: string;
  /** Why ours deviates, as far as a check by hand has shown. */
  readonly cause?: string;
}

/**
 * Works out every row with the calculation it names.
 * @throws RangeError for a row whose case or figure is unknown, or whose inputs do not fit
 */
export function runEvidence(
  rows: readonly EvidenceRow[],
  cases: Readonly<Record<string, EvidenceCase>>,
): EvidenceLine[] {
  return rows.flatMap((row) => {
    const calculation = cases[row.case];
    if (!calculation) {
      throw new RangeError(
        `${row.id}: expected a case of ${Object.keys(cases).join(', ')}, received ${row.case}`,
      );
    }
    const figures = calculation(caseInputs(row.inputs));
    return Object.entries(row.published).map(([figure, published]): EvidenceLine => {
      const ours = figures[figure];
      if (ours === undefined) {
        throw new RangeError(
          `${row.id}: expected a figure of ${Object.keys(figures).join(', ')}, received ${figure}`,
        );
      }
      return {
        id: row.id,
        subject: row.subject,
        kind: row.kind,
        title: row.title,
        figure,
        unit: row.unit,
        published,
        ours,
        deviation: published === 0 ? null : (ours - published) / Math.abs(published),
        tolerance: row.tolerance,
        within: isWithin(row, ours, published),
        scope: row.scope,
        source: row.source,
        read: row.read,
        ...(row.note === undefined ? {} : { note: row.note }),
        ...(row.cause === undefined ? {} : { cause: row.cause }),
      };
    });
  });
}

/** A value that is not a number is never within. */
function isWithin(row: EvidenceRow, ours: number, published: number): boolean | null {
  if (row.tolerance === null) return null;
  const allowed = Math.max(row.tolerance * Math.abs(published), row.absolute ?? 0);
  return Math.abs(ours - published) <= allowed;
}

/** Outside its tolerance without a cause written beside it: something has changed that nobody has looked into. */
export function isUnexplained(line: EvidenceLine): boolean {
  return line.within === false && line.cause === undefined;
}
