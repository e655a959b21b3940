export { appraiser } from './appraiser.ts';
export type { Appraiser } from './appraiser.ts';
export { reacher } from './reacher.ts';
export type { Reacher } from './reacher.ts';
export { run, sliced } from './sliced.ts';
export type { Slicing, Steps } from './sliced.ts';
