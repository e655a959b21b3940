export { askedOf } from './asked.ts';
export { fillGround, groundLabels } from './fillGround.ts';
export { asPriceDate } from './priceDate.ts';
export { parseStudy, readDraft, readStudy } from './readStudy.ts';
export { studySchema, studyVersion } from './schema.ts';
export { fingerprint, writeStudy } from './writeStudy.ts';
