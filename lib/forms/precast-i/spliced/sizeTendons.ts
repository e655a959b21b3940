import { mostStrands } from '../../common/precast/strandRows.ts';
import { straightStrands, type SplicedModel, type StraightStrands } from './splicedModel.ts';
import { splicedData } from './splicedData.ts';
import {
  layTendons,
  tendonMoments,
  tendonUse,
  type TendonMoments,
  type Tendons,
  type TendonUse,
} from './tendonUse.ts';

/** Tendons of a beam with their moments and how the beam is used. */
export interface SizedTendons {
  readonly straight: StraightStrands;
  readonly tendons: Tendons;
  readonly moments: TendonMoments;
  readonly use: TendonUse;
}

/** What a search has found so far: least excess of a stage, 1 at least, and least strand. */
interface Search {
  best: SizedTendons | undefined;
  worst: number;
  areaM2: number;
}

/**
 * Fewest strands in tendons, and the part of them in the first stage, with which every stage holds, with no more strands on the
 * bed than pieces need to carry themselves; where none does, with half of what fits there and with all; else those whose worst
 * stage is least over its limit.
 */
export function sizeTendons(model: SplicedModel): SizedTendons {
  const most = splicedData.tendons.strands * splicedData.tendons.most;
  const least = model.straight.count;
  const fits = mostStrands(model.shape.rows);
  const search: Search = { best: undefined, worst: Infinity, areaM2: Infinity };
  for (const bed of new Set([least, 2 * Math.round((least + fits) / 4), fits])) {
    const straight = straightStrands(model, bed);
    // What tendons hold up only gets better with more of them: where all of them do not, fewer do not.
    if (keepBetter(model, straight, most, search) || !lacking(search)) {
      for (let count = 10; count < most; count += 10) if (keepBetter(model, straight, count, search)) break;
      const from = search.best!.tendons.strands;
      for (let count = from - 2; search.worst <= 1 && count > from - 10; count -= 2)
        if (!keepBetter(model, straight, count, search)) break;
    }
    if (search.worst <= 1) break;
  }
  return search.best!;
}

/** True where the best so far lacks tendons rather than has too many of them. */
function lacking({ best }: Search): boolean {
  return !best || Math.max(best.use.serviceSoffit.use, best.use.serviceTop.use, best.use.bending.use) > 1;
}

/** Tries the parts of the first stage; true where one of them holds. Of those that hold the least strand is kept. */
function keepBetter(model: SplicedModel, straight: StraightStrands, count: number, search: Search): boolean {
  const laid = layTendons(model, count, 0);
  const moments = tendonMoments(model, laid);
  const areaM2 = count * model.tendonM2 + straight.count * model.strandM2;
  let held = false;
  for (const share of splicedData.stages.firstShares) {
    const tendons = { ...laid, first: share * count };
    const use = tendonUse(model, straight, tendons, moments);
    const worst = Math.max(1, ...Object.values(use).map((one: TendonUse['bending']) => one.use));
    held ||= worst <= 1;
    if (worst > search.worst || (worst === search.worst && areaM2 >= search.areaM2)) continue;
    search.worst = worst;
    search.areaM2 = areaM2;
    search.best = { straight, tendons, moments, use };
  }
  return held;
}
