import { describe, expect, it } from 'vitest';
import {
  criticalForceKN,
  endShare,
  frameStiffnessKNm,
  holdingForceKN,
  ownShare,
  steelKNm2,
  turningForceKN,
} from '../../../lib/forms/half-through/uFrame.ts';

describe('frameStiffnessKNm(frame)', () => {
  const frame = { postM: 1.5, leverM: 1.9, planesM: 11, postInertiaM4: 2e-4, crossInertiaM4: 3e-3 };

  it('is that of a cantilever on an unyielding cross-girder, 3 E I / h3', () => {
    expect(frameStiffnessKNm({ ...frame, crossInertiaM4: 1e9 })).toBeCloseTo(
      (3 * 210e6 * 2e-4) / 1.5 ** 3,
      3,
    );
  });

  it('is that of a beam under equal end moments with stiff posts, 2 E I / (h2 b)', () => {
    expect(frameStiffnessKNm({ ...frame, postInertiaM4: 1e9 })).toBeCloseTo(
      (2 * 210e6 * 3e-3) / (1.9 ** 2 * 11),
      3,
    );
  });

  it('adds the flexibilities of both', () => {
    // By hand: 3.375 / 6e-4 = 5,625; 3.61 x 11 / 6e-3 = 6,618; 210e6 / 12,243 = 17,152 kN/m.
    expect(frameStiffnessKNm(frame)).toBeCloseTo(17152, -1);
  });
});

describe('criticalForceKN(bed, flange, share, spacing, span)', () => {
  it('is m pi2 E I / L2 with m = (2 / pi2) root(c L4 / E I), EN 1993-2 6.3.4.2 (from memory)', () => {
    const bed = 4000;
    const flange = 3.5e5;
    const L = 40;
    const m = (2 / Math.PI ** 2) * Math.sqrt((bed * L ** 4) / flange);
    expect(criticalForceKN(bed, flange, 1, 1, L)).toBeCloseTo((m * Math.PI ** 2 * flange) / L ** 2, 6);
  });

  it('is at least that of the bar alone over the span and at most that between two frames', () => {
    expect(criticalForceKN(1e-6, 1e5, 1, 4, 20)).toBeCloseTo((Math.PI ** 2 * 1e5) / 400, 6);
    expect(criticalForceKN(1e12, 1e5, 1, 4, 20)).toBeCloseTo((Math.PI ** 2 * 1e5) / 16, 6);
  });
});

describe('endShare(end, bed, flange)', () => {
  it('is a half for a free end and one for an unyielding one (bars on an elastic bed, any text on stability)', () => {
    expect(endShare(0, 4000, 3e5)).toBe(0.5);
    expect(endShare(1e12, 4000, 3e5)).toBeCloseTo(1, 6);
  });

  it.each([0.5, 1.5, 3])('agrees with the least buckling force of a long bar in small steps, k = %f', (k) => {
    const bed = 4000;
    const flange = 3e5;
    const a = (bed / flange) ** 0.25;
    const end = k * flange * a ** 3;
    const exact = leastBucklingForce(flange, bed, end, (14 * Math.PI) / a);
    expect(exact / (2 * Math.sqrt(bed * flange))).toBeCloseTo(endShare(end, bed, flange), 2);
  });
});

describe('holdingForceKN(force, critical, flange, spacing)', () => {
  it('is a hundredth of the force where the half-wave is short and grows without end towards buckling', () => {
    const flange = 1e5;
    const short = (Math.PI ** 2 * flange) / 3 ** 2;
    expect(holdingForceKN(500, short, flange, 3)).toBe(5);
    const long = (Math.PI ** 2 * flange) / 12 ** 2;
    // By hand: 3/12 x 3000 / 80 / (1 - 3000 / 6854).
    expect(holdingForceKN(3000, long, flange, 3)).toBeCloseTo(
      ((0.25 * 3000) / 80) * (1 / (1 - 3000 / long)),
      6,
    );
    expect(holdingForceKN(long, long, flange, 3)).toBe(Infinity);
  });
});

describe('turningForceKN and ownShare', () => {
  it('push of a turned frame falls with its flexibility, and a stiff bed keeps a push to itself', () => {
    expect(turningForceKN(0.005, 2, 15000, 1e12, 3.5)).toBeCloseTo((0.005 * 2 * 15000) / 1.5, 3);
    expect(turningForceKN(0.005, 2, 7500, 3e5, 3.5)).toBeLessThan(turningForceKN(0.005, 2, 15000, 3e5, 3.5));
    expect(ownShare(1e9, 3e5, 3.5)).toBe(1);
    expect(ownShare(4300, 3.58e5, 3.5)).toBeCloseTo(0.41, 2);
    expect(steelKNm2).toBe(210e6);
  });
});

/** Least N of E I y'''' + N y'' + c y = 0 by finite differences and inverse iteration; spring at the left end, right end held. */
function leastBucklingForce(flange: number, bed: number, end: number, lengthM: number): number {
  const n = 500;
  const h = lengthM / n;
  const K: number[][] = Array.from({ length: n }, () => new Array<number>(n).fill(0));
  const G: number[][] = Array.from({ length: n }, () => new Array<number>(n).fill(0));
  const add = (M: number[][], row: readonly (readonly [number, number])[], factor: number): void => {
    for (const [i, p] of row) for (const [j, q] of row) if (i < n && j < n) M[i]![j]! += factor * p * q;
  };
  for (let i = 1; i < n; i++) {
    add(
      K,
      [
        [i - 1, 1],
        [i, -2],
        [i + 1, 1],
      ],
      flange / h ** 3,
    );
  }
  for (let i = 0; i < n; i++) {
    K[i]![i]! += bed * h * (i === 0 ? 0.5 : 1);
    add(
      G,
      [
        [i, 1],
        [i + 1, -1],
      ],
      1 / h,
    );
  }
  K[0]![0]! += end;
  // Banded elimination: nothing lies further than two from the diagonal.
  const solve = (right: number[]): number[] => {
    const A = K.map((row) => [...row]);
    const b = [...right];
    for (let i = 0; i < n; i++)
      for (let j = i + 1; j <= Math.min(n - 1, i + 2); j++) {
        const f = A[j]![i]! / A[i]![i]!;
        for (let m = i; m <= Math.min(n - 1, i + 2); m++) A[j]![m]! -= f * A[i]![m]!;
        b[j]! -= f * b[i]!;
      }
    for (let i = n - 1; i >= 0; i--) {
      for (let m = i + 1; m <= Math.min(n - 1, i + 2); m++) b[i]! -= A[i]![m]! * b[m]!;
      b[i]! /= A[i]![i]!;
    }
    return b;
  };
  const times = (M: number[][], u: readonly number[]): number[] =>
    M.map((row, i) => {
      let sum = 0;
      for (let j = Math.max(0, i - 2); j <= Math.min(n - 1, i + 2); j++) sum += row[j]! * u[j]!;
      return sum;
    });
  const dot = (u: readonly number[], v: readonly number[]): number =>
    u.reduce((sum, x, i) => sum + x * v[i]!, 0);
  // A start that is nowhere at rest, largest at the sprung end.
  let u = Array.from({ length: n }, (_, i) => Math.cos((i * h * 1.0) / 3) * Math.exp((-2 * i) / n));
  let value = 0;
  for (let round = 0; round < 60; round++) {
    const v = solve(times(G, u));
    value = dot(v, times(K, v)) / dot(v, times(G, v));
    const norm = Math.sqrt(dot(v, v));
    u = v.map((x) => x / norm);
  }
  return value;
}
