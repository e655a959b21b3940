import type { OwnWeight } from './boxLoads.ts';
import type { BoxModel } from './boxModel.ts';

/** Design moments without the parasitic part of the tendons at the stations, kNm: sagging, and hogging taken positive. */
export function ultimateMoments(
  model: BoxModel,
  own: OwnWeight,
): { readonly down: Float64Array; readonly up: Float64Array } {
  const { uls } = model.standard.factors;
  const { most } = model.traffic;
  const n = most.momentMaxKNm.length;
  const down = new Float64Array(n);
  const up = new Float64Array(n);
  for (let i = 0; i < n; i++) {
    const lasting =
      uls.permanent * own.effects.momentKNm[i]! + uls.superimposed * model.superimposed.momentKNm[i]!;
    down[i] = lasting + uls.traffic * most.momentMaxKNm[i]!;
    up[i] = -lasting - uls.traffic * most.momentMinKNm[i]!;
  }
  return { down, up };
}
