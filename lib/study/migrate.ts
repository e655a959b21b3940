/** A step turns the raw content of one version into that of the next, `version` included. */
export type Migration = (old: Readonly<Record<string, unknown>>) => Record<string, unknown>;

/** Steps by the version they start from. Version 1 is the first, so there are none yet. */
const migrations: Readonly<Record<number, Migration>> = {};

/**
 * Brings raw content from version `from` to version `to`, one step at a time.
 * Throws RangeError when a step is missing from the table: a fault of the tool, not of the file.
 */
export function migrate(
  raw: Readonly<Record<string, unknown>>,
  from: number,
  to: number,
  steps: Readonly<Record<number, Migration>> = migrations,
): Readonly<Record<string, unknown>> {
  let content = raw;
  for (let version = from; version < to; version += 1) {
    const step = steps[version];
    if (step === undefined) throw new RangeError(`no migration from version ${version}`);
    content = step(content);
  }
  return content;
}
