import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { RiverGiven, Site } from '../../lib/model/index.ts';
import {
  afflux,
  floodSection,
  flowAt,
  laceyDepth,
  laceyWidth,
  pierScour,
  riversAt,
  scourAt,
  siltFactorOf,
} from '../../lib/river/index.ts';
import { crossing } from '../substructure/crossing.ts';

const given: RiverGiven = {
  floodFromM: 20,
  floodToM: 180,
  freeboardM: 1,
  flowM3s: 600,
  velocityMs: null,
  allowedAffluxM: 0.2,
  grainMm: 1,
  siltFactor: null,
  vesselDwtT: null,
  vesselSpeedMs: null,
};

/** The invented crossing with its brook in flood to level 2: 2 m over the plain, 6 m over the bed. */
function flooded(more: Partial<RiverGiven> = {}, site: Partial<Site> = {}): Site {
  return {
    ...crossing,
    waters: [
      { name: 'Brook', fromM: 80, toM: 120, levelM: -1, floodLevelM: 2, river: { ...given, ...more } },
    ],
    ...site,
  };
}

const pier = (chainageM: number, lengthM = 1.2) => ({
  chainageM,
  kind: 'pier' as const,
  shaft: { lengthM, widthM: 6, columns: 1, concreteM3: 0, reinforcementKg: 0 },
});

describe('afflux', () => {
  it('afflux(3.01, 675.6, 559.4) is 0.239 m as a bridge report has it', () => {
    // Hydraulic report of an Indian bridge (read): V 3.01 m/s, A 675.6 m2, a 559.4 m2, afflux 239 mm.
    expect(afflux(3.01, 675.6, 559.4)).toBeCloseTo(0.239, 3);
  });

  it('afflux(nothing taken away) is 0 and grows without limit as the opening closes', () => {
    expect(afflux(2, 500, 500)).toBe(0);
    expect(afflux(2, 500, 520)).toBe(0);
    expect(afflux(2, 500, 0)).toBe(Infinity);
    expect(afflux(2, 500, 250)).toBeGreaterThan(afflux(2, 500, 400));
  });
});

describe('scour', () => {
  it('pierScour(4.52, 5.334, 7.15) is 10.484 m as a published worked sample has it', () => {
    // HEC-18 sample of a university's hydraulics pages (read): circular pier, clear-water bed, 10.484 m.
    expect(pierScour(4.52, 5.334, 7.15)).toBeCloseTo(10.484, 2);
  });

  it('pierScour(slow and fast) stays within 2.4 and 3 pier widths', () => {
    // HEC-18 limits for round noses along the flow (read in a technical reference).
    fc.assert(
      fc.property(
        fc.double({ min: 0.5, max: 4, noNaN: true }),
        fc.double({ min: 0.3, max: 20, noNaN: true }),
        fc.double({ min: 0.1, max: 9, noNaN: true }),
        (a, y, v) => {
          const most = v / Math.sqrt(9.81 * y) > 0.8 ? 3 : 2.4;
          expect(pierScour(a, y, v)).toBeLessThanOrEqual(most * a + 1e-9);
        },
      ),
      { seed: 6 },
    );
    expect(pierScour(0, 5, 2)).toBe(0);
    expect(pierScour(1, 0, 2)).toBe(0);
  });

  it('laceyDepth(q, f), laceyWidth(Q) and siltFactorOf(d50) are the formulas of Lacey', () => {
    // 1.34 (q^2 / f)^(1/3) in a bridge report (read); 4.8 sqrt(Q) and 1.76 sqrt(d50) from memory.
    expect(laceyDepth(8, 1)).toBeCloseTo(1.34 * 4, 12);
    expect(laceyDepth(8, 8)).toBeCloseTo(1.34 * 2, 12);
    expect(laceyWidth(1684.5)).toBeCloseTo(197, 0);
    expect(siltFactorOf(0.25)).toBeCloseTo(0.88, 12);
  });

  it('scourAt(flow) never falls as the flow rises, and a finer bed scours deeper', () => {
    const at = (flowM3s: number, grainMm = 1): number => {
      const flow = flowAt(flooded({ flowM3s, grainMm }), 100)!;
      return scourAt(flow, 1.2, 1);
    };
    const depths = [50, 100, 200, 400, 800, 1600].map((flow) => at(flow));
    expect(depths).toEqual([...depths].sort((a, b) => a - b));
    expect(at(600, 0.2)).toBeGreaterThan(at(600, 20));
  });

  it('scourAt(bed not known) is the preset with the hole at the pier', () => {
    const flow = flowAt(flooded({ grainMm: null }), 100)!;
    expect(flow.laceyM).toBeNull();
    expect(scourAt(flow, 1.2, 1)).toBeCloseTo(1 + pierScour(1.2, 6, flow.velocityMs), 12);
  });
});

