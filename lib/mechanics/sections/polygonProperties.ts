/** A point of a section: y across, z up, m. */
export type SectionPoint = readonly [y: number, z: number];

/** Properties of a plane area about its own axes; z up from the origin of the points. */
export interface PolygonProperties {
  readonly areaM2: number;
  /** Height of the centroid above z = 0, m. */
  readonly centroidM: number;
  /** About the horizontal axis through the centroid, m4. */
  readonly inertiaM4: number;
  /** About the vertical axis through the centroid, m4. */
  readonly inertiaYM4: number;
  /** Length of the outline, holes included, m. */
  readonly perimeterM: number;
}

/** Sums over an outline (Green's theorem): area, first and second moments about the origin, length. */
export interface OutlineSums {
  area: number;
  firstZ: number;
  firstY: number;
  secondZ: number;
  secondY: number;
  perimeter: number;
}

/** Sums of one closed outline, turned so that the area is positive whichever way it runs. */
export function outlineSums(points: readonly SectionPoint[]): OutlineSums {
  let area = 0;
  let firstZ = 0;
  let firstY = 0;
  let secondZ = 0;
  let secondY = 0;
  let perimeter = 0;
  for (let i = 0; i < points.length; i++) {
    const [y0, z0] = points[i]!;
    const [y1, z1] = points[(i + 1) % points.length]!;
    const cross = y0 * z1 - y1 * z0;
    area += cross / 2;
    firstZ += ((z0 + z1) * cross) / 6;
    firstY += ((y0 + y1) * cross) / 6;
    secondZ += ((z0 * z0 + z0 * z1 + z1 * z1) * cross) / 12;
    secondY += ((y0 * y0 + y0 * y1 + y1 * y1) * cross) / 12;
    perimeter += Math.hypot(y1 - y0, z1 - z0);
  }
  const sign = area < 0 ? -1 : 1;
  return {
    area: sign * area,
    firstZ: sign * firstZ,
    firstY: sign * firstY,
    secondZ: sign * secondZ,
    secondY: sign * secondY,
    perimeter,
  };
}

/**
 * Properties of a polygon with holes.
 * @throws RangeError for fewer than three points or an area that is not positive
 */
export function polygonProperties(
  points: readonly SectionPoint[],
  holes: readonly (readonly SectionPoint[])[] = [],
): PolygonProperties {
  if (!(points.length >= 3))
    throw new RangeError(`points: expected three or more, received ${points.length}`);
  const sums = outlineSums(points);
  for (const hole of holes) {
    const inner = outlineSums(hole);
    sums.area -= inner.area;
    sums.firstZ -= inner.firstZ;
    sums.firstY -= inner.firstY;
    sums.secondZ -= inner.secondZ;
    sums.secondY -= inner.secondY;
    sums.perimeter += inner.perimeter;
  }
  if (!(sums.area > 0)) throw new RangeError(`polygon: expected an area above 0, received ${sums.area} m2`);
  return {
    areaM2: sums.area,
    centroidM: sums.firstZ / sums.area,
    inertiaM4: sums.secondZ - sums.firstZ ** 2 / sums.area,
    inertiaYM4: sums.secondY - sums.firstY ** 2 / sums.area,
    perimeterM: sums.perimeter,
  };
}
