import { scaleLinear } from 'd3-scale';
import type { Spread } from '../model.ts';

/** A level axis: pixels of a value, and the round values to mark. */
export interface Axis {
  readonly x: (value: number) => number;
  readonly ticks: readonly number[];
  readonly from: number;
  readonly to: number;
}

/** Linear axis over the given values, no longer than needed, with about `count` marks at round values. */
export function linearAxis(values: readonly number[], left: number, right: number, count = 6): Axis {
  const known = values.filter(Number.isFinite);
  const low = known.length === 0 ? 0 : Math.min(...known);
  const high = known.length === 0 ? 1 : Math.max(...known);
  const pad = (high - low || Math.abs(high) || 1) * 0.03;
  const scale = scaleLinear([low - pad, high + pad], [left, right]);
  return { x: (value) => scale(value), ticks: scale.ticks(count), from: low - pad, to: high + pad };
}

/** Figures a cost is printed with; see `money2`. */
const COST_FIGURES = 2;

/**
 * Linear axis over costs: its marks are at most `count` or so, in even steps that two figures of a cost can print. Where
 * no even step can (costs that differ by less than that), only those marks stay that can be printed so.
 */
export function costAxis(values: readonly number[], left: number, right: number, count = 6): Axis {
  const isPrintable = (tick: number): boolean => Number(tick.toPrecision(COST_FIGURES)) === tick;
  for (let fewer = count; fewer > 1; fewer -= 1) {
    const axis = linearAxis(values, left, right, fewer);
    if (axis.ticks.length > 1 && axis.ticks.every(isPrintable)) return axis;
  }
  const axis = linearAxis(values, left, right, count);
  return { ...axis, ticks: axis.ticks.filter(isPrintable) };
}

/** Every figure of some spreads and limits, for an axis. */
export const spreadValues = (spreads: readonly Spread[], more: readonly number[] = []): number[] => [
  ...spreads.flatMap((spread) => [spread.p10, spread.p90]),
  ...more,
];
