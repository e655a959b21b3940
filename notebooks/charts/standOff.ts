import type { AppraisedOption } from '../model.ts';

/** A mark of a panel, px. */
export interface Place {
  readonly option: AppraisedOption;
  readonly x: number;
  readonly y: number;
}

/**
 * Where each number stands: on its own place, or, where marks are closer than 26 px, on a flag beside them, 24 px apart,
 * in the same order from top to bottom, clear of other numbers and never on the limit.
 */
export function standOff(
  places: readonly Place[],
  reference: number | null,
  right: number,
  limitY: number | null,
  panel: { readonly top: number; readonly bottom: number },
): Map<number, { readonly x: number; readonly y: number; readonly flag: boolean }> {
  const out = new Map<number, { x: number; y: number; flag: boolean }>();
  const clusters: Place[][] = [];
  const left = new Set(places);
  for (const place of places) {
    if (!left.delete(place)) continue;
    const cluster = [place];
    for (let grown = true; grown;) {
      grown = false;
      for (const other of left) {
        if (!cluster.some((one) => Math.hypot(one.x - other.x, one.y - other.y) < 26)) continue;
        cluster.push(other);
        left.delete(other);
        grown = true;
      }
    }
    clusters.push(cluster);
  }
  const flagged: Place[][] = [];
  for (const cluster of clusters) {
    // The reference keeps its place where 14 px about it are free; a mark alone keeps its own.
    const stays =
      cluster.length === 1
        ? cluster
        : cluster.filter(
            (one) =>
              one.option.number === reference &&
              cluster.every((other) => other === one || Math.hypot(one.x - other.x, one.y - other.y) >= 14),
          );
    for (const one of stays) out.set(one.option.number, { x: one.x, y: one.y, flag: false });
    const rest = cluster.filter((one) => !stays.includes(one)).sort((a, b) => a.y - b.y);
    if (rest.length > 0) flagged.push(rest);
  }
  for (const rest of flagged) {
    const most = Math.max(...rest.map((one) => one.x));
    const least = Math.min(...rest.map((one) => one.x));
    const middle = rest.reduce((sum, one) => sum + one.y, 0) / rest.length;
    let best: { x: number; ys: number[] } | null = null;
    let cost = Infinity;
    for (const x of most + 46 > right ? [least - 32] : [most + 32, most + 56, least - 32]) {
      for (let shift = -120; shift <= 120; shift += 4) {
        const ys = rest.map((_, index) => middle + shift + (index - (rest.length - 1) / 2) * 24);
        const taken = [...out.values(), ...places];
        let here = Math.abs(shift) + Math.abs(x - most - 32) * 0.5;
        for (const y of ys) {
          if (y < panel.top + 12 || y > panel.bottom - 12) here += 300;
          if (limitY !== null && Math.abs(y - limitY) < 13) here += 200;
          for (const other of taken) if (Math.hypot(other.x - x, other.y - y) < 22) here += 120;
        }
        if (here < cost) {
          cost = here;
          best = { x, ys };
        }
      }
    }
    rest.forEach((one, index) =>
      out.set(one.option.number, { x: best?.x ?? one.x, y: best?.ys[index] ?? one.y, flag: true }),
    );
  }
  return out;
}
