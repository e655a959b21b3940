import type { CastInPier, Design, Site, Unit } from '../model/index.ts';
import { constructionDepth } from '../site/constructionDepth.ts';
import { alongSupportsM } from '../site/skew.ts';
import { bearingKind, rubberHeight } from './bearingKind.ts';
import { substructureData } from './data.ts';
import { deckMaterial } from './deckMaterial.ts';
import { depthOver } from './depthOver.ts';
import { fixedSupport } from './fixedSupport.ts';
import { brakingForce, jointMovement, unbalancedFriction, type DeckMaterial } from './loads.ts';
import { framedStiffness, leafAt, pierStiffness } from './pierStiffness.ts';
import { seismicLoad } from './seismicLoad.ts';

/** How a unit is held along the road. */
export interface HeldAlong {
  /**
   * Stiffness of each of its supports against the deck moving along the road, kN per m; 0 where it slides. One that
   * holds it alone has 1.
   */
  readonly stiffnessKNm: readonly number[];
  /** Chainage that stays where it is when the deck grows or shrinks, m. */
  readonly stillM: number;
  /** Laminated rubber on every support: held by all of them, fixed on none. */
  readonly afloat: boolean;
}

/** A unit with what its supports stand on: heights from ground to road and depths of water, m. */
export interface UnitOnGround {
  readonly site: Site;
  readonly unit: Unit;
  readonly design: Design;
  readonly heightM: readonly number[];
  readonly waterDepthM: readonly number[];
}

/** Most piers that hold one unit together. Common practice, no source. */
const MOST_PIERS = 4;
/** Holding it by more than one has to spare this share of what the piers are dear by. Common practice, no source. */
const PAYS = 0.05;

const sum = (values: readonly number[]): number => values.reduce((total, value) => total + value, 0);
const pressed = ({ reactions }: Design): number[] =>
  reactions.map(({ permanentKN }) => Math.max(0, permanentKN));

/** Braking of a unit with the unbalanced friction of those of its supports on which it slides, kN. */
export function forceAlong({ site, unit, design }: UnitOnGround, { stiffnessKNm }: HeldAlong): number {
  const x = unit.supportsM;
  const permanent = pressed(design);
  const first = stiffnessKNm.findIndex((k) => k > 0);
  const slides = (i: number): boolean => stiffnessKNm[i] === 0;
  const left = permanent.filter((_, i) => slides(i) && i < first);
  const right = permanent.filter((_, i) => slides(i) && i > first);
  return brakingForce(site.standard, x.at(-1)! - x[0]!, site.deck) + unbalancedFriction(left, right);
}

/**
 * Force along the road on a support that holds a unit, kN: its share of braking and friction by stiffness, and what it
 * takes to bend or shear it by half the movement, both ways together, of its distance from the point that stays.
 */
export const holdingForce = (
  forceKN: number,
  stiffnessKNm: number,
  allKNm: number,
  movementMm: number,
): number => (forceKN * stiffnessKNm) / allKNm + (stiffnessKNm * movementMm) / 2 / 1000;

/** Centre of stiffness, m. */
export const stillAt = (x: readonly number[], stiffness: readonly number[]): number =>
  x.reduce((moment, at, i) => moment + at * stiffness[i]!, 0) / sum(stiffness);

/**
 * Shear stiffness of the laminated rubber of one unit on one support, kN/m: G A / height for its load, kN, and
 * movement, mm.
 */
export function rubberStiffness(loadKN: number, movementMm: number): number {
  const { rubberShearMPa, rubberPressureMPa, leastRubberM } = substructureData.bearings;
  const areaM2 = loadKN / (rubberPressureMPa * 1000);
  return (rubberShearMPa * 1000 * areaM2) / Math.max(leastRubberM, rubberHeight(movementMm));
}

/** Two springs one above the other. */
export const inSeries = (a: number, b: number): number => 1 / (1 / a + 1 / b);

/** Height of each pier from its foundation to its bearings, or to the deck that is cast in with it, m. */
export function pierHeights({ site, design, heightM }: UnitOnGround): number[] {
  const { bearings, piles } = substructureData;
  return heightM.map((height, i) => {
    const bearingM = design.castIn?.some(({ support }) => support === i) ? 0 : bearings.heightM;
    return Math.max(
      1,
      height - constructionDepth(site.deck, depthOver(design, i)) - bearingM + piles.capCoverM,
    );
  });
}

/** Runs of neighbouring inner supports that contain one of them, two or more, at most so many. */
function runsWith(held: number, count: number): (readonly [from: number, to: number])[] {
  const runs: (readonly [number, number])[] = [];
  for (let from = 1; from <= held; from += 1)
    for (let to = held; to <= count - 2; to += 1)
      if (to > from && to - from < MOST_PIERS) runs.push([from, to]);
  return runs;
}

