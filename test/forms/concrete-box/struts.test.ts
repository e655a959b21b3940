import { describe, expect, it } from 'vitest';
import { crossValue } from '../../../lib/actions/index.ts';
import { wideBoxVariants } from '../../../lib/forms/concrete-box/boxVariants.ts';
import { concreteBox } from '../../../lib/forms/concrete-box/index.ts';
import { strutPlan } from '../../../lib/forms/concrete-box/strutPlan.ts';
import { strutLine, strutReaction, worstAxles } from '../../../lib/forms/concrete-box/strutReaction.ts';
import { pressedShare } from '../../../lib/forms/concrete-box/struts.ts';
import type { Design, DeckStrip, StandardId, UnitTask } from '../../../lib/model/index.ts';
import { deckSpec } from '../../../lib/site/index.ts';

const strip = (kind: DeckStrip['kind'], widthM: number): DeckStrip => ({
  kind,
  widthM,
  ultimateWidthM: widthM,
});
const deckOf = (widthM: number, standard: StandardId = 'lm1') =>
  deckSpec([strip('barrier', 0.5), strip('lane', widthM - 1), strip('barrier', 0.5)], 0.09, standard);
const taskOf = (widthM: number, spanM: number, depthM: number, standard: StandardId = 'lm1'): UnitTask => ({
  form: 'concrete-box',
  spansM: [0.8 * spanM, spanM, 0.8 * spanM],
  deck: deckOf(widthM, standard),
  standard,
  planRadiusM: Infinity,
  method: 'falsework',
  depthM,
});
const figure = (design: Design, name: string): number => design.figures[name]!;
const mass = (design: Design, what: string): number =>
  design.lines.filter((line) => line.what === what).reduce((sum, { quantity }) => sum + quantity, 0);

describe('strutPlan(width, depth, tendons across)', () => {
  it('puts the heads where the next web would be, as far as a strut of 30 degrees reaches', () => {
    // 24.4 m over 1 + 2 + 2 x 0.45 fields is 6.26 m; a box 6 m deep reaches further, one 2.5 m deep does not.
    const deep = strutPlan(24.4, 6, false);
    expect(deep.cells).toBe(1);
    expect(deep.outM).toBeCloseTo(24.4 / 3.9, 6);
    const low = strutPlan(24.4, 2.5, false);
    expect(low.outM).toBeCloseTo(1.9 / Math.tan(Math.PI / 6) - 0.25 * 2.2, 2);
    for (const { cells, spacingM, outM, overhangM } of [deep, low])
      expect(cells * spacingM + 2 * outM + 2 * overhangM).toBeCloseTo(24.4, 9);
  });

  it('carries a deck of about 30 m on one cell, as single boxes do (common practice, no source)', () => {
    expect(strutPlan(28.8, 7, false).cells).toBe(1);
    expect(strutPlan(30, 7, true).cells).toBe(1);
    expect(strutPlan(30, 3, false).cells).toBeGreaterThan(1);
  });
});

describe('strutPlan(Kochertal viaduct)', () => {
  it('has its one cell of 8.6 m and its wings of 11.2 m under a deck of 31 m, 6.5 m deep', () => {
    // Web spacing, cantilever, width and depth as printed in a public encyclopaedia, read.
    const { cells, spacingM, outM, overhangM } = strutPlan(31, 6.5, true);
    expect(cells).toBe(1);
    expect(Math.abs(spacingM / 8.6 - 1)).toBeLessThan(0.1);
    expect(Math.abs((outM + overhangM) / 11.2 - 1)).toBeLessThan(0.1);
  });
});

describe('strutLine(width, plan)', () => {
  const plan = { cells: 1, spacingM: 6, outM: 6, overhangM: 2.7 };
  const line = strutLine(23.4, plan);

  it('is the end reaction of two equal spans, 0.4063 in the middle (A. Hicks, formulas of continuous beams, from memory)', () => {
    expect(crossValue(line, 3)).toBeCloseTo(0, 9);
    expect(crossValue(line, 6)).toBeCloseTo(13 / 32, 9);
    expect(crossValue(line, 9)).toBeCloseTo(1, 9);
  });

  it('is 1 + 1.25 x / l on the overhang of two equal spans', () => {
    expect(crossValue(line, 9 + 2)).toBeCloseTo(1 + (1.25 * 2) / 6, 9);
  });
});

