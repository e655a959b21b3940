import { barDesignMPa } from '../common/bars.ts';
import { slabData } from '../common/slab/slabData.ts';
import type { FaceNeed } from './barNeeds.ts';
import { slabDeckData } from './slabDeckData.ts';
import type { SlabModel } from './slabModel.ts';

/**
 * Steel of the top bars at the two obtuse corners of a skew slab, m3: both ways over a share of the shorter of end span and
 * width from the corner, each way a share of the bars that the soffit of the end span would need without tendons. The rule
 * is that of a corner held down of a slab on its edges (see data), as an obtuse corner is; none on a slight skew.
 */
export function cornerBarsM3(
  model: SlabModel,
  low: Pick<FaceNeed, 'designKNm' | 'effectiveM' | 'widthM'>,
): number {
  const { task, standardId, beam } = model;
  const { fromSkewDeg, reachShare, areaShare } = slabDeckData.cornerBars;
  if (!((task.skewDeg ?? 0) >= fromSkewDeg)) return 0;
  const perKNm =
    1 / (low.widthM * slabData.leverRatio.value * low.effectiveM * barDesignMPa(standardId) * 1e3);
  const corner = (span: number): number => {
    const moments = low.designKNm.subarray(beam.supportAt[span], beam.supportAt[span + 1]! + 1);
    const areaM2PerM = areaShare * Math.max(...moments) * perKNm;
    const reachM = reachShare * Math.min(task.spansM[span]!, task.deck.widthM);
    return 2 * areaM2PerM * reachM ** 2;
  };
  return corner(0) + corner(task.spansM.length - 1);
}
