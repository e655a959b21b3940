import {
  effectiveWidthRatio,
  internalPlateFactor,
  plateSlenderness,
  shearBucklingFactor,
  yieldRatio,
} from '../../mechanics/index.ts';

/** A web with equal stiffeners along it between posts. */
export interface StiffenedWeb {
  /** Depth along the web and distance of the posts, m. */
  readonly depthM: number;
  readonly postM: number;
  readonly thicknessM: number;
  /** Stiffeners along it, and the second moment of area of each with a strip of web, m4. */
  readonly ribs: number;
  readonly ribM4: number;
  readonly fyMPa: number;
}

/** Slenderness in shear over the whole web and over one panel between its stiffeners: the greater (EN 1993-1-5 5.3 and A.3, from memory). */
function webShearSlenderness(web: StiffenedWeb): number {
  const { depthM, postM, thicknessM, ribs, ribM4, fyMPa } = web;
  const base = 37.4 * thicknessM * yieldRatio(fyMPa);
  const whole = depthM / (base * Math.sqrt(wholeFactor(web)));
  if (ribs === 0 || !(ribM4 > 0)) return whole;
  const panelM = depthM / (ribs + 1);
  return Math.max(whole, panelM / (base * Math.sqrt(shearBucklingFactor(postM, panelM))));
}

/** Buckling factor of the whole web with its stiffeners. */
function wholeFactor({ depthM, postM, thicknessM, ribs, ribM4 }: StiffenedWeb): number {
  const plain = shearBucklingFactor(postM, depthM);
  if (ribs === 0 || !(ribM4 > 0)) return plain;
  const ratio = postM / depthM;
  // A third of the stiffness of closely spaced stiffeners does not come about: 5.3(4) takes that off.
  const relative = (ribs * ribM4) / 3 / (thicknessM ** 3 * depthM);
  if (ribs <= 2 && ratio < 3) return 4.1 + (6.3 + 0.18 * relative) / ratio ** 2 + 2.2 * Math.cbrt(relative);
  return plain + Math.max((9 / ratio ** 2) * relative ** 0.75, 2.1 * Math.cbrt(relative));
}

/** Shear resistance, kN, rigid end posts, eta 1.2, flanges neglected (EN 1993-1-5 5.2, from memory). */
export function stiffenedWebShearKN(web: StiffenedWeb, partialFactor: number): number {
  const lambda = webShearSlenderness(web);
  const eta = web.fyMPa <= 460 ? 1.2 : 1;
  let chi = eta;
  if (lambda >= 1.08) chi = 1.37 / (0.7 + lambda);
  else if (lambda >= 0.83 / eta) chi = 0.83 / lambda;
  return (1e3 * chi * web.fyMPa * web.depthM * web.thicknessM) / (Math.sqrt(3) * partialFactor);
}

/**
 * Share of the pressed part of the web that acts in bending: its outermost panel by plate buckling (EN 1993-1-5 4.4, from
 * memory), the same share for the panels behind it.
 * @param pressedM depth of web under compression, m
 */
export function pressedWebShare(web: StiffenedWeb, pressedM: number): number {
  const panelM = web.depthM / (web.ribs + 1);
  if (!(pressedM > 0)) return 1;
  const psi = Math.max(-3, (pressedM - panelM) / pressedM);
  const lambda = plateSlenderness(panelM / web.thicknessM, web.fyMPa, internalPlateFactor(psi));
  return effectiveWidthRatio(lambda, psi);
}

/**
 * Resistance of a web to a force of a launching bearing under it, kN: yield over the loaded length with the flange, shared
 * by buckling with the lowest stiffener (EN 1993-1-5 6.2 to 6.5, from memory).
 * @param bearingM length of the bearing, m; `flangeM` bottom plate, m
 */
export function patchResistanceKN(
  web: StiffenedWeb,
  bearingM: number,
  flangeM: number,
  partialFactor: number,
): number {
  const { depthM, postM, thicknessM, ribs, ribM4, fyMPa } = web;
  const panelM = depthM / (ribs + 1);
  let factor = 6 + 2 * (depthM / postM) ** 2;
  if (ribs > 0) {
    const relative = Math.min(
      (10.9 * ribM4) / (depthM * thicknessM ** 3),
      13 * (postM / depthM) ** 3 + 210 * Math.max(0, 0.3 - panelM / postM),
    );
    factor += Math.max(0, (5.44 * panelM) / postM - 0.21) * Math.sqrt(Math.max(0, relative));
  }
  const criticalKN = (0.9 * factor * 210e6 * thicknessM ** 3) / depthM;
  const flangeWidthM = Math.min(30 * yieldRatio(fyMPa) * flangeM, 1);
  const lengthM = Math.min(
    postM,
    bearingM + 2 * flangeM * (1 + Math.sqrt(flangeWidthM / thicknessM + 0.02 * (depthM / flangeM) ** 2)),
  );
  const yieldKN = 1e3 * fyMPa * thicknessM * lengthM;
  const chi = Math.min(1, 0.5 / Math.sqrt(yieldKN / criticalKN));
  return (chi * yieldKN) / partialFactor;
}
