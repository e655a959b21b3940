/** The front door: notebooks and tests of the whole import from here. */
export * from './model/index.ts';
export { appraise, appraiseSteps, type Step } from './appraise.ts';
export { appraiseOption, type PricedAppraisal } from './appraise/appraiseOption.ts';
export { formFacts } from './appraise/facts.ts';
export { sizer, type Sizer } from './appraise/sizer.ts';
export { workbench, type Workbench } from './appraise/workbench.ts';
export { publishedBands, type BandColumn, type PublishedBand } from './bands/publishedBands.ts';
export { formModule, sizeableForms } from './forms/index.ts';
export { guide, type Guide, type GuideForm } from './guide.ts';
export { sentence } from './messages/index.ts';
export { drawDrivers, drawRates, ratePacks, ratesFor } from './price/index.ts';
export { depthBand, endRatioWindow, spanWindow } from './rules/index.ts';
export { constructionDepth, groundAt, roadLevelAt, soffitLimitAt, stretchAt, survey, waterDepthAt } from './site/index.ts';
export { fingerprint, parseStudy, readStudy, writeStudy } from './study/index.ts';
export { items } from './takeoff/index.ts';
