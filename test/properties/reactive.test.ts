import fc from 'fast-check';
import type { Scheduler } from 'fast-check';
import { describe, expect, it } from 'vitest';
import { graph } from '../../notebooks/reactive/index.ts';
import type { Cell, SlowRun, State } from '../../notebooks/reactive/index.ts';
import { turn } from '../reactive/manual.ts';
import { cellName, formula, inputName, plainAnswers, randomGraph } from '../reactive/randomGraph.ts';
import type { Answer, RandomCell, RandomGraph } from '../reactive/randomGraph.ts';

type Step = 'finish one' | readonly { readonly input: number; readonly value: number }[];

const edits = fc.array(fc.record({ input: fc.nat(2), value: fc.nat(9) }), { minLength: 1, maxLength: 2 });
const steps = fc.array(fc.oneof(fc.constant('finish one' as const), edits), { minLength: 1, maxLength: 14 });

/** The key a run or view knows cell `k` by; a word, because objects sort keys that are numbers. */
const key = (k: number): string => `x${k}`;

/** Follows one reader of the graph through the ages: what it sees must be right at one age, never an earlier one. */
function follower(history: readonly (readonly Answer[])[]) {
  let age = 0;
  /** Whether the values seen, by cell index, are those of one age; moves on to it. */
  return (seen: ReadonlyMap<number, number>): boolean => {
    const fits = (answers: readonly Answer[]): boolean =>
      [...seen].every(([k, value]) => {
        const answer = answers[k]!;
        return 'value' in answer && answer.value === value;
      });
    const found = history.findIndex((answers, at) => at >= age && fits(answers));
    age = Math.max(age, found);
    return found >= 0;
  };
}

/** A random graph built on ours, watched by the plain answers at every age so far. */
function watched(spec: RandomGraph, scheduler: Scheduler) {
  const g = graph();
  const values = [...spec.inputs];
  const history = [plainAnswers(spec, values)];
  const live = new Map<string, number>();
  // Kept in a list, because what a run throws would be taken for the failure of its cell.
  const faults: string[] = [];
  const all: Cell<number>[] = spec.inputs.map((value, i) => g.input(inputName(i), value));
  const inputs = all.slice() as ReturnType<typeof g.input<number>>[];

  const slowRun = async (
    cell: RandomCell,
    name: string,
    given: readonly number[],
    { signal, handOn }: SlowRun,
  ) => {
    live.set(name, (live.get(name) ?? 0) + 1);
    if (live.get(name) !== 1) faults.push(`${name} has ${live.get(name)!} live runs`);
    let ended = false;
    const end = (): void => {
      if (!ended) live.set(name, live.get(name)! - 1);
      ended = true;
    };
    signal.addEventListener('abort', end);
    if (cell.handsOn) {
      try {
        handOn(formula(cell, given, name));
      } catch {
        // It fails at its end all the same.
      }
    }
    await scheduler.schedule(Promise.resolve(), name);
    end();
    return formula(cell, given, name);
  };

  spec.cells.forEach((cell, i) => {
    const name = cellName(i);
    const isOfOneAge = follower(history);
    const uses = Object.fromEntries(cell.uses.map((k) => [key(k), all[k]!]));
    const handed = (given: Record<string, number>): number[] => {
      const seen = new Map(cell.uses.map((k) => [k, given[key(k)]!]));
      if (!isOfOneAge(seen)) faults.push(`${name} was handed ${JSON.stringify([...seen])}`);
      return cell.uses.map((k) => given[key(k)]!);
    };
    all.push(
      cell.kind === 'cell'
        ? g.cell(name, uses, (given) => formula(cell, handed(given), name))
        : g.slow(name, uses, (given, run) => slowRun(cell, name, handed(given), run), { policy: cell.kind }),
    );
  });

  const show = (cells: readonly number[], who: string) => {
    const isOfOneAge = follower(history);
    return (state: State<Readonly<Record<string, number>>>): void => {
      if (state.value === undefined) return;
      const seen = new Map(cells.map((k) => [k, state.value![key(k)]!]));
      if (!isOfOneAge(seen)) faults.push(`${who} shows ${JSON.stringify([...seen])}`);
      const present = history.at(-1)!;
      if (state.state === 'ready') {
        for (const k of cells) expect(present[k], who).toEqual({ value: seen.get(k) });
      }
    };
  };
  const look = (cells: readonly number[], who: string): void => {
    g.view(Object.fromEntries(cells.map((k) => [key(k), all[k]!])), show(cells, who));
  };
  const everything = all.map((_, k) => k);
  look(everything, 'view of all');
  for (const j of everything) for (const k of everything.slice(0, j)) look([j, k], `view of ${j} and ${k}`);

  /** Everything a cell hangs on. */
  const above = (cell: Cell<unknown>): Cell<unknown>[] =>
    g.uses(cell).flatMap((used) => [used, ...above(used)]);

  return {
    g,
    edit: (changes: readonly { readonly input: number; readonly value: number }[]): void => {
      for (const { input, value } of changes) values[input % values.length] = value;
      const next = plainAnswers(spec, values);
      if (values.some((value, i) => (history.at(-1)![i] as { value: number }).value !== value))
        history.push(next);
      g.batch(() => {
        for (const { input, value } of changes) g.set(inputs[input % inputs.length]!, value);
      });
    },
    /** A cell that says it is ready or failed must be so at the present age. */
    check: (settled: boolean): void => {
      expect(faults).toEqual([]);
      all.forEach((cell, k) => {
        const state = g.state(cell);
        const answer = history.at(-1)![k]!;
        if (state.state === 'ready') expect({ value: state.value }, cell.name).toEqual(answer);
        const isRunning = [cell, ...above(cell)].some(({ name }) => (live.get(name) ?? 0) > 0);
        if (isRunning) expect(state.state, cell.name).not.toBe('ready');
        if (state.state === 'failed') expect({ failed: state.raisedBy }, cell.name).toEqual(answer);
        if (settled) expect(state.state, cell.name).not.toBe('pending');
      });
    },
  };
}

