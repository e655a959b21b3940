import { methodNames, standardNames, type Obstacle } from '../../lib/index.ts';

/** Whether supports may stand in an obstacle, in words. */
export const supportsWords: Readonly<Record<Obstacle['supports'], string>> = {
  hard: 'barred',
  soft: 'at a price',
  none: 'free',
};

/** Words for what a study holds under names of its own, by the field it stands in. */
const words: Readonly<Record<string, Readonly<Record<string, string>>>> = {
  loading: standardNames,
  method: methodNames,
  supports: supportsWords,
  fixedEnd: { start: 'the start', end: 'the end', both: 'both ends', none: 'neither end' },
  startTieIn: { moves: 'moves', fixed: 'stays' },
  endTieIn: { moves: 'moves', fixed: 'stays' },
  approachSides: { slopes: 'side slopes', walls: 'walls' },
  gasMain: { none: 'none', outside: 'outside', inside: 'hidden inside' },
};

/** A choice or kind held at a path, as it is said in the trade: 'lm1' -> 'EN 1991-2, LM1'. */
export const heldWords = (path: string, value: string): string =>
  words[path.slice(path.lastIndexOf('/') + 1)]?.[value] ?? value;
