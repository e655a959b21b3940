import { describe, expect, it } from 'vitest';
import { deckDepth, taskAt } from '../../lib/appraise/deckDepth.ts';
import { limitingSpan, type LimitingSpan } from '../../lib/appraise/limitingSpan.ts';
import { finish } from '../../lib/appraise/work.ts';
import { cannotCarry, formModule } from '../../lib/forms/index.ts';
import type { DeckStrip, FormId, UnitTask } from '../../lib/model/index.ts';
import { meanRates, ratesFor } from '../../lib/price/index.ts';
import { deckSpec } from '../../lib/site/index.ts';

const mean = meanRates(ratesFor({ ratePack: 'demo-2026', rates: [] }));

function taskOf(
  form: FormId,
  spansM: number[],
  lanes = 3,
  more: Partial<UnitTask> = {},
): Omit<UnitTask, 'depthM'> {
  const edge: DeckStrip = { kind: 'barrier', widthM: 0.5, ultimateWidthM: 0.5 };
  const lane: DeckStrip = { kind: 'lane', widthM: 3.5, ultimateWidthM: 3.5 };
  const strips = [edge, ...Array.from({ length: lanes }, () => lane), edge];
  return {
    form,
    spansM,
    deck: deckSpec(strips, 0.09, 'lm1'),
    standard: 'lm1',
    planRadiusM: Infinity,
    method: formModule(form).methods[0],
    ...more,
  };
}
const limitOf = (task: Omit<UnitTask, 'depthM'>): LimitingSpan =>
  finish(limitingSpan({ task, haunch: 1 }, mean));
const reach = (...asked: Parameters<typeof taskOf>): number => limitOf(taskOf(...asked)).fails!.spanM;

/** Whether a unit with these spans carries at the depth that is found for it afresh. */
function carriesAt(task: Omit<UnitTask, 'depthM'>, spanM: number): boolean {
  const governing = Math.max(...task.spansM);
  const unit = { task: { ...task, spansM: task.spansM.map((one) => (one * spanM) / governing) }, haunch: 1 };
  const { depthM } = finish(deckDepth(unit, mean));
  return cannotCarry([formModule(task.form).size(taskAt(unit, depthM))]) === null;
}

describe('limitingSpan(unit, rates)', () => {
  it.each<[FormId, number[]]>([
    ['slab', [20]],
    ['composite-i', [60, 80, 60]],
    ['precast-i', [30]],
    ['half-through', [40]],
    ['concrete-box', [35, 45, 35]],
  ])(
    '%s, spans in the proportion %o: below it carries, above it does not, and the limit is a real check',
    (form, spansM) => {
      const task = taskOf(form, spansM);
      const { carries, fails, ownWeightHalfM, ownWeight80M } = limitOf(task);
      expect(fails!.spanM).toBeGreaterThan(carries!.spanM);
      expect(fails!.spanM / carries!.spanM).toBeLessThan(1.0051);
      expect(carriesAt(task, 0.96 * carries!.spanM)).toBe(true);
      expect(carriesAt(task, 1.04 * fails!.spanM)).toBe(false);
      const { limitingCheck, task: sized } = fails!.design;
      expect(limitingCheck.utilisation).toBeGreaterThan(1);
      expect(Number.isFinite(limitingCheck.utilisation)).toBe(true);
      const ratios = sized.spansM.map((one) => one / fails!.spanM);
      ratios.forEach((ratio, i) => expect(ratio).toBeCloseTo(spansM[i]! / Math.max(...spansM), 9));
      if (ownWeightHalfM !== null && ownWeight80M !== null) expect(ownWeightHalfM).toBeLessThan(ownWeight80M);
      if (ownWeight80M !== null) expect(ownWeight80M).toBeLessThanOrEqual(carries!.spanM);
    },
  );

  it('reads off own-weight spans at which the share is what they say', () => {
    const task = taskOf('concrete-box', [35, 45, 35]);
    const { ownWeightHalfM, ownWeight80M } = limitOf(task);
    for (const [spanM, share] of [
      [ownWeightHalfM!, 0.5],
      [ownWeight80M!, 0.8],
    ] as const) {
      const unit = { task: { ...task, spansM: task.spansM.map((one) => (one * spanM) / 45) }, haunch: 1 };
      const { depthM } = finish(deckDepth(unit, mean));
      expect(formModule('concrete-box').size(taskAt(unit, depthM)).ownWeightShare).toBeCloseTo(share, 1);
    }
  });

  it('rises with the strength of the concrete and falls with its weight, where the form reads them', () => {
    const box = (more: Partial<UnitTask>): number => reach('concrete-box', [35, 45, 35], 3, more);
    const usual = box({ strengthMPa: 60 });
    expect(box({ strengthMPa: 45 })).toBeLessThan(usual);
    expect(box({ strengthMPa: 60, light: { densityKgM3: 1800 } })).toBeGreaterThan(usual);
  });

  it.each<[FormId, number[]]>([
    ['half-through', [40]],
    ['composite-i', [60, 80, 60]],
  ])('%s falls with the width that its girders carry', (form, spansM) => {
    const [two, three, four] = [2, 3, 4].map((lanes) => reach(form, spansM, lanes));
    expect(three).toBeLessThan(two!);
    expect(four).toBeLessThan(three!);
  });

  it.each<[FormId, number[]]>([
    ['slab', [20]],
    ['precast-i', [30]],
    ['half-through', [40]],
  ])('%s falls with what is laid on its deck', (form, spansM) => {
    const light = taskOf(form, spansM);
    const heavy = {
      ...light,
      deck: {
        ...light.deck,
        superimposedKNm: 2 * light.deck.superimposedKNm,
        surfacingM: 2 * light.deck.surfacingM,
      },
    };
    expect(limitOf(heavy).fails!.spanM).toBeLessThan(limitOf(light).fails!.spanM);
  });
});
