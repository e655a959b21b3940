import { describe, expect, it } from 'vitest';
import { ratesFor, type Appraisal, type Study } from '../../lib/index.ts';
import { answerTo } from './answerTo.ts';
import { exampleStudy as study } from './workedOut.ts';

/** A study with one item at the 90 % point of its own rate: dear, and inside what was stated. */
const dear =
  (item: string) =>
  (whole: Study): Study => {
    const { p10, p50, p90 } = ratesFor(whole.books).rates.find((rate) => rate.item === item)!;
    const up = p90 / p50;
    const typed = { item, p10: p10 * up, p50: p90, p90: p90 * up, reason: 'at the 90 % point of its range' };
    return { ...whole, books: { ...whole.books, rates: [typed] } };
  };
/** A study with another headroom over everything whose headroom is not confirmed, m. */
const clearing =
  (headroomM: number) =>
  (whole: Study): Study => ({
    ...whole,
    brief: {
      ...whole.brief,
      obstacles: whole.brief.obstacles.map((one) =>
        one.clearance && !one.clearance.confirmed
          ? { ...one, clearance: { ...one.clearance, headroomM } }
          : one,
      ),
    },
  });
const leading = ({ options, standing }: Appraisal) => {
  const group = standing.groups.find((one) => one.includes(standing.leader!))!;
  return options.filter(({ number }) => group.includes(number));
};
/** Form and number of supports of what leads: what an option is known by. */
const leader = ({ options, standing }: Appraisal): string => {
  const { form, supports } = options.find(({ number }) => number === standing.leader)!;
  return `${form} on ${supports.length} supports`;
};

describe('worked examples', { timeout: 120_000 }, () => {
  it.each([
    ['low-ferry', 'girder steel at the dear end of its range', dear('plate-girder-steel')],
    ['stonebeck-lane', 'a headroom of 5.50 m where 5.35 m is not confirmed', clearing(5.5)],
    ['tanners-yard', 'girder steel at the dear end of its range', dear('plate-girder-steel')],
  ] as const)('%s is open: two families lead together, and %s changes what leads', (name, _, changed) => {
    const before = answerTo(study(name));
    expect(new Set(leading(before).map(({ family }) => family)).size).toBeGreaterThanOrEqual(2);
    const after = answerTo(changed(study(name)));
    expect(leader(after)).not.toBe(leader(before));
  });

  it('sarrow-estuary is open: a box and a stayed bridge lead together, and a headroom of 18 m where 22 m is not confirmed changes the family', () => {
    const before = answerTo(study('sarrow-estuary'));
    const { options } = before;
    const family = ({ options: all, standing }: Appraisal): string =>
      all.find(({ number }) => number === standing.leader)!.family;
    const possible = options.filter(({ status }) => status !== 'out');
    expect(new Set(leading(before).map((one) => one.family)).size).toBeGreaterThanOrEqual(2);
    expect(new Set(possible.map((one) => one.family))).toEqual(new Set(['cable-supported', 'box', 'truss']));
    for (const { units } of possible) {
      const forms = new Set(units.map(({ form }) => form));
      expect(forms.size).toBeGreaterThan(1);
      for (const { supportsM } of units)
        for (const x of supportsM) expect(x <= 2600 || x >= 2780, `support at ${x}`).toBe(true);
    }
    const after = answerTo(clearing(18)(study('sarrow-estuary')));
    expect(family(after)).not.toBe(family(before));
  });
});
