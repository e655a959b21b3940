import { describe, expect, it } from 'vitest';
import { loadStandard } from '../../../lib/actions/index.ts';
import { quantityOf } from '../../../lib/forms/common/measured.ts';
import { superimposedOn } from '../../../lib/forms/common/superimposed.ts';
import { cantileverFigures } from '../../../lib/forms/cantilever-box/figures.ts';
import { cantileverBox } from '../../../lib/forms/cantilever-box/index.ts';
import { boxLayout } from '../../../lib/forms/concrete-box/boxLayout.ts';
import { wideBoxVariants } from '../../../lib/forms/concrete-box/boxVariants.ts';
import { boxFigures } from '../../../lib/forms/concrete-box/figures.ts';
import { concreteBox } from '../../../lib/forms/concrete-box/index.ts';
import type { Ribs } from '../../../lib/forms/concrete-box/ribs.ts';
import type { Design } from '../../../lib/model/index.ts';
import { cantileverTask } from '../cantilever-box/cases.ts';
import { boxTask, plainDeck } from './cases.ts';

const ribsAt = (widthM: number): Ribs => boxLayout(boxTask([50], 2.8, { widthM, ribs: true })).ribs!;
const permanentKN = ({ reactions }: Design): number =>
  reactions.reduce((sum, reaction) => sum + reaction.permanentKN, 0);
const m3Of = (design: Design, what: string): number =>
  design.lines.filter((line) => line.what === what).reduce((sum, { quantity }) => sum + quantity, 0);

describe('designRibs(case)', () => {
  it('hogs at the web by slab, rib, surfacing, edge and lanes on the wing: by hand', () => {
    // 20 m on one cell: webs 20 / 1.9 apart, wings of 4.737 m; ribs at 4 m; lanes of 3 m from the kerb, 9.5 m out.
    const layout = boxLayout(boxTask([50], 2.8, { widthM: 20, ribs: true }));
    const { ribs, slab, overhangM } = layout;
    expect(overhangM).toBeCloseTo(4.737, 3);
    const { rootM, widthM, rootMomentKNm } = ribs!;
    const below = rootM - slab.midM;
    const dead =
      25 * slab.midM * (overhangM ** 2 / 2) * 4 +
      25 * widthM * overhangM ** 2 * (0.15 / 2 + (below - 0.15) / 6);
    const { surfacingKNm2, edgesKNm } = superimposedOn(plainDeck(20));
    const laid = 4 * (surfacingKNm2 * (overhangM ** 2 / 2) + (edgesKNm / 2) * (overhangM - 0.25));
    // Lane 1 stands 2.737 m out of the web, of lane 2 (200 kN axles) only the outer wheel, 0.737 m out, half its axle.
    const axles = (1 + (4 - 1.2) / 4) * (300 * 2.737 + 200 * 0.5 * 0.737);
    const lanes = 4 * (9 * 3 * 2.737 + 2.5 * 1.237 * (1.237 / 2));
    const { uls } = loadStandard('lm1').factors;
    const byHand = uls.permanent * dead + uls.superimposed * laid + uls.traffic * (axles + lanes);
    expect(rootMomentKNm / byHand).toBeGreaterThan(0.95);
    expect(rootMomentKNm / byHand).toBeLessThan(1.05);
  });

  it('grows with the width of the deck; two cells halve the wings', () => {
    expect(ribsAt(20).rootMomentKNm).toBeGreaterThan(ribsAt(16).rootMomentKNm);
    expect(ribsAt(20).rootM).toBeGreaterThan(ribsAt(16).rootM);
    expect(ribsAt(24).rootMomentKNm).toBeLessThan(ribsAt(22).rootMomentKNm);
  });

  it('says where its bars no longer fit', () => {
    const wide = boxLayout(boxTask([50], 2.8, { widthM: 22.7, ribs: true })).ribs!;
    expect(wide.rootM).toBe(1.5);
    expect(wide.checks.find(({ id }) => id === 'rib-bars')!.utilisation).toBeGreaterThan(1);
  });

  it('measures what stands below the slab: trapezia under the wings, level inside', () => {
    const { ribs, slab, overhangM, spacingM } = boxLayout(boxTask([50], 2.8, { widthM: 20, ribs: true }));
    const below = ribs!.rootM - slab.midM;
    const stemM2 = overhangM * (0.15 + below) + spacingM * below;
    expect(ribs!.concreteM3M).toBeCloseTo((0.4 * stemM2) / 4, 9);
    expect(ribs!.formsM2M).toBeCloseTo((2 * stemM2) / 4, 9);
  });
});

