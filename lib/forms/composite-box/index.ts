import type { Design, UnitTask } from '../../model/index.ts';
import { checkUnitTask } from '../common/checkUnitTask.ts';
import { limiting } from '../common/checks.ts';
import { constantDepth } from '../common/depthAlong.ts';
import { obtuseOf } from '../common/obtuse.ts';
import { withSkewEnds } from '../common/skewEnds.ts';
import { overLimit } from '../common/warnings.ts';
import { heaviestPiece } from '../composite-i/girderChecks.ts';
import { girderElevation } from '../composite-i/girderDrawing.ts';
import { girderReactions } from '../composite-i/girderReactions.ts';
import { ownWeightShare } from '../composite-i/girderReport.ts';
import { sizeGirder } from '../composite-i/sizeGirder.ts';
import type { FormModule } from '../formModule.ts';
import { boxGirderChecks } from './boxGirderChecks.ts';
import { boxGirderSections } from './boxGirderDrawing.ts';
import { boxGirderLines } from './boxGirderLines.ts';
import { boxGirderModel } from './boxGirderModel.ts';
import { boxGirderFigures } from './boxGirderReport.ts';
import { boxGirderSkew } from './boxGirderSkew.ts';
import { boxSteelOf } from './boxSteel.ts';

/** How far webs lean, of the most they may; the first is preferred. */
const LEANS = [1, 0.5, 0] as const;

/**
 * Composite box girders of constant depth: one steel tub, or more on wide decks, with leaning webs and a ribbed bottom
 * plate, closed by a concrete slab; built unpropped. `depthM` of the task is soffit to top of slab over the webs. Simple
 * or continuous spans of about 30 to 150 m.
 */
export const compositeBox: FormModule = {
  id: 'composite-box',
  family: 'box',
  name: 'Composite box girders',
  pattern: { kind: 'continuous' },
  // Side spans by common practice, no source.
  alsoPatterns: [{ kind: 'flanked', approach: 'composite-i', side: [0.6, 0.85] }],
  methods: ['crane'],
  choices: ['squareEnds'],
  size: (task) => withSkewEnds(task, size),
};

/** @throws RangeError for spans, depth or widths that are not possible */
function size(task: UnitTask): Design {
  checkUnitTask(task);
  // Leaning webs save bottom plate and bring the bearings together: where a bearing would lift, or the narrower plate is
  // not enough, the webs stand up as far as it takes.
  let best = sizeWith(task, LEANS[0]);
  for (const lean of LEANS.slice(1)) {
    if (best.limitingCheck.utilisation <= 1) break;
    const next = sizeWith(task, lean);
    if (next.limitingCheck.utilisation < best.limitingCheck.utilisation) best = next;
  }
  return best;
}

function sizeWith(task: UnitTask, lean: number): Design {
  const model = boxGirderModel(task, lean);
  const steelOf = boxSteelOf(model);
  const girder = sizeGirder(model, steelOf);
  const steel = steelOf(model, girder.run, girder.effects, girder.plateKg);
  const reactions = girderReactions(model, girder);
  const skew = boxGirderSkew(model, girder);
  const checks = boxGirderChecks(model, girder, reactions, skew);
  const depthM = model.girderM + model.slab.rootM;
  const half = heaviestPiece(model, girder);
  return {
    task,
    depthM: { support: depthM, midspan: depthM },
    depthAlong: constantDepth(model.lengthM, depthM),
    elevation: girderElevation(model, girder.run),
    sections: boxGirderSections(model, girder.run),
    reactions,
    ...obtuseOf(model.traffic),
    checks,
    limitingCheck: limiting(checks),
    ownWeightShare: ownWeightShare(girder),
    lines: boxGirderLines(model, girder, steel),
    // A tub comes as one piece with its frames and ribs.
    heaviestPiece: {
      lengthM: half.lengthM,
      massT: 2 * half.massT * (1 + steel.totalKg / girder.plateKg),
    },
    warnings: overLimit(checks, 'plates'),
    figures: boxGirderFigures(model, girder, steel, skew),
  };
}
