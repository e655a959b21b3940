import { describe, expect, it } from 'vitest';
import { cantileverBox } from '../../../lib/forms/cantilever-box/index.ts';
import type { Design } from '../../../lib/model/index.ts';
import { cantileverSpans, cantileverTask } from './cases.ts';

const mass = (design: Design, what: string): number =>
  design.lines.filter((line) => line.what === what).reduce((sum, { quantity }) => sum + quantity, 0);

describe('cantileverBox.size(wide deck on struts)', () => {
  const task = cantileverTask(cantileverSpans(120), 4, { widthM: 24 });
  const plain = cantileverBox.size(task);
  const strutted = cantileverBox.size({ ...task, struts: true });

  it('has fewer cells and holds', () => {
    expect(strutted.figures['cells']!).toBeLessThan(plain.figures['cells']!);
    expect(strutted.limitingCheck.utilisation).toBeLessThanOrEqual(1.0001);
    expect(plain.checks.some(({ id }) => id === 'wing-struts')).toBe(false);
    expect(strutted.checks.some(({ id }) => id === 'wing-struts')).toBe(true);
  });

  it('measures struts that grow longer towards the piers', () => {
    const { strutSideM = 0, strutLengthM = 0 } = strutted.figures;
    const rows = (2 * 2.24 * 120) / 4;
    const atMidspan = rows * strutSideM ** 2 * strutLengthM;
    expect(mass(strutted, 'struts under the wings')).toBeGreaterThan(1.05 * atMidspan);
    // No longer than from the deck to the soffit over the pier and out to the heads.
    const longest = Math.hypot(strutted.depthM.support, strutted.figures['strutsOutM']! + 1);
    expect(mass(strutted, 'struts under the wings')).toBeLessThan(rows * strutSideM ** 2 * longest);
  });

  it('carries their weight: permanent reactions are box, struts, diaphragms and superimposed load', () => {
    const m3 = ['box', 'blisters and joints', 'struts under the wings'].reduce(
      (sum, what) => sum + mass(strutted, what),
      strutted.lines.find(({ item, what }) => item === 'box-concrete' && what === 'diaphragms')!.quantity,
    );
    const laid = 2.24 * 120 * task.deck.superimposedKNm;
    const permanent = strutted.reactions.reduce((sum, { permanentKN }) => sum + permanentKN, 0);
    expect(permanent / (25 * m3 + laid)).toBeCloseTo(1, 2);
  });

  it('shows them in both cuts, steeper at the pier', () => {
    const steep = strutted.sections.map(({ shapes }) => {
      const [head, foot] = shapes.find(({ part }) => part === 'strut')!.points;
      return Math.abs((foot![1] - head![1]) / (foot![0] - head![0]));
    });
    expect(steep).toHaveLength(2);
    expect(steep[1]!).toBeGreaterThan(steep[0]!);
    // No flatter than 30 degrees: common practice, no source.
    expect(steep[0]!).toBeGreaterThan(0.57);
  });
});

describe('cantileverBox.variants(spans, deck, method)', () => {
  it('offers struts on a deck that one cell no longer carries without', () => {
    const offers = (widthM: number): boolean =>
      cantileverBox.variants!(
        cantileverSpans(120),
        cantileverTask(cantileverSpans(120), 4, { widthM }).deck,
        'balanced-cantilever',
      ).some(({ struts }) => struts);
    expect([12, 18, 24].map(offers)).toEqual([false, false, true]);
  });
});
