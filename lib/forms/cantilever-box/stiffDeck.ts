import { trafficOnDeck } from '../../actions/index.ts';
import { lineBeam, type LineBeam } from '../../mechanics/index.ts';
import type { UnitTask } from '../../model/index.ts';
import { stiffnessAt, type BoxConcrete } from '../concrete-box/boxConcrete.ts';
import { trafficOnBox, type BoxTraffic } from '../concrete-box/boxTraffic.ts';
import { supportPositions } from '../common/supports.ts';
import { anchorsOf, type Anchor } from './anchors.ts';
import { tipsM, type Arm } from './arms.ts';
import { castInSupports } from './castInPiers.ts';
import { haunchShare, pierDepths, placeAt } from './haunch.ts';
import { betweenHeldAndFree, heldPier, type HeldPier } from './heldPiers.ts';
import { overSupports, type OverSupports } from './parasitic.ts';

/** Line beam of a haunched deck with the traffic on it. Its stiffness is 1 at midspan, less in lightweight concrete. */
export interface StiffDeck {
  readonly beam: LineBeam;
  /** That stiffness at the stations. */
  readonly stiffness: Float64Array;
  readonly traffic: BoxTraffic;
  readonly overSupports: OverSupports;
  /** What holds longer arms down, in the order in which it is called upon. */
  readonly anchors: readonly Anchor[];
  /** Piers that the deck is cast in with. */
  readonly heldPiers: readonly HeldPier[];
}

/** Stations of a span. */
export const stationsPerSpan = 20;
const kept = new Map<string, StiffDeck>();

/**
 * The beam by how much deeper and stiffer the deck is over the piers. Both ratios are rounded (to a tenth and to a quarter
 * of the exponent) so that trials of depth share their influence lines; the last 64 decks are kept.
 * @param depthRatio depth over the pier of the longest arms over that at midspan, 1 or more
 * @param power of the depth by which the inertia grows
 */
export function stiffDeck(
  { task, arms, ...box }: BoxConcrete & { readonly task: UnitTask; readonly arms: readonly Arm[] },
  depthRatio: number,
  power: number,
): StiffDeck {
  const ratio = Math.round(10 * depthRatio) / 10;
  const exponent = Math.round(4 * power) / 4;
  const key = JSON.stringify([
    task.standard,
    task.spansM,
    task.deck,
    ratio,
    exponent,
    task.light,
    task.strengthMPa,
    task.castInPiers,
  ]);
  const known = kept.get(key);
  if (known) return known;
  const supportsM = supportPositions(task.spansM);
  const depths = pierDepths(arms, 1, ratio);
  const stiffness = (xM: number): number => {
    const { arm, way } = placeAt(arms, supportsM, xM);
    const concrete = stiffnessAt(box, xM);
    if (arm < 0) return concrete;
    return concrete * (1 + (depths.get(arms[arm]!.support)! - 1) * haunchShare(way)) ** exponent;
  };
  const geometry = {
    spansM: task.spansM,
    eiKNm2: stiffness,
    stationsPerSpan,
    extraStationsM: tipsM(arms, task.spansM, stationsPerSpan),
  };
  const beam = lineBeam(geometry);
  const castIn = castInSupports(task);
  const load = trafficOnDeck(task.standard, task.deck);
  const free = trafficOnBox(beam, load);
  const made: StiffDeck = {
    beam,
    stiffness: beam.xM.map(stiffness),
    overSupports: overSupports(beam),
    anchors: anchorsOf(arms, task.light !== undefined, { ...geometry, beam }),
    traffic: castIn.length > 0 ? betweenHeldAndFree(geometry, castIn, free) : free,
    heldPiers: castIn.map((support) => heldPier(geometry, beam, support, load)),
  };
  if (kept.size >= 64) for (const [oldest] of [...kept].slice(0, 32)) kept.delete(oldest);
  kept.set(key, made);
  return made;
}
