import { answerTo } from './answerTo.ts';
import { beforeAll, describe, expect, it } from 'vitest';
import { appraise, roadLevelAt, type Appraisal, type Study } from '../../lib/index.ts';
import { lowFerry, mirrored } from './studies.ts';

/** One sizer for the file would hide nothing: sizing is pure. Each appraisal here starts afresh. */
let base: Appraisal;
beforeAll(() => {
  base = answerTo(lowFerry());
});

const withBrief = (change: Partial<Study['brief']>): Study => {
  const study = lowFerry();
  return { ...study, brief: { ...study.brief, ...change } };
};
const cheapest = (appraisal: Appraisal, form: string): Appraisal['options'][number] =>
  appraisal.options.find((option) => option.form === form)!;

describe('appraise', { timeout: 60_000 }, () => {
  it('appraise(study) works out four forms of four families, cheapest first', () => {
    expect(new Set(base.options.map((option) => option.form))).toEqual(
      new Set(['composite-i', 'concrete-box', 'truss', 'cable-stayed']),
    );
    const p50 = base.options.map((option) => option.cost.p50);
    expect(p50).toEqual([...p50].sort((a, b) => a - b));
  });

  it('appraise(study) stands no support inside a barred stretch and covers the crossing', () => {
    for (const option of base.options) {
      const x = option.units.flatMap((unit) => unit.supportsM);
      expect(x[0]).toBe(1240);
      expect(x.at(-1)).toBe(1470);
      for (const zone of base.site.zones.filter((entry) => entry.hard)) {
        expect(x.filter((at) => at > zone.fromM && at < zone.toM)).toEqual([]);
      }
    }
  });

  it('appraise(same study) is the same to the last figure, and another seed moves odds but no quantity', () => {
    expect(appraise(lowFerry())).toEqual(base);
    const study = lowFerry();
    const other = answerTo({ ...study, books: { ...study.books, seed: 7 } });
    const quantities = (a: Appraisal): unknown => new Map(a.options.map((o) => [o.number, o.quantities]));
    expect(quantities(other)).toEqual(quantities(base));
    expect(cheapest(other, 'composite-i').cost.p50).not.toBe(cheapest(base, 'composite-i').cost.p50);
    expect(cheapest(other, 'composite-i').cost.p50 / cheapest(base, 'composite-i').cost.p50).toBeCloseTo(
      1,
      1,
    );
  });

  it('appraise(mirrored study) mirrors every arrangement and keeps quantities', () => {
    const other = answerTo(mirrored(lowFerry()));
    const spans = (a: Appraisal, back: boolean): string[] =>
      a.options
        .map((o) => {
          const list = o.units.flatMap((u) =>
            u.supportsM.slice(1).map((x, i) => (x - u.supportsM[i]!).toFixed(3)),
          );
          return `${o.form} ${o.method} ${(back ? list.reverse() : list).join('+')}`;
        })
        .sort();
    expect(spans(other, true)).toEqual(spans(base, false));
    const steel = (a: Appraisal): number => cheapest(a, 'composite-i').quantities.structuralSteelKg;
    expect(steel(other) / steel(base)).toBeCloseTo(1, 6);
  });

  it('appraise(wider river) needs longer spans and costs more, within reason', () => {
    const { obstacles, crossing } = lowFerry().brief;
    const wide = obstacles.map((o) => (o.name === 'River Wend' ? { ...o, fromM: 1310, toM: 1400 } : o));
    const other = answerTo(withBrief({ obstacles: wide, crossing }));
    const [a, b] = [cheapest(base, 'composite-i'), cheapest(other, 'composite-i')];
    expect(b.perM2.structuralSteelKg).toBeGreaterThan(1.1 * a.perM2.structuralSteelKg);
    expect(b.cost.p50).toBeGreaterThan(1.03 * a.cost.p50);
    expect(b.cost.p50).toBeLessThan(2 * a.cost.p50);
  });

  it('appraise(half the budget) lowers the chance within it and reorders nothing; no budget gives no chance', () => {
    const { budget } = lowFerry().brief;
    if (budget === 'unknown') throw new Error('the example has a budget');
    const poor = answerTo(withBrief({ budget: { ...budget, amount: budget.amount / 2 } }));
    const free = answerTo(withBrief({ budget: 'unknown' }));
    const order = (a: Appraisal): number[] => a.options.map((option) => option.number);
    expect(order(poor)).toEqual(order(base));
    expect(order(free)).toEqual(order(base));
    for (const { number } of base.options) {
      expect(poor.standing.within[number]!).toBeLessThanOrEqual(base.standing.within[number]!);
    }
    expect(free.standing.within).toEqual({});
  });

  it('appraise(dearer steel) moves steel decks more than concrete ones', () => {
    const study = lowFerry();
    const steel = { item: 'plate-girder-steel', p10: 5, p50: 7, p90: 10, reason: 'trial' };
    const other = answerTo({ ...study, books: { ...study.books, rates: [steel] } });
    const rise = (form: string): number => cheapest(other, form).cost.p50 / cheapest(base, form).cost.p50;
    expect(rise('composite-i')).toBeGreaterThan(1.03);
    expect(rise('concrete-box')).toBeCloseTo(1, 2);
  });

  it('appraise(more headroom over the rail) lifts the road or thins the deck, never fouls it silently', () => {
    const { obstacles } = lowFerry().brief;
    const higher = obstacles.map((o) =>
      o.clearance && o.kind === 'railway' ? { ...o, clearance: { ...o.clearance, headroomM: 6.6 } } : o,
    );
    const other = answerTo(withBrief({ obstacles: higher }));
    for (const option of other.options) {
      const fouled = option.headroom !== null && option.headroom.spareM < 0;
      if (fouled) expect(option.status).toBe('out');
    }
    const [a, b] = [cheapest(base, 'composite-i'), cheapest(other, 'composite-i')];
    const rail = 1272;
    const lift = roadLevelAt(b.profile, rail) - roadLevelAt(a.profile, rail);
    const thinner = a.depthM.midspan - b.depthM.midspan;
    expect(lift + thinner).toBeGreaterThan(0.3);
  });

  it('appraise(form out by rule and not asked anyway) drops it with the rule as the reason', () => {
    const study = lowFerry();
    const wide = study.brief.obstacles.map((o) =>
      o.name === 'River Wend' ? { ...o, fromM: 1290, toM: 1440 } : o,
    );
    const other = answerTo({
      ...study,
      brief: { ...study.brief, obstacles: wide },
      options: { ...study.options, workOutAnyway: [] },
    });
    const dropped = other.dropped.find((entry) => entry.form === 'composite-i')!;
    expect(dropped.because.join(' ')).toMatch(/15\d/);
    expect(other.options.some((option) => option.form === 'composite-i')).toBe(false);
  });

  it('appraise(study with a register) keeps numbers for life', () => {
    const study = lowFerry();
    const again = answerTo({ ...study, options: { ...study.options, register: base.register } });
    expect(again.register).toEqual(base.register);
    const numbers = (a: Appraisal): string[] => a.options.map((o) => `${o.number} ${o.form}`).sort();
    expect(numbers(again)).toEqual(numbers(base));
  });
});
