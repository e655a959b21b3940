import type { Design, Site, Support } from '../model/index.ts';
import { standOneSupport } from './standOneSupport.ts';
import { trialAsk, type DeckOnSupport } from './trialAsk.ts';

/**
 * Reactions per metre of neighbouring half-spans from a sized unit: the heaviest interior support, or the end supports of a
 * single span taken back to back.
 */
export function deckOnSupport(design: Design): DeckOnSupport {
  const spans = design.task.spansM;
  let best: DeckOnSupport = { permanentKNm: 0, trafficKNm: 0, depthM: design.depthM.support };
  for (let i = 1; i < spans.length; i++) {
    const length = (spans[i - 1]! + spans[i]!) / 2;
    const reaction = design.reactions[i]!;
    const permanentKNm = reaction.permanentKN / length;
    if (permanentKNm > best.permanentKNm) {
      best = { permanentKNm, trafficKNm: reaction.trafficMaxKN / length, depthM: design.depthM.support };
    }
  }
  if (spans.length > 1) return best;
  const half = spans[0]! / 2;
  const end = design.reactions[0]!;
  return {
    permanentKNm: end.permanentKN / half,
    trafficKNm: end.trafficMaxKN / half,
    depthM: design.depthM.support,
  };
}

/**
 * A trial pier for the cost table: a sliding pier of a deck known only by its reactions per metre, between two spans.
 * Lengths and levels in metres. The fixed pier of an option is dearer by its braking force; the search does not know it yet.
 */
export function standPierBetween(
  site: Site,
  deck: DeckOnSupport,
  chainageM: number,
  spanLeftM: number,
  spanRightM: number,
  roadLevelM: number,
): Support {
  return standOneSupport(
    site,
    trialAsk(site, deck, { kind: 'pier', chainageM, roadLevelM, lengthM: (spanLeftM + spanRightM) / 2 }),
  );
}
