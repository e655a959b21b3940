import { describe, expect, it } from 'vitest';
import { turnedOver } from '../../../lib/forms/concrete-box/boxBearings.ts';
import { boxModel } from '../../../lib/forms/concrete-box/boxModel.ts';
import { boxSkew } from '../../../lib/forms/concrete-box/boxSkew.ts';
import { concreteBox } from '../../../lib/forms/concrete-box/index.ts';
import { sizeBox } from '../../../lib/forms/concrete-box/sizeBox.ts';
import type { Design, UnitTask } from '../../../lib/model/index.ts';
import { expectSquareEnds } from '../squareEnds.ts';
import { boxTask } from './cases.ts';

const at = (skew: Partial<UnitTask>): Design => concreteBox.size(boxTask([35, 45, 35], 2.1, skew));
const uplift = ({ checks }: Design): number => checks.find(({ id }) => id === 'bearing-uplift')!.utilisation;

/** Torques of a box, sized, on a skew of 10 degrees. */
const torques = (spansM: readonly number[], depthM: number, asked: Partial<UnitTask> = {}) => {
  const model = boxModel(boxTask(spansM, depthM, { skewDeg: 10, ...asked }));
  const box = sizeBox(model);
  return { model, box, skew: boxSkew(model, box) };
};

describe('size(concrete-box) on its bearings on a skew', () => {
  it('brings the acute bearing nearer to lifting with the skew, and says what it shifts', () => {
    const [square, slight, more] = [0, 5, 10].map((skewDeg) => at({ skewDeg }));
    expect(uplift(slight!)).toBeGreaterThan(uplift(square!));
    expect(uplift(more!)).toBeGreaterThan(uplift(slight!));
    const { skewTorqueKNm, skewBearingKN, bearingsApartM } = more!.figures;
    expect(skewTorqueKNm! / skewBearingKN!).toBeCloseTo(bearingsApartM!, 9);
    expect(square!.figures).not.toHaveProperty('skewTorqueKNm');
    // Its bearings are made like the one at the obtuse corner, so nothing is said of a mean.
    expect(more!.warnings.join(' ')).toMatch(/square to the road at the piers.*as much less\./);
  });

  it('takes its ends square where the acute bearing would lift, as square as a deck without a skew', () => {
    expectSquareEnds(at);
  });
});

it('size(concrete-box) stands its ends square where that is asked, and measures what closes the wedges', () => {
  const asked = at({ skewDeg: 5, squareEnds: true });
  expect(uplift(asked)).toBe(uplift(at({})));
  expect(asked.figures).not.toHaveProperty('skewTorqueKNm');
  expect(asked).not.toHaveProperty('skewPressKN');
  expect(at({ skewDeg: 5 }).skewPressKN).toBeGreaterThan(0);
  // By hand: 12 x 12 x tan 5 (0.0875) x 1.2 m of concrete, 100 kg of bars in a m3.
  const [concrete, bars] = asked.lines.slice(-2);
  expect(concrete!.quantity).toBeCloseTo(15.118, 2);
  expect(bars!.quantity).toBeCloseTo(100 * concrete!.quantity, 9);
  expect(asked.warnings.join(' ')).toMatch(
    /Skew 5 degrees: all bearings stand square to the road\. .* measured/,
  );
  // On a square deck there is nothing to ask.
  const { task: _asked, ...square } = at({ squareEnds: true });
  const { task: _plain, ...plain } = at({});
  expect(square).toEqual(plain);
});

