import example from '../../data/examples/low-ferry.json' with { type: 'json' };
import { parseStudy, sentence, type Study } from '../../lib/index.ts';

/** The worked example as the page opens it. */
export function workedStudy(): Study {
  const read = parseStudy(example);
  if (!read.ok) throw new Error(read.problems.map(sentence).join(' '));
  return read.value;
}

/** Problems of a draft, by place. */
export function placesOf(study: Study): string[] {
  const read = parseStudy(study);
  return read.ok ? [] : read.problems.map(({ path }) => path.join('.'));
}
