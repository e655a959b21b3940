import { describe, expect, it } from 'vitest';
import { figure, figurePaths } from '../../../lib/explain/index.ts';
import { quantityOf } from '../../../lib/forms/common/measured.ts';
import { formModule } from '../../../lib/forms/index.ts';
import { steelBox } from '../../../lib/forms/steel-box/index.ts';
import { itemOf } from '../../../lib/takeoff/index.ts';
import { lowFerry } from '../../appraise/studies.ts';
import { steelBoxTask } from './cases.ts';
import { answerTo } from '../../appraise/answerTo.ts';

const usual = steelBoxTask([80, 100, 80], 3.6);
const useOf = (design: ReturnType<typeof steelBox.size>, id: string): number =>
  design.checks.find((check) => check.id === id)!.utilisation;

describe('steelBox.size()', () => {
  it('is registered under its id', () => {
    expect(formModule('steel-box')).toBe(steelBox);
  });

  it.each([
    [{ spansM: [] }, /spansM/u],
    [{ spansM: [40, NaN] }, /spansM\[1\]/u],
    [{ depthM: 0 }, /depthM/u],
    [{ deckPlateM: 0 }, /deckPlateM/u],
  ])('size(%o) says what is wrong', (change, message) => {
    expect(() => steelBox.size({ ...usual, ...change })).toThrow(message);
  });

  it('sizes ordinary units within all limits, with items of the bill only', () => {
    for (const task of [
      usual,
      steelBoxTask([120, 150, 120], 5),
      steelBoxTask([80, 100, 80], 4, { widthM: 30 }),
      steelBoxTask([90], 3.6, { method: 'launch' }),
      steelBoxTask([70, 90, 70], 3.6, { method: 'launch' }),
      steelBoxTask([80, 100, 80], 3.6, { standard: 'hl93' }),
    ]) {
      const design = steelBox.size(task);
      for (const { id, utilisation } of design.checks) expect(utilisation, id).toBeLessThanOrEqual(1);
      for (const { item, quantity } of design.lines) {
        expect(() => itemOf(item)).not.toThrow();
        expect(quantity).toBeGreaterThan(0);
      }
    }
  });

  it('carries its weight: permanent reactions are the measured steel and the superimposed load', () => {
    for (const task of [
      usual,
      steelBoxTask([90], 3.6, { method: 'launch' }),
      steelBoxTask([88, 134, 170, 134, 88], 5.5, { widthM: 28 }),
    ]) {
      const design = steelBox.size(task);
      const length = task.spansM.reduce((sum, span) => sum + span, 0);
      const weight =
        9.81e-3 * quantityOf(design.lines, 'orthotropic-steel') + task.deck.superimposedKNm * length;
      const sum = design.reactions.reduce((all, { permanentKN }) => all + permanentKN, 0);
      expect(sum / weight).toBeCloseTo(1, 2);
      expect(quantityOf(design.lines, 'orthotropic-steel') / length / task.deck.widthM).toBeCloseTo(
        design.figures.steelKgM2!,
        6,
      );
    }
  });

  it('keeps the moment of the arms in the piers where spans are cantilevered: w L2 / 8 against less in one cast', () => {
    const arms = steelBox.size(steelBoxTask([80, 100, 80], 4.5));
    expect(arms.figures.cantileveredSpans).toBe(1);
    const pushed = steelBox.size(steelBoxTask([80, 100, 80], 4.5, { method: 'launch' }));
    expect(pushed.figures.cantileveredSpans).toBe(0);
    const sagOver = (d: typeof arms): number => d.figures.span2SagDesignKNm! / d.figures.steelKgM2!;
    expect(sagOver(arms)).toBeLessThan(sagOver(pushed));
  });

  it('respects the depth that is asked for and says what is too shallow', () => {
    const shallow = steelBox.size(steelBoxTask([48, 60, 48], 1.2));
    expect(shallow.depthM.midspan).toBe(1.2);
    expect(useOf(shallow, 'box-depth')).toBeCloseTo(1.25, 6);
    expect(shallow.warnings.some((warning) => /least depth of a box: 125 %/iu.test(warning))).toBe(true);
  });

  it('is haunched where that saves steel, and never where it is launched', () => {
    expect(steelBox.size(steelBoxTask([120, 150, 120], 4.2)).depthM.support).toBeGreaterThan(5.9);
    const pushed = steelBox.size(steelBoxTask([80, 100, 80], 2.8, { method: 'launch' }));
    expect(pushed.depthM.support).toBe(2.8);
  });

  it('takes the depth over the piers that is asked for, never one above the soffit of its spans', () => {
    const asked = steelBox.size({ ...usual, haunch: { pierDepthM: 4.4, law: 'parabolic' } });
    expect(asked.depthM).toEqual({ support: 4.4, midspan: 3.6 });
    expect(() => steelBox.size({ ...usual, haunch: { pierDepthM: 3, law: 'parabolic' } })).toThrow(
      /haunch\.pierDepthM: expected at least/u,
    );
  });

  it('says that a thin deck plate is too thin, and is lighter for it', () => {
    const thin = steelBox.size({ ...usual, deckPlateM: 0.01 });
    expect(useOf(thin, 'deck-plate')).toBeCloseTo(1.4, 6);
    expect(thin.figures.deckPlateKgM2).toBeLessThan(steelBox.size(usual).figures.deckPlateKgM2!);
  });

  it('turns a curve in plan into torque and moves the bearings apart', () => {
    const straight = steelBox.size(usual);
    const curved = steelBox.size({ ...usual, planRadiusM: 300 });
    expect(straight.figures.curveTorqueKNm).toBe(0);
    expect(curved.figures.torqueDesignKNm).toBeGreaterThan(straight.figures.torqueDesignKNm!);
    expect(useOf(curved, 'bearing-uplift')).toBeGreaterThan(useOf(straight, 'bearing-uplift'));
  });

  it('names the limit where the span is too long for the thickest practical plates', () => {
    const design = steelBox.size(steelBoxTask([240, 300, 240], 8));
    expect(design.limitingCheck.utilisation).toBeGreaterThan(1);
    expect(['bending-shear', 'bottom-buckling', 'deflection']).toContain(design.limitingCheck.id);
    expect(design.warnings.length).toBeGreaterThan(0);
  });
});

it(
  'appraise(study) with steel boxes explains every figure of theirs in its own words',
  { timeout: 60_000 },
  () => {
    const study = lowFerry();
    const boxes = {
      ...study,
      books: { ...study.books, draws: 1000 },
      options: { ...study.options, forms: ['steel-box' as const], kept: [] },
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