describe('size(concrete-box) on a skew and a curve', () => {
  const said = (asked: Partial<UnitTask>): string =>
    at(asked).warnings.find((warning) => warning.startsWith('Skew'))!;

  it('blames the skew where a bearing lifts with it and not without', () => {
    expect(uplift(at({ planRadiusM: 150 }))).toBeLessThanOrEqual(1);
    expect(said({ planRadiusM: 150, skewDeg: 10 })).toMatch(/the acute would lift.*tied down/);
  });

  it('blames the curve where a bearing lifts on square supports already, and sizes those', () => {
    const square = at({ planRadiusM: 60 });
    expect(uplift(square)).toBeGreaterThan(1);
    expect(uplift(at({ planRadiusM: 60, skewDeg: 10 }))).toBe(uplift(square));
    const words = said({ planRadiusM: 60, skewDeg: 10 });
    expect(words).toMatch(/on square supports already, by eccentric traffic and the curve \(120 % /);
    expect(words).not.toMatch(/acute|tied down/);
  });
});

describe('boxSkew(model, box)', () => {
  it('of a single span under traffic is what the prismatic box would have', () => {
    const { model, box, skew } = torques([40], 2.1);
    const { beam, layout, traffic } = model;
    let areaKNm2 = 0;
    for (let i = 1; i < beam.xM.length; i++) {
      const { momentMaxKNm } = traffic.most;
      areaKNm2 += ((momentMaxKNm[i - 1]! + momentMaxKNm[i]!) / 2) * (beam.xM[i]! - beam.xM[i - 1]!);
    }
    // Bredt with the walls of midspan, which are thinner than those at the supports: top slab, two webs, bottom slab.
    const { bottomM, webM } = box.thicknesses;
    const heightM = 2.1 - layout.slab.midM / 2 - bottomM / 2;
    const topM = layout.cells * layout.spacingM;
    const soffitM = topM - 2 * layout.slope * heightM;
    const enclosedM2 = ((topM + soffitM) / 2) * heightM;
    const walls =
      topM / layout.slab.midM + (2 * heightM * Math.hypot(1, layout.slope)) / webM + soffitM / bottomM;
    const k = (4 * enclosedM2 ** 2) / walls / 2.4 / box.sections.span.inertiaM4;
    // T = k tan x mean moment / (1 + k tan2): both ends slope and twist together; tan 10 = 0.17633.
    const handKNm = (k * 0.17633 * areaKNm2) / 40 / (1 + k * 0.17633 ** 2);
    expect(skew.trafficKNm[0]! / handKNm).toBeGreaterThan(0.95);
    expect(skew.trafficKNm[0]! / handKNm).toBeLessThan(1.1);
  });

  it('is bent back by tendons: less lasts than own weight would bring', () => {
    const { model, box, skew } = torques([40], 2.1);
    const own = boxSkew(model, { ...box, tendons: { ...box.tendons, forceKN: 0 } });
    expect(Math.abs(skew.lastingKNm[0]!)).toBeLessThan(0.6 * own.lastingKNm[0]!);
    expect(skew.trafficKNm).toEqual(own.trafficKNm);
  });

  it('of a launched deck lasts with what is laid on it, whatever it weighs and is stressed with', () => {
    const { model, box, skew } = torques([40, 50, 50, 40], 3.4, { method: 'launch' });
    const bare = boxSkew(model, { ...box, tendons: { ...box.tendons, forceKN: 0 } });
    expect(skew.lastingKNm[0]).toBeGreaterThan(0);
    expect(bare).toEqual(skew);
  });

  it('is none on square supports', () => {
    const { skew } = torques([40], 2.1, { skewDeg: 0 });
    expect(skew).toEqual({ lastingKNm: [0], trafficKNm: [0] });
  });
});

it('turnedOver(skew) takes what lasts the other way without the traffic that relieves it, and relieves nothing with it', () => {
  const turning = { lastingKN: 2000, outwardKNm: 0, trafficKNm: 800, besidePushKNm: 0, pushKNm: 0 };
  const factors = { favourable: 1, traffic: 1.35 };
  const over = (lastingKNm: number): number =>
    turnedOver({ ...turning, skew: { lastingKNm, trafficKNm: 600, pressKN: 300 } }, 4, 4, factors).overKNm;
  // By hand: with skew traffic 800 + 600 - 300 x 2 = 800 kNm x 1.35 = 1,080; without 800 - 200 x 2 = 400 x 1.35 = 540.
  expect(over(-400)).toBeCloseTo(1080, 9);
  expect(over(-900)).toBeCloseTo(900 + 540, 9);
  // A slight twist presses more than it turns: 800 + 50 - 600 would be less than 400 without it.
  const slight = { lastingKNm: 10, trafficKNm: 50, pressKN: 300 };
  expect(turnedOver({ ...turning, skew: slight }, 4, 4, factors).overKNm).toBeCloseTo(10 + 540, 9);
});
