import { trafficOnInfluence } from '../../actions/index.ts';
import type { Design, UnitTask } from '../../model/index.ts';
import { checkUnitTask } from '../common/checkUnitTask.ts';
import { limiting } from '../common/checks.ts';
import { constantDepth } from '../common/depthAlong.ts';
import { overLimit } from '../common/warnings.ts';
import type { FormModule } from '../formModule.ts';
import { cableChecks, deflectionM } from './cableChecks.ts';
import { cableData } from './cableData.ts';
import { cableElevation, cableSections } from './cableDrawing.ts';
import { cableLines } from './cableLines.ts';
import { cableReactions } from './cableReactions.ts';
import { skewWarnings } from './skewEnds.ts';
import { sizePlane, type SizedBridge } from './sizePlane.ts';
import { stayMassKg } from './sizeStays.ts';
import { deckPush } from './stayForces.ts';

/**
 * Cable-stayed deck on one or two pylons: two planes of stays in a semi-fan, composite deck of two edge girders,
 * cross-girders and slab, H-shaped concrete pylons, built by cantilevering on its stays.
 *
 * `depthM` of the task is soffit to top of slab; `pylons` says which supports carry pylons (otherwise the ends of the main
 * span). The composite deck is taken always: whether a concrete one would be cheaper is a matter of prices, which sizing
 * does not know. Main spans of 40 to 800 m; below about 120 m the stays save little and pylons cost much.
 */
export const cableStayed: FormModule = {
  id: 'cable-stayed',
  family: 'cable-supported',
  name: 'Cable-stayed',
  pattern: { kind: 'pylon', approach: 'composite-i', onePylonBack: [0.5, 1], twoPylonSide: [0.33, 0.47] },
  methods: ['stay-cantilever'],
  size,
};

function size(task: UnitTask): Design {
  checkUnitTask(task);
  const bridge = sizePlane(task);
  const checks = cableChecks(bridge);
  const reactions = cableReactions(bridge, task);
  const { lengthM } = bridge.layout;
  return {
    task,
    depthM: { support: task.depthM, midspan: task.depthM },
    depthAlong: constantDepth(lengthM, task.depthM),
    elevation: cableElevation(bridge, task),
    sections: cableSections(bridge, task),
    reactions,
    checks,
    limitingCheck: limiting(checks),
    ownWeightShare: ownWeightShare(bridge),
    lines: cableLines(bridge, task),
    heaviestPiece: heaviestPiece(bridge),
    warnings: [...overLimit(checks, 'plates, stays and legs'), ...warningsOf(bridge, task)],
    figures: figuresOf(bridge, task),
  };
}

function warningsOf(bridge: SizedBridge, task: UnitTask): string[] {
  const warnings: string[] = [];
  const { standard, layout } = bridge;
  if (bridge.lasting.slack)
    warnings.push(
      'The back span is longer than the main span: the anchor stays carry nothing under lasting load.',
    );
  if (task.clearUnderM === undefined)
    warnings.push(
      `Height of the road at the pylons is not given: legs below the deck are measured ${cableData.assumedHeightM.value} m high.`,
    );
  const level = [-1, 1].map(() => 1);
  const whole = trafficOnInfluence(bridge.traffic, [0, layout.mainSpanM], level);
  if (whole.beyondScope)
    warnings.push(
      `The load model is written for loaded lengths up to ${standard.longestLoadedM} m; beyond that it is on the safe side.`,
    );
  if (Number.isFinite(task.planRadiusM))
    warnings.push('Stays of a curved deck pull the pylon sideways; the pylon is sized for a straight one.');
  warnings.push(...skewWarnings(task, { ...bridge, mainSpanM: layout.mainSpanM }));
  return warnings;
}

/** Self-weight part of the force of the most loaded suspended stay. */
function ownWeightShare(bridge: SizedBridge): number {
  const { stays, layout, loadKNm, selfKNm } = bridge;
  let best = 0;
  layout.stays.forEach((stay, i) => {
    if (!stay.anchor && stays[i]!.strands > stays[best]!.strands) best = i;
  });
  const { permanentKN, trafficMaxKN } = stays[best]!;
  return (permanentKN * selfKNm) / loadKNm / (permanentKN + trafficMaxKN);
}

/** Edge girder of one stay step, or a cross-girder. */
function heaviestPiece(bridge: SizedBridge): { lengthM: number; massT: number } {
  const { spacingM } = bridge.layout.pylons[0]!;
  const edgeT = (Math.max(...bridge.girders.map((girder) => girder.massKgPerM)) * spacingM) / 1000;
  const crossT = (bridge.floor.crossGirder.massKgPerM * bridge.planesM) / 1000;
  return edgeT >= crossT ? { lengthM: spacingM, massT: edgeT } : { lengthM: bridge.planesM, massT: crossT };
}

function figuresOf(bridge: SizedBridge, task: UnitTask): Record<string, number> {
  const { layout, stays, pylons } = bridge;
  const [pylon] = layout.pylons;
  const hungKg = stayMassKg(layout, stays, 'hung');
  const anchorKg = stayMassKg(layout, stays, 'anchor');
  const areaM2 = layout.lengthM * task.deck.widthM;
  const edgeKg = bridge.zones.reduce(
    (sum, zone, z) => sum + 2 * zone.totalM * bridge.girders[z]!.massKgPerM,
    0,
  );
  return {
    mainSpanM: layout.mainSpanM,
    pylons: layout.pylons.length,
    pylonHeightM: pylon!.heightM,
    pylonHeightOverMain: pylon!.heightM / layout.mainSpanM,
    staySpacingM: pylon!.spacingM,
    planesM: bridge.planesM,
    staysPerPlane: layout.stays.reduce((sum, stay) => sum + stay.count, 0),
    hungStaysKg: hungKg,
    anchorStaysKg: anchorKg,
    anchorOverHungStays: anchorKg / hungKg,
    stayKgM2: (hungKg + anchorKg) / areaM2,
    deckPushKN: Math.max(
      ...[-1, 1].map((side) => deckPush(layout, bridge.lasting.stayKN, 0, side as -1 | 1, 0)),
    ),
    pylonLegLengthM: pylons[0]!.lengthM,
    pylonLegWidthM: pylons[0]!.widthM,
    pylonWallM: pylons[0]!.wallM,
    pylonBarRatio: pylons[0]!.barRatio,
    pylonTopMovementM: Math.max(
      ...bridge.model.topM.map((line) => {
        const moved = trafficOnInfluence(bridge.traffic, bridge.track, line);
        return Math.max(moved.max, -moved.min);
      }),
    ),
    permanentKNm: 2 * bridge.loadKNm,
    edgeGirderKgM2: edgeKg / areaM2,
    floorSteelKgM2: bridge.floor.steelKgPerM / task.deck.widthM,
    slabM: bridge.floor.slab.meanM,
    deflectionM: deflectionM(bridge),
  };
}
