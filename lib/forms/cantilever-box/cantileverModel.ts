import { loadStandard, type LoadStandard } from '../../actions/index.ts';
import { imposedCurvature, uniform, type Effects, type LineBeam } from '../../mechanics/index.ts';
import type { StandardId, UnitTask } from '../../model/index.ts';
import { depthBand } from '../../rules/index.ts';
import { supportPositions } from '../common/supports.ts';
import { boxConcrete, laidKNm, type BoxConcrete } from '../concrete-box/boxConcrete.ts';
import { boxData } from '../concrete-box/boxData.ts';
import { boxLayout, webSlope, type BoxLayout } from '../concrete-box/boxLayout.ts';
import { roundUp } from '../concrete-box/boxModel.ts';
import type { BoxTraffic } from '../concrete-box/boxTraffic.ts';
import type { Anchor } from './anchors.ts';
import { armsOf, type Arm } from './arms.ts';
import { cantileverData } from './cantileverData.ts';
import type { HeldPier } from './heldPiers.ts';
import { haunchShare, pierDepths, placeAt } from './haunch.ts';
import type { OverSupports } from './parasitic.ts';
import { stiffDeck } from './stiffDeck.ts';

/** What does not hang on the depth over the piers. */
export interface CantileverBase extends BoxConcrete {
  readonly task: UnitTask;
  readonly standardId: StandardId;
  readonly standard: LoadStandard;
  /** Box of the depth at midspan. */
  readonly layout: BoxLayout;
  readonly supportsM: readonly number[];
  readonly lengthM: number;
  readonly arms: readonly Arm[];
  /** Span that governs: twice the longest haunch, or the longest span, m. */
  readonly governingM: number;
  /** Area of one strand, m2. */
  readonly strandM2: number;
  readonly leastWebM: number;
  readonly leastBottomM: number;
}

/** A haunched deck before its thicknesses and tendons are sought. */
export interface CantileverModel extends CantileverBase {
  /** Depth over the piers of the longest arms, m. */
  readonly pierDepthM: number;
  /** The same by support. */
  readonly depthsM: ReadonlyMap<number, number>;
  /** Stiffness 1 at midspan, less in lightweight concrete; that stiffness at the stations. */
  readonly beam: LineBeam;
  readonly stiffness: Float64Array;
  /** Arm of each station (-1 in a single span), way from its pier to the end of the haunch, depth there, m. */
  readonly armAt: Int16Array;
  readonly way: Float64Array;
  readonly depthM: Float64Array;
  readonly overSupports: OverSupports;
  /** What holds longer arms down, in the order in which it is called upon. */
  readonly anchors: readonly Anchor[];
  /** Stations of each inner pier from the tips of its arms inwards, with their distance from it, m. */
  readonly towardsPiers: ReadonlyMap<number, readonly { readonly i: number; readonly away: number }[]>;
  /** What is laid on the joined deck: not the ballast that holds an arm down, which is there before. */
  readonly superimposed: Effects;
  readonly traffic: BoxTraffic;
  /** Piers that the deck is cast in with. */
  readonly heldPiers: readonly HeldPier[];
  /** Parasitic moment of 1 / depth as curvature that sags the deck, on stiffness 1, kNm per kNm2. */
  readonly warmKNm: Float64Array;
  readonly mostBottomM: number;
}

/** Lays out the box and the arms. */
export function cantileverBase(task: UnitTask): CantileverBase {
  const { spansM, standard: standardId } = task;
  const supportsM = supportPositions(spansM);
  const arms = armsOf(spansM);
  const governingM = arms.length > 0 ? 2 * Math.max(...arms.map(({ armM }) => armM)) : Math.max(...spansM);
  const layout = boxLayout(
    task,
    Math.max(task.depthM, depthBand('cantilever-box', 'continuous')[1] * governingM),
  );
  const clearM = layout.spacingM - boxData.webLeastM[standardId];
  const { leastM, clearOverThickness } = boxData.bottomSlab;
  return {
    task,
    standardId,
    standard: loadStandard(standardId),
    ...boxConcrete(task),
    layout,
    supportsM,
    lengthM: supportsM[supportsM.length - 1]!,
    arms,
    governingM,
    strandM2: boxData.strandAreaMm2[standardId] * 1e-6,
    leastWebM: boxData.webLeastM[standardId],
    leastBottomM: roundUp(Math.max(leastM, clearM / clearOverThickness)),
  };
}

/**
 * A depth over the piers with its beam, traffic and superimposed load.
 * @param power of the depth by which the inertia grows towards the piers
 * @param upright outer webs stand upright, so that the bottom slab is as wide as the box
 */
export function cantileverModel(
  base: CantileverBase,
  pierDepthM: number,
  power: number,
  upright = false,
): CantileverModel {
  const { task, arms, supportsM, layout } = base;
  const { mostM, mostOverDepth } = cantileverData.bottomSlab;
  const depthsM = pierDepths(arms, task.depthM, pierDepthM);
  const { beam, stiffness, traffic, overSupports, anchors, heldPiers } = stiffDeck(
    base,
    pierDepthM / task.depthM,
    power,
  );
  const n = beam.xM.length;
  const armAt = new Int16Array(n);
  const way = new Float64Array(n);
  const depthM = new Float64Array(n);
  for (let i = 0; i < n; i++) {
    const place = placeAt(arms, supportsM, beam.xM[i]!);
    armAt[i] = place.arm;
    way[i] = place.way;
    const arm = arms[place.arm];
    depthM[i] = task.depthM + (arm ? (depthsM.get(arm.support)! - task.depthM) * haunchShare(place.way) : 0);
  }
  return {
    ...base,
    layout: { ...layout, slope: upright ? 0 : webSlope(layout.cells * layout.spacingM, pierDepthM) },
    pierDepthM,
    depthsM,
    beam,
    stiffness,
    armAt,
    way,
    depthM,
    overSupports,
    anchors,
    towardsPiers: towardsPiers(arms, armAt, beam),
    superimposed: uniform(beam, laidWhenJoined(task, anchors)),
    traffic,
    heldPiers,
    warmKNm: imposedCurvature(
      beam,
      depthM.map((depth) => 1 / depth),
    ).momentKNm,
    mostBottomM: Math.min(mostM, mostOverDepth * pierDepthM),
  };
}

/** Whether a span holds a longer arm down, so that its ballast is there before the deck is joined. */
export function holdsDown(anchors: readonly Anchor[], span: number): boolean {
  return anchors.some(({ firstSpan, lastSpan }) => span >= firstSpan && span <= lastSpan);
}

/** What is laid on the joined deck, kN/m, of all spans or of each: not the ballast that holds an arm down. */
export function laidWhenJoined(task: UnitTask, anchors: readonly Anchor[]): number | number[] {
  const { ballastKNm } = task;
  if (!ballastKNm || anchors.length === 0) return laidKNm(task);
  return laidKNm({
    ...task,
    ballastKNm: ballastKNm.map((kNm, span) => (holdsDown(anchors, span) ? 0 : kNm)),
  });
}

function towardsPiers(
  arms: readonly Arm[],
  armAt: Int16Array,
  beam: LineBeam,
): CantileverModel['towardsPiers'] {
  const out = new Map<number, { readonly i: number; readonly away: number }[]>();
  armAt.forEach((at, i) => {
    const arm = arms[at];
    if (!arm) return;
    const mine = out.get(arm.support) ?? [];
    mine.push({ i, away: Math.abs(beam.xM[i]! - arm.pierM) });
    out.set(arm.support, mine);
  });
  for (const mine of out.values()) mine.sort((a, b) => b.away - a.away);
  return out;
}
