export { graph } from './graph.ts';
export type { Graph } from './graph.ts';
export type { Cell, Equal, Input, Policy, Progress, SlowRun, State, Uses, Values } from './cell.ts';
