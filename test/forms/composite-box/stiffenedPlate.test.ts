import { describe, expect, it } from 'vitest';
import {
  chooseStiffener,
  platePressedShare,
  stiffenerOf,
  strutShare,
  supportShearLag,
} from '../../../lib/forms/composite-box/stiffenedPlate.ts';

const field = { pitchM: 0.8, frameM: 4, stiffener: stiffenerOf(0.3) };

describe('strutShare()', () => {
  it('is the strut of plate, web and flange by hand', () => {
    // Plate 800 x 30, web 300 x 12, flange 150 x 15 at 4 m, fy 345: A = 24000 + 3600 + 2250 = 29850 mm2;
    // z from the middle of the plate: web 165, flange 322.5: axis (594000 + 725625) / 29850 = 44.2 mm;
    // I = 1.8e6 + 24000 x 44.2^2 + 27e6 + 3600 x 120.8^2 + 0.04e6 + 2250 x 278.3^2 = 302.5e6; i = 100.7 mm;
    // lambda = 39.7 / (pi root(210000 / 345)) = 0.512; e = 225.6 - 44.2 = 181.3, alpha = 0.49 + 0.09 x 1.80 = 0.652;
    // phi = 0.5 (1 + 0.652 x 0.312 + 0.262) = 0.733; chi = 1 / (0.733 + root(0.537 - 0.262)) = 0.795.
    expect(strutShare(field, 0.03, 345)).toBeCloseTo(0.795, 2);
  });

  it('falls with the distance of the frames and rises with the height of the rib', () => {
    expect(strutShare({ ...field, frameM: 6 }, 0.03, 345)).toBeLessThan(strutShare(field, 0.03, 345));
    expect(strutShare({ ...field, stiffener: stiffenerOf(0.4) }, 0.03, 345)).toBeGreaterThan(
      strutShare(field, 0.03, 345),
    );
    expect(chooseStiffener(0.8, 6, 345).heightM).toBeGreaterThanOrEqual(chooseStiffener(0.8, 3, 345).heightM);
  });
});

describe('platePressedShare()', () => {
  it('takes the panels of a thin plate off by EN 1993-1-5 4.4', () => {
    // 800 / 12 at fy 355: lambda = 66.7 / (28.4 x 0.8136 x 2) = 1.443; (1.443 - 0.22) / 1.443^2 = 0.587.
    const strut = strutShare(field, 0.012, 355);
    expect(platePressedShare(field, 0.012, 355) / strut).toBeCloseTo(0.587, 3);
    // 800 / 40 at 335: lambda = 20 / (28.4 x 0.8375 x 2) = 0.42: whole.
    expect(platePressedShare(field, 0.04, 335)).toBe(strutShare(field, 0.04, 335));
  });
});

describe('supportShearLag()', () => {
  it('is beta 2 to the power kappa of EN 1993-1-5', () => {
    // b0 = 3 m, Le = 30 m: kappa 0.1, beta 2 = 1 / (1 + 6 (0.1 - 0.004) + 0.016) = 0.628; 0.628^0.1 = 0.955.
    expect(supportShearLag(3, 30)).toBeCloseTo(0.955, 3);
    expect(supportShearLag(0.5, 30)).toBe(1);
  });
});
