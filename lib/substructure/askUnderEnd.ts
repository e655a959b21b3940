import type { Site } from '../model/index.ts';
import { constructionDepth } from '../site/index.ts';
import { substructureData } from './data.ts';
import { windOnDeck } from './loads.ts';
import type { DeckOnSupport } from './standPierBetween.ts';
import type { SupportAsk } from './supportAsk.ts';

/**
 * What a trial abutment is asked to carry: sliding bearings under half an end span of a deck known only by its reactions
 * per metre. Lengths and levels in metres. The search looks for a place for it by this; an option has its own.
 */
export function askUnderEnd(
  site: Site,
  deck: DeckOnSupport,
  chainageM: number,
  spanM: number,
  roadLevelM: number,
): SupportAsk {
  const length = spanM / 2;
  const permanentKN = deck.permanentKNm * length;
  return {
    name: 'abutment',
    kind: 'abutment',
    chainageM,
    roadLevelM,
    soffitLevelM: roadLevelM - constructionDepth(site.deck, deck.depthM),
    permanentKN,
    trafficKN: deck.trafficKNm * length,
    trafficLeastKN: 0,
    alongKN: substructureData.friction.coefficient * permanentKN,
    acrossKN: windOnDeck(deck.depthM, length),
    fixed: false,
    heldAlongKN: 0,
    bearingMovementMm: 0,
    bearings: substructureData.bearings.perLine,
    jointMovementMm: 0,
  };
}
