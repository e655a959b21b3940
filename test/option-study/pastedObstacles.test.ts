import { describe, expect, it } from 'vitest';
import { pastedObstacles } from '../../notebooks/option-study/brief/pastedObstacles.ts';

const refusal = (text: string): string => {
  const read = pastedObstacles(text);
  return read.ok ? '' : read.why;
};

describe('pastedObstacles(text)', () => {
  it('takes columns in the order of the table, headings left out, envelopes as presets', () => {
    const text =
      'name\tkind\tfrom\tto\tsupports\tfrom\tto\tlevel\tclear\nMill race\triver\t1300,5\t1320\tbarred\t1302\t1318\t7.2\t4.5\r\nFarm track\troad\t1350\t1354\n';
    const read = pastedObstacles(text);
    expect(read).toEqual({
      ok: true,
      remarks: ['the headings were left out'],
      obstacles: [
        {
          kind: 'river',
          name: 'Mill race',
          fromM: 1300.5,
          toM: 1320,
          supports: 'hard',
          pierPremium: 'unknown',
          clearance: { fromM: 1302, toM: 1318, datumLevelM: 7.2, headroomM: 4.5, confirmed: false },
        },
        {
          kind: 'road',
          name: 'Farm track',
          fromM: 1350,
          toM: 1354,
          supports: 'none',
          pierPremium: 'unknown',
          clearance: null,
        },
      ],
    });
  });

  it('refuses with its line what it cannot read, and takes nothing', () => {
    expect(refusal('')).toContain('no text');
    expect(refusal('a;road;1')).toContain('line 1: expected at least four columns');
    expect(refusal('a;road;1;2\nb;moat;3;4')).toContain("line 2: kind 'moat' is not known");
    expect(refusal('a;road;10;2')).toContain("expected 'to' beyond 10");
    expect(refusal('a;road;1;2;sometimes')).toContain('supports');
    expect(refusal('a;road;1;2;free;1;2;;5')).toContain('envelope above level');
    expect(refusal(';road;1;2')).toContain('name');
  });
});
