import { uniform } from '../../../mechanics/index.ts';
import type { MeasuredLine, Shape, SupportReaction } from '../../../model/index.ts';
import { structuralDepthM } from '../../common/precast/precastDrawing.ts';
import { diaphragmM3 } from '../../common/precast/precastLines.ts';
import { beamFigures, precastReactions } from '../../common/precast/precastReport.ts';
import { heightUnder } from '../../concrete-box/heightUnder.ts';
import type { SizedSpliced } from './sizedSpliced.ts';
import { pierSolidM3, spliceCount } from './splicedLines.ts';
import type { SplicedModel } from './splicedModel.ts';

/** Characteristic reactions of the whole deck, its weight on the continuous beam; what the tendons shift is in it. */
export function splicedReactions(model: SplicedModel, { sized }: SizedSpliced): SupportReaction[] {
  const { layout, shape, slab, task, beam, standard } = model;
  const gamma = standard.unitWeights.concreteKNm3;
  const deck =
    gamma * (layout.count * (shape.areaM2 + model.haunchM * shape.topWidthM) + slab.meanM * task.deck.widthM);
  const walls = diaphragmM3(model);
  const smeared = task.spansM.map(
    (_, span) => deck + (model.deadKNm[span]! - model.ownKNm - model.wetKNm) * (layout.count - 1),
  );
  const dead = uniform(beam, smeared);
  const shifted = parasiticReactionsKN(model, sized);
  const last = task.spansM.length;
  const solidKN = (gamma * pierSolidM3(model)) / Math.max(1, last - 1);
  return precastReactions(model).map((reaction, j) => ({
    ...reaction,
    permanentKN:
      dead.reactionKN[j]! +
      (layout.count * model.superimposed.reactionKN[j]!) / model.curve +
      (j === 0 || j === last ? gamma * walls.endM3 : gamma * walls.pierM3 + solidKN) +
      layout.count * shifted[j]!,
  }));
}

/** Reactions of the parasitic moments of one beam, kN: slopes of a line straight between supports; they add up to nothing. */
function parasiticReactionsKN(model: SplicedModel, { tendons, moments }: SizedSpliced['sized']): number[] {
  const { beam, task } = model;
  const first = 1e3 * tendons.first * model.tendonM2 * tendons.lastingMPa;
  const second = 1e3 * (tendons.strands - tendons.first) * model.tendonM2 * tendons.lastingMPa;
  const at = beam.supportAt.map(
    (i) => first * moments.bareParasitic[i]! + second * moments.wholeParasitic[i]!,
  );
  const slope = task.spansM.map((spanM, span) => (at[span + 1]! - at[span]!) / spanM);
  return at.map((_, j) => (slope[j] ?? 0) - (slope[j - 1] ?? 0));
}

/** Tendons are stressed before the slab and after it. */
export const tendonStages = 2;

/** Named figures of one beam unless the name says otherwise. */
export function splicedFigures(
  model: SplicedModel,
  spliced: SizedSpliced,
  lines: readonly MeasuredLine[],
): Record<string, number> {
  const { task, plan } = model;
  const { tendons, straight } = spliced.sized;
  return {
    ...beamFigures(model, spliced, lines),
    splices: spliceCount(model),
    tendonStages,
    longestPieceM: plan.longestM,
    pieceStrands: straight.count,
    tendons: tendons.tendons,
    tendonStrands: tendons.strands,
    firstStageStrands: tendons.first,
    tendonLowM: tendons.lowM,
    tendonHighM: tendons.highM,
    tendonInitialMPa: tendons.initialMPa,
    tendonLastingMPa: tendons.lastingMPa,
    towerHeightM: Math.max(...heightUnder(task).soffitM),
  };
}

/** Splices and tendons in the elevation, faint. */
export function splicedShapes(model: SplicedModel, { sized }: SizedSpliced): Shape[] {
  const depthM = structuralDepthM(model);
  const topM = depthM - model.shape.depthM;
  const cuts = model.plan.atM.map((x): Shape => ({
    part: 'splice',
    material: 'concrete',
    kind: 'line',
    points: [
      [x, -topM],
      [x, -depthM],
    ],
    thicknessM: 0.03,
    faint: true,
  }));
  const tendon: Shape = {
    part: 'tendons',
    material: 'strand',
    kind: 'line',
    points: Array.from(model.beam.xM, (x, i) => [x, sized.moments.zM[i]! - depthM] as const),
    thicknessM: 0.03,
    faint: true,
  };
  return [...cuts, tendon];
}
