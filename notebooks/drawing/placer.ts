/** A box on the sheet, px. */
export interface Box {
  readonly left: number;
  readonly top: number;
  readonly right: number;
  readonly bottom: number;
}

/** Area that two boxes share, px2. Nearly all pairs share none, which is found without reckoning. */
function overlap(a: Box, b: Box): number {
  if (a.right <= b.left || b.right <= a.left || a.bottom <= b.top || b.bottom <= a.top) return 0;
  return (
    (Math.min(a.right, b.right) - Math.max(a.left, b.left)) *
    (Math.min(a.bottom, b.bottom) - Math.max(a.top, b.top))
  );
}

/** Lettering that covers more than this stands in the way of something, px2. */
export const IN_THE_WAY = 40;

/** How bad it is to write over a pier or a wall. */
export const STRUCTURE = 6;

/** Keeps lettering off lines and off other lettering: remembers what is taken and picks the freest of some places. */
export interface Placer {
  /** Marks a box as taken. `weight` says how bad it is to write over it. */
  readonly take: (box: Box, weight?: number) => void;
  /** Marks a run of points as taken, `half` px either side of the line. */
  readonly takeLine: (points: readonly (readonly [number, number])[], half?: number, weight?: number) => void;
  /** Index of the freest candidate (the earlier of equals), which is then taken; -1 where all are worse than `limit`. */
  readonly choose: (candidates: readonly Box[], limit?: number) => number;
}

/** Makes an empty sheet to place lettering on. */
export function placer(sheet: Box): Placer {
  const taken: { box: Box; weight: number }[] = [];
  const take = (box: Box, weight = 1): void => {
    taken.push({ box, weight });
  };
  return {
    take,
    takeLine: (points, half = 1.5, weight = 1) => {
      for (let i = 1; i < points.length; i += 1) {
        const [x0, y0] = points[i - 1] ?? [0, 0];
        const [x1, y1] = points[i] ?? [0, 0];
        const steps = Math.max(1, Math.ceil(Math.hypot(x1 - x0, y1 - y0) / 8));
        for (let step = 0; step < steps; step += 1) {
          const xa = x0 + ((x1 - x0) * step) / steps;
          const xb = x0 + ((x1 - x0) * (step + 1)) / steps;
          const ya = y0 + ((y1 - y0) * step) / steps;
          const yb = y0 + ((y1 - y0) * (step + 1)) / steps;
          take(
            {
              left: Math.min(xa, xb) - half,
              right: Math.max(xa, xb) + half,
              top: Math.min(ya, yb) - half,
              bottom: Math.max(ya, yb) + half,
            },
            weight,
          );
        }
      }
    },
    choose: (candidates, limit = Infinity) => {
      let best = -1;
      let least = limit;
      candidates.forEach((box, index) => {
        let cost = 0;
        if (
          box.left < sheet.left ||
          box.right > sheet.right ||
          box.top < sheet.top ||
          box.bottom > sheet.bottom
        )
          cost += 1e4;
        for (const other of taken) {
          // What costs as much as the best already needs no further look.
          if (cost >= least - 1e-9) return;
          cost += overlap(box, other.box) * other.weight;
        }
        if (cost < least - 1e-9) {
          least = cost;
          best = index;
        }
      });
      const chosen = candidates[best];
      if (chosen !== undefined) take(chosen, 3);
      return best;
    },
  };
}
