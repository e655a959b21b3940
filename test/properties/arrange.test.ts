import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { arrange, type ArrangeRequest } from '../../lib/arrange/index.ts';
import type { CostTable, Site, Unit } from '../../lib/model/index.ts';
import { abutmentWindows, standBetween } from '../../lib/site/index.ts';
import { demoRequests } from '../arrange/demoRequests.ts';
import { demoSite, mirroredSite, type DemoZone } from '../arrange/demoSite.ts';
import { demoTable } from '../arrange/demoTable.ts';

const zones = (most: number): fc.Arbitrary<DemoZone[]> =>
  fc
    .array(
      fc.tuple(
        fc.double({ min: 0.05, max: 0.85, noNaN: true }),
        fc.double({ min: 0.005, max: 0.1, noNaN: true }),
      ),
      {
        maxLength: most,
      },
    )
    .map((list) => list.map(([from, width]): DemoZone => [from, from + width]));

/** Random crossings for some of the requests: hard and soft zones anywhere, lengths on and off the metre. */
function crossing(requests: readonly ArrangeRequest[], longestM: number) {
  return fc
    .record({
      lengthM: fc.oneof(
        fc.integer({ min: 30, max: longestM }),
        fc.double({ min: 30, max: longestM, noNaN: true }),
      ),
      hard: zones(5),
      soft: zones(2),
      phase: fc.double({ min: 0, max: 6, noNaN: true }),
      request: fc.constantFrom(...requests),
    })
    .map(({ lengthM, hard, soft, phase, request }) => {
      const scaled = (list: DemoZone[]): DemoZone[] =>
        list.map(([from, to]) => [from * lengthM, to * lengthM]);
      const site = demoSite(lengthM, scaled(hard), scaled(soft));
      const table = demoTable((x) => 250_000 + 80_000 * Math.sin(x / 17 + phase) + 300 * x);
      return { site, table, request };
    });
}

const short = crossing(demoRequests.slice(0, 2), 150);
const long = crossing(demoRequests.slice(0, 2), 320);
const withApproaches = crossing(demoRequests.slice(2), 220);

function spansOf(unit: Unit): number[] {
  return unit.supportsM.slice(1).map((x, i) => x - unit.supportsM[i]!);
}

/** Asks the arrangement itself, without help from the library, whether it keeps every limit of a continuous unit. */
function keepsWindows(spans: readonly number[], windows: ArrangeRequest['windows']): boolean {
  const longest = Math.max(...spans);
  if (longest > windows.maxSpanM + 1e-4 || longest < windows.minSpanM - 1e-4) return false;
  const [least, most] = windows.endRatio!;
  if (spans.length === 1) return true;
  if (spans.length === 2) return Math.min(...spans) / longest >= least - 1e-4;
  const ratios = [spans[0]! / spans[1]!, spans.at(-1)! / spans.at(-2)!];
  return ratios.every((ratio) => ratio >= least - 1e-4 && ratio <= most + 1e-4);
}

function mirroredTable(table: CostTable, site: Site): CostTable {
  return {
    ...table,
    support: (form, x, left, right) => table.support(form, site.startM + site.endM - x, right, left),
  };
}

function expectLawful({
  site,
  table,
  request,
}: {
  site: Site;
  table: CostTable;
  request: ArrangeRequest;
}): number {
  const { arrangements } = arrange(request, site, table);
  for (const { units } of arrangements) {
    for (const x of units.flatMap(({ supportsM }) => supportsM)) {
      if (x === site.startM || x === site.endM) continue;
      for (const { fromM, toM, hard } of site.zones) {
        const half = request.pierHalfWidthM - 1e-5;
        if (hard) expect(x <= fromM - half || x >= toM + half).toBe(true);
      }
    }
    expect(units.flatMap(spansOf).reduce((a, b) => a + b, 0)).toBeCloseTo(site.lengthM, 5);
    units.slice(1).forEach((unit, i) => expect(unit.supportsM[0]).toBe(units[i]!.supportsM.at(-1)));
    for (const unit of units) {
      if (unit.role === 'approach') expect(keepsWindows(spansOf(unit), request.approach!)).toBe(true);
      else if (request.pattern.kind === 'continuous')
        expect(keepsWindows(spansOf(unit), request.windows)).toBe(true);
    }
  }
  return arrangements.length;
}

