import { describe, expect, it } from 'vitest';
import { evidenceCommand } from '../../lib/cli/evidence.ts';
import { answer } from './run.ts';

interface Kind {
  readonly kind: string;
  readonly medianDeviation: number;
  readonly aim: { readonly medianAtMost: number; readonly met: boolean } | null;
}
interface Result {
  readonly kinds: readonly Kind[];
  readonly subjects: readonly { readonly subject: string }[];
  readonly formsWithoutCase: readonly string[];
  readonly lines: readonly {
    readonly id: string;
    readonly kind: string;
    readonly deviation: number | null;
  }[];
}

const json = answer(evidenceCommand, '');
const table = answer(evidenceCommand, 'table');
const result = JSON.parse(json.out) as Result;

describe('evidence on the command line', () => {
  it('prints kinds, subjects, forms without a case and every line as JSON', () => {
    expect(json.code).toBe(0);
    expect(result.kinds.map(({ kind }) => kind)).toEqual(['mechanics', 'designed', 'built', 'law']);
    expect(result.subjects.length).toBeGreaterThan(10);
    expect(result.lines.length).toBeGreaterThan(500);
  });

  it('says of an aim what its own lines say', () => {
    for (const { kind, medianDeviation, aim } of result.kinds.filter((each) => each.aim !== null)) {
      const sizes = result.lines
        .filter((line) => line.kind === kind && line.deviation !== null)
        .map((line) => Math.abs(line.deviation!))
        .sort((a, b) => a - b);
      const middle = (sizes[Math.floor((sizes.length - 1) / 2)]! + sizes[Math.floor(sizes.length / 2)]!) / 2;
      expect(medianDeviation).toBeCloseTo(middle, 12);
      if (aim!.met) expect(middle).toBeLessThanOrEqual(aim!.medianAtMost);
    }
  });

  it('says on standard error what is outside its tolerance, and why', () => {
    const outside = json.err.split('\n').filter(Boolean);
    for (const line of outside) expect(line).toMatch(/: expected .*, received .*; source .*; cause: ./u);
  });

  it('prints the same as a table to be read', () => {
    expect(table.code).toBe(0);
    const lines = table.out.split('\n');
    for (const { kind, aim } of result.kinds) {
      const row = lines.find((line) => line.startsWith(`${kind} `));
      if (aim !== null) expect(row).toMatch(aim.met ? / met$/u : / missed$/u);
      else expect(row).toMatch(/ none$/u);
    }
    for (const { subject } of result.subjects) {
      expect(lines.some((line) => line.startsWith(`${subject} `))).toBe(true);
      expect(lines.some((line) => line.startsWith(`  ${subject}: `))).toBe(true);
    }
    for (const form of result.formsWithoutCase) expect(lines).toContain(`${form}: no published case found`);
  });

  it('refuses other words', () => {
    const { code, err } = answer(evidenceCommand, 'chart');
    expect(code).toBe(2);
    expect(err).toContain('table');
    expect(err).toContain('chart');
  });
});
