import type { CrossLine } from '../../../actions/index.ts';

/** Equal beams side by side that share load by bending, torsion and what links them. */
export interface LinkedBeams {
  /** Axes across the deck, m, rising. */
  readonly offsetsM: readonly number[];
  readonly spanM: number;
  readonly bendingKNm2: number;
  readonly torsionKNm2: number;
  /** From an axis to where the link takes hold, m. */
  readonly halfM: number;
  /** A hinge that carries shear, or a slab strip: its length, m, and stiffness E t3 / 12, kNm2 per m. */
  readonly link: 'hinge' | { readonly lengthM: number; readonly stiffnessKNm: number };
}

/** What one beam takes of a unit load by where it stands across: bending, 1, and torque, m. */
export interface BeamShare {
  readonly bending: CrossLine;
  readonly torsion: CrossLine;
}

/** Harmonics of the load along the span; what is left of the series is taken like the last. */
const harmonics = [1, 3, 5, 7, 9];

/**
 * Shares of beams linked along their span, by harmonics of a load at midspan (articulated plate with hinges; slab strips
 * between stiff beams otherwise): every harmonic n has its own share, its moment at midspan falls with 1 / n2.
 * Spindel, ICE Proceedings 1961, and Cusens and Pama, Bridge Deck Analysis (method, from memory).
 * @param wanted indices of the beams asked for
 */
export function beamShares(beams: LinkedBeams, wanted: readonly number[]): BeamShare[] {
  const { offsetsM, halfM, link } = beams;
  const n = offsetsM.length;
  // Where hinges join two beams one point will do.
  const places = offsetsM.flatMap((y, j) =>
    link === 'hinge' && j > 0
      ? [{ j, y: y + halfM }]
      : [
          { j, y: y - halfM },
          { j, y: y + halfM },
        ],
  );
  const yM = places.map(({ y }) => y);
  const bending = wanted.map(() => new Float64Array(places.length));
  const torsion = wanted.map(() => new Float64Array(places.length));
  let left = 1;
  harmonics.forEach((order, h) => {
    const weight = h === harmonics.length - 1 ? left : 8 / (Math.PI * order) ** 2;
    left -= weight;
    const wave = (order * Math.PI) / beams.spanM;
    const upright = beams.bendingKNm2 * wave ** 4;
    const twist = beams.torsionKNm2 * wave ** 2;
    const stiffness = assembled(beams, upright, twist);
    factorise(stiffness, 2 * n);
    wanted.forEach((beam, k) => {
      for (const [dof, own, out] of [
        [2 * beam, upright, bending[k]!],
        [2 * beam + 1, twist, torsion[k]!],
      ] as const) {
        const u = new Float64Array(2 * n);
        u[dof] = own;
        substitute(stiffness, u);
        places.forEach(({ j, y }, p) => {
          out[p]! += weight * (u[2 * j]! + (y - offsetsM[j]!) * u[2 * j + 1]!);
        });
      }
    });
  });
  return wanted.map((_, k) => ({
    bending: { yM, value: [...bending[k]!] },
    torsion: { yM, value: [...torsion[k]!] },
  }));
}

/** Entries of a row of the band: the diagonal and three past it. */
const band = 4;

/** Stiffness of sag and twist of every beam, row by row: the diagonal and what lies right of it. */
function assembled({ offsetsM, halfM, link }: LinkedBeams, upright: number, twist: number): Float64Array {
  const n = offsetsM.length;
  const K = new Float64Array(2 * n * band);
  for (let i = 0; i < n; i++) {
    K[2 * i * band] = upright;
    K[(2 * i + 1) * band] = twist;
  }
  // Ends of the link from sag and twist of its two beams; a hinge is a stiff spring between them.
  const a = halfM;
  const between =
    link === 'hinge'
      ? [{ row: [1, a, -1, a], k: 1e6 * upright }]
      : // Strip: shear mode and bending mode of a beam with turning ends.
        [
          {
            row: [1, a + link.lengthM / 2, -1, a + link.lengthM / 2],
            k: (12 * link.stiffnessKNm) / link.lengthM ** 3,
          },
          { row: [0, 1, 0, -1], k: link.stiffnessKNm / link.lengthM },
        ];
  for (let i = 0; i < n - 1; i++)
    for (const { row, k } of between)
      for (let r = 0; r < 4; r++)
        for (let c = r; c < 4; c++) K[(2 * i + r) * band + c - r]! += k * row[r]! * row[c]!;
  return K;
}

/** L D Lt of a band matrix in place: D on the diagonal, rows of Lt right of it. */
function factorise(K: Float64Array, size: number): void {
  for (let i = 0; i < size; i++) {
    const pivot = K[i * band]!;
    for (let r = 1; r < band && i + r < size; r++) {
      const factor = K[i * band + r]! / pivot;
      for (let c = r; c < band; c++) K[(i + r) * band + c - r]! -= factor * K[i * band + c]!;
    }
    for (let r = 1; r < band; r++) K[i * band + r]! /= pivot;
  }
}

/** Solves with the factors; `u` holds the load and then the answer. */
function substitute(K: Float64Array, u: Float64Array): void {
  const size = u.length;
  for (let i = 0; i < size; i++)
    for (let r = 1; r < band && i + r < size; r++) u[i + r]! -= K[i * band + r]! * u[i]!;
  for (let i = size - 1; i >= 0; i--) {
    u[i]! /= K[i * band]!;
    for (let r = 1; r < band && i + r < size; r++) u[i]! -= K[i * band + r]! * u[i + r]!;
  }
}
