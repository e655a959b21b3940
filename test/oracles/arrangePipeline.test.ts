/**
 * Brute force through the whole pipeline: every arrangement of a continuous form on a coarse grid of places is sized at its
 * depth of least cost, stood on its supports, measured and priced at mean rates, and none may be cheaper than the best
 * proposal. The grid holds the edges of the barred stretches, where piers of long spans stand.
 */
import { describe, expect, it } from 'vitest';
import { finish } from '../../lib/appraise/work.ts';
import { workbench, type Workbench } from '../../lib/appraise/workbench.ts';
import { proposalsFor } from '../../lib/appraise/proposals.ts';
import { PIER_HALF_WIDTH_M } from '../../lib/appraise/requestFor.ts';
import { workOption } from '../../lib/appraise/cheapestOption.ts';
import type { FormId, MethodId } from '../../lib/model/index.ts';
import { expectedLines } from '../../lib/substructure/index.ts';
import { lowFerry } from '../appraise/studies.ts';

const GRID_M = 5;

/** Cost of the whole crossing at mean rates, worked out by every stage. */
function fullCost(bench: Workbench, form: FormId, method: MethodId, supportsM: readonly number[]): number {
  const units = [{ form, role: 'main', supportsM } as const];
  // Plain girders: the arrangement is looked at, not how its girders are made.
  const option = { number: 1, form, method, units, depthM: null, variant: {}, origin: 'kept' } as const;
  const { lines, supports } = finish(workOption(bench, option));
  const feet = supports.flatMap((support) => expectedLines({ ...support, lines: [] }));
  return bench.costOf([...lines, ...feet]);
}

function places({ site }: Workbench): number[] {
  const { startM, endM, lengthM, zones } = site;
  const steps = Math.round(lengthM / GRID_M);
  const grid = Array.from({ length: steps - 1 }, (_, i) => startM + ((i + 1) * lengthM) / steps);
  const barred = zones
    .filter(({ hard }) => hard)
    .map(({ fromM, toM }) => [fromM - PIER_HALF_WIDTH_M, toM + PIER_HALF_WIDTH_M] as const);
  const edges = barred.flat();
  return [...grid.filter((x) => barred.every(([from, to]) => x < from || x > to)), ...edges]
    .filter((x) => x > startM && x < endM)
    .sort((a, b) => a - b);
}

/** Every row of spans within the band whose end spans are 0.5 to 1 of their neighbours and inner ones half of the longest. */
function* rows(at: readonly number[], startM: number, endM: number, mostM: number): Generator<number[]> {
  const grow = function* (row: number[]): Generator<number[]> {
    const last = row.at(-1)!;
    if (endM - last <= mostM) yield [...row, endM];
    for (const x of at) if (x > last + 10 && x - last <= mostM) yield* grow([...row, x]);
  };
  for (const row of grow([startM])) {
    const spans = row.slice(1).map((x, i) => x - row[i]!);
    if (spans.length < 3) continue;
    const ends = [spans[0]! / spans[1]!, spans.at(-1)! / spans.at(-2)!];
    const inner = spans.slice(1, -1);
    if (ends.every((r) => r >= 0.5 && r <= 1) && Math.min(...inner) >= 0.5 * Math.max(...spans)) yield row;
  }
}

describe('proposals against brute force through the whole pipeline', { timeout: 120_000 }, () => {
  it.each<[FormId, number]>([
    ['composite-i', 110],
    ['concrete-box', 83],
  ])('nothing on a grid of 5 m is cheaper than the best proposal of %s', (form, mostM) => {
    const bench = workbench(lowFerry());
    const { arrangements } = finish(proposalsFor(bench, form));
    const { method } = arrangements[0]!;
    const proposed = Math.min(
      ...arrangements.map(({ method: own, units }) => fullCost(bench, form, own, units[0]!.supportsM)),
    );
    const { startM, endM } = bench.site;
    const all = [...rows(places(bench), startM, endM, mostM)];
    expect(all.length).toBeGreaterThan(20);
    const least = Math.min(...all.map((row) => fullCost(bench, form, method, row)));
    expect(proposed).toBeLessThanOrEqual(least);
  });
});
