import { describe, expect, it } from 'vitest';
import {
  bearingBy,
  likeliest,
  missingOdds,
  withBearingBy,
  withBoundary,
  withoutStretch,
  withSplit,
  withUnknownGround,
} from '../../notebooks/option-study/brief/stretchEdits.ts';
import { groundAt, survey, type Study } from '../../lib/index.ts';
import { placesOf, workedStudy } from './study.ts';

const ends = ({ brief }: Study): number[][] => brief.groundStretches.map(({ fromM, toM }) => [fromM, toM]);

describe('stretches of ground', () => {
  it('share their ends: moving one moves the other', () => {
    const moved = withBoundary(workedStudy(), 1, 1290);
    expect(ends(moved).slice(0, 2)).toEqual([
      [1225, 1290],
      [1290, 1355],
    ]);
    expect(placesOf(moved)).toEqual([]);
  });

  it('are split in two of the same ground, and taken out without a gap', () => {
    const split = withSplit(workedStudy(), 0);
    expect(ends(split).slice(0, 2)).toEqual([
      [1225, 1255],
      [1255, 1285],
    ]);
    expect(placesOf(split)).toEqual([]);
    for (const index of [0, 1, 3]) {
      const without = withoutStretch(workedStudy(), index);
      expect(without.brief.groundStretches).toHaveLength(3);
      expect([ends(without)[0]![0], ends(without)[2]![1]]).toEqual([1225, 1485]);
      expect(placesOf(without)).toEqual([]);
    }
  });

  it('take the odds of ground nobody has looked at when nothing is known', () => {
    const unknown = withUnknownGround(workedStudy(), 2);
    const stretch = unknown.brief.groundStretches[2]!;
    expect(stretch).toMatchObject({ fromM: 1355, toM: 1425, known: false });
    expect(missingOdds(stretch.classes)).toBe(0);
    expect(stretch.classes.length).toBeGreaterThan(2);
    expect(placesOf(unknown)).toEqual([]);
  });

  it('bear at a level or as deep below the ground, the same in the middle when it is said the other way', () => {
    const study = workedStudy();
    const [before] = study.brief.groundStretches[1]!.classes;
    const down = withBearingBy(study, 1, 0, 'depth');
    expect([bearingBy(study, 1, 0), bearingBy(down, 1, 0), bearingBy(down, 1, 9)]).toEqual([
      'level',
      'depth',
      undefined,
    ]);
    const { bearingLevelM, bearingDepthM } = down.brief.groundStretches[1]!.classes[0]!;
    expect(bearingLevelM).toBeUndefined();
    const site = survey(study.brief);
    const middleM = (1285 + 1355) / 2;
    expect(groundAt(site, middleM) - bearingDepthM!).toBeCloseTo(before!.bearingLevelM!, 1);
    expect(placesOf(down)).toEqual([]);
    const back = withBearingBy(down, 1, 0, 'level');
    expect(back.brief.groundStretches[1]!.classes[0]!.bearingLevelM).toBeCloseTo(before!.bearingLevelM!, 1);
    expect(withBearingBy(study, 1, 0, 'level')).toBe(study);
  });

  it('say what their odds leave open', () => {
    const classes = (...odds: number[]) =>
      odds.map((share) => ({ ground: 'rock' as const, bearingLevelM: 0, odds: share }));
    expect(missingOdds(classes(0.5, 0.15, 0.35))).toBe(0);
    expect(missingOdds(classes(0.1, 0.2))).toBe(0.7);
    expect(missingOdds(classes(0.9, 0.2))).toBe(-0.1);
    expect(likeliest(classes(0.2, 0.5, 0.5))).toBe(1);
  });
});
