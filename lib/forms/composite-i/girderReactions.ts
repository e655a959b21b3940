import { trafficOnDeck, trafficOnInfluence } from '../../actions/index.ts';
import { beamTrack, reactionInfluence } from '../../mechanics/index.ts';
import type { SupportReaction } from '../../model/index.ts';
import type { GirderModel } from './girderModel.ts';
import type { SizedGirder } from './sizeGirder.ts';

/** Characteristic reactions of the whole deck: girders times permanent reactions, all lanes for traffic. */
export function girderReactions(model: GirderModel, girder: SizedGirder): SupportReaction[] {
  const { steelStage, superimposed, shrinkage, traffic, shortBeam } = girder.effects;
  const deck = trafficOnDeck(model.standardId, model.task.deck);
  const track = beamTrack(shortBeam);
  // The whole deck weighs on its supports what it weighs: a skew only heaps it on the obtuse corners.
  const inShear = model.traffic.shearRatio * (model.traffic.obtuse ?? 1);
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
      trafficMaxKN: (traffic.reactionMaxKN[j]! / inShear) * ratio(whole.max, one.max),
      trafficMinKN: (traffic.reactionMinKN[j]! / inShear) * ratio(whole.min, one.min),
    };
  });
}
