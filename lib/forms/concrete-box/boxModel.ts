import { loadStandard, type LoadStandard } from '../../actions/index.ts';
import { imposedCurvature, lineBeam, uniform, type Effects, type LineBeam } from '../../mechanics/index.ts';
import type { StandardId, UnitTask } from '../../model/index.ts';
import { supportPositions } from '../common/supports.ts';
import { boxConcrete, laidKNm, stiffnessAt, type BoxConcrete } from './boxConcrete.ts';
import { boxData } from './boxData.ts';
import { boxLayout, type BoxLayout } from './boxLayout.ts';
import { boxTraffic, type BoxTraffic } from './boxTraffic.ts';
import { sharePowers } from './tendonShare.ts';
import { tendonShapes, type TendonShapes } from './tendonShape.ts';

/** Everything about a box that does not change while its thicknesses and tendons are sought. */
export interface BoxModel extends BoxConcrete {
  readonly task: UnitTask;
  readonly standardId: StandardId;
  readonly standard: LoadStandard;
  readonly layout: BoxLayout;
  readonly supportsM: readonly number[];
  readonly lengthM: number;
  /** Line beam of stiffness 1, less in lightweight concrete: forces do not depend on the whole, deflections are divided by EI. */
  readonly beam: LineBeam;
  /** That stiffness at the stations. */
  readonly stiffness: Float64Array;
  /** 1 over inner supports and over all supports, falling to 0 at a fifth of the span; at the stations. */
  readonly pierShare: Float64Array;
  readonly supportShare: Float64Array;
  readonly superimposed: Effects;
  readonly traffic: BoxTraffic;
  /** Parasitic moment of unit curvature that arches the deck upwards, on stiffness 1. */
  readonly archedKNm: Float64Array;
  /** Ways to share the strands out among the spans. */
  readonly tendonShapes: readonly TendonShapes[];
  /** Area of one strand, m2. */
  readonly strandM2: number;
  readonly leastWebM: number;
  readonly leastBottomM: number;
  readonly mostBottomM: number;
}

/** Lays out the box and places the loads that do not depend on its thicknesses. */
export function boxModel(task: UnitTask): BoxModel {
  const { spansM, standard: standardId, depthM } = task;
  const standard = loadStandard(standardId);
  const layout = boxLayout(task);
  const made = boxConcrete(task);
  const beam = lineBeam({ spansM, ...(made.light ? { eiKNm2: (xM: number) => stiffnessAt(made, xM) } : {}) });
  const stiffness = beam.xM.map((xM) => stiffnessAt(made, xM));
  const supportsM = supportPositions(spansM);
  const shares = shareOfSupports(spansM, beam);
  const launched = task.method === 'launch';
  const { bottomSlab } = boxData;
  const clearM = layout.spacingM - boxData.webLeastM[standardId];
  return {
    task,
    standardId,
    standard,
    ...made,
    layout,
    supportsM,
    lengthM: supportsM[supportsM.length - 1]!,
    beam,
    stiffness,
    ...shares,
    superimposed: uniform(beam, laidKNm(task)),
    traffic: boxTraffic(task, beam),
    archedKNm: imposedCurvature(beam, new Float64Array(beam.xM.length).fill(-1)).momentKNm,
    tendonShapes: sharePowers(spansM).map((power) => tendonShapes(spansM, beam, power, stiffness)),
    strandM2: boxData.strandAreaMm2[standardId] * 1e-6,
    leastWebM: launched ? boxData.webLeastLaunchedM[standardId] : boxData.webLeastM[standardId],
    leastBottomM: roundUp(
      Math.max(
        launched ? bottomSlab.leastLaunchedM : bottomSlab.leastM,
        clearM / bottomSlab.clearOverThickness,
      ),
    ),
    mostBottomM: Math.min(bottomSlab.mostM, bottomSlab.mostOverDepth * depthM),
  };
}

/** Thickness rounded up to the step of drawings, m. */
export function roundUp(thicknessM: number): number {
  const step = boxData.stepM.value;
  return Number((Math.ceil(thicknessM / step - 1e-6) * step).toFixed(6));
}

function shareOfSupports(
  spansM: readonly number[],
  beam: LineBeam,
): { pierShare: Float64Array; supportShare: Float64Array } {
  const n = beam.xM.length;
  const pierShare = new Float64Array(n);
  const supportShare = new Float64Array(n);
  const last = spansM.length - 1;
  spansM.forEach((spanM, span) => {
    const from = beam.supportAt[span]!;
    const reach = boxData.pierZone.overSpan * spanM;
    for (let i = from; i <= beam.supportAt[span + 1]!; i++) {
      const x = beam.xM[i]! - beam.xM[from]!;
      const left = Math.max(0, 1 - x / reach);
      const right = Math.max(0, 1 - (spanM - x) / reach);
      supportShare[i] = Math.max(left, right);
      pierShare[i] = Math.max(span > 0 ? left : 0, span < last ? right : 0);
    }
  });
  return { pierShare, supportShare };
}
