import { describe, expect, it } from 'vitest';
import { appraise, appraiseKept, memory, readStudy, writeStudy, type Study } from '../../lib/index.ts';
import { keptOf, withLock } from '../../notebooks/option-study/handEdits.ts';
import { withPierAdded, withPierRemoved, withSpanParted } from '../../notebooks/option-study/pierCount.ts';
import { workedStudy } from './study.ts';

const lowFerry = workedStudy();
const kept = memory();
const only: Study = {
  ...lowFerry,
  books: { ...lowFerry.books, draws: 1000 },
  options: { ...lowFerry.options, forms: ['composite-i', 'cable-stayed'] },
};
const first = appraise(only, kept);
const numbered: Study = { ...only, options: { ...only.options, register: first.register } };
const option = first.options.find(({ form }) => form === 'composite-i')!;
const hung = first.options.find(({ form }) => form === 'cable-stayed')!;

const placesOf = (study: Study, of = option): number[] => [
  ...new Set(keptOf(study, of).units.flatMap(({ supportsM }) => supportsM)),
];
const start = placesOf(numbered);
/** The study of a change that must have been made. */
function made(changed: ReturnType<typeof withPierAdded>): Study {
  if (!changed.ok) throw new Error(changed.why);
  return changed.study;
}

describe('withPierAdded(study, option, span, chainageM)', () => {
  it('puts a pier where it is asked for, in the middle otherwise, and keeps the option under its number', () => {
    const at = start[0]! + 12.5;
    const study = made(withPierAdded(numbered, option, 0, at));
    expect(placesOf(study)).toEqual([start[0], at, ...start.slice(1)]);
    expect(study.options.reference).toBe(option.number);
    expect(study.options.kept).toHaveLength(1);
    const middle = made(withPierAdded(numbered, option, 1));
    // Chainages by hand are to the decimetre.
    expect(Math.abs(placesOf(middle)[2]! - (start[1]! + start[2]!) / 2)).toBeLessThan(0.051);
  });

  it('is worked out with its spans, and read back as it was written', () => {
    const study = made(withPierAdded(numbered, option, 0, start[0]! + 20));
    const read = readStudy(writeStudy(study));
    expect(read.ok && read.value.options.kept).toEqual(study.options.kept);
    const { option: now } = appraiseKept(study, option, kept);
    expect(now!.supports).toHaveLength(option.supports.length + 1);
    expect(now!.designs[0]!.task.spansM[0]).toBeCloseTo(20, 6);
    const mine = appraise(study, kept).options.find(({ number }) => number === option.number)!;
    expect(mine.supports.map(({ chainageM }) => chainageM)).toEqual(placesOf(study));
  });

  it('counts locked piers and pylons anew', () => {
    const locked = made(withPierAdded(withLock(numbered, option, 2, true), option, 0, start[0]! + 20));
    expect(keptOf(locked, option).locked).toEqual([3]);
    const unit = hung.units.find(({ pylons }) => pylons !== undefined)!;
    const at = unit.supportsM[unit.pylons![0]!]!;
    const places = placesOf(numbered, hung);
    const span = places.indexOf(unit.supportsM[0]!);
    const study = made(withPierAdded(numbered, hung, span, unit.supportsM[0]! + 10));
    const now = keptOf(study, hung).units.find(({ pylons }) => pylons !== undefined)!;
    expect(now.supportsM[now.pylons![0]!]).toBe(at);
  });

  it('is refused beside a support, where there is no span, and in a form of two spans that has them', () => {
    expect(withPierAdded(numbered, option, 0, start[0]! + 1)).toMatchObject({
      ok: false,
      why: expect.stringContaining('2 m from the next support') as string,
    });
    expect(withPierAdded(numbered, option, NaN).ok).toBe(false);
    expect(withPierAdded(numbered, option, 0, NaN).ok).toBe(false);
    const frame = {
      ...option,
      form: 'portal-frame' as const,
      units: [{ form: 'portal-frame' as const, role: 'main' as const, supportsM: [1240, 1355, 1470] }],
    };
    expect(withPierAdded(numbered, frame, 0)).toMatchObject({
      ok: false,
      why: expect.stringContaining('2 spans and no more') as string,
    });
  });
});

describe('withPierRemoved(study, option, index)', () => {
  it('makes the spans beside it one, and puts back what was added', () => {
    const study = made(withPierRemoved(numbered, option, 1));
    expect(placesOf(study)).toEqual(start.toSpliced(1, 1));
    const added = made(withPierAdded(numbered, option, 0, start[0]! + 20));
    expect(keptOf(made(withPierRemoved(added, option, 1)), option).units).toEqual(option.units);
    const { option: now } = appraiseKept(study, option, kept);
    expect(now!.supports).toHaveLength(option.supports.length - 1);
  });

  it('counts locked piers anew', () => {
    const study = made(withPierRemoved(withLock(numbered, option, 3, true), option, 1));
    expect(keptOf(study, option).locked).toEqual([2]);
  });

  it('leaves abutments, locked piers, pylons and the piers on which two units meet', () => {
    const why = (changed: ReturnType<typeof withPierRemoved>): string => (changed.ok ? '' : changed.why);
    expect(why(withPierRemoved(numbered, option, 0))).toContain('only a pier');
    expect(why(withPierRemoved(numbered, option, start.length - 1))).toContain('only a pier');
    expect(why(withPierRemoved(numbered, option, NaN))).toContain('only a pier');
    expect(why(withPierRemoved(withLock(numbered, option, 1, true), option, 1))).toContain('locked');
    const places = placesOf(numbered, hung);
    const unit = hung.units.find(({ pylons }) => pylons !== undefined)!;
    const pylon = places.indexOf(unit.supportsM[unit.pylons![0]!]!);
    expect(why(withPierRemoved(numbered, hung, pylon))).toContain('pylon');
    const joint = places.findIndex(
      (at) => hung.units.filter(({ supportsM }) => supportsM.includes(at)).length > 1,
    );
    expect(why(withPierRemoved(numbered, hung, joint))).toContain('two units meet');
  });
});

describe('withSpanParted(study, option, span, lengths)', () => {
  const whole = start[2]! - start[1]!;
  it('puts a pier where the two lengths meet', () => {
    const study = made(withSpanParted(numbered, option, 1, [12, whole - 12]));
    expect(placesOf(study)).toEqual([...start.slice(0, 2), start[1]! + 12, ...start.slice(2)]);
  });
  it('is refused with both sums where they do not make up the span', () => {
    expect(withSpanParted(numbered, option, 1, [12, whole - 10])).toMatchObject({
      ok: false,
      why: expect.stringContaining(`must make up ${whole.toFixed(1)} m`) as string,
    });
    expect(withSpanParted(numbered, option, 1, [NaN, 3]).ok).toBe(false);
  });
});
