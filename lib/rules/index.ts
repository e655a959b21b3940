export { bibliography, fact, factDictionary, rule, rules, rulesFor, source } from './book.ts';
export { evaluate, type Evaluated, type Truth } from './evaluate.ts';
export { flip } from './flip.ts';
export { cite, printed } from './reason.ts';
export type { Condition, Fact, Rule, Source, Subject } from './rule.ts';
export { checkFacts, missingFacts, rulingOf, rulingsFor, type MissingFact } from './rulingsFor.ts';
export { statusChange, statusFlip, statusOf } from './statusOf.ts';
export {
  depthBand,
  depthMeasure,
  endRatioWindow,
  leastOfTwoSpans,
  floorBand,
  haunchedDepthBands,
  leastHeadroomSpareM,
  midspanDepthBand,
  sideRatioWindow,
  spanWindow,
  windowOf,
  type DepthMeasure,
  type Interval,
} from './windows.ts';
export { withRatios } from './withRatios.ts';
export { verdictOf, wholeCondition, type Verdict } from './verdictOf.ts';
