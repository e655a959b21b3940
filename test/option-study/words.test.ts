import { describe, expect, it } from 'vitest';
import { nextWords } from '../../notebooks/option-study/words.ts';
import { workedStudy } from './study.ts';

describe('nextWords(brief)', () => {
  const { brief } = workedStudy();
  const confirmed = brief.obstacles.map((one) => ({
    ...one,
    clearance: one.clearance && { ...one.clearance, confirmed: true },
  }));

  it('asks for a headroom that is a preset first, then for boreholes where supports stand', () => {
    const open = confirmed.map((one) => ({
      ...one,
      clearance: one.clearance && { ...one.clearance, confirmed: false },
    }));
    expect(nextWords({ ...brief, obstacles: open })).toMatch(/^ask for the headroom over/u);
    expect(nextWords({ ...brief, obstacles: confirmed })).toMatch(/^ask for boreholes at the river piers;/u);
    expect(nextWords({ ...brief, obstacles: confirmed, waters: [] })).toMatch(
      /^ask for boreholes at the supports;/u,
    );
  });

  it('goes on to the decision once the ground is known', () => {
    const groundStretches = brief.groundStretches.map((stretch) => ({ ...stretch, known: true }));
    expect(nextWords({ ...brief, obstacles: confirmed, groundStretches })).toMatch(/record the decision/u);
  });
});
