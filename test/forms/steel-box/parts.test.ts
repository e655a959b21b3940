import { describe, expect, it } from 'vitest';
import { steelYield } from '../../../lib/actions/index.ts';
import { sectionProperties, webShearCapacity } from '../../../lib/mechanics/index.ts';
import { depthsAlong } from '../../../lib/forms/steel-box/boxHaunch.ts';
import { leastDeckPlate } from '../../../lib/forms/steel-box/steelBoxModel.ts';
import { ribSection, sizeRib } from '../../../lib/forms/steel-box/deckRibs.ts';
import {
  patchResistanceKN,
  pressedWebShare,
  stiffenedWebShearKN,
} from '../../../lib/forms/steel-box/stiffenedWeb.ts';

const web = { depthM: 3, postM: 4, thicknessM: 0.014, ribs: 0, ribM4: 0, fyMPa: 355 };
const yieldMPa = (thicknessM: number): number => steelYield('S355', 1000 * thicknessM);

describe('ribSection()', () => {
  it('is the trapezoid and its plate as polygons', () => {
    const [h, t, plate] = [0.325, 0.006, 0.014];
    const wall = (side: number): { kind: 'polygon'; points: [number, number][] } => {
      const across = t * Math.hypot(1, 0.075 / h);
      return {
        kind: 'polygon',
        points: [
          [side * 0.15 - across / 2, -plate / 2],
          [side * 0.15 + across / 2, -plate / 2],
          [side * 0.075 + across / 2, -plate / 2 - h],
          [side * 0.075 - across / 2, -plate / 2 - h],
        ],
      };
    };
    const whole = sectionProperties([
      { kind: 'rect', widthM: 0.6, heightM: plate, bottomM: -plate / 2 },
      { kind: 'rect', widthM: 0.15, heightM: t, bottomM: -plate / 2 - h - t / 2 },
      wall(-1),
      wall(1),
    ]);
    const rib = ribSection(h, t, plate);
    expect(rib.areaM2 + 0.6 * plate).toBeCloseTo(whole.areaM2, 6);
    expect(rib.axisM).toBeCloseTo(-whole.centroidM, 4);
    expect(rib.inertiaM4 / whole.inertiaM4).toBeCloseTo(1, 2);
  });
});

describe('sizeRib()', () => {
  it('asks for more on longer spans between crossbeams', () => {
    const areas = [2.5, 3.5, 4].map((pitchM) => sizeRib('lm1', pitchM, 0.014, yieldMPa).areaM2);
    expect(areas[1]).toBeGreaterThanOrEqual(areas[0]!);
    expect(areas[2]).toBeGreaterThan(areas[0]!);
  });

  // EN 1993-2 annex C: closed ribs on crossbeams 2.5 to 4 m apart are 275 to 350 mm high with walls of 6 to 8 mm (from memory).
  it('finds the ribs of road bridges on crossbeams 4 m apart', () => {
    const rib = sizeRib('lm1', 4, 0.014, yieldMPa);
    expect(rib.heightM).toBeGreaterThanOrEqual(0.275);
    expect(rib.heightM).toBeLessThanOrEqual(0.35);
    expect(rib.thicknessM).toBeLessThanOrEqual(0.008);
  });
});

describe('leastDeckPlate()', () => {
  // EN 1993-2 annex C.1.2.2, from memory: 14 mm under 70 mm of asphalt or more, 16 mm under 40 mm or more.
  it('is 14 mm under thick and 16 mm under thin surfacing', () => {
    expect(leastDeckPlate(0.09)).toBe(0.014);
    expect(leastDeckPlate(0.07)).toBe(0.014);
    expect(leastDeckPlate(0.05)).toBe(0.016);
  });
});

describe('stiffenedWebShearKN()', () => {
  it('is the web between posts where nothing stiffens it along', () => {
    const plain = webShearCapacity({
      depthM: 3,
      thicknessM: 0.014,
      fyMPa: 355,
      panelLengthM: 4,
      partialFactor: 1.1,
    });
    expect(stiffenedWebShearKN(web, 1.1)).toBeCloseTo(plain, 6);
  });

  it('rises with stiff stiffeners up to the panel between them', () => {
    const some = stiffenedWebShearKN({ ...web, ribs: 1, ribM4: 2e-5 }, 1.1);
    const stiff = stiffenedWebShearKN({ ...web, ribs: 1, ribM4: 1 }, 1.1);
    const panel = webShearCapacity({
      depthM: 1.5,
      thicknessM: 0.014,
      fyMPa: 355,
      panelLengthM: 4,
      partialFactor: 1.1,
    });
    expect(some).toBeGreaterThan(stiffenedWebShearKN(web, 1.1));
    expect(stiff).toBeCloseTo(2 * panel, 6);
    expect(some).toBeLessThanOrEqual(stiff);
  });
});

it('pressedWebShare() is 1 for stocky panels and falls with slender ones', () => {
  expect(pressedWebShare({ ...web, thicknessM: 0.05 }, 1.5)).toBe(1);
  expect(pressedWebShare({ ...web, thicknessM: 0.012 }, 1.5)).toBeLessThan(
    pressedWebShare({ ...web, thicknessM: 0.02 }, 1.5),
  );
});

// By hand after EN 1993-1-5 6.4 and 6.5 (from memory): kF = 6 + 2 (3/4)2 = 7.125, Fcr = 0.9 x 7.125 x 210e6 x 0.014^3 / 3 =
// 1231.7 kN; m1 = 30 x 0.8136 x 0.02 / 0.014 = 34.87, m2 = 0.02 (3 / 0.02)2 = 450; ly = 1 + 0.04 (1 + root 484.87) = 1.9208 m;
// ly tw fy = 9546 kN, lambda = 2.784, chi = 0.1796, over 1.1: 1558 kN.
it('patchResistanceKN() is the resistance to a force on one flange', () => {
  expect(patchResistanceKN(web, 1, 0.02, 1.1)).toBeCloseTo(1558, -1);
});

describe('depthsAlong()', () => {
  it('is a parabola from pier to middle of inner spans', () => {
    const depths = depthsAlong([80, 100, 80], [0, 30, 80, 105, 130, 155, 180, 260], 3, 5);
    expect(Array.from(depths)).toEqual([3, 3, 5, 3.5, 3, 3.5, 5, 3]);
  });

  it('is straight where that is asked for', () => {
    const depths = depthsAlong([80, 100, 80], [80, 105, 130], 3, 5, 'straight');
    expect(Array.from(depths)).toEqual([5, 4, 3]);
  });

  it('is level where the pier is no deeper, and on a single span', () => {
    expect(Array.from(depthsAlong([60, 60], [0, 30, 60], 3, 3))).toEqual([3, 3, 3]);
    expect(Array.from(depthsAlong([60], [0, 30, 60], 3, 3))).toEqual([3, 3, 3]);
  });
});
