import { describe, expect, it } from 'vitest';
import { girderFigures, steelArea, type GirderTop } from '../../../lib/forms/composite-i/girderSection.ts';
import { sectionProperties, type SectionPart } from '../../../lib/mechanics/index.ts';

const plates = { heightM: 2.8, topWidthM: 1, topM: 0.04, bottomWidthM: 1.2, bottomM: 0.06, webM: 0.018 };
const steel: SectionPart[] = [
  { kind: 'rect', widthM: 1.2, heightM: 0.06, bottomM: 0 },
  { kind: 'rect', widthM: 0.018, heightM: 2.7, bottomM: 0.06 },
  { kind: 'rect', widthM: 1, heightM: 0.04, bottomM: 2.76 },
];

describe('girderFigures()', () => {
  const out = { areaM2: 0, centroidM: 0, inertiaM4: 0 };

  it('agrees with sectionProperties() for the steel alone', () => {
    const expected = sectionProperties(steel);
    girderFigures(out, plates);
    expect(out.areaM2).toBeCloseTo(expected.areaM2, 12);
    expect(out.areaM2).toBeCloseTo(steelArea(plates), 12);
    expect(out.centroidM).toBeCloseTo(expected.centroidM, 12);
    expect(out.inertiaM4).toBeCloseTo(expected.inertiaM4, 12);
  });

  it('agrees with sectionProperties() with a slab in steel units', () => {
    const n = 6.2;
    const slab: SectionPart = { kind: 'rect', widthM: 6, heightM: 0.3, bottomM: 2.8, eRatio: 1 / n };
    const top: GirderTop = {
      slabAreaM2: 1.8 / n,
      slabInertiaM4: (6 * 0.3 ** 3) / 12 / n,
      slabAboveM: 0.15,
      barAreaM2: 0,
      barAboveM: 0.15,
    };
    const expected = sectionProperties([...steel, slab]);
    girderFigures(out, plates, top);
    expect(out.areaM2).toBeCloseTo(expected.areaM2, 12);
    expect(out.centroidM).toBeCloseTo(expected.centroidM, 12);
    expect(out.inertiaM4).toBeCloseTo(expected.inertiaM4, 12);
  });

  it('takes a strip of the web out', () => {
    const expected = sectionProperties([
      steel[0]!,
      { kind: 'rect', widthM: 0.018, heightM: 0.44, bottomM: 0.06 },
      { kind: 'rect', widthM: 0.018, heightM: 1.96, bottomM: 0.8 },
      steel[2]!,
    ]);
    girderFigures(out, plates, undefined, 0.018 * 0.3, 0.65, 0.3);
    expect(out.areaM2).toBeCloseTo(expected.areaM2, 12);
    expect(out.inertiaM4).toBeCloseTo(expected.inertiaM4, 12);
  });
});
