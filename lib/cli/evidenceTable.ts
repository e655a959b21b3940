import type { Agreement, KindSummary, SubjectSummary } from '../evidence/index.ts';

/** What the table is made of. */
interface EvidenceResult {
  readonly kinds: readonly KindSummary[];
  readonly subjects: readonly SubjectSummary[];
  readonly formsWithoutCase: readonly string[];
}

const columns = ['cases', 'figures', 'median', '<= 25 %', '<= 30 %'];

/** How published values and ours stand, as plain text: by kind with the aims, by subject, and the causes of the worst. */
export function evidenceTable({ kinds, subjects, formsWithoutCase }: EvidenceResult): string {
  return [
    ...table([
      ['kind', ...columns, 'worst', 'aim', 'reached'],
      ...kinds.map((kind) => [kind.kind, ...cells(kind), worst(kind), ...aim(kind.aim)]),
    ]),
    '',
    ...table([
      ['subject', ...columns, 'worst', 'outside its tolerance'],
      ...subjects.map((subject) => [
        subject.subject,
        ...cells(subject),
        worst(subject),
        String(subject.outside),
      ]),
    ]),
    '',
    'worst of each subject, and why',
    ...subjects.map(
      ({ subject, worst: line }) =>
        `  ${subject}: ${line === null ? 'none' : `${line.id}, ${line.cause ?? 'cause not known'}`}`,
    ),
    '',
    ...formsWithoutCase.map((form) => `${form}: no published case found`),
    '',
  ].join('\n');
}

function cells(of: Agreement): string[] {
  const { cases, figures, medianDeviation, withinQuarter, withinThirty } = of;
  return [
    String(cases),
    String(figures),
    `${(100 * medianDeviation).toFixed(1)} %`,
    share(withinQuarter),
    share(withinThirty),
  ];
}

function worst({ worst: line }: Agreement): string {
  if (line === null) return 'none';
  const sign = line.deviation > 0 ? '+' : '';
  return `${sign}${(100 * line.deviation).toFixed(1)} % ${line.id}`;
}

function aim(of: KindSummary['aim']): [string, string] {
  if (of === null) return ['none', ''];
  const wanted = `median ${share(of.medianAtMost)}, ${share(of.shareAtLeast)} within ${share(of.limit)}`;
  return [wanted, of.met ? 'met' : 'missed'];
}

function share(value: number): string {
  return `${(100 * value).toFixed(0)} %`;
}

/** Columns as wide as their widest cell. */
function table(rows: readonly (readonly string[])[]): string[] {
  const widths = rows[0]!.map((_, column) => Math.max(...rows.map((row) => row[column]!.length)));
  return rows.map((row) =>
    row
      .map((cell, column) => cell.padEnd(widths[column]!))
      .join('  ')
      .trimEnd(),
  );
}
