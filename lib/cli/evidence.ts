import {
  evidence,
  formsWithoutCase,
  isUnexplained,
  kindSummaries,
  summary,
  type EvidenceLine,
} from '../evidence/index.ts';
import { evidenceTable } from './evidenceTable.ts';
import { readFlags } from './flags.ts';
import { refuse } from './refusal.ts';
import { jsonText, type Said } from './said.ts';

/**
 * `evidence [table]`: published values against ours. As JSON every line, how they stand by kind against the aims and by
 * subject, and the forms without a published case; with the word `table` the same without the lines, to be read. Lines
 * outside their tolerance go to standard error with their cause. Exit 0 when each of them has one, 1 when one has not.
 */
export function evidenceCommand(argv: readonly string[]): Said {
  const { rest } = readFlags([], argv, { words: true });
  const [layout] = rest;
  if (rest.length > 1 || (layout !== undefined && layout !== 'table')) {
    return refuse([
      {
        code: 'unknown-key',
        path: ['command line'],
        expected: "'table' or nothing",
        received: rest.join(' '),
        remedy: 'leave it out for JSON, or say table',
      },
    ]);
  }
  const lines = evidence();
  const result = {
    kinds: kindSummaries(lines),
    subjects: summary(lines),
    formsWithoutCase: formsWithoutCase(lines),
  };
  return {
    out: layout === 'table' ? evidenceTable(result) : jsonText({ ...result, lines }),
    notes: lines.filter((line) => line.within === false).map(said),
    code: lines.some(isUnexplained) ? 1 : 0,
  };
}

function said(line: EvidenceLine): string {
  const percent = line.deviation === null ? '' : ` (${(100 * line.deviation).toFixed(1)} %)`;
  return (
    `${line.id} ${line.figure}: expected ${line.published} ${line.unit}, received ${line.ours}${percent}; ` +
    `source ${line.source}; cause: ${line.cause ?? 'not known'}`
  );
}
