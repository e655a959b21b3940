import { trafficOnDeck, trafficOnInfluence } from '../../actions/index.ts';
import type { SupportReaction, UnitTask } from '../../model/index.ts';
import { supportPositions } from '../common/supports.ts';
import type { SizedBridge } from './sizePlane.ts';

/**
 * Characteristic reactions of the whole deck. At a pylon: everything its stays bring down, without the pylon's own
 * weight. At an anchor pier: the end bay less the pull of the anchor stays, negative where it must be
 * tied down. A pier inside a back span is taken to carry one bay of deck.
 */
export function cableReactions(bridge: SizedBridge, task: UnitTask): SupportReaction[] {
  const { layout, lasting, model, track, loadKNm } = bridge;
  const load = trafficOnDeck(task.standard, task.deck);
  const x = supportPositions(task.spansM);
  return x.map((at, support) => {
    const pylon = layout.pylons.findIndex((place) => place.support === support);
    const line = model.reactionLine(support);
    let permanentKN = 0;
    if (support === 0 || support === x.length - 1) permanentKN = (loadKNm * endBayM(bridge, at)) / 2;
    else if (pylon < 0) permanentKN = loadKNm * layout.pylons[0]!.spacingM;
    layout.stays.forEach((stay, i) => {
      const held = stay.anchor && Math.abs(stay.deckM - at) < 1e-6;
      const sign = held ? -1 : stay.pylon === pylon ? 1 : 0;
      if (sign === 0) return;
      permanentKN += sign * lasting.stayKN[i]! * stay.sine;
      const stayLine = model.stayLine(i);
      for (let j = 0; j < line.length; j++) line[j]! += sign * stayLine[j]! * stay.sine;
    });
    const traffic = trafficOnInfluence(load, track, line);
    return { permanentKN: 2 * permanentKN, trafficMaxKN: traffic.max, trafficMinKN: traffic.min };
  });
}

/** Deck between an end of the unit and the suspended stay nearest to it, m. */
function endBayM(bridge: SizedBridge, atM: number): number {
  const gaps = bridge.layout.stays.filter((stay) => !stay.anchor).map((stay) => Math.abs(stay.deckM - atM));
  const toPylon = bridge.layout.pylons.map((pylon) => Math.abs(pylon.xM - atM));
  return Math.min(...gaps, ...toPylon);
}
