/** A hollow rectangular leg bent about one axis: `depthM` in the plane of bending, `widthM` across it. */
export interface HollowLeg {
  readonly depthM: number;
  readonly widthM: number;
  readonly wallM: number;
  /** Bars over concrete, spread evenly over the walls. */
  readonly barRatio: number;
}

/** Concrete area, m2. */
export function legArea({ depthM, widthM, wallM }: Omit<HollowLeg, 'barRatio'>): number {
  return depthM * widthM - Math.max(0, depthM - 2 * wallM) * Math.max(0, widthM - 2 * wallM);
}

/** Gross inertia about the axis across the plane of bending, m4. */
export function legInertia({ depthM, widthM, wallM }: Omit<HollowLeg, 'barRatio'>): number {
  const inner = Math.max(0, widthM - 2 * wallM) * Math.max(0, depthM - 2 * wallM) ** 3;
  return (widthM * depthM ** 3 - inner) / 12;
}

/**
 * Ultimate moment, kNm, of a hollow leg under a compression `axialKN`: rigid-plastic, concrete at fcd over the
 * compressed part of the walls, bars at fyd in compression there and in tension elsewhere. With bars spread like the
 * concrete, the compressed area is Ac = (N + rho fyd A) / (fcd + 2 rho fyd) and M = (fcd + 2 rho fyd) times its first
 * moment about the middle. 0 when the axial force alone is too much.
 */
export function legMoment(leg: HollowLeg, axialKN: number, fcdMPa: number, fydMPa: number): number {
  const area = legArea(leg);
  const bars = leg.barRatio * fydMPa * 1000;
  const intensity = fcdMPa * 1000 + 2 * bars;
  const compressed = (Math.max(0, axialKN) + bars * area) / intensity;
  if (!(compressed < area)) return 0;
  return intensity * firstMoment(leg, compressed);
}

/** First moment about mid-depth of the part of the walls, of the given area, nearest one face, m3. */
function firstMoment({ depthM: d, widthM: b, wallM: t }: HollowLeg, area: number): number {
  const half = d / 2;
  const flange = b * t;
  if (area <= flange) {
    const y = area / b;
    return area * (half - y / 2);
  }
  const webs = 2 * t * (d - 2 * t);
  const flangeMoment = flange * (half - t / 2);
  if (area <= flange + webs) {
    const y = (area - flange) / (2 * t);
    return flangeMoment + (area - flange) * (half - t - y / 2);
  }
  const y = (area - flange - webs) / b;
  return flangeMoment - (area - flange - webs) * (half - t + y / 2);
}
