import { describe, expect, it } from 'vitest';
import { loadStandard } from '../../../lib/actions/index.ts';
import {
  sizeEdgeGirder,
  type DeckForces,
  type EdgeCase,
} from '../../../lib/forms/cable-stayed/sizeEdgeGirder.ts';
import { sectionProperties } from '../../../lib/mechanics/index.ts';

const edge: EdgeCase = {
  standard: loadStandard('lm1'),
  depthM: 2,
  slabM: 0.25,
  deckWidthM: 14,
  slabWidthM: 7,
  shearKN: 1500,
};
const forces: DeckForces = {
  atM: 0,
  permanentKN: 12000,
  trafficKN: 3000,
  permanentKNm: -800,
  trafficMaxKNm: 6000,
  trafficMinKNm: -5000,
};

describe('sizeEdgeGirder(edge, sections)', () => {
  it('stress of the chosen plates worked out again with transformed sections is the use it reports', () => {
    const girder = sizeEdgeGirder(edge, [forces]);
    const { heightM: h, topM, bottomM, webM, topWidthM, bottomWidthM } = girder.plates;
    // C35/45: Ecm = 22 (43/10)^0.3 = 34.08 GPa; EN 1992-1-1 table 3.1, from memory.
    const ratio = 210000 / (22000 * 4.3 ** 0.3);
    const section = (n: number): ReturnType<typeof sectionProperties> =>
      sectionProperties([
        { kind: 'rect', widthM: bottomWidthM, heightM: bottomM, bottomM: 0 },
        { kind: 'rect', widthM: webM, heightM: h - topM - bottomM, bottomM },
        { kind: 'rect', widthM: topWidthM, heightM: topM, bottomM: h - topM },
        { kind: 'rect', widthM: 7, heightM: girder.slabM, bottomM: h, eRatio: 1 / n },
      ]);
    const long = section(3 * ratio);
    const short = section(ratio);
    const fy = bottomM <= 0.016 ? 355 : bottomM <= 0.04 ? 345 : 335;
    const tension =
      (1.35 * -800 * long.centroidM) / long.inertiaM4 +
      (1.35 * 6000 * short.centroidM) / short.inertiaM4 -
      12000 / long.areaM2;
    const pressed =
      1.35 * (12000 / long.areaM2 + (800 * long.centroidM) / long.inertiaM4) +
      1.35 * (3000 / short.areaM2 + (5000 * short.centroidM) / short.inertiaM4);
    expect(girder.utilisation).toBeCloseTo(Math.max(tension / fy, (1.1 * pressed) / fy) / 1000, 3);
    expect(girder.utilisation).toBeLessThanOrEqual(1);
  });

  it('more push needs no less steel', () => {
    const mass = (permanentKN: number): number =>
      sizeEdgeGirder(edge, [{ ...forces, permanentKN }]).massKgPerM;
    expect(mass(40000)).toBeGreaterThan(mass(20000));
  });

  it('beyond the thickest plates and slab it comes back overstressed', () => {
    expect(sizeEdgeGirder(edge, [{ ...forces, permanentKN: 4e5 }]).utilisation).toBeGreaterThan(1);
  });
});
