import type { Combo } from './combos.ts';
import { substructureData } from './data.ts';
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
 * `windKN` at `windLevelM` is the wind on the shaft itself; `ownKN` its weight.
 */
export function pierCombos(
  ask: SupportAsk,
  setting: Setting,
  bearingLevelM: number,
  own: { readonly weightKN: number; readonly windKN: number; readonly windLevelM: number },
): Combo[] {
  const { factors } = substructureData;
  const wind = ask.acrossKN + own.windKN;
  const windLevelM =
    wind > 0 ? (ask.acrossKN * bearingLevelM + own.windKN * own.windLevelM) / wind : bearingLevelM;
  const held = ask.permanentKN + own.weightKN;
  const combos: Combo[] = [
    {
      verticalKN: held + ask.trafficKN,
      alongKN: ask.alongKN,
      alongLevelM: bearingLevelM,
      acrossKN: factors.windWithTraffic * wind,
      acrossLevelM: windLevelM,
      capacity: 1,
      ultimate: factors.traffic,
    },
    {
      verticalKN: held,
      alongKN: substructureData.friction.coefficient * Math.max(0, ask.permanentKN),
      alongLevelM: bearingLevelM,
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
    combos.push(...seismicCombos(ask, setting.seismic, bearingLevelM, own.weightKN));
  return combos;
}

/** Earthquake along the road with a share of it across, and the other way round; no traffic. */
function seismicCombos(
  ask: SupportAsk,
  { pierShare }: SeismicLoad,
  bearingLevelM: number,
  shaftKN: number,
): Combo[] {
  const shaft = substructureData.seismic.shaftShare * shaftKN;
  const along = pierShare * (Math.max(0, ask.heldAlongKN) + shaft);
  const across = pierShare * (Math.max(0, ask.permanentKN) + shaft);
  return quakeDirections().map(([a, b]) => ({
    verticalKN: ask.permanentKN + shaftKN,
    alongKN: a * along,
    alongLevelM: bearingLevelM,
    acrossKN: b * across,
    acrossLevelM: bearingLevelM,
    capacity: accidentalCapacity,
    ultimate: 1,
  }));
}
