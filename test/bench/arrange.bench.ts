/**
 * How long the search of arrangements takes, apart from the sizing behind its cost tables, and next to a general-purpose
 * solver on the same table. Run `npm run bench -- test/bench/arrange.bench.ts`.
 */
import highsLoader from 'highs';
import { bench, describe } from 'vitest';
import { requestFor } from '../../lib/appraise/requestFor.ts';
import { finish } from '../../lib/appraise/work.ts';
import { workbench, type Workbench } from '../../lib/appraise/workbench.ts';
import { arrange } from '../../lib/arrange/index.ts';
import { formModule, sizeableForms } from '../../lib/forms/index.ts';
import type { Study } from '../../lib/model/index.ts';
import { longCrossing } from '../appraise/longCrossing.ts';
import { lowFerry } from '../appraise/studies.ts';
import { leastBySolver, milpCases, searchFor } from '../oracles/arrangeMilp.ts';

const asked = sizeableForms.map((form) => ({ form, method: formModule(form).methods[0] }));

/** Sizes every row that the searches read. */
function layTables({ tables }: Workbench): void {
  for (const one of asked)
    for (const rows of tables.rowsOf(one)) for (const index of rows.spansM.keys()) finish(rows.make(index));
}

function searchAll({ site, tables }: Workbench): void {
  for (const one of asked) arrange(requestFor(one, site), site, tables.tableFor(one));
}

const once = { iterations: 1, time: 0, warmupIterations: 0, warmupTime: 0 };

describe.each<[name: string, aim: string, study: Study]>([
  ['230 m', '50 ms', lowFerry()],
  ['3 km with 20 zones', '300 ms', longCrossing()],
])('%s, all forms', (_, aim, study) => {
  const laid = workbench(study);
  layTables(laid);
  searchAll(laid);
  bench(`search, aim ${aim}`, () => searchAll(laid), { iterations: 5, time: 0, warmupIterations: 2 });
  bench('sizing of trial spans from nothing', () => layTables(workbench(study)), once);
  bench(
    'search from nothing but its trial spans: sizes trial piers',
    () => {
      const { rows } = laid.kept;
      searchAll(workbench(study, { ...workbench(study).kept, rows }));
    },
    once,
  );
});

const highs = await highsLoader();

describe.each(milpCases)('arrangement on $lengthM m by the search and by a solver', (given) => {
  bench('search', () => void arrange(...searchFor(given)), { iterations: 5, time: 0 });
  bench('mixed-integer solver', () => void leastBySolver(highs, given), once);
});
