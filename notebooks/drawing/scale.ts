/** The only scales drawings are made at: 1 to this. The last two are for crossings longer than a sheet at 1:5000. */
const scaleSeries = [100, 200, 250, 500, 1000, 2000, 2500, 5000, 10_000, 20_000] as const;
export type Scale = (typeof scaleSeries)[number];

/** Pixels (96 to the inch) of one metre at 1:scale. */
export const pxPerMetre = (scale: Scale): number => 96 / 0.0254 / scale;

/**
 * The largest scale of the series at which a length fits.
 * @param lengthM length to be drawn, m, > 0
 * @param widthPx room for it, px, > 0
 * @param from the largest scale to try, e.g. 1000 for whole crossings
 * @returns the scale; the smallest when nothing fits
 */
export function largestScale(lengthM: number, widthPx: number, from: Scale = 100): Scale {
  return scaleSeries.find((scale) => scale >= from && lengthM * pxPerMetre(scale) <= widthPx) ?? 20_000;
}
