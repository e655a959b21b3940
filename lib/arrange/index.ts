export { arrange } from './arrange.ts';
export { SOFT_ZONE_EXTRA } from './curves.ts';
export { faultsOf } from './faults.ts';
export { governingSpan, tableCost } from './tableCost.ts';
export type { ArrangeRequest, ArrangeResult, Relaxation, Windows } from './request.ts';
