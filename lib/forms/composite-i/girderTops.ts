import type { UnitTask } from '../../model/index.ts';
import type { SlabDesign } from '../common/slab/designSlab.ts';
import { compositeData } from './compositeData.ts';
import { elementsPerSpan } from './elementsPerSpan.ts';
import type { GirderLayout } from './girderLayout.ts';
import { bareGirder, type GirderTop } from './girderSection.ts';

/** What acts above the steel girder by element; see `GirderModel`. */
export interface GirderTops {
  readonly short: readonly GirderTop[];
  readonly lasting: readonly GirderTop[];
  readonly cracked: readonly GirderTop[];
  readonly isCracked: Uint8Array;
  readonly shrinkageKN: Float64Array;
}

/**
 * Slab and bars that act with one girder in every element, for short loads, lasting loads and cracked, and the force of
 * prevented shrinkage.
 * @param modularRatio of moduli for short loads
 */
export function girderTops(
  task: UnitTask,
  layout: GirderLayout,
  slab: SlabDesign,
  modularRatio: number,
  modulusMPa: number,
): GirderTops {
  const { spansM } = task;
  const count = spansM.length * elementsPerSpan;
  const short: GirderTop[] = [];
  const lasting: GirderTop[] = [];
  const cracked: GirderTop[] = [];
  const isCracked = new Uint8Array(count);
  const shrinkageKN = new Float64Array(count);
  const tributaryM = task.deck.widthM / layout.count;
  const thicknessM = slab.meanM;
  // The soffit of the slab stands on the girder at the line; its mean thickness hangs from the level top.
  const slabAboveM = slab.rootM - thicknessM / 2;
  const n1 = modularRatio * compositeData.longTermRatio.value;
  const last = spansM.length - 1;
  let lastWidthM = NaN;
  for (let e = 0; e < count; e++) {
    const span = Math.floor(e / elementsPerSpan);
    const along = ((e % elementsPerSpan) + 0.5) / elementsPerSpan;
    const share = compositeData.crackedShare.value;
    const atLeft = span > 0 && along < share;
    const atRight = span < last && along > 1 - share;
    isCracked[e] = atLeft || atRight ? 1 : 0;
    const widthM = effectiveWidth(task, span, atLeft ? span : atRight ? span + 1 : -1, tributaryM);
    const area = widthM * thicknessM;
    const own = (area * thicknessM * thicknessM) / 12;
    if (widthM === lastWidthM) {
      short.push(short[e - 1]!);
      lasting.push(lasting[e - 1]!);
      cracked.push(cracked[e - 1]!);
    } else {
      const bars = compositeData.barsOverPiers[task.standard] * area;
      const top = (n: number): GirderTop => ({
        slabAreaM2: area / n,
        slabInertiaM4: own / n,
        slabAboveM,
        barAreaM2: 0,
        barAboveM: slabAboveM,
      });
      short.push(top(modularRatio));
      lasting.push(top(n1));
      cracked.push({ ...bareGirder, slabAboveM, barAreaM2: bars, barAboveM: slabAboveM });
    }
    lastWidthM = widthM;
    shrinkageKN[e] = isCracked[e] === 1 ? 0 : (compositeData.shrinkage.strain * modulusMPa * 1e3 * area) / n1;
  }
  return { short, lasting, cracked, isCracked, shrinkageKN };
}

/** Slab that acts with one girder, m: Le/8 on each side under the European standard, all of it in the other. */
function effectiveWidth(task: UnitTask, span: number, support: number, tributaryM: number): number {
  if (task.standard === 'hl93') return tributaryM;
  const { spansM } = task;
  const lag = compositeData.shearLag;
  const last = spansM.length - 1;
  const lengthM =
    support >= 0
      ? lag.atSupport * (spansM[support - 1]! + spansM[support]!)
      : last === 0
        ? spansM[span]!
        : (span === 0 || span === last ? lag.endSpan : lag.innerSpan) * spansM[span]!;
  return Math.min(tributaryM, (2 * lengthM) / lag.eachSide);
}
