import { describe, expect, it } from 'vitest';
import {
  caseInputs,
  evidenceRow,
  formsWithoutCase,
  isUnexplained,
  kindSummaries,
  runEvidence,
  summary,
  type EvidenceRow,
} from '../../lib/evidence/index.ts';

const row: EvidenceRow = {
  id: 'a',
  subject: 'sums',
  kind: 'built',
  title: 'Two and two',
  case: 'sum',
  inputs: { terms: [2, 2] },
  published: { sum: 4 },
  unit: '',
  tolerance: 0.01,
  scope: 'everything',
  source: 'arithmetic',
  read: true,
};
const cases = {
  sum: (inputs: ReturnType<typeof caseInputs>) => ({
    sum: inputs.numbers('terms').reduce((a, b) => a + b, 0),
  }),
  nothing: () => ({ sum: Number.NaN }),
};

describe('runEvidence(rows, cases)', () => {
  it('works ours out and compares it within the tolerance', () => {
    const far = { ...row, id: 'b', inputs: { terms: [2, 2.05] } };
    const [near, off] = runEvidence([row, far], cases);
    expect(near).toMatchObject({ ours: 4, deviation: 0, within: true });
    expect(off).toMatchObject({ ours: 4.05, within: false });
    expect(off!.deviation).toBeCloseTo(0.0125, 9);
  });

  it('never lets a value that is not a number be within', () => {
    expect(runEvidence([{ ...row, case: 'nothing' }], cases)[0]!.within).toBe(false);
  });

  it('decides nothing on a row that is only shown', () => {
    expect(runEvidence([{ ...row, tolerance: null, published: { sum: 9 } }], cases)[0]!.within).toBeNull();
  });

  it('allows the absolute tolerance of few printed digits', () => {
    const printed = { ...row, tolerance: 1e-6, absolute: 0.06, published: { sum: 4.05 } };
    expect(runEvidence([printed], cases)[0]!.within).toBe(true);
  });

  it('names a case, a figure or an input that is not there', () => {
    expect(() => runEvidence([{ ...row, case: 'product' }], cases)).toThrow(
      /a: expected a case of sum, nothing, received product/,
    );
    expect(() => runEvidence([{ ...row, published: { product: 4 } }], cases)).toThrow(
      /a: expected a figure of sum, received product/,
    );
    expect(() => runEvidence([{ ...row, inputs: { terms: 'two' } }], cases)).toThrow(
      /terms: expected a list of numbers, received "two"/,
    );
  });
});

/** Rows of one figure that ours exceeds by the given shares. */
const over = (shares: readonly number[], more: Partial<EvidenceRow> = {}): EvidenceRow[] =>
  shares.map((share, i) => ({ ...row, id: `${more.kind}-${i}`, inputs: { terms: [4, 4 * share] }, ...more }));

describe('isUnexplained(line)', () => {
  it('is what lies outside without a cause', () => {
    const [within, outside, explained] = runEvidence(
      [row, { ...row, published: { sum: 5 } }, { ...row, published: { sum: 5 }, cause: 'Counted twice.' }],
      cases,
    );
    expect([within, outside, explained].map((line) => isUnexplained(line!))).toEqual([false, true, false]);
  });
});

describe('evidenceRow', () => {
  it('asks for a kind and a source', () => {
    const { kind, ...without } = row;
    expect(kind).toBe('built');
    expect(evidenceRow.safeParse(without).success).toBe(false);
    expect(evidenceRow.safeParse({ ...row, kind: 'rumour' }).success).toBe(false);
    expect(evidenceRow.safeParse({ ...row, source: undefined }).success).toBe(false);
  });

  it('refuses unknown keys and rows without a value', () => {
    expect(evidenceRow.safeParse({ ...row, ours: 4 }).success).toBe(false);
    expect(evidenceRow.safeParse({ ...row, published: {} }).success).toBe(false);
  });
});

describe('summary(lines)', () => {
  it('counts by subject', () => {
    const lines = runEvidence(
      [row, { ...row, id: 'b', published: { sum: 5 } }, { ...row, id: 'c', tolerance: null }],
      cases,
    );
    expect(summary(lines)).toEqual([
      {
        subject: 'sums',
        within: 1,
        outside: 1,
        shownOnly: 1,
        cases: 3,
        figures: 3,
        medianDeviation: 0,
        withinQuarter: 1,
        withinThirty: 1,
        worst: { id: 'b', figure: 'sum', deviation: -0.2, cause: null },
      },
    ]);
  });
});

describe('kindSummaries(lines)', () => {
  it('works out median and shares and holds them against the aim', () => {
    const shares = [0.05, 0.12, 0.14, 0.16, 0.28, 0.29, 0.31];
    const [built] = kindSummaries(runEvidence(over(shares, { kind: 'built', cause: 'Heavy.' }), cases));
    expect(built).toMatchObject({ kind: 'built', cases: 7, figures: 7 });
    expect(built!.medianDeviation).toBeCloseTo(0.16, 9);
    expect(built!.withinQuarter).toBeCloseTo(4 / 7, 9);
    expect(built!.withinThirty).toBeCloseTo(6 / 7, 9);
    expect(built!.worst).toMatchObject({ id: 'built-6', cause: 'Heavy.' });
    expect(built!.aim!.share).toBeCloseTo(6 / 7, 9);
    expect(built!.aim!.met).toBe(false);
  });

  it('meets an aim only with the median and the share both', () => {
    const met = (kind: EvidenceRow['kind'], shares: readonly number[]): boolean | undefined =>
      kindSummaries(runEvidence(over(shares, { kind }), cases))[0]!.aim?.met;
    expect(met('built', [0.05, 0.12, 0.14, 0.16, 0.29])).toBe(true);
    expect(met('built', [0.05, 0.12, 0.14, 0.16, 0.31])).toBe(false);
    expect(met('designed', [0.05, 0.09, 0.24])).toBe(true);
    expect(met('designed', [0.05, 0.11, 0.24])).toBe(false);
    expect(met('designed', [0.05, 0.09, 0.26])).toBe(false);
  });

  it('keeps the kinds apart and has no aim for mechanics and laws', () => {
    const rows = [
      ...over([0, 0, 0], { kind: 'mechanics' }),
      ...over([0.5], { kind: 'law' }),
      ...over([0.2], { kind: 'designed' }),
    ];
    const kinds = kindSummaries(runEvidence(rows, cases));
    expect(kinds.map(({ kind, aim }) => [kind, aim?.met])).toEqual([
      ['mechanics', undefined],
      ['designed', false],
      ['law', undefined],
    ]);
  });
});

describe('formsWithoutCase(lines)', () => {
  it('takes neither mechanics nor a law for a case', () => {
    const about = (subject: string, kind: EvidenceRow['kind']): EvidenceRow => ({ ...row, subject, kind });
    const lines = runEvidence(
      [
        about('slab', 'law'),
        about('truss', 'mechanics'),
        about('precast-i', 'designed'),
        about('steel-box', 'built'),
      ],
      cases,
    );
    const without = formsWithoutCase(lines);
    expect(without).toContain('slab');
    expect(without).toContain('truss');
    expect(without).not.toContain('precast-i');
    expect(without).not.toContain('steel-box');
  });
});
