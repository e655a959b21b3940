import type { Check, Design, UnitTask } from '../../model/index.ts';
import { checkUnitTask } from '../common/checkUnitTask.ts';
import { limiting } from '../common/checks.ts';
import { constantDepth } from '../common/depthAlong.ts';
import { overLimit } from '../common/warnings.ts';
import type { FormModule } from '../formModule.ts';
import { rankedChoices, type RankedChoice } from './chooseBeams.ts';
import { heaviestBeam, precastChecks } from './precastChecks.ts';
import { precastElevation, precastSections, structuralDepthM } from './precastDrawing.ts';
import { precastLines } from './precastLines.ts';
import { precastModel, type PrecastModel } from './precastModel.ts';
import { ownWeightShare, precastFigures, precastReactions } from './precastReport.ts';
import { sizeBeams, type SizedBeams } from './sizeBeams.ts';

/**
 * Precast pretensioned I and bulb-tee beams in one piece under a slab cast in place: each span carries its own weight and
 * the wet slab by itself, the deck is continuous for traffic. `depthM` of the task is soffit to top of slab: the deepest
 * beam of the market that fits under slab and fill is taken, so that a deck may come out shallower than asked, and never
 * deeper unless the shallowest beam is. Spans of about 9 to 50 m, decks of 6 to 30 m.
 */
export const precastI: FormModule = {
  id: 'precast-i',
  family: 'girder',
  name: 'Precast I-beams',
  pattern: { kind: 'continuous' },
  methods: ['crane'],
  size,
};

interface Tried {
  readonly model: PrecastModel;
  readonly beams: SizedBeams;
  readonly checks: readonly Check[];
  readonly worst: Check;
}

/** @throws RangeError for spans, depth or beam counts that are not possible */
function size(task: UnitTask): Design {
  checkUnitTask(task);
  const { model, beams, checks, worst } = cheapestThatHolds(task);
  const lines = precastLines(model, beams);
  const depthM = structuralDepthM(model);
  return {
    task,
    depthM: { support: depthM, midspan: depthM },
    depthAlong: constantDepth(model.lengthM, depthM),
    elevation: precastElevation(model, beams),
    sections: precastSections(model),
    reactions: precastReactions(model),
    checks,
    limitingCheck: worst,
    ownWeightShare: ownWeightShare(model),
    lines,
    heaviestPiece: heaviestBeam(model),
    warnings: overLimit(checks, 'beams and strands'),
    figures: precastFigures(model, beams, lines),
  };
}

/**
 * The cheapest choice by its estimate, where it holds. Else the closest beams: where even they do not hold the better of
 * the two is given, otherwise the choices between are tried from the cheapest on.
 */
function cheapestThatHolds(task: UnitTask): Tried {
  const ranked = rankedChoices(task);
  const first = tried(task, ranked[0]!);
  if (first.worst.utilisation <= 1 || ranked.length === 1) return first;
  const closest = ranked.reduce((most, next) => (strength(next) > strength(most) ? next : most));
  const last = closest === ranked[0] ? first : tried(task, closest);
  if (!(last.worst.utilisation <= 1)) return last.worst.utilisation < first.worst.utilisation ? last : first;
  for (const choice of ranked.slice(1)) {
    if (choice === closest) return last;
    const next = tried(task, choice);
    if (next.worst.utilisation <= 1) return next;
  }
  return last;
}

/** Orders choices by what they can carry: number of beams times the modulus of their soffit. */
function strength({ layout, shape }: RankedChoice): number {
  return (layout.count * shape.inertiaM4) / shape.centroidM;
}

function tried(task: UnitTask, choice: RankedChoice): Tried {
  const model = precastModel(task, choice);
  const beams = sizeBeams(model);
  const checks = precastChecks(model, beams);
  return { model, beams, checks, worst: limiting(checks) };
}
