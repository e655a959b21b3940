import { describe, expect, it } from 'vitest';
import { arrange, faultsOf, governingSpan, tableCost, type ArrangeRequest } from '../../lib/arrange/index.ts';
import { survey } from '../../lib/site/index.ts';
import type { Arrangement, Unit } from '../../lib/model/index.ts';
import { lowFerry } from '../site/demoBrief.ts';
import { demoRequests } from './demoRequests.ts';
import { demoSite, type DemoZone } from './demoSite.ts';
import { demoTable } from './demoTable.ts';

const [composite, , truss, stayed] = demoRequests as readonly [
  ArrangeRequest,
  ArrangeRequest,
  ArrangeRequest,
  ArrangeRequest,
];

function spansOf(unit: Unit): number[] {
  return unit.supportsM.slice(1).map((x, i) => x - unit.supportsM[i]!);
}

function allSpans(arrangement: Arrangement): number[] {
  return arrangement.units.flatMap(spansOf);
}

function main(arrangement: Arrangement): Unit {
  return arrangement.units.find(({ role }) => role === 'main')!;
}

describe('arrange where nothing is barred', () => {
  it.each([truss, stayed])('arrange($form) puts the main span over the deepest place', (request) => {
    const level = demoSite(300);
    const site = { ...level, groundX: [0, 60, 180, 220, 300], groundZ: [20, 12, 0, 0, 20] };
    const { arrangements } = arrange(request, site, demoTable());
    expect(arrangements.length).toBeGreaterThan(0);
    for (const arrangement of arrangements) {
      const { supportsM, pylons = [] } = main(arrangement);
      const [first, last] = [supportsM[0]!, supportsM.at(-1)!];
      // Beside one pylon both spans are about as long; of two the main span is that between them.
      const [from, to] = pylons.length === 2 ? pylons.map((i) => supportsM[i]!) : [first, last];
      // The floor of the valley reaches from 180 to 220 m: supports may be moved along it where that is cheaper.
      expect(from!).toBeLessThan(220);
      expect(to!).toBeGreaterThan(180);
    }
  });
});

describe('arrange on the worked example', () => {
  const site = survey(lowFerry().brief);
  const table = demoTable();

  it.each(demoRequests)(
    'arrange($form) finds different arrangements that fill the crossing and break no limit',
    (request) => {
      const { arrangements, dropped, relaxations } = arrange(request, site, table);
      expect(arrangements.length).toBeGreaterThanOrEqual(1);
      expect(arrangements.length).toBeLessThanOrEqual(3);
      expect(relaxations).toEqual([]);
      for (const arrangement of arrangements) {
        expect(allSpans(arrangement).reduce((a, b) => a + b, 0)).toBeCloseTo(230, 6);
        expect(arrangement.units[0]!.supportsM[0]).toBe(1240);
        expect(arrangement.units.at(-1)!.supportsM.at(-1)).toBe(1470);
        expect(faultsOf(arrangement.units, request, site)).toEqual([]);
        expect(arrangement.tableCost).toBeCloseTo(tableCost(arrangement.units, table), 6);
      }
      const kinds = arrangements.map(
        (a) => `${allSpans(a).length} ${a.units.flatMap((u) => u.pylons ?? []).length}`,
      );
      expect(new Set(kinds).size).toBe(kinds.length);
      const costs = arrangements.map((a) => a.tableCost);
      expect(costs).toEqual([...costs].sort((a, b) => a - b));
      for (const { form, reason, count } of dropped) {
        expect(form).toBe(request.form);
        expect(reason).not.toBe('');
        expect(count).toBeGreaterThan(0);
      }
    },
  );

  it('arrange(truss) puts one simple span over the river and approaches of the other form beside it', () => {
    for (const arrangement of arrange(truss, site, table).arrangements) {
      const unit = main(arrangement);
      expect(unit.supportsM).toHaveLength(2);
      expect(unit.supportsM[0]).toBeLessThanOrEqual(1325 - 1.25);
      expect(unit.supportsM[1]).toBeGreaterThanOrEqual(1385 + 1.25);
      for (const other of arrangement.units) if (other !== unit) expect(other.form).toBe('composite-i');
    }
  });

  it('arrange(cable-stayed) names the pylons of the main unit and keeps their ratios', () => {
    for (const arrangement of arrange(stayed, site, table).arrangements) {
      const { pylons, supportsM } = main(arrangement);
      expect(pylons!.length).toBeGreaterThanOrEqual(1);
      const [first, last] = [supportsM[pylons![0]!]!, supportsM[pylons!.at(-1)!]!];
      const sides = [first - supportsM[0]!, supportsM.at(-1)! - last];
      const span = pylons!.length === 1 ? Math.max(...sides) : last - first;
      const back = Math.min(...sides) / span;
      const [least, most] = pylons!.length === 1 ? [0.5, 0.9] : [0.35, 0.5];
      expect(back).toBeGreaterThanOrEqual(least - 1e-6);
      expect(back).toBeLessThanOrEqual(most + 1e-6);
    }
  });

  it('arrange counts what it drops by reason, the river and the railway by name', () => {
    const reasons = arrange(composite, site, table).dropped.map(({ reason }) => reason);
    expect(reasons).toContain('support in a barred stretch: River Wend');
    expect(reasons).toContain('support in a barred stretch: Low Ferry branch, single track');
    expect(reasons).toContain('dearer than one kept with as many supports');
  });

  it('arrange gives the same answer twice', () => {
    for (const request of demoRequests)
      expect(arrange(request, site, table)).toEqual(arrange(request, site, table));
  });
});

