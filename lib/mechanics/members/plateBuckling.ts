/** Plates and columns of steel at quick-check level, after EN 1993-1-5 and EN 1993-1-1 (from memory). Stresses MPa. */

/** epsilon = root(235 / fy). */
export function yieldRatio(fyMPa: number): number {
  return Math.sqrt(235 / fyMPa);
}

/** Buckling factor k_sigma of a plate held on both long edges; psi = least over greatest edge stress, 1 down to -3 (EN 1993-1-5 table 4.1). */
export function internalPlateFactor(psi: number): number {
  if (psi >= 0) return 8.2 / (1.05 + psi);
  if (psi > -1) return 7.81 - 6.29 * psi + 9.78 * psi * psi;
  return 5.98 * (1 - psi) ** 2;
}

/** Slenderness of a plate, (b/t) / (28.4 epsilon root k). */
export function plateSlenderness(widthOverThickness: number, fyMPa: number, kSigma: number): number {
  return widthOverThickness / (28.4 * yieldRatio(fyMPa) * Math.sqrt(kSigma));
}

/**
 * Effective share of the compressed width of a plate held on both edges (EN 1993-1-5 4.4(2)):
 * 1 up to lambda = 0.5 + root(0.085 - 0.055 psi), else (lambda - 0.055 (3 + psi)) / lambda2.
 */
export function effectiveWidthRatio(lambda: number, psi = 1): number {
  const limit = 0.5 + Math.sqrt(Math.max(0, 0.085 - 0.055 * psi));
  if (lambda <= limit) return 1;
  return Math.min(1, (lambda - 0.055 * (3 + psi)) / (lambda * lambda));
}

/** The same for an outstand: 1 up to 0.748, else (lambda - 0.188) / lambda2 (EN 1993-1-5 4.4(2)). */
export function outstandWidthRatio(lambda: number): number {
  return lambda <= 0.748 ? 1 : Math.min(1, (lambda - 0.188) / (lambda * lambda));
}

/** Shear buckling factor of a panel of length a and depth d; no stiffeners: infinite length (EN 1993-1-5 A.3). */
export function shearBucklingFactor(panelLengthM: number, depthM: number): number {
  const ratio = panelLengthM / depthM;
  if (!(ratio < Infinity)) return 5.34;
  return ratio >= 1 ? 5.34 + 4 / ratio ** 2 : 4 + 5.34 / ratio ** 2;
}

/** What decides the shear resistance of a web. */
export interface WebShear {
  readonly depthM: number;
  readonly thicknessM: number;
  readonly fyMPa: number;
  /** Distance of transverse stiffeners, m; Infinity when there are none. */
  readonly panelLengthM: number;
  /** Partial factor; 1.1 when absent. */
  readonly partialFactor?: number;
}

/**
 * Shear resistance of an unstiffened or transversely stiffened web, kN, flange contribution neglected
 * (EN 1993-1-5 5.2, rigid end posts, eta 1.2): chi_w fy d t / (root 3 gamma).
 */
export function webShearCapacity(web: WebShear): number {
  const eta = web.fyMPa <= 460 ? 1.2 : 1;
  const k = shearBucklingFactor(web.panelLengthM, web.depthM);
  const lambda = web.depthM / web.thicknessM / (37.4 * yieldRatio(web.fyMPa) * Math.sqrt(k));
  let chi = eta;
  if (lambda >= 1.08) chi = 1.37 / (0.7 + lambda);
  else if (lambda >= 0.83 / eta) chi = 0.83 / lambda;
  const gamma = web.partialFactor ?? 1.1;
  return (1000 * chi * web.fyMPa * web.depthM * web.thicknessM) / (Math.sqrt(3) * gamma);
}

export type BucklingCurve = 'a0' | 'a' | 'b' | 'c' | 'd';
const imperfection: Readonly<Record<BucklingCurve, number>> = {
  a0: 0.13,
  a: 0.21,
  b: 0.34,
  c: 0.49,
  d: 0.76,
};

/** Reduction chi of a column of slenderness lambda (EN 1993-1-1 6.3.1.2). 1 up to 0.2. */
export function columnReduction(lambda: number, curve: BucklingCurve): number {
  if (lambda <= 0.2) return 1;
  const phi = 0.5 * (1 + imperfection[curve] * (lambda - 0.2) + lambda * lambda);
  return Math.min(1, 1 / (phi + Math.sqrt(phi * phi - lambda * lambda)));
}

/** Slenderness of a column of effective length l and radius of gyration i: (l/i) / (pi root(E/fy)). */
export function columnSlenderness(
  effectiveLengthM: number,
  gyrationM: number,
  fyMPa: number,
  eMPa = 210000,
): number {
  return effectiveLengthM / gyrationM / (Math.PI * Math.sqrt(eMPa / fyMPa));
}
