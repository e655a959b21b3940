import { materials } from '../../actions/index.ts';
import { gussetKg, strutKgPerM } from './bracingMember.ts';
import { compositeData } from './compositeData.ts';
import type { GirderModel } from './girderModel.ts';

/**
 * Bracing in plan of decks of several I-girders with long spans, kg: crossed diagonals between two girders from cross-frame
 * to cross-frame, which carry the wind on the girder face to the supports while there is no slab. 0 where the spans are
 * shorter, where frames of cross-girders hold the flanges, and in boxes.
 */
export function lateralBracingKg(model: GirderModel): number {
  const { task, layout, supportsM, braceAtM, girderM, standardId } = model;
  const { fromSpanM, windFactor, strutShare } = compositeData.lateral;
  if (layout.twin || model.plate !== undefined) return 0;
  const windKNm = windFactor * compositeData.crossGirder.windKNm2 * girderM;
  let kg = 0;
  task.spansM.forEach((spanM, span) => {
    if (!(spanM > fromSpanM)) return;
    const [from, to] = [supportsM[span]!, supportsM[span + 1]!];
    for (let b = 1; b < braceAtM.length; b++) {
      const [start, end] = [braceAtM[b - 1]!, braceAtM[b]!];
      if (start < from - 1e-6 || end > to + 1e-6) continue;
      const diagonalM = Math.hypot(end - start, layout.spacingM);
      // Shear of the panel, wind on part of the span only included: that of the end of the panel nearer to a support.
      const shearKN = windKNm * Math.max((from + to) / 2 - start, end - (from + to) / 2);
      const forceKN = (shearKN * diagonalM) / (2 * layout.spacingM);
      const perM = Math.max(
        strutKgPerM(diagonalM / 2, standardId),
        (materials.steelDensityKgM3 * forceKN) / (strutShare * model.yieldMPa(0.02) * 1e3),
      );
      kg += 2 * diagonalM * perM + compositeData.gusset.perPanel * gussetKg(perM);
    }
  });
  return kg;
}
