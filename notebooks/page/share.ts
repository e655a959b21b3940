type Plain = Readonly<Record<string, unknown>>;

const isPlain = (value: unknown): value is Plain =>
  typeof value === 'object' && value !== null && !Array.isArray(value);

/**
 * The new value, built as far as possible from parts of the old one: every part that says the same is the old part
 * itself, and when nothing has changed so is the whole. For plain data (objects, lists, text, numbers) of any depth.
 */
export function share<T>(before: unknown, after: T): T {
  if (Object.is(before, after)) return after;
  if (Array.isArray(before) && Array.isArray(after)) {
    const parts = after.map((part: unknown, i) => share(before[i], part));
    const same = parts.length === before.length && parts.every((part, i) => Object.is(part, before[i]));
    return (same ? before : parts) as T;
  }
  if (isPlain(before) && isPlain(after)) {
    const keys = Object.keys(after);
    const parts = Object.fromEntries(keys.map((key) => [key, share(before[key], after[key])]));
    const same =
      keys.length === Object.keys(before).length &&
      keys.every((key) => key in before && Object.is(parts[key], before[key]));
    return (same ? before : parts) as T;
  }
  return after;
}
