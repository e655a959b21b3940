import { describe, expect, it } from 'vitest';
import { boxLayout } from '../../../lib/forms/concrete-box/boxLayout.ts';
import { concreteBox } from '../../../lib/forms/concrete-box/index.ts';
import { cantileverBox } from '../../../lib/forms/cantilever-box/index.ts';
import type { Design, UnitTask } from '../../../lib/model/index.ts';
import { cantileverTask } from '../cantilever-box/cases.ts';
import { boxTask } from './cases.ts';

const use = ({ checks }: Design, id: string): number => checks.find((one) => one.id === id)!.utilisation;
const boxWidthOf = ({ cells, spacingM }: { cells: number; spacingM: number }): number => cells * spacingM;

describe('boxLayout(task with a width of its box)', () => {
  it.each([
    ['plain', {}],
    ['two cells', { widthM: 20 }],
    ['tendons across', { widthM: 18, transverse: true }],
    ['struts', { widthM: 24, struts: true }],
  ] as const)('is the layout there is where it is asked as wide as that: %s', (_, change) => {
    const task: UnitTask = boxTask([50], 3.5, change);
    const open = boxLayout(task);
    const asked = boxLayout({ ...task, boxWidthM: boxWidthOf(open) });
    expect(asked.cells).toBe(open.cells);
    for (const name of ['spacingM', 'overhangM'] as const) expect(asked[name]).toBeCloseTo(open[name], 9);
    expect(asked.struts?.outM ?? 0).toBeCloseTo(open.struts?.outM ?? 0, 9);
    expect(asked.slab.midM).toBe(open.slab.midM);
  });

  it('fills the deck: box, strut heads and overhangs', () => {
    for (const boxWidthM of [6, 9, 14]) {
      const { cells, spacingM, overhangM, struts } = boxLayout(
        boxTask([50], 3.5, { widthM: 20, struts: true, boxWidthM }),
      );
      expect(cells * spacingM).toBeCloseTo(boxWidthM, 9);
      expect(boxWidthM + 2 * (overhangM + struts!.outM)).toBeCloseTo(20, 9);
    }
  });

  it('has as many cells as the slab between the webs asks for', () => {
    // 7.4 m between the webs of a plain slab: 7.4 m is one cell, 7.5 m two.
    for (const [boxWidthM, cells] of [
      [7.4, 1],
      [7.5, 2],
    ] as const)
      expect(boxLayout(boxTask([50], 2.5, { widthM: 12, boxWidthM })).cells).toBe(cells);
  });

  it('leans its webs so that the soffit keeps 0.7 of the box or 1 in 4', () => {
    const at = (boxWidthM: number): number => boxLayout(boxTask([50], 2.5, { boxWidthM })).slope;
    expect(at(4)).toBeCloseTo((0.3 * 4) / 5, 9);
    expect(at(8)).toBe(0.25);
  });
});

describe.each([
  ['concrete-box', (change: object) => concreteBox.size(boxTask([40, 50, 40], 2.4, change))],
  ['cantilever-box', (change: object) => cantileverBox.size(cantileverTask([65, 110, 65], 3, change))],
] as const)('size(%s) with a width of its box', (_, size) => {
  const [narrow, wide] = [size({ boxWidthM: 5 }), size({ boxWidthM: 7.4 })];

  it('draws, measures and reports the box asked for', () => {
    expect(narrow.figures['webSpacingM']).toBe(5);
    expect(narrow.figures['overhangM']).toBeCloseTo(3.5, 9);
    expect(wide.figures['pierInertiaM4']!).toBeGreaterThan(0);
  });

  it('is stiffer where it is wider, by the flange it gains at the bottom', () => {
    expect(wide.figures['inertiaM4']!).toBeGreaterThan(narrow.figures['inertiaM4']!);
    expect(wide.figures['centroidFromTopM']!).toBeGreaterThan(narrow.figures['centroidFromTopM']!);
  });

  it('thickens the roots of longer wings', () => {
    expect(narrow.figures['topSlabRootM']!).toBeGreaterThan(wide.figures['topSlabRootM']!);
  });

  it('is refused by its slab where the wings reach too far, with the number', () => {
    const design = size({ boxWidthM: 2.6, deck: { ...narrow.task.deck, widthM: 20, carriagewayM: 19 } });
    expect(use(design, 'slab-root')).toBeGreaterThan(1);
    expect(design.warnings.some((text) => /[Ss]lab over its supports.*: \d+ %/u.test(text))).toBe(true);
  });
});
