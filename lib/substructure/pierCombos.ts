import type { Combo } from './combos.ts';
import { substructureData } from './data.ts';
import { pushedBy, swayedBy, together, turnedBy, type FrameAsk, type FramedShaft } from './framedShaft.ts';
import { quakeDirections, type SeismicLoad } from './seismicLoad.ts';
import type { Setting } from './setting.ts';
import type { SupportAsk } from './supportAsk.ts';
import { strikesAt } from './strikesAt.ts';
import { upliftKN } from './supportLines.ts';

/** Ratio of allowable loads under accidental to those under characteristic loads. */
export const accidentalCapacity = 1.5;

/**
 * Combinations of loads at the bearings of a pier or pylon: traffic with braking or friction and part of the wind;
 * wind without traffic; one arm ahead of the other where a deck is cantilevered from it; uplift where there is any; a vehicle, train or vessel striking the shaft where one can; an earthquake.
 * `windKN` at `windLevelM` is the wind on the shaft itself; `ownKN` its weight. A shaft that the deck is cast in with
 * (`shaft`) is held by it against turning, and bent by what the deck moves and turns.
 */
export function pierCombos(
  ask: SupportAsk,
  setting: Setting,
  bearingLevelM: number,
  own: { readonly weightKN: number; readonly windKN: number; readonly windLevelM: number },
  shaft: FramedShaft | null = null,
): Combo[] {
  const { factors } = substructureData;
  const wind = ask.acrossKN + own.windKN;
  const windLevelM =
    wind > 0 ? (ask.acrossKN * bearingLevelM + own.windKN * own.windLevelM) / wind : bearingLevelM;
  const held = ask.permanentKN + own.weightKN;
  const { frame } = ask;
  const at = { alongLevelM: bearingLevelM };
  const inFrame = frame && shaft && { ask: frame, shaft };
  const slidesKN = substructureData.friction.coefficient * Math.max(0, ask.permanentKN);
  const combos: Combo[] = [
    {
      verticalKN: held + ask.trafficKN,
      ...at,
      ...(inFrame ? bentBy(inFrame, ask.alongKN, frame.trafficKNm) : { alongKN: ask.alongKN }),
      acrossKN: factors.windWithTraffic * wind,
      acrossLevelM: windLevelM,
      capacity: 1,
      ultimate: factors.traffic,
    },
    {
      verticalKN: held,
      ...at,
      ...(inFrame ? bentBy(inFrame, 0, 0) : { alongKN: slidesKN }),
      acrossKN: wind,
      acrossLevelM: windLevelM,
      capacity: 1,
      ultimate: factors.wind,
    },
  ];
  if (ask.building) {
    combos.push({
      verticalKN: ask.building.verticalKN + own.weightKN,
      alongKN: 0,
      alongLevelM: bearingLevelM,
      momentAlongKNm: ask.building.momentKNm,
      acrossKN: 0,
      acrossLevelM: bearingLevelM,
      capacity: 1,
      ultimate: factors.permanent,
    });
  }
  const uplift = upliftKN(ask);
  if (uplift > 0) {
    const none = { alongKN: 0, alongLevelM: bearingLevelM, acrossKN: 0, acrossLevelM: bearingLevelM };
    combos.push({
      ...none,
      verticalKN: factors.favourable * own.weightKN - uplift,
      capacity: 1,
      ultimate: 1,
    });
  }
  for (const { alongKN, acrossKN, aboveGroundM } of strikesAt(setting)) {
    const levelM = setting.groundLevelM + aboveGroundM;
    combos.push({
      verticalKN: held,
      alongKN,
      alongLevelM: levelM,
      acrossKN,
      acrossLevelM: levelM,
      capacity: accidentalCapacity,
      ultimate: 1,
    });
  }
  if (setting.seismic !== null)
    combos.push(...seismicCombos(ask, setting.seismic, bearingLevelM, own.weightKN, shaft));
  return combos;
}

/**
 * What bends a shaft in one with the deck, as a force and a moment at its top: a force along the road, kN, the couple of the
 * traffic, kNm, what is laid on the deck, and its movement. All are taken to bend it the same way.
 */
function bentBy(
  { ask, shaft }: { readonly ask: FrameAsk; readonly shaft: FramedShaft },
  alongKN: number,
  trafficKNm: number,
): Pick<Combo, 'alongKN' | 'momentAlongKNm' | 'imposed'> {
  const imposed = pushedBy(shaft, ask.pushM);
  const turned = turnedBy(shaft, ask.laidKNm + trafficKNm);
  const all = together(swayedBy(shaft, alongKN), turned, imposed);
  return { alongKN: all.forceKN, momentAlongKNm: -all.topKNm, imposed };
}

/** Earthquake along the road with a share of it across, and the other way round; no traffic. */
function seismicCombos(
  ask: SupportAsk,
  { pierShare }: SeismicLoad,
  bearingLevelM: number,
  shaftKN: number,
  framed: FramedShaft | null,
): Combo[] {
  const shaft = substructureData.seismic.shaftShare * shaftKN;
  const along = pierShare * (Math.max(0, ask.heldAlongKN) + shaft);
  const across = pierShare * (Math.max(0, ask.permanentKN) + shaft);
  return quakeDirections().map(([a, b]) => ({
    verticalKN: ask.permanentKN + shaftKN,
    alongKN: a * along,
    ...(framed ? { momentAlongKNm: -swayedBy(framed, a * along).topKNm } : {}),
    alongLevelM: bearingLevelM,
    acrossKN: b * across,
    acrossLevelM: bearingLevelM,
    capacity: accidentalCapacity,
    ultimate: 1,
  }));
}
