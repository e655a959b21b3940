import type { Haunch } from '../../model/index.ts';
import { supportPositions } from '../common/supports.ts';
import { steelBoxData } from './steelBoxData.ts';

/** Lengths over which the depth falls to that of midspan, m, to the left and right of every support; 0 at the ends. */
function reaches(spansM: readonly number[]): [left: number, right: number][] {
  const { endReach } = steelBoxData.haunch;
  const last = spansM.length - 1;
  const own = (span: number): number =>
    span > 0 && span < last ? spansM[span]! / 2 : endReach * spansM[span]!;
  const isEnd = (span: number): boolean => span === 0 || span === last;
  const reach = (span: number, other: number): number =>
    isEnd(span) && !isEnd(other) ? Math.min(own(span), own(other)) : own(span);
  return Array.from({ length: last + 2 }, (_, j) =>
    j === 0 || j > last ? [0, 0] : [reach(j - 1, j), reach(j, j - 1)],
  );
}

/**
 * Depth along a unit, m at the places given: `midspanM` where no haunch reaches, `pierM` over the piers of the longest
 * haunches, less over those of shorter ones, a parabola or a straight line between.
 */
export function depthsAlong(
  spansM: readonly number[],
  atM: ArrayLike<number>,
  midspanM: number,
  pierM: number,
  law: Haunch['law'] = 'parabolic',
): Float64Array {
  const supportsM = supportPositions(spansM);
  const reach = reaches(spansM);
  const longest = Math.max(...reach.flat());
  const power = law === 'straight' ? 1 : steelBoxData.haunch.power;
  const deeper = reach.map((both) => (longest > 0 ? ((pierM - midspanM) * Math.max(...both)) / longest : 0));
  return Float64Array.from({ length: atM.length }, (_, i) => {
    const x = atM[i]!;
    let depth = midspanM;
    supportsM.forEach((at, j) => {
      const over = reach[j]![x < at ? 0 : 1];
      const away = Math.abs(x - at);
      if (!(away < over)) return;
      depth = Math.max(depth, midspanM + deeper[j]! * (1 - away / over) ** power);
    });
    return depth;
  });
}
