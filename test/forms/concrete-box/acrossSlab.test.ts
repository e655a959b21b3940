import { describe, expect, it } from 'vitest';
import { acrossNeed, acrossSlab, acrossStress } from '../../../lib/forms/concrete-box/acrossSlab.ts';
import { cellsFor } from '../../../lib/forms/concrete-box/boxLayout.ts';
import { boxVariants } from '../../../lib/forms/concrete-box/boxVariants.ts';
import { concreteBox } from '../../../lib/forms/concrete-box/index.ts';
import { cantileverBox } from '../../../lib/forms/cantilever-box/index.ts';
import type { DeckStrip, StandardId, UnitTask } from '../../../lib/model/index.ts';
import { deckSpec } from '../../../lib/site/index.ts';

const strip = (kind: DeckStrip['kind'], widthM: number): DeckStrip => ({
  kind,
  widthM,
  ultimateWidthM: widthM,
});
const deckOf = (widthM: number, standard: StandardId = 'lm1') =>
  deckSpec([strip('barrier', 0.5), strip('lane', widthM - 1), strip('barrier', 0.5)], 0.09, standard);
const slabOf = (widthM: number, standard: StandardId = 'lm1') => {
  const spacingM = widthM / 1.9;
  return acrossSlab({
    standard,
    deck: deckOf(widthM, standard),
    direction: 'across',
    spacingM,
    overhangM: 0.45 * spacingM,
    continuous: true,
    uniform: false,
  });
};
const taskOf = (widthM: number, standard: StandardId = 'lm1'): UnitTask => ({
  form: 'concrete-box',
  spansM: [48, 60, 48],
  deck: deckOf(widthM, standard),
  standard,
  planRadiusM: Infinity,
  method: 'falsework',
  depthM: 3,
});

describe('acrossStress(standard, width, turn)', () => {
  it('is the jacking stress less friction, draw-in and lasting losses, by hand', () => {
    // 0.79 x 1860 = 1469.4; e^(-0.19 (0.15 + 0.005 x 9)) = 0.96363; 6 mm x 195000 / 18 m = 65 MPa.
    const { initialMPa, lastingMPa } = acrossStress('lm1', 18, 0.3);
    expect(initialMPa).toBeCloseTo(1469.4 * 0.96363 - 65, 0);
    expect(lastingMPa).toBeCloseTo(0.85 * initialMPa, 6);
  });
});

describe('acrossNeed(moment, thickness, standard)', () => {
  it('leaves the open face without stress under 0.9 of it, by hand', () => {
    const kN = acrossNeed(200, 0.5, 'lm1');
    // W = 0.5^2 / 6, e = 0.16 m: 0.9 P (1 / 0.5 + 0.16 / 0.041667) = 200 / 0.041667.
    expect(kN).toBeCloseTo(200 / 0.0416667 / (0.9 * (2 + 0.16 / 0.0416667)), 0);
    const stress = (0.9 * kN) / 0.5 + (0.9 * kN * 0.16 - 200) / (0.5 ** 2 / 6);
    expect(Math.abs(stress)).toBeLessThan(1e-6);
  });

  it('is less in a thicker slab and none without a moment', () => {
    expect(acrossNeed(200, 0.6, 'lm1')).toBeLessThan(acrossNeed(200, 0.5, 'lm1'));
    expect(acrossNeed(0, 0.5, 'lm1')).toBe(0);
  });
});

describe('acrossSlab(slab)', () => {
  it.each(['lm1', 'hl93'] as const)('keeps every limit of a single cell to 20 m, %s', (standard) => {
    for (const widthM of [15, 17, 19.9]) {
      for (const { id, utilisation } of slabOf(widthM, standard).checks)
        expect([widthM, id, utilisation <= 1.0001]).toEqual([widthM, id, true]);
    }
  });

  it('has 5 to 12 kg/m2 of strand across, as decks of this kind do (common practice, no source), thicker when wider', () => {
    for (const standard of ['lm1', 'hl93'] as const) {
      const [narrow, wide] = [slabOf(15, standard), slabOf(19, standard)];
      for (const slab of [narrow, wide]) {
        expect(slab.strandKgM2).toBeGreaterThan(5);
        expect(slab.strandKgM2).toBeLessThan(12);
      }
      expect(wide.rootM).toBeGreaterThan(narrow.rootM);
      expect(wide.meanM).toBeGreaterThan(narrow.meanM);
    }
  });
});

describe('a box with tendons across', () => {
  it('cellsFor(width) keeps one cell to about 14 m plain and 20 m with tendons', () => {
    expect([cellsFor(13.9, false), cellsFor(14.3, false)]).toEqual([1, 2]);
    expect([cellsFor(19.9, true), cellsFor(20.2, true)]).toEqual([1, 2]);
    expect(boxVariants([60], deckOf(12))).toEqual([]);
    expect(boxVariants([60], deckOf(17))).toEqual([{ transverse: true }]);
  });

  it.each([concreteBox, cantileverBox])(
    'has one cell, two webs, its tendons measured and fewer bars',
    (form) => {
      const method = form.methods[0];
      const plainTask: UnitTask = {
        ...taskOf(17),
        form: form.id,
        method,
        spansM: [65, 100, 65],
        depthM: 3.6,
      };
      const plain = form.size(plainTask);
      const across = form.size({ ...plainTask, transverse: true });
      const total = (design: typeof plain, item: string): number =>
        design.lines.reduce((sum, line) => sum + (line.item === item ? line.quantity : 0), 0);
      expect([plain.figures['cells'], across.figures['cells']]).toEqual([2, 1]);
      const tendons = across.lines.find(({ what }) => what === 'tendons across the top slab')!;
      expect(tendons.quantity).toBeCloseTo(across.figures['acrossStrandKgM2']! * 230 * 17, 6);
      expect(total(across, 'reinforcement')).toBeLessThan(total(plain, 'reinforcement'));
      expect(plain.lines.some(({ what }) => what === 'tendons across the top slab')).toBe(false);
      // The drawn section has one void.
      const box = across.sections[0]!.shapes.find(({ holes }) => holes !== undefined)!;
      expect(box.holes).toHaveLength(1);
    },
  );
});
