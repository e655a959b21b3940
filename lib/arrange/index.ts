export { arrange, fits } from './arrange.ts';
export { faultsOf } from './faults.ts';
export { flatTable } from './relaxations.ts';
export { governingSpan, tableCost } from './tableCost.ts';
export type { ArrangeRequest, ArrangeResult, Relaxation, Windows } from './request.ts';
