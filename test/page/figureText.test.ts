import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  judgeFigure,
  movedFigure,
  readFigure,
  smallestStep,
  writeFigure,
} from '../../notebooks/page/figureText.ts';
import type { FigureRules } from '../../notebooks/page/figureText.ts';

const metres: FigureRules = { places: 2, unit: 'm' };
const read = (text: string, rules = metres) => {
  const figure = readFigure(text, rules);
  return figure.ok ? figure.value : figure.why;
};

describe('readFigure', () => {
  it.each([
    ['1240', 1240],
    ['1 240', 1240],
    ['1\u2009240.5', 1240.5],
    ['1\u00a0240,5', 1240.5],
    ['5.90 m', 5.9],
    ['5,90m', 5.9],
    ['-3.9', -3.9],
    ['\u22123,9', -3.9],
    ['+2', 2],
    ['.5', 0.5],
    ['1.', 1],
    ['1.240', 1.24],
    ['0,240', 0.24],
    ['12,3', 12.3],
    ['1,240.5', 1240.5],
    ['1.240,5', 1240.5],
    ['1,240,000', 1240000],
    ['1.240.000,25', 1240000.25],
  ])('readFigure(%j) reads %d', (text, value) => {
    expect(read(text)).toBe(value);
  });

  it.each(['abc', '1e3', '1..2', '1,2,3', '12 m3', '--4', '1.2.3,4', 'Infinity', 'm'])(
    'readFigure(%j) says that it cannot be read',
    (text) => {
      expect(typeof read(text)).toBe('string');
    },
  );

  it("readFigure('1,240') asks which of its two readings is meant instead of choosing one", () => {
    expect(read('1,240')).toBe("'1,240' can be read as 1\u2009240 or as 1.240: write one of them");
  });

  it('readFigure takes an empty field, ? and the word for it as not known, only where that is allowed', () => {
    const rules = { ...metres, unknown: 'not given' };
    for (const text of ['', '  ', '?', 'not given', 'Not Given']) expect(read(text, rules)).toBe('unknown');
    for (const text of ['', '?']) expect(read(text)).toBe('a figure is needed here');
    expect(typeof read('not given')).toBe('string');
    expect(read('not given')).toContain('not a figure');
  });

  it('readFigure(writeFigure(x)) is x to the places shown', () => {
    fc.assert(
      fc.property(
        fc.double({ min: -1e9, max: 1e9, noNaN: true }),
        fc.integer({ min: 0, max: 4 }),
        (value, places) => {
          const rules = { places };
          const shown = Number(value.toFixed(places));
          // Three places may look like thousands only with a comma; the tool writes a point.
          expect(read(writeFigure(value, rules), rules)).toBe(shown === 0 ? 0 : shown);
        },
      ),
      { seed: 3 },
    );
  });
});

describe('a count', () => {
  it('judgeFigure(value) refuses what is no whole number and offers the nearest', () => {
    const lanes = { places: 0, whole: true, min: { value: 1 }, max: { value: 20 } };
    expect(judgeFigure(2.5, lanes)).toEqual({ why: 'a whole number is expected, not 2.5', nearest: 3 });
    expect(judgeFigure(2, lanes)).toBeNull();
    expect(judgeFigure(0.5, lanes)?.nearest).toBe(1);
  });
});

describe('judgeFigure', () => {
  const rules: FigureRules = {
    ...metres,
    min: { value: 1.75, because: 'the flange at the pier is at 100 %' },
    max: { value: 6, open: true },
  };

  it('judgeFigure(value) names limit, unit and reason, and the nearest value that is allowed', () => {
    expect(judgeFigure(1.5, rules)).toEqual({
      why: 'at least 1.75 m, because the flange at the pier is at 100 %',
      nearest: 1.75,
    });
    expect(judgeFigure(6, rules)).toEqual({ why: 'less than 6.00 m', nearest: 5.99 });
    expect(judgeFigure(1.75, rules)).toBeNull();
    expect(judgeFigure(5.99, rules)).toBeNull();
  });

  it('judgeFigure refuses what is no number', () => {
    expect(judgeFigure(NaN, rules)).not.toBeNull();
    expect(judgeFigure(Infinity, metres)).not.toBeNull();
    expect(judgeFigure('unknown', rules)).not.toBeNull();
    expect(judgeFigure('unknown', { ...rules, unknown: 'unknown' })).toBeNull();
  });

  it('movedFigure(from, by) keeps to the places shown and inside the limits', () => {
    expect(movedFigure(2.3, 0.1, rules)).toBe(2.4);
    expect(movedFigure(0.1, 0.2, metres)).toBe(0.3);
    expect(movedFigure(1.8, -1, rules)).toBe(1.75);
    expect(movedFigure(5.5, 1, rules)).toBe(5.99);
    fc.assert(
      fc.property(fc.double({ min: -50, max: 50, noNaN: true }), (by) => {
        expect(judgeFigure(movedFigure(2.3, by, rules), rules)).toBeNull();
      }),
      { seed: 5 },
    );
  });

  it('smallestStep(places) is the last place shown', () => {
    expect(smallestStep(0)).toBe(1);
    expect(smallestStep(2)).toBe(0.01);
  });
});
