import { describe, expect, it } from 'vitest';
import { caseInputs, evidenceRow, runEvidence, type EvidenceRow } from '../../lib/evidence/index.ts';
import { summary } from '../../lib/evidence/summary.ts';

const row: EvidenceRow = {
  id: 'a',
  subject: 'sums',
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

describe('evidenceRow', () => {
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
        compared: 3,
        within: 1,
        outside: 1,
        shownOnly: 1,
        worstDeviation: 0.2,
        medianDeviation: 0,
        withinQuarter: 1,
        worst: { id: 'b', deviation: -0.2 },
      },
    ]);
  });
});
