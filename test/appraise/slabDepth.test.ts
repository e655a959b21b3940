import { describe, expect, it } from 'vitest';
import { bandOf, deckDepth, taskAt, type OpenDepth } from '../../lib/appraise/deckDepth.ts';
import { onGrid } from '../../lib/appraise/depthGrid.ts';
import { finish } from '../../lib/appraise/work.ts';
import { cannotCarry, formModule } from '../../lib/forms/index.ts';
import { standardIds, type DeckStrip, type StandardId } from '../../lib/model/index.ts';
import { meanRates, ratesFor } from '../../lib/price/index.ts';
import { deckSpec } from '../../lib/site/index.ts';

const mean = meanRates(ratesFor({ ratePack: 'demo-2026', rates: [] }));
function slabOf(spansM: number[], standard: StandardId): OpenDepth {
  const edge: DeckStrip = { kind: 'barrier', widthM: 0.5, ultimateWidthM: 0.5 };
  const lane: DeckStrip = { kind: 'lane', widthM: 4.5, ultimateWidthM: 4.5 };
  const deck = deckSpec([edge, lane, lane, edge], 0.09, standard);
  return {
    task: { form: 'slab', spansM, deck, standard, planRadiusM: Infinity, method: 'falsework' },
    haunch: 1,
  };
}

// AASHTO LRFD, 8th ed. 2017, table 2.5.2.6.3-1: 1.2 (S + 3.0) / 30 of simple and (S + 3.0) / 30 of continuous reinforced
// slabs, S in m and 3.0 for 10 ft, at least 165 mm; worked out by hand.
const table: readonly (readonly [spanM: number, simpleM: number, continuousM: number])[] = [
  [6, 0.36, 0.3],
  [8, 0.44, 0.367],
  [10, 0.52, 0.433],
  [12, 0.6, 0.5],
  [15, 0.72, 0.6],
];
const cases = table.flatMap(([spanM, simpleM, continuousM]) =>
  standardIds.flatMap((standard) => [
    [[spanM], simpleM, standard] as const,
    [[spanM, spanM], continuousM, standard] as const,
  ]),
);

describe('default depth of short slabs', () => {
  it.each(cases)(
    'spans %o m are at least %d m deep under %s, and deflect within their limit',
    (spansM, leastM, standard) => {
      const open = slabOf([...spansM], standard);
      const { depthM } = finish(deckDepth(open, mean));
      expect(depthM).toBeGreaterThanOrEqual(leastM);
      // No deeper than it must: half as deep again would be another slab.
      expect(depthM).toBeLessThan(1.5 * leastM);
      const design = formModule('slab').size(taskAt(open, depthM));
      const deflection = design.checks.find(({ id }) => id === 'deflection')!;
      expect(deflection.utilisation).toBeGreaterThan(0);
      expect(cannotCarry([design])).toBeNull();
    },
  );

  it('the least depth of the band is that of the table, to the rounding of its ratios', () => {
    for (const [spanM, simpleM, continuousM] of table) {
      // 10 ft are 3.048 m: up to 0.6 % over the table in metres.
      for (const [spansM, leastM] of [
        [[spanM], simpleM],
        [[spanM, spanM], continuousM],
      ] as const) {
        const [least] = bandOf(slabOf([...spansM], 'hl93'));
        expect(least / leastM).toBeGreaterThan(0.999);
        expect(least / leastM).toBeLessThan(1.006);
      }
    }
  });

  it('slabs under half a metre are drawn to 10 mm, deeper sections to 50 mm', () => {
    expect([0.3619, 0.494, 0.52, 1.237].map(onGrid)).toEqual([0.36, 0.49, 0.5, 1.25]);
  });
});
