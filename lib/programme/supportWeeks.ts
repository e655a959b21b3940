import type { Design, Support } from '../model/index.ts';
import type { Range } from './data.ts';
import { programmeData } from './data.ts';

/**
 * Weeks one crew needs for one support: foundation in its likeliest ground, cofferdam in water, then shaft, pylon or abutment.
 * `speed` picks the quick, likely or slow figures.
 */
export function supportWeeks(support: Support, designs: readonly Design[], speed: keyof Range): number {
  const data = programmeData;
  const foundation = support.foundations.reduce((best, next) => (next.odds > best.odds ? next : best));
  const sheeted = foundation.lines.some((line) => line.item === 'cofferdam');
  let weeks = sheeted ? data.cofferdam[speed] : 0;
  if (foundation.piles === null) weeks += data.footing[speed];
  else {
    const metres = foundation.piles.count * foundation.piles.lengthM;
    weeks += data.pileCap[speed] + metres / data.pilesM[speed];
  }
  if (support.kind === 'abutment') return weeks + data.abutment[speed];
  if (support.kind === 'pylon') return weeks + (support.heightM + pylonHeight(designs)) / data.pylonM[speed];
  return weeks + support.heightM / data.shaftM[speed] + data.pierTop[speed];
}

/** Height of the pylons over the deck, m. */
function pylonHeight(designs: readonly Design[]): number {
  const carriers = designs.filter((design) => (design.task.pylons?.length ?? 0) > 0);
  return Math.max(
    0,
    ...carriers.flatMap((d) => d.elevation.flatMap((shape) => shape.points.map(([, z]) => z))),
  );
}
