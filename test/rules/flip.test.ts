import { describe, expect, it } from 'vitest';
import { flip } from '../../lib/rules/index.ts';

describe('flip(condition, facts)', () => {
  it('[R11] stops at the limit where the limit itself turns it', () => {
    expect(flip({ fact: 'mainSpanM', is: '>', value: 50 }, { mainSpanM: 63 })).toEqual({
      fact: 'mainSpanM',
      from: 63,
      to: 50,
      unit: 'm',
    });
  });

  it('[R12] goes one step past the limit where the limit itself does not', () => {
    expect(flip({ fact: 'mainSpanM', is: '>', value: 50 }, { mainSpanM: 40 })?.to).toBe(50.1);
    expect(flip({ fact: 'mainSpanM', between: [30, 91] }, { mainSpanM: 63 })?.to).toBe(91.1);
    expect(flip({ fact: 'mainSpanM', between: [30, 91] }, { mainSpanM: 35 })?.to).toBe(29.9);
  });

  it('[R11] all: false through one part only, that part has to move; through two, no single number will do', () => {
    const both = {
      all: [
        { fact: 'mainSpanM', is: '>', value: 50 },
        { fact: 'skewDeg', is: '>', value: 15 },
      ],
    } as const;
    expect(flip(both, { mainSpanM: 40, skewDeg: 20 })).toMatchObject({ fact: 'mainSpanM', to: 50.1 });
    expect(flip(both, { mainSpanM: 40, skewDeg: 10 })).toBeUndefined();
    // True through both: the nearer in proportion, 51 -> 50 m rather than 60 -> 15 degrees.
    expect(flip(both, { mainSpanM: 51, skewDeg: 60 })).toMatchObject({ fact: 'mainSpanM', to: 50 });
    expect(flip(both, { mainSpanM: 200, skewDeg: 16 })).toMatchObject({ fact: 'skewDeg', to: 15 });
  });

  it('[R11] any: true through two parts, no single number turns it', () => {
    const either = {
      any: [
        { fact: 'mainSpanM', is: '>', value: 50 },
        { fact: 'skewDeg', is: '>', value: 15 },
      ],
    } as const;
    expect(flip(either, { mainSpanM: 60, skewDeg: 20 })).toBeUndefined();
    expect(flip(either, { mainSpanM: 60, skewDeg: 10 })).toMatchObject({ fact: 'mainSpanM', to: 50 });
  });

  it('[R11] not mirrors what it holds', () => {
    const condition = { fact: 'mainSpanM', is: '>', value: 50 } as const;
    expect(flip({ not: condition }, { mainSpanM: 63 })).toEqual(flip(condition, { mainSpanM: 63 }));
  });

  it('[R11] a limit that is itself a fact may move as well', () => {
    const long = { fact: 'pieceLengthM', is: '>', than: 'haulLengthM' } as const;
    const turned = flip(long, { pieceLengthM: 45, haulLengthM: 30 });
    expect(turned).toMatchObject({ fact: 'pieceLengthM', from: 45, to: 30 });
    expect(flip(long, { pieceLengthM: 20, haulLengthM: 30 })?.to).toBeCloseTo(30.1, 12);
  });

  it('[R11] text, yes/no and a straight cannot be moved', () => {
    expect(flip({ fact: 'method', is: '=', value: 'launch' }, { method: 'launch' })).toBeUndefined();
    expect(flip({ fact: 'planRadiusM', is: '<', value: 300 }, { planRadiusM: Infinity })).toBeUndefined();
  });

  it('[R13] what hangs on something unknown has no flip', () => {
    expect(flip({ fact: 'mainSpanM', is: '>', value: 50 }, {})).toBeUndefined();
    const half = {
      all: [
        { fact: 'mainSpanM', is: '>', value: 50 },
        { fact: 'skewDeg', is: '>', value: 15 },
      ],
    } as const;
    expect(flip(half, { mainSpanM: 63 })).toBeUndefined();
    // False whatever the unknown turns out to be, but moving the span would only make it unknown.
    expect(flip(half, { mainSpanM: 40 })).toBeUndefined();
  });
});
