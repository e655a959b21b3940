import { z } from '../../zod.ts';
import json from '../../../data/forms/fatigue.json';
import { runGroup, straightLine, type AxleGroup, type Extremes, type Track } from '../../mechanics/index.ts';
import type { StandardId } from '../../model/index.ts';
import { cited } from '../common/cited.ts';

const rules = z.strictObject({
  axles: z.strictObject({ atM: z.array(z.number()), loadKN: z.array(z.number()), source: z.string() }),
  dynamicAllowance: cited,
  damage: z.strictObject({
    at10M: z.number(),
    at80M: z.number(),
    most: z.number(),
    mostFrom25M: z.number(),
    source: z.string(),
  }),
  rangeMPa: z.strictObject({
    plain: z.number(),
    gusset: z.number(),
    stiffener: z.number(),
    stay: z.number(),
    source: z.string(),
  }),
});

const data = z.strictObject({ note: z.string(), lm1: rules, hl93: rules }).parse(json);

const groups: Readonly<Record<StandardId, AxleGroup>> = { lm1: groupOf('lm1'), hl93: groupOf('hl93') };

function groupOf(id: StandardId): AxleGroup {
  const { axles, dynamicAllowance } = data[id];
  return {
    atM: axles.atM,
    loadKN: axles.loadKN.map((load) => load * (1 + dynamicAllowance.value)),
    whole: true,
  };
}

/**
 * Range of a force or moment made by the fatigue lorry of a standard crossing an influence line (straight between the
 * stations of the track), equivalent to the traffic of the design life.
 * @param lengthM length that the damage factor goes by: the span of a beam or chord, 0.4 of it for shear, m
 */
export function fatigueRange(
  id: StandardId,
  track: Track,
  ordinates: ArrayLike<number>,
  lengthM: number,
): number {
  const out: Extremes = { max: 0, min: 0 };
  runGroup(track, groups[id], straightLine(track.xM, ordinates), -1, out);
  return damageFactor(id, lengthM) * (out.max - out.min);
}

/** Flange of a girder with nothing attached, member at a gusset, flange with a stiffener, strand of a stay. */
export type FatigueDetail = 'plain' | 'gusset' | 'stiffener' | 'stay';

/** Allowed range, MPa, of a detail. */
export function fatigueLimitMPa(id: StandardId, detail: FatigueDetail): number {
  return data[id].rangeMPa[detail];
}

function damageFactor(id: StandardId, lengthM: number): number {
  const { at10M, at80M, most, mostFrom25M } = data[id].damage;
  const between = (from: number, to: number): number =>
    Math.min(1, Math.max(0, (lengthM - from) / (to - from)));
  return Math.min(at10M + (at80M - at10M) * between(10, 80), most + (mostFrom25M - most) * between(10, 25));
}
