/** Cables: parabola, catenary, stays (classical; Ernst 1965; Gimsing, Cable Supported Bridges). */

export interface ParabolicCable {
  /** Horizontal force, kN. */
  readonly hKN: number;
  /** Force at the towers, kN. */
  readonly tMaxKN: number;
  /** Length of the cable in the span, m. */
  readonly lengthM: number;
}

/** Cable under a load that is uniform on the horizontal: H = w l2 / 8 f, length exact. @throws RangeError unless all are above 0 */
export function parabolicCable(cable: { spanM: number; sagM: number; wKNm: number }): ParabolicCable {
  const { spanM, sagM, wKNm } = cable;
  if (!(spanM > 0 && sagM > 0 && wKNm > 0)) {
    throw new RangeError(
      `cable: expected span, sag and load above 0, received ${spanM} m, ${sagM} m, ${wKNm} kN/m`,
    );
  }
  const n = sagM / spanM;
  const root = Math.sqrt(1 + 16 * n * n);
  const hKN = (wKNm * spanM * spanM) / (8 * sagM);
  return { hKN, tMaxKN: hKN * root, lengthM: spanM * (root / 2 + Math.log(4 * n + root) / (8 * n)) };
}

export interface Catenary {
  readonly hKN: number;
  readonly tMaxKN: number;
  readonly lengthM: number;
}

/** Cable under its own weight, kN per m of cable; the parameter c = H / w by halving of cosh(l / 2c) = 1 + f / c. */
export function catenary(cable: { spanM: number; sagM: number; wKNm: number }): Catenary {
  const { spanM, sagM, wKNm } = cable;
  if (!(spanM > 0 && sagM > 0 && wKNm > 0)) {
    throw new RangeError(
      `cable: expected span, sag and load above 0, received ${spanM} m, ${sagM} m, ${wKNm} kN/m`,
    );
  }
  const sag = (c: number): number => c * (Math.cosh(spanM / (2 * c)) - 1);
  let low = spanM / 1400;
  let high = (spanM * spanM) / (8 * sagM) + spanM;
  for (let i = 0; i < 100; i++) {
    const middle = (low + high) / 2;
    if (sag(middle) > sagM) low = middle;
    else high = middle;
  }
  const c = (low + high) / 2;
  return { hKN: wKNm * c, tMaxKN: wKNm * (c + sagM), lengthM: 2 * c * Math.sinh(spanM / (2 * c)) };
}

/** Horizontal force of the catenary over that of the parabola of the same span, sag and total weight: how far the parabola may be trusted. */
export function catenaryCheck(spanM: number, sagM: number): number {
  const exact = catenary({ spanM, sagM, wKNm: 1 });
  return exact.hKN / parabolicCable({ spanM, sagM, wKNm: exact.lengthM / spanM }).hKN;
}

/**
 * Area, m2, of the cables of a suspension bridge that carry load p and their own weight:
 * A = p K / (f - gamma K), K = (L / 8n) root(1 + 16 n2).
 * @throws RangeError when the span is beyond what the cable carries of itself (gamma K >= f)
 */
export function mainCableAreaM2(cable: {
  spanM: number;
  sagM: number;
  loadKNm: number;
  stressMPa: number;
  unitWeightKNm3?: number;
}): number {
  const { spanM, sagM, loadKNm, stressMPa } = cable;
  const gamma = cable.unitWeightKNm3 ?? 77;
  const n = sagM / spanM;
  const K = (spanM / (8 * n)) * Math.sqrt(1 + 16 * n * n);
  const left = 1000 * stressMPa - gamma * K;
  if (!(left > 0)) {
    throw new RangeError(
      `cable: expected a span its stress can carry, received ${spanM} m at ${stressMPa} MPa`,
    );
  }
  return (loadKNm * K) / left;
}

/** Volume of steel in the main span of a parabolic cable, m3: (H/s) l (1 + 16 n2 / 3), area following the force along it. */
export function mainCableVolumeM3(cable: {
  spanM: number;
  sagM: number;
  wKNm: number;
  stressMPa: number;
}): number {
  const n = cable.sagM / cable.spanM;
  const hKN = (cable.wKNm * cable.spanM ** 2) / (8 * cable.sagM);
  return (hKN / (1000 * cable.stressMPa)) * cable.spanM * (1 + (16 * n * n) / 3);
}

/**
 * Modulus of a stay that sags, MPa (Ernst): E / (1 + (gamma Lh)2 E / 12 s3); with a second stress the secant between both,
 * E / (1 + (gamma Lh)2 (s1 + s2) E / 24 s1^2 s2^2).
 * @param horizontalM horizontal length of the stay, m
 */
export function ernstModulus(stay: {
  eMPa: number;
  horizontalM: number;
  stressMPa: number;
  toStressMPa?: number;
  unitWeightKNm3?: number;
}): number {
  const { eMPa, horizontalM, stressMPa } = stay;
  if (!(stressMPa > 0)) throw new RangeError(`stay: expected a stress above 0, received ${stressMPa} MPa`);
  const weightMPa = ((stay.unitWeightKNm3 ?? 77) * horizontalM) / 1000;
  const to = stay.toStressMPa ?? stressMPa;
  return eMPa / (1 + (weightMPa ** 2 * (stressMPa + to) * eMPa) / (24 * stressMPa ** 2 * to ** 2));
}

/** What a half span of stays carries. */
export interface StayFan {
  /** Length of deck hung on one side of the tower, m. */
  readonly reachM: number;
  /** Height of the tower above the deck, m. */
  readonly heightM: number;
  readonly wKNm: number;
  readonly stressMPa: number;
}

/** Volume of a fan of stays on one side of a tower, m3, back-stays apart: (w a / s)(h + a2 / 3h). */
export function stayVolumeFan({ reachM: a, heightM: h, wKNm, stressMPa }: StayFan): number {
  return ((wKNm * a) / (1000 * stressMPa)) * (h + (a * a) / (3 * h));
}

/** Volume of a harp of stays, m3: (w a / 2s)(h + a2 / h). */
export function stayVolumeHarp({ reachM: a, heightM: h, wKNm, stressMPa }: StayFan): number {
  return ((wKNm * a) / (2000 * stressMPa)) * (h + (a * a) / h);
}

/** One stay: length and what it pulls when it holds a vertical force. */
export interface StayForce {
  readonly lengthM: number;
  readonly forceKN: number;
  /** Push into the deck. */
  readonly horizontalKN: number;
}

/** Force of a stay that holds `verticalKN` at `reachM` from the tower, its upper end `riseM` above the deck. */
export function stayForce(reachM: number, riseM: number, verticalKN: number): StayForce {
  if (!(riseM > 0)) throw new RangeError(`stay: expected a rise above 0, received ${riseM} m`);
  const lengthM = Math.hypot(reachM, riseM);
  return { lengthM, forceKN: (verticalKN * lengthM) / riseM, horizontalKN: (verticalKN * reachM) / riseM };
}
