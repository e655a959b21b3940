import { describe, expect, it } from 'vitest';
import {
  archInPlaneCriticalKN,
  archMomentInfluence,
  archThrust,
  archThrustInfluence,
  catenary,
  catenaryCheck,
  columnReduction,
  effectiveWidthRatio,
  halfSpanMomentKNm,
  mainCableAreaM2,
  parabolicCable,
  planeTruss,
  shearBucklingFactor,
  stayForce,
  stayVolumeFan,
  stayVolumeHarp,
  trussForces,
  webShearCapacity,
  type ArchKind,
} from '../../../lib/mechanics/index.ts';

describe('planeTruss(geometry)', () => {
  // Parallel chords 5 m apart, six panels of 6 m, posts and diagonals falling towards midspan.
  const nodes: [number, number][] = [];
  const members: [number, number][] = [];
  for (let i = 0; i <= 6; i++) {
    nodes.push([6 * i, 0], [6 * i, 5]);
    members.push([2 * i, 2 * i + 1]);
    if (i > 0)
      members.push(
        [2 * i - 2, 2 * i],
        [2 * i - 1, 2 * i + 1],
        i <= 3 ? [2 * i - 1, 2 * i] : [2 * i - 2, 2 * i + 1],
      );
  }
  const truss = planeTruss({
    nodes,
    members,
    areasM2: members.map(() => 0.02),
    supports: [
      { node: 0, x: true, z: true },
      { node: 12, x: false, z: true },
    ],
  });
  const loads = [1, 2, 3, 4, 5].map((i) => ({ node: 2 * i, zKN: 100 }));
  const forces = trussForces(truss, loads);
  const member = (i: number, j: number): number =>
    forces.memberKN[members.findIndex(([a, b]) => a === i && b === j)]!;

  it('has chord forces M / h and diagonal forces V / sin, by sections', () => {
    // At the third panel point M = 250 x 18 - 100 (12 + 6) = 2700; top chord of panel 3 by the moment about its foot.
    expect(member(5, 7)).toBeCloseTo(-2700 / 5, 6);
    expect(member(4, 6)).toBeCloseTo((250 * 12 - 100 * 6) / 5, 6);
    // Shear in panel 2 is 250 - 100.
    expect(member(3, 4)).toBeCloseTo((150 * Math.hypot(6, 5)) / 5, 6);
    expect(Array.from(forces.reactionKN)).toEqual([expect.closeTo(250, 6), expect.closeTo(250, 6)]);
  });

  it('deflects by the sum of N n l / E A', () => {
    const unit = trussForces(truss, [{ node: 6, zKN: 1 }]).memberKN;
    const sum = members.reduce(
      (total, _, k) => total + (forces.memberKN[k]! * unit[k]! * truss.lengthM[k]!) / (2.1e8 * 0.02),
      0,
    );
    expect(forces.deflectionM[6]).toBeCloseTo(sum, 9);
  });

  it('refuses a frame that folds', () => {
    expect(() =>
      planeTruss({
        nodes: [
          [0, 0],
          [1, 0],
          [1, 1],
          [0, 1],
        ],
        members: [
          [0, 1],
          [1, 2],
          [2, 3],
          [3, 0],
        ],
        areasM2: [1, 1, 1, 1],
        supports: [
          { node: 0, x: true, z: true },
          { node: 1, x: false, z: true },
        ],
      }),
    ).toThrow(/mechanism/);
  });
});

