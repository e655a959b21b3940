import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  aashtoFactors,
  loadStandard,
  notionalLanes,
  serviceTraffic,
  trafficEnvelope,
  trafficOnDeck,
  trafficOnGirder,
  trafficOnInfluence,
  trafficTorsion,
  type TrafficLoad,
} from '../../lib/actions/index.ts';
import {
  deflectionInfluence,
  lineBeam,
  momentInfluence,
  pointLoads,
  reactionInfluence,
  uniform,
} from '../../lib/mechanics/index.ts';
import type { DeckSpec } from '../../lib/model/index.ts';

const deck = (carriagewayM: number, widthM = carriagewayM + 1, footwayM = 0): DeckSpec => ({
  widthM,
  carriagewayM,
  carriagewayOffsetM: 0,
  lanes: 2,
  footwayM,
  surfacingM: 0.09,
  superimposedKNm: 40,
});

describe('loadStandard(id)', () => {
  it('refuses a standard without a data file', () => {
    expect(() => loadStandard('hs20' as never)).toThrow(/standard: expected one of lm1, hl93, received hs20/);
  });
});

describe('notionalLanes(lanes, carriageway)', () => {
  it('counts as EN 1991-2 table 4.1 (from memory)', () => {
    const { lanes } = loadStandard('lm1');
    const count = (w: number): number => notionalLanes(lanes, w).count;
    expect([5.3, 5.4, 6, 8.9, 9, 11, 12].map(count)).toEqual([1, 2, 2, 2, 3, 3, 4]);
    expect(notionalLanes(lanes, 5.6).widthM).toBeCloseTo(2.8, 9);
  });

  it('counts as AASHTO LRFD 3.6.1.1.1 (from memory): 12 ft lanes, two from 20 ft', () => {
    const { lanes } = loadStandard('hl93');
    const count = (ft: number): number => notionalLanes(lanes, ft * 0.3048).count;
    expect([19, 20, 24, 35.9, 36, 48].map(count)).toEqual([1, 2, 2, 2, 3, 4]);
  });

  it('wants a carriageway', () => {
    expect(() => notionalLanes(loadStandard('lm1').lanes, Number.NaN)).toThrow(/received NaN/);
  });
});

describe('trafficOnDeck(id, deck)', () => {
  it('of LM1 loads three lanes and the remaining area', () => {
    // 300 + 200 + 100 over 300; 27 + 7.5 + 7.5 + 2.5 x 2.
    const load = trafficOnDeck('lm1', deck(11));
    expect(load.vehicleFactor).toBeCloseTo(2, 9);
    expect(load.udlKNm).toBeCloseTo(47, 9);
  });

  it('of HL-93 takes the number of lanes that is worst with its presence factor', () => {
    // 1.2, 2.0, 2.55, 2.6 for one to four lanes.
    expect(trafficOnDeck('hl93', deck(5)).vehicleFactor).toBeCloseTo(1.2, 9);
    expect(trafficOnDeck('hl93', deck(8)).vehicleFactor).toBeCloseTo(2, 9);
    expect(trafficOnDeck('hl93', deck(11)).vehicleFactor).toBeCloseTo(2.55, 9);
    expect(trafficOnDeck('hl93', deck(15)).vehicleFactor).toBeCloseTo(2.6, 9);
    // 0.64 klf a lane.
    expect(trafficOnDeck('hl93', deck(8)).udlKNm).toBeCloseTo(2 * 9.3401, 2);
  });
});

