import { expect, it } from 'vitest';
import type { Study } from '../../lib/index.ts';
import { lowFerry } from './studies.ts';
import { answerTo } from './answerTo.ts';

/** The worked example with firm ground far below any pile: nothing can be founded on it. */
function bottomless(): Study {
  const study = lowFerry();
  const { startM, endM } = study.brief.crossing;
  return {
    ...study,
    brief: {
      ...study.brief,
      groundStretches: [
        {
          fromM: startM,
          toM: endM,
          known: true,
          classes: [{ ground: 'soft-clay', bearingLevelM: -400, odds: 1 }],
        },
      ],
    },
    options: { ...study.options, forms: ['composite-i'] },
    books: { ...study.books, draws: 200 },
  };
}

it('appraise(ground that carries nothing) puts the option out with its reason and still prices it', () => {
  const { options } = answerTo(bottomless());
  expect(options.length).toBeGreaterThan(0);
  for (const { status, rulings, cost } of options) {
    expect(status).toBe('out');
    const ruling = rulings.find(({ rule }) => rule === 'foundation-none');
    expect(ruling?.effect).toBe('out');
    expect(ruling?.because.join()).toMatch(/neither a footing nor a group of bored piles/u);
    expect(cost.p50).toBeGreaterThan(0);
  }
});
