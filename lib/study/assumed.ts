import type { Study } from '../model/index.ts';

/** Whether a path is another one or lies inside it: what stands for a list or a group stands for all in it. */
const covers = (whole: string, path: string): boolean => path === whole || path.startsWith(`${whole}.`);

/** Paths as a study lists them: each once, in order. */
export const inOrder = (paths: readonly string[]): string[] =>
  [...new Set(paths)].sort((one, other) => (one < other ? -1 : 1));

const isHolder = (value: unknown): value is Readonly<Record<string, unknown>> =>
  typeof value === 'object' && value !== null;

const isSame = (one: unknown, other: unknown): boolean =>
  one === other || JSON.stringify(one) === JSON.stringify(other);

/** Whether a dotted path leads to a field of the brief: 'brief.road.startLevelM', 'brief.deck.0.widthM'. */
export function namesField(study: Pick<Study, 'brief'>, path: string): boolean {
  const [root, ...keys] = path.split('.');
  let value: unknown = study.brief;
  return (
    root === 'brief' &&
    keys.length > 0 &&
    keys.every((key) => {
      if (!isHolder(value) || !Object.hasOwn(value, key)) return false;
      if (Array.isArray(value) && !/^\d+$/u.test(key)) return false;
      value = value[key];
      return true;
    })
  );
}

/** Whether what stands at a path of the study, or something in it, is a start value that nobody has confirmed. */
export const isAssumed = ({ assumed }: Study, path: string): boolean =>
  assumed.some((marked) => covers(marked, path) || covers(path, marked));

/** For each entry of a list the place it had before; undefined for one that is new. A copy has the place of its original. */
function origins(before: readonly unknown[], after: readonly unknown[]): (number | undefined)[] {
  if (before.length === after.length) return after.map((_, i) => i);
  const most = Math.min(before.length, after.length);
  const more = after.length - before.length;
  let head = 0;
  while (head < most && before[head] === after[head]) head += 1;
  let tail = 0;
  while (tail < most - head && before.at(-1 - tail) === after.at(-1 - tail)) tail += 1;
  return after.map((entry, i) => {
    if (i < head) return i;
    if (i >= after.length - tail) return i - more;
    const original = before.indexOf(entry);
    return original < 0 ? undefined : original;
  });
}

/** One brief after another: which start values of the first are still such in the second. */
interface Passage {
  readonly marked: readonly string[];
  /** Paths of which something has been said without another value. */
  readonly said: readonly string[];
}

function still(
  passage: Passage,
  before: unknown,
  after: unknown,
  from: string,
  to: string,
  isInside: boolean,
): string[] {
  const { marked, said } = passage;
  const isMarked = isInside || marked.includes(from);
  if (said.some((path) => covers(path, to))) return [];
  if (isMarked && isSame(before, after) && !said.some((path) => covers(to, path))) return [to];
  // What has changed in part is marked in its other parts.
  if (!isMarked && !marked.some((path) => covers(from, path))) return [];
  if (!isHolder(before) || !isHolder(after)) return [];
  const part = (was: string | number, is: string | number): string[] =>
    still(passage, before[was], after[is], `${from}.${was}`, `${to}.${is}`, isMarked);
  if (Array.isArray(before) && Array.isArray(after))
    return origins(before, after).flatMap((was, is) => (was === undefined ? [] : part(was, is)));
  return Object.keys(after).flatMap((key) => (Object.hasOwn(before, key) ? part(key, key) : []));
}

const lanes = ({ deck }: Study['brief']): number => deck.filter(({ kind }) => kind === 'lane').length;

/** What an edit says of start values besides those it changes. */
const saidBy = (before: Study['brief'], after: Study['brief']): string[] => [
  // Who puts in or takes out a lane says how many there are.
  ...(lanes(before) === lanes(after) ? [] : after.deck.map((_, i) => `brief.deck.${i}.kind`)),
  // What its authority has confirmed is no start value.
  ...after.obstacles.flatMap(({ clearance }, i) =>
    clearance?.confirmed === true ? [`brief.obstacles.${i}.clearance`] : [],
  ),
];

/** The start values of a study that nobody has confirmed after an edit: what it changes is none any more. */
export const stillAssumed = (before: Study, after: Study): string[] =>
  inOrder(
    still(
      { marked: before.assumed, said: saidBy(before.brief, after.brief) },
      before.brief,
      after.brief,
      'brief',
      'brief',
      false,
    ),
  );

/** The study with what stands at some paths confirmed as it stands. */
export const confirmed = (study: Study, paths: readonly string[]): Study => ({
  ...study,
  assumed: inOrder(
    still({ marked: study.assumed, said: paths }, study.brief, study.brief, 'brief', 'brief', false),
  ),
});

/** The study with what stands at some paths unconfirmed again, as far as it was in another state of it. */
export const assumedAgain = (study: Study, earlier: Study, paths: readonly string[]): Study => ({
  ...study,
  assumed: inOrder([
    ...study.assumed,
    ...paths.filter((path) => earlier.assumed.some((marked) => covers(marked, path))),
    ...earlier.assumed.filter((marked) => paths.some((path) => covers(path, marked))),
  ]),
});