describe('floodSection', () => {
  it('floodSection(triangle) is exact: area, width and the integral of depth^(5/3)', () => {
    const valley = { groundX: [0, 10, 20], groundZ: [4, 0, 4] };
    const section = floodSection(valley, 2, 0, 20);
    expect(section.widthM).toBeCloseTo(10, 12);
    expect(section.areaM2).toBeCloseTo(10, 12);
    // Twice the integral of (0.4 x)^(5/3) from 0 to 5.
    expect(section.conveyance).toBeCloseTo((2 * 0.4 ** (5 / 3) * 5 ** (8 / 3)) / (8 / 3), 10);
  });

  it('floodSection(anywhere) agrees with a sum of thin strips', () => {
    fc.assert(
      fc.property(
        fc.array(fc.double({ min: -5, max: 5, noNaN: true }), { minLength: 3, maxLength: 8 }),
        (groundZ) => {
          const line = { groundX: groundZ.map((_, i) => 7 * i), groundZ };
          const end = 7 * (groundZ.length - 1);
          const n = 20_000;
          let area = 0;
          let power = 0;
          for (let k = 0; k < n; k++) {
            const x = ((k + 0.5) * end) / n;
            const i = Math.min(groundZ.length - 2, Math.floor(x / 7));
            const z = groundZ[i]! + ((groundZ[i + 1]! - groundZ[i]!) * (x - 7 * i)) / 7;
            const y = Math.max(0, 1 - z);
            area += (y * end) / n;
            power += (y ** (5 / 3) * end) / n;
          }
          const section = floodSection(line, 1, 0, end);
          expect(section.areaM2).toBeCloseTo(area, 3);
          expect(section.conveyance).toBeCloseTo(power, 3);
        },
      ),
      { seed: 6, numRuns: 30 },
    );
  });
});

describe('riversAt', () => {
  it('riversAt(no piers) takes the area under the flood level between the abutments', () => {
    const [river] = riversAt(flooded(), []);
    // 160 m of 2 m, 40 m of another 4 m, and two banks of 1 m width from 0 to -4.
    expect(river!.areaM2).toBeCloseTo(160 * 2 + 40 * 4 + 2 * (4 / 2), 9);
    expect(river!.openingM2).toBeCloseTo(river!.areaM2!, 9);
    expect(river!.affluxM).toBe(0);
    expect(river!.velocityMs).toBeCloseTo(600 / river!.areaM2!, 12);
    expect(river!.waterwayM).toBeCloseTo(160, 9);
  });

  it('riversAt(more piers) takes their real widths off and raises the afflux', () => {
    const one = riversAt(flooded(), [pier(100)])[0]!;
    const two = riversAt(flooded(), [pier(100), pier(60)])[0]!;
    expect(one.openingM2).toBeCloseTo(one.bridgeAreaM2! - 1.2 * 6, 9);
    expect(two.openingM2).toBeCloseTo(one.openingM2! - 1.2 * 2, 9);
    expect(two.affluxM).toBeGreaterThan(one.affluxM!);
    expect(two.waterwayM).toBeCloseTo(160 - 2.4, 9);
    // A pier on land and an abutment take nothing.
    expect(riversAt(flooded(), [pier(10), { ...pier(100), kind: 'abutment' }])[0]!.affluxM).toBe(0);
  });

  it('riversAt(shorter bridge) pays for approaches on the flood plain', () => {
    const short = flooded({}, { startM: 70, endM: 130, lengthM: 60 });
    expect(riversAt(short, [])[0]!.affluxM).toBeGreaterThan(0);
    // All of the flow goes through the bridge: it runs faster there.
    expect(flowAt(short, 100)!.velocityMs).toBeGreaterThan(flowAt(flooded(), 100)!.velocityMs);
  });

  it('riversAt(skew) shortens the opening by the cosine', () => {
    const [square] = riversAt(flooded(), []);
    const [skew] = riversAt(flooded({}, { skewDeg: 60 }), []);
    expect(skew!.areaM2).toBeCloseTo(square!.areaM2! / 2, 9);
  });

  it('riversAt(flow and velocity) works the flow out both ways and uses the greater', () => {
    const [river] = riversAt(flooded({ velocityMs: 2 }), []);
    const byVelocity = 2 * river!.areaM2!;
    expect(river!.flowM3s).toBeCloseTo(Math.max(600, byVelocity), 9);
    expect(river!.flowSpread).toBeCloseTo(Math.max(600, byVelocity) / Math.min(600, byVelocity), 9);
    const [alone] = riversAt(flooded({ flowM3s: null, velocityMs: 2 }), []);
    expect(alone!.flowM3s).toBeCloseTo(byVelocity, 9);
    expect(alone!.flowSpread).toBe(1);
  });

  it('riversAt(unknown flow or level) stays unknown', () => {
    expect(riversAt(flooded({ flowM3s: null }), [pier(100)])[0]).toMatchObject({
      affluxM: null,
      allowedAffluxM: 0.2,
    });
    const level = flooded();
    const unknown = { ...level, waters: [{ ...level.waters[0]!, floodLevelM: null }] };
    expect(riversAt(unknown, [])[0]!.flowM3s).toBeNull();
    expect(flowAt(unknown, 100)).toBeNull();
    expect(riversAt(crossing, [])[0]!.affluxM).toBeNull();
  });

  it('flowAt(everywhere) carries the whole flow between the abutments', () => {
    const site = flooded({}, { startM: 40, endM: 160, lengthM: 120 });
    let flow = 0;
    const step = 0.01;
    for (let x = 40 + step / 2; x < 160; x += step) {
      const here = flowAt(site, x);
      if (here) flow += here.velocityMs * here.depthM * step;
    }
    expect(flow).toBeCloseTo(600, 1);
  });
});
