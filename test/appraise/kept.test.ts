import { describe, expect, it } from 'vitest';
import { depthBandOf, depthTrials, type Appraisal, type FormId, type Unit } from '../../lib/index.ts';
import { arrangementFacts } from '../../lib/appraise/facts.ts';
import { rulingsFor } from '../../lib/rules/index.ts';
import { survey } from '../../lib/site/index.ts';
import { lowFerry } from './studies.ts';
import { answerTo } from './answerTo.ts';

/** The worked example with one option kept by hand and composite I-girders proposed beside it. */
function withKept(supportsM: readonly number[], form: FormId = 'composite-i', pylons?: number[]): Appraisal {
  const study = lowFerry();
  const unit: Unit = { form, role: 'main', supportsM, ...(pylons ? { pylons } : {}) };
  const method = form === 'cable-stayed' ? 'stay-cantilever' : 'crane';
  const option = { number: 1, form, method, units: [unit], depthM: null } as const;
  return answerTo({
    ...study,
    books: { ...study.books, draws: 500 },
    options: { ...study.options, forms: ['composite-i'], kept: [option] },
  });
}
const first = ({ options }: Appraisal): Appraisal['options'][number] =>
  options.find(({ number }) => number === 1)!;

describe('appraise(option kept by hand)', { timeout: 60_000 }, () => {
  it('works out a pier in the river, puts it out and names the stretch', () => {
    const option = first(withKept([1240, 1300, 1350, 1410, 1470]));
    expect(option.status).toBe('out');
    expect(option.faults).toContain('support in a barred stretch: River Wend');
    expect(option.rulings.find(({ rule }) => rule === 'support-barred')!.effect).toBe('out');
    expect(option.cost.p50).toBeGreaterThan(0);
  });

  it('counts half a pier and its working space to what must stay clear', () => {
    // The river begins at 1325; a pier at 1324.5 stands with one leg in it, one at 1323.4 beside it.
    expect(first(withKept([1240, 1290, 1324.5, 1400, 1470])).status).toBe('out');
    expect(first(withKept([1240, 1290, 1323.4, 1400, 1470])).faults.join()).not.toMatch(/barred/u);
  });

  it('depthTrials(study, option) stays inside the band of its depth and holds its own depth', () => {
    const option = first(withKept([1240, 1290, 1323.4, 1400, 1470]));
    const [least, most] = depthBandOf(lowFerry(), option);
    const depths = depthTrials(lowFerry(), option).map(({ depthM }) => depthM!);
    expect(depths.length).toBeGreaterThan(3);
    expect(Math.min(...depths)).toBeGreaterThanOrEqual(least);
    expect(Math.max(...depths)).toBeLessThanOrEqual(most);
    expect(depths).toContain(option.depthM.midspan);
    expect(depths).toEqual([...new Set(depths)].sort((a, b) => a - b));
  });

  it('works out spans outside their windows and says which', () => {
    const short = first(withKept([1240, 1262, 1320, 1390, 1470]));
    expect(short.faults).toEqual(['end span outside its window']);
    const long = first(withKept([1240, 1470]));
    expect(long.faults).toEqual(['span outside the band of the form']);
    expect(long.status).toBe('out');
  });

  it('stands on the abutments of the brief, wherever they were when it was kept', () => {
    const option = first(withKept([1230, 1290, 1390, 1480]));
    expect(option.units[0]!.supportsM).toEqual([1240, 1290, 1390, 1470]);
  });

  it.each<[string, readonly number[], FormId, number[] | undefined, RegExp]>([
    ['a pier beyond an abutment', [1200, 1220, 1390, 1470], 'composite-i', undefined, /beyond an abutment/u],
    ['a pylon on an abutment', [1240, 1320, 1470], 'cable-stayed', [0], /pylons on inner supports/u],
  ])('says why %s cannot be worked out, and works out the rest', (_, supports, form, pylons, why) => {
    const appraisal = withKept(supports, form, pylons);
    const dropped = appraisal.dropped.find(({ option }) => option === 1)!;
    expect(dropped.because.join()).toMatch(why);
    expect(appraisal.options.length).toBeGreaterThan(0);
    expect(appraisal.retired).not.toContain(1);
  });
});

describe('arrangementFacts(pier in a soft stretch)', () => {
  const { brief } = lowFerry();
  const garden = {
    kind: 'heritage',
    name: 'walled garden',
    fromM: 1400,
    toM: 1420,
    pierPremium: 'unknown',
    clearance: null,
  } as const;
  const cautions = (supports: 'soft' | 'none', pierM: number): readonly string[] => {
    const site = survey({ ...brief, obstacles: [...brief.obstacles, { ...garden, supports }] });
    const units: Unit[] = [{ form: 'composite-i', role: 'main', supportsM: [1240, 1300, pierM, 1470] }];
    const rulings = rulingsFor(
      'arrangement',
      'composite-i',
      arrangementFacts(site, { units, method: 'crane' }),
    );
    return rulings.filter(({ effect }) => effect === 'caution').map(({ rule }) => rule);
  };

  it('warns of it, and of nothing on its edge or where supports are free', () => {
    expect(cautions('soft', 1410)).toContain('support-soft');
    expect(cautions('soft', 1400)).not.toContain('support-soft');
    expect(cautions('none', 1410)).not.toContain('support-soft');
  });
});
