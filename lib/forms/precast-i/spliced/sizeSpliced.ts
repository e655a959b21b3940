import type { Check, Design, UnitTask } from '../../../model/index.ts';
import { limiting } from '../../common/checks.ts';
import { constantDepth } from '../../common/depthAlong.ts';
import type { BeamChoice } from '../../common/precast/beamChoice.ts';
import { heaviestBeam } from '../../common/precast/precastChecks.ts';
import { precastElevation, precastSections, structuralDepthM } from '../../common/precast/precastDrawing.ts';
import { pretensioned } from '../../common/precast/pretensioned.ts';
import { obtuseOf } from '../../common/obtuse.ts';
import { overLimit } from '../../common/warnings.ts';
import { heightUnder } from '../../concrete-box/heightUnder.ts';
import { rankedChoices } from '../chooseBeams.ts';
import { splicedBeams } from '../beamShapes.ts';
import type { SizedSpliced } from './sizedSpliced.ts';
import { sizeTendons } from './sizeTendons.ts';
import { splicedChecks } from './splicedChecks.ts';
import { spliceCount, splicedLines } from './splicedLines.ts';
import { splicedModel, type SplicedModel } from './splicedModel.ts';
import { splicedPier } from './splicedPiers.ts';
import { splicedFigures, splicedReactions, splicedShapes, tendonStages } from './splicedReport.ts';
import { splicedShears } from './splicedShear.ts';

interface Tried {
  readonly model: SplicedModel;
  readonly all: SizedSpliced;
  readonly checks: readonly Check[];
  readonly worst: Check;
}

/**
 * Sizes beams that are too long or heavy for the road in one piece: hauled in pieces, spliced on towers, post-tensioned along
 * the unit, some of the tendons on the bare beams and the rest once the slab is on them. The unit is continuous for all but
 * the weight of the pieces on their towers, which comes on the continuous beam when the towers go. Spans of about 40 to 75 m,
 * constant depth. Creep between the stages is not followed.
 * @throws RangeError for spans, depth or beam counts that are not possible
 */
export function sizeSpliced(task: UnitTask): Design {
  const { model, all, checks, worst } = cheapestThatHolds(task);
  const depthM = structuralDepthM(model);
  const lines = splicedLines(model, all);
  const { beam, most, superimposed } = model;
  const longest = task.spansM.indexOf(Math.max(...task.spansM));
  const middle = Math.round((beam.supportAt[longest]! + beam.supportAt[longest + 1]!) / 2);
  const own = model.ownKNmAt[middle]! + model.wetKNmAt[middle]!;
  const warnings = overLimit(checks, 'beams and tendons');
  if (!heightUnder(task).known)
    warnings.push('Height under the deck unknown: towers under the splices taken at a usual height.');
  return {
    task,
    depthM: { support: depthM, midspan: depthM },
    depthAlong: constantDepth(model.lengthM, depthM),
    elevation: [
      ...precastElevation(
        model,
        task.spansM.map(() => ({ midM: all.sized.straight.zM, endM: all.sized.straight.zM })),
      ),
      ...splicedShapes(model, all),
    ],
    sections: precastSections(model, []),
    reactions: splicedReactions(model, all),
    ...obtuseOf(model.traffic),
    checks,
    limitingCheck: worst,
    ownWeightShare: own / (own + superimposed.momentKNm[middle]! + most.momentMaxKNm[middle]!),
    lines,
    heaviestPiece: heaviestBeam(model),
    warnings,
    staging: { splices: spliceCount(model), stages: tendonStages },
    figures: splicedFigures(model, all, lines),
  };
}

/** The cheapest number of beams that holds; where even the most beams do not hold, the better of the two. */
function cheapestThatHolds(task: UnitTask): Tried {
  const ranked = rankedChoices(task, splicedBeams);
  const first = tried(task, ranked[0]!);
  if (first.worst.utilisation <= 1 || ranked.length === 1) return first;
  const strongest = ranked.reduce((most, next) => (next.layout.count > most.layout.count ? next : most));
  const last = strongest === ranked[0] ? first : tried(task, strongest);
  if (!(last.worst.utilisation <= 1)) return last.worst.utilisation < first.worst.utilisation ? last : first;
  for (const choice of ranked.slice(1)) {
    if (choice === strongest) return last;
    const next = tried(task, choice);
    if (next.worst.utilisation <= 1) return next;
  }
  return last;
}

function tried(task: UnitTask, choice: BeamChoice): Tried {
  const model = splicedModel(task, choice);
  const sized = sizeTendons(model);
  const all: SizedSpliced = {
    sized,
    shears: splicedShears(model, sized),
    piers: task.spansM.slice(1).map((_, i) => splicedPier(model, sized, i + 1)),
  };
  const checks = splicedChecks(model, all);
  return { model, all, checks, worst: limiting(checks) };
}

/** True where a unit has to be spliced: a span longer than what the road takes in one piece. */
export function mustBeSpliced({ spansM }: Pick<UnitTask, 'spansM'>): boolean {
  return Math.max(...spansM) > pretensioned.haul.lengthM;
}
