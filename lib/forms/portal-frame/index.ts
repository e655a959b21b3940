import type { Design, UnitTask } from '../../model/index.ts';
import { checkUnitTask } from '../common/checkUnitTask.ts';
import { limiting } from '../common/checks.ts';
import { curveWarning } from '../common/curveWarning.ts';
import { skewWords } from '../common/skewWords.ts';
import { overLimit } from '../common/warnings.ts';
import type { FormModule } from '../formModule.ts';
import { frameChecks } from './frameChecks.ts';
import { frameDepthAlong, frameElevation, frameSections } from './frameDrawing.ts';
import { frameLines } from './frameLines.ts';
import { frameModel } from './frameModel.ts';
import { frameFigures, frameReactions, frameWalls, ownWeightShare } from './frameReport.ts';
import { portalData } from './portalData.ts';
import { sizeFrame } from './sizeFrame.ts';

/**
 * Concrete portal frame of one span, or of two with a wall between them: haunched deck and walls in one, without bearings or joints, cast on falsework;
 * reinforced on short spans, its deck prestressed beyond. `depthM` of the task is the deck at midspan. Worked out on stiff
 * and on soft feet, with the fill pressing on the walls. Spans of about 6 to 60 m.
 */
export const portalFrame: FormModule = {
  id: 'portal-frame',
  family: 'girder',
  name: 'Portal frame',
  pattern: { kind: 'continuous', mostSpans: 2 },
  methods: ['falsework'],
  wallsInOne: true,
  leapsAtM: [portalData.reinforced.mostSpanM],
  size,
};

/** @throws RangeError for more than two spans, depths or widths that are not possible, strikes that do not go with the walls, or an earthquake less than none */
function size(task: UnitTask): Design {
  checkUnitTask(task);
  if (task.spansM.length > 2)
    throw new RangeError(
      `spansM: expected one span or two, received ${task.spansM.length}; a portal frame stands on its walls`,
    );
  if (task.strikes && task.strikes.length !== task.spansM.length + 1)
    throw new RangeError(
      `strikes: expected a list for each of ${task.spansM.length + 1} walls, received ${task.strikes.length}; leave it out where nothing strikes them`,
    );
  if (task.quakeShare !== undefined && !(task.quakeShare >= 0))
    throw new RangeError(
      `quakeShare: expected 0 or more, received ${task.quakeShare}; leave it out where no earthquake is reckoned with`,
    );
  const model = frameModel(task);
  const sized = sizeFrame(model);
  const checks = frameChecks(model, sized);
  const warnings = overLimit(checks, model.prestressed ? 'tendons and bars' : 'bars');
  warnings.push(...curveWarning(task, 'all its figures are those of a straight deck.'));
  if ((task.skewDeg ?? 0) > 0)
    warnings.push(
      `${skewWords(task.skewDeg!)}: walls are as long as the skew makes them; the deck spans as if square, and what it carries at its obtuse corners and the twist of skew earth pressure are left out.`,
    );
  if (task.clearUnderM === undefined)
    warnings.push(
      `Height under the deck is not given: walls are sized for ${portalData.leg.assumedClearM} m under the soffit.`,
    );
  if (model.shape.intoGround)
    warnings.push(
      'The ground stands high behind a wall: it goes down into it so as not to be too short and stiff.',
    );
  return {
    task,
    depthM: { support: model.shape.kneeM, midspan: task.depthM },
    depthAlong: frameDepthAlong(model),
    elevation: frameElevation(model, sized.tendons),
    sections: frameSections(model, sized.tendons),
    reactions: frameReactions(model, sized),
    walls: frameWalls(model, sized),
    checks,
    limitingCheck: limiting(checks),
    ownWeightShare: ownWeightShare(model, sized),
    lines: frameLines(model, sized),
    heaviestPiece: null,
    warnings,
    figures: frameFigures(model, sized),
  };
}
