import type { Design } from '../model/index.ts';

/** Figures of a design that count its girders, beams or boxes side by side, by form. */
const counts = ['girders', 'beamLines', 'boxes'] as const;

/** Name of the figure that counts the girders, beams or boxes of a design, and how many; undefined where it has none to count. */
export function girderLines({
  figures,
}: Pick<Design, 'figures'>): { readonly figure: string; readonly count: number } | undefined {
  const figure = counts.find((name) => figures[name] !== undefined);
  return figure && { figure, count: figures[figure]! };
}
