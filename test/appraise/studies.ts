import { readFileSync } from 'node:fs';
import { readStudy, type Study } from '../../lib/index.ts';

/** The first worked example, read as the tool reads it. */
export function lowFerry(): Study {
  const read = readStudy(readFileSync('data/examples/low-ferry.json', 'utf8'));
  if (!read.ok) throw new Error(JSON.stringify(read.problems));
  return read.value;
}

/** The same crossing seen from the other end. */
export function mirrored(study: Study): Study {
  const { brief } = study;
  const { startM, endM } = brief.crossing;
  const turn = (x: number): number => startM + endM - x;
  const stretch = <T extends { readonly fromM: number; readonly toM: number }>(s: T): T => ({
    ...s,
    fromM: turn(s.toM),
    toM: turn(s.fromM),
  });
  const { startGradient: _start, endGradient: _end, ...road } = brief.road;
  const back = (gradient: number | 'unknown'): number | 'unknown' =>
    gradient === 'unknown' ? gradient : -gradient;
  return {
    ...study,
    brief: {
      ...brief,
      crossing: {
        ...brief.crossing,
        ground: brief.crossing.ground.map((p) => ({ ...p, chainageM: turn(p.chainageM) })).reverse(),
      },
      road: {
        ...road,
        startLevelM: road.endLevelM,
        endLevelM: road.startLevelM,
        fixedEnd: road.fixedEnd === 'start' ? 'end' : road.fixedEnd === 'end' ? 'start' : road.fixedEnd,
        startTieIn: road.endTieIn,
        endTieIn: road.startTieIn,
        startApproachM: road.endApproachM,
        endApproachM: road.startApproachM,
        ...(brief.road.endGradient === undefined ? {} : { startGradient: back(brief.road.endGradient) }),
        ...(brief.road.startGradient === undefined ? {} : { endGradient: back(brief.road.startGradient) }),
      },
      deck: [...brief.deck].reverse(),
      obstacles: brief.obstacles.map((o) => ({
        ...stretch(o),
        clearance: o.clearance && stretch(o.clearance),
      })),
      waters: brief.waters.map((w) => ({
        ...stretch(w),
        floodFromM: turn(w.floodToM),
        floodToM: turn(w.floodFromM),
      })),
      groundStretches: brief.groundStretches.map(stretch).reverse(),
    },
  };
}