describe.each(['lm1', 'hl93'] as const)('concreteBox.size(wide deck on ribs, %s)', (standard) => {
  const task = boxTask([48, 60, 48], 3.6, { widthM: 19, standard });
  const [plain, ribbed] = [concreteBox.size(task), concreteBox.size({ ...task, ribs: true })];

  it('has fewer cells, a slab of one thickness, its ribs measured, weighed and drawn', () => {
    expect(ribbed.figures['cells']).toBeLessThan(plain.figures['cells']!);
    expect(ribbed.figures['topSlabRootM']).toBe(ribbed.figures['topSlabMidM']);
    const concreteM3 = quantityOf(ribbed.lines, 'box-concrete');
    const laid = task.deck.superimposedKNm * 156;
    const gamma = loadStandard(standard).unitWeights.concreteKNm3;
    expect(permanentKN(ribbed) / (gamma * concreteM3 + laid)).toBeCloseTo(1, 2);
    expect(m3Of(ribbed, 'ribs under the slab')).toBeGreaterThan(0);
    expect(m3Of(ribbed, 'bars of the ribs')).toBeGreaterThan(0);
    for (const { shapes } of ribbed.sections)
      expect(shapes.filter(({ part }) => part === 'rib')).toHaveLength(1);
    expect(ribbed.elevation.filter(({ part }) => part === 'rib')).toHaveLength(39);
  });

  it('holds, and says where its figures come from', () => {
    expect(ribbed.limitingCheck.utilisation).toBeLessThanOrEqual(1.0001);
    const manual = new Set(boxFigures.map(({ path }) => path));
    for (const name of Object.keys(ribbed.figures).filter((one) => one.startsWith('rib')))
      expect(manual).toContain(`options/:option/designs/:unit/figures/${name}`);
  });

  it('is carried in one way', () => {
    expect(() => concreteBox.size({ ...task, ribs: true, struts: true })).toThrow(/carried in one way/u);
    expect(() => concreteBox.size({ ...task, ribs: true, transverse: true })).toThrow(/Leave the ribs out/u);
  });
});

describe('cantileverBox.size(wide deck on ribs)', () => {
  const task = cantileverTask([62, 100, 62], 3.2, { widthM: 19 });
  const [plain, ribbed] = [cantileverBox.size(task), cantileverBox.size({ ...task, ribs: true })];

  it('carries them on its arms and says where its figures come from', () => {
    expect(ribbed.figures['cells']).toBe(1);
    expect(plain.figures['cells']).toBe(2);
    const laid = task.deck.superimposedKNm * 224;
    expect(permanentKN(ribbed) / (25 * quantityOf(ribbed.lines, 'box-concrete') + laid)).toBeCloseTo(1, 2);
    const manual = new Set(cantileverFigures.map(({ path }) => path));
    const added = Object.keys(ribbed.figures).filter((name) => !(name in plain.figures));
    expect(added.length).toBeGreaterThan(3);
    for (const name of ['ribDepthM', 'ribRootKNm', 'ribInsideKNm', 'ribShearKN'])
      expect(added).toContain(name);
    for (const name of added)
      if (!/\d/u.test(name)) expect(manual).toContain(`options/:option/designs/:unit/figures/${name}`);
  });
});

describe('wideBoxVariants(spans, deck, method)', () => {
  it('tries ribs where they save a cell of a deck that tendons across do not carry on one', () => {
    const ribs = (widthM: number): boolean =>
      wideBoxVariants([50, 60, 50], plainDeck(widthM), 'falsework', 0.06).some((one) => one.ribs === true);
    expect([12, 18, 21, 24].map(ribs)).toEqual([false, false, true, true]);
  });
});
