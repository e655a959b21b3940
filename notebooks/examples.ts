import lowFerry from '../data/examples/low-ferry.json';
import sarrowEstuary from '../data/examples/sarrow-estuary.json';
import stonebeckLane from '../data/examples/stonebeck-lane.json';
import tannersYard from '../data/examples/tanners-yard.json';
import { parseStudy, sentence, type Study } from '../lib/index.ts';
import type { ExampleName } from './exampleNames.ts';

const files: Readonly<Record<ExampleName, unknown>> = {
  'low-ferry': lowFerry,
  'stonebeck-lane': stonebeckLane,
  'tanners-yard': tannersYard,
  'sarrow-estuary': sarrowEstuary,
};

/** A worked example as a study. */
export function workedExample(name: ExampleName): Study {
  const parsed = parseStudy(files[name]);
  if (!parsed.ok) throw new Error(parsed.problems.map(sentence).join(' '));
  return parsed.value;
}
