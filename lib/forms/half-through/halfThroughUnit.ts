import type { UnitTask } from '../../model/index.ts';
import { windowOf } from '../../rules/index.ts';
import { cosineOfSkew } from '../../site/skew.ts';
import { sizeFloor, type Floor } from '../floor/sizeFloor.ts';
import { edgeCase, type EdgeCase } from './edgeCase.ts';
import { edgeStatics, type EdgeStatics } from './edgeStatics.ts';
import { edgeUse, worstUse, type EdgeUse } from './edgeUse.ts';
import { halfThroughData } from './halfThroughData.ts';
import { edgeStiffness, sizeEdgeGirder, type EdgeChoice, type EdgeGirder } from './sizeEdgeGirder.ts';

/** A sized half-through unit: two equal girders and the floor between them. */
export interface HalfThroughUnit {
  readonly case: EdgeCase;
  readonly statics: EdgeStatics;
  readonly girder: EdgeGirder;
  readonly use: EdgeUse;
  readonly floor: Floor;
  readonly panels: readonly number[];
  /** All structural steel, kg. */
  readonly steelKg: number;
}

interface Trial {
  readonly girder: EdgeGirder;
  readonly steelKg: number;
  /** Steel, made dear where a limit is passed. */
  readonly rank: number;
}

/**
 * Unit of least steel: cross-girder spacings, heights of the edge girders over the published band, posts from light to
 * heavy, one choice after another on a girder of constant stiffness; the result is then brought into agreement with its
 * own stiffness.
 */
export function halfThroughUnit(task: UnitTask): HalfThroughUnit {
  const c = edgeCase(task);
  const first = edgeStatics(c);
  const heights = heightsFor(c);
  const posts = halfThroughData.posts.sections;
  let best: Trial | undefined;
  const consider = (choice: EdgeChoice): boolean => {
    const girder = sizeEdgeGirder(c, first, choice, best ? { passes: 1, like: best.girder } : { passes: 2 });
    const use = worstUse(edgeUse(c, first, girder));
    const steelKg = steelOf(girder);
    const rank = steelKg * (use > 1 ? 10 * use : 1);
    if (best && !(rank < best.rank)) return false;
    best = { girder, steelKg, rank };
    return true;
  };
  const frameKNm = frameMoment(c, first);
  for (const spacing of halfThroughData.crossSpacingM.tried) {
    const panels = task.spansM.map((spanM) => Math.max(1, Math.ceil(spanM / spacing - 1e-9)));
    const crossSpacingM = Math.max(...task.spansM.map((spanM, i) => spanM / panels[i]!));
    const floor = sizeFloor({
      standard: task.standard,
      deck: task.deck,
      planesM: c.planesM,
      crossSpacingM,
      depthM: task.depthM,
      stringers: false,
      frameKNm: frameKNm / cosineOfSkew(task.skewDeg ?? null),
      ...(task.skewDeg === undefined ? {} : { skewDeg: task.skewDeg }),
    });
    const post = posts[Math.floor(posts.length / 2)]!;
    for (const heightM of best ? [best.girder.choice.heightM] : heights)
      consider({ heightM, post, floor, panels });
  }
  const { choice } = best!.girder;
  const middle = posts.indexOf(choice.post);
  for (const step of [-1, 1])
    for (let i = middle + step; posts[i] && consider({ ...choice, post: posts[i]! }); i += step);
  // Light posts may favour another height than the middle one they were tried at.
  const chosen = best!.girder.choice;
  const at = heights.indexOf(chosen.heightM);
  for (const heightM of [heights[at - 1], heights[at + 1]])
    if (heightM !== undefined) consider({ ...chosen, heightM });

  let girder = best!.girder;
  // The moments of a simple span do not know its stiffness.
  const statics = task.spansM.length > 1 ? edgeStatics(c, edgeStiffness(girder)) : first;
  girder = sizeEdgeGirder(c, statics, girder.choice);
  let use = edgeUse(c, statics, girder);
  if (worstUse(use) > 1) {
    girder = sizeEdgeGirder(c, statics, girder.choice, { earlier: girder });
    use = edgeUse(c, statics, girder);
  }
  const { floor, panels } = girder.choice;
  return { case: c, statics, girder, use, floor, panels, steelKg: steelOf(girder) };
}

/** Both girders, all cross-girders and what the end frames add, kg. */
function steelOf(girder: EdgeGirder): number {
  const { platesKg, postsKg, bearingKg, detailKg, endCrossKg, choice } = girder;
  const crossGirders = choice.panels.reduce((sum, n) => sum + n, 1);
  const crossKg = crossGirders * choice.floor.crossGirder.massKgPerM * choice.floor.crossM;
  return 2 * (platesKg + postsKg + bearingKg + detailKg) + endCrossKg + crossKg;
}

/** Girder heights tried, m: over the published band of the longest span, but always above the road. */
function heightsFor(c: EdgeCase): number[] {
  const band = windowOf('half-through', 'edgeGirderRatio', ['in favour']);
  if (!band) throw new RangeError('no band of edge girder depth in the rules of half-through');
  const spanM = Math.max(...c.task.spansM);
  const least = c.task.depthM + halfThroughData.upstandM.value;
  const { tried } = halfThroughData.heights;
  const heights = Array.from({ length: tried }, (_, i) =>
    Math.max(least, (band[0] + ((band[1] - band[0]) * i) / (tried - 1)) * spanM),
  );
  return heights.filter((heightM, i) => i === 0 || heightM > heights[i - 1]! + 1e-9);
}

/**
 * Moment of a frame about its cross-girder before the frames are known, kNm: the flange force M / h over `long`, a fifth
 * more for the nearness of buckling, on the lever h.
 */
function frameMoment(c: EdgeCase, statics: EdgeStatics): number {
  const { uls } = c.standard.factors;
  // Slab, steel and kerb of a half deck weigh about twice its superimposed load.
  const permanent = 3 * uls.permanent * c.superimposedKNm;
  const most = statics.unit.momentKNm.reduce(
    (worst, m, i) => Math.max(worst, permanent * m + uls.traffic * statics.traffic.momentMaxKNm[i]!),
    0,
  );
  return (1.2 * most) / halfThroughData.imperfection.long;
}
