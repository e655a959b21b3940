import { expect, it } from 'vitest';
import type { AppraisedOption, Study, Water } from '../../lib/index.ts';
import { lowFerry } from './studies.ts';
import { answerTo } from './answerTo.ts';

/** The worked example with a pier in its river, and the river known as far as said. */
function inRiver(more: Partial<Water>): Study {
  const study = lowFerry();
  const { brief } = study;
  return {
    ...study,
    brief: {
      ...brief,
      obstacles: brief.obstacles.map((one) =>
        one.kind === 'river' ? { ...one, supports: 'none', clearance: null } : one,
      ),
      waters: brief.waters.map((water) => ({ ...water, ...more })),
    },
    books: { ...study.books, draws: 100 },
    options: {
      ...study.options,
      forms: ['composite-i'],
      kept: [
        {
          number: 40,
          form: 'composite-i',
          method: 'crane',
          units: [
            { form: 'composite-i', role: 'main', supportsM: [1240, 1284, 1316, 1348, 1390, 1432, 1470] },
          ],
          depthM: 1.8,
        },
      ],
    },
  };
}

const kept = (more: Partial<Water>): AppraisedOption =>
  answerTo(inRiver(more)).options.find(({ number }) => number === 40)!;
const effects = (option: AppraisedOption): Record<string, string> =>
  Object.fromEntries(option.rulings.map(({ rule, effect }) => [rule, effect]));

it('appraise(river not known) says what would settle it and puts nothing out for it', () => {
  const option = kept({});
  const said = effects(option);
  expect(said['afflux']).toBe('to confirm');
  const ruling = option.rulings.find(({ rule }) => rule === 'afflux')!;
  expect(ruling.because.join()).toMatch(/flow of the design flood.*allowed afflux/u);
  expect(said['scour-bed']).toBe('to confirm');
  expect(option.rivers![0]!.affluxM).toBeNull();
});

it('appraise(fast flood) is out for the afflux; with a generous allowance the road makes room for it', () => {
  const river = { flowM3s: 1500, grainMm: 1, allowedAffluxM: 0.02 };
  const strict = kept(river);
  expect(strict.rivers![0]!.affluxM).toBeGreaterThan(0.02);
  expect(effects(strict)['afflux']).toBe('out');
  expect(strict.status).toBe('out');
  const generous = kept({ ...river, allowedAffluxM: 0.5 });
  expect(effects(generous)['afflux']).toBeUndefined();
  // The lowest soffit over the flood is kept clear of the allowance as well.
  const { rivers, headroom } = generous;
  expect(rivers![0]!.freeboardM).toBeGreaterThanOrEqual(
    rivers![0]!.freeboardNeededM + 0.5 - rivers![0]!.affluxM! + headroom!.spareM - 1e-9,
  );
});

it('appraise(known flood) founds the pier in the river deeper the faster it runs', () => {
  const toe = (flowM3s: number): number => {
    const pier = kept({ flowM3s, grainMm: 0.5, allowedAffluxM: 1 }).supports[3]!;
    const foundation = pier.foundations[0]!;
    return foundation.piles?.toeLevelM ?? foundation.footing.topLevelM - foundation.footing.depthM;
  };
  expect(toe(1500)).toBeLessThan(toe(300));
});
