import type { Combo } from './combos.ts';
import { substructureData } from './data.ts';
import type { Setting } from './setting.ts';
import type { SupportAsk } from './supportAsk.ts';
import { upliftKN } from './supportLines.ts';

/** Ratio of allowable loads under accidental to those under characteristic loads. */
const accidentalCapacity = 1.5;

/**
 * Combinations of loads at the bearings of a pier or pylon: traffic with braking or friction and part of the wind;
 * wind without traffic; uplift where there is any; a vehicle or train striking the shaft where traffic is near.
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
  if (setting.impact !== null) {
    combos.push({
      verticalKN: held,
      alongKN: setting.impact.forceKN,
      alongLevelM: setting.groundLevelM + setting.impact.heightM,
      acrossKN: 0,
      acrossLevelM: bearingLevelM,
      capacity: accidentalCapacity,
      ultimate: 1,
    });
  }
  return combos;
}
