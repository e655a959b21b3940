/** Equal elements a span is divided into; plates are constant within one. */
export const elementsPerSpan = 20;
