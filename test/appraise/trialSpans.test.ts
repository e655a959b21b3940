import { describe, expect, it } from 'vitest';
import { formModule } from '../../lib/forms/index.ts';
import { skewOn } from '../../lib/appraise/askedTask.ts';
import { workbench, type MeasuredLine, type Workbench } from '../../lib/index.ts';
import { meanClearance } from '../../lib/appraise/meanClearance.ts';
import { trialSpans } from '../../lib/appraise/trialSpans.ts';
import { methodLines } from '../../lib/takeoff/index.ts';
import { levelCrossing } from './levelCrossing.ts';

describe('trialSpans()', () => {
  it('goes from end to end by even ratios where nothing leaps', () => {
    const spans = trialSpans([8, 64], [], 4);
    [8, 16, 32, 64].forEach((span, i) => expect(spans[i]).toBeCloseTo(span, 9));
    expect(trialSpans([8, 64], [8, 64, 100], 4)).toEqual(spans);
  });

  it('has both sides of every leap, the rest where the gaps are widest, and no more than asked for', () => {
    const spans = trialSpans([8, 60], [40, 25], 7);
    expect(spans).toHaveLength(7);
    expect(spans).toEqual(spans.toSorted((a, b) => a - b));
    expect(spans[0]).toBe(8);
    expect(spans[6]).toBe(60);
    for (const leap of [25, 40]) {
      const at = spans.indexOf(leap);
      expect(at).toBeGreaterThan(0);
      expect(spans[at + 1]! / leap - 1).toBeCloseTo(1e-6, 9);
    }
    expect(spans[1]).toBeCloseTo(Math.sqrt(8 * 25), 9);
    expect(trialSpans([8, 60], [10, 20, 30, 40], 7)).toHaveLength(10);
  });
});

describe('cost table of portal frames of two spans', () => {
  const benches = new Map<number, Workbench>();

  /** By the table, and as sized at its depth: all but what is measured with piers. */
  function both(lengthM: number, share: number): { readonly table: number; readonly sized: number } {
    const bench = benches.get(lengthM) ?? workbench(levelCrossing(lengthM));
    benches.set(lengthM, bench);
    const { site, size, costOf, tables } = bench;
    const table = tables.tableFor({ form: 'portal-frame', method: 'falsework' });
    const longM = lengthM / (1 + share);
    const spansM = [longM, share * longM];
    const clearM = meanClearance(site);
    const design = size({
      form: 'portal-frame',
      method: formModule('portal-frame').methods[0],
      deck: site.deck,
      standard: site.standard,
      planRadiusM: Infinity,
      clearUnderM: [clearM, clearM, clearM],
      ...skewOn(site),
      spansM,
      depthM: table.depthM('portal-frame', longM),
    });
    const ofDeck = ({ part, item }: MeasuredLine): boolean => part !== 'piers' && item !== 'method-setup';
    return {
      table: spansM.reduce((sum, span) => sum + span * table.deckPerM('portal-frame', span, longM), 0),
      sized: costOf([...design.lines, ...methodLines([design])].filter(ofDeck)),
    };
  }

  it('is what is sized on either side of where tendons begin, and where the shorter span is the least it may be', () => {
    for (const share of [1, 0.5]) {
      const { table, sized } = both(50, share);
      expect(table / sized).toBeCloseTo(1, 6);
    }
    const { table, sized } = both(50.0002, 1);
    expect(table / sized).toBeCloseTo(1, 3);
    expect(sized / both(50, 1).sized).toBeGreaterThan(1.05);
  });

  it('rises as steeply as what is sized from equal to unequal spans, and is nowhere a tenth off', () => {
    for (const lengthM of [50, 64]) {
      const equal = both(lengthM, 1);
      const uneven = both(lengthM, 0.6);
      const rise = (uneven.table - equal.table) / (uneven.sized - equal.sized);
      expect(Math.abs(rise - 1)).toBeLessThan(0.15);
      for (const share of [0.9, 0.75]) {
        const { table, sized } = both(lengthM, share);
        expect(Math.abs(table / sized - 1)).toBeLessThan(0.1);
      }
    }
  });
});
