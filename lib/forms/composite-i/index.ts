import type { Design, UnitTask } from '../../model/index.ts';
import { checkUnitTask } from '../common/checkUnitTask.ts';
import { limiting } from '../common/checks.ts';
import { obtuseOf } from '../common/obtuse.ts';
import { overLimit } from '../common/warnings.ts';
import type { FormModule } from '../formModule.ts';
import { girderChecks, heaviestPiece } from './girderChecks.ts';
import { girderDepthAlong, girderElevation, girderSections } from './girderDrawing.ts';
import { girderFiguresOf, ownWeightShare } from './girderReport.ts';
import { girderLines } from './girderLines.ts';
import { girderModel, leastDepthM } from './girderModel.ts';
import { girderVariants } from './girderVariants.ts';
import { girderReactions } from './girderReactions.ts';
import { sizeGirder } from './sizeGirder.ts';

/**
 * Composite I-girders: two girders with cross-girders or more girders with bracing, a concrete slab on top, built
 * unpropped. `depthM` of the task is soffit to top of slab over the girders, at midspan where `haunch` deepens them over
 * the piers. Webs deeper than about 3 m have a stiffener along them. `substringers` halve the span of the slab between
 * three girders or more. The lean of a haunched bottom flange, which takes shear off the web, is left out. Simple or continuous spans of
 * about 20 to 120 m, decks of 8 to 25 m.
 */
export const compositeI: FormModule = {
  id: 'composite-i',
  family: 'girder',
  name: 'Composite I-girders',
  pattern: { kind: 'continuous' },
  // Deeper girders over a long opening than before and behind it; side spans by common practice, no source.
  alsoPatterns: [{ kind: 'flanked', approach: 'composite-i', side: [0.6, 0.85] }],
  methods: ['crane', 'launch'],
  ignoresHeight: true,
  choices: ['haunchRatio', 'substringers'],
  reads: ['girders', 'haunch'],
  variants: girderVariants,
  leastDepthM,
  size,
};

/** @throws RangeError for spans, depth or girder counts that are not possible */
function size(task: UnitTask): Design {
  checkUnitTask(task);
  const model = girderModel(task);
  const girder = sizeGirder(model);
  const checks = girderChecks(model, girder);
  const depthAlong = girderDepthAlong(model);
  return {
    task,
    depthM: { support: Math.max(...depthAlong.depthM), midspan: model.girderM + model.slab.rootM },
    depthAlong,
    elevation: girderElevation(model, girder.run),
    sections: girderSections(model, girder.run, girder.secondary.crossGirderM),
    reactions: girderReactions(model, girder),
    ...obtuseOf(model.traffic),
    checks,
    limitingCheck: limiting(checks),
    ownWeightShare: ownWeightShare(girder),
    lines: girderLines(model, girder),
    heaviestPiece: heaviestPiece(model, girder),
    warnings: overLimit(checks, 'plates'),
    figures: girderFiguresOf(model, girder),
  };
}
