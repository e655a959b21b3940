import { describe, expect, it } from 'vitest';
import { boxLayout, type BoxLayout } from '../../../lib/forms/concrete-box/boxLayout.ts';
import { boxSection } from '../../../lib/forms/concrete-box/boxSection.ts';
import { boxTask } from './cases.ts';

/** A box of plain rectangles: upright webs, slab of one thickness. */
function plain(): BoxLayout {
  const layout = boxLayout(boxTask([50], 2.5));
  return {
    ...layout,
    cells: 1,
    webs: 2,
    spacingM: 6,
    overhangM: 3,
    slope: 0,
    slab: { ...layout.slab, midM: 0.25, rootM: 0.25, edgeM: 0.25 },
  };
}

describe('boxSection()', () => {
  it('adds up the rectangles of a plain box, chamfers included', () => {
    const section = boxSection(plain(), 2.5, 0.4, 0.2);
    // Slab 12 x 0.25, box 6.4 x 2.25 less void 5.6 x 2.05, two chamfers of 0.25 m.
    const area = 12 * 0.25 + 6.4 * 2.25 - 5.6 * 2.05 + 2 * (0.25 ** 2 / 2);
    expect(section.areaM2).toBeCloseTo(area, 9);
    const chamferZ = 2.3 - 0.25 / 3;
    const first =
      12 * 0.25 * 0.125 + 6.4 * 2.25 * 1.375 - 5.6 * 2.05 * (0.25 + 2.05 / 2) + 0.25 ** 2 * chamferZ;
    expect(section.topM).toBeCloseTo(first / area, 9);
    expect(section.topM + section.lowM).toBeCloseTo(2.5, 12);
    const about = (b: number, h: number, z: number): number =>
      (b * h ** 3) / 12 + b * h * (z - first / area) ** 2;
    const chamfer = 2 * (0.25 ** 4 / 36 + (0.25 ** 2 / 2) * (chamferZ - first / area) ** 2);
    expect(section.inertiaM4).toBeCloseTo(
      about(12, 0.25, 0.125) + about(6.4, 2.25, 1.375) - about(5.6, 2.05, 0.25 + 2.05 / 2) + chamfer,
      9,
    );
    expect(section.bottomWidthM).toBeCloseTo(6.4, 12);
  });

  it('has as many voids as cells and none where the depth leaves no room', () => {
    const wide = boxLayout(boxTask([50], 2.5, { widthM: 20 }));
    expect(wide.cells).toBe(2);
    expect(boxSection(wide, 2.5, 0.4, 0.2).outline.cells).toHaveLength(2);
    expect(boxSection(wide, 0.6, 0.4, 0.2).outline.cells).toHaveLength(0);
  });

  it('leans the outer webs inwards and keeps their thickness square to the web', () => {
    const layout = { ...plain(), slope: 0.25 };
    const { outline, bottomWidthM } = boxSection(layout, 2.5, 0.4, 0.2);
    expect(bottomWidthM).toBeCloseTo(6 - 2 * 0.25 * 2.5 + 0.4 * Math.hypot(1, 0.25), 12);
    const outerY = outline.outer[2]![0];
    const innerY = outline.cells[0]![0]![0];
    expect(Math.abs(innerY - outerY)).toBeCloseTo(0.4 * Math.hypot(1, 0.25), 12);
  });
});
