let last = 0;

/** An id no other element of the page has. */
export function nextId(kind: string): string {
  last += 1;
  return `${kind}-${String(last)}`;
}
