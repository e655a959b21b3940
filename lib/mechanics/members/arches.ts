/**
 * Parabolic arches whose inertia grows with the slope (I = Ic / cos phi), axial shortening neglected: the classical
 * closed forms. x = xi L from the left springing; moments sagging positive.
 */

export type ArchKind = 'two-hinged' | 'fixed';

/** Rise of the axis at xi as a share of the crown rise: 4 xi (1 - xi). */
export function archRise(xi: number): number {
  return 4 * xi * (1 - xi);
}

/** Thrust of a unit load at xi: two-hinged 5/8 (L/f)(xi - 2 xi3 + xi4), fixed 15/4 (L/f) xi2 (1 - xi)2. */
export function archThrustInfluence(kind: ArchKind, spanM: number, riseM: number, xi: number): number {
  const flat = spanM / riseM;
  return kind === 'fixed'
    ? 3.75 * flat * xi * xi * (1 - xi) ** 2
    : 0.625 * flat * (xi - 2 * xi ** 3 + xi ** 4);
}

/** Moment at section s of a unit load at xi, both as shares of the span, m per unit load. */
export function archMomentInfluence(
  kind: ArchKind,
  spanM: number,
  riseM: number,
  s: number,
  xi: number,
): number {
  const H = archThrustInfluence(kind, spanM, riseM, xi);
  const past = Math.max(0, s - xi);
  if (kind === 'two-hinged') return spanM * ((1 - xi) * s - past) - H * riseM * archRise(s);
  const springing = spanM * xi * (1 - xi) ** 2 * (2.5 * xi - 1);
  const shear = (1 - xi) ** 2 * (1 + 2 * xi);
  return springing + spanM * (shear * s - past) - H * riseM * archRise(s);
}

/** Influence lines at equal stations along an arch. */
export function archLines(
  kind: ArchKind,
  spanM: number,
  riseM: number,
  s: number,
  stations = 40,
): { readonly xM: Float64Array; readonly moment: Float64Array; readonly thrust: Float64Array } {
  const xM = Float64Array.from({ length: stations + 1 }, (_, i) => (spanM * i) / stations);
  return {
    xM,
    moment: xM.map((x) => archMomentInfluence(kind, spanM, riseM, s, x / spanM)),
    thrust: xM.map((x) => archThrustInfluence(kind, spanM, riseM, x / spanM)),
  };
}

/** Uniform load on an arch along its line of thrust: thrust w L2 / 8 f and springing force, kN; no bending. */
export function archThrust(
  spanM: number,
  riseM: number,
  wKNm: number,
): { hKN: number; springingKN: number; crownKN: number } {
  if (!(spanM > 0 && riseM > 0))
    throw new RangeError(`arch: expected span and rise above 0, received ${spanM} and ${riseM} m`);
  const hKN = (wKNm * spanM * spanM) / (8 * riseM);
  return { hKN, springingKN: Math.hypot(hKN, (wKNm * spanM) / 2), crownKN: hKN };
}

/** Moment at the quarter point under a uniform load on half the span, two-hinged: p L2 / 64 (sagging under the load, hogging opposite). */
export function halfSpanMomentKNm(spanM: number, pKNm: number): number {
  return (pKNm * spanM * spanM) / 64;
}

/** Length of a parabolic arch, m. */
export function archLengthM(spanM: number, riseM: number): number {
  const n = riseM / spanM;
  const root = Math.sqrt(1 + 16 * n * n);
  return spanM * (root / 2 + Math.log(4 * n + root) / (8 * n));
}

/** Critical uniform load q L3 / EI of parabolic arches of constant section in their plane (Timoshenko and Gere, Theory of Elastic Stability, from memory). */
const inPlane = {
  ratio: [0.1, 0.2, 0.3, 0.4, 0.5, 0.6],
  'two-hinged': [28.5, 45.4, 46.5, 43.9, 38.4, 30.5],
  fixed: [60.7, 101, 115, 111, 97.4, 83.8],
} as const;

/**
 * Critical thrust in the plane of the arch, kN, from the critical uniform load; below a rise of 0.1 the straight column
 * (4 pi2 EI / L2 two-hinged, 8.18 pi2 fixed) is the limit and the table is followed down to it.
 * @throws RangeError for a rise over span above 0.6
 */
export function archInPlaneCriticalKN(kind: ArchKind, spanM: number, riseM: number, eiKNm2: number): number {
  const n = riseM / spanM;
  if (!(n > 0 && n <= 0.6))
    throw new RangeError(`arch: expected rise/span above 0 and up to 0.6, received ${n}`);
  const q = inPlane[kind];
  // H = q L2 / 8 f = (q L3 / EI) EI / (8 n L2)
  const flat = kind === 'fixed' ? 80.8 : 4 * Math.PI ** 2;
  const first = q[0] / (8 * 0.1);
  if (n <= 0.1) return ((flat + ((first - flat) * n) / 0.1) * eiKNm2) / spanM ** 2;
  let i = 1;
  while (n > inPlane.ratio[i]!) i++;
  const t = (n - inPlane.ratio[i - 1]!) / (inPlane.ratio[i]! - inPlane.ratio[i - 1]!);
  const value = q[i - 1]! + t * (q[i]! - q[i - 1]!);
  return (value * eiKNm2) / (8 * n * spanM ** 2);
}

/**
 * Critical force of a rib out of its plane, kN: pi2 EIz / (k s)2 with s the length of the arch between lateral holds
 * (portals or the springings) and k the column factor of those holds (0.5 built in, 1 pinned). The deck of a tied arch
 * follows the rib and helps; that is neglected, on the safe side.
 */
export function archOutOfPlaneCriticalKN(lengthM: number, columnFactor: number, eiKNm2: number): number {
  return (Math.PI ** 2 * eiKNm2) / (columnFactor * lengthM) ** 2;
}
