import { assumedAgain, confirmed, type Study } from '../../../lib/index.ts';
import { getAt, putAt, type Path } from '../../page/place.ts';

/** The study with an entry put into the list at `path` so that it stands at `index`. */
export function withEntry(study: Study, path: Path, index: number, entry: unknown): Study {
  const list = getAt(study, path) as readonly unknown[];
  return putAt(study, path, [...list.slice(0, index), entry, ...list.slice(index)]);
}

/** The study without the entry at `index` of the list at `path`. */
export function withoutEntry(study: Study, path: Path, index: number): Study {
  const list = getAt(study, path) as readonly unknown[];
  return putAt(
    study,
    path,
    list.filter((_, i) => i !== index),
  );
}

/** The study with another list at `path`, none of whose entries is a start value. */
export const withPasted = (study: Study, path: Path, entries: readonly unknown[]): Study =>
  putAt(confirmed(study, [path.join('.')]), path, entries);

/** The study with the list at `path` as it was in an earlier state of it, start values among its entries. */
export const withListOf = (study: Study, path: Path, earlier: Study): Study =>
  assumedAgain(putAt(study, path, getAt(earlier, path)), earlier, [path.join('.')]);
