import { describe, expect, it } from 'vitest';
import { approachesTo } from '../../lib/arrange/approaches.ts';
import { supportCosts } from '../../lib/arrange/curves.ts';
import { frameOf } from '../../lib/arrange/frame.ts';
import { limitsOf, spanFault, spansAlong } from '../../lib/arrange/limits.ts';
import { searchUnit } from '../../lib/arrange/unitSearch.ts';
import { demoSite, type DemoZone } from './demoSite.ts';
import { demoTable } from './demoTable.ts';

const crossings: readonly (readonly [lengthM: number, zones: readonly DemoZone[]])[] = [
  [160, []],
  [
    300,
    [
      [40, 75],
      [120, 131],
      [200, 240.5],
    ],
  ],
  [
    420.7,
    [
      [18, 44],
      [101, 150],
      [260, 275],
      [330, 371],
    ],
  ],
  [
    900,
    [
      [100, 160],
      [300, 340],
      [420, 480],
      [700, 745],
    ],
  ],
];

describe.each(crossings)('approaches on %d m', (lengthM, zones) => {
  const form = 'composite-i' as const;
  const limits = limitsOf({ minSpanM: 20, maxSpanM: 90, endRatio: [0.55, 0.9] });
  const table = demoTable((x) => 250_000 + 200_000 * Math.sin(x / 60));
  const frame = frameOf(demoSite(lengthM, zones), 1.25, form, table, 30);
  const { X } = frame;
  const supports = supportCosts(table, form, frame, 11, 90);
  const last = X.length - 1;

  /** Least cost of every number of spans to every end, with nothing left out. */
  const all = X.reduce<Map<number, number>[]>((maps) => [...maps, new Map<number, number>()], []);
  const task = {
    form,
    X,
    firstEnd: 1,
    lastEnd: last,
    limits,
    supports,
    endIsPier: true,
    wantedUpTo: () => Infinity,
  };
  searchUnit(task, table, (end, spans, _, cost, trace) => {
    if (spanFault(spansAlong(X, trace()()), limits) !== null) return true;
    all[end]!.set(spans, Math.min(cost, all[end]!.get(spans) ?? Infinity));
    return true;
  });

  it('leave out nothing that is among the three cheapest', () => {
    const kept = approachesTo(form, X, 1, last, limits, supports, table, false);
    expect(all.filter((costs) => costs.size > 3).length).toBeGreaterThan(20);
    for (const [end, costs] of all.entries()) {
      const three = [...costs].sort((a, b) => a[1] - b[1] || a[0] - b[0]).slice(0, 3);
      expect(kept[end]!.map(({ spans }) => spans)).toEqual(three.map(([spans]) => spans));
      kept[end]!.forEach(({ cost }, i) => expect(cost).toBeCloseTo(three[i]![1], 4));
    }
  });

  it('are found to the same ends where any will do', () => {
    const any = approachesTo(form, X, 1, last, limits, supports, table, true);
    expect(any.map((list) => list.length)).toEqual(all.map(({ size }) => Math.min(1, size)));
  });
});
