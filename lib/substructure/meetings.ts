import type { At } from '../model/index.ts';
import { groundAt, roadLevelAt, waterDepthAt } from '../site/index.ts';
import { depthOver } from './articulate.ts';
import { fixedSupport } from './fixedSupport.ts';

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

/** Which of its supports holds a unit along the road. */
export function fixedIn(at: At, unit: number): number {
  const { site } = at;
  const { supportsM } = at.option.units[unit]!;
  return fixedSupport(
    supportsM,
    supportsM.map((x) => roadLevelAt(at.option.profile, x) - groundAt(site, x)),
    supportsM.map((x) => waterDepthAt(site, x)),
  );
}