describe('random graphs under random edits and completions', () => {
  it.each([1, 2, 3])(
    '[G3] [G7] [G10] [G14] [G15] 100 interleavings from seed %i never mix ages and settle on the plain answers',
    async (seed) => {
      await fc.assert(
        fc.asyncProperty(
          randomGraph(8, true),
          steps,
          fc.scheduler(),
          async (spec, script: Step[], scheduler) => {
            const { g, edit, check } = watched(spec, scheduler);
            await turn();
            check(false);
            for (const step of script) {
              if (step !== 'finish one') edit(step);
              else if (scheduler.count() > 0) await scheduler.waitNext(1);
              await turn();
              check(false);
            }
            const end = { reached: false };
            void g.settled().then(() => (end.reached = true));
            for (let left = 100; left > 0 && !end.reached; left -= 1) {
              if (scheduler.count() > 0) await scheduler.waitNext(1);
              await turn();
            }
            expect(end.reached, 'settled').toBe(true);
            check(true);
            g.dispose();
          },
        ),
        { seed, numRuns: 100 },
      );
    },
  );

  it('[G2] [G4] 200 random graphs run a cell only when the plain answer of something it uses has changed', () => {
    fc.assert(
      fc.property(randomGraph(12, false), fc.array(edits, { maxLength: 8 }), (spec, script) => {
        const g = graph();
        const ran: string[] = [];
        const values = [...spec.inputs];
        const inputs = values.map((value, i) => g.input(inputName(i), value));
        const all: Cell<number>[] = [...inputs];
        spec.cells.forEach((cell, i) => {
          const name = cellName(i);
          const uses = Object.fromEntries(cell.uses.map((k) => [key(k), all[k]!]));
          const run = (given: Record<string, number>): number => {
            ran.push(name);
            return formula(
              cell,
              cell.uses.map((k) => given[key(k)]!),
              name,
            );
          };
          all.push(g.cell(name, uses, run));
        });
        g.batch(() => undefined);
        for (const changes of script) {
          const before = plainAnswers(spec, values);
          for (const { input, value } of changes) values[input % values.length] = value;
          const after = plainAnswers(spec, values);
          ran.length = 0;
          g.batch(() => {
            for (const { input, value } of changes) g.set(inputs[input % inputs.length]!, value);
          });
          const expected = spec.cells.flatMap((cell, i) => {
            const changed = cell.uses.some((k) => JSON.stringify(before[k]) !== JSON.stringify(after[k]));
            const runnable = cell.uses.every((k) => 'value' in after[k]!);
            return changed && runnable ? [cellName(i)] : [];
          });
          expect(ran).toEqual(expected);
        }
      }),
      { seed: 4, numRuns: 200 },
    );
  });
});
