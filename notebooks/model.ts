/** The shapes of the pipeline as the pages read them: one place to import them from. */
export type * from '../lib/index.ts';
export {
  PIER_HALF_WIDTH_M,
  abutmentWindows,
  billParts,
  constructionDepth,
  depthMissed,
  families,
  familyOf,
  formIds,
  roadLevelAt,
  siteOf,
} from '../lib/index.ts';
