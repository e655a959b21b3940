/** A value as it is shown in a problem: text in quotes, long text cut, groups and lists by their size. */
export function shown(value: unknown): string {
  if (value === undefined || value === null) return 'nothing';
  if (typeof value === 'string') return value.length > 60 ? `'${value.slice(0, 57)}...'` : `'${value}'`;
  if (typeof value === 'number' || typeof value === 'boolean') return `${value}`;
  if (Array.isArray(value)) return `a list of ${value.length}`;
  if (typeof value === 'object') return `a group of ${Object.keys(value).length} named values`;
  return `a ${typeof value}`;
}
