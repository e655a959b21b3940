import type { Design, UnitTask } from '../../model/index.ts';
import { checkUnitTask } from '../common/checkUnitTask.ts';
import { limiting } from '../common/checks.ts';
import { constantDepth } from '../common/depthAlong.ts';
import { obtuseOf } from '../common/obtuse.ts';
import { curveWarning } from '../common/curveWarning.ts';
import { overLimit } from '../common/warnings.ts';
import { heightUnder } from '../concrete-box/heightUnder.ts';
import type { FormModule } from '../formModule.ts';
import { leastDepthM } from './optionalDepth.ts';
import { sizeSlab } from './sizeSlab.ts';
import { slabChecks } from './slabChecks.ts';
import { slabElevation, slabSectionCuts } from './slabDrawing.ts';
import { slabLines } from './slabLines.ts';
import { slabModel } from './slabModel.ts';
import { ownWeightShare, slabFigures, slabReactions } from './slabReport.ts';

/**
 * Slab bridge of constant depth cast on falsework: reinforced on short spans, prestressed along the road beyond, with
 * round voids where it is deep. `depthM` of the task is the whole slab. Simple or continuous spans of about 5 to 41 m.
 */
export const slab: FormModule = {
  id: 'slab',
  family: 'slab',
  name: 'Slab',
  pattern: { kind: 'continuous' },
  methods: ['falsework'],
  leastDepthM,
  size,
};

/** @throws RangeError for spans, depth or widths that are not possible */
function size(task: UnitTask): Design {
  checkUnitTask(task);
  const model = slabModel(task);
  const sized = sizeSlab(model);
  const checks = slabChecks(model, sized);
  const warnings = overLimit(checks, model.prestressed ? 'tendons and bars' : 'bars');
  warnings.push(...curveWarning(task, 'all its figures are those of a straight deck.'));
  if (!heightUnder(task).known)
    warnings.push(
      `Height under the deck is not given: falsework is measured for a road ${heightUnder(task).assumedRoadM} m above ground.`,
    );
  return {
    task,
    depthM: { support: task.depthM, midspan: task.depthM },
    depthAlong: constantDepth(model.lengthM, task.depthM),
    elevation: slabElevation(model, sized),
    sections: slabSectionCuts(model, sized),
    reactions: slabReactions(model),
    ...obtuseOf(model.traffic),
    checks,
    limitingCheck: limiting(checks),
    ownWeightShare: ownWeightShare(model),
    lines: slabLines(model, sized),
    heaviestPiece: null,
    warnings,
    figures: slabFigures(model, sized),
  };
}
