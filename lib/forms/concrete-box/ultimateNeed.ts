import { compressionDepth, faceBarsM2, strandDesignMPa } from './bendingCapacity.ts';
import { barDesignMPa } from '../common/bars.ts';
import { boxData } from './boxData.ts';
import type { OwnWeight } from './boxLoads.ts';
import type { BoxModel } from './boxModel.ts';
import type { SectionsAlong } from './sectionsAlong.ts';
import { betweenZeros, workingWidthM } from './shearLag.ts';
import type { StationNeed } from './stationNeed.ts';
import type { TendonShapes } from './tendonShape.ts';
import { ultimateMoments } from './ultimateMoments.ts';

/**
 * Draped force of the heaviest span after all losses that ultimate bending asks for at a station, kN, with the compression zone of
 * the force of the pass before. Infinity where more force makes it worse.
 */
export function ultimateNeed(
  model: BoxModel,
  sections: SectionsAlong,
  own: OwnWeight,
  lastingMPa: number,
  straightM2: number,
  beforeKN: number,
  { share }: TendonShapes,
): StationNeed {
  const { task, layout, standard } = model;
  const { down, up } = ultimateMoments(model, own);
  const grown = strandDesignMPa(model) / lastingMPa;
  const ductCover = boxData.ductCoverM.value;
  const bar = barDesignMPa(model.standardId) * 1e3;
  const straightKN = (straightM2 / 2) * strandDesignMPa(model) * 1e3;
  const bars = [bar * faceBarsM2(sections.span.bottomWidthM), bar * faceBarsM2(task.deck.widthM)] as const;
  const flangeWidthM = workingWidthM(layout, betweenZeros(task.spansM).inSpanM);
  const n = down.length;
  const fixed = [new Float64Array(n), new Float64Array(n)] as const;
  const block = [new Float64Array(n), new Float64Array(n)] as const;
  for (let i = 0; i < n; i++) {
    const websM = layout.webs * sections.webM[i]!;
    const faces = [
      { widthM: flangeWidthM, flangeM: layout.slab.meanM, websM },
      // Over the piers the slab grows with the compression zone.
      {
        widthM: sections.span.bottomWidthM,
        flangeM: model.pierShare[i]! > 0 ? model.mostBottomM : sections.bottomM[i]!,
        websM,
      },
    ] as const;
    faces.forEach((face, side) => {
      const c = compressionDepth(model, face, beforeKN * grown * share[i]! + straightKN + bars[side]!);
      block[side]![i] = c;
      fixed[side]![i] =
        straightKN * (task.depthM - ductCover - c) + bars[side]! * (task.depthM - ductCover / 2 - c);
    });
  }
  const prestress = standard.factors.uls.prestress;
  const [fixedSag, fixedHog] = fixed;
  const [blockSag, blockHog] = block;
  return (i, { depthM, parasiticM, share: shared }) => {
    const m = prestress * parasiticM;
    const strength = grown * shared;
    const sag = down[i]! - fixedSag[i]!;
    const forSag = sag > 0 ? over(sag, strength * (depthM - blockSag[i]!) - m) : 0;
    const hog = up[i]! - fixedHog[i]!;
    const forHog = hog > 0 ? over(hog, strength * (task.depthM - depthM - blockHog[i]!) + m) : 0;
    return Math.max(forSag, forHog);
  };
}

function over(moment: number, armM: number): number {
  return armM > 0 ? moment / armM : Infinity;
}
