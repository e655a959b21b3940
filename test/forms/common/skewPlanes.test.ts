import { describe, expect, it } from 'vitest';
import { aheadM, alongSkewM, skewPlanesWarnings } from '../../../lib/forms/common/skewPlanes.ts';
import { sizeFloor } from '../../../lib/forms/floor/sizeFloor.ts';
import { frameStiffnessKNm } from '../../../lib/forms/half-through/uFrame.ts';
import { halfThrough } from '../../../lib/forms/half-through/index.ts';
import { truss } from '../../../lib/forms/truss/index.ts';
import type { Design, UnitTask } from '../../../lib/model/index.ts';
import { girderTask } from '../composite-i/cases.ts';
import { floorDeck } from '../floor/cases.ts';

describe('two planes on skew supports', () => {
  it('have cross-girders of D / cos and bearings D tan ahead of each other, either way', () => {
    // By hand, 12 m and 30 degrees: 12 / 0.8660 = 13.86 m; 12 x 0.5774 = 6.93 m.
    expect(alongSkewM(12, 30)).toBeCloseTo(13.856, 3);
    expect(aheadM(12, 30)).toBeCloseTo(6.928, 3);
    expect(alongSkewM(12, -30)).toBe(alongSkewM(12, 30));
    expect(aheadM(12, -30)).toBe(aheadM(12, 30));
    expect([alongSkewM(12), aheadM(12)]).toEqual([12, 0]);
  });

  it('are said to part by the half sine of their deflection at that offset', () => {
    // By hand: 6.93 m of 80 m, 100 mm: 100 sin(180 x 6.93 / 80) = 100 sin(15.6 degrees) = 26.9 mm.
    const [said, ...rest] = skewPlanesWarnings({ skewDeg: 30, spansM: [80] }, 12, 0.1);
    expect(said).toMatch(/13\.9 m long.*6\.9 m ahead.*27 mm/);
    expect(rest).toEqual([]);
    expect(skewPlanesWarnings({ spansM: [80] }, 12, 0.1)).toEqual([]);
  });
});

it('sizeFloor(skew) bends its cross-girders by 1 / cos more', () => {
  const floor = {
    standard: 'lm1',
    deck: floorDeck,
    planesM: 13,
    crossSpacingM: 5,
    depthM: 1.4,
    stringers: true,
  } as const;
  const square = sizeFloor(floor);
  const skew = sizeFloor({ ...floor, skewDeg: 30 });
  expect(sizeFloor({ ...floor, skewDeg: 0 })).toEqual(square);
  expect(skew.crossM / square.crossM).toBeCloseTo(1 / Math.cos(Math.PI / 6), 12);
  // The same axles on influence lines of 13 / 4 and 13 / (4 x 0.866) m: 1.1547 times the moment.
  expect(skew.crossGirder.trafficCharacteristicKNm / square.crossGirder.trafficCharacteristicKNm).toBeCloseTo(
    1.1547,
    4,
  );
  expect(skew.crossGirder.massKgPerM).toBeGreaterThan(square.crossGirder.massKgPerM);
});

it('a U-frame turned by 30 degrees holds the flange by three quarters of its stiffness', () => {
  const frame = { postM: 1.5, leverM: 1.9, planesM: 11, postInertiaM4: 2e-4, crossInertiaM4: 3e-3 };
  // cos2 of 30 degrees = 0.75; square it has 17,152 kN/m: 12,864 kN/m.
  expect(frameStiffnessKNm({ ...frame, cosine: Math.cos(Math.PI / 6) })).toBeCloseTo(12864, 0);
});

const steelKg = ({ lines }: Design): number =>
  lines.reduce((sum, { item, quantity }) => (item.endsWith('-steel') ? sum + quantity : sum), 0);

describe.each([
  ['truss', truss, [80], 1.5],
  ['half-through', halfThrough, [30], 1.2],
] as const)('size(%s) of a skew deck', (form, module, spansM, depthM) => {
  const at = (skew: Partial<UnitTask>): Design =>
    module.size({ ...girderTask(spansM, depthM, skew), deck: floorDeck, form, method: 'crane' });

  it('is that of a square one to the last digit at 0', () => {
    const { task: _square, ...square } = at({});
    const { task: _none, ...none } = at({ skewDeg: 0 });
    expect(none).toEqual(square);
  });

  it('takes more steel the more it is skewed, and weighs on its supports with the traffic of a square one', () => {
    const [square, ...skewed] = [0, 15, 30, 45].map((skewDeg) => at({ skewDeg }));
    let before = steelKg(square!);
    for (const design of skewed) {
      expect(steelKg(design)).toBeGreaterThan(before);
      before = steelKg(design);
      design.reactions.forEach(({ trafficMaxKN }, j) =>
        expect(trafficMaxKN).toBeCloseTo(square!.reactions[j]!.trafficMaxKN, 6),
      );
      expect(design.warnings.join(' ')).toContain('run along the supports');
    }
  });
});

it('a skew truss has more bracing: portals and struts along the supports, one diagonal longer', () => {
  const bracing = (skewDeg: number): number => {
    const design = truss.size({
      ...girderTask([80], 1.5, { skewDeg }),
      deck: floorDeck,
      form: 'truss',
      method: 'crane',
    });
    return design.figures['bracingKg']!;
  };
  expect(bracing(30)).toBeGreaterThan(bracing(0));
});
