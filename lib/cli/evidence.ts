import { evidence } from '../evidence/index.ts';
import { summary } from '../evidence/summary.ts';

/**
 * Published values against ours as JSON: every line, and a count by subject. Exit 0 when all deciding lines are within
 * their tolerance, 1 when one is not.
 */
const lines = evidence();
process.stdout.write(`${JSON.stringify({ subjects: summary(lines), lines }, null, 2)}\n`);
const outside = lines.filter((line) => line.within === false);
for (const line of outside) {
  const percent = line.deviation === null ? '' : ` (${(100 * line.deviation).toFixed(1)} %)`;
  process.stderr.write(
    `${line.id} ${line.figure}: expected ${line.published} ${line.unit}, received ${line.ours}${percent}; source ${line.source}\n`,
  );
}
process.exitCode = outside.length > 0 ? 1 : 0;
