import { describe, expect, it } from 'vitest';
import { carries } from '../../lib/forms/index.ts';
import type { FormId, Study } from '../../lib/index.ts';
import { begun, emptyGaps, type Gaps } from '../../notebooks/shelf/newStudy.ts';
import { answerTo } from './answerTo.ts';

/** A study begun from what is known of a crossing, for one form. */
function studyOf(gaps: Partial<Gaps>, form: FormId): Study {
  const made = begun({ ...emptyGaps, ...gaps });
  if (!made.ok) throw new Error(made.why);
  const { study } = made;
  return {
    ...study,
    books: { ...study.books, draws: 300 },
    options: { ...study.options, forms: [form] },
  };
}

describe('appraise with approaches', () => {
  it('appraise(wide river) makes approaches as deep as their own spans ask for, not as those of the table', () => {
    // 183 m between the main piers of a box built by cantilevering; approaches of 18 to 31 m that rise to it.
    const river = {
      lengthM: 600,
      crossed: 'river',
      barredM: 180,
      headroomM: 12,
      lanes: 4,
      widthM: 22,
    } as const;
    const { options } = answerTo(studyOf(river, 'cantilever-box'));
    const withGirders = options.filter(({ units }) => units.some(({ form }) => form === 'composite-i'));
    expect(withGirders.length).toBeGreaterThan(0);
    for (const { units, designs, status } of withGirders) {
      expect(status).not.toBe('out');
      designs.forEach(({ limitingCheck }, k) => {
        if (units[k]!.role === 'approach')
          expect(carries(limitingCheck.utilisation), limitingCheck.label).toBe(true);
      });
    }
  });

  it('appraise(long crossing) makes composite girders deeper over a long opening than before and behind it', () => {
    const study = studyOf({ lengthM: 1200, crossed: 'river', barredM: 100, headroomM: 12 }, 'composite-i');
    const { options } = answerTo(study);
    const { units, designs, cost } = options[0]!;
    expect(units.map(({ role }) => role)).toEqual(['approach', 'main', 'approach']);
    const [before, main, behind] = designs.map(({ depthM }) => depthM.midspan);
    expect(before!).toBeLessThan(0.75 * main!);
    expect(behind!).toBeLessThan(0.75 * main!);
    // Worth more than the two joints: one depth throughout costs a good deal more.
    const whole = answerTo({
      ...study,
      options: {
        ...study.options,
        kept: [
          {
            number: 99,
            form: 'composite-i',
            method: 'crane',
            units: [
              {
                form: 'composite-i',
                role: 'main',
                supportsM: units.flatMap(({ supportsM }, k) => supportsM.slice(k === 0 ? 0 : 1)),
              },
            ],
            depthM: null,
          },
        ],
      },
    }).options.find(({ number }) => number === 99)!;
    expect(whole.cost.p50).toBeGreaterThan(1.04 * cost.p50);
  });
});
