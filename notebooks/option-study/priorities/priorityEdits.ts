import type { Study } from '../../../lib/index.ts';

/** Names that no list of named values may hold: a study file with one of them is refused. */
const NEVER = ['__proto__', 'constructor', 'prototype'];

/** Names of the priorities of a study, in the order in which they are written to its file. */
export const priorityNames = ({ priorities }: Study): string[] => Object.keys(priorities.weights).sort();

/** A name that no other priority has: 'noise', 'noise 2'. */
function free(study: Study, name: string): string {
  const taken = new Set([...NEVER, ...priorityNames(study)]);
  for (let count = 1; ; count += 1) {
    const tried = count === 1 ? name : `${name} ${count}`;
    if (!taken.has(tried)) return tried;
  }
}

const withWeights = (study: Study, weights: Readonly<Record<string, number>>): Study => ({
  ...study,
  priorities: { ...study.priorities, weights },
});

/** The study with one more priority of weight 1, and its name. */
export function withNewPriority(study: Study): { readonly study: Study; readonly name: string } {
  const name = free(study, 'new priority');
  return { study: withWeights(study, { ...study.priorities.weights, [name]: 1 }), name };
}

/** The study with another weight of a priority it has. */
export const withWeight = (study: Study, name: string, weight: number): Study =>
  Object.hasOwn(study.priorities.weights, name)
    ? withWeights(study, { ...study.priorities.weights, [name]: weight })
    : study;

/** The study without a priority. */
export function withoutPriority(study: Study, name: string): Study {
  const { [name]: _gone, ...others } = study.priorities.weights;
  return withWeights(study, others);
}

/** The study with a priority under another name, counted on where that is taken; without a name it is taken out. */
export function renamed(study: Study, name: string, next: string): Study {
  const weight = study.priorities.weights[name];
  if (weight === undefined || next === name) return study;
  const others = withoutPriority(study, name);
  if (next === '') return others;
  return withWeights(others, { ...others.priorities.weights, [free(others, next)]: weight });
}
