import type { ArrangeRequest } from '../../lib/arrange/index.ts';

const composite = { minSpanM: 25, maxSpanM: 120, endRatio: [0.5, 1] } as const;

/** One request per pattern, with windows of the usual order; common practice, no source. */
export const demoRequests: readonly ArrangeRequest[] = [
  {
    form: 'composite-i',
    method: 'launch',
    pattern: { kind: 'continuous' },
    windows: composite,
    pierHalfWidthM: 1.25,
  },
  {
    form: 'concrete-box',
    method: 'falsework',
    pattern: { kind: 'continuous' },
    windows: { minSpanM: 25, maxSpanM: 75, endRatio: [0.5, 1] },
    pierHalfWidthM: 1.25,
  },
  {
    form: 'truss',
    method: 'float-in',
    pattern: { kind: 'simple-main', approach: 'composite-i' },
    windows: { minSpanM: 45, maxSpanM: 150, endRatio: [0.5, 1] },
    approach: { ...composite, minSpanM: 20 },
    pierHalfWidthM: 1.25,
  },
  {
    form: 'cable-stayed',
    method: 'stay-cantilever',
    pattern: { kind: 'pylon', approach: 'composite-i', onePylonBack: [0.5, 0.9], twoPylonSide: [0.35, 0.5] },
    windows: { minSpanM: 60, maxSpanM: 500, endRatio: [0.35, 0.9] },
    approach: { ...composite, minSpanM: 20 },
    pierHalfWidthM: 1.5,
  },
];
