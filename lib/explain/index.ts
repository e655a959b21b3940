export type { Context } from './at.ts';
export { trialContext, trialFigure } from './trialFigure.ts';
export { reachFigure, reachPath } from './reachFigure.ts';
export { figure, figurePaths, rebuilt } from './figure.ts';
