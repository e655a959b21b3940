import { trafficOnDeck, trafficOnInfluence } from '../../actions/index.ts';
import { beamTrack, reactionInfluence } from '../../mechanics/index.ts';
import type { Design, SupportReaction, UnitTask } from '../../model/index.ts';
import { checkUnitTask } from '../common/checkUnitTask.ts';
import { limiting } from '../common/checks.ts';
import { constantDepth } from '../common/depthAlong.ts';
import { skewPlanesWarnings } from '../common/skewPlanes.ts';
import { overLimit } from '../common/warnings.ts';
import { elementsPerSpan } from '../composite-i/elementsPerSpan.ts';
import type { FormModule } from '../formModule.ts';
import { halfThroughChecks } from './halfThroughChecks.ts';
import { halfThroughElevation, halfThroughSections } from './halfThroughDrawing.ts';
import { halfThroughLines, heaviestPiece } from './halfThroughLines.ts';
import { halfThroughUnit, type HalfThroughUnit } from './halfThroughUnit.ts';

/**
 * Half-through deck: the road runs between two plate girders on cross-girders and a slab that spans from one to the next.
 *
 * `depthM` of the task is the depth of the floor, soffit of the cross-girders to top of the slab: it alone takes
 * clearance under the road. The girders stand with their feet at that soffit outside carriageway and footways, rise
 * above the road and are chosen here for least steel; their height stands in the figures as `edgeGirderM`.
 *
 * The girders carry everything as bare steel: the slab lies near their pulled flange and has cracked there. Their top
 * flange is held by U-frames alone. Over piers the slab near the pressed flange would help and is left out. Frames at
 * the supports give the flange its end. Widening is ruled out by the girders themselves.
 * On a skew its frames run along the supports and stand turned to the girders. Simple and continuous spans; equal girders.
 */
export const halfThrough: FormModule = {
  id: 'half-through',
  family: 'girder',
  name: 'Half-through girders',
  pattern: { kind: 'continuous' },
  methods: ['crane', 'launch'],
  ignoresHeight: true,
  size,
};

/** @throws RangeError for spans, depth or decks that are not possible */
function size(task: UnitTask): Design {
  checkUnitTask(task);
  const unit = halfThroughUnit(task);
  const checks = halfThroughChecks(unit);
  return {
    task,
    depthM: { support: task.depthM, midspan: task.depthM },
    depthAlong: constantDepth(unit.case.lengthM, task.depthM),
    elevation: halfThroughElevation(unit),
    sections: halfThroughSections(unit),
    reactions: reactionsOf(unit),
    checks,
    limitingCheck: limiting(checks),
    ownWeightShare: ownWeightShare(unit),
    lines: halfThroughLines(unit),
    heaviestPiece: heaviestPiece(unit),
    warnings: [
      ...overLimit(checks, 'plates'),
      ...skewPlanesWarnings(task, unit.case.planesM, checks.find(({ id }) => id === 'deflection')!.demand),
      'The girders stand on both sides of the road: it cannot be widened later.',
    ],
    figures: figuresOf(unit),
  };
}

/** Characteristic reactions of the whole deck. */
function reactionsOf({ case: c, statics, girder }: HalfThroughUnit): SupportReaction[] {
  const deck = trafficOnDeck(c.task.standard, c.task.deck);
  const track = beamTrack(statics.beam);
  const permanentKNm = (2 * (girder.loads.ownKNm + girder.loads.superimposedKNm)) / c.curve;
  return c.supportsM.map((_, j) => {
    const line = reactionInfluence(statics.beam, j);
    const whole = trafficOnInfluence(deck, track, line);
    const one = trafficOnInfluence(c.traffic, track, line);
    // The envelope of the girder holds what the standard asks for at inner supports; the deck differs by its lanes.
    const ratio = (all: number, single: number): number => (single === 0 ? 0 : all / single);
    return {
      permanentKN: permanentKNm * statics.unit.reactionKN[j]!,
      trafficMaxKN: statics.traffic.reactionMaxKN[j]! * ratio(whole.max, one.max),
      trafficMinKN: statics.traffic.reactionMinKN[j]! * ratio(whole.min, one.min),
    };
  });
}

/** Own weight of the governing characteristic moment, 0 to 1. */
function ownWeightShare({ statics, girder }: HalfThroughUnit): number {
  const { ownKNm, superimposedKNm } = girder.loads;
  let most = 0;
  let share = 0;
  statics.unit.momentKNm.forEach((m, i) => {
    const { momentMaxKNm, momentMinKNm } = statics.traffic;
    const total = m * (ownKNm + superimposedKNm) + (m < 0 ? momentMinKNm[i]! : momentMaxKNm[i]!);
    if (!(Math.abs(total) > most)) return;
    most = Math.abs(total);
    share = (m * ownKNm) / total;
  });
  return Math.min(1, Math.max(0, share));
}

function figuresOf(unit: HalfThroughUnit): Record<string, number> {
  const { case: c, girder, use, floor, panels, steelKg } = unit;
  const { spansM } = c.task;
  const longest = spansM.indexOf(Math.max(...spansM));
  const middle = longest * elementsPerSpan + elementsPerSpan / 2;
  const areaM2 = c.task.deck.widthM * c.lengthM;
  const { demand } = girder;
  return {
    edgeGirderM: girder.choice.heightM,
    planesM: c.planesM,
    crossSpacingM: Math.max(...spansM.map((spanM, i) => spanM / panels[i]!)),
    crossGirders: panels.reduce((sum, n) => sum + n, 1),
    slabM: floor.slab.meanM,
    crossGirderM: floor.crossGirder.plates.heightM,
    laneVehicles: c.traffic.vehicleFactor,
    trafficUniformKNm: c.traffic.udlKNm,
    curvatureFactor: c.curve,
    flangeWidthM: girder.widthM,
    midspanTopFlangeM: girder.topM[middle]!,
    midspanBottomFlangeM: girder.bottomM[middle]!,
    midspanWebM: girder.webM[middle]!,
    postDepthM: girder.post.section.depthM,
    postInertiaM4: girder.frame.postInertiaM4,
    frameKNm: girder.frameKNm,
    endFrames: girder.endFrames,
    topForceKN: use.topForceKN,
    criticalKN: use.criticalKN,
    holdingKN: use.holdingKN,
    turningKN: use.turningKN,
    ownKNm: girder.loads.ownKNm,
    sagDesignKNm: Math.max(...demand.sagKNm),
    hogDesignKNm: Math.min(0, ...demand.hogKNm),
    steelKgM2: steelKg / areaM2,
    girderKgM2: (2 * girder.platesKg) / areaM2,
  };
}
