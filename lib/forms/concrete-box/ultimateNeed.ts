import { compressionDepth, faceBarsM2, strandDesignMPa } from './bendingCapacity.ts';
import { barDesignMPa } from '../common/bars.ts';
import { boxData } from './boxData.ts';
import type { OwnWeight } from './boxLoads.ts';
import type { BoxModel } from './boxModel.ts';
import type { SectionsAlong } from './sectionsAlong.ts';
import { betweenZeros, workingWidthM } from './shearLag.ts';
import type { LineNeed } from './serviceNeed.ts';
import type { TendonShapes } from './tendonShape.ts';
import { ultimateMoments } from './ultimateMoments.ts';

/**
 * Draped force of the heaviest span after all losses that ultimate bending asks for along a given line of the tendons, kN, with the
 * compression zone of the force of the pass before. Infinity where more force makes it worse.
 */
export function ultimateNeed(
  model: BoxModel,
  sections: SectionsAlong,
  own: OwnWeight,
  lastingMPa: number,
  straightM2: number,
  beforeKN: number,
  { share }: TendonShapes,
): LineNeed {
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
  return ({ depthM, parasiticM }, enough = Infinity) => {
    let most = 0;
    for (let i = 0; i < n; i++) {
      const m = prestress * parasiticM[i]!;
      const strength = grown * share[i]!;
      const sag = down[i]! - fixed[0][i]!;
      if (sag > 0) most = Math.max(most, over(sag, strength * (depthM[i]! - block[0][i]!) - m));
      const hog = up[i]! - fixed[1][i]!;
      if (hog > 0) most = Math.max(most, over(hog, strength * (task.depthM - depthM[i]! - block[1][i]!) + m));
      if (most >= enough) break;
    }
    return most;
  };
}

function over(moment: number, armM: number): number {
  return armM > 0 ? moment / armM : Infinity;
}
