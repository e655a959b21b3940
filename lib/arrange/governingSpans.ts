import { SLACK, type Limits } from './limits.ts';
import type { UnitTask } from './unitTask.ts';

/**
 * Full search up to this many positions and for one end only: governing spans by half metres, by more where that makes
 * too many, and every number of spans. Longer crossings and approaches, which have many ends, take fewer
 * governing spans, in even steps of their logarithm, and numbers of spans near the fewest possible for each.
 */
const MANY = 700;
const FINEST_M = 0.5;
export const MORE_SPANS = 3;
const MOST_GOVERNING = 64;
const APPROACH_GOVERNING = 32;
const FEW_GOVERNING = 16;

function manyEnds(task: UnitTask): boolean {
  return task.lastEnd > task.firstEnd;
}

/** Whether every number of spans is laid out. */
export const isFull = (task: UnitTask): boolean => task.X.length <= MANY && !manyEnds(task);

/** Widest gap between neighbouring candidates that every layout has to span, m. */
function forcedSpan(X: Float64Array, last: number): number {
  let widest = 0;
  for (let i = 1; i <= last; i += 1) widest = Math.max(widest, X[i]! - X[i - 1]!);
  return widest;
}

/** Governing spans to try, rising, m; empty when the forced span is beyond the band. */
export function governingSpans(task: UnitTask): number[] {
  const { X, firstEnd, lastEnd, limits } = task;
  const least = Math.max(limits.minSpanM, forcedSpan(X, firstEnd));
  const most = Math.min(limits.maxSpanM, X[lastEnd]!);
  if (!(least <= most + SLACK)) return [];
  const range = most - least;
  const count = X.length > MANY ? FEW_GOVERNING : manyEnds(task) ? APPROACH_GOVERNING : MOST_GOVERNING;
  if (range <= count) {
    const steps = Math.min(Math.max(Math.ceil(range / FINEST_M - SLACK), 0), count);
    return Array.from({ length: steps + 1 }, (_, i) =>
      i === steps ? Math.max(most, least) : least + (i * range) / steps,
    );
  }
  const growth = (most / least) ** (1 / count);
  return Array.from({ length: count + 1 }, (_, i) => least * growth ** i);
}

/** Most spans worth trying with one governing span. */
export function mostSpans(task: UnitTask, governingM: number): number {
  const { limits, X, lastEnd } = task;
  const lengthM = X[lastEnd]!;
  const interior = Math.max(limits.minSpacingM, limits.interiorLeast * governingM);
  const room = Math.max(2, Math.floor(2 + (lengthM - 2 * limits.minSpacingM) / interior + SLACK));
  const ever = Math.min(limits.mostSpans, room);
  if (isFull(task)) return ever;
  return Math.min(ever, fewestSpans(limits, lengthM, governingM) + MORE_SPANS);
}

/** Fewest spans that can reach a length with one governing span. */
export function fewestSpans(limits: Limits, lengthM: number, governingM: number): number {
  if (lengthM <= governingM + SLACK) return 1;
  if (lengthM <= 2 * governingM + SLACK) return 2;
  return Math.max(3, Math.ceil(lengthM / governingM + 2 * (1 - Math.min(limits.endMost, 1)) - 1e-6));
}
