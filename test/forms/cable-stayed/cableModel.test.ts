import { LuDecomposition, Matrix } from 'ml-matrix';
import { describe, expect, it } from 'vitest';
import { cableModel } from '../../../lib/forms/cable-stayed/cableModel.ts';
import { stayLayout } from '../../../lib/forms/cable-stayed/stayLayout.ts';

const spans = [80, 200, 80];
const layout = stayLayout(spans, [1, 2]);

function modelWith(deckEiKNm2: number, pylonKNPerM = 5000): ReturnType<typeof cableModel> {
  return cableModel(spans, layout, {
    stayKNPerM: layout.stays.map((stay) => (195e6 * 0.004 * stay.count) / stay.lengthM),
    deckEiKNm2,
    pylonKNPerM: [pylonKNPerM, pylonKNPerM],
  });
}

describe('cableModel(spans, layout, stiffness)', () => {
  it('holds up a unit load wherever it stands: suspended stays and supports together make 1', () => {
    const model = modelWith(2e7);
    const up = new Float64Array(model.beam.xM.length);
    const add = (line: Float64Array, factor: number): void => line.forEach((v, j) => (up[j]! += factor * v));
    layout.stays.forEach((stay, i) => {
      if (!stay.anchor) add(model.stayLine(i), stay.sine);
    });
    [0, 1, 2, 3].forEach((support) => add(model.reactionLine(support), 1));
    for (const v of up) expect(v).toBeCloseTo(1, 8);
  });

  it('every pylon top is in balance: stays, anchor stays and the bending of the pylon', () => {
    const model = modelWith(2e7);
    model.topM.forEach((top, p) => {
      const pull = new Float64Array(top.length);
      layout.stays.forEach((stay, i) => {
        if (stay.pylon === p) model.stayLine(i).forEach((v, j) => (pull[j]! += stay.side * stay.cosine * v));
      });
      pull.forEach((v, j) => expect(v).toBeCloseTo(5000 * top[j]!, 8));
    });
  });

  it('a limp deck hangs each load on its own stay, and the anchor stay holds its push', () => {
    // Hand: a load of 1 at a stay gives 1 / sine in it; its horizontal must be held by the anchor stay when the pylon is limp.
    const model = modelWith(50, 1e-3);
    const i = layout.stays.findLastIndex((stay) => stay.pylon === 0 && stay.side === 1 && !stay.anchor);
    const stay = layout.stays[i]!;
    const station = model.beam.xM.findIndex((x) => Math.abs(x - stay.deckM) < 1e-6);
    expect(model.stayLine(i)[station]!).toBeGreaterThan(0.9 / stay.sine);
    expect(model.stayLine(i)[station]!).toBeLessThan(1.02 / stay.sine);
    const anchor = layout.stays.findIndex((one) => one.pylon === 0 && one.anchor);
    const back = layout.stays[anchor]!;
    const expected = stay.cosine / stay.sine / back.cosine;
    // The neighbours of the pylon's other side give a little of it back.
    expect(model.stayLine(anchor)[station]!).toBeGreaterThan(0.6 * expected);
    expect(model.stayLine(anchor)[station]!).toBeLessThan(1.02 * expected);
  });

  it('mirrored stays have mirrored lines', () => {
    const model = modelWith(2e7);
    const n = model.beam.xM.length;
    const left = layout.stays.findIndex((stay) => stay.pylon === 0 && stay.anchor);
    const right = layout.stays.findIndex((stay) => stay.pylon === 1 && stay.anchor);
    for (let j = 0; j < n; j++) {
      expect(model.stayLine(left)[j]!).toBeCloseTo(model.stayLine(right)[n - 1 - j]!, 8);
    }
  });

  it('agrees with one dense stiffness matrix of deck, stays and pylon tops', () => {
    const ei = 2e7;
    const model = modelWith(ei);
    const x = model.beam.xM;
    const n = x.length;
    // Freedoms: sinking and turning of every station, then the movement of each pylon top towards the end.
    const K = Matrix.zeros(2 * n + 2, 2 * n + 2);
    const add = (i: number, j: number, value: number): void => {
      K.set(i, j, K.get(i, j) + value);
    };
    for (let e = 0; e + 1 < n; e++) {
      const h = x[e + 1]! - x[e]!;
      const k = ei / h ** 3;
      const at = [2 * e, 2 * e + 1, 2 * e + 2, 2 * e + 3];
      const block = [
        [12, 6 * h, -12, 6 * h],
        [6 * h, 4 * h * h, -6 * h, 2 * h * h],
        [-12, -6 * h, 12, -6 * h],
        [6 * h, 2 * h * h, -6 * h, 4 * h * h],
      ];
      block.forEach((row, a) => row.forEach((value, b) => add(at[a]!, at[b]!, k * value)));
    }
    const stations = layout.stays.map((stay) => x.findIndex((at) => Math.abs(at - stay.deckM) < 1e-6));
    const stiffness = layout.stays.map((stay) => (195e6 * 0.004 * stay.count) / stay.lengthM);
    // A stay stretches by sine x sinking - side x cosine x movement of its pylon top.
    const stretch = layout.stays.map((stay, i): [number, number][] => [
      [2 * stations[i]!, stay.sine],
      [2 * n + stay.pylon, -stay.side * stay.cosine],
    ]);
    stretch.forEach((terms, i) => {
      for (const [a, va] of terms) for (const [b, vb] of terms) add(a, b, stiffness[i]! * va * vb);
    });
    for (const p of [0, 1]) add(2 * n + p, 2 * n + p, 5000);
    for (const end of [0, 2 * (n - 1)]) add(end, end, 1e14);
    const inverse = new LuDecomposition(K);
    for (const loaded of [3, Math.floor(n / 3), Math.floor(n / 2)]) {
      const load = Matrix.zeros(2 * n + 2, 1);
      load.set(2 * loaded, 0, 1);
      const u = inverse.solve(load);
      for (const p of [0, 1]) expect(model.topM[p]![loaded]! / u.get(2 * n + p, 0)).toBeCloseTo(1, 4);
      stretch.forEach((terms, i) => {
        const force =
          stiffness[i]! * terms.reduce((sum, [freedom, factor]) => sum + factor * u.get(freedom, 0), 0);
        expect(model.stayLine(i)[loaded]!).toBeCloseTo(force, 5);
      });
      const middle = model.stationAt(180, 80);
      expect(model.deflectionLine(middle)[loaded]!).toBeCloseTo(u.get(2 * middle, 0), 8);
    }
  });
});
