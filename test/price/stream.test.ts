import { expect, it } from 'vitest';
import { uniformStream } from '../../lib/price/stream.ts';

const take = (count: number, seed: number, name: string): number[] => {
  const next = uniformStream(seed, name);
  return Array.from({ length: count }, () => next());
};

it('uniformStream(seed, name) repeats, and differs by seed and by name', () => {
  expect(take(20, 7, 'a')).toEqual(take(20, 7, 'a'));
  expect(take(20, 7, 'a')).not.toEqual(take(20, 8, 'a'));
  expect(take(20, 7, 'a')).not.toEqual(take(20, 7, 'b'));
});

it('uniformStream(seed, name) stays inside (0, 1) and is even: chi-square of 20 cells below its 99.9 % point', () => {
  const U = take(20_000, 42, 'even');
  expect(Math.min(...U)).toBeGreaterThan(0);
  expect(Math.max(...U)).toBeLessThan(1);
  const cells = new Array<number>(20).fill(0);
  for (const u of U) cells[Math.floor(u * 20)]!++;
  const chi = cells.reduce((sum, n) => sum + (n - 1000) ** 2 / 1000, 0);
  // 99.9 % point of chi-square with 19 degrees of freedom, statistical tables: 43.82.
  expect(chi).toBeLessThan(43.82);
});

it('uniformStream(seed, name) of neighbouring seeds and of different names are uncorrelated', () => {
  const pairs: [number[], number[]][] = [
    [take(10_000, 1, 'a'), take(10_000, 2, 'a')],
    [take(10_000, 1, 'driver market'), take(10_000, 1, 'driver steel')],
    [take(10_000, 1, 'item a'), take(10_001, 1, 'item a').slice(1)],
  ];
  // Correlation of independent pairs has a standard deviation of 1 / sqrt(n) = 0.01.
  for (const [a, b] of pairs) expect(Math.abs(correlation(a, b))).toBeLessThan(0.04);
});

function correlation(a: readonly number[], b: readonly number[]): number {
  const mean = (v: readonly number[]): number => v.reduce((s, x) => s + x, 0) / v.length;
  const [ma, mb] = [mean(a), mean(b)];
  let [ab, aa, bb] = [0, 0, 0];
  a.forEach((x, k) => {
    ab += (x - ma) * (b[k]! - mb);
    aa += (x - ma) ** 2;
    bb += (b[k]! - mb) ** 2;
  });
  return ab / Math.sqrt(aa * bb);
}
