import type { At } from '../model/index.ts';
import { groundAt, roadLevelAt, waterDepthAt } from '../site/index.ts';
import { depthOver } from './depthOver.ts';
import { heldAlong, type HeldAlong, type UnitOnGround } from './heldAlong.ts';
import { integralEnds } from './integralEnds.ts';

/** A unit as it meets a support: its place among the units, and which of its supports this is. */
export interface UnitAt {
  readonly unit: number;
  readonly s: number;
  /** Path of its design. */
  readonly path: string;
}

/** The units that meet at the support of `:support`: one, or two where they share it. */
export function unitsAt(at: At): UnitAt[] {
  return at.option.units.flatMap(({ supportsM }, unit) => {
    const s = supportsM.indexOf(at.support.chainageM);
    return s < 0 ? [] : [{ unit, s, path: `${at.root}/designs/${unit}` }];
  });
}

/** Path of the depth of a unit over one of its supports, null on a haunch between its two named depths. */
export function depthPathAt(at: At, { unit, s, path }: UnitAt): string | null {
  const design = at.option.designs[unit]!;
  const over = depthOver(design, s);
  const found = (['support', 'midspan'] as const).find(
    (where) => Math.abs(design.depthM[where] - over) < 1e-9,
  );
  return found === undefined ? null : `${path}/depthM/${found}`;
}

/** A unit with what its supports stand on, as its horizontal system is worked out from. */
export function onGround(at: At, unit: number): UnitOnGround {
  const { site, option } = at;
  const { supportsM } = option.units[unit]!;
  return {
    site,
    unit: option.units[unit]!,
    design: option.designs[unit]!,
    heightM: supportsM.map((x) => roadLevelAt(option.profile, x) - groundAt(site, x)),
    waterDepthM: supportsM.map((x) => waterDepthAt(site, x)),
  };
}

/** How a unit is held along the road. */
export const heldIn = (at: At, unit: number): HeldAlong =>
  heldAlong(onGround(at, unit), integralEnds(at.site, at.option.units, at.option.designs));
