import { readFileSync } from 'node:fs';
import { expect, it } from 'vitest';
import { proposalsFor } from '../../lib/appraise/proposals.ts';
import { finish } from '../../lib/appraise/work.ts';
import { workbench } from '../../lib/appraise/workbench.ts';
import { formModule } from '../../lib/forms/index.ts';
import { readStudy, type FormId } from '../../lib/index.ts';

it.each<[FormId, boolean]>([
  // Two spans of 60 m at most on a crossing of 169.6 m.
  ['portal-frame', false],
  ['precast-i', true],
])('trial units of a %s are sized in tanners-yard: %s', (form, isSized) => {
  const read = readStudy(readFileSync('data/examples/tanners-yard.json', 'utf8'));
  if (!read.ok) throw new Error(JSON.stringify(read.problems));
  const bench = workbench(read.value);
  const { arrangements, because } = finish(proposalsFor(bench, form));
  expect(arrangements.length > 0).toBe(isSized);
  expect(because.length > 0).toBe(!isSized);
  const [rows] = bench.tables.rowsOf({ form, method: formModule(form).methods[0] });
  expect(rows!.spansM.some((_, i) => bench.kept.rows.get(rows!.key(i)) !== undefined)).toBe(isSized);
});
