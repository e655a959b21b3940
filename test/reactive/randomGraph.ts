import fc from 'fast-check';
import type { Arbitrary } from 'fast-check';

/** A cell of a random graph: a small sum over cells above, made coarse so that values often come out equal. */
export interface RandomCell {
  readonly kind: 'cell' | 'latest' | 'progress';
  /** Indices of the cells used; inputs come first. */
  readonly uses: readonly number[];
  readonly factor: number;
  /** The sum is taken to the remainder by this. */
  readonly coarse: number;
  /** Remainder at which the cell fails, or -1 for never. */
  readonly failsAt: number;
  /** Whether a slow one hands its result on as a part before its run ends. */
  readonly handsOn: boolean;
}

export interface RandomGraph {
  readonly inputs: readonly number[];
  readonly cells: readonly RandomCell[];
}

/** What a cell of a random graph comes to: its value, or the error message that stands for it. */
export type Answer = { readonly value: number } | { readonly failed: string };

/** Random graphs of up to 3 inputs and `most` cells; slow ones only when `slow` is set. */
export function randomGraph(most: number, slow: boolean): Arbitrary<RandomGraph> {
  const kinds = slow ? (['cell', 'latest', 'progress', 'progress'] as const) : (['cell'] as const);
  const cell = fc.record({
    kind: fc.constantFrom(...kinds),
    picks: fc.array(fc.nat(), { minLength: 1, maxLength: 3 }),
    factor: fc.integer({ min: 1, max: 3 }),
    coarse: fc.constantFrom(2, 3, 7, 1000),
    failsAt: fc.constantFrom(-1, -1, -1, 1),
    handsOn: fc.boolean(),
  });
  return fc
    .record({
      inputs: fc.array(fc.nat(9), { minLength: 1, maxLength: 3 }),
      cells: fc.array(cell, { minLength: 1, maxLength: most }),
    })
    .map(({ inputs, cells }) => ({
      inputs,
      cells: cells.map(({ picks, ...rest }, i) => ({
        ...rest,
        uses: [...new Set(picks.map((pick) => pick % (inputs.length + i)))],
      })),
    }));
}

export const inputName = (i: number): string => `in${i}`;
export const cellName = (i: number): string => `c${i}`;

/** The value of a cell from the values it uses; throws where the cell is made to fail. */
export function formula(cell: RandomCell, values: readonly number[], name: string): number {
  const value = values.reduce((sum, x, i) => sum + cell.factor * (i + 1) * x, 1) % cell.coarse;
  if (value === cell.failsAt) throw new RangeError(`${name} fails`);
  return value;
}

/** The whole graph worked out plainly, without a cache: inputs first, then cells. */
export function plainAnswers(graph: RandomGraph, inputs: readonly number[]): readonly Answer[] {
  const answers: Answer[] = inputs.map((value) => ({ value }));
  graph.cells.forEach((cell, i) => {
    const used = cell.uses.map((k) => answers[k]!);
    const failed = used.find((answer) => 'failed' in answer);
    if (failed) {
      answers.push(failed);
      return;
    }
    try {
      const values = used.map((answer) => (answer as { value: number }).value);
      answers.push({ value: formula(cell, values, cellName(i)) });
    } catch {
      answers.push({ failed: cellName(i) });
    }
  });
  return answers;
}
