import type { Study } from '../../lib/index.ts';
import { lowFerry } from './studies.ts';

/** A level road 6.5 m over level dry ground, with nothing to cross: what is asked is a matter of spans alone. */
export function levelCrossing(lengthM: number): Study {
  const { brief, ...study } = lowFerry();
  return {
    ...study,
    brief: {
      ...brief,
      crossing: {
        ...brief.crossing,
        startM: 100,
        endM: 100 + lengthM,
        ground: [60, 240].map((chainageM) => ({ chainageM, levelM: 10 })),
      },
      road: { ...brief.road, startLevelM: 16.5, endLevelM: 16.5 },
      obstacles: [],
      waters: [],
      groundStretches: brief.groundStretches
        .slice(0, 1)
        .map((stretch) => ({ ...stretch, fromM: 60, toM: 240 })),
    },
  };
}
