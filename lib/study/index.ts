export { askedOf } from './asked.ts';
export { assumedAgain, confirmed, isAssumed, stillAssumed } from './assumed.ts';
export { fillGround, groundLabels } from './fillGround.ts';
export { asPriceDate } from './priceDate.ts';
export { parseStudy, readDraft, readStudy } from './readStudy.ts';
export { startValueAt, startValues, startValueWords } from './startValues.ts';
export { studySchema, studyVersion } from './schema.ts';
export { fingerprint, writeStudy } from './writeStudy.ts';
