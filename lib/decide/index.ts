export { afterEdit } from './afterEdit.ts';
export type { Contender } from './contender.ts';
export { changedOption, draftDecision } from './draftDecision.ts';
export { issuedOn, sinceIssued } from './issued.ts';
export { levelWith } from './levelWith.ts';
export { stand } from './stand.ts';
