/** The shapes of the pipeline as the pages read them: one place to import them from. */
export type * from '../lib/index.ts';
export {
  PIER_HALF_WIDTH_M,
  abutmentWindows,
  bearingLevel,
  billParts,
  constructionDepth,
  depthMissed,
  families,
  familyOf,
  formIds,
  groundAt,
  roadLevelAt,
  siteOf,
} from '../lib/index.ts';
