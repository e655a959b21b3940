import { describe, expect, it } from 'vitest';
import { meanRates, ratesFor } from '../../lib/price/index.ts';
import { standPierBetween, expectedLines } from '../../lib/substructure/index.ts';
import { constructionDepth, roadLevelAt } from '../../lib/site/index.ts';
import { programmeData, supportWeeks } from '../../lib/programme/index.ts';
import { ORDINARY_DEPTH_M } from '../../lib/appraise/meanClearance.ts';
import { memory } from '../../lib/appraise/memory.ts';
import { profileOrNearest } from '../../lib/appraise/profileOrNearest.ts';
import { proposalsFor } from '../../lib/appraise/proposals.ts';
import { PIER_LOADS_KN, PIER_PERMANENT, trialPiers } from '../../lib/appraise/trialPiers.ts';
import { finish } from '../../lib/appraise/work.ts';
import { workbench } from '../../lib/appraise/workbench.ts';
import type { Arrangement, FormId, Obstacle, Study } from '../../lib/index.ts';
import { answerTo } from './answerTo.ts';
import { lowFerry } from './studies.ts';
import { exampleStudy } from './workedOut.ts';

/** Flat ground under a level road, with one stretch in which no support may stand. */
function flat(lengthM: number, barred: readonly [fromM: number, toM: number], form: FormId): Study {
  const study = lowFerry();
  const { brief } = study;
  const road: Obstacle = {
    kind: 'road',
    name: 'road',
    fromM: barred[0],
    toM: barred[1],
    supports: 'hard',
    pierPremium: 'unknown',
    clearance: null,
  };
  const levels: readonly (readonly [number, number])[] = [
    [-40, 15],
    [0, 15],
    [10, 10],
    [lengthM - 10, 10],
    [lengthM, 15],
    [lengthM + 40, 15],
  ];
  const [plain] = brief.groundStretches;
  return {
    ...study,
    brief: {
      ...brief,
      crossing: {
        ...brief.crossing,
        startM: 0,
        endM: lengthM,
        skewDeg: 0,
        ground: levels.map(([chainageM, levelM]) => ({ chainageM, levelM })),
      },
      road: { ...brief.road, startLevelM: 19, endLevelM: 19 },
      obstacles: [road],
      waters: [],
      groundStretches: [{ ...plain!, fromM: 0, toM: lengthM }],
    },
    books: { ...study.books, draws: 300 },
    options: { ...study.options, forms: [form], workOutAnyway: [form] },
  };
}

const proposed = (study: Study): readonly Arrangement[] =>
  finish(proposalsFor(workbench(study, memory()), study.options.forms[0]!)).arrangements;
const spansOf = ({ units }: Arrangement): number[] =>
  units.flatMap(({ supportsM }) => supportsM.slice(1).map((x, i) => x - supportsM[i]!));

describe('proposalsFor(form built out from its piers)', () => {
  it('proposes no single span of a cantilevered box, and says what would let one in', () => {
    const found = finish(proposalsFor(workbench(flat(60, [6, 54], 'cantilever-box')), 'cantilever-box'));
    expect(found.arrangements).toEqual([]);
    expect(found.because.join(' ')).toContain('fits if');
  });

  it('launches a steel box of one span, which has no pier to be built from', () => {
    const found = proposed(flat(70, [6, 64], 'steel-box'));
    expect(found.length).toBeGreaterThan(0);
    for (const one of found) {
      expect(spansOf(one)).toEqual([70]);
      expect(one.method).not.toBe('balanced-cantilever');
    }
  });
});

describe('proposalsFor(truss)', () => {
  it('floats nothing in where there is no water, though towers would stand on the road that is crossed', () => {
    const found = proposed(flat(70, [6, 64], 'truss'));
    expect(new Set(found.map(({ method }) => method))).toEqual(new Set(['crane']));
  });

  it('is floated in as well over water in which towers would stand', () => {
    const study = flat(70, [6, 64], 'truss');
    const water = {
      ...lowFerry().brief.waters[0]!,
      fromM: 12,
      toM: 58,
      floodFromM: 12,
      floodToM: 58,
      levelM: 11,
    };
    const wet: Study = { ...study, brief: { ...study.brief, waters: [{ ...water, floodLevelM: 11.5 }] } };
    expect(new Set(proposed(wet).map(({ method }) => method))).toEqual(new Set(['crane', 'float-in']));
  });
});

