import { describe, expect, it } from 'vitest';
import { trafficEnvelope, trafficOnDeck } from '../../../lib/actions/index.ts';
import { boxGirderModel } from '../../../lib/forms/composite-box/boxGirderModel.ts';
import { boxGirderSkew } from '../../../lib/forms/composite-box/boxGirderSkew.ts';
import { boxSteelOf } from '../../../lib/forms/composite-box/boxSteel.ts';
import { compositeBox } from '../../../lib/forms/composite-box/index.ts';
import { bearingPerKNm, bearingUplift } from '../../../lib/forms/composite-box/tubBearings.ts';
import { girderEffects } from '../../../lib/forms/composite-i/girderEffects.ts';
import { girderReactions } from '../../../lib/forms/composite-i/girderReactions.ts';
import { sizeGirder } from '../../../lib/forms/composite-i/sizeGirder.ts';
import { bredt } from '../../../lib/mechanics/index.ts';
import type { Design, UnitTask } from '../../../lib/model/index.ts';
import { expectSquareEnds } from '../squareEnds.ts';
import { tubTask } from './cases.ts';

const at = (skew: Partial<UnitTask>): Design => compositeBox.size(tubTask([35, 45, 35], 1.9, skew));
const upliftOf = ({ checks }: Design): number =>
  checks.find(({ id }) => id === 'bearing-uplift')!.utilisation;

/** A box with the plates it is sized with on square ends, which is then put on a skew. */
const sizedOn = (spansM: readonly number[], depthM: number, asked: Parameters<typeof tubTask>[2] = {}) => {
  const model = boxGirderModel(tubTask(spansM, depthM, asked), 1);
  const girder = sizeGirder(model, boxSteelOf(model));
  const on = (skewDeg: number) => ({ ...model, task: { ...model.task, skewDeg } });
  const torques = (skewDeg: number) => boxGirderSkew(on(skewDeg), girder);
  const uplift = (skewDeg: number): number =>
    bearingUplift(on(skewDeg), girderReactions(model, girder), torques(skewDeg)).utilisation;
  return { model, girder, on, torques, uplift };
};

describe('boxGirderSkew(model, girder)', () => {
  it('of a single span of the same plates throughout is the closed form', () => {
    const spanM = 40;
    const { model, girder, on } = sizedOn([spanM], 2.2);
    const middle = girder.run.webM.length / 2;
    const same = (values: Float64Array): Float64Array => values.map(() => values[middle]!);
    const run = {
      ...girder.run,
      topM: same(girder.run.topM),
      bottomM: same(girder.run.bottomM),
      webM: same(girder.run.webM),
    };
    const effects = girderEffects(model, run, 0);
    const skew = boxGirderSkew(on(20), { ...girder, run, effects });

    // The end turns about the line of its bearings alone: a slope s comes with a twist s tan. Loads even along the span
    // slope both ends by a, opposite ways, so that the span is twisted by 2 a tan = T L / GJ. The moment that the bearings
    // hold stands square to their line: with T comes T tan about the other axis, which bends both ends back,
    //   2 a = (area of M) / EI - T tan L / EI.
    // Together T = k tan (mean of M) / (1 + k tan2), k = GJ / EI. Mean of M: w L2 / 12 of an even load, and EI times the
    // curvature of shrinkage, N e / EI with N in the slab and e above the axis.
    const { shape, slab } = model;
    const topM = run.topM[0]!;
    const webM = run.webM[0]!;
    const bottomM = run.bottomM[0]!;
    const webHeightM = model.girderM - topM - bottomM;
    const n = 3 * model.modularRatio;
    const slabM2 = 2 * n * model.lasting[0]!.slabAreaM2;
    const slabAboveM = model.girderM + slab.rootM - slab.meanM / 2;
    const rect = (widthM: number, heightM: number, middleM: number) => ({
      areaM2: widthM * heightM,
      inertiaM4: (widthM * heightM ** 3) / 12,
      zM: middleM,
    });
    const parts = [
      rect(2 * run.topWidthM, topM, model.girderM - topM / 2),
      rect(2 * webM, webHeightM, bottomM + webHeightM / 2),
      rect(shape.bottomM, bottomM, bottomM / 2),
      rect(slabM2 / slab.meanM / n, slab.meanM, slabAboveM),
    ];
    const areaM2 = parts.reduce((sum, part) => sum + part.areaM2, 0);
    const axisM = parts.reduce((sum, part) => sum + part.areaM2 * part.zM, 0) / areaM2;
    const inertiaM4 = parts.reduce(
      (sum, part) => sum + part.inertiaM4 + part.areaM2 * (part.zM - axisM) ** 2,
      0,
    );
    const leanM = shape.slant * (shape.heightM + slab.meanM / 2);
    const torsionM4 = bredt(((shape.topM + shape.bottomM) / 2) * (shape.heightM + slab.meanM / 2), [
      { lengthM: shape.topM, thicknessM: slab.meanM / ((n * 1.2) / 1.3) },
      { lengthM: 2 * leanM, thicknessM: webM },
      { lengthM: shape.bottomM, thicknessM: bottomM },
    ]);
    const k = torsionM4 / 2.6 / inertiaM4;
    const laidKNm = (model.task.deck.superimposedKNm * spanM ** 2) / 12;
    const shrunkKNm = 2 * model.shrinkageKN[0]! * (slabAboveM - axisM);
    const tan = 0.36397;
    const handKNm = (k * tan * (laidKNm + shrunkKNm)) / (1 + k * tan ** 2);
    expect(skew.lastingKNm[0]! / handKNm).toBeCloseTo(1, 2);
  });

  it('does not mind the wet slab, which the open tub carries, nor on which side the skew is', () => {
    const { model, girder, on, torques } = sizedOn([35, 45, 35], 1.9);
    const heavier = { ...girder.effects.steelStage };
    heavier.momentKNm = heavier.momentKNm.map((kNm) => 2 * kNm);
    const wet = boxGirderSkew(on(10), { ...girder, effects: { ...girder.effects, steelStage: heavier } });
    expect(wet).toEqual(torques(10));
    expect(torques(-10)).toEqual(torques(10));
    expect(torques(0)).toEqual({ lastingKNm: [0, 0, 0], trafficKNm: [0, 0, 0] });
    expect(model.task).not.toHaveProperty('skewDeg');
  });

  it('of two boxes is twice that of one under half of the lanes, which is less than the worst box has', () => {
    const { model, girder, on, torques } = sizedOn([45, 60, 45], 2.4, { widthM: 20 });
    expect(model.tubs.boxes).toBe(2);
    const { shortBeam, traffic } = girder.effects;
    const lanes = trafficEnvelope(shortBeam, trafficOnDeck('lm1', model.task.deck), { deflection: false });
    const alone = (momentMaxKNm: Float64Array): number =>
      boxGirderSkew(
        { ...on(10), tubs: { ...model.tubs, boxes: 1, count: 2 } },
        { ...girder, effects: { ...girder.effects, traffic: { ...traffic, momentMaxKNm } } },
      ).trafficKNm[0]!;
    const quarter = alone(lanes.momentMaxKNm.map((kNm) => kNm / 4));
    expect(torques(10).trafficKNm[0]! / quarter).toBeCloseTo(2, 9);
    expect(alone(traffic.momentMaxKNm)).toBeGreaterThan(quarter);
  });
});