describe('strutReaction(standard, deck, plan, thickness, spacing)', () => {
  it('is what lanes on their line come to, by hand', () => {
    const plan = { cells: 1, spacingM: 6.55, outM: 3.78, overhangM: 2.945 };
    const line = strutReaction('lm1', deckOf(20), plan, 0.3, 4);
    // Lanes at 2, 5 and 8 m from the edge stand at 1.297, 0.388 and nothing: 27 and 7.5 kN/m, axles of 300 and 200 kN.
    expect(line.trafficKNm).toBeCloseTo(27 * 1.297 + 7.5 * 0.388, 0);
    const axleKN = 300 * 1.297 + 200 * 0.388;
    // Two axles 1.2 m apart on struts at 4 m: 1 + 2.8 / 4.
    const most = worstAxles(line, 4, (x) => Math.max(0, 1 - Math.abs(x) / 4));
    expect(most / (1.7 * axleKN)).toBeCloseTo(1, 1);
  });
});

describe('pressedShare(length, side, off the middle)', () => {
  it('is 1.14 (1 - 2 e / h) - 0.02 l / h (EN 1992-1-1 12.6.5.2, from memory), by hand', () => {
    expect(pressedShare(5, 0.4, 0.02)).toBeCloseTo(1.14 * 0.9 - 0.25, 9);
    expect(pressedShare(0.4, 0.4, 0.02)).toBeCloseTo(0.9, 9);
    expect(pressedShare(40, 0.4, 0.02)).toBe(0);
  });
});

describe.each(['lm1', 'hl93'] as const)('concreteBox.size(wide deck on struts, %s)', (standard) => {
  const plainTask = taskOf(24, 60, 3.4, standard);
  const plain = concreteBox.size(plainTask);
  const strutted = concreteBox.size({ ...plainTask, struts: true });

  it('has fewer cells, less concrete, and its struts measured and drawn', () => {
    expect(figure(strutted, 'cells')).toBeLessThan(figure(plain, 'cells'));
    expect(figure(strutted, 'concreteM3M2')).toBeLessThan(figure(plain, 'concreteM3M2'));
    const rows = (2.6 * 60) / 4;
    const eachM3 = figure(strutted, 'strutSideM') ** 2 * figure(strutted, 'strutLengthM');
    expect(mass(strutted, 'struts under the wings')).toBeCloseTo(2 * rows * eachM3, 6);
    for (const { shapes } of strutted.sections) {
      expect(shapes.filter(({ part }) => part === 'strut')).toHaveLength(2);
      const [box] = shapes.filter(({ part }) => part === 'box');
      const across = box!.points.map(([y]) => y);
      expect(Math.max(...across) - Math.min(...across)).toBeCloseTo(24, 9);
    }
    expect(strutted.limitingCheck.utilisation).toBeLessThanOrEqual(1.0001);
  });

  it('is in balance: force, pull and hung load of a strut are one triangle', () => {
    const [force, tie, hang] = ['strutForceKN', 'strutTieKNm', 'strutHangKNm'].map((name) =>
      figure(strutted, name),
    );
    expect(Math.hypot(4 * tie!, 4 * hang!) / force!).toBeCloseTo(1, 9);
  });

  it('asks for heavier struts under a wider deck', () => {
    const wider = concreteBox.size({ ...taskOf(26, 60, 3.4, standard), struts: true });
    expect(figure(wider, 'strutForceKN')).toBeGreaterThan(figure(strutted, 'strutForceKN'));
  });
});

describe('wideBoxVariants(spans, deck, method)', () => {
  it('offers struts beyond what one cell carries without, where they save a cell', () => {
    const has = (widthM: number, method: 'falsework' | 'launch' = 'falsework') =>
      wideBoxVariants([48, 60, 48], deckOf(widthM), method, 0.0625).some(({ struts }) => struts);
    expect([13, 17, 19.9, 20.5, 24, 28].map((widthM) => has(widthM))).toEqual([
      false,
      false,
      false,
      true,
      true,
      true,
    ]);
    expect(has(24, 'launch')).toBe(false);
  });
});
