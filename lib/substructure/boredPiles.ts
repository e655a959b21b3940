import { noForces } from './combos.ts';
import type { FootTask } from './foot.ts';
import { demandAt } from './foot.ts';
import type { GroundFigures } from './data.ts';
import { substructureData } from './data.ts';

/** Most rows of piles along and across the road. */
const mostAlong = 8;
const mostAcross = 10;

/** A capped group of bored piles. */
export interface PileGroup {
  readonly rowsAlong: number;
  readonly rowsAcross: number;
  readonly diameterM: number;
  /** From the underside of the cap to the toe, m. */
  readonly lengthM: number;
  readonly toeLevelM: number;
  readonly cap: { readonly lengthM: number; readonly widthM: number; readonly depthM: number };
}

/** Levels that bound the piles, m. */
export interface PileLevels {
  /** Top of the cap. */
  readonly capTopM: number;
  readonly bearingLevelM: number;
  /** Bed level after scour: no shaft friction is counted above it. */
  readonly scouredLevelM: number;
}

/**
 * Allowable load of one pile, kN: (shaft friction x perimeter x length in the bearing stratum + base x area) / safety,
 * within the mean stress of the concrete. `inStratumM` is the length below both bearing level and scour, m.
 */
export function pileCapacity(ground: GroundFigures, diameterM: number, inStratumM: number): number {
  const { safety, concreteMPa } = substructureData.piles;
  const area = (Math.PI * diameterM * diameterM) / 4;
  const soil = (ground.shaftKPa * Math.PI * diameterM * inStratumM + ground.baseKPa * area) / safety;
  return Math.min(soil, concreteMPa * 1000 * area);
}

/** A group of bored piles and how far its piles are beyond the tool's range: 1 where they are within it. */
export interface PilesFound {
  readonly group: PileGroup;
  readonly overload: number;
}

/** Overloads are told apart to this. */
const overloadStep = 0.01;

/**
 * The group that carries the loads, or where none does the one that would if every pile could carry and reach so many times
 * more: the least multiple, found by halving. Loads are finite, so there always is one.
 */
export function pilesOrNearest(task: FootTask, ground: GroundFigures, levels: PileLevels): PilesFound {
  const within = boredPiles(task, ground, levels);
  if (within !== null) return { group: within, overload: 1 };
  const eased = (overload: number): PileGroup | null =>
    boredPiles(
      {
        ...task,
        combos: task.combos.map((combo) => ({ ...combo, capacity: combo.capacity * overload })),
      },
      ground,
      levels,
      overload,
    );
  let low = 1;
  let high = 2;
  let group = eased(high);
  while (group === null && high < Number.MAX_SAFE_INTEGER) {
    low = high;
    high *= 2;
    group = eased(high);
  }
  if (group === null) throw new RangeError('pile group: expected finite loads and levels');
  while (high - low > overloadStep) {
    const middle = (low + high) / 2;
    const found = eased(middle);
    if (found === null) low = middle;
    else [high, group] = [middle, found];
  }
  return { group, overload: high };
}

/**
 * The group with the least effort in piles and cap: diameters and rows are tried in turn, under a wall also how far the cap
 * lies to the front; loads on the corner piles come
 * from V / n with the moments on the pile grid; the length in the bearing stratum is what the corner pile needs.
 * Null when no group carries the loads (the ground or the loads are outside the tool's range). `reach` multiplies the
 * longest piles.
 */
export function boredPiles(
  task: FootTask,
  ground: GroundFigures,
  levels: PileLevels,
  reach = 1,
): PileGroup | null {
  const { backfill } = task;
  if (backfill === null) return leastGroup(task, ground, levels, reach)?.group ?? null;
  let best = null as Group | null;
  for (const heelShare of substructureData.abutment.pileHeelShares) {
    const over = { ...task, backfill: { ...backfill, heelShare } };
    best = leastGroup(over, ground, levels, reach, best?.effort) ?? best;
  }
  return best?.group ?? null;
}

interface Group {
  readonly group: PileGroup;
  readonly effort: number;
}

