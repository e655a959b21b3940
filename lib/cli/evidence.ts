import { evidence } from '../evidence/index.ts';
import { summary } from '../evidence/summary.ts';
import { readFlags } from './flags.ts';
import { jsonText, type Said } from './said.ts';

/**
 * `evidence`: published values against ours as JSON, every line and a count by subject. Exit 0 when all deciding lines
 * are within their tolerance, 1 when one is not.
 */
export function evidenceCommand(argv: readonly string[]): Said {
  readFlags([], argv);
  const lines = evidence();
  const outside = lines.filter((line) => line.within === false);
  const notes = outside.map((line) => {
    const percent = line.deviation === null ? '' : ` (${(100 * line.deviation).toFixed(1)} %)`;
    return `${line.id} ${line.figure}: expected ${line.published} ${line.unit}, received ${line.ours}${percent}; source ${line.source}`;
  });
  return { out: jsonText({ subjects: summary(lines), lines }), notes, code: outside.length > 0 ? 1 : 0 };
}
