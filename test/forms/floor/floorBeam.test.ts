import { describe, expect, it } from 'vitest';
import { floorBeam, type FloorBeamDemand } from '../../../lib/forms/floor/floorBeam.ts';
import { sectionProperties } from '../../../lib/mechanics/index.ts';

const demand: FloorBeamDemand = {
  spanM: 13,
  depthM: 1.1,
  slabM: 0.24,
  slabWidthM: 3.25,
  castingKNm: 1700,
  slabKNm: 1500,
  superimposedKNm: 500,
  trafficKNm: 4200,
  shearKN: 1800,
  fatigueKNm: 700,
  trafficCharacteristicKNm: 3100,
  detail: 'stiffener',
};
const yieldMPa = (mm: number): number => (mm <= 16 ? 355 : mm <= 40 ? 345 : 335);

describe('floorBeam(demand, standard, yield, concrete)', () => {
  it('stress of the bottom flange by stages, worked out again with transformed sections, is within yield and near it', () => {
    const beam = floorBeam(demand, 'lm1', yieldMPa, 34000);
    const { heightM: h, topM, bottomM, webM, topWidthM, bottomWidthM } = beam.plates;
    const section = (ratio: number | null): ReturnType<typeof sectionProperties> =>
      sectionProperties([
        { kind: 'rect', widthM: bottomWidthM, heightM: bottomM, bottomM: 0 },
        { kind: 'rect', widthM: webM, heightM: h - topM - bottomM, bottomM },
        { kind: 'rect', widthM: topWidthM, heightM: topM, bottomM: h - topM },
        ...(ratio === null
          ? []
          : [{ kind: 'rect' as const, widthM: 3.25, heightM: 0.24, bottomM: h, eRatio: 1 / ratio }]),
      ]);
    const bottom = (moment: number, ratio: number | null): number => {
      const { inertiaM4, centroidM } = section(ratio);
      return (moment * centroidM) / inertiaM4 / 1000;
    };
    const n0 = 210000 / 34000;
    const stress = bottom(1500, null) + bottom(500, 3 * n0) + bottom(4200, n0);
    const uses = [
      stress / yieldMPa(1000 * bottomM),
      // Category 80 over 1.35, EN 1993-1-9, from memory.
      bottom(700, n0) / 59.3,
      (5 * 3100 * 13 ** 2) / (48 * 2.1e8 * section(n0).inertiaM4) / (13 * 0.00167),
    ];
    expect(beam.utilisation).toBeLessThanOrEqual(1);
    expect(Math.max(...uses)).toBeLessThanOrEqual(beam.utilisation + 1e-9);
    expect(Math.max(...uses)).toBeGreaterThan(0.9);
  });

  it('a deeper beam of the same load is lighter down to its thinnest plates', () => {
    const mass = (depthM: number): number =>
      floorBeam({ ...demand, depthM }, 'lm1', yieldMPa, 34000).massKgPerM;
    expect(mass(1.3)).toBeLessThan(mass(0.8));
  });

  it('a load beyond the thickest flange comes back overstressed', () => {
    const beam = floorBeam({ ...demand, depthM: 0.35, trafficKNm: 30000 }, 'lm1', yieldMPa, 34000);
    expect(beam.utilisation).toBeGreaterThan(1);
  });
});
