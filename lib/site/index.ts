export { addedFill } from './addedFill.ts';
export { CROSSFALL, constructionDepth } from './constructionDepth.ts';
export { deckSpec } from './deckSpec.ts';
export { groundAt, soffitLimitAt, stretchAt, waterDepthAt } from './lookups.ts';
export type { DepthAlong } from './depthAlong.ts';
export { headroomSpare, type HeadroomSpare } from './headroomSpare.ts';
export { profileFor, type ProfileRefusal, type ProfileResult } from './profileFor.ts';
export { survey } from './survey.ts';
export { roadLevelAt } from './roadLevelAt.ts';
