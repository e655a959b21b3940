import type { Design, Problem, UnitTask } from '../../model/index.ts';
import { midspanDepthBand } from '../../rules/index.ts';
import { checkUnitTask } from '../common/checkUnitTask.ts';
import { limiting } from '../common/checks.ts';
import { curveWarning } from '../common/curveWarning.ts';
import { withSkewEnds } from '../common/skewEnds.ts';
import { overLimit } from '../common/warnings.ts';
import { boxFaults, refuse } from '../concrete-box/boxFaults.ts';
import { boxChoices, wideBoxVariants } from '../concrete-box/boxVariants.ts';
import { heightUnder } from '../concrete-box/heightUnder.ts';
import type { FormModule } from '../formModule.ts';
import { castInFaults } from './castInPiers.ts';
import { choosePierDepth } from './choosePierDepth.ts';
import { haunchedReactions } from './haunchedBearings.ts';
import { haunchedCuts, haunchedDepth, haunchedElevation } from './haunchedDrawing.ts';
import { haunchedLines } from './haunchedLines.ts';
import { haunchedCastIn, haunchedFigures, haunchedOwnShare } from './haunchedReport.ts';
import { haunchedWarnings } from './haunchedWarnings.ts';

/**
 * Prestressed concrete box with a curved soffit, cast in place by cantilevering from its piers segment by segment.
 * `depthM` of the task is the depth at midspan; that over the piers is found inside its published band. Continuous units
 * of two spans or more, main spans of about 50 to 250 m; a single span has no pier to balance on and is refused by its
 * first check.
 */
export const cantileverBox: FormModule = {
  id: 'cantilever-box',
  family: 'box',
  name: 'Cantilevered concrete box',
  pattern: { kind: 'continuous' },
  // Concrete all the way, or lighter approaches: on soft ground the weight of a deck is paid for once more below it.
  alsoPatterns: [
    { kind: 'flanked', approach: 'concrete-box', side: [0.55, 0.7] },
    { kind: 'flanked', approach: 'composite-i', side: [0.55, 0.7] },
  ],
  methods: ['balanced-cantilever'],
  choices: [...boxChoices, 'castInPiers'],
  faults,
  variants: (spansM, deck, method) =>
    wideBoxVariants(spansM, deck, method, midspanDepthBand('cantilever-box')![1]),
  size: (task) => withSkewEnds(task, size),
};

function faults(task: Omit<UnitTask, 'depthM'>): Problem[] {
  return [...boxFaults(task), ...castInFaults(task)];
}

/** @throws RangeError for spans, depth, widths or concrete that are not possible */
function size(task: UnitTask): Design {
  checkUnitTask(task);
  refuse(faults(task));
  const { model, box, checks } = choosePierDepth(task);
  const reactions = haunchedReactions(model, box);
  const castIn = haunchedCastIn(model, box);
  const warnings = [...overLimit(checks, 'tendons and concrete'), ...haunchedWarnings(model, box)];
  warnings.push(
    ...curveWarning(
      task,
      'webs and bearings are checked for the torque of the curve, but bending is that of a straight deck.',
    ),
  );
  if (!heightUnder(task).known)
    warnings.push(
      `Height under the deck is not given: falsework is measured for a road ${heightUnder(task).assumedRoadM} m above ground.`,
    );
  return {
    task,
    depthM: { support: model.pierDepthM, midspan: task.depthM },
    depthAlong: haunchedDepth(model),
    elevation: haunchedElevation(model, box),
    sections: haunchedCuts(model, box),
    reactions,
    ...(castIn.length > 0 ? { castIn } : {}),
    checks,
    limitingCheck: limiting(checks),
    ownWeightShare: haunchedOwnShare(model, box),
    lines: haunchedLines(model, box),
    heaviestPiece: null,
    warnings,
    figures: haunchedFigures(model, box),
  };
}
