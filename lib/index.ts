/** The front door: notebooks and tests of the whole import from here. */
export * from './model/index.ts';
export { appraise, appraiseSteps } from './appraise.ts';
export { conclude, optionsOf } from './appraise/conclude.ts';
export { formsAsked, formsInParts } from './appraise/formsAsked.ts';
export {
  laySteps,
  proposeSteps,
  workOutSteps,
  type FormProposals,
  type LaidRow,
  type Outcome,
  type Share,
  type Step,
  type Steps,
} from './appraise/parts.ts';
export { appraiseKept, type KeptAppraisal } from './appraise/appraiseKept.ts';
export { choiceProblems } from './appraise/choiceProblems.ts';
export { depthMissed } from './appraise/depthMissed.ts';
export { depthBandOf, depthTrials } from './appraise/depthTrials.ts';
export {
  formReach,
  limitM,
  type FormReach,
  type NoReach,
  type PlainDeck,
  type SpanReached,
} from './appraise/formReach.ts';
export { formFacts } from './appraise/facts.ts';
export { PIER_HALF_WIDTH_M } from './appraise/requestFor.ts';
export { ruledOut } from './appraise/ruledOut.ts';
export { memory, type Memory } from './appraise/memory.ts';
export { workbench, type Workbench } from './appraise/workbench.ts';
export { publishedBands, type BandColumn, type PublishedBand } from './bands/publishedBands.ts';
export {
  figure,
  figurePaths,
  reachFigure,
  reachPath,
  trialFigure,
  type Context as FigureContext,
} from './explain/index.ts';
export { formModule, sizeableForms } from './forms/index.ts';
export {
  builtBucket,
  builtShares,
  builtSpans,
  type BuiltBucket,
  type BuiltClass,
  type BuiltSpans,
} from './bands/builtSpans.ts';
export { spanSources, type SpanSource } from './bands/spanSources.ts';
export { afterEdit, changedOption, draftDecision, issuedOn, levelWith, sinceIssued } from './decide/index.ts';
export { depthGuidance, type DepthGuidance } from './depthGuidance.ts';
export { guide, type Guide, type GuideForm, type GuideTask } from './guide.ts';
export { sentence } from './messages/index.ts';
export { drawDrivers, drawRates, ratePacks, ratesFor } from './price/index.ts';
export { depthBand, endRatioWindow, fact, printed, source, spanWindow, type Source } from './rules/index.ts';
export {
  CROSSFALL,
  abutmentWindows,
  bearingLevel,
  constructionDepth,
  groundAt,
  roadLevelAt,
  siteOf,
  soffitLimitAt,
  stretchAt,
  survey,
  waterDepthAt,
} from './site/index.ts';
export {
  asPriceDate,
  askedOf,
  assumedAgain,
  confirmed,
  fillGround,
  fingerprint,
  groundLabels,
  isAssumed,
  parseStudy,
  readDraft,
  readStudy,
  startValueWords,
  startValues,
  studyVersion,
  writeStudy,
} from './study/index.ts';
export { items } from './takeoff/index.ts';
