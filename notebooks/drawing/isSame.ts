/** Whether two values of plain data (objects, lists, text, numbers) say the same, to any depth. */
export function isSame(a: unknown, b: unknown): boolean {
  if (Object.is(a, b)) return true;
  if (typeof a !== 'object' || typeof b !== 'object' || a === null || b === null) return false;
  if (Array.isArray(a) !== Array.isArray(b)) return false;
  const [one, other] = [a, b] as [Record<string, unknown>, Record<string, unknown>];
  let more = 0;
  for (const key in one) {
    if (!(key in other) || !isSame(one[key], other[key])) return false;
    more += 1;
  }
  for (const _ in other) more -= 1;
  return more === 0;
}