describe('trafficOnGirder(id, deck, girders, girder)', () => {
  it('loads nothing on the side that relieves', () => {
    const narrow = trafficOnGirder('lm1', deck(11), [-3.5, 3.5], 1);
    const wide = trafficOnGirder('lm1', deck(14), [-3.5, 3.5], 1);
    // Wider carriageway: more overhang on the near side, nothing gained beyond the far girder.
    expect(wide.vehicleFactor).toBeGreaterThan(narrow.vehicleFactor);
  });

  it('shares out between all girders at least what the deck carries', () => {
    for (const id of ['lm1', 'hl93'] as const) {
      const girders = [-5, -2.5, 0, 2.5, 5];
      const sum = girders.reduce(
        (total, _, i) => total + trafficOnGirder(id, deck(12), girders, i).vehicleFactor,
        0,
      );
      expect(sum).toBeGreaterThanOrEqual(trafficOnDeck(id, deck(12)).vehicleFactor - 1e-9);
    }
  });

  it('is the same on both outer girders of a symmetrical deck', () => {
    const left = trafficOnGirder('lm1', deck(11), [-6, -2, 2, 6], 0);
    const right = trafficOnGirder('lm1', deck(11), [-6, -2, 2, 6], 3);
    expect(left.vehicleFactor).toBeCloseTo(right.vehicleFactor, 9);
    expect(left.udlKNm).toBeCloseTo(right.udlKNm, 9);
  });

  it('uses AASHTO factors inside their validity only', () => {
    const girders = [-12.5, -7.5, -2.5, 2.5, 7.5, 12.5].map((y) => y * 0.54864);
    const options = { spanM: 36.576, slabM: 0.1905, kgM4: 0.9296 };
    const inner = trafficOnGirder('hl93', deck(14.63, 15.5), girders, 2, options);
    expect(inner.distribution).toBe('AASHTO factors');
    expect(inner.vehicleFactor).toBeCloseTo(0.732, 3);
    expect(inner.vehicleFactor * inner.shearRatio).toBeCloseTo(0.884, 3);
    expect(
      trafficOnGirder('hl93', deck(14.63, 15.5), girders, 2, { ...options, spanM: 90 }).distribution,
    ).toBe('rigid crossbeam');
    expect(trafficOnGirder('lm1', deck(14.63, 15.5), girders, 2, options).distribution).toBe(
      'rigid crossbeam',
    );
    expect(aashtoFactors({ spacingM: 6, girders: 3, ...options }).outside).toEqual([
      'girder spacing 19.69 ft is outside 3.5 to 16',
      'number of girders 3 is below 4',
    ]);
  });

  it('names a girder that is not there', () => {
    expect(() => trafficOnGirder('lm1', deck(11), [0], 0)).toThrow(/two girders/);
    expect(() => trafficOnGirder('lm1', deck(11), [-3, 3], 2)).toThrow(/expected 0 to 1, received 2/);
  });
});

describe('trafficTorsion(id, deck)', () => {
  it('of LM1 on 11 m takes the two lanes beside one kerb and the loads up to the middle', () => {
    // 300 x 4 + 200 x 1 on two axles; uniform 27 x 4 + 2.5 (2.5^2 / 2).
    const torsion = trafficTorsion('lm1', deck(11));
    expect(torsion.vehicleTorqueKNm).toBeCloseTo(2 * (300 * 4 + 200 * 1), 6);
    expect(torsion.udlTorqueKNmPerM).toBeCloseTo(108 + (2.5 * 2.5 ** 2) / 2, 6);
  });
});

