import { describe, expect, it } from 'vitest';
import { appraiseCommand } from '../../lib/cli/appraise.ts';
import { changedExample, example } from './exampleFile.ts';
import { answer } from './run.ts';

interface Printed {
  readonly options: {
    readonly family: string;
    readonly spans: number[];
    readonly cost: { p10: number; p50: number; p90: number };
    readonly rulings: { source: string; because: string[] }[];
  }[];
  readonly droppedCounts: { reason: string; count: number }[];
  readonly standing: { leader: number | null; because: string[] };
}

describe('appraise', () => {
  it('appraise(low-ferry.json) prints options of four families with spans, costs, rulings and reasons', () => {
    const printed = answer(appraiseCommand, example);
    expect(printed.err).toBe('');
    expect(printed.code).toBe(0);
    const result = JSON.parse(printed.out) as Printed;
    expect(new Set(result.options.map((option) => option.family))).toEqual(
      new Set(['girder', 'box', 'truss', 'cable-supported']),
    );
    for (const option of result.options) {
      expect(option.spans.reduce((sum, span) => sum + span, 0)).toBeCloseTo(230, 6);
      expect(option.cost.p10).toBeLessThan(option.cost.p50);
      expect(option.cost.p50).toBeLessThan(option.cost.p90);
      expect(option.rulings.every((ruling) => ruling.source !== '' && ruling.because.length > 0)).toBe(true);
    }
    expect(
      result.droppedCounts.some((dropped) => dropped.reason.includes('River Wend') && dropped.count > 0),
    ).toBe(true);
    expect(result.standing.leader).not.toBeNull();
  }, 60_000);

  it.each([
    [
      'negative width',
      (s: never) => ((s as { brief: { deck: { widthM: number }[] } }).brief.deck[2]!.widthM = -3.5),
      /width/,
    ],
    [
      'reversed zone',
      (s: never) => {
        const { obstacles } = (s as { brief: { obstacles: { fromM: number; toM: number }[] } }).brief;
        [obstacles[1]!.fromM, obstacles[1]!.toM] = [obstacles[1]!.toM, obstacles[1]!.fromM];
      },
      /obstacles\[1\]/,
    ],
    [
      'text in a number',
      (s: never) => ((s as { brief: { surfacingM: unknown } }).brief.surfacingM = '0.09'),
      /surfacing/,
    ],
    ['version 99', (s: never) => ((s as { version: number }).version = 99), /version.*99/],
  ])(
    'appraise(study with %s) is refused with expected, received and remedy',
    (_what, change, words) => {
      const printed = answer(appraiseCommand, changedExample(change as (s: Record<string, never>) => void));
      expect(printed.code).toBe(2);
      expect(printed.out).toBe('');
      expect(printed.err).toMatch(/expected .* received /);
      expect(printed.err).toMatch(words);
    },
    30_000,
  );
});

it('appraise(study with start values) counts and names those that nobody has confirmed', () => {
  const file = changedExample((study) => {
    Object.assign(study['options']!, { forms: ['composite-i'], workOutAnyway: [] });
    Object.assign(study, { assumed: ['brief.road.endLevelM', 'brief.road.startLevelM', 'brief.loading'] });
  });
  const printed = answer(appraiseCommand, file);
  expect(printed.err).toBe('2 start values not confirmed: level of the road, load standard.');
  const result = JSON.parse(printed.out) as { startValuesNotConfirmed: string[] };
  expect(result.startValuesNotConfirmed).toEqual(['level of the road', 'load standard']);
}, 60_000);
