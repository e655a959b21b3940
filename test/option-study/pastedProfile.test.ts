import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { pastedProfile } from '../../notebooks/option-study/brief/pastedProfile.ts';

const points = (text: string): (readonly [number, number])[] => {
  const read = pastedProfile(text);
  if (!read.ok) throw new Error(read.why);
  return read.points.map(({ chainageM, levelM }) => [chainageM, levelM] as const);
};
const why = (text: string): string => {
  const read = pastedProfile(text);
  return read.ok ? 'taken' : read.why;
};

describe('pastedProfile', () => {
  it('reads two columns as a spreadsheet copies them', () => {
    expect(points('1240\t15.33\r\n1250\t12.9\r\n1260\t-0.5\r\n')).toEqual([
      [1240, 15.33],
      [1250, 12.9],
      [1260, -0.5],
    ]);
  });

  it('reads commas for decimals, spaces in thousands, true minus, semicolons and posted chainages', () => {
    expect(points('1\u202f240,5\t15,33\n1 250\t\u22120,25')).toEqual([
      [1240.5, 15.33],
      [1250, -0.25],
    ]);
    expect(points('1+240;15.3\n1+250.5;12,9')).toEqual([
      [1240, 15.3],
      [1250.5, 12.9],
    ]);
    expect(points('0 3\n10  4')).toEqual([
      [0, 3],
      [10, 4],
    ]);
  });

  it('leaves out headings, empty lines and an empty last column, and says so of headings', () => {
    const read = pastedProfile('Chainage (m)\tLevel (m)\n\n0\t3\t\n10\t4\t\n');
    expect(read).toEqual({
      ok: true,
      points: [
        { chainageM: 0, levelM: 3 },
        { chainageM: 10, levelM: 4 },
      ],
      remarks: ['the headings were left out'],
    });
  });

  it('turns a survey from the far end round', () => {
    const read = pastedProfile('20\t5\n10\t4\n0\t3');
    expect(read.ok && read.points.map(({ chainageM }) => chainageM)).toEqual([0, 10, 20]);
    expect(read.ok && read.remarks).toEqual(['the points were turned round to rising chainages']);
  });

  it('refuses with the line and what was expected there', () => {
    expect(why('0\t3\n10\n20\t4')).toBe('line 2: expected two columns, chainage and level, found one column');
    expect(why('0\t3\t1\n10\t4\t1')).toContain(
      'line 1: expected two columns, chainage and level, found 3 columns',
    );
    expect(why('0\t3\n10\tdeep')).toBe("line 2: level: 'deep' is not a figure");
    expect(why('a1\t3\n10\t4')).toBe("line 1: chainage: 'a1' is not a figure");
    expect(why('0\t3\n1,250\t4')).toContain('can be read as');
    expect(why('0\t1250\n10\t125000')).toContain('are the columns exchanged?');
  });

  it('refuses points that do not rise, naming the line as it was pasted', () => {
    expect(why('0\t3\n\n10\t4\n10\t5\n20\t5')).toBe(
      'line 4: chainage 10 stands there twice; put the points in order of chainage',
    );
    expect(why('0\t3\n20\t4\n10\t5\n30\t5')).toBe(
      'line 3: chainage 10 comes after 20; put the points in order of chainage',
    );
  });

  it('refuses too few points and no text', () => {
    expect(why('')).toBe('there is no text to paste');
    expect(why('Chainage\tLevel')).toBe('a ground line needs at least two points, found none');
    expect(why('10\t4')).toBe('a ground line needs at least two points, found one');
  });

  it('gives back any profile that was written as two columns', () => {
    const profile = fc
      .uniqueArray(fc.integer({ min: -1_000_000, max: 1_000_000 }), { minLength: 2, maxLength: 40 })
      .chain((chainages) =>
        fc.tuple(
          fc.constant(chainages.map((c) => c / 100).sort((a, b) => a - b)),
          fc.array(fc.integer({ min: -500_000, max: 500_000 }), {
            minLength: chainages.length,
            maxLength: chainages.length,
          }),
        ),
      );
    fc.assert(
      fc.property(profile, fc.boolean(), ([chainages, levels], isReversed) => {
        const rows = chainages.map((chainage, i) => [chainage, levels[i]! / 100] as const);
        const written = (isReversed ? [...rows].reverse() : rows).map((row) => row.join('\t')).join('\r\n');
        expect(points(written)).toEqual(rows.map((row) => [...row]));
      }),
      { seed: 20260101, numRuns: 200 },
    );
  });
});