describe('trafficEnvelope(beam, load)', () => {
  const lm1 = trafficOnDeck('lm1', deck(11));

  it('covers any place of the tandem and any pattern of loaded spans', () => {
    const beam = lineBeam({ spansM: [30, 40, 25] });
    const envelope = trafficEnvelope(beam, lm1);
    fc.assert(
      fc.property(
        fc.double({ min: 0, max: 93.8, noNaN: true }),
        fc.array(fc.boolean(), { minLength: 3, maxLength: 3 }),
        (at, loaded) => {
          const axles = pointLoads(
            beam,
            [0, 1.2].map((offset) => ({ xM: at + offset, loadKN: 600 })),
          );
          const spread = uniform(
            beam,
            loaded.map((on) => (on ? 47 : 0)),
          );
          beam.xM.forEach((_, s) => {
            const moment = axles.momentKNm[s]! + spread.momentKNm[s]!;
            expect(moment).toBeLessThan(envelope.momentMaxKNm[s]! + 2);
            expect(moment).toBeGreaterThan(envelope.momentMinKNm[s]! - 2);
            const shear = axles.shearRightKN[s]! + spread.shearRightKN[s]!;
            expect(shear).toBeLessThan(envelope.shearMaxKN[s]! + 0.5);
            expect(shear).toBeGreaterThan(envelope.shearMinKN[s]! - 0.5);
            expect(axles.deflectionM[s]! + spread.deflectionM[s]!).toBeLessThan(
              envelope.deflectionM[s]! * 1.001 + 1,
            );
          });
          beam.supportAt.forEach((_, j) => {
            expect(axles.reactionKN[j]! + spread.reactionKN[j]!).toBeLessThan(
              envelope.reactionMaxKN[j]! + 0.5,
            );
          });
        },
      ),
      { seed: 61, numRuns: 40 },
    );
  });

  it('is the mirror image on the beam turned round', () => {
    const one = trafficEnvelope(lineBeam({ spansM: [20, 35] }), trafficOnDeck('hl93', deck(11)));
    const other = trafficEnvelope(lineBeam({ spansM: [35, 20] }), trafficOnDeck('hl93', deck(11)));
    const last = one.momentMaxKNm.length - 1;
    one.momentMaxKNm.forEach((m, s) =>
      expect(other.momentMaxKNm[last - s]! / Math.max(1, m)).toBeCloseTo(Math.min(1, m), 3),
    );
    one.momentMinKNm.forEach((m, s) =>
      expect(Math.abs(other.momentMinKNm[last - s]! - m)).toBeLessThan(
        1e-3 * Math.abs(one.momentMinKNm[20]!),
      ),
    );
    one.shearMaxKN.forEach((v, s) => expect(Math.abs(other.shearMinKN[last - s]! + v)).toBeLessThan(1));
  });

  it('lets two trucks govern hogging and inner reactions only', () => {
    const beam = lineBeam({ spansM: [36, 36] });
    const hl93 = { ...trafficOnDeck('hl93', deck(11)), vehicleFactor: 1, udlKNm: 0 };
    const envelope = trafficEnvelope(beam, hl93);
    // Sagging at 0.4 L: two trucks would need both spans; one truck is all there is.
    const one = trafficOnInfluence(hl93, beam.xM, momentInfluence(beam, 8));
    expect(envelope.momentMaxKNm[8]! / one.max).toBeCloseTo(1, 2);
    // Over the pier two trucks at 90 % beat one.
    const single = trafficOnInfluence(hl93, beam.xM, momentInfluence(beam, 20));
    expect(envelope.momentMinKNm[20]! / single.min).toBeGreaterThan(1.4);
    const reaction = trafficOnInfluence(hl93, beam.xM, reactionInfluence(beam, 1));
    expect(envelope.reactionMaxKN[1]!).toBeGreaterThan(1.2 * reaction.max);
    expect(
      envelope.reactionMaxKN[0]! / trafficOnInfluence(hl93, beam.xM, reactionInfluence(beam, 0)).max,
    ).toBeCloseTo(1, 2);
  });

  it('takes the longer wheelbase over the pier of short spans, where two trucks do not fit', () => {
    const beam = lineBeam({ spansM: [9, 9] });
    const load = { ...trafficOnDeck('hl93', deck(11)), vehicleFactor: 1 / 1.33, udlKNm: 0 };
    const ours = trafficEnvelope(beam, load).momentMinKNm[20]!;
    // 32 kip on each span at their worst: the rear gap may stretch to 30 ft; here 22 ft is the nearest tried.
    const at = (x: number): number => (-142.343 * 9 * (x / 9 - (x / 9) ** 3)) / 4;
    let worst = 0;
    for (const gap of [4.2672, 6.7056, 9.144]) {
      for (let x = 9 - gap + 0.01; x < 9; x += 0.01) {
        const front = x - 4.2672;
        const light = front > 0 ? (at(front) * 35.586) / 142.343 : 0;
        worst = Math.min(worst, at(x) + at(18 - x - gap) + light);
      }
    }
    expect(ours / worst).toBeCloseTo(1, 2);
  });

  it('deflects under the truck alone, or a quarter of it with the lane load (AASHTO LRFD 3.6.1.3.2, from memory)', () => {
    const EI = 1e7;
    const beam = lineBeam({ spansM: [24], eiKNm2: () => EI });
    const load = { ...trafficOnDeck('hl93', deck(11)), vehicleFactor: 1, udlKNm: 9.34 };
    const at = (vehicleFactor: number, udlKNm: number): number =>
      trafficOnInfluence({ ...load, vehicleFactor, udlKNm }, beam.xM, deflectionInfluence(beam, 10)).max;
    expect(trafficEnvelope(beam, load).deflectionM[10]! / Math.max(at(1, 0), at(0.25, 9.34))).toBeCloseTo(
      1,
      2,
    );
  });

  it('splits moments and shears when their factors differ', () => {
    const beam = lineBeam({ spansM: [30] });
    const same = trafficEnvelope(beam, lm1);
    const more = trafficEnvelope(beam, { ...lm1, shearRatio: 1.2 });
    expect(more.momentMaxKNm[10]).toBeCloseTo(same.momentMaxKNm[10]!, 9);
    expect(more.shearMaxKN[0]).toBeCloseTo(1.2 * same.shearMaxKN[0]!, 6);
    expect(more.reactionMaxKN[0]).toBeCloseTo(1.2 * same.reactionMaxKN[0]!, 6);
  });
});

