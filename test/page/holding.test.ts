import { describe, expect, it } from 'vitest';
import { followHold, inputsOf } from '../../notebooks/page/holding.ts';
import { graph } from '../../notebooks/reactive/index.ts';

/** Two inputs, what is made from one of them by two steps, and what is made from the other. */
function made() {
  const g = graph();
  const brief = g.input('brief', 1);
  const rates = g.input('rates', 1);
  const held = g.input<readonly string[]>('held', []);
  const site = g.cell('site', { brief }, (v) => v.brief);
  const depth = g.cell('depth', { site }, (v) => v.site);
  const price = g.cell('price', { rates }, (v) => v.rates);
  return { g, brief, held, depth, price };
}

describe('inputsOf', () => {
  it('inputsOf(graph, cells) follows every step up to the inputs, and no further down', () => {
    const { g, depth, price } = made();
    expect([...inputsOf(g, [depth])]).toEqual(['brief']);
    expect([...inputsOf(g, [depth, price])]).toEqual(['brief', 'rates']);
    expect([...inputsOf(g, [])]).toEqual([]);
  });
});

describe('followHold', () => {
  it('tells when what a cell is made from becomes held and when it is so no more, and of nothing else', () => {
    const { g, held, depth, price } = made();
    const told: string[] = [];
    const below = followHold(g, held, [depth], [], () => told.push('depth'));
    const beside = followHold(g, held, [price], [], () => told.push('price'));
    const set = (names: readonly string[]): void => g.batch(() => g.set(held, names));
    set(['brief']);
    expect([below.isHeld(), beside.isHeld()]).toEqual([true, false]);
    set(['brief', 'rates']);
    expect([below.isHeld(), beside.isHeld()]).toEqual([true, true]);
    set([]);
    expect([below.isHeld(), beside.isHeld()]).toEqual([false, false]);
    expect(told).toEqual(['depth', 'price', 'depth', 'price']);
  });

  it('is not held by what is shown as it is typed', () => {
    const { g, brief, held, depth } = made();
    const fields = followHold(g, held, [brief, depth], [brief], () => undefined);
    g.batch(() => g.set(held, ['brief']));
    expect(fields.isHeld()).toBe(false);
  });
});
