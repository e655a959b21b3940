/** A point of a panel: less is better both ways. */
export interface Point {
  readonly number: number;
  readonly x: number;
  readonly y: number;
}

/** Numbers of the points that nothing beats: no other is at least as good both ways and better in one. */
export function undominated(points: readonly Point[]): Set<number> {
  return new Set(
    points
      .filter((a) => points.every((b) => b === a || !(b.x <= a.x && b.y <= a.y && (b.x < a.x || b.y < a.y))))
      .map((point) => point.number),
  );
}

function corners(points: readonly Point[]): (readonly [number, number])[] {
  const best = undominated(points);
  return points
    .filter((point) => best.has(point.number))
    .sort((a, b) => a.x - b.x || a.y - b.y)
    .map(({ x, y }) => [x, y] as const);
}

/**
 * The edge as a step: down from the top at the leftmost undominated point, along to the next, and out to the right.
 * Infinity stands for the edges of the panel.
 */
export function edgeOf(points: readonly Point[]): (readonly [number, number])[] {
  const run = corners(points);
  const first = run[0];
  const last = run[run.length - 1];
  if (first === undefined || last === undefined) return [];
  const out: (readonly [number, number])[] = [[first[0], Infinity]];
  run.forEach(([x, y], index) => {
    const before = run[index - 1];
    if (before !== undefined) out.push([x, before[1]]);
    out.push([x, y]);
  });
  out.push([Infinity, last[1]]);
  return out;
}

/** The dominated side of that edge as a closed run. */
export function dominatedSide(points: readonly Point[]): (readonly [number, number])[] {
  const edge = edgeOf(points);
  return edge.length === 0 ? [] : [...edge, [Infinity, Infinity]];
}
