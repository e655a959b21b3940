import { describe, expect, it } from 'vitest';
import { arrange } from '../../lib/arrange/index.ts';
import { requestFor } from '../../lib/appraise/requestFor.ts';
import { workbench } from '../../lib/appraise/workbench.ts';
import { workOptionAt } from '../../lib/appraise/workOption.ts';
import { memory, type Study, type Unit } from '../../lib/index.ts';
import { meanRates, ratesFor } from '../../lib/price/index.ts';
import { lowFerry } from './studies.ts';

const asked = { form: 'composite-i', method: 'crane' } as const;
const kept = memory();

/** The worked example with a stretch in which supports had better not stand. */
function withGarden(fromM: number, toM: number, pierPremium: number | 'unknown'): Study {
  const study = lowFerry();
  const garden = {
    kind: 'heritage',
    name: 'walled garden',
    fromM,
    toM,
    supports: 'soft',
    clearance: null,
    pierPremium,
  } as const;
  return { ...study, brief: { ...study.brief, obstacles: [...study.brief.obstacles, garden] } };
}

function bestUnit(study: Study): Unit {
  const { site, tables } = workbench(study, kept);
  return arrange(requestFor(asked, site), site, tables.tableFor(asked)).arrangements[0]!.units[0]!;
}

describe('a stretch in which supports had better not stand', { timeout: 60_000 }, () => {
  const free = bestUnit(lowFerry());
  const pierM = free.supportsM[1]!;
  const standsIn = ({ supportsM }: Unit): boolean => supportsM.some((x) => x > pierM - 3 && x < pierM + 3);

  it('arrange keeps its pier there for a small sum and leaves the stretch for a large one', () => {
    expect(standsIn(bestUnit(withGarden(pierM - 3, pierM + 3, 100)))).toBe(true);
    expect(standsIn(bestUnit(withGarden(pierM - 3, pierM + 3, 5_000_000)))).toBe(false);
  });

  it.each([
    [120_000, 'soft-stretch-sum', 120_000],
    ['unknown', 'soft-stretch-support', 1],
  ] as const)(
    'a pier in it at a sum of %s is measured as %s, %s, and costs that more',
    (sum, item, quantity) => {
      const option = { number: 1, ...asked, units: [free], origin: 'proposed' } as const;
      const plain = workbench(lowFerry(), kept);
      const bench = workbench(withGarden(pierM - 3, pierM + 3, sum), kept);
      const before = workOptionAt(plain, { ...option, depthM: 2.5 }, [2.5]);
      const after = workOptionAt(bench, { ...option, depthM: 2.5 }, [2.5]);
      const own = after.lines.filter((line) => line.item.startsWith('soft-stretch'));
      expect(own.map((line) => [line.item, line.quantity, line.part, line.support])).toEqual([
        [item, quantity, 'piers', 1],
      ]);
      const more = bench.costOf(after.lines) - plain.costOf(before.lines);
      expect(more).toBeCloseTo(quantity * meanRates(ratesFor(bench.study.books))[item]!, 2);
    },
  );

  it('a support on its edge or an abutment in it costs no more', () => {
    const bench = workbench(withGarden(pierM, pierM + 30, 120_000), kept);
    const option = { number: 1, ...asked, units: [free], origin: 'proposed', depthM: 2.5 } as const;
    const { lines } = workOptionAt(bench, option, [2.5]);
    expect(lines.some((line) => line.item.startsWith('soft-stretch'))).toBe(false);
  });
});