describe('bearingUplift(model, reactions, torques)', () => {
  it('grows with the skew from the first tenth of a degree on', () => {
    const { uplift } = sizedOn([35, 45, 35], 1.9);
    const uses = [0, 0.1, 0.5, 2, 5, 10, 20, 40].map(uplift);
    for (let i = 1; i < uses.length; i++) expect(uses[i]!).toBeGreaterThan(uses[i - 1]!);
    expect(uplift(-10)).toBe(uplift(10));
  });

  it('shifts a torque by the distance of two bearings, and less by the bearings of two boxes', () => {
    const { model } = sizedOn([35, 45, 35], 1.9);
    // By hand: bottom plate less 0.4 m at each web.
    expect(bearingPerKNm(model)).toBeCloseTo(1 / (model.shape.bottomM - 0.8), 9);
    const wide = sizedOn([35, 45, 35], 1.9, { widthM: 20 }).model;
    // By hand: middles of the boxes at y, bearings at y - a/2 and y + a/2; sum of squares 4 y2 + a2.
    const y = wide.tubs.spacingM;
    const a = wide.shape.bottomM - 0.8;
    expect(bearingPerKNm(wide)).toBeCloseTo((y + a / 2) / (4 * y ** 2 + a ** 2), 9);
  });
});

describe('size(composite-box) on a skew', () => {
  it('stands its webs up where that keeps the acute bearing down, and says what it shifts', () => {
    const [square, slight, more] = [0, 5, 10].map((skewDeg) => at({ skewDeg }));
    expect(upliftOf(slight!)).toBeGreaterThan(upliftOf(square!));
    expect(more!.figures.webSlope).toBeLessThan(square!.figures.webSlope!);
    expect(upliftOf(more!)).toBeLessThanOrEqual(1);
    const { skewTorqueKNm, skewBearingKN, bottomPlateWidthM } = more!.figures;
    expect(skewTorqueKNm! / skewBearingKN!).toBeCloseTo(bottomPlateWidthM! - 0.8, 9);
    expect(square!.figures).not.toHaveProperty('skewTorqueKNm');
    expect(more!.warnings.join(' ')).toMatch(/square to the road at the piers.*obtuse bearing/);
  });

  it('takes its ends square where the acute bearing would lift, as square as a deck without a skew', () => {
    expectSquareEnds(at);
  });

  it('is the same on either side', () => {
    const { task: _left, warnings: _one, ...left } = at({ skewDeg: -10 });
    const { task: _right, warnings: _other, ...right } = at({ skewDeg: 10 });
    expect(left).toEqual(right);
  });
});
