import { describe, expect, it } from 'vitest';
import { depthRange } from '../../lib/appraise/depthRange.ts';
import { workbench } from '../../lib/appraise/workbench.ts';
import { compositeData } from '../../lib/forms/composite-i/compositeData.ts';
import { formModule } from '../../lib/forms/index.ts';
import type { Design } from '../../lib/model/index.ts';
import { depthBand } from '../../lib/rules/index.ts';
import { lowFerry } from './studies.ts';

const bench = workbench(lowFerry());
const { site, tables } = bench;
const truss = { form: 'truss', method: formModule('truss').methods[0] } as const;

/** A composite approach of these spans at the depth that the cost table of a truss reads for it. */
function approach(spansM: readonly number[]): Design {
  const girders = formModule('composite-i');
  const depthM = Math.round(tables.tableFor(truss).depthM('composite-i', Math.max(...spansM)) * 20) / 20;
  return girders.size({
    form: 'composite-i',
    method: girders.methods[0],
    spansM,
    deck: site.deck,
    standard: site.standard,
    planRadiusM: Infinity,
    depthM,
  });
}

describe('short composite spans beside a main unit', () => {
  it.each([9, 10, 11, 12, 13, 14, 15, 16, 18, 20])(
    'an approach span of %s m alone has a depth at which every check holds',
    (spanM) => {
      expect(approach([spanM]).checks.filter(({ utilisation }) => utilisation > 1)).toEqual([]);
    },
  );

  it.each([
    { spansM: [9, 14] },
    { spansM: [7, 12, 12, 7] },
    { spansM: [10, 14, 10] },
    { spansM: [12, 20, 12] },
  ])('an approach of $spansM m too', ({ spansM }) => {
    expect(approach(spansM).checks.filter(({ utilisation }) => utilisation > 1)).toEqual([]);
  });

  it('depthRange(12 m) is the one depth of the slab and the least girder, deeper than the published ratio', () => {
    const [least, most] = depthRange('composite-i', 'crane', [12], site);
    const { figures } = approach([12]);
    const slabM = figures['slabAtGirderM']!;
    expect(least).toBeCloseTo(slabM + compositeData.leastGirderM.value, 9);
    expect(most).toBe(least);
    expect(most / 12).toBeGreaterThan(depthBand('composite-i', 'simple', 'crane')[1]);
  });

  it('depthRange(40 m) is the published band', () => {
    const [least, most] = depthBand('composite-i', 'simple', 'crane');
    expect(depthRange('composite-i', 'crane', [40], site)).toEqual([40 * least, 40 * most]);
  });
});
