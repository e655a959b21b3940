/**
 * A place to be filled in a reason template: `{fact}`, `{limit:fact}`, or `{fact?one|more}`, whose words are those for
 * one or for any other number. Matches `limit:`, the fact, and the two words.
 */
export const placeholder = /\{(limit:)?([A-Za-z0-9]+)(?:\?([^|{}]*)\|([^|{}]*))?\}/g;

/** Ids of facts named between braces in a reason template. */
export function namedIn(template: string): readonly string[] {
  return [...template.matchAll(placeholder)].map((match) => match[2]!);
}

/** Ids of facts whose number decides between words in a reason template. */
export function countedIn(template: string): readonly string[] {
  return [...template.matchAll(placeholder)]
    .filter((match) => match[3] !== undefined)
    .map((match) => match[2]!);
}
