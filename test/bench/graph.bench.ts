import { bench, describe } from 'vitest';
import { graph } from '../../notebooks/reactive/index.ts';
import type { Cell } from '../../notebooks/reactive/index.ts';

/** A page's worth of cells: a layered graph of 50, each using two above, with every tenth coarse enough to cut off. */
function page(slow: boolean) {
  const g = graph();
  const width = g.input('width', 0);
  const all: Cell<number>[] = [width];
  for (let i = 1; i < 50; i += 1) {
    const above = all[Math.max(0, i - 1 - (i % 4))]!;
    const further = all[Math.floor(i / 2)]!;
    const coarse = i % 10 === 0 ? 16 : 1;
    all.push(g.cell(`c${i}`, { above, further }, (v) => Math.floor((v.above + v.further) / coarse)));
  }
  if (slow) {
    g.slow('totals', { last: all.at(-1)! }, ({ last }) => Promise.resolve(last), { policy: 'progress' });
  }
  g.view({ width, last: all.at(-1)! }, () => undefined);
  g.batch(() => undefined);
  return { g, width };
}

describe('drag of 1000 steps through 50 cells', () => {
  bench('cells on the page only', () => {
    const { g, width } = page(false);
    for (let step = 1; step <= 1000; step += 1) g.batch(() => g.set(width, step));
    g.dispose();
  });

  bench('with a slow cell at the end, settled after the release', async () => {
    const { g, width } = page(true);
    for (let step = 1; step <= 1000; step += 1) {
      g.batch(() => g.set(width, step));
      if (step % 16 === 0) await Promise.resolve();
    }
    await g.settled();
    g.dispose();
  });
});
