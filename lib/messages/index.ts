export { placeOf, remedyFor, sentence, sentences } from './messages.ts';
