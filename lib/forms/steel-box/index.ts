import type { Design, UnitTask } from '../../model/index.ts';
import { checkUnitTask } from '../common/checkUnitTask.ts';
import { limiting } from '../common/checks.ts';
import { evenTowers } from '../common/evenTowers.ts';
import { withSkewEnds } from '../common/skewEnds.ts';
import { overLimit } from '../common/warnings.ts';
import type { FormModule } from '../formModule.ts';
import { choosePierDepth } from './choosePierDepth.ts';
import { steelBoxDepth, steelBoxElevation, steelBoxSections } from './steelBoxDrawing.ts';
import { steelBoxLines, towersInSpans } from './steelBoxLines.ts';
import {
  steelBoxFigures,
  steelBoxOwnShare,
  steelBoxPiece,
  steelBoxReactions,
  steelBoxWarnings,
} from './steelBoxReport.ts';

/**
 * Steel box girders with an orthotropic deck: one cell, or more on wide decks, of constant depth or haunched. `depthM` of
 * the task is the depth at midspan, deck plate to soffit; that over the piers is found inside its published band, and is
 * the same where the box is launched. Set by crane it is put together on towers. Simple or continuous spans of about 60 to 300 m.
 */
export const steelBox: FormModule = {
  id: 'steel-box',
  family: 'box',
  name: 'Steel box girder',
  pattern: { kind: 'continuous' },
  alsoPatterns: [{ kind: 'flanked', approach: 'composite-i', side: [0.6, 0.8] }],
  methods: ['balanced-cantilever', 'launch', 'crane'],
  reads: ['haunch'],
  choices: ['squareEnds'],
  temporaryTowersM(task) {
    const towers = towersInSpans(task);
    return evenTowers(task.spansM, (_, span) => towers[span]!);
  },
  size: (task) => withSkewEnds(task, size),
};

/**
 * @throws RangeError for spans, depth or widths that are not possible, a deck plate that is not above 0, or a haunch
 * shallower than its spans
 */
function size(task: UnitTask): Design {
  checkUnitTask(task);
  if (task.deckPlateM !== undefined && !(task.deckPlateM > 0))
    throw new RangeError(`deckPlateM: expected more than 0 m, received ${task.deckPlateM}`);
  if (task.haunch && !(task.haunch.pierDepthM >= task.depthM))
    throw new RangeError(
      `haunch.pierDepthM: expected at least the depth at midspan ${task.depthM} m, received ${task.haunch.pierDepthM}`,
    );
  const { box, checks } = choosePierDepth(task);
  const { model } = box;
  const reactions = steelBoxReactions(box);
  return {
    task,
    depthM: { support: model.pierDepthM, midspan: task.depthM },
    depthAlong: steelBoxDepth(model),
    elevation: steelBoxElevation(box),
    sections: steelBoxSections(box),
    reactions,
    checks,
    limitingCheck: limiting(checks),
    ownWeightShare: steelBoxOwnShare(box),
    lines: steelBoxLines(box),
    heaviestPiece: steelBoxPiece(box),
    warnings: [...overLimit(checks, 'plates'), ...steelBoxWarnings(box)],
    figures: steelBoxFigures(box),
  };
}
