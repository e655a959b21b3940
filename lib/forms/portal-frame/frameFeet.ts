import type { FootLoad, FrameModel } from './frameModel.ts';
import { portalData } from './portalData.ts';
import type { SizedFrame } from './sizeFrame.ts';

/**
 * Characteristic loads on the footing of a wall, on stiff and on soft feet: with fill at rest, at its least while the warm
 * deck pushes outwards, as the warm deck presses it (K*), and with a short cold deck and traffic behind the wall; each
 * with the traffic that goes with it. Along and moments are positive towards the span.
 */
export function footLoads(model: FrameModel, { traffic, tendons }: SizedFrame, end: 0 | 1): FootLoad[] {
  const { earth, temperature, shrinkage, cracked, service } = portalData;
  const held = model.prestressed ? 1 : cracked.share;
  const perK = (temperature.expansion1PerK / 1e-5) * held;
  const dry = -held * shrinkage.relaxed * (shrinkage.strain / 1e-5);
  return model.cases.flatMap((one, k) => {
    const [middle, ...ends] = traffic.feet[k]!;
    const base = [
      one.own.feet[end],
      one.superimposed.feet[end],
      ...(tendons ? [tendons.parasitic[k]!.feet[end]] : []),
    ];
    const rest = times(one.earth.feet[end], earth.restPressure);
    const least = times(one.earth.feet[end], earth.activePressure);
    const pressed = one.pressedEarth.feet[end];
    const behind = one.surcharge[end].feet[end];
    const warm = (share: number): FootLoad => times(one.longer.feet[end], share * perK * temperature.warmerK);
    const cold = (share: number): FootLoad =>
      times(one.longer.feet[end], -share * perK * temperature.colderK + dry);
    const beside = service.characteristicTemperature;
    const inMiddle = middle![end];
    const overWall = ends[end]![end];
    return [
      [rest],
      [rest, inMiddle],
      [rest, overWall],
      [least, warm(1)],
      [least, warm(beside), inMiddle],
      [pressed, warm(1)],
      [pressed, warm(beside), overWall],
      [rest, cold(1), behind],
      [rest, cold(beside), behind, overWall],
    ].map((loads) => total([...base, ...loads]));
  });
}

const times = (load: FootLoad, factor: number): FootLoad => ({
  verticalKN: factor * load.verticalKN,
  alongKN: factor * load.alongKN,
  momentKNm: factor * load.momentKNm,
});

const total = (loads: readonly FootLoad[]): FootLoad =>
  loads.reduce((a, b) => ({
    verticalKN: a.verticalKN + b.verticalKN,
    alongKN: a.alongKN + b.alongKN,
    momentKNm: a.momentKNm + b.momentKNm,
  }));

/** Movement of the end of the deck from its warmest to its coldest, shrunk, mm. */
export function endMovementMm({ shape }: FrameModel): number {
  const { temperature, shrinkage } = portalData;
  const { expansion1PerK, warmerK, colderK } = temperature;
  return ((expansion1PerK * (warmerK + colderK) + shrinkage.strain) * shape.spanM * 1e3) / 2;
}
