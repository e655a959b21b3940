import { pretensioned } from './pretensioned.ts';
import type { PrecastModel } from './precastModel.ts';
import { mostRelieved, strandLimit, strandPlan, type StrandPlan } from './strandPlan.ts';
import { releaseUse, spanUse, type SpanUse } from './spanUse.ts';

/** Strands of the beams of one span and how they are used. */
export interface SpanStrands {
  readonly plan: StrandPlan;
  readonly use: SpanUse;
}

const fewest = 4;

/**
 * Fewest strands, in pairs, that hold a span in service and at ultimate; then as many of them draped or debonded as the
 * ends ask for at release, and pairs in the top flange where that is not enough. All that fit where even those do not hold.
 */
export function sizeStrands(model: PrecastModel, span: number): SpanStrands {
  let best = withTop(model, span, 0);
  for (let top = 2; top <= pretensioned.strand.mostTop && !(best.use.releaseTop.use <= 1); top += 2) {
    const next = withTop(model, span, top);
    if (next.use.tension.use > 1 && best.use.tension.use <= 1) break;
    best = next;
  }
  return best;
}

/** Strands of a span with `top` of them in the top flange. */
function withTop(model: PrecastModel, span: number, top: number): SpanStrands {
  const spanM = model.task.spansM[span]!;
  const most = 2 * Math.floor(strandLimit(model) / 2);
  const holds = (low: number): boolean => {
    const { tension, bending } = spanUse(model, span, strandPlan(model, spanM, low, 0, top));
    return tension.use <= 1 && bending.use <= 1;
  };
  let least = fewest / 2;
  let high = most / 2;
  while (least < high) {
    const mid = (least + high) >> 1;
    if (holds(2 * mid)) high = mid;
    else least = mid + 1;
  }
  let low = 2 * high;
  let plan = relieved(model, span, low, top);
  let use = spanUse(model, span, plan);
  // What is taken off the ends may be missed a little further in.
  while (low + 2 <= most && use.tension.use > 1 && use.releaseBottom.use <= 1) {
    low += 2;
    plan = relieved(model, span, low, top);
    use = spanUse(model, span, plan);
  }
  return { plan, use };
}

/** The plan with the fewest strands draped or debonded that the ends can stand at release. */
function relieved(model: PrecastModel, span: number, low: number, top: number): StrandPlan {
  const spanM = model.task.spansM[span]!;
  const most = mostRelieved(model, low);
  let plan = strandPlan(model, spanM, low, 0, top);
  for (let k = 0; k <= most; k += 2) {
    plan = strandPlan(model, spanM, low, k, top);
    const { releaseTop, releaseBottom } = releaseUse(model, span, plan);
    if (releaseTop.use <= 1 && releaseBottom.use <= 1) break;
  }
  return plan;
}
