import type { Design, UnitTask } from '../../model/index.ts';
import { depthBand } from '../../rules/index.ts';
import { checkUnitTask } from '../common/checkUnitTask.ts';
import { limiting } from '../common/checks.ts';
import { constantDepth } from '../common/depthAlong.ts';
import { obtuseOf } from '../common/obtuse.ts';
import { curveWarning } from '../common/curveWarning.ts';
import { withSkewEnds } from '../common/skewEnds.ts';
import { overLimit } from '../common/warnings.ts';
import type { FormModule } from '../formModule.ts';
import { boxChecks } from './boxChecks.ts';
import { boxElevation, boxSections } from './boxDrawing.ts';
import { boxFigures, boxReactions, ownWeightShare } from './boxReport.ts';
import { boxLines } from './boxLines.ts';
import { boxModel } from './boxModel.ts';
import { boxSkew } from './boxSkew.ts';
import { boxFaults, refuse } from './boxFaults.ts';
import { boxChoices, wideBoxVariants } from './boxVariants.ts';
import { heightUnder } from './heightUnder.ts';
import { sizeBox } from './sizeBox.ts';

/**
 * Prestressed concrete box of constant depth, cast in place on falsework or launched from one end: cells by the width of
 * the deck and by struts under its wings, draped bonded tendons. `depthM` of the task is soffit to top of slab. Simple or continuous spans of about 20
 * to 100 m, decks of 8 to 25 m.
 */
export const concreteBox: FormModule = {
  id: 'concrete-box',
  family: 'box',
  name: 'Concrete box',
  pattern: { kind: 'continuous' },
  methods: ['falsework', 'launch'],
  choices: boxChoices,
  faults: boxFaults,
  variants: (spansM, deck, method) =>
    wideBoxVariants(
      spansM,
      deck,
      method,
      depthBand('concrete-box', spansM.length > 1 ? 'continuous' : 'simple', method)[1],
    ),
  size: (task) => withSkewEnds(task, size),
};

/** @throws RangeError for spans, depth, widths or concrete that are not possible */
function size(task: UnitTask): Design {
  checkUnitTask(task);
  refuse(boxFaults(task));
  const model = boxModel(task);
  const box = sizeBox(model);
  const reactions = boxReactions(model, box);
  const skew = boxSkew(model, box);
  const checks = boxChecks(model, box, reactions, skew);
  const warnings = overLimit(checks, 'tendons and concrete');
  warnings.push(
    ...curveWarning(
      task,
      'webs and bearings are checked for the torque of the curve, but bending is that of a straight deck.',
    ),
  );
  if (task.method !== 'launch' && !heightUnder(task).known)
    warnings.push(
      `Height under the deck is not given: falsework is measured for a road ${heightUnder(task).assumedRoadM} m above ground.`,
    );
  return {
    task,
    depthM: { support: task.depthM, midspan: task.depthM },
    depthAlong: constantDepth(model.lengthM, task.depthM),
    elevation: boxElevation(model, box),
    sections: boxSections(model, box),
    reactions,
    ...obtuseOf(model.traffic.load),
    checks,
    limitingCheck: limiting(checks),
    ownWeightShare: ownWeightShare(model, box),
    lines: boxLines(model, box),
    heaviestPiece: null,
    warnings,
    figures: boxFigures(model, box, skew),
  };
}
