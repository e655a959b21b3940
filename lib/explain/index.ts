export type { Context } from './at.ts';
export { figure, figurePaths, rebuilt } from './figure.ts';