/** The group with the least effort, below `least`: concrete of piles and cap, and a fixed amount for each pile, m3. */
function leastGroup(
  task: FootTask,
  ground: GroundFigures,
  levels: PileLevels,
  reach: number,
  least = Infinity,
): Group | null {
  const { piles } = substructureData;
  let best: PileGroup | null = null;
  const wall = task.backfill !== null;
  // What the group has to carry before its own weight: groups below it are not worked out.
  const stress = piles.concreteMPa * 1000;
  let leastLateral = 0;
  let leastVertical = 0;
  for (const combo of task.combos) {
    leastLateral = Math.max(
      leastLateral,
      Math.sqrt(combo.alongKN ** 2 + combo.acrossKN ** 2) / combo.capacity,
    );
    leastVertical = Math.max(leastVertical, combo.verticalKN / combo.capacity);
  }
  for (let k = 0; k < piles.diametersM.length; k++) {
    const diameterM = piles.diametersM[k]!;
    const lateralKN = piles.lateralKN[k]!;
    const spacing = piles.spacing * diameterM;
    const area = (Math.PI * diameterM * diameterM) / 4;
    for (let rowsAlong = 2; rowsAlong <= mostAlong; rowsAlong++) {
      for (let rowsAcross = 2; rowsAcross <= mostAcross; rowsAcross++) {
        const lengthM = Math.max(
          (rowsAlong - 1) * spacing + 2 * diameterM,
          task.shaftLengthM + diameterM / 2,
        );
        const widthM = Math.max(
          (rowsAcross - 1) * spacing + 2 * diameterM,
          task.shaftWidthM + (wall ? 0 : diameterM / 2),
        );
        const depthM = Math.max(piles.leastCapDepthM, piles.capDepthDiameters * diameterM);
        const capVolume = lengthM * widthM * depthM;
        const n = rowsAlong * rowsAcross;
        if (capVolume + n * (area * ground.socketDiameters * diameterM + piles.perPileM3) > least) break;
        if (wall && rowsAcross > 2 && widthM > task.shaftWidthM + 2 * diameterM) break;
        if (n * lateralKN < leastLateral || n * stress * area < leastVertical) continue;
        const undersideM = levels.capTopM - depthM;
        const startM = Math.min(levels.bearingLevelM, levels.scouredLevelM, undersideM);
        // Longer piles than these are out of the tool's range, or cost more than the best so far: no need to know how long.
        const mostM =
          overrun +
          Math.min(
            reach * piles.longestInStratumM,
            reach * piles.mostDiameters * diameterM - (undersideM - startM),
            ((least - capVolume) / n - piles.perPileM3) / area - (undersideM - startM),
          );
        trial.diameterM = diameterM;
        trial.lateralKN = lateralKN;
        trial.spacing = spacing;
        trial.rowsAlong = rowsAlong;
        trial.rowsAcross = rowsAcross;
        trial.lengthM = lengthM;
        trial.widthM = widthM;
        trial.depthM = depthM;
        trial.undersideM = undersideM;
        const need = stratumLength(task, ground, trial, mostM);
        if (need === null || need > reach * piles.longestInStratumM) continue;
        const toeLevelM = startM - need;
        const pileLength = undersideM - toeLevelM;
        if (pileLength > reach * piles.mostDiameters * diameterM) continue;
        const effort = capVolume + n * (pileLength * area + piles.perPileM3);
        if (effort < least) {
          least = effort;
          best = {
            rowsAlong,
            rowsAcross,
            diameterM,
            lengthM: pileLength,
            toeLevelM,
            cap: { lengthM, widthM, depthM },
          };
        }
      }
    }
  }
  return best === null ? null : { group: best, effort: least };
}

/** The group that is tried: one record for all, for there are hundreds under every support. */
const trial = {
  diameterM: 0,
  lateralKN: 0,
  spacing: 0,
  rowsAlong: 0,
  rowsAcross: 0,
  lengthM: 0,
  widthM: 0,
  depthM: 0,
  undersideM: 0,
};

const load = noForces();

/** Room for rounding, m, past which a pile is surely too long. */
const overrun = 1e-6;

/** Length in the bearing stratum that the worst pile of a trial group needs, m; null when the group fails or needs more than `mostM`. */
function stratumLength(
  task: FootTask,
  ground: GroundFigures,
  group: Readonly<typeof trial>,
  mostM: number,
): number | null {
  const { piles } = substructureData;
  const { diameterM: d, rowsAlong, rowsAcross, spacing, lengthM, widthM, depthM, undersideM } = group;
  const n = rowsAlong * rowsAcross;
  const area = (Math.PI * d * d) / 4;
  const perimeter = Math.PI * d;
  // Corner pile: M y / sum(y2) of a grid of r rows at spacing s is M * 6 / (n s (r + 1)).
  const perMomentAlong = 6 / (n * spacing * (rowsAlong + 1));
  const perMomentAcross = 6 / (n * spacing * (rowsAcross + 1));
  let inStratum = ground.socketDiameters * d;
  for (const combo of task.combos) {
    demandAt(task, combo, lengthM, widthM, depthM, undersideM, load);
    if (Math.sqrt(load.alongKN ** 2 + load.acrossKN ** 2) > n * group.lateralKN * combo.capacity) return null;
    const swing =
      Math.abs(load.momentAlongKNm) * perMomentAlong + Math.abs(load.momentAcrossKNm) * perMomentAcross;
    const most = (load.verticalKN / n + swing) / combo.capacity;
    const least = (load.verticalKN / n - swing) / combo.capacity;
    if (most > piles.concreteMPa * 1000 * area) return null;
    const forLoad = (most * piles.safety - ground.baseKPa * area) / (ground.shaftKPa * perimeter);
    const forUplift = (-least * piles.safety) / (piles.tensionShare * ground.shaftKPa * perimeter);
    inStratum = Math.max(inStratum, forLoad, forUplift);
    if (inStratum > mostM) return null;
  }
  return inStratum;
}