describe('footway load', () => {
  it('falls with the loaded length and is capped beside vehicles', () => {
    // EN 1991-2 5.3.2.1 (from memory): 2 + 120 / (L + 30); 3.0 at 90 m and 2.5 from 210 m on.
    const footway: TrafficLoad = { ...trafficOnDeck('lm1', deck(11, 16, 4)), vehicleFactor: 0, udlKNm: 0 };
    const perM = (spanM: number): number => {
      const beam = lineBeam({ spansM: [spanM] });
      return (8 * trafficEnvelope(beam, footway).momentMaxKNm[10]!) / spanM ** 2;
    };
    expect(perM(20)).toBeCloseTo(4 * 3, 6);
    expect(perM(90)).toBeCloseTo(4 * 3, 6);
    expect(perM(150)).toBeCloseTo(4 * (2 + 120 / 180), 6);
    expect(perM(300)).toBeCloseTo(4 * 2.5, 6);
  });
});

describe('beyond the reach of LM1', () => {
  const lm1 = trafficOnDeck('lm1', deck(11));

  it('keeps LM1 and says so', () => {
    expect(trafficEnvelope(lineBeam({ spansM: [190] }), lm1).beyondScope).toBe(false);
    expect(trafficEnvelope(lineBeam({ spansM: [250] }), lm1).beyondScope).toBe(true);
    expect(trafficEnvelope(lineBeam({ spansM: [250] }), trafficOnDeck('hl93', deck(11))).beyondScope).toBe(
      false,
    );
  });

  it('takes a typed load per lane against loaded length instead', () => {
    const typed = { ...lm1, longSpan: { loadedM: [200, 600], laneKNm: [20, 12] } };
    const envelope = trafficEnvelope(lineBeam({ spansM: [400] }), typed);
    expect(envelope.beyondScope).toBe(false);
    // 16 kN/m a lane at 400 m, two lanes' worth: w L2 / 8.
    expect(envelope.momentMaxKNm[10]).toBeCloseTo((2 * 16 * 400 ** 2) / 8, 3);
  });
});

describe('serviceTraffic(load)', () => {
  it('is frequent under EN (0.75 and 0.40) and Service III under AASHTO (0.80), from memory', () => {
    const load = trafficOnDeck('lm1', deck(11));
    expect(serviceTraffic(load).vehicleFactor).toBeCloseTo(1.5, 9);
    expect(serviceTraffic(load).udlKNm).toBeCloseTo(0.4 * 47, 9);
    const hl93 = trafficOnDeck('hl93', deck(11));
    expect(serviceTraffic(hl93).vehicleFactor).toBeCloseTo(0.8 * 2.55, 9);
  });
});

describe('trafficOnInfluence(load, stations, ordinates)', () => {
  it('agrees with the envelope of a beam on the same line', () => {
    const beam = lineBeam({ spansM: [30, 40, 25] });
    const lm1 = trafficOnDeck('lm1', deck(11));
    const envelope = trafficEnvelope(beam, lm1);
    const line = trafficOnInfluence(lm1, beam.xM, momentInfluence(beam, 30));
    expect(line.max / envelope.momentMaxKNm[30]!).toBeCloseTo(1, 2);
  });

  it('wants an ordinate for every station', () => {
    expect(() => trafficOnInfluence(trafficOnDeck('lm1', deck(11)), [0, 1, 2], [0, 1])).toThrow(
      /expected 3, one a station, received 2/,
    );
  });
});

it.each(['lm1', 'hl93'] as const)(
  'trafficEnvelope(symmetrical beam, %s) presses on the last support as on the first, and as the shear beside it',
  (id) => {
    const deck = {
      widthM: 12,
      carriagewayM: 11,
      carriagewayOffsetM: 0,
      lanes: 3,
      footwayM: 0,
      surfacingM: 0.09,
      superimposedKNm: 33,
    };
    const { reactionMaxKN, shearMinKN } = trafficEnvelope(
      lineBeam({ spansM: [50, 63, 50] }),
      trafficOnDeck(id, deck),
    );
    expect(reactionMaxKN[3]! / reactionMaxKN[0]!).toBeCloseTo(1, 6);
    expect(-shearMinKN.at(-1)! / reactionMaxKN[3]!).toBeCloseTo(1, 6);
  },
);
