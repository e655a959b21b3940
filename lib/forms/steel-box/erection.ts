import type { UnitTask } from '../../model/index.ts';
import { launchStages, pointLoads, type Effects, type LineBeam } from '../../mechanics/index.ts';
import { steelBoxData } from './steelBoxData.ts';
import type { SteelBoxModel } from './steelBoxModel.ts';

/** Design moments of the steel while it is built, kNm at the stations, and the greatest reaction of a launching line, kN. */
export interface ErectionMoments {
  /** 0 or more. */
  readonly stageSagKNm: Float64Array;
  /** 0 or less. */
  readonly stageHogKNm: Float64Array;
  /** 0 unless launched. */
  readonly launchKN: number;
}

/**
 * Spans whose middle is closed by cantilevers from both sides: the longest inner ones where the box is built that way.
 * Shorter ones are put together on towers before and hold the arms down.
 */
export function cantileveredSpans({
  task,
}: {
  readonly task: Pick<UnitTask, 'method' | 'spansM'>;
}): number[] {
  const { method, spansM } = task;
  if (method !== 'balanced-cantilever') return [];
  const least = steelBoxData.cantilever.leastOverLongest * Math.max(...spansM);
  return spansM.flatMap((span, i) => (i > 0 && i < spansM.length - 1 && span >= least - 1e-9 ? [i] : []));
}

/**
 * Cantilevers with their derricks on the beam they leave behind, or the deck pushed out with its nose.
 * @param staged beam that carries the own weight, with hinges at `hingesM`
 */
export function erection(
  model: SteelBoxModel,
  staged: LineBeam,
  own: Effects,
  ownKNm: Float64Array,
  hingesM: readonly number[],
): ErectionMoments {
  const n = model.xM.length;
  const stageSagKNm = new Float64Array(n);
  const stageHogKNm = new Float64Array(n);
  const { uls } = model.standard.factors;
  if (model.task.method === 'launch') {
    const shares = launchShares(model.task.spansM);
    const longest = Math.max(...model.task.spansM);
    const weight = uls.permanent * Math.max(...ownKNm);
    stageSagKNm.fill(shares.sag * weight * longest ** 2);
    stageHogKNm.fill(shares.hog * weight * longest ** 2);
    return { stageSagKNm, stageHogKNm, launchKN: shares.reaction * weight * longest };
  }
  const { craneKN } = steelBoxData.cantilever;
  // What is put together on towers hangs out over nothing.
  const imbalance = hingesM.length > 0 ? steelBoxData.cantilever.imbalance : 0;
  // A derrick on the tip of each of the two arms that meet.
  const cranes =
    hingesM.length > 0
      ? pointLoads(
          staged,
          hingesM.map((xM) => ({ xM, loadKN: 2 * craneKN })),
        )
      : null;
  for (let i = 0; i < n; i++) {
    const moment =
      uls.permanent * ((1 + imbalance) * own.momentKNm[i]! + (cranes === null ? 0 : cranes.momentKNm[i]!));
    stageSagKNm[i] = Math.max(0, moment);
    stageHogKNm[i] = Math.min(0, moment);
  }
  return { stageSagKNm, stageHogKNm, launchKN: 0 };
}

interface LaunchShares {
  readonly sag: number;
  readonly hog: number;
  readonly reaction: number;
}

const launches = new Map<string, LaunchShares>();

/** Moments over w L2 and reaction over w L of the longest span while it is crossed; they depend on proportions alone. */
function launchShares(spansM: readonly number[]): LaunchShares {
  const longest = Math.max(...spansM);
  const at = spansM.indexOf(longest);
  const some = spansM.slice(Math.max(0, at - 2), at + 2).map((span) => span / longest);
  const key = some.map((span) => span.toFixed(4)).join();
  const known = launches.get(key);
  if (known) return known;
  const { noseOverSpan, noseOverDeckWeight, noseStiffness, yardOverSpan } = steelBoxData.launch;
  const { sagKNm, hogKNm, reactionKN } = launchStages({
    spansM: some,
    weightKNm: 1,
    noseM: noseOverSpan,
    noseKNm: noseOverDeckWeight,
    noseStiffness,
    yardSpansM: [yardOverSpan, yardOverSpan],
    steps: 5,
  });
  const made = { sag: sagKNm, hog: hogKNm, reaction: reactionKN };
  if (launches.size >= 64) launches.clear();
  launches.set(key, made);
  return made;
}
