/** A copy of plain data with every number at six significant figures: enough to check, short enough to read. */
export function rounded<T>(value: T): T {
  if (typeof value === 'number') return (Number.isFinite(value) ? Number(value.toPrecision(6)) : null) as T;
  if (Array.isArray(value)) return value.map(rounded) as T;
  if (value !== null && typeof value === 'object') {
    return Object.fromEntries(Object.entries(value).map(([key, entry]) => [key, rounded(entry)])) as T;
  }
  return value;
}
