export { inText } from './inText.ts';
export { placeOf, remedyFor, sentence, sentences } from './messages.ts';
