import type { Study } from '../model/index.ts';
import { inOrder } from './assumed.ts';

/** Names of start values by the beginning of their path; several paths may have one name. */
const names: readonly (readonly [path: RegExp, name: (brief: Study['brief'], index: number) => string])[] = [
  [/^brief\.deck\.\d+\.kind$/u, () => 'number of lanes'],
  [/^brief\.deck\.\d+\.(?:w|ultimateW)idthM$/u, () => 'widths of the strips of the deck'],
  [/^brief\.deck\b/u, () => 'strips of the deck'],
  [/^brief\.loading$/u, () => 'load standard'],
  [/^brief\.surfacingM$/u, () => 'surfacing'],
  [/^brief\.crossing\.ground\b/u, () => 'ground line'],
  [/^brief\.road\.(?:start|end)LevelM$/u, () => 'level of the road'],
  [/^brief\.road\.(?:fixedEnd|mayRiseM)$/u, () => 'rise of the road'],
  [/^brief\.obstacles\.(\d+)\.kind$/u, (brief, i) => `what ${brief.obstacles[i]!.name} is`],
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
  [/^brief\.groundStretches\b/u, () => 'ground'],
  [/^brief\.budget\b/u, () => 'budget'],
];

function nameOf(brief: Study['brief'], path: string): string {
  for (const [pattern, name] of names) {
    const found = pattern.exec(path);
    if (found !== null) return name(brief, Number(found[1]));
  }
  return path;
}

/** The start values of a study that nobody has confirmed, by name and each once; by its path where it has no name. */
export const startValues = ({ brief, assumed }: Study): string[] => [
  ...new Set(inOrder(assumed).map((path) => nameOf(brief, path))),
];

/** The same in one line: '2 start values not confirmed: level of the road, ground line'; '' where there is none. */
export function startValueWords(study: Study): string {
  const found = startValues(study);
  const values = found.length === 1 ? 'start value' : 'start values';
  return found.length === 0 ? '' : `${found.length} ${values} not confirmed: ${found.join(', ')}`;
}
