import { pretensioned } from './pretensioned.ts';
import type { PrecastModel } from './precastModel.ts';
import { strandLosses, type StrandStress } from './strandLosses.ts';
import { mostStrands, strandCentroidM } from './strandRows.ts';

/** Strands of one beam: how many, at what level, and what is done with them towards the ends. */
export interface StrandPlan {
  /** All strands, and those of them in the top flange that hold it together at release. */
  readonly count: number;
  readonly top: number;
  /** Draped or debonded strands. */
  readonly relieved: number;
  /** Centroid above the soffit at midspan and at the ends, of the strands that act there, m. */
  readonly midM: number;
  readonly endM: number;
  readonly stress: StrandStress;
}

/** Strands at one section: area m2 and height above the soffit m. */
export interface StrandsThere {
  areaM2: number;
  zM: number;
}

/** Most strands that fit in a beam, an even number. */
export function strandLimit(model: PrecastModel): number {
  return mostStrands(model.shape.rows);
}

/**
 * Plan of `low` strands from the bottom up (even), `relieved` of them draped or debonded, and `top` in the top flange, for
 * a span of `spanM`.
 */
export function strandPlan(
  model: PrecastModel,
  spanM: number,
  low: number,
  relieved: number,
  top = 0,
): StrandPlan {
  const { shape, standardId } = model;
  const count = low + top;
  const topM = shape.depthM - pretensioned.strand.axisM[standardId];
  const lowM = strandCentroidM(shape.rows, low);
  const midM = (low * lowM + top * topM) / count;
  const stress = strandLosses(model, count, shape.centroidM - midM, spanM);
  if (relieved === 0) return { count, top, relieved, midM, endM: midM, stress };
  if (model.kind.relief[standardId] === 'debonded') {
    const endM = ((low - relieved) * lowM + top * topM) / (count - relieved);
    return { count, top, relieved, midM, endM, stress };
  }
  const rows = usedRows(model, low);
  const pairs = relieved / 2;
  // Pairs of the middle columns from the uppermost row used, raised to as many rows under the top.
  const lifted = rows.slice(Math.max(0, rows.length - pairs));
  const before = lifted.reduce((sum, zM) => sum + zM, 0) / Math.max(1, lifted.length);
  const pitch = pretensioned.strand.pitchM[standardId];
  const after = shape.depthM - pretensioned.relief.drapedTopM - ((pairs - 1) * pitch) / 2;
  const endM = midM + (relieved / count) * (after - before);
  return { count, top, relieved, midM, endM, stress };
}

/** Most strands that may be draped or debonded, an even number. */
export function mostRelieved(model: PrecastModel, low: number): number {
  const kind = model.kind.relief[model.standardId];
  const share = 2 * Math.floor((pretensioned.relief[kind].mostShare * low) / 2 + 1e-9);
  return kind === 'draped' ? Math.min(share, 2 * usedRows(model, low).length) : share;
}

/** Heights of the rows that `count` strands fill or begin, m. */
function usedRows(model: PrecastModel, count: number): number[] {
  const heights: number[] = [];
  let left = count;
  for (const row of model.shape.rows) {
    if (left <= 0) break;
    heights.push(row.zM);
    left -= row.count;
  }
  return heights;
}

/**
 * Strands that act at a share of the span from the nearer end: all of them within the middle; towards the end fewer
 * where debonded in even steps, higher where draped.
 */
export function strandsAt(model: PrecastModel, plan: StrandPlan, share: number, out: StrandsThere): void {
  const { standardId, strandM2 } = model;
  const kind = model.kind.relief[standardId];
  const near = Math.min(1, Math.max(0, Math.min(share, 1 - share) / pretensioned.relief[kind].endOver));
  if (kind === 'debonded') {
    const off = (1 - near) * plan.relieved;
    const low =
      (plan.count * plan.midM - (plan.count - plan.relieved) * plan.endM) / Math.max(1, plan.relieved);
    out.areaM2 = (plan.count - off) * strandM2;
    out.zM = (plan.count * plan.midM - off * low) / (plan.count - off);
  } else {
    out.areaM2 = plan.count * strandM2;
    out.zM = plan.endM + near * (plan.midM - plan.endM);
  }
}
