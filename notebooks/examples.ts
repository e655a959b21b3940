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
export type ExampleName = keyof typeof files;

/** Names of the worked examples in the order of the shelf. */
export const exampleNames = Object.keys(files) as readonly ExampleName[];

/** The example of a name, the first for a name that none of them has. */
export const exampleNamed = (name: string | null): ExampleName =>
  exampleNames.find((known) => known === name) ?? 'low-ferry';

/** A worked example as a study. */
export function workedExample(name: ExampleName): Study {
  const parsed = parseStudy(files[name]);
  if (!parsed.ok) throw new Error(parsed.problems.map(sentence).join(' '));
  return parsed.value;
}
