export { afflux } from './afflux.ts';
export { flowAt, siltFactor, type FlowAt } from './flowAt.ts';
export { floodSection, type FloodSection } from './floodSection.ts';
export { laceyDepth, laceyWidth, siltFactorOf } from './lacey.ts';
export { pierScour } from './pierScour.ts';
export { type RiverFlow } from './riverFlow.ts';
export { riversAt } from './riversAt.ts';
export { scourAt } from './scourAt.ts';
