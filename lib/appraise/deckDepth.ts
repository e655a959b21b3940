import { formModule } from '../forms/index.ts';
import type { UnitTask } from '../model/index.ts';
import { depthRange } from './depthRange.ts';
import { depthThatCarries, type DepthFound } from './depthThatCarries.ts';
import type { Work } from './work.ts';

/** A unit whose depth is open. */
export interface OpenDepth {
  readonly task: Omit<UnitTask, 'depthM'>;
  /** Depth over piers / depth at midspan; 1 for constant depth. */
  readonly haunch: number;
}

/** The task at a midspan depth, m, deeper over the piers where that was asked for. */
export function taskAt({ task, haunch }: OpenDepth, midspanM: number): UnitTask {
  return {
    ...task,
    depthM: midspanM,
    ...(haunch > 1 ? { haunch: { pierDepthM: haunch * midspanM, law: 'parabolic' as const } } : {}),
  };
}

/** Published band of its depth, m. */
export function bandOf({ task }: OpenDepth): readonly [least: number, most: number] {
  return depthRange(task.form, task.method, task.spansM, task);
}

/**
 * The depth of a unit that knows no crossing: that of least cost of the deck alone in the published band, beyond it where none
 * inside carries.
 *
 * @param mean money per unit of each item
 * @param near depth to begin with, m
 */
export function deckDepth(
  open: OpenDepth,
  mean: Readonly<Record<string, number>>,
  near?: number,
): Work<DepthFound> {
  const form = formModule(open.task.form);
  return depthThatCarries(
    bandOf(open),
    (depthM) => {
      const { lines, limitingCheck } = form.size(taskAt(open, depthM));
      const cost = lines.reduce((sum, line) => sum + line.quantity * mean[line.item]!, 0);
      return { cost, utilisation: limitingCheck.utilisation };
    },
    near,
  );
}
