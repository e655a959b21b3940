import { describe, expect, it } from 'vitest';
import { slabOutline, slabSections } from '../../../lib/forms/slab/slabSection.ts';
import { deck } from './cases.ts';

describe('slabOutline()', () => {
  it('is a plain rectangle while thin', () => {
    const { span } = slabSections(slabOutline(deck, 0.5, 0.25), 0.5);
    expect(span.areaM2).toBeCloseTo(12 * 0.5, 12);
    expect(span.inertiaM4).toBeCloseTo((12 * 0.5 ** 3) / 12, 12);
    expect(span.topM).toBeCloseTo(0.25, 12);
  });

  it('takes the area and inertia of round voids off a deep slab, and leaves it solid over the supports', () => {
    const depthM = 1.1;
    const outline = slabOutline(deck, depthM, 0.35);
    const { span, solid } = slabSections(outline, depthM);
    const n = outline.voids.length;
    const d = outline.voidDiameterM;
    expect(n).toBeGreaterThanOrEqual(2);
    expect(d).toBeCloseTo(1.1 - 0.2 - 0.17, 12);
    const hole = (Math.PI * d ** 2) / 4;
    expect(span.areaM2).toBeCloseTo(solid.areaM2 - n * hole, 9);
    // By Steiner about the new centroid; the polygon of 24 corners has the area of the circle, its inertia within 0.1 %.
    const voidDepth = 0.2 + d / 2;
    const top = (solid.areaM2 * solid.topM - n * hole * voidDepth) / span.areaM2;
    const inertia =
      solid.inertiaM4 +
      solid.areaM2 * (solid.topM - top) ** 2 -
      n * ((Math.PI * d ** 4) / 64 + hole * (voidDepth - top) ** 2);
    expect(span.topM).toBeCloseTo(top, 9);
    expect(span.inertiaM4 / inertia).toBeCloseTo(1, 4);
    expect(span.websM).toBeCloseTo(outline.soffitM - n * d, 12);
  });

  it('keeps ribs and edges between the voids', () => {
    const { voids, voidDiameterM, soffitM } = slabOutline(deck, 1.2, 0.35);
    const middles = voids.map((hole) => hole.reduce((sum, [y]) => sum + y, 0) / hole.length);
    middles
      .slice(1)
      .forEach((y, i) => expect(y - middles[i]! - voidDiameterM).toBeGreaterThanOrEqual(0.3 - 1e-9));
    expect(soffitM / 2 - middles.at(-1)! - voidDiameterM / 2).toBeCloseTo(0.7, 9);
  });
});
