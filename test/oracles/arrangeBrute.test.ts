/**
 * Brute force on a coarse crossing: a few dozen metres on the grid of 1 m, with spans of a few metres, so that every
 * arrangement can be listed. Nothing of the search is used but its result and the cost table.
 */
import { describe, expect, it } from 'vitest';
import { arrange, type ArrangeRequest } from '../../lib/arrange/index.ts';
import type { CostTable, FormId } from '../../lib/model/index.ts';
import { demoSite, type DemoZone } from '../arrange/demoSite.ts';

const rates: Readonly<Partial<Record<FormId, readonly [a: number, b: number, fixed: number]>>> = {
  'composite-i': [100, 9, 40],
  truss: [130, 5, 60],
  'cable-stayed': [150, 4, 150],
};

function tableFor({ phase, endWorksAs = 1, aloneWorksAs = 1 }: Case): CostTable {
  const rate = (form: FormId): readonly [number, number, number] => rates[form]!;
  return {
    deckPerM: (form, span, governing) => rate(form)[0] + rate(form)[1] * (0.7 * governing + 0.3 * span),
    endWorksAs: (form) => (form === 'composite-i' ? endWorksAs : 1),
    aloneWorksAs: (form) => (form === 'composite-i' ? aloneWorksAs : 1),
    depthM: () => 1,
    unitFixed: (form, _, pylons = 0) => rate(form)[2] * Math.max(pylons, 1),
    support: (_, x, left, right) => 220 + 90 * Math.sin(x / 3 + phase) + 6 * (left + right),
  };
}

interface Case {
  readonly lengthM: number;
  readonly hard: readonly DemoZone[];
  readonly phase: number;
  /** Inner span that an end span of a continuous unit works like; itself unless given. */
  readonly endWorksAs?: number;
  /** The same of a span that stands alone. */
  readonly aloneWorksAs?: number;
}

const cases: readonly Case[] = [
  { lengthM: 30, hard: [[12, 18]], phase: 0 },
  {
    lengthM: 34,
    hard: [
      [5, 8],
      [15, 22],
    ],
    phase: 1,
  },
  {
    lengthM: 28,
    hard: [
      [9, 11],
      [14, 21],
    ],
    phase: 2,
  },
  {
    lengthM: 36,
    hard: [
      [6, 8],
      [14, 19],
      [27, 29],
    ],
    phase: 3,
  },
  {
    lengthM: 33,
    hard: [
      [6, 8],
      [14, 19],
    ],
    phase: 4,
    endWorksAs: 1.25,
  },
  { lengthM: 36, hard: [[14, 22]], phase: 5, endWorksAs: 1.2, aloneWorksAs: 1.45 },
];

const halfM = 0.5;
const continuous = { minSpanM: 5, maxSpanM: 14, endRatio: [0.5, 1] } as const;
const approach = { minSpanM: 4, maxSpanM: 12, endRatio: [0.5, 1] } as const;

function allowed({ hard, lengthM }: Case): number[] {
  const places: number[] = [];
  const edges = hard.flatMap(([from, to]) => [from - halfM, to + halfM]);
  const all = [...Array.from({ length: lengthM + 1 }, (_, i) => i), ...edges].sort((a, b) => a - b);
  for (const x of all) {
    if (places.at(-1) === x || x < 0 || x > lengthM) continue;
    if (x === 0 || x === lengthM || hard.every(([from, to]) => x <= from - halfM || x >= to + halfM))
      places.push(x);
  }
  return places;
}

