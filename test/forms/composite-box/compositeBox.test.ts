import { describe, expect, it } from 'vitest';
import { figure, figurePaths } from '../../../lib/explain/index.ts';
import { quantityOf } from '../../../lib/forms/common/measured.ts';
import { compositeBox } from '../../../lib/forms/composite-box/index.ts';
import { formModule } from '../../../lib/forms/index.ts';
import { itemOf } from '../../../lib/takeoff/index.ts';
import { lowFerry } from '../../appraise/studies.ts';
import { tubTask } from './cases.ts';
import { answerTo } from '../../appraise/answerTo.ts';

const usual = tubTask([48, 60, 48], 2.6);
const useOf = (design: ReturnType<typeof compositeBox.size>, id: string): number =>
  design.checks.find((check) => check.id === id)!.utilisation;

describe('compositeBox.size()', () => {
  it('is registered under its id', () => {
    expect(formModule('composite-box')).toBe(compositeBox);
  });

  it.each([
    [{ spansM: [] }, /spansM/u],
    [{ spansM: [40, NaN] }, /spansM\[1\]/u],
    [{ depthM: 0 }, /depthM/u],
    [{ planRadiusM: -1 }, /planRadiusM/u],
  ])('size(%o) says what is wrong', (change, message) => {
    expect(() => compositeBox.size({ ...usual, ...change })).toThrow(message);
  });

  it('sizes an ordinary unit within all limits, with items of the bill only', () => {
    const design = compositeBox.size(usual);
    for (const { id, utilisation } of design.checks) expect(utilisation, id).toBeLessThanOrEqual(1.0001);
    expect(design.warnings).toEqual([]);
    for (const { item, quantity } of design.lines) {
      expect(() => itemOf(item)).not.toThrow();
      expect(quantity).toBeGreaterThan(0);
    }
  });

  it('carries its weight: permanent reactions are the measured steel, slab and superimposed load', () => {
    for (const task of [usual, tubTask([50], 2.4), tubTask([48, 60, 48], 2.6, { widthM: 20 })]) {
      const design = compositeBox.size(task);
      const length = task.spansM.reduce((sum, span) => sum + span, 0);
      const weight =
        9.81e-3 * quantityOf(design.lines, 'plate-girder-steel') +
        25 * quantityOf(design.lines, 'deck-concrete') +
        task.deck.superimposedKNm * length;
      const sum = design.reactions.reduce((all, { permanentKN }) => all + permanentKN, 0);
      expect(sum / weight).toBeCloseTo(1, 2);
      expect(quantityOf(design.lines, 'plate-girder-steel') / length / task.deck.widthM).toBeCloseTo(
        design.figures.steelKgM2!,
        6,
      );
    }
  });

  it('paints the inside too, and has room to walk in', () => {
    const design = compositeBox.size(usual);
    const inside = design.lines.find(({ what }) => what === 'inside of the boxes')!.quantity;
    const outside = design.lines.find(({ what }) => what === 'outside of the boxes')!.quantity;
    expect(inside).toBeGreaterThan(outside);
    expect(design.figures.boxInnerHeightM).toBeGreaterThan(1.8);
    expect(design.figures.boxInnerHeightM).toBeLessThan(2.6);
  });

  it('turns a curve in plan into torque, shear of the webs and uplift of the inner bearing', () => {
    const straight = compositeBox.size(usual);
    const curved = compositeBox.size({ ...usual, planRadiusM: 300 });
    const sharp = compositeBox.size({ ...usual, planRadiusM: 120 });
    expect(straight.figures.curveTorqueKNm).toBe(0);
    expect(curved.figures.torqueDesignKNm).toBeGreaterThan(straight.figures.torqueDesignKNm!);
    expect(useOf(curved, 'bearing-uplift')).toBeGreaterThan(useOf(straight, 'bearing-uplift'));
    expect(useOf(sharp, 'bearing-uplift')).toBeGreaterThan(1);
    expect(sharp.warnings.some((warning) => /[Uu]plift/u.test(warning))).toBe(true);
  });

  it('has one box up to 16 m of deck and two beyond', () => {
    expect(compositeBox.size(usual).figures.boxes).toBe(1);
    expect(compositeBox.size(tubTask([48, 60, 48], 2.6, { widthM: 18 })).figures.boxes).toBe(2);
  });

  it('stands its webs up and widens its top flanges before it gives up', () => {
    // Two boxes of 120 m span: the bottom plates between leaning webs would be 2.1 m wide, and 120 mm of them not enough.
    const wide = compositeBox.size(tubTask([96, 120, 96], 4.8, { widthM: 17 }));
    expect(wide.limitingCheck.utilisation).toBeLessThanOrEqual(1);
    const single = compositeBox.size(tubTask([96, 120, 96], 4.8, { widthM: 14 }));
    expect(useOf(single, 'bending-piers')).toBeLessThan(1.02);
  });

  it('gives up with a warning where the plates run out', () => {
    const design = compositeBox.size(tubTask([100, 130, 100], 2.6));
    expect(design.limitingCheck.utilisation).toBeGreaterThan(1);
    expect(design.warnings.length).toBeGreaterThan(0);
  });
});

it(
  'appraise(study) with composite boxes explains every figure of theirs in its own words',
  { timeout: 60_000 },
  () => {
    const study = lowFerry();
    const boxes = {
      ...study,
      books: { ...study.books, draws: 1000 },
      options: { ...study.options, forms: ['composite-box' as const], kept: [] },
    };
    const context = { study: boxes, appraisal: answerTo(boxes) };
    expect(context.appraisal.options.length).toBeGreaterThan(0);
    const unsaid = figurePaths(context).filter((path) =>
      /its unit stands at the end of its name|^(demand|capacity) of the check '/u.test(
        figure(context, path).because.formula,
      ),
    );
    expect(unsaid).toEqual([]);
  },
);
