import { describe, expect, it } from 'vitest';
import { choosePierDepth } from '../../../lib/forms/cantilever-box/choosePierDepth.ts';
import { haunchedSkew } from '../../../lib/forms/cantilever-box/haunchedSkew.ts';
import { cantileverBox } from '../../../lib/forms/cantilever-box/index.ts';
import { turnedOver } from '../../../lib/forms/concrete-box/boxBearings.ts';
import type { Design, UnitTask } from '../../../lib/model/index.ts';
import { cantileverTask } from './cases.ts';

const at = (skew: Partial<UnitTask>): Design => cantileverBox.size(cantileverTask([90, 150, 90], 3.5, skew));
const square = at({});
const concreteM3 = ({ lines }: Design): number =>
  lines.reduce((sum, { item, quantity }) => (item.endsWith('concrete') ? sum + quantity : sum), 0);
const uplift = ({ checks }: Design): number => checks.find(({ id }) => id === 'bearing-uplift')!.utilisation;

describe('size(cantilever-box) of a skew deck', () => {
  it('is that of a square one to the last digit at 0', () => {
    const { task: _square, ...plain } = square;
    const { task: _none, ...none } = at({ skewDeg: 0 });
    expect(none).toEqual(plain);
  });

  it('twists its end spans: thicker webs, the acute bearing nearer to lifting', () => {
    const [slight, more] = [5, 10].map((skewDeg) => at({ skewDeg }));
    expect(uplift(slight!)).toBeGreaterThan(uplift(square));
    expect(uplift(more!)).toBeGreaterThan(uplift(slight!));
    expect(concreteM3(more!)).toBeGreaterThan(concreteM3(square));
    const { skewTorqueKNm, skewBearingKN, bearingsApartM } = more!.figures;
    expect(skewTorqueKNm! / skewBearingKN!).toBeGreaterThanOrEqual(bearingsApartM!);
    expect(more!.warnings.join(' ')).toMatch(/square to the road at the piers.*obtuse bearing/);
  });

  it('takes its ends square where the acute bearing would lift, and says so', () => {
    const skew = at({ skewDeg: 30 });
    // By hand: 12 m wide, tan 30 = 0.5774: 6.9 m of sill at one edge, two wedges of 12 x 6.928 / 2 x 1.2 m thick.
    expect(concreteM3(skew) - concreteM3(square)).toBeCloseTo(99.77, 2);
    expect(uplift(skew)).toBe(uplift(square));
    expect(skew.warnings.join(' ')).toMatch(/acute would lift.*6\.9 m of sill and slab/);
  });
});

it('haunchedSkew(model) is near what the box of midspan would have from end to end', () => {
  const { model, box } = choosePierDepth(cantileverTask([90, 150, 90], 3.5, { skewDeg: 5 }));
  const { beam, layout, traffic } = model;
  const to = beam.supportAt[1]!;
  // By hand: slope x EI is the area of the moments, each by its share of the distance to the pier, 90 m.
  let area = 0;
  for (let i = 1; i <= to; i++) {
    const l = beam.xM[i]! - beam.xM[i - 1]!;
    const at = (j: number): number => traffic.most.momentMaxKNm[j]! * (1 - beam.xM[j]! / 90);
    area += ((at(i - 1) + at(i)) / 2) * l;
  }
  // Bredt with the walls of midspan: top slab, two webs, bottom slab.
  const { midM } = layout.slab;
  const { bottomM, webM } = box.thicknesses;
  const heightM = 3.5 - midM / 2 - bottomM / 2;
  const topM = layout.cells * layout.spacingM;
  const soffitM = topM - 2 * layout.slope * heightM;
  const enclosedM2 = ((topM + soffitM) / 2) * heightM;
  const walls = topM / midM + (2 * heightM * Math.hypot(1, layout.slope)) / webM + soffitM / bottomM;
  const k = (4 * enclosedM2 ** 2) / walls / 2.4 / box.sections.midspan.inertiaM4;
  // tan 5 = 0.0875. The haunch stiffens the pier end in bending and in torsion alike.
  const handKNm = (0.0875 * (area / 90) * k) / (1 + (k * 0.0875 ** 2) / 4);
  const [first] = haunchedSkew(model, box.sections, box.weight).trafficKNm;
  expect(first! / handKNm).toBeGreaterThan(0.8);
  expect(first! / handKNm).toBeLessThan(1.25);
});

it('turnedOver(skew) takes what lasts, and of traffic what it turns more than it presses', () => {
  const turning = {
    lastingKN: 2000,
    outwardKNm: 0,
    trafficKNm: 800,
    besidePushKNm: 0,
    pushKNm: 0,
    skew: { lastingKNm: 500, trafficKNm: 600, pressKN: 300 },
  };
  const { overKNm, heldKNm } = turnedOver(turning, 4, 4, { favourable: 1, traffic: 1.35 });
  // By hand: eccentric traffic presses 800 / 4 = 200 kN, that of the skew 300; 800 + 600 - 300 x 2 = 800 kNm moves;
  // 500 + 1.35 x 800 = 1,580 kNm over, 2,000 x 2 = 4,000 kNm held.
  expect(overKNm).toBeCloseTo(1580, 9);
  expect(heldKNm).toBeCloseTo(4000, 9);
});