function expectMirrored({
  site,
  table,
  request,
}: {
  site: Site;
  table: CostTable;
  request: ArrangeRequest;
}): void {
  const turn = (x: number): number => site.startM + site.endM - x;
  const there = arrange(request, site, table).arrangements;
  const back = arrange(request, mirroredSite(site), mirroredTable(table, site)).arrangements;
  expect(back.length).toBe(there.length);
  there.forEach(({ units }, i) => {
    const turned = [...back[i]!.units].reverse();
    expect(turned.map(({ form }) => form)).toEqual(units.map(({ form }) => form));
    units.forEach(({ supportsM }, u) => {
      const other = [...turned[u]!.supportsM].reverse().map(turn);
      expect(other.length).toBe(supportsM.length);
      supportsM.forEach((x, s) => expect(other[s]).toBeCloseTo(x, 5));
    });
  });
}

describe('arrange on random crossings', () => {
  it.each([
    ['continuous units on up to 150 m', short, 2500],
    ['continuous units on up to 320 m', long, 200],
    ['units with approaches', withApproaches, 200],
  ] as const)(
    'arrange never puts a support of %s in a hard zone and keeps every window',
    (_, crossings, numRuns) => {
      let found = 0;
      fc.assert(
        fc.property(crossings, (given) => {
          found += expectLawful(given);
        }),
        { seed: 20260110, numRuns },
      );
      // The property would say nothing if hardly anything were found.
      expect(found).toBeGreaterThan(numRuns);
    },
    120_000,
  );

  it.each([
    ['continuous units on up to 150 m', short, 250],
    ['continuous units on up to 320 m', long, 50],
    ['units with approaches', withApproaches, 60],
  ] as const)(
    'arrange of a mirrored crossing mirrors %s',
    (_, crossings, numRuns) => {
      fc.assert(fc.property(crossings, expectMirrored), { seed: 20260111, numRuns });
    },
    120_000,
  );

  it('arrange never puts a support in a hard zone, nor a zone behind an abutment, wherever abutments stand in their windows', () => {
    const share = fc.double({ min: 0, max: 1, noNaN: true });
    const windows = fc.record({ start: share, end: share, startAt: share, endAt: share });
    let found = 0;
    let moved = 0;
    fc.assert(
      fc.property(
        fc.oneof({ weight: 9, arbitrary: short }, { weight: 1, arbitrary: withApproaches }),
        windows,
        ({ site, table, request }, given) => {
          // As far in as two windows of a random width each, both less than half the crossing.
          const room = (part: number): number => 0.49 * part * site.lengthM;
          const windowed: Site = {
            ...site,
            windows: {
              startLatestM: site.startM + room(given.start),
              endEarliestM: site.endM - room(given.end),
            },
          };
          const { start, end } = abutmentWindows(windowed, request.pierHalfWidthM);
          const startM = start[0] + given.startAt * (start[1] - start[0]);
          const endM = end[1] - given.endAt * (end[1] - end[0]);
          if (startM > start[0] || endM < end[1]) moved += 1;
          for (const { fromM, toM } of site.zones) {
            // What reaches over an end of the crossing is the brief's, and leaves that abutment no window.
            const isBuried = (a: number, b: number): boolean => toM > a + 1e-9 && fromM < b - 1e-9;
            expect(isBuried(site.startM, startM)).toBe(false);
            expect(isBuried(endM, site.endM)).toBe(false);
          }
          found += expectLawful({ site: standBetween(windowed, startM, endM), table, request });
        },
      ),
      { seed: 20260112, numRuns: 3000 },
    );
    expect(found).toBeGreaterThan(3000);
    expect(moved).toBeGreaterThan(1000);
  }, 120_000);
});
