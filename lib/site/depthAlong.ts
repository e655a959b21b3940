/** Construction depth along the crossing (structure, surfacing, crossfall): chainages rise; straight in between. */
export interface DepthAlong {
  readonly xM: readonly number[];
  readonly depthM: readonly number[];
}

/** Depth at a chainage, m: a constant, or read off the straight lines between the given points, level beyond them. */
export function depthAt(depth: number | DepthAlong, chainageM: number): number {
  if (typeof depth === 'number') return depth;
  const { xM, depthM } = depth;
  let i = 1;
  while (i < xM.length - 1 && xM[i]! < chainageM) i += 1;
  const x0 = xM[i - 1]!;
  const x1 = xM[i] ?? x0;
  const d0 = depthM[i - 1]!;
  const d1 = depthM[i] ?? d0;
  const share = x1 > x0 ? Math.min(Math.max((chainageM - x0) / (x1 - x0), 0), 1) : 0;
  let deepest = d0 + share * (d1 - d0);
  // Where two units meet the deeper one counts, whichever side it lies on.
  for (let next = i + 1; xM[next] === chainageM; next += 1) deepest = Math.max(deepest, depthM[next]!);
  return deepest;
}
