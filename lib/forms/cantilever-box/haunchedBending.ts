import { bendingCapacity, blockDepth, faceBarsM2 } from '../concrete-box/bendingCapacity.ts';
import type { BendingUse } from '../concrete-box/ultimateBending.ts';
import { cantileverData } from './cantileverData.ts';
import { betweenZeros, workingWidthM } from '../concrete-box/shearLag.ts';
import type { CantileverModel } from './cantileverModel.ts';
import type { FoundStrands } from './findStrands.ts';
import type { HaunchedSections } from './sectionsAlong.ts';
import type { StagedWeight } from './stages.ts';
import { strandStates, ultimateInUse } from './tendonNeeds.ts';

/** Ultimate bending of a haunched deck where it is used most. */
export interface HaunchedBending {
  readonly sag: BendingUse;
  readonly hog: BendingUse;
  /** The free cantilever with its traveller. */
  readonly stage: BendingUse;
}

const nil: BendingUse = { use: 0, demandKNm: 0, capacityKNm: 1, station: 0 };

/** Ultimate bending at every station: the deck in use, parasitic moments included, and its arms before they are joined. */
export function haunchedBending(
  model: CantileverModel,
  sections: HaunchedSections,
  weight: StagedWeight,
  found: FoundStrands,
): HaunchedBending {
  const { layout, task } = model;
  const { coverM: topCover } = cantileverData.topTendons;
  const { coverM: lowCover } = cantileverData.bottomTendons;
  const flangeWidthM = workingWidthM(layout, betweenZeros(task.spansM).inSpanM);
  const n = sections.areaM2.length;
  let [sag, hog, stage] = [nil, nil, nil];
  for (let i = 0; i < n; i++) {
    const depth = model.depthM[i]!;
    const websM = layout.webs * sections.webM[i]!;
    const widthM = sections.bottomWidthM[i]!;
    const { sagging, hogging, free } = designMoments(model, weight, found, i);
    if (sagging > 0) {
      const capacity = bendingCapacity(
        model,
        {
          strandM2: found.bottom[i]! * model.strandM2,
          strandDepthM: depth - lowCover,
          barM2: faceBarsM2(widthM),
          barDepthM: depth - lowCover / 2,
        },
        { widthM: flangeWidthM, flangeM: layout.slab.meanM, websM },
      );
      sag = worse(sag, sagging, capacity, i);
    }
    const most = Math.max(hogging, free);
    if (!(most > 0)) continue;
    const capacity = bendingCapacity(
      model,
      {
        strandM2: found.top[i]! * model.strandM2,
        strandDepthM: depth - topCover,
        barM2: faceBarsM2(task.deck.widthM),
        barDepthM: depth - topCover / 2,
      },
      { widthM, flangeM: sections.bottomM[i]!, websM },
    );
    if (hogging > 0) hog = worse(hog, hogging, capacity, i);
    if (free > 0) stage = worse(stage, free, capacity, i);
  }
  return { sag, hog, stage };
}

/** Depth of the compression zone that hogging asks for at every station, m; 0 where it sags. */
export function zonesM(
  model: CantileverModel,
  sections: HaunchedSections,
  weight: StagedWeight,
  found: FoundStrands,
): Float64Array {
  const { coverM } = cantileverData.topTendons;
  return sections.bottomWidthM.map((widthM, i) => {
    const { hogging, free } = designMoments(model, weight, found, i);
    const most = Math.max(hogging, free);
    return most > 0 ? blockDepth(model, most, model.depthM[i]! - coverM, widthM) : 0;
  });
}

/** Design moments of a station, kNm: in use sagging and hogging (taken positive), and hogging of the free arm. */
function designMoments(
  model: CantileverModel,
  weight: StagedWeight,
  found: FoundStrands,
  i: number,
): { sagging: number; hogging: number; free: number } {
  const { open, lasting } = strandStates(model, found.stresses);
  const { max, min } = ultimateInUse(model, weight, found.use, [open, lasting], found, i);
  const { permanent } = model.standard.factors.uls;
  return { sagging: max, hogging: -min, free: -permanent * weight.cantileverKNm[i]! };
}

function worse(known: BendingUse, demandKNm: number, capacityKNm: number, station: number): BendingUse {
  const use = capacityKNm > 0 ? demandKNm / capacityKNm : Infinity;
  return use > known.use ? { use, demandKNm, capacityKNm, station } : known;
}
