export { addedFill } from './addedFill.ts';
export { deckSpec } from './deckSpec.ts';
export { groundAt, soffitLimitAt, stretchAt, waterDepthAt } from './lookups.ts';
export { profileFor, type DepthAlong, type ProfileRefusal, type ProfileResult } from './profileFor.ts';
export { survey } from './survey.ts';
