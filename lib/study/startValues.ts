import type { Study } from '../model/index.ts';
import { inOrder, namesField } from './assumed.ts';

type Brief = Study['brief'];

/** Names of start values by their paths, in the order of the brief; several paths may have one name. */
const names: readonly (readonly [path: RegExp, name: (brief: Brief, index: number) => string])[] = [
  [/^brief\.deck\.\d+\.kind$/u, () => 'number of lanes'],
  [/^brief\.deck\.\d+\.(?:w|ultimateW)idthM$/u, () => 'widths of the strips of the deck'],
  [/^brief\.deck\b/u, () => 'strips of the deck'],
  [/^brief\.obstacles\.(\d+)\.kind$/u, (brief, i) => `kind of ${brief.obstacles[i]!.name}`],
  [/^brief\.obstacles\.(\d+)\.(?:from|to)M$/u, (brief, i) => `width of ${brief.obstacles[i]!.name}`],
  [/^brief\.obstacles\.(\d+)\.supports$/u, (brief, i) => `supports in ${brief.obstacles[i]!.name}`],
  [
    /^brief\.obstacles\.(\d+)\.clearance\b/u,
    (brief, i) => `what stays clear over ${brief.obstacles[i]!.name}`,
  ],
  [/^brief\.obstacles\.(\d+)$/u, (brief, i) => brief.obstacles[i]!.name],
  [/^brief\.waters\.(\d+)\.levelM$/u, (brief, i) => `water level of ${brief.waters[i]!.name}`],
  [
    /^brief\.waters\.(\d+)\.(?:from|to|floodFrom|floodTo)M$/u,
    (brief, i) => `edges of the water of ${brief.waters[i]!.name}`,
  ],
  [/^brief\.road\.(?:start|end)LevelM$/u, () => 'level of the road'],
  [/^brief\.road\.(?:fixedEnd|mayRiseM)$/u, () => 'rise of the road'],
  [/^brief\.loading$/u, () => 'load standard'],
  [/^brief\.surfacingM$/u, () => 'surfacing'],
  [/^brief\.crossing\.ground\b/u, () => 'ground line'],
  [/^brief\.groundStretches\b/u, () => 'ground'],
  [/^brief\.budget\b/u, () => 'budget'],
];

/** The name of a start value, and its place among the others; its path, behind them, where it has no name. */
function named(brief: Brief, path: string): readonly [place: number, name: string] {
  const place = names.findIndex(([pattern]) => pattern.test(path));
  const row = names[place];
  // A draft may list a path that leads nowhere.
  return row === undefined || !namesField({ brief }, path)
    ? [names.length, path]
    : [place, row[1](brief, Number(row[0].exec(path)?.[1]))];
}

/**
 * The start values of a study that nobody has confirmed, by name and each once, in the order of the brief; by its path
 * where it has no name.
 */
export function startValues({ brief, assumed }: Study): string[] {
  const found = inOrder(assumed).map((path) => named(brief, path));
  return [...new Set(found.sort(([one], [other]) => one - other).map(([, name]) => name))];
}

/** The name of the start value at a path. */
export const startValueAt = ({ brief }: Study, path: string): string => named(brief, path)[1];

/** All of them in one line: '2 start values not confirmed: level of the road, ground line'; '' where there is none. */
export function startValueWords(study: Study): string {
  const found = startValues(study);
  const values = found.length === 1 ? 'start value' : 'start values';
  return found.length === 0 ? '' : `${found.length} ${values} not confirmed: ${found.join(', ')}`;
}