/** Every row of supports from `from` to `to` whose spans keep the windows of a continuous unit. */
function* rows(
  places: readonly number[],
  from: number,
  to: number,
  w: typeof continuous | typeof approach,
): Generator<number[]> {
  const least = w.endRatio[0] * w.minSpanM;
  const grow = function* (row: number[]): Generator<number[]> {
    const last = row.at(-1)!;
    for (const x of places) {
      const span = x - last;
      if (span < least - 1e-9 || span > w.maxSpanM + 1e-9 || x > to) continue;
      if (x === to) yield [...row, x];
      else yield* grow([...row, x]);
    }
  };
  for (const row of grow([from])) {
    const spans = row.slice(1).map((x, i) => x - row[i]!);
    const longest = Math.max(...spans);
    if (longest < w.minSpanM - 1e-9) continue;
    if (spans.length === 2 && Math.min(...spans) < w.endRatio[0] * longest - 1e-9) continue;
    if (spans.length >= 3) {
      const ends = [spans[0]! / spans[1]!, spans.at(-1)! / spans.at(-2)!];
      if (ends.some((r) => r < w.endRatio[0] - 1e-9 || r > w.endRatio[1] + 1e-9)) continue;
      if (Math.min(...spans.slice(1, -1)) < w.endRatio[0] * longest - 1e-9) continue;
    }
    yield row;
  }
}

/** Deck and fixed cost of one unit. */
function unitCost(table: CostTable, form: FormId, row: readonly number[], pylons = 0): number {
  const spans = row.slice(1).map((x, i) => x - row[i]!);
  const governing = Math.max(...spans);
  const hasEnds = spans.length > 1 && pylons === 0;
  const works = (i: number): number =>
    spans.length === 1 && pylons === 0
      ? table.aloneWorksAs!(form, governing)
      : hasEnds && (i === 0 || i === spans.length - 1)
        ? table.endWorksAs!(form, governing)
        : 1;
  return spans.reduce(
    (sum, s, i) => sum + s * table.deckPerM(form, works(i) * s, governing),
    table.unitFixed(form, governing, pylons),
  );
}

function piersCost(table: CostTable, row: readonly number[]): number {
  let sum = 0;
  for (let i = 1; i < row.length - 1; i += 1)
    sum += table.support('truss', row[i]!, row[i]! - row[i - 1]!, row[i + 1]! - row[i]!);
  return sum;
}

/** Cheapest by number of supports. */
class Best {
  readonly byCount = new Map<number, number>();
  offer(count: number, cost: number): void {
    if (cost < (this.byCount.get(count) ?? Infinity)) this.byCount.set(count, cost);
  }
}

/** Cheapest complete crossings with a main unit whose supports are `main`, over every approach on both sides. */
function withApproaches(
  table: CostTable,
  places: readonly number[],
  lengthM: number,
  mainRow: readonly number[],
  form: FormId,
  best: Best,
  pylons = 0,
): void {
  const a = mainRow[0]!;
  const b = mainRow.at(-1)!;
  const lefts = a === 0 ? [[0]] : [...rows(places, 0, a, approach)];
  const rights = b === lengthM ? [[lengthM]] : [...rows(places, b, lengthM, approach)];
  for (const left of lefts) {
    for (const right of rights) {
      const all = [...left.slice(0, -1), ...mainRow, ...right.slice(1)];
      let cost = unitCost(table, form, mainRow, pylons) + piersCost(table, all);
      if (left.length > 1) cost += unitCost(table, 'composite-i', left);
      if (right.length > 1) cost += unitCost(table, 'composite-i', right);
      best.offer(all.length, cost);
    }
  }
}

function widest({ hard }: Case): readonly [number, number] {
  const [from, to] = hard.reduce((a, b) => (b[1] - b[0] > a[1] - a[0] ? b : a));
  return [from - halfM, to + halfM];
}

/** The search may not be dearer than brute force by more than `share`, and never cheaper than everything there is. */
function expectAsGood(
  request: ArrangeRequest,
  given: Case,
  table: CostTable,
  best: Best,
  share: number,
): void {
  const site = demoSite(given.lengthM, given.hard);
  const { arrangements } = arrange({ ...request, keep: 20 }, site, table);
  const cheapest = Math.min(...best.byCount.values());
  expect(arrangements.length).toBeGreaterThan(0);
  expect(arrangements[0]!.tableCost).toBeLessThanOrEqual(cheapest * (1 + share));
  for (const { units, tableCost } of arrangements) {
    const count = units.reduce((sum, unit) => sum + unit.supportsM.length - 1, 1);
    expect(tableCost).toBeGreaterThanOrEqual(best.byCount.get(count)! * (1 - 1e-9));
  }
}

