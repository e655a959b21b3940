import type { Cell } from '../reactive/index.ts';

/** A station as the ties between stations are read from it. */
export interface Station {
  /** E.g. '3+020'. */
  readonly name: string;
  /** Cells of the graph it shows. */
  readonly shows: readonly Cell<unknown>[];
  /** Cells that belong here although a station further up shows them too, e.g. a slice that is edited here. */
  readonly owns?: readonly Cell<unknown>[];
}

/** The stations a station uses, and those that use it, each in page order. */
export interface Ties {
  readonly uses: readonly string[];
  readonly usedBy: readonly string[];
}

type UsesOf = (cell: Cell<unknown>) => readonly Cell<unknown>[];

/** The station each cell belongs to: the one that claims it, else the first on the page that shows it. */
function owners(stations: readonly Station[]): Map<string, string> {
  const owner = new Map<string, string>();
  for (const { name, owns = [] } of stations) for (const cell of owns) owner.set(cell.name, name);
  for (const { name, shows } of stations) {
    for (const cell of shows) if (!owner.has(cell.name)) owner.set(cell.name, name);
  }
  return owner;
}

/**
 * Ties between the stations of a page, by station name. A station uses the owners of the cells it shows, and the
 * owners of what its own cells use; cells without a station are looked through. Stations tied to themselves are not.
 * @param usesOf what a cell uses, as `graph.uses` tells it
 */
export function tiesOf(stations: readonly Station[], usesOf: UsesOf): ReadonlyMap<string, Ties> {
  const owner = owners(stations);
  const above = new Map<string, Set<string>>();
  for (const { name, shows, owns = [] } of stations) {
    const found = new Set<string>();
    const seen = new Set<string>();
    const look = (cell: Cell<unknown>): void => {
      if (seen.has(cell.name)) return;
      seen.add(cell.name);
      const home = owner.get(cell.name);
      if (home !== undefined && home !== name) found.add(home);
      else for (const used of usesOf(cell)) look(used);
    };
    for (const cell of [...shows, ...owns]) look(cell);
    above.set(name, found);
  }
  const names = stations.map(({ name }) => name);
  return new Map(
    names.map((name) => [
      name,
      {
        uses: names.filter((other) => above.get(name)?.has(other)),
        usedBy: names.filter((other) => above.get(other)?.has(name)),
      },
    ]),
  );
}

/**
 * The station a cell is to be looked for at: its owner, or for a cell without one the first station on the page that
 * depends on it through such cells. Undefined when no station does.
 */
export function homeOf(cellName: string, stations: readonly Station[], usesOf: UsesOf): string | undefined {
  const owner = owners(stations);
  const own = owner.get(cellName);
  if (own !== undefined) return own;
  const reaches = (cell: Cell<unknown>, name: string, seen: Set<string>): boolean => {
    if (cell.name === cellName) return true;
    if (seen.has(cell.name)) return false;
    seen.add(cell.name);
    const home = owner.get(cell.name);
    if (home !== undefined && home !== name) return false;
    return usesOf(cell).some((used) => reaches(used, name, seen));
  };
  return stations.find(({ name, shows, owns = [] }) =>
    [...shows, ...owns].some((cell) => reaches(cell, name, new Set())),
  )?.name;
}
