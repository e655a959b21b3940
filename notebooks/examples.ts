import lowFerry from '../data/examples/low-ferry.json';
import sarrowEstuary from '../data/examples/sarrow-estuary.json';
import stonebeckLane from '../data/examples/stonebeck-lane.json';
import tannersYard from '../data/examples/tanners-yard.json';
import { parseStudy, sentence, type Study } from '../lib/index.ts';

/** The worked examples by the name they have in an address, the one shown without a study first. */
const files = {
  'low-ferry': lowFerry,
  'stonebeck-lane': stonebeckLane,
  'tanners-yard': tannersYard,
  'sarrow-estuary': sarrowEstuary,
} as const;

/** A worked example by name; the first for a name that none of them has. */
export function workedExample(name: string | null): Study {
  const parsed = parseStudy(Object.entries(files).find(([known]) => known === name)?.[1] ?? lowFerry);
  if (!parsed.ok) throw new Error(parsed.problems.map(sentence).join(' '));
  return parsed.value;
}

/** Names of the worked examples in the order of the shelf. */
export const exampleNames: readonly string[] = Object.keys(files);
