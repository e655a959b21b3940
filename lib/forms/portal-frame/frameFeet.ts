import type { IntegralWall, WallLoad, WallQuake } from '../../model/index.ts';
import { brakingOf } from './combine.ts';
import type { FrameModel } from './frameModel.ts';
import { portalData } from './portalData.ts';
import type { SizedFrame } from './sizeFrame.ts';

/**
 * Characteristic loads on the footing of a wall, on stiff and on soft feet: with fill at rest, at its least while the warm
 * deck pushes outwards, as the warm deck presses it (K*), and with a short cold deck and traffic behind the wall; each
 * with the traffic that goes with it. Then braking either way, which all walls share by their stiffness, without what the
 * fill in front of the deck would take of it; and any wall of the frame struck, without traffic: the deck holds its head
 * and hands that share on to the other walls. Along and moments are positive towards the span, of a middle wall towards the last.
 */
export function footLoads(
  model: FrameModel,
  { traffic, tendons }: SizedFrame,
  wall: number,
): IntegralWall['loads'] {
  const { earth, temperature, shrinkage, cracked, service, factors } = portalData;
  const held = model.prestressed ? 1 : cracked.share;
  const perK = (temperature.expansion1PerK / 1e-5) * held;
  const dry = -held * shrinkage.relaxed * (shrinkage.strain / 1e-5);
  const brakingKN = factors[model.standardId].braking * brakingOf(model);
  const { name } = model.shape.walls[wall]!;
  const ends = name === 'first' ? [0] : name === 'last' ? [1] : [0, 1];
  return model.cases.flatMap((one, k): IntegralWall['loads'] => {
    const inSpans = traffic.feet[k]!.inSpan.map((feet) => feet[wall]!);
    const overWall = traffic.feet[k]!.overWall[wall]![wall]!;
    const base = [
      one.own.feet[wall]!,
      one.superimposed.feet[wall]!,
      ...(tendons ? [tendons.parasitic[k]!.feet[wall]!] : []),
    ];
    const rest = times(one.earth.feet[wall]!, earth.restPressure);
    const least = times(one.earth.feet[wall]!, earth.activePressure);
    const pressed = one.pressedEarth.feet[wall]!;
    const behind = ends.map((end) => one.surcharge[end]!.feet[wall]!);
    const warm = (share: number): WallLoad =>
      times(one.longer.feet[wall]!, share * perK * temperature.warmerK);
    const cold = (share: number): WallLoad =>
      times(one.longer.feet[wall]!, -share * perK * temperature.colderK + dry);
    const beside = service.characteristicTemperature;
    const braked = bothWays(times(one.braking.feet[wall]!, brakingKN)).flatMap((braking) => {
      const { inSpan, overWall: over } = traffic.feetBraking[k]!;
      const above = over[wall]![wall]!;
      return [
        ...inSpan.map((feet) => [rest, braking, feet[wall]!]),
        ...over.map((feet) => [rest, braking, feet[wall]!]),
        [pressed, warm(beside), braking, above],
        [rest, cold(beside), braking, above],
      ];
    });
    const struck = (model.task.strikes ?? []).flatMap((strikes, hit) =>
      strikes.flatMap((strike, n) => {
        if (hit !== wall && !(strike.alongKN > 0)) return [];
        const along = one.strikes[hit]![n]!.feet[wall]!;
        return (strike.alongKN > 0 ? bothWays(along) : [along]).map((load) => ({
          ...total([...base, rest, load]),
          struck: hit === wall ? strike : { ...strike, acrossKN: 0 },
        }));
      }),
    );
    return [
      ...[
        [rest],
        ...inSpans.map((inMiddle) => [rest, inMiddle]),
        [rest, overWall],
        [least, warm(1)],
        ...inSpans.map((inMiddle) => [least, warm(beside), inMiddle]),
        [pressed, warm(1)],
        [pressed, warm(beside), overWall],
        ...behind.map((side) => [rest, cold(1), side]),
        ...behind.map((side) => [rest, cold(beside), side, overWall]),
        ...braked,
      ].map((loads) => total([...base, ...loads])),
      ...struck,
    ];
  });
}

/**
 * An earthquake on the footing of a wall, on stiff and on soft feet, beside permanent loads and fill at rest; what imposed
 * movements do is not there as well (EN 1998-2 5.5, from memory). Along, deck and walls are drawn by their share of all weight
 * and the walls share it by stiffness; across, a wall takes it of what rests on it and of itself, that of the deck on its top.
 */
export function footQuake(
  model: FrameModel,
  { tendons }: SizedFrame,
  wall: number,
  quakeShare: number,
): WallQuake[] {
  return model.cases.map((one, k): WallQuake => {
    const held = [one.own.feet[wall]!, one.superimposed.feet[wall]!];
    const parasitic = tendons ? [tendons.parasitic[k]!.feet[wall]!] : [];
    const fill = times(one.earth.feet[wall]!, portalData.earth.restPressure);
    const { verticalKN } = total(held);
    return {
      rest: total([...held, ...parasitic, fill]),
      along: times(one.weightAlong.feet[wall]!, quakeShare),
      acrossKN: quakeShare * verticalKN,
      acrossAboveM: weightAboveM(model, wall, verticalKN),
    };
  });
}

/** Height over the footing of the weight on a wall and of its own, m: the deck counts at its top. */
export function weightAboveM(model: FrameModel, wall: number, verticalKN: number): number {
  const { heightM, topM, footM } = model.shape.walls[wall]!;
  const ownKN = model.standard.unitWeights.concreteKNm3 * model.wallM3[wall]!;
  const middleM = ((heightM - model.shape.kneeM) / 3) * ((footM + 2 * topM) / (footM + topM));
  return ((verticalKN - ownKN) * heightM + ownKN * middleM) / verticalKN;
}

const bothWays = (load: WallLoad): WallLoad[] => [load, times(load, -1)];

const times = (load: WallLoad, factor: number): WallLoad => ({
  verticalKN: factor * load.verticalKN,
  alongKN: factor * load.alongKN,
  momentKNm: factor * load.momentKNm,
});

const total = (loads: readonly WallLoad[]): WallLoad =>
  loads.reduce((a, b) => ({
    verticalKN: a.verticalKN + b.verticalKN,
    alongKN: a.alongKN + b.alongKN,
    momentKNm: a.momentKNm + b.momentKNm,
  }));

/** Movement of the deck over a wall from its warmest to its coldest, shrunk, mm: it grows from its middle. */
export function wallMovementMm({ shape }: FrameModel, wall: number): number {
  const { temperature, shrinkage } = portalData;
  const { expansion1PerK, warmerK, colderK } = temperature;
  const { lengthM, supportsM } = shape;
  const reachM = Math.abs(2 * supportsM[wall]! - lengthM);
  return ((expansion1PerK * (warmerK + colderK) + shrinkage.strain) * reachM * 1e3) / 2;
}
