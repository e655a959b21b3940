export { appraiser } from './appraiser.ts';
export type { Appraiser } from './appraiser.ts';
export { run, sliced } from './sliced.ts';
export type { Slicing, Steps } from './sliced.ts';
