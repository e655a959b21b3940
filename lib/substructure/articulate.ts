import type { CastInPier } from '../model/index.ts';
import { substructureData } from './data.ts';
import { deckMaterial } from './deckMaterial.ts';
import { depthOver } from './depthOver.ts';
import { pushOf, type FrameAsk } from './framedShaft.ts';
import { forceAlong, heldAlong, holdingForce, type UnitOnGround } from './heldAlong.ts';
import { jointMovement, windOnDeck, type DeckMaterial } from './loads.ts';

/** How one unit is held at one of its supports. Forces characteristic, kN; movement to the fixed point, mm. */
export interface Hold {
  readonly fixed: boolean;
  readonly alongKN: number;
  readonly acrossKN: number;
  readonly movementMm: number;
  /** Permanent load of the whole unit where it is held here, kN; 0 where it slides. */
  readonly heldKN: number;
  /** A pier that the deck is cast in with: what the deck does to it. */
  readonly frame?: FrameAsk;
}

/**
 * Horizontal system of one unit: what holds it takes braking and the unbalanced friction of the sliding bearings, shared by
 * stiffness where that is more than one support (`heldAlong`); each sliding support takes its own friction; wind goes to
 * every support by its share of the length; movements grow with the distance to the point that stays.
 * Heights and water depths (m) are per support of the unit; `alone` where its deck is cast into the abutments.
 */
export function articulate(on: UnitOnGround, alone = false): Hold[] {
  const { unit, design } = on;
  const x = unit.supportsM;
  const held = heldAlong(on, alone);
  const material = deckMaterial(design);
  const permanent = design.reactions.map((reaction) => Math.max(0, reaction.permanentKN));
  const force = forceAlong(on, held);
  const all = held.stiffnessKNm.reduce((sum, one) => sum + one, 0);
  const weight = permanent.reduce((sum, one) => sum + one, 0);
  return x.map((chainage, i) => {
    const own = held.stiffnessKNm[i]!;
    const movementMm = jointMovement(material, Math.abs(chainage - held.stillM));
    const isFixed = own > 0 && !held.afloat;
    const castIn = design.castIn?.find(({ support }) => support === i);
    return {
      fixed: isFixed,
      alongKN:
        own > 0
          ? // A shaft in one with the deck is pushed by what the deck moves when it is sized.
            holdingForce(force, own, all, castIn ? 0 : movementMm)
          : substructureData.friction.coefficient * (permanent[i] ?? 0),
      acrossKN: windOnDeck(depthOver(design, i), tributary(x, i)),
      // A pier that holds the deck bends with it.
      movementMm: isFixed ? 0 : movementMm,
      heldKN: own > 0 ? (weight * own) / all : 0,
      ...(castIn ? { frame: frameOf(castIn, material, chainage, held.stillM) } : {}),
    };
  });
}

function frameOf(
  { support: _at, ...pier }: CastInPier,
  material: DeckMaterial,
  chainageM: number,
  stillM: number,
): FrameAsk {
  return { ...pier, ...pushOf(material, Math.abs(chainageM - stillM)), stillM };
}

/** Half the span on either side, m. */
function tributary(x: readonly number[], i: number): number {
  const left = i > 0 ? x[i]! - x[i - 1]! : 0;
  const right = i < x.length - 1 ? x[i + 1]! - x[i]! : 0;
  return (left + right) / 2;
}
