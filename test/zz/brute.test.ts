import { readFileSync } from 'node:fs';
import { test } from 'vitest';
import { proposalsFor } from '/work/wt/crossing/lib/appraise/proposals.ts';
import { workbench, benchFor } from '/work/wt/crossing/lib/appraise/workbench.ts';
import { workOption } from '/work/wt/crossing/lib/appraise/cheapestOption.ts';
import { finish } from '/work/wt/crossing/lib/appraise/work.ts';
import { memory } from '/work/wt/crossing/lib/appraise/memory.ts';
import { standBetween } from '/work/wt/crossing/lib/site/index.ts';
import { expectedLines } from '/work/wt/crossing/lib/substructure/index.ts';
import { readStudy } from '/work/wt/crossing/lib/index.ts';
const read = readStudy(readFileSync(process.env.F ?? '/tmp/lf-win.json','utf8'));
if (!read.ok) throw new Error(JSON.stringify(read));
const study = read.value;
const full = (bench: any, a: any) => {
  const own = benchFor(bench, a.units);
  const w = finish(workOption(own, { number: 1, form: a.form, method: a.method, units: a.units, depthM: null, origin: 'proposed' })).option;
  const c = own.costOf(w.lines) + own.costOf(w.supports.flatMap((s: any) => expectedLines({ ...s, lines: [] })));
  return [c, w.depthM.midspan] as const;
};
test.skip('x', () => {
  for (const form of (process.env.FORMS ?? 'composite-i,concrete-box').split(',') as any[]) {
    const bench = workbench(study, memory());
    const t0 = performance.now();
    const found = finish(proposalsFor(bench, form));
    const t1 = performance.now();
    const mine = found.arrangements.map((a) => [...full(bench, a), a.tableCost, a.method, a.units.map(u=>u.supportsM.map(x=>Math.round(x*10)/10))]);
    process.stdout.write(form + ' ' + (t1-t0).toFixed(0) + ' ms\n' + mine.map((m) => JSON.stringify(m)).join('\n') + '\n');
    const { windows, ...bare } = bench.site;
    const rows: any[] = [];
    const n = 5;
    const lim = { s: [bare.startM, Math.min(windows!.startLatestM, Number(process.env.SMAX ?? 1e9))], e: [Math.max(windows!.endEarliestM, Number(process.env.EMIN ?? -1e9)), bare.endM] };
    for (let i = 0; i <= n; i++) for (let j = 0; j <= n; j++) {
      const s = lim.s[0]! + (lim.s[1]! - lim.s[0]!) * i / n, e = lim.e[1]! - (lim.e[1]! - lim.e[0]!) * j / n;
      const site = standBetween(bare as any, s, e);
      const b = { ...bench, site, keptHere: workbench(study, memory()).keptHere };
      for (const a of finish(proposalsFor(b as any, form)).arrangements) rows.push([full(b, a), a.method, a.units.map(u=>u.supportsM.map(x=>Math.round(x*10)/10))]);
    }
    rows.sort((a, b) => a[0][0] - b[0][0]);
    process.stdout.write('brute\n' + rows.slice(0, 4).map((m) => JSON.stringify(m)).join('\n') + '\n');
  }
}, 600000);