describe('arrange', () => {
  it('arrange(short crossing) needs no pier, and one span is all there is', () => {
    const { arrangements } = arrange(
      composite,
      demoSite(40),
      demoTable(() => 1e7),
    );
    expect(arrangements[0]!.units).toEqual([{ form: 'composite-i', role: 'main', supportsM: [0, 40] }]);
  });

  it('arrange(simple main span over a whole crossing) has no approaches', () => {
    const { arrangements } = arrange(truss, demoSite(60, [[2, 58]]), demoTable());
    expect(arrangements.map(({ units }) => units)).toEqual([
      [{ form: 'truss', role: 'main', supportsM: [0, 60] }],
    ]);
  });

  it('arrange(cheap two-pylon table) lays out two pylons with side spans about the opening', () => {
    const request: ArrangeRequest = { ...stayed, windows: { ...stayed.windows, minSpanM: 200 } };
    const { arrangements } = arrange(request, demoSite(440, [[110, 330]]), demoTable());
    const two = arrangements.map(main).find(({ pylons }) => pylons!.length === 2)!;
    expect(two.supportsM[two.pylons![0]!]).toBeLessThanOrEqual(110 - 1.5 + 1e-6);
    expect(two.supportsM[two.pylons![1]!]).toBeGreaterThanOrEqual(330 + 1.5 - 1e-6);
  });

  it('arrange stands in a soft zone only where that saves more than what the table asks for it', () => {
    // 100 m in two equal spans wants its pier at 50; the soft stretch makes it dearer there.
    const request: ArrangeRequest = {
      ...composite,
      windows: { ...composite.windows, minSpanM: 45, maxSpanM: 60 },
      keep: 9,
    };
    const site = demoSite(100, [], [[46, 54]]);
    const pierOf = (premium: number): number =>
      arrange(request, site, {
        ...demoTable(),
        support: (_, x) => 250_000 + (x > 46 && x < 54 ? premium : 0),
      })
        .arrangements.map(({ units }) => units[0]!.supportsM)
        .find(({ length }) => length === 3)![1]!;
    expect(pierOf(250_000)).toSatisfy((x: number) => x <= 46 + 1e-6 || x >= 54 - 1e-6);
    expect(pierOf(2500)).toBeCloseTo(50, 6);
  });

  it('arrange goes where piers are cheap', () => {
    const request: ArrangeRequest = {
      ...composite,
      windows: { ...composite.windows, minSpanM: 40, maxSpanM: 75 },
      keep: 1,
    };
    const dear = demoTable((x) => 200_000 + (x < 52 ? 400_000 : 0));
    expect(
      arrange(request, demoSite(100), dear).arrangements[0]!.units[0]!.supportsM[1],
    ).toBeGreaterThanOrEqual(52);
  });

  it('arrange(nothing fits) says how far a wide stretch has to give way to short spans', () => {
    // 111 m on a crossing of 302.5 m; the longest span is 41 m, half a pier of 1.25 m stands clear on each side.
    const request = { ...composite, windows: { ...composite.windows, minSpanM: 20, maxSpanM: 41 } };
    const site302 = demoSite(302.5, [[95.6, 206.6, 'river']]);
    const zone = arrange(request, site302, demoTable()).relaxations.find(({ what }) => what === 'zone')!;
    expect(zone.to).toBeLessThanOrEqual(38.5);
    expect(zone.to).toBeGreaterThanOrEqual(37.5);
  });

  it('arrange(nothing fits) asks of no stretch to give way that does not stand in the way', () => {
    // The main span goes over the two that overlap, 58 m and half a pier of 1.25 m on each side; the approaches over the rest.
    const zones: DemoZone[] = [
      [60, 90, 'river'],
      [85, 118, 'bank'],
      [150, 155, 'road'],
      [200, 240, 'railway'],
    ];
    const request = { ...truss, windows: { ...truss.windows, maxSpanM: 55 } };
    const { arrangements, relaxations } = arrange(request, demoSite(300, zones), demoTable());
    expect(arrangements).toEqual([]);
    expect(relaxations.map(({ what }) => what)).toContain('longest-span');
    expect(relaxations.map(({ name }) => name)).not.toContain('road');
    expect(relaxations.map(({ name }) => name)).not.toContain('railway');
  });

  it('arrange(nothing fits) says what to relax, smallest change first, and each of them is enough', () => {
    const request: ArrangeRequest = { ...composite, windows: { ...composite.windows, maxSpanM: 60 } };
    const site = demoSite(200, [[70, 130, 'river']]);
    const { arrangements, relaxations } = arrange(request, site, demoTable());
    expect(arrangements).toEqual([]);
    const span = relaxations.find(({ what }) => what === 'longest-span')!;
    // By hand: 60 m of river and half a pier of 1.25 m on each side.
    expect(span.to).toBeGreaterThanOrEqual(62.5);
    expect(span.to).toBeLessThanOrEqual(63.1);
    const zone = relaxations.find(({ what }) => what === 'zone')!;
    expect(zone.name).toBe('river');
    expect(zone.to).toBeLessThanOrEqual(57.5);
    expect(zone.to).toBeGreaterThanOrEqual(56.9);
    const shares = relaxations.map(({ from, to }) => Math.abs(to - from) / from);
    expect(shares).toEqual([...shares].sort((a, b) => a - b));
    const wider = { ...request, windows: { ...request.windows, maxSpanM: span.to } };
    expect(arrange(wider, site, demoTable()).arrangements.length).toBeGreaterThan(0);
  });

  it('arrange refuses reversed windows and missing approach windows', () => {
    const reversed: ArrangeRequest = {
      ...composite,
      windows: { minSpanM: 50, maxSpanM: 40, endRatio: [0.5, 1] },
    };
    expect(() => arrange(reversed, demoSite(100), demoTable())).toThrow(RangeError);
    const { approach, ...bare } = truss;
    expect(approach).toBeDefined();
    expect(() => arrange(bare, demoSite(100), demoTable())).toThrow('windows of the approach form');
  });
});

