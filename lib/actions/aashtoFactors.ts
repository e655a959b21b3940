import { girderCorner, MOST_SKEW_DEG, skewTangent } from './obtuseCorner.ts';

/** What the AASHTO LRFD distribution factors of girder decks depend on (4.6.2.2, slab on girders, type k and a). */
export interface GirderDeck {
  readonly spacingM: number;
  /** Span for the factor, m: mean of two spans for hogging moments. */
  readonly spanM: number;
  readonly slabM: number;
  /** Longitudinal stiffness n (I + A e2), m4. */
  readonly kgM4: number;
  readonly girders: number;
  /** Skew of the supports from square, degrees, either way; square when absent. */
  readonly skewDeg?: number;
}

/** Lanes carried by an inner girder, presence included, several lanes or one loaded, whichever is more. */
export interface GirderFactors {
  readonly moment: number;
  readonly shear: number;
  /** For fatigue: one lane, presence factor 1.2 taken out. */
  readonly momentOneLane: number;
  /** Why the factors do not hold here; empty when they do. */
  readonly outside: readonly string[];
}

const foot = 0.3048;
const inch = 0.0254;

/** Longitudinal stiffness Kg = n (I + A e2), m4: n girder over slab modulus, e from girder centroid to slab middle. */
export function girderStiffnessM4(n: number, inertiaM4: number, areaM2: number, eM: number): number {
  return n * (inertiaM4 + areaM2 * eM * eM);
}

/**
 * AASHTO LRFD tables 4.6.2.2.2b-1, 4.6.2.2.2e-1, 4.6.2.2.3a-1 and 4.6.2.2.3c-1 for concrete decks on girders (from
 * memory), in feet and inches as written there:
 * gM = 0.075 + (S/9.5)^0.6 (S/L)^0.2 (Kg/12 L ts3)^0.1, one lane 0.06 + (S/14)^0.4 (S/L)^0.3 (Kg/12 L ts3)^0.1;
 * gV = 0.2 + S/12 - (S/35)^2, one lane 0.36 + S/25.
 */
export function aashtoFactors(deck: GirderDeck): GirderFactors {
  const S = deck.spacingM / foot;
  const L = deck.spanM / foot;
  const ts = deck.slabM / inch;
  const Kg = deck.kgM4 / inch ** 4;
  const stiff = Kg / (12 * L * ts ** 3);
  const several = 0.075 + (S / 9.5) ** 0.6 * (S / L) ** 0.2 * stiff ** 0.1;
  const one = 0.06 + (S / 14) ** 0.4 * (S / L) ** 0.3 * stiff ** 0.1;
  const shear = Math.max(0.2 + S / 12 - (S / 35) ** 2, 0.36 + S / 25);
  const skew = Math.abs(deck.skewDeg ?? 0);
  const c1 = skew < 30 ? 0 : 0.25 * stiff ** 0.25 * (S / L) ** 0.5;
  const momentSkew = 1 - c1 * skewTangent(skew) ** 1.5;
  return {
    moment: Math.max(several, one) * momentSkew,
    shear: shear * girderCorner(deck, skew),
    momentOneLane: (one * momentSkew) / 1.2,
    outside: [
      ...outside('girder spacing', S, 3.5, 16, 'ft'),
      ...outside('slab thickness', ts, 4.5, 12, 'in'),
      ...outside('span', L, 20, 240, 'ft'),
      ...outside('number of girders', deck.girders, 4, Infinity, ''),
      ...outside('stiffness Kg', Kg, 10000, 7000000, 'in4'),
      ...outside('skew', skew, 0, MOST_SKEW_DEG, 'degrees'),
    ],
  };
}

/**
 * Correction of the inner factor for the outer girder: moment 0.77 + de/9.1, shear 0.6 + de/10; de from the web to the kerb, -1 to 5.5 ft (4.6.2.2.2d-1, from memory).
 */
export function outerCorrection(kerbBeyondM: number): {
  moment: number;
  shear: number;
  outside: readonly string[];
} {
  const de = kerbBeyondM / foot;
  return {
    moment: 0.77 + de / 9.1,
    shear: 0.6 + de / 10,
    outside: outside('kerb beyond the outer girder', de, -1, 5.5, 'ft'),
  };
}

function outside(what: string, value: number, least: number, most: number, unit: string): string[] {
  if (value >= least * (1 - 1e-9) && value <= most * (1 + 1e-9)) return [];
  const where = most === Infinity ? 'below' : 'outside';
  const range = most === Infinity ? `${least}` : `${least} to ${most}`;
  return [
    [what, Number(value.toPrecision(4)), unit, 'is', where, range].filter((word) => word !== '').join(' '),
  ];
}