/** A deck on laminated rubber throughout; null where a bearing of it is no rubber, or braking would shear it too far. */
function afloat(on: UnitOnGround, piers: readonly number[], material: DeckMaterial): HeldAlong | null {
  const { unit, design, site } = on;
  const { bearings, factors } = substructureData;
  const x = unit.supportsM;
  const loads = design.reactions.map(({ permanentKN, trafficMaxKN }) => permanentKN + trafficMaxKN);
  if (!loads.every((load) => load > 0)) return null;
  const isEnd = (i: number): boolean => i === 0 || i === x.length - 1;
  let stillM = (x[0]! + x.at(-1)!) / 2;
  let stiffnessKNm: number[] = [];
  const moves = (i: number): number => jointMovement(material, Math.abs(x[i]! - stillM));
  // The height of the rubber hangs on the point that stays, and that on the rubber: once is near enough, twice settles it.
  for (let k = 0; k < 2; k += 1) {
    stiffnessKNm = x.map((_, i) => {
      const rubber = rubberStiffness(loads[i]!, moves(i));
      return isEnd(i) ? rubber : inSeries(piers[i]!, rubber);
    });
    stillM = stillAt(x, stiffnessKNm);
  }
  const designMN = design.reactions.map(
    ({ permanentKN, trafficMaxKN }) =>
      (factors.permanent * permanentKN + factors.traffic * trafficMaxKN) / 1000,
  );
  const isRubber = x.every((_, i) => bearingKind(moves(i), designMN[i]!, bearings.perLine) === 'elastomeric');
  const swayM = brakingForce(site.standard, x.at(-1)! - x[0]!, site.deck) / sum(stiffnessKNm);
  const strain = bearings.rubberStrain + bearings.brakingStrain;
  const isSheared = x.some((_, i) => {
    const rubberM = Math.max(bearings.leastRubberM, rubberHeight(moves(i)));
    return moves(i) / 2 / 1000 + swayM > strain * rubberM;
  });
  return isRubber && !isSheared ? { stiffnessKNm, stillM, afloat: true } : null;
}

/** Held by the piers that the deck is cast in with. */
function byFrame(on: UnitOnGround, castIn: readonly CastInPier[]): HeldAlong {
  const { unit, site } = on;
  const heights = pierHeights(on);
  const stiffnessKNm = unit.supportsM.map((_, i) => {
    const pier = castIn.find(({ support }) => support === i);
    return pier ? framedStiffness(alongSupportsM(site), heights[i]!, pier.deckTurnKNm) : 0;
  });
  return { stiffnessKNm, stillM: stillAt(unit.supportsM, stiffnessKNm), afloat: false };
}

/**
 * How a unit is held along the road. Piers that the deck is cast in with hold it. Elsewhere one support near its middle
 * holds it alone, unless two or more neighbouring piers with that one among them, or laminated rubber on all its
 * supports, leave smaller moments at the feet of its piers, the worst of them counted twice: braking and friction are
 * then shared by stiffness, 3 E I / h^3 of a pier with the rubber on it in series, and each pier is bent by what the
 * deck moves over it. Foundations are taken as rigid: on the safe side for what bends a pier. Units on pylons or with
 * walls of their own, and decks cast into their abutments (`alone`), have one fixed point.
 */
export function heldAlong(on: UnitOnGround, alone = false): HeldAlong {
  const { site, unit, design, heightM, waterDepthM } = on;
  if (design.castIn) return byFrame(on, design.castIn);
  const x = unit.supportsM;
  const held = fixedSupport(x, heightM, waterDepthM);
  const single: HeldAlong = {
    stiffnessKNm: x.map((_, i) => (i === held ? 1 : 0)),
    stillM: x[held]!,
    afloat: false,
  };
  const hasOwn = unit.pylons !== undefined || (design.walls !== undefined && design.walls.length > 0);
  if (alone || hasOwn || x.length < 4) return single;

  const material = deckMaterial(design);
  const heights = pierHeights(on);
  const permanent = pressed(design);
  const quake = (seismicLoad(site)?.pierShare ?? 0) * sum(permanent);
  /** Moments at the feet of the piers, kNm. */
  const moments = (system: HeldAlong): number[] => {
    const force = forceAlong(on, system);
    const all = sum(system.stiffnessKNm);
    return x.slice(1, -1).map((at, k) => {
      const i = k + 1;
      const own = system.stiffnessKNm[i]!;
      const moved = jointMovement(material, Math.abs(at - system.stillM));
      const along =
        own > 0
          ? Math.max(holdingForce(force, own, all, moved), (quake * own) / all)
          : substructureData.friction.coefficient * permanent[i]!;
      return along * heights[i]!;
    });
  };
  const piers = x.map((at, i) => pierStiffness(alongSupportsM(site), heights[i]!, leafAt(site, at)));
  const byPiers = runsWith(held, x.length).map(([from, to]): HeldAlong => {
    const stiffnessKNm = x.map((_, i) => (i >= from && i <= to ? piers[i]! : 0));
    return { stiffnessKNm, stillM: stillAt(x, stiffnessKNm), afloat: false };
  });
  const onRubber = afloat(on, piers, material);
  /** Piers are dear by the moments at their feet, and as they are built alike, by the worst of them once more. */
  const dearness = (system: HeldAlong): number => {
    const each = moments(system);
    return sum(each) + Math.max(...each);
  };
  let best = single;
  let least = (1 - PAYS) * dearness(single);
  for (const system of onRubber ? [...byPiers, onRubber] : byPiers) {
    const after = dearness(system);
    if (after < least) {
      best = system;
      least = after;
    }
  }
  return best;
}
