import { describe, expect, it } from 'vitest';
import {
  workbench,
  type AppraisedOption,
  type MeasuredLine,
  type Road,
  type RoadProfile,
  type Study,
} from '../../lib/index.ts';
import { meanRates, ratesFor } from '../../lib/price/index.ts';
import { constructionDepth, profileFor } from '../../lib/site/index.ts';
import { approachLines } from '../../lib/takeoff/index.ts';
import { answerTo } from './answerTo.ts';
import { lowFerry, mirrored } from './studies.ts';

/** The first worked example, whose end is fixed, with one form and draws as few as figures of the middle need. */
function held(road: Partial<Road>): Study {
  const study = lowFerry();
  return {
    ...study,
    brief: { ...study.brief, road: { ...study.brief.road, ...road } },
    books: { ...study.books, draws: 300 },
    options: { ...study.options, forms: ['composite-i'] },
  };
}

/** Lines of what is regraded. */
const regraded = ({ lines }: AppraisedOption): readonly MeasuredLine[] =>
  lines.filter(({ what }) => what.startsWith('end regrading') || what.startsWith('start regrading'));

const ruled = ({ rulings }: AppraisedOption, rule: string) => rulings.find((one) => one.rule === rule);

describe('appraise with the gradient of the road behind a fixed end', () => {
  it('appraise(gradient unknown) is the same as without it to the last figure', () => {
    const { study: _asked, site: _site, ...without } = answerTo(held({}));
    const {
      study: _other,
      site: _same,
      ...unknown
    } = answerTo(held({ startGradient: 'unknown', endGradient: 'unknown' }));
    expect(JSON.stringify(unknown)).toBe(JSON.stringify(without));
    expect(without.options.flatMap(regraded)).toEqual([]);
  });

  it('appraise(gradient) measures the regrading of each option and pays for it', () => {
    const { options, site } = answerTo(held({ endGradient: 0.02, endApproachM: 600 }));
    expect(options.length).toBeGreaterThan(0);
    for (const option of options) {
      const behind = option.profile.regrading!.end!;
      expect(behind.curveM).toBeCloseTo(behind.radiusM * behind.gradientChange, 9);
      const sum = (item: string): number =>
        regraded(option).reduce((all, line) => all + (line.item === item ? line.quantity : 0), 0);
      expect(sum('fill')).toBe(behind.fillM3);
      expect(sum('excavation')).toBe(behind.cutM3);
      expect(sum('surfacing')).toBeCloseTo(behind.lengthM * site.deck.widthM, 9);
      expect(option.profile.regrading).not.toHaveProperty('start');
      expect(ruled(option, 'road-regrading')).toBeUndefined();
    }
  });

  it('appraise(steeper road behind) is never cheaper, option by option', () => {
    const plain = answerTo(held({ endApproachM: 2000 }));
    // The deck falls towards its end in every option, so that a road that rises there is ever farther from it.
    const cost = [0, 0.02, 0.04].map((endGradient) => {
      const { options } = answerTo(held({ endGradient, endApproachM: 2000 }));
      return Math.min(...options.map((option) => option.cost.p50));
    });
    expect(cost[0]!).toBeGreaterThan(Math.min(...plain.options.map((option) => option.cost.p50)));
    expect(cost[1]!).toBeGreaterThan(cost[0]!);
    expect(cost[2]!).toBeGreaterThan(cost[1]!);
  });

  it('appraise(curve longer than the known approach) puts an option out and says why', () => {
    const { options } = answerTo(held({ endGradient: 0.03, endApproachM: 40 }));
    expect(options.length).toBeGreaterThan(0);
    for (const option of options) {
      expect(option.profile.regrading!.end!.lengthM).toBeGreaterThan(40);
      expect(option.status).toBe('out');
      expect(ruled(option, 'road-regrading')).toMatchObject({
        effect: 'out',
        because: [expect.stringMatching(/takes 1\d\d(\.\d)? m behind a fixed end; 40 m may be regraded/)],
      });
    }
  });

  it('appraise(road behind as steep as is allowed) puts an option out that cannot be led back to it', () => {
    const { options } = answerTo(held({ endGradient: 0.06, endApproachM: 2000 }));
    for (const option of options) {
      expect(option.profile.regrading!.end!.comesBack).toBe(false);
      expect(ruled(option, 'road-regrading-steep')).toMatchObject({ effect: 'out' });
    }
  });

  it('appraise(approach of unknown length) leaves it to be confirmed', () => {
    const { options } = answerTo(held({ endGradient: 0.03 }));
    expect(options.length).toBeGreaterThan(0);
    for (const option of options)
      expect(ruled(option, 'road-regrading')).toMatchObject({ effect: 'to confirm' });
  });

  it('hundredMm has the regrading in its quantities, and they come to its money at mean rates', () => {
    const study = held({ endGradient: 0.02, endApproachM: 600 });
    const { options, site } = answerTo(study);
    const rates = meanRates(ratesFor(study.books));
    for (const { hundredMm } of options) {
      const { fillM3, cutM3, wallM2, surfacingM2, parapetM, amount } = hundredMm!;
      expect(wallM2).toBe(0);
      expect(parapetM).toBeCloseTo((2 * surfacingM2) / site.deck.widthM, 6);
      const byHand =
        fillM3 * rates['fill']! +
        cutM3 * rates['excavation']! +
        surfacingM2 * rates['surfacing']! +
        parapetM * rates['parapet']!;
      expect(byHand).toBeCloseTo(amount, 3);
    }
    // Where the end falls more steeply for it, the sag behind grows: dug deeper, surfaced over a longer stretch.
    const steeper = options.filter(({ hundredMm }) => hundredMm!.amount > 0);
    expect(steeper.length).toBeGreaterThan(0);
    for (const { hundredMm, profile } of steeper) {
      expect(profile.regrading!.end!.kind).toBe('sag');
      expect(hundredMm!.cutM3).toBeGreaterThan(0);
      expect(hundredMm!.surfacingM2).toBeGreaterThan(0);
    }
    for (const { hundredMm } of answerTo(held({})).options)
      expect(hundredMm).toMatchObject({ cutM3: 0, surfacingM2: 0, parapetM: 0 });
  });

  it('appraise() takes the sharper crest that spares the curve behind where that is cheaper in all, and only there', () => {
    // The road falls away at 5 % behind the end and rises at 3 % before the start: both curves go with a crest over the bridge.
    const steep = held({
      fixedEnd: 'both',
      startGradient: 0.03,
      endGradient: -0.05,
      startApproachM: 600,
      endApproachM: 600,
    });
    const bench = workbench(steep);
    for (const option of answerTo(steep).options) {
      expect(option.profile.easedFor).toBe('start');
      expect(option.profile.regrading!.start!.gradientChange).toBeCloseTo(0, 9);
      expect(option.profile.regrading!.end!.gradientChange).toBeLessThan(0.001);
      // Higher than it need be, and the approaches spare more than 100 mm of depth would.
      expect(option.headroom!.spareM).toBeGreaterThan(0.1);
      const lowest = profileFor(bench.site, {
        xM: [bench.site.startM, bench.site.endM],
        depthM: [0, 0].map(() => constructionDepth(bench.site.deck, option.depthM.support)),
      });
      if (!lowest.ok) throw new Error('expected a road');
      const paid = (profile: RoadProfile): number => bench.costOf(approachLines(bench.site, profile));
      expect(paid(option.profile)).toBeLessThan(paid(lowest.profile) - 10_000);
    }
    // Where the existing road goes up behind the end no crest spares anything.
    for (const { profile } of answerTo(held({ endGradient: 0.02, endApproachM: 600 })).options)
      expect(profile.easedFor).toBeUndefined();
  });

  it('appraise(mirrored) regrades as much behind the other end', () => {
    const study = held({ endGradient: 0.02, endApproachM: 600 });
    const [one, other] = [answerTo(study), answerTo(mirrored(study))];
    for (const option of one.options) {
      const back = other.options.find(({ supports }) => supports.length === option.supports.length)!;
      const [end, start] = [option.profile.regrading!.end!, back.profile.regrading!.start!];
      expect(start.kind).toBe(end.kind);
      expect(start.lengthM / end.lengthM).toBeCloseTo(1, 2);
    }
  });
});
