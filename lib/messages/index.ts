export { inText } from './inText.ts';
export { fileSentence, placeOf, remedyFor, sentence, sentences } from './messages.ts';
