import type { Check, Design, MeasuredLine, Shape, UnitTask } from '../../../model/index.ts';
import { checkUnitTask } from '../checkUnitTask.ts';
import { limiting } from '../checks.ts';
import { constantDepth } from '../depthAlong.ts';
import { obtuseOf } from '../obtuse.ts';
import { overLimit } from '../warnings.ts';
import type { BeamChoice } from './beamChoice.ts';
import { heaviestBeam, precastChecks } from './precastChecks.ts';
import { precastElevation, precastSections, structuralDepthM } from './precastDrawing.ts';
import { precastLines } from './precastLines.ts';
import { precastModel, type PrecastModel } from './precastModel.ts';
import type { PrecastKind } from './precastKind.ts';
import { ownWeightShare, precastFigures, precastReactions } from './precastReport.ts';
import { sizeBeams, type SizedBeams } from './sizeBeams.ts';

/** A form of pretensioned beams under a slab: its choices, cheapest first, and what it has beside beams, slab and cross-walls. */
export interface PrecastForm extends PrecastKind {
  readonly choices: (task: UnitTask) => readonly BeamChoice[];
  /** Formwork of the slab, m2. */
  readonly formworkM2: (model: PrecastModel) => number;
  readonly extraChecks?: (model: PrecastModel, beams: SizedBeams) => Check[];
  readonly extraLines?: (model: PrecastModel, beams: SizedBeams) => MeasuredLine[];
  readonly extraFigures?: (model: PrecastModel, beams: SizedBeams) => Record<string, number>;
  /** Shapes of a cross-section beside beams, fill and slab. */
  readonly extraShapes?: (model: PrecastModel) => Shape[];
}

interface Tried {
  readonly model: PrecastModel;
  readonly beams: SizedBeams;
  readonly checks: readonly Check[];
  readonly worst: Check;
}

/**
 * Sizes one unit of precast beams. Each span carries its own weight and the wet slab by itself, the deck is continuous for
 * traffic; the depth asked for is soffit to top of slab and bounds the beam from above.
 * @throws RangeError for spans, depth or beam counts that are not possible
 */
export function sizePrecast(form: PrecastForm, task: UnitTask): Design {
  checkUnitTask(task);
  const { model, beams, checks, worst } = cheapestThatHolds(form, task);
  const lines = [
    ...precastLines(model, beams, form.formworkM2(model)),
    ...(form.extraLines?.(model, beams) ?? []),
  ];
  const depthM = structuralDepthM(model);
  return {
    task,
    depthM: { support: depthM, midspan: depthM },
    depthAlong: constantDepth(model.lengthM, depthM),
    elevation: precastElevation(
      model,
      beams.strands.map(({ plan }) => plan),
    ),
    sections: precastSections(model, form.extraShapes?.(model) ?? []),
    reactions: precastReactions(model),
    ...obtuseOf(model.traffic),
    checks,
    limitingCheck: worst,
    ownWeightShare: ownWeightShare(model),
    lines,
    heaviestPiece: heaviestBeam(model),
    warnings: overLimit(checks, 'beams and strands'),
    figures: { ...precastFigures(model, beams, lines), ...form.extraFigures?.(model, beams) },
  };
}

/**
 * The cheapest choice by its estimate, where it holds. Else the closest beams: where even they do not hold the better of
 * the two is given, otherwise the choices between are tried from the cheapest on.
 */
function cheapestThatHolds(form: PrecastForm, task: UnitTask): Tried {
  const ranked = form.choices(task);
  const first = tried(form, task, ranked[0]!);
  if (first.worst.utilisation <= 1 || ranked.length === 1) return first;
  const closest = ranked.reduce((most, next) => (strength(next) > strength(most) ? next : most));
  const last = closest === ranked[0] ? first : tried(form, task, closest);
  if (!(last.worst.utilisation <= 1)) return last.worst.utilisation < first.worst.utilisation ? last : first;
  for (const choice of ranked.slice(1)) {
    if (choice === closest) return last;
    const next = tried(form, task, choice);
    if (next.worst.utilisation <= 1) return next;
  }
  return last;
}

/** Orders choices by what they can carry: number of beams times the modulus of their soffit. */
function strength({ layout, shape }: BeamChoice): number {
  return (layout.count * shape.inertiaM4) / shape.centroidM;
}

function tried(form: PrecastForm, task: UnitTask, choice: BeamChoice): Tried {
  const model = precastModel(form, task, choice);
  const beams = sizeBeams(model);
  const checks = [...precastChecks(model, beams), ...(form.extraChecks?.(model, beams) ?? [])];
  return { model, beams, checks, worst: limiting(checks) };
}
