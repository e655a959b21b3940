import type { Obstacle, ObstacleKind, Study } from '../../lib/index.ts';
import { lowFerry } from './studies.ts';

const LENGTH_M = 3000;
const kinds: readonly ObstacleKind[] = ['road', 'river', 'bank', 'utility', 'railway', 'heritage'];

const obstacle = (
  kind: ObstacleKind,
  name: string,
  fromM: number,
  toM: number,
  supports: Obstacle['supports'],
): Obstacle => ({ kind, name, fromM, toM, supports, pierPremium: 'unknown', clearance: null });

/**
 * An invented estuary of 3 km with twenty stretches in which supports may not or had better not stand: nineteen of 15 to
 * 50 m at uneven distances, every fourth of them soft, and a navigation opening of 60 m.
 */
export function longCrossing(): Study {
  const study = lowFerry();
  const { brief } = study;
  const [plain, channel, , shore] = brief.groundStretches;
  const stretches = Array.from({ length: 20 }, (_, i) => i)
    .filter((i) => i !== 9)
    .map((i) => {
      const fromM = 60 + i * 145 + ((i * 37) % 60);
      const kind = kinds[i % kinds.length]!;
      return obstacle(
        kind,
        `${kind} ${i}`,
        fromM,
        fromM + 15 + ((i * 23) % 35),
        i % 4 === 3 ? 'soft' : 'hard',
      );
    });
  return {
    ...study,
    brief: {
      ...brief,
      crossing: {
        ...brief.crossing,
        startM: 0,
        endM: LENGTH_M,
        ground: Array.from({ length: 61 }, (_, i) => ({
          chainageM: (i * LENGTH_M) / 60,
          levelM: 2 + 3 * Math.sin(i / 5) - 6 * Math.sin((Math.PI * i) / 60),
        })),
      },
      road: { ...brief.road, startLevelM: 20, endLevelM: 20, mayRiseM: 5 },
      obstacles: [...stretches, obstacle('river', 'navigation', 1480, 1540, 'hard')],
      waters: [
        {
          ...brief.waters[0]!,
          fromM: 900,
          toM: 2100,
          levelM: 0.5,
          floodLevelM: 2.5,
          floodFromM: 600,
          floodToM: 2500,
        },
      ],
      groundStretches: [
        { ...plain!, fromM: 0, toM: 900 },
        { ...channel!, fromM: 900, toM: 2100 },
        { ...shore!, fromM: 2100, toM: LENGTH_M },
      ],
    },
  };
}
