import { trafficOnDeck, trafficOnInfluence } from '../../actions/index.ts';
import { beamTrack, reactionInfluence } from '../../mechanics/index.ts';
import type { Design, SupportReaction, UnitTask } from '../../model/index.ts';
import { checkUnitTask } from '../common/checkUnitTask.ts';
import { limiting } from '../common/checks.ts';
import { constantDepth } from '../common/depthAlong.ts';
import { overLimit } from '../common/warnings.ts';
import type { FormModule } from '../formModule.ts';
import { girderChecks, heaviestPiece } from './girderChecks.ts';
import { girderElevation, girderSections } from './girderDrawing.ts';
import { girderFiguresOf, ownWeightShare } from './girderReport.ts';
import { girderLines } from './girderLines.ts';
import { girderModel, type GirderModel } from './girderModel.ts';
import { sizeGirder, type SizedGirder } from './sizeGirder.ts';

/**
 * Composite I-girders of constant depth: two girders with cross-girders or more girders with bracing, a concrete slab on
 * top, built unpropped. `depthM` of the task is soffit to top of slab over the girders. Simple or continuous spans of
 * about 20 to 120 m, decks of 8 to 25 m.
 */
export const compositeI: FormModule = {
  id: 'composite-i',
  family: 'girder',
  name: 'Composite I-girders',
  pattern: { kind: 'continuous' },
  methods: ['crane', 'launch'],
  size,
};

/** @throws RangeError for spans, depth or girder counts that are not possible */
function size(task: UnitTask): Design {
  checkUnitTask(task);
  const model = girderModel(task);
  const girder = sizeGirder(model);
  const checks = girderChecks(model, girder);
  const depthM = model.girderM + model.slab.rootM;
  return {
    task,
    depthM: { support: depthM, midspan: depthM },
    depthAlong: constantDepth(model.lengthM, depthM),
    elevation: girderElevation(model, girder.run),
    sections: girderSections(model, girder.run, girder.secondary.crossGirderM),
    reactions: reactionsOf(model, girder),
    checks,
    limitingCheck: limiting(checks),
    ownWeightShare: ownWeightShare(girder),
    lines: girderLines(model, girder),
    heaviestPiece: heaviestPiece(model, girder),
    warnings: overLimit(checks, 'plates'),
    figures: girderFiguresOf(model, girder),
  };
}

/** Characteristic reactions of the whole deck: girders times permanent reactions, all lanes for traffic. */
function reactionsOf(model: GirderModel, girder: SizedGirder): SupportReaction[] {
  const { steelStage, superimposed, shrinkage, traffic, shortBeam } = girder.effects;
  const deck = trafficOnDeck(model.standardId, model.task.deck);
  const track = beamTrack(shortBeam);
  return model.supportsM.map((_, j) => {
    const line = reactionInfluence(shortBeam, j);
    const whole = trafficOnInfluence(deck, track, line);
    const one = trafficOnInfluence(model.traffic, track, line);
    // The envelope of the girder holds what the standard asks for at inner supports; the deck differs by its lanes.
    const ratio = (all: number, single: number): number => (single === 0 ? 0 : all / single);
    const permanent = steelStage.reactionKN[j]! + superimposed.reactionKN[j]!;
    return {
      permanentKN:
        (model.layout.count * permanent) / model.curve + model.layout.count * shrinkage.reactionKN[j]!,
      trafficMaxKN: (traffic.reactionMaxKN[j]! / model.traffic.shearRatio) * ratio(whole.max, one.max),
      trafficMinKN: (traffic.reactionMinKN[j]! / model.traffic.shearRatio) * ratio(whole.min, one.min),
    };
  });
}
