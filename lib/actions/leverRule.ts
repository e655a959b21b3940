import type { CrossLine } from './crossLine.ts';

/**
 * Share of a girder of a unit load at y when the slab is hinged over the inner girders: 1 over the girder, 0 over its
 * neighbours, straight between, and on over the cantilevers.
 * @throws RangeError for fewer than two girders
 */
export function leverRule(girderOffsetsM: readonly number[], girder: number): CrossLine {
  const n = girderOffsetsM.length;
  if (!(n >= 2)) throw new RangeError(`girderOffsetsM: expected two girders or more, received ${n}`);
  return { yM: girderOffsetsM, value: girderOffsetsM.map((_, i) => (i === girder ? 1 : 0)) };
}
