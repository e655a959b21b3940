import { asPriceDate } from './priceDate.ts';

/** A step turns the raw content of one version into that of the next, `version` included. */
export type Migration = (old: Readonly<Record<string, unknown>>) => Record<string, unknown>;

type Group = Readonly<Record<string, unknown>>;

const isGroup = (value: unknown): value is Group =>
  typeof value === 'object' && value !== null && !Array.isArray(value);

/**
 * Version 1 took any words for the price date of the budget. Those that are no date are kept with what the budget
 * includes, and the date is unknown.
 */
const datedPrices: Migration = (old) => {
  const study = { ...old, version: 2 };
  const { brief } = old;
  if (!isGroup(brief) || !isGroup(brief['budget'])) return study;
  const { budget } = brief;
  const { priceDate, includes } = budget;
  if (typeof priceDate !== 'string' || priceDate === '') return study;
  const date = asPriceDate(priceDate);
  const kept = `price date as written: ${priceDate}`;
  const dated =
    date === null
      ? {
          ...budget,
          priceDate: 'unknown',
          includes: typeof includes === 'string' && includes !== '' ? `${includes}; ${kept}` : kept,
        }
      : { ...budget, priceDate: date };
  return { ...study, brief: { ...brief, budget: dated } };
};

/** Steps by the version they start from. */
const migrations: Readonly<Record<number, Migration>> = { 1: datedPrices };

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