describe('cables', () => {
  it('parabolicCable() keeps its equilibrium: the tower force has the vertical w l / 2', () => {
    const cable = parabolicCable({ spanM: 800, sagM: 80, wKNm: 120 });
    expect(Math.sqrt(cable.tMaxKN ** 2 - cable.hKN ** 2)).toBeCloseTo((120 * 800) / 2, 6);
  });

  it('catenary() has the sag asked for and the vertical at the towers', () => {
    const cable = catenary({ spanM: 1000, sagM: 100, wKNm: 40 });
    const c = cable.hKN / 40;
    expect(c * (Math.cosh(500 / c) - 1)).toBeCloseTo(100, 6);
    expect(cable.tMaxKN).toBeCloseTo(Math.hypot(cable.hKN, (40 * cable.lengthM) / 2), 3);
  });

  it('catenaryCheck() leaves the parabola by 4/3 of the squared sag ratio', () => {
    // H / Hp = (2 / u) tanh(u / 2) with u = l / 2c, and u is about 4 f / l: 1 - u2 / 12.
    for (const n of [0.02, 0.05, 0.1])
      expect((1 - catenaryCheck(1000, 1000 * n)) / ((4 / 3) * n * n)).toBeCloseTo(1, 1);
  });

  it('mainCableAreaM2() reaches exactly its stress under load and own weight', () => {
    const areaM2 = mainCableAreaM2({ spanM: 1200, sagM: 120, loadKNm: 90, stressMPa: 700 });
    const { tMaxKN } = parabolicCable({ spanM: 1200, sagM: 120, wKNm: 90 + 77 * areaM2 });
    expect(tMaxKN / areaM2 / 1000).toBeCloseTo(700, 6);
    expect(() => mainCableAreaM2({ spanM: 9000, sagM: 900, loadKNm: 90, stressMPa: 700 })).toThrow(/9000 m/);
  });

  it('stay volumes of single stays tend to the closed forms: 8.4536 and 9.9429 m3 for twenty', () => {
    // Worked out independently: reach 200 m, tower 80 m, 120 kN/m, 700 MPa.
    let fan = 0;
    let harp = 0;
    for (let i = 0; i < 20; i++) {
      const reach = 10 * i + 5;
      const inFan = stayForce(reach, 80, 1200);
      const inHarp = stayForce(reach, 0.4 * reach, 1200);
      fan += (inFan.forceKN * inFan.lengthM) / 700000;
      harp += (inHarp.forceKN * inHarp.lengthM) / 700000;
    }
    const whole = { reachM: 200, heightM: 80, wKNm: 120, stressMPa: 700 };
    expect(fan).toBeCloseTo(8.4536, 3);
    expect(harp).toBeCloseTo(9.9429, 3);
    expect(fan / stayVolumeFan(whole)).toBeCloseTo(1, 3);
    expect(harp / stayVolumeHarp(whole)).toBeCloseTo(1, 3);
  });

  it('a fan is lightest at a height of reach / root 3 and a harp at the reach (Gimsing, from memory)', () => {
    const fan = (heightM: number): number => stayVolumeFan({ reachM: 1, heightM, wKNm: 1, stressMPa: 1 });
    const harp = (heightM: number): number => stayVolumeHarp({ reachM: 1, heightM, wKNm: 1, stressMPa: 1 });
    const best = 1 / Math.sqrt(3);
    expect(fan(best)).toBeLessThan(Math.min(fan(best * 0.99), fan(best * 1.01)));
    expect(harp(1)).toBeLessThan(Math.min(harp(0.99), harp(1.01)));
  });
});

