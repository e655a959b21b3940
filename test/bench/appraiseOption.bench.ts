/**
 * How long one option of a girder form takes from its piers to its P50 on stored draws, at a depth that is given and with
 * the depth sought; sizes, supports and prices are worked out anew each time, cost tables and draws are there already.
 * Each line says the median. Run `npm run bench -- test/bench/appraiseOption.bench.ts --project unit`.
 */
import { afterAll, bench, describe } from 'vitest';
import { appraiseOption, appraiseOptionAt } from '../../lib/appraise/appraiseOption.ts';
import { drawn } from '../../lib/appraise/drawn.ts';
import { memory, type Memory } from '../../lib/appraise/memory.ts';
import { finish } from '../../lib/appraise/work.ts';
import { workbench } from '../../lib/appraise/workbench.ts';
import { formModule } from '../../lib/forms/index.ts';
import type { FormId, MadeOption } from '../../lib/model/index.ts';
import { lowFerry } from '../appraise/studies.ts';

/** Supports of the worked example: its usual five spans, and one that a short form can reach. */
const long = [0, 41, 84, 147, 190, 231];
const short = [0, 33, 66, 99, 132, 165, 198, 231];

const cases: readonly (readonly [form: FormId, supportsM: readonly number[], depthM: number])[] = [
  ['composite-i', long, 2.5],
  ['composite-box', long, 2.5],
  ['concrete-box', long, 2.6],
  ['cantilever-box', long, 2.2],
  ['steel-box', long, 2.4],
  ['half-through', long, 1.2],
  ['precast-i', short, 1.9],
  ['precast-trough', short, 1.7],
  ['adjacent-box', short, 1.3],
];

const study = lowFerry();
const { startM, endM } = study.brief.crossing;
const laid = workbench(study);

const median = (values: readonly number[]): number => {
  const sorted = [...values].sort((a, b) => a - b);
  return sorted[Math.floor(sorted.length / 2)] ?? NaN;
};

/** A memory with tables, trial piers and draws, and nothing of any option. */
const forgetful = (): Memory => {
  const { rows, piers, draws } = laid.kept;
  return { ...memory(), rows, piers, draws };
};

const all: { readonly name: string; readonly ms: number }[] = [];

function timed(name: string, iterations: number, run: () => void): void {
  const times: number[] = [];
  bench(
    name,
    () => {
      const began = performance.now();
      run();
      times.push(performance.now() - began);
    },
    {
      iterations,
      time: 0,
      warmupIterations: 3,
      warmupTime: 0,
      teardown(_, mode) {
        if (mode !== 'run') return;
        all.push({ name, ms: median(times) });
        process.stdout.write(`${name}: median ${median(times).toFixed(1)} ms\n`);
      },
    },
  );
}

describe('one option to P50', () => {
  for (const [form, supportsM, depthM] of cases) {
    const [method] = formModule(form).methods;
    const places = supportsM.map((x) => startM + (x * (endM - startM)) / supportsM.at(-1)!);
    const option: MadeOption = {
      number: 1,
      form,
      method,
      units: [{ form, role: 'main', supportsM: places }],
      depthM: null,
      origin: 'kept',
    };
    // The tables and draws are laid before anything is timed.
    finish(appraiseOption(laid, drawn(laid), option));
    timed(`${form}, depth given, aim 3 ms`, 20, () => {
      const here = workbench(study, forgetful());
      appraiseOptionAt(here, drawn(here), option, [depthM]);
    });
    timed(`${form}, depth sought`, 5, () => {
      const here = workbench(study, forgetful());
      finish(appraiseOption(here, drawn(here), option));
    });
  }
});

afterAll(() => {
  const given = all.filter(({ name }) => name.includes('given, aim'));
  process.stdout.write(
    `girder forms, depth given: median ${median(given.map(({ ms }) => ms)).toFixed(1)} ms\n`,
  );
});
