import { readFileSync } from 'node:fs';
import { readStudy } from '../../lib/study/index.ts';
import type { Brief, Study } from '../../lib/model/index.ts';

/** Text of the worked example. */
export const lowFerryText = readFileSync(
  new URL('../../data/examples/low-ferry.json', import.meta.url),
  'utf8',
);

/** The worked example as a study. */
export function lowFerry(): Study {
  const read = readStudy(lowFerryText);
  if (!read.ok) throw new Error('the worked example does not read');
  return read.value;
}

/** A level 100 m crossing without obstacles, to be changed piece by piece. */
export function plainBrief(change: Partial<Brief> = {}): Brief {
  return {
    crossing: {
      startM: 0,
      endM: 100,
      ground: [
        { chainageM: 0, levelM: 0 },
        { chainageM: 100, levelM: 0 },
      ],
      planRadiusM: 'straight',
      groundAccelerationG: 'unknown',
      siteClass: 'unknown',
      skewDeg: 0,
    },
    road: {
      startLevelM: 6,
      endLevelM: 6,
      fixedEnd: 'none',
      mayRiseM: 2,
      maxGradient: 0.05,
      fillSideSlope: 2,
      designSpeedKmh: 'unknown',
      crestRadiusM: 'unknown',
      sagRadiusM: 'unknown',
      startTieIn: 'moves',
      endTieIn: 'moves',
      startApproachM: 'unknown',
      endApproachM: 'unknown',
      approachSides: 'slopes',
    },
    deck: [{ kind: 'lane', widthM: 12, ultimateWidthM: 12 }],
    surfacingM: 0.09,
    loading: 'lm1',
    obstacles: [],
    waters: [],
    groundStretches: [
      { fromM: 0, toM: 100, known: true, classes: [{ ground: 'rock', bearingLevelM: -1, odds: 1 }] },
    ],
    access: {
      haulLengthM: 'unknown',
      haulMassT: 'unknown',
      crane: 'unknown',
      barge: 'unknown',
      craneMomentTm: 'unknown',
      launchYardM: 'unknown',
    },
    demands: { lanesKept: 0, gasMain: 'none' },
    budget: 'unknown',
    ...change,
  };
}
