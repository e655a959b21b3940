import { describe, expect, it } from 'vitest';
import { meanClearance } from '../../lib/appraise/meanClearance.ts';
import { tautSide } from '../../lib/appraise/tautSide.ts';
import { trialPiers } from '../../lib/appraise/trialPiers.ts';
import { workbench } from '../../lib/appraise/workbench.ts';
import { memory, survey, type Study } from '../../lib/index.ts';
import { workedExample } from '../../notebooks/examples.ts';

const unit = (side: number, utilisation: number) =>
  ({
    task: { spansM: [side * 200, 200, side * 200] },
    checks: [{ id: 'back-stay-slack', utilisation }],
  }) as unknown as Parameters<typeof tautSide>[0];

describe('tautSide(unit on two pylons)', () => {
  it('is the side span itself where its back-stays are just taut', () => {
    expect(tautSide(unit(0.42, 1))).toBeCloseTo(0.42, 9);
  });

  it('is found from another side span with the same loads, by hand', () => {
    // Traffic a quarter of the weight: 1/4 - r^2 = r^2 / 4, r = sqrt(0.2). At 0.4 that is used to 0.25 x 0.16 / 0.09.
    expect(tautSide(unit(0.4, (0.25 * 0.16) / 0.09))).toBeCloseTo(Math.sqrt(0.2), 9);
    expect(tautSide(unit(0.4, 0))).toBe(Infinity);
  });
});

/** The estuary with its road at other levels at both ends. */
const estuary = (levelM: number, mayRiseM: number): Study => {
  const study = workedExample('sarrow-estuary');
  const { brief } = study;
  const road = { ...brief.road, startLevelM: levelM, endLevelM: levelM, mayRiseM };
  return { ...study, brief: { ...brief, road } };
};

describe('what the cost table knows of the road', () => {
  it('meanClearance(site) is the height under a deck that clears what it crosses, in steps of 2 m', () => {
    const high = meanClearance(survey(estuary(60, 0).brief));
    expect(high - meanClearance(survey(estuary(50, 0).brief))).toBe(10);
    expect(high % 2).toBe(0);
  });

  it('trialPiers(site) reach up to the road that climbs over the channel, not to the one proposed', () => {
    const low = estuary(20, 12);
    const { obstacles } = low.brief;
    const unhindered = {
      ...low,
      brief: { ...low.brief, obstacles: obstacles.map((one) => ({ ...one, clearance: null })) },
    };
    const [level, climbing] = [unhindered, low].map((study) => {
      const { site, costOf } = workbench(study);
      return trialPiers({ site, costOf }, memory().piers)(2400, 2);
    });
    expect(climbing!).toBeGreaterThan(level!);
  });
});