describe('proposalsFor(viaduct on level ground)', () => {
  it.each(['composite-i', 'concrete-box', 'composite-box'] as const)(
    '%s: inner spans about even, none far longer than a road of 20 m asks for',
    (form) => {
      for (const one of proposed(flat(500, [240, 260], form))) {
        const inner = spansOf(one).slice(1, -1);
        expect(Math.max(...inner) / Math.min(...inner)).toBeLessThan(1.35);
        expect(one.units.length).toBe(1);
      }
    },
  );
});

describe('trialPiers(site)', () => {
  it('counts the months a pier adds to the site, at the rate of a site month', () => {
    const { site, costOf, study } = workbench(flat(500, [240, 260], 'composite-i'));
    const loadKN = PIER_LOADS_KN[2];
    const road = profileOrNearest(site, constructionDepth(site.deck, ORDINARY_DEPTH_M));
    const deck = {
      permanentKNm: (PIER_PERMANENT * loadKN) / 40,
      trafficKNm: ((1 - PIER_PERMANENT) * loadKN) / 40,
      depthM: ORDINARY_DEPTH_M,
    };
    const pier = standPierBetween(site, deck, 100, 40, 40, roadLevelAt(road, 100));
    const weeks = supportWeeks(pier, [], 'likely');
    expect(weeks).toBeGreaterThan(2);
    // Two crews side by side; a deck on falsework or cranes waits for about half of the supports.
    const months = (0.5 * weeks) / programmeData.crews / programmeData.weeksPerMonth;
    const money = trialPiers({ site, costOf }, memory().piers)(100, 2) - costOf(expectedLines(pier));
    expect(money).toBeCloseTo(months * meanRates(ratesFor(study.books))['site-month']!, 3);
  });
});

describe('appraise(cable-stayed)', { timeout: 60_000 }, () => {
  const stayed = (headroomM: number, widthM: number): Study => {
    const whole = exampleStudy('sarrow-estuary');
    const obstacles = whole.brief.obstacles.map((one) => {
      if (one.name !== 'Navigation channel' || one.clearance === null) return one;
      const middleM = (one.fromM + one.toM) / 2;
      const [fromM, toM] = [middleM - widthM / 2, middleM + widthM / 2];
      return { ...one, fromM, toM, clearance: { ...one.clearance, headroomM } };
    });
    return {
      ...whole,
      brief: { ...whole.brief, obstacles },
      books: { ...whole.books, draws: 300 },
      options: { ...whole.options, forms: ['cable-stayed'], kept: [] },
    };
  };

  it.each([
    [22, 170],
    [24, 180],
  ])('headroom %s m over %s m: with one pylon it does not carry, with two it does', (headroomM, widthM) => {
    const { options } = answerTo(stayed(headroomM, widthM));
    const pylons = (status: string): Set<number> =>
      new Set(
        options
          .filter((one) => one.status === status)
          .map((one) => one.units.find((u) => u.pylons)!.pylons!.length),
      );
    expect(pylons('out')).toEqual(new Set([1]));
    expect(pylons('possible')).toEqual(new Set([2]));
    expect(new Set(options.map(({ supports }) => supports.length)).size).toBe(options.length);
  });
});

describe('appraise(gorge)', () => {
  it('launches girders that no crane sets from so far below, and says of those set by crane why not', () => {
    const study = flat(150, [0, 0.1], 'composite-i');
    const { brief } = study;
    const levels = [
      [-60, 200],
      [0, 200],
      [20, 185],
      [45, 150],
      [75, 132],
      [105, 150],
      [130, 185],
      [150, 200],
      [210, 200],
    ] as const;
    const gorge: Study = {
      ...study,
      brief: {
        ...brief,
        crossing: { ...brief.crossing, ground: levels.map(([chainageM, levelM]) => ({ chainageM, levelM })) },
        road: { ...brief.road, startLevelM: 203, endLevelM: 203 },
        obstacles: [],
        groundStretches: [
          { fromM: 0, toM: 150, known: true, classes: [{ ground: 'rock', bearingDepthM: 2, odds: 1 }] },
        ],
      },
    };
    const { options } = answerTo(gorge);
    const warned = (method: string): Set<boolean> =>
      new Set(
        options
          .filter((one) => one.method === method)
          .map(({ rulings }) =>
            rulings.some(({ rule, effect }) => rule === 'crane-height' && effect === 'caution'),
          ),
      );
    expect(warned('crane')).toEqual(new Set([true]));
    expect(warned('launch')).toEqual(new Set([false]));
  });
});
