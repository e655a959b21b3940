import { Runtime } from '@observablehq/runtime';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { graph } from '../../notebooks/reactive/index.ts';
import type { Cell } from '../../notebooks/reactive/index.ts';
import { turn } from '../reactive/manual.ts';
import { cellName, formula, inputName, randomGraph } from '../reactive/randomGraph.ts';
import type { Answer, RandomGraph } from '../reactive/randomGraph.ts';

/**
 * The oracle is a general-purpose reactive runtime that nobody here wrote. Both are given the same cells and edits and
 * must come to rest on the same values and the same failures. What is not compared: how often cells run (the oracle
 * has no cut-off for equal values) and which of several failures passes on (there it is the first to arrive).
 */
type Edit = readonly [input: number, value: number];

/** A slow answer, the same for both engines. */
async function slowly(produce: () => number): Promise<number> {
  await turn();
  return produce();
}

function ours(spec: RandomGraph) {
  const g = graph();
  const inputs = spec.inputs.map((value, i) => g.input(inputName(i), value));
  const all: Cell<number>[] = [...inputs];
  const names = [...spec.inputs.map((_, i) => inputName(i)), ...spec.cells.map((_, i) => cellName(i))];
  spec.cells.forEach((cell, i) => {
    const name = cellName(i);
    const uses = Object.fromEntries(cell.uses.map((k) => [names[k]!, all[k]!]));
    const run = (given: Record<string, number>): number =>
      formula(
        cell,
        cell.uses.map((k) => given[names[k]!]!),
        name,
      );
    all.push(
      cell.kind === 'cell'
        ? g.cell(name, uses, run)
        : g.slow(name, uses, (given) => slowly(() => run(given)), { policy: cell.kind }),
    );
  });
  return {
    edit: ([input, value]: Edit): void => g.set(inputs[input % inputs.length]!, value),
    rest: async (): Promise<Answer[]> => {
      await g.settled();
      return all.map((cell) => {
        const state = g.state(cell);
        if (state.state === 'failed') return { failed: (state.error as Error).message };
        expect(state.state, cell.name).toBe('ready');
        return { value: state.value! };
      });
    },
    end: (): void => g.dispose(),
  };
}

function theirs(spec: RandomGraph) {
  const runtime = new Runtime();
  const module = runtime.module();
  const names = [...spec.inputs.map((_, i) => inputName(i)), ...spec.cells.map((_, i) => cellName(i))];
  const inputs = spec.inputs.map((value, i) => module.variable({}).define(inputName(i), [], value));
  spec.cells.forEach((cell, i) => {
    const run = (...given: number[]): number => formula(cell, given, cellName(i));
    module.variable({}).define(
      cellName(i),
      cell.uses.map((k) => names[k]!),
      cell.kind === 'cell' ? run : (...given: number[]) => slowly(() => run(...given)),
    );
  });
  return {
    edit: ([input, value]: Edit): void => {
      const i = input % inputs.length;
      inputs[i]!.define(inputName(i), [], value);
    },
    rest: (): Promise<Answer[]> =>
      Promise.all(
        names.map((name) =>
          module.value(name).then(
            (value) => ({ value: value as number }),
            (error: unknown) => ({ failed: (error as Error).message }),
          ),
        ),
      ),
    end: (): void => runtime.dispose(),
  };
}

describe('the graph against an independent runtime', () => {
  it.each([11, 12])(
    '[G2] [G7] [G9] 60 random graphs from seed %i come to rest on the same answers',
    async (seed) => {
      const script = fc.array(fc.array(fc.tuple(fc.nat(2), fc.nat(9)), { minLength: 1, maxLength: 3 }), {
        minLength: 1,
        maxLength: 4,
      });
      let compared = 0;
      let failures = 0;
      await fc.assert(
        fc.asyncProperty(randomGraph(8, true), script, async (spec, bursts: Edit[][]) => {
          const mine = ours(spec);
          const other = theirs(spec);
          for (const burst of [[], ...bursts]) {
            for (const edit of burst) {
              mine.edit(edit);
              other.edit(edit);
            }
            const [left, right] = await Promise.all([mine.rest(), other.rest()]);
            expect(left.map(firstWord)).toEqual(right.map(firstWord));
            compared += left.length;
            failures += left.filter((answer) => 'failed' in answer).length;
          }
          mine.end();
          other.end();
        }),
        { seed, numRuns: 60 },
      );
      // The comparison means something only if both kinds of answer were met often.
      expect(compared).toBeGreaterThan(500);
      expect(failures).toBeGreaterThan(50);
      expect(compared - failures).toBeGreaterThan(250);
    },
  );
});

/** An answer without the origin of its failure, on which the two may differ when several cells fail. */
function firstWord(answer: Answer): number | 'failed' {
  return 'failed' in answer ? 'failed' : answer.value;
}
