/**
 * Which figure of the study something printed is: its path, as an explanation is asked for, or the paths of the figures
 * it was made from, e.g. both ends of a range. No path leaves it unasked.
 */
export type Asked = string | readonly string[] | undefined;

/** Value of the attribute `data-figure` of what prints a figure: its paths with spaces between them. */
export const dataFigure = (figure: Asked): string | undefined =>
  typeof figure === 'string' || figure === undefined
    ? figure
    : figure.length === 0
      ? undefined
      : figure.join(' ');

/** Paths that an attribute holds. */
export const pathsOf = (attribute: string): string[] => attribute.split(' ');

/** Path of a figure of an option; options go by their number. */
export const ofOption = (option: { readonly number: number }, field: string): string =>
  `options/${String(option.number)}/${field}`;

/** Both ends of the range of a cost or a time of an option. */
export const rangeOf = (option: { readonly number: number }, field: 'cost' | 'months'): string[] => [
  ofOption(option, `${field}/p10`),
  ofOption(option, `${field}/p90`),
];

/** Chance that an option stays within the budget. */
export const withinOf = (option: { readonly number: number }): string =>
  `standing/within/${String(option.number)}`;

/** Price of an option per m2 of deck. */
export const perM2Of = (option: { readonly number: number }): string =>
  ofOption(option, 'pricePerM2/withApproaches');

/** A level or depth of an option at a chainage. */
export const overOf = (
  option: { readonly number: number },
  chainageM: number,
  field: 'roadM' | 'structureM' | 'soffitM' | 'leastM' | 'spareM' | 'fallM',
): string => ofOption(option, `over/${String(chainageM)}/${field}`);

/** Path of a figure of an option tried at another depth beside the study, by the place of the trial among them. */
export const ofTrial = (index: number, path: string): string => `depths/${index}/${path}`;

/** Of which trial a path tells, and what of it; null for a figure of the study. */
export function trialIn(path: string): { readonly index: number; readonly path: string } | null {
  const [, index, rest] = /^depths\/(\d+)\/(.+)$/u.exec(path) ?? [];
  return index === undefined || rest === undefined ? null : { index: Number(index), path: rest };
}
