import { describe, expect, it } from 'vitest';
import {
  frameEffects,
  planeFrame,
  type FrameGeometry,
  type FrameLoad,
} from '../../../lib/mechanics/index.ts';

/** Rectangular portal of height h and span L, beam in n pieces; feet hinged or built in. */
function portal(
  h: number,
  L: number,
  n: number,
  feet: 'hinged' | 'built in',
  { beam = 1e5, leg = 1e5, axial = 1e12 } = {},
): FrameGeometry {
  const nodes: [number, number][] = [
    [0, -h],
    ...Array.from({ length: n + 1 }, (_, i): [number, number] => [(i * L) / n, 0]),
    [L, -h],
  ];
  const members = nodes.slice(1).map((_, i): [number, number] => [i, i + 1]);
  return {
    nodes,
    members,
    eaKN: members.map(() => axial),
    eiKNm2: members.map((_, e) => (e === 0 || e === members.length - 1 ? leg : beam)),
    feet: [0, nodes.length - 1].map((node) => ({
      node,
      alongKNPerM: Infinity,
      upKNPerM: Infinity,
      turnKNm: feet === 'hinged' ? 0 : Infinity,
    })),
  };
}

/** Load w down along the beam, in nodal forces. */
function spread(geometry: FrameGeometry, w: number, L: number): FrameLoad {
  const n = geometry.nodes.length - 3;
  const nodal = new Float64Array(3 * geometry.nodes.length);
  for (let i = 0; i <= n; i++) nodal[3 * (i + 1) + 1] = ((-w * L) / n) * (i === 0 || i === n ? 0.5 : 1);
  return { nodal };
}

// Handbook formulas of rigid frames (Kleinlogel, from memory); k = (I beam / I leg) (h / L).
describe('frameEffects(portal)', () => {
  it('has the thrust w L2 / (4 h (2k + 3)) on hinges', () => {
    const geometry = portal(6, 12, 96, 'hinged', { beam: 2e5 });
    const { feet, startKNm } = frameEffects(planeFrame(geometry), spread(geometry, 10, 12));
    const thrust = (10 * 144) / (4 * 6 * (2 * 1 + 3));
    expect(feet[0]![0] / thrust).toBeCloseTo(1, 3);
    expect(feet[0]![1]).toBeCloseTo(60, 6);
    expect(startKNm[1]! / (-thrust * 6)).toBeCloseTo(1, 3);
    expect(startKNm[1 + 48]! / (180 - thrust * 6)).toBeCloseTo(1, 3);
  });

  it('has the corner moment w L2 / (6 (k + 2)), half of it at feet that are built in', () => {
    const geometry = portal(6, 12, 96, 'built in', { leg: 3e5 });
    const { feet, startKNm } = frameEffects(planeFrame(geometry), spread(geometry, 10, 12));
    const k = 6 / 12 / 3;
    const corner = (10 * 144) / (6 * (k + 2));
    expect(startKNm[1]! / -corner).toBeCloseTo(1, 3);
    expect(startKNm[0]! / (corner / 2)).toBeCloseTo(1, 3);
    expect(feet[0]![2] / (-corner / 2)).toBeCloseTo(1, 3);
  });

  it('sways under a force along the beam: half of P h in each corner on hinges', () => {
    const geometry = portal(5, 9, 6, 'hinged');
    const nodal = new Float64Array(3 * geometry.nodes.length);
    nodal[3] = 8;
    const { startKNm, endKNm, feet } = frameEffects(planeFrame(geometry), { nodal });
    expect(endKNm[0]).toBeCloseTo(20, 4);
    expect(startKNm[geometry.members.length - 1]).toBeCloseTo(-20, 4);
    expect(feet[0]![0]).toBeCloseTo(-4, 4);
    expect(feet[1]![1]).toBeCloseTo((8 * 5) / 9, 4);
  });

  it('has the thrust 3 E I alpha dT L / (h2 (2h + 3L)) when the beam grows warm on hinges', () => {
    const [h, L] = [7, 20];
    const geometry = portal(h, L, 8, 'hinged');
    const strain = geometry.members.map((_, e) => (e === 0 || e === geometry.members.length - 1 ? 0 : 3e-4));
    const { feet } = frameEffects(planeFrame(geometry), { strain });
    expect(feet[0]![0] / ((3 * 1e5 * 3e-4 * L) / (h ** 2 * (2 * h + 3 * L)))).toBeCloseTo(1, 5);
  });

  it('has only the moment E I kappa in a straight beam that is built in at both ends and bends freely', () => {
    const nodes: [number, number][] = [
      [0, 0],
      [4, 0],
      [10, 0],
    ];
    const geometry: FrameGeometry = {
      nodes,
      members: [
        [0, 1],
        [1, 2],
      ],
      eaKN: [1e6, 1e6],
      eiKNm2: [2e4, 2e4],
      feet: [0, 2].map((node) => ({ node, alongKNPerM: Infinity, upKNPerM: Infinity, turnKNm: Infinity })),
    };
    const { startKNm, endKNm, shearKN } = frameEffects(planeFrame(geometry), {
      curvature1PerM: [1e-3, 1e-3],
    });
    for (const moment of [...startKNm, ...endKNm]) expect(moment).toBeCloseTo(-20, 8);
    for (const shear of shearKN) expect(shear).toBeCloseTo(0, 8);
  });

  it('gives springs their share: a propped tie of two stiffnesses', () => {
    const geometry: FrameGeometry = {
      nodes: [
        [0, 0],
        [5, 0],
      ],
      members: [[0, 1]],
      eaKN: [5000],
      eiKNm2: [1e4],
      feet: [
        { node: 0, alongKNPerM: 1000, upKNPerM: Infinity, turnKNm: Infinity },
        { node: 1, alongKNPerM: 0, upKNPerM: Infinity, turnKNm: 0 },
      ],
    };
    const { moved, normalKN, feet } = frameEffects(planeFrame(geometry), { nodal: [0, 0, 0, 50, 0, 0] });
    expect(moved[3]).toBeCloseTo(50 / 1000 + (50 * 5) / 5000, 9);
    expect(normalKN[0]).toBeCloseTo(50, 9);
    expect(feet[0]![0]).toBeCloseTo(-50, 9);
  });
});

describe('planeFrame(geometry)', () => {
  it('refuses a mechanism and a member without length', () => {
    const geometry = portal(5, 9, 2, 'hinged');
    const free = geometry.feet.map((foot) => ({ ...foot, alongKNPerM: 0 }));
    expect(() => planeFrame({ ...geometry, feet: free })).toThrow(/mechanism/u);
    expect(() => planeFrame({ ...geometry, nodes: geometry.nodes.map(() => [0, 0] as const) })).toThrow(
      /length/u,
    );
  });
});