describe('arrange against brute force', () => {
  it.each(cases)(
    'arrange(continuous) on $lengthM m finds the cheapest for every number of supports',
    (given) => {
      const table = tableFor(given);
      const best = new Best();
      for (const row of rows(allowed(given), 0, given.lengthM, continuous)) {
        best.offer(row.length, unitCost(table, 'composite-i', row) + piersCost(table, row));
      }
      const request: ArrangeRequest = {
        form: 'composite-i',
        method: 'crane',
        pattern: { kind: 'continuous' },
        windows: continuous,
        pierHalfWidthM: halfM,
      };
      expectAsGood(request, given, table, best, 0.005);
      const found = arrange(
        { ...request, keep: 20 },
        demoSite(given.lengthM, given.hard),
        table,
      ).arrangements;
      expect(found.length).toBe(best.byCount.size);
      for (const { units, tableCost } of found) {
        const cheapest = best.byCount.get(units[0]!.supportsM.length)!;
        expect(Math.abs(tableCost / cheapest - 1)).toBeLessThan(0.005);
      }
    },
  );

  it.each(cases)('arrange(simple main span) on $lengthM m costs within 0.5 % of it', (given) => {
    const table = tableFor(given);
    const best = new Best();
    const places = allowed(given);
    const [from, to] = widest(given);
    for (const a of places) {
      for (const b of places) {
        if (a <= from && b >= to && b - a >= 8 && b - a <= 16)
          withApproaches(table, places, given.lengthM, [a, b], 'truss', best);
      }
    }
    const request: ArrangeRequest = {
      form: 'truss',
      method: 'float-in',
      pattern: { kind: 'simple-main', approach: 'composite-i' },
      windows: { minSpanM: 8, maxSpanM: 16, endRatio: [0.5, 1] },
      approach,
      pierHalfWidthM: halfM,
    };
    expectAsGood(request, given, table, best, 0.005);
  });

  it.each(cases)('arrange(pylons) on $lengthM m costs within 0.5 % of it', (given) => {
    const table = tableFor(given);
    const best = new Best();
    const places = allowed(given);
    const [from, to] = widest(given);
    const inside = (share: number, [least, most]: readonly [number, number]): boolean =>
      share >= least - 1e-9 && share <= most + 1e-9;
    const one = [0.5, 0.9] as const;
    const two = [0.35, 0.5] as const;
    const offer = (mainRow: readonly number[], pylons: number): void =>
      withApproaches(table, places, given.lengthM, mainRow, 'cable-stayed', best, pylons);
    const least = 0.35 * 8;
    /** Nothing, or one anchor pier, between two supports. */
    const anchors = (from: number, to: number): number[][] => [
      [],
      ...places.filter((x) => x - from >= least && to - x >= least).map((x) => [x]),
    ];
    for (const a of places) {
      for (const b of places) {
        const main = b - a;
        if (!(a <= from && b >= to && main >= 8 && main <= 20)) continue;
        for (const end of places) {
          if (end > b && inside((end - b) / main, one)) {
            for (const anchor of anchors(b, end)) offer([a, b, ...anchor, end], 1);
          }
          if (end < a && inside((a - end) / main, one)) {
            for (const anchor of anchors(end, a)) offer([end, ...anchor, a, b], 1);
          }
          if (!(end < a && inside((a - end) / main, two))) continue;
          for (const far of places) {
            if (!(far > b && inside((far - b) / main, two))) continue;
            for (const before of anchors(end, a)) {
              for (const after of anchors(b, far)) offer([end, ...before, a, b, ...after, far], 2);
            }
          }
        }
      }
    }
    const request: ArrangeRequest = {
      form: 'cable-stayed',
      method: 'stay-cantilever',
      pattern: { kind: 'pylon', approach: 'composite-i', onePylonBack: one, twoPylonSide: two },
      windows: { minSpanM: 8, maxSpanM: 20, endRatio: [0.35, 0.9] },
      approach,
      pierHalfWidthM: halfM,
    };
    expectAsGood(request, given, table, best, 0.005);
  });
});
