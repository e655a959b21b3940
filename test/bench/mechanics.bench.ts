import { inverse, Matrix } from 'ml-matrix';
import { bench, describe } from 'vitest';
import { axleGroups } from '../../lib/actions/axleGroups.ts';
import { loadStandard, trafficEnvelope, trafficOnDeck } from '../../lib/actions/index.ts';
import { lineBeam } from '../../lib/mechanics/index.ts';
import type { StandardId } from '../../lib/model/index.ts';

/**
 * The traffic envelope of a seven-span haunched beam, ours beside the same envelope with the dense matrices of ml-matrix:
 * stiffness inverted once, influence matrix, every axle group on every station of every line, linear between stations.
 */
const spansM = [45, 60, 60, 60, 60, 60, 45];
const supports = spansM.reduce((all, span) => [...all, all[all.length - 1]! + span], [0]);
const eiKNm2 = (x: number): number => {
  const nearest = Math.min(...supports.slice(1, -1).map((s) => Math.abs(s - x)));
  return 4e7 * (1 + 3 * Math.max(0, 1 - nearest / 15)) ** 1.5;
};
const deck = {
  widthM: 12,
  carriagewayM: 11,
  carriagewayOffsetM: 0,
  lanes: 2,
  footwayM: 0,
  surfacingM: 0.09,
  superimposedKNm: 40,
};

function ours(id: StandardId): number {
  const beam = lineBeam({ spansM, eiKNm2 });
  return trafficEnvelope(beam, trafficOnDeck(id, deck), { deflection: false }).momentMinKNm[20]!;
}

function dense(id: StandardId): number {
  const { xM, supportAt } = lineBeam({ spansM, eiKNm2 });
  const ei = Array.from(xM, (x, e) => eiKNm2((x + (xM[e + 1] ?? x)) / 2));
  const n = xM.length;
  const K = Matrix.zeros(2 * n, 2 * n);
  for (let e = 0; e < n - 1; e++) {
    const h = xM[e + 1]! - xM[e]!;
    const c = ei[e]! / h ** 3;
    const k = [
      [12, 6 * h, -12, 6 * h],
      [6 * h, 4 * h * h, -6 * h, 2 * h * h],
      [-12, -6 * h, 12, -6 * h],
      [6 * h, 2 * h * h, -6 * h, 4 * h * h],
    ];
    for (let a = 0; a < 4; a++)
      for (let b = 0; b < 4; b++) K.set(2 * e + a, 2 * e + b, K.get(2 * e + a, 2 * e + b) + c * k[a]![b]!);
  }
  const held = new Set(supportAt.map((s) => 2 * s));
  for (const i of held) {
    for (let j = 0; j < 2 * n; j++) {
      K.set(i, j, 0);
      K.set(j, i, 0);
    }
    K.set(i, i, 1);
  }
  const F = inverse(K);
  const load = trafficOnDeck(id, deck);
  const { usual, two } = axleGroups(id);
  let pier = 0;
  for (let s = 0; s < n; s++) {
    const e = Math.min(s, n - 2);
    const h = xM[e + 1]! - xM[e]!;
    const c = ei[e]! / (h * h);
    const side = s === e ? [6, 4 * h, -6, 2 * h] : [-6, -2 * h, 6, -4 * h];
    const moment = Float64Array.from(xM, (_, i) => {
      let sum = 0;
      for (let a = 0; a < 4; a++) sum += c * side[a]! * F.get(2 * e + a, 2 * i);
      return sum;
    });
    const at = (x: number): number => {
      if (x < 0 || x > xM[n - 1]!) return 0;
      let i = 0;
      while (i < n - 2 && xM[i + 1]! <= x) i++;
      return moment[i]! + ((moment[i + 1]! - moment[i]!) * (x - xM[i]!)) / (xM[i + 1]! - xM[i]!);
    };
    let area = 0;
    for (let i = 0; i < n - 1; i++)
      area += (Math.min(0, moment[i]! + moment[i + 1]!) / 2) * (xM[i + 1]! - xM[i]!);
    let least = 0;
    for (const group of usual) {
      const sums = Float64Array.from(xM, (x) =>
        group.atM.reduce((sum, offset, i) => {
          const value = group.loadKN[i]! * at(x + offset);
          return sum + (group.whole ? value : Math.min(0, value));
        }, 0),
      );
      least = Math.min(least, ...sums);
      if (!two?.groups.has(group)) continue;
      for (let i = 0; i < n; i++)
        for (let j = i + 1; j < n; j++)
          if (xM[j]! - xM[i]! >= two.apartM) least = Math.min(least, two.share * (sums[i]! + sums[j]!));
    }
    if (s === supportAt[1]) pier = load.vehicleFactor * least + load.udlKNm * area;
  }
  return pier;
}

for (const id of ['lm1', 'hl93'] as const) {
  describe(`${loadStandard(id).name} envelope of seven haunched spans`, () => {
    bench('trafficEnvelope()', () => void ours(id));
    bench('dense matrices of ml-matrix, moments alone', () => void dense(id), { iterations: 5, time: 200 });
  });
}
