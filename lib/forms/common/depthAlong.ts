import type { Design } from '../../model/index.ts';

/** Depth along a unit as it stands in `Design`: x from the first support, m, and structural depth, m. */
export type DepthAlong = Design['depthAlong'];

/** The same depth from end to end; two points. */
export function constantDepth(lengthM: number, depthM: number): DepthAlong {
  return { xM: [0, lengthM], depthM: [depthM, depthM] };
}

/** Structural depth at `xM`, m: linear between the points, the end values beyond them. */
export function depthAt(along: DepthAlong, xM: number): number {
  const { xM: xs, depthM: depths } = along;
  const last = xs.length - 1;
  if (!(xM > xs[0]!)) return depths[0]!;
  for (let i = 1; i <= last; i++) {
    const right = xs[i]!;
    if (xM <= right) {
      const left = xs[i - 1]!;
      const share = right > left ? (xM - left) / (right - left) : 1;
      return depths[i - 1]! + share * (depths[i]! - depths[i - 1]!);
    }
  }
  return depths[last]!;
}
