import type { Design, Site, Unit } from '../model/index.ts';
import { substructureData } from './data.ts';
import { deckMaterial } from './deckMaterial.ts';
import { fixedSupport } from './fixedSupport.ts';
import { brakingForce, jointMovement, unbalancedFriction, windOnDeck } from './loads.ts';

/** How one unit is held at one of its supports. Forces characteristic, kN; movement to the fixed point, mm. */
export interface Hold {
  readonly fixed: boolean;
  readonly alongKN: number;
  readonly acrossKN: number;
  readonly movementMm: number;
  /** Permanent load of the whole unit where it is held here, kN; 0 where it slides. */
  readonly heldKN: number;
}

/**
 * Horizontal system of one unit: one fixed point near its middle takes braking and the unbalanced friction of the sliding
 * bearings; each sliding support takes its own friction; wind goes to every support by its share of the length; movements
 * grow with the distance to the fixed point. Heights and water depths (m) are per support of the unit.
 */
export function articulate(
  site: Site,
  unit: Unit,
  design: Design,
  heightM: readonly number[],
  waterDepthM: readonly number[],
): Hold[] {
  const x = unit.supportsM;
  const held = fixedSupport(x, heightM, waterDepthM);
  const material = deckMaterial(design);
  const permanent = design.reactions.map((reaction) => Math.max(0, reaction.permanentKN));
  const unitLength = x.at(-1)! - x[0]!;
  const fixedAlong =
    brakingForce(site.standard, unitLength, site.deck) +
    unbalancedFriction(permanent.slice(0, held), permanent.slice(held + 1));
  return x.map((chainage, i) => ({
    fixed: i === held,
    alongKN: i === held ? fixedAlong : substructureData.friction.coefficient * (permanent[i] ?? 0),
    acrossKN: windOnDeck(depthOver(design, i), tributary(x, i)),
    movementMm: jointMovement(material, Math.abs(chainage - x[held]!)),
    heldKN: i === held ? permanent.reduce((sum, one) => sum + one, 0) : 0,
  }));
}

/** Half the span on either side, m. */
function tributary(x: readonly number[], i: number): number {
  const left = i > 0 ? x[i]! - x[i - 1]! : 0;
  const right = i < x.length - 1 ? x[i + 1]! - x[i]! : 0;
  return (left + right) / 2;
}

/** Structural depth of a unit over its support `i` (0-based), m. */
export function depthOver(design: Design, i: number): number {
  const { xM, depthM } = design.depthAlong;
  const at = design.task.spansM.slice(0, i).reduce((sum, span) => sum + span, 0);
  let k = 1;
  while (k < xM.length - 1 && xM[k]! < at - 1e-9) k++;
  const x0 = xM[k - 1] ?? 0;
  const x1 = xM[k] ?? x0;
  const d0 = depthM[k - 1] ?? design.depthM.support;
  const d1 = depthM[k] ?? d0;
  const share = x1 > x0 ? Math.min(1, Math.max(0, (at - x0) / (x1 - x0))) : 0;
  return d0 + share * (d1 - d0);
}
