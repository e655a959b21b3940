import type { Site } from '../model/index.ts';
import { constructionDepth } from '../site/index.ts';
import { substructureData } from './data.ts';
import { windOnDeck } from './loads.ts';
import type { SupportAsk } from './supportAsk.ts';

/** Reactions of a deck per metre of the spans beside a support, kN/m, with its depth over the support, m. */
export interface DeckOnSupport {
  readonly permanentKNm: number;
  readonly trafficKNm: number;
  readonly depthM: number;
}

/** Where a trial support stands: levels in m, and the metres of deck that rest on it. */
export interface TrialPlace {
  readonly kind: 'pier' | 'abutment';
  readonly chainageM: number;
  readonly roadLevelM: number;
  readonly lengthM: number;
}

/**
 * What a trial support is asked to carry: sliding bearings under a deck known only by its reactions per metre. The search
 * looks for places by this; an option has its own.
 */
export function trialAsk(
  site: Site,
  deck: DeckOnSupport,
  { kind, chainageM, roadLevelM, lengthM }: TrialPlace,
): SupportAsk {
  const permanentKN = deck.permanentKNm * lengthM;
  return {
    name: kind,
    kind,
    chainageM,
    roadLevelM,
    soffitLevelM: roadLevelM - constructionDepth(site.deck, deck.depthM),
    permanentKN,
    trafficKN: deck.trafficKNm * lengthM,
    trafficLeastKN: 0,
    alongKN: substructureData.friction.coefficient * permanentKN,
    acrossKN: windOnDeck(deck.depthM, lengthM),
    fixed: false,
    heldAlongKN: 0,
    bearingMovementMm: 0,
    bearings: substructureData.bearings.perLine,
    jointMovementMm: 0,
  };
}
