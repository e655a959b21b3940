import { describe, expect, expectTypeOf, it } from 'vitest';
import { graph } from '../../notebooks/reactive/index.ts';
import type { Cell, Input, Progress, State } from '../../notebooks/reactive/index.ts';

describe('types of the graph', () => {
  it('cell() and slow() hand a run exactly the values of what it uses', async () => {
    const g = graph();
    const width = g.input('width', 12);
    const spans = g.input<readonly number[]>('spans', [60, 80, 60]);
    expectTypeOf(width).toEqualTypeOf<Input<number>>();

    const area = g.cell('area', { width, spans }, (values) => {
      expectTypeOf(values).branded.toEqualTypeOf<{
        readonly width: number;
        readonly spans: readonly number[];
      }>();
      return values.spans.reduce((sum, span) => sum + span, 0) * values.width;
    });
    expectTypeOf(area).toEqualTypeOf<Cell<number>>();

    const words = g.slow(
      'words',
      { figure: area },
      async ({ figure }, { signal, report }) => {
        expectTypeOf(figure).toEqualTypeOf<number>();
        expectTypeOf(signal).toEqualTypeOf<AbortSignal>();
        expectTypeOf(report).toEqualTypeOf<(progress: Progress) => void>();
        return Promise.resolve(`${figure} m²`);
      },
      { policy: 'progress', equal: (a, b) => a.length === b.length },
    );
    expectTypeOf(words).toEqualTypeOf<Cell<string>>();

    g.view({ width, words }, (state) => {
      if (state.state !== 'ready') return;
      expectTypeOf(state.value).branded.toEqualTypeOf<{ readonly width: number; readonly words: string }>();
    });
    await g.settled();
    expectTypeOf(g.state(words)).toEqualTypeOf<State<string>>();
    expect(g.state(words)).toEqual({ state: 'ready', value: '2400 m²' });
  });

  it('wrong uses, values and settings do not compile', () => {
    const g = graph();
    const width = g.input('width', 12);
    const area = g.cell('area', { width }, (values) => values.width * 2);
    const wrong = (): void => {
      // @ts-expect-error -- a word for a number
      g.set(width, 'wide');
      // @ts-expect-error -- only inputs are set
      g.set(area, 3);
      // @ts-expect-error -- not among what it uses
      g.cell('a', { width }, ({ depth }) => typeof depth);
      // @ts-expect-error -- a value is not a cell
      g.cell('b', { width: 12 }, (values) => values.width);
      // @ts-expect-error -- a slow cell declares its policy
      g.slow('c', { width }, (values) => values.width, {});
      // @ts-expect-error -- only two policies
      g.slow('d', { width }, (values) => values.width, { policy: 'soon' });
      // @ts-expect-error -- a pending cell may have no value
      g.state(area).value.toFixed();
    };
    expectTypeOf(wrong).toBeFunction();
    expect(g.cells()).toHaveLength(2);
  });

  it('a cell of a narrower type stands in for one of a wider type, not the other way round', () => {
    expectTypeOf<Cell<60>>().toExtend<Cell<number>>();
    expectTypeOf<Cell<number>>().not.toExtend<Cell<60>>();
    expectTypeOf<Input<number>>().toExtend<Cell<unknown>>();
    expectTypeOf<Cell<number>>().not.toExtend<Input<number>>();
  });
});