describe('faultsOf', () => {
  it('faultsOf(dragged pier) names the barred stretch and the window', () => {
    const site = demoSite(100, [[40, 60, 'line']]);
    const units: Unit[] = [{ form: 'composite-i', role: 'main', supportsM: [0, 50, 100] }];
    expect(faultsOf(units, composite, site)).toEqual(['support in a barred stretch: line']);
    const uneven: Unit[] = [{ form: 'composite-i', role: 'main', supportsM: [0, 30, 100] }];
    expect(faultsOf(uneven, composite, site)).toEqual(['end span outside its window']);
  });
});

describe('governingSpan', () => {
  it('governingSpan(unit) is its longest span', () => {
    expect(governingSpan({ form: 'truss', role: 'main', supportsM: [0, 30, 75, 100] })).toBe(45);
  });
});

describe('economic span', () => {
  it.each([
    [100, 250_000],
    [150, 240_000],
    [80, 512_000],
  ])('arrange lands near sqrt(P/b) for b %d and P %d and within 0.5 % of brute force', (b, P) => {
    // Span cost a + b L per metre and pier cost P: cost per metre a + b L + P/L is least at L = sqrt(P/b).
    const table = {
      deckPerM: (_: string, __: number, G: number) => 5000 + b * G,
      depthM: () => 2,
      unitFixed: () => 0,
      support: () => P,
    };
    const request: ArrangeRequest = {
      ...composite,
      windows: { minSpanM: 20, maxSpanM: 150, endRatio: [0.5, 1] },
    };
    const lengthM = 640;
    const [best] = arrange(request, demoSite(lengthM), table).arrangements;
    // Brute force over the number of even spans; on a grid of 1 m the longest of n spans is a whole metre.
    let even = Infinity;
    for (let n = 1; n <= 32; n += 1) {
      even = Math.min(even, lengthM * (5000 + b * Math.ceil(lengthM / n)) + (n - 1) * P);
    }
    expect(Math.abs(best!.tableCost / even - 1)).toBeLessThan(0.005);
    const mean = lengthM / allSpans(best!).length;
    // Within 10 % of it the cost differs by less than 0.3 %.
    expect(Math.abs(mean / Math.sqrt(P / b) - 1)).toBeLessThan(0.1);
  });
});
