import { describe, expect, it } from 'vitest';
import { gussetKg, strutKgPerM } from '../../../lib/forms/composite-i/bracingMember.ts';
import { compositeI } from '../../../lib/forms/composite-i/index.ts';
import { stiffenersBetween } from '../../../lib/forms/composite-i/webStiffener.ts';
import type { Design } from '../../../lib/model/index.ts';
import { girderTask } from './cases.ts';

const mass = (design: Design, what: string): number =>
  design.lines.filter((line) => line.what === what).reduce((sum, { quantity }) => sum + quantity, 0);

describe('gussetKg(angle)', () => {
  it('is a plate of 12 mm three legs square: 120 x 120 x 12 of 21.6 kg/m, by hand', () => {
    expect(Math.abs(gussetKg(21.6) / (7850 * 0.012 * 0.36 ** 2) - 1)).toBeLessThan(0.12);
  });
});

describe('bracing in plan', () => {
  const long = compositeI.size({ ...girderTask([80], 3.2), girders: 4 });

  it('is crossed diagonals in one bay for the wind on the face of the girder, by hand', () => {
    const { spacingM = 0, girderHeightM = 0 } = long.figures;
    const diagonalM = Math.hypot(8, spacingM);
    let kg = 0;
    for (let bay = 0; bay < 10; bay++) {
      // 1.5 x 2 kN/m2 on the height; shear at the end of the bay nearer to a support; half of yield of 345 MPa (20 mm).
      const shearKN = 3 * girderHeightM * Math.max(40 - 8 * bay, 8 * (bay + 1) - 40);
      const areaM2 = (shearKN * diagonalM) / (2 * spacingM) / (0.5 * 345e3);
      const perM = Math.max(7850 * areaM2, strutKgPerM(diagonalM / 2, 'lm1'));
      kg += 2 * diagonalM * perM + 3 * gussetKg(perM);
    }
    expect(mass(long, 'bracing in plan') / kg).toBeCloseTo(1, 2);
  });

  it('is not needed up to 250 ft (AASHTO LRFD C6.7.5.2, from memory), nor beside stiff cross-girders', () => {
    expect(mass(compositeI.size({ ...girderTask([76], 3), girders: 4 }), 'bracing in plan')).toBe(0);
    expect(mass(compositeI.size(girderTask([90], 3.6)), 'bracing in plan')).toBe(0);
  });
});

describe('stiffenersBetween(model)', () => {
  const model = { braceAtM: [0, 8, 16, 20], girderM: 4 };

  it('keeps panels beside a stiffener along the web within 1.5 of the height under HL-93 (AASHTO LRFD 6.10.9.1, from memory)', () => {
    expect(stiffenersBetween({ ...model, standardId: 'hl93' })).toBe(2);
    expect(stiffenersBetween({ ...model, girderM: 5.4, standardId: 'hl93' })).toBe(0);
    expect(stiffenersBetween({ ...model, girderM: 3, standardId: 'hl93' })).toBe(0);
    expect(stiffenersBetween({ ...model, standardId: 'lm1' })).toBe(0);
  });
});

it('compositeI.size() carries the forms that stay under the slab in North America, 15 psf', () => {
  const design = compositeI.size({ ...girderTask([40], 1.8), standard: 'hl93', girders: 4 });
  const steelKN = design.lines
    .filter(({ item }) => item === 'plate-girder-steel')
    .reduce((sum, { quantity }) => sum + quantity * 9.81e-3, 0);
  const slabM3 = mass(design, 'deck slab');
  const { widthM, superimposedKNm } = design.task.deck;
  const permanentKN = design.reactions.reduce((sum, { permanentKN: kN }) => sum + kN, 0);
  const forms = permanentKN - steelKN - 23.6 * slabM3 - 40 * superimposedKNm;
  expect(forms / (0.72 * 40 * widthM)).toBeCloseTo(1, 1);
});
