import type { Shape } from '../model.ts';

/** Bounds of some shapes, m. */
export interface Extent {
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
}

/** Bounds of everything drawn. No shapes give a box of no size at the origin. */
export function extentOf(shapes: readonly Shape[]): Extent {
  const points = shapes.flatMap((shape) => shape.points);
  if (points.length === 0) return { left: 0, right: 0, top: 0, bottom: 0 };
  const xs = points.map(([x]) => x);
  const zs = points.map(([, z]) => z);
  return { left: Math.min(...xs), right: Math.max(...xs), top: Math.max(...zs), bottom: Math.min(...zs) };
}

const furniture = /parapet|barrier|surfacing|edge strip|kerb/;

/** The shapes that carry: no parapets, kerbs, surfacing or hidden lines. */
export const structureOf = (shapes: readonly Shape[]): Shape[] =>
  shapes.filter(
    (shape) => shape.faint !== true && shape.material !== 'surfacing' && !furniture.test(shape.part),
  );

/** Lowest point of the structure, m (furniture stands above and does not count). */
export const lowestOf = (shapes: readonly Shape[]): number => extentOf(structureOf(shapes)).bottom;

/** Places of webs, beams and planes across the deck, m, left to right: what a section's lower dimension is strung on. */
export function webPlaces(shapes: readonly Shape[]): number[] {
  const found: number[] = [];
  for (const shape of structureOf(shapes)) {
    if (shape.material === 'stay') continue;
    const box = extentOf([shape]);
    const wide = box.right - box.left;
    const high = box.top - box.bottom;
    const below = box.bottom < -0.3;
    if (shape.kind === 'line' && below && high > 0.4 && high > 2 * wide)
      found.push((box.left + box.right) / 2);
    else if (
      shape.kind === 'polygon' &&
      below &&
      /beam|girder|web|tie|plane|box beam|trough/.test(shape.part) &&
      wide < 3.2 &&
      high > 0.5 * wide
    )
      found.push((box.left + box.right) / 2);
  }
  found.sort((a, b) => a - b);
  return found.filter((x, index) => index === 0 || x - (found[index - 1] ?? x) > 0.15);
}
