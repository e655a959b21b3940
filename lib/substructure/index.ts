export { deckOnSupport, standPierBetween } from './standPierBetween.ts';
export { trialAsk, type DeckOnSupport } from './trialAsk.ts';
export { strikesAt } from './strikesAt.ts';
export { settingAt, type Setting } from './setting.ts';
export { placeText } from './placeText.ts';
export { standOneSupport } from './standOneSupport.ts';
export type { SupportAsk } from './supportAsk.ts';
export { standSupports } from './standSupports.ts';
export { expectedLines, foundationsCost } from './supportLines.ts';