describe('arches', () => {
  const parts = 4000;
  /** Integral over the span by the middle rule; inertia growing with the slope makes ds / I equal dx / Ic. */
  const integral = (f: (xi: number) => number): number => {
    let sum = 0;
    for (let i = 0; i < parts; i++) sum += f((i + 0.5) / parts) / parts;
    return sum;
  };
  const rise = (xi: number): number => 4 * xi * (1 - xi);

  it('two-hinged thrust is the integral of M y over that of y2', () => {
    for (const at of [0.1, 0.25, 0.5, 0.8]) {
      const simple = (xi: number): number => (xi < at ? xi * (1 - at) : at * (1 - xi));
      const H = integral((xi) => simple(xi) * rise(xi)) / integral((xi) => rise(xi) ** 2);
      expect(archThrustInfluence('two-hinged', 1, 1, at)).toBeCloseTo(H, 5);
    }
  });

  it('fixed moments do no work on the three movements that built-in ends forbid', () => {
    for (const at of [0.15, 0.4, 0.5]) {
      const M = (xi: number): number => archMomentInfluence('fixed', 1, 0.2, xi, at);
      expect(integral(M)).toBeCloseTo(0, 5);
      expect(integral((xi) => M(xi) * xi)).toBeCloseTo(0, 5);
      expect(integral((xi) => M(xi) * rise(xi))).toBeCloseTo(0, 5);
    }
  });

  it('a uniform load bends neither arch and pushes with w l2 / 8 f', () => {
    for (const kind of ['two-hinged', 'fixed'] satisfies ArchKind[]) {
      expect(integral((xi) => archThrustInfluence(kind, 100, 20, xi)) * 100).toBeCloseTo(
        archThrust(100, 20, 1).hKN,
        3,
      );
      expect(integral((xi) => archMomentInfluence(kind, 100, 20, 0.3, xi))).toBeCloseTo(0, 3);
    }
  });

  it('halfSpanMomentKNm() is what the influence line gives at the quarter point', () => {
    const half = integral((xi) => (xi < 0.5 ? archMomentInfluence('two-hinged', 80, 16, 0.25, xi) : 0)) * 80;
    expect(half).toBeCloseTo(halfSpanMomentKNm(80, 1), 2);
  });

  it('archInPlaneCriticalKN() of a flat arch is a column of half its length (pinned)', () => {
    const flat = archInPlaneCriticalKN('two-hinged', 100, 1, 1e6);
    expect(flat / ((4 * Math.PI ** 2 * 1e6) / 1e4)).toBeCloseTo(1, 1);
    expect(archInPlaneCriticalKN('fixed', 100, 20, 1e6)).toBeGreaterThan(
      archInPlaneCriticalKN('two-hinged', 100, 20, 1e6),
    );
    expect(() => archInPlaneCriticalKN('fixed', 100, 90, 1e6)).toThrow(/0.9/);
  });
});

describe('plates and columns', () => {
  it('columnReduction() follows the printed curves', () => {
    // EN 1993-1-1 figure 6.4 as tabulated, from memory: curve a 0.6656 and c 0.5399 at slenderness 1.
    expect(columnReduction(1, 'a')).toBeCloseTo(0.6656, 3);
    expect(columnReduction(1, 'c')).toBeCloseTo(0.5399, 3);
    expect(columnReduction(0.2, 'd')).toBe(1);
  });

  it('effectiveWidthRatio() is full up to 0.673 in even compression and joins without a step', () => {
    expect(effectiveWidthRatio(0.67)).toBe(1);
    expect(effectiveWidthRatio(0.6735)).toBeCloseTo(1, 2);
    // Winter: (1 - 0.22 / 1) / 1
    expect(effectiveWidthRatio(1)).toBeCloseTo(0.78, 9);
    expect(effectiveWidthRatio(1, 0)).toBeGreaterThan(effectiveWidthRatio(1, 1));
  });

  it('webShearCapacity() is plastic with eta 1.2 in a stocky web and falls with slenderness', () => {
    const stocky = webShearCapacity({ depthM: 1, thicknessM: 0.03, fyMPa: 355, panelLengthM: Infinity });
    expect(stocky).toBeCloseTo((1.2 * 355e3 * 0.03) / (Math.sqrt(3) * 1.1), 6);
    const slender = webShearCapacity({ depthM: 3, thicknessM: 0.012, fyMPa: 355, panelLengthM: Infinity });
    const stiffened = webShearCapacity({ depthM: 3, thicknessM: 0.012, fyMPa: 355, panelLengthM: 2 });
    expect(stiffened).toBeGreaterThan(slender);
    expect(shearBucklingFactor(3, 3)).toBeCloseTo(9.34, 9);
  });
});
