import type { UnitTask } from '../../model/index.ts';
import { carries } from '../common/carries.ts';
import { limiting } from '../common/checks.ts';
import type { Check } from '../../model/index.ts';
import { sizeSteelBox, type SizedSteelBox } from './sizeSteelBox.ts';
import { steelBoxChecks } from './steelBoxChecks.ts';
import { steelBoxData } from './steelBoxData.ts';
import { steelBoxModel } from './steelBoxModel.ts';

/** A box sized with one depth over its piers, and its limit states. */
export interface SteelBoxDeck {
  readonly box: SizedSteelBox;
  readonly checks: readonly Check[];
}

/** Depths over the piers that are tried where there may be a haunch, deeper than in the spans: the one asked for, or published ones. */
function haunches(task: UnitTask): number[] {
  const { pierOverSpan, leastDeeper } = steelBoxData.haunch;
  // A soffit that is pushed over its piers is straight.
  if (task.spansM.length === 1 || task.method === 'launch') return [];
  if (task.haunch) return [task.haunch.pierDepthM];
  const governing = Math.max(...task.spansM);
  return pierOverSpan
    .map((ratio) => ratio * governing)
    .filter((depth) => depth > (1 + leastDeeper) * task.depthM);
}

interface Trial {
  readonly deck: SteelBoxDeck;
  readonly kg: number;
  readonly use: number;
}

/**
 * The box with the least steel among those that hold; where none holds the one that comes nearest. Tried are the depth of
 * the spans throughout, with leaning webs and, where those do not do and there is no haunch, with upright ones, and the
 * published depths at the piers or the one asked for.
 */
export function choosePierDepth(task: UnitTask): SteelBoxDeck {
  const deeper = haunches(task);
  const governing = Math.max(...task.spansM);
  let best: Trial | null = null;
  // A shallow box of one depth is out of the question where there may be a haunch.
  if (
    deeper.length === 0 ||
    (!task.haunch && task.depthM >= steelBoxData.haunch.constantOverSpan * governing)
  ) {
    best = trialOf(task, task.depthM, false, null);
    if (deeper.length === 0 && !carries(best.use)) best = least(best, trialOf(task, task.depthM, true, null));
  }
  for (const depthM of deeper) {
    const trial = trialOf(task, depthM, true, best);
    const found: Trial = best === null ? trial : least(best, trial);
    // Steel has one least place: once it rises a deeper pier is no better.
    if (found === best) break;
    best = found;
  }
  return best!.deck;
}

function trialOf(task: UnitTask, pierDepthM: number, upright: boolean, before: Trial | null): Trial {
  const box = sizeSteelBox(steelBoxModel(task, pierDepthM, upright), before?.deck.box ?? null);
  const checks = steelBoxChecks(box);
  return { deck: { box, checks }, kg: box.steel.totalKg, use: limiting(checks).utilisation };
}

/** The better of two, the first where they are equal. */
function least(one: Trial, other: Trial): Trial {
  const holds = carries(other.use);
  if (holds !== carries(one.use)) return holds ? other : one;
  return (holds ? other.kg < one.kg : other.use < one.use) ? other : one;
}
