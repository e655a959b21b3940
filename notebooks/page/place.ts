/** Where a field stands in plain data: keys and indices from its root, e.g. ['brief', 'crossing', 'startM']. */
export type Path = readonly (string | number)[];

const refuse = (path: Path, i: number): never => {
  const where = path.slice(0, i + 1).join('.');
  throw new Error(`place '${where}': expected a field of the data, found nothing; correct the path`);
};

/** What stands at a path. A path that leads nowhere is an error of whoever wrote it, and is thrown. */
export function getAt(root: unknown, path: Path): unknown {
  return path.reduce<unknown>((value, key, i) => {
    if (typeof value !== 'object' || value === null || !(key in value)) return refuse(path, i);
    return (value as Record<string | number, unknown>)[key];
  }, root);
}

/** Whether a path leads anywhere, e.g. to an entry of a list that may have become shorter. */
export function hasAt(root: unknown, path: Path): boolean {
  let value = root;
  return path.every((key) => {
    if (typeof value !== 'object' || value === null || !(key in value)) return false;
    value = (value as Record<string | number, unknown>)[key];
    return true;
  });
}

/** The same data with another value at a path; what does not lie on the path is kept as it is. Throws like `getAt`. */
export function putAt<T>(root: T, path: Path, value: unknown): T {
  const put = (part: unknown, i: number): unknown => {
    const key = path[i];
    if (key === undefined) return value;
    if (typeof part !== 'object' || part === null || !(key in part)) return refuse(path, i);
    const next = put((part as Record<string | number, unknown>)[key], i + 1);
    if (Array.isArray(part)) return part.map((one: unknown, at) => (at === key ? next : one));
    return { ...part, [key]: next };
  };
  return put(root, 0) as T;
}

/** Whether `path` is `field` itself or lies inside it. */
export function isWithin(path: Path, field: Path): boolean {
  return field.every((key, i) => path[i] === key);
}
