import { z } from '../zod.ts';
import demo2026 from '../../data/rates/demo-2026.json';
import type { Books, Spread } from '../model/index.ts';
import { items } from '../takeoff/index.ts';
import { normalCdf } from './normal.ts';

const rising = (r: { p10: number; p50: number; p90: number }): boolean => r.p10 < r.p50 && r.p50 < r.p90;

const packSchema = z
  .strictObject({
    name: z.string().min(1),
    title: z.string().min(1),
    place: z.string().min(1),
    /** Price date, e.g. '2026 Q1'. */
    priceDate: z.string().regex(/^\d{4} Q[1-4]$/),
    currency: z.string().length(3),
    source: z.string().min(1),
    rates: z.array(
      z
        .strictObject({
          item: z.string(),
          p10: z.number().positive(),
          p50: z.number().positive(),
          p90: z.number().positive(),
          /** Number of tenders behind the rate. */
          tenders: z.number().int().nonnegative(),
        })
        .refine(rising, 'p10 < p50 < p90'),
    ),
  })
  .refine(
    (pack) =>
      pack.rates.length === items.length &&
      items.every((item) => pack.rates.some((rate) => rate.item === item.id)),
    'one rate for every item of items.json',
  );

/** A rate pack: what every item costs at one date and place, 10, 50 and 90 % points. */
export type RatePack = z.infer<typeof packSchema>;

/** Rate packs on the shelf, by name. */
export const ratePacks: ReadonlyMap<string, RatePack> = new Map(
  [demo2026].map((raw) => packSchema.parse(raw)).map((pack) => [pack.name, pack]),
);

/** One rate as it is used, money per unit of its item. */
export interface Rate extends Spread {
  readonly item: string;
  /** Why it differs from the pack; null where it is the pack's. */
  readonly typed: string | null;
}

/** The rates of a study: one for every item, in the order of items.json. */
export interface Rates {
  readonly pack: RatePack;
  readonly rates: readonly Rate[];
}

/**
 * Rates of a study: its pack with the typed rates laid over it.
 * Throws a RangeError on an unknown pack or item, or on a typed rate whose points do not rise from above 0.
 */
export function ratesFor(books: Pick<Books, 'ratePack' | 'rates'>): Rates {
  const pack = ratePacks.get(books.ratePack);
  if (pack === undefined) {
    throw new RangeError(
      `rate pack: expected one of ${[...ratePacks.keys()].join(', ')}, received '${books.ratePack}'; choose a pack on the shelf`,
    );
  }
  const rates = new Map<string, Rate>(
    pack.rates.map(({ item, p10, p50, p90 }) => [item, { item, p10, p50, p90, typed: null }]),
  );
  for (const { item, p10, p50, p90, reason } of books.rates) {
    if (!rates.has(item)) {
      throw new RangeError(
        `typed rate: expected an item of the bill, received '${item}'; see data/rates/items.json`,
      );
    }
    if (!(p10 > 0 && p10 < p50 && p50 < p90)) {
      throw new RangeError(
        `typed rate of ${item}: expected 0 < p10 < p50 < p90, received ${p10}, ${p50}, ${p90}`,
      );
    }
    rates.set(item, { item, p10, p50, p90, typed: reason });
  }
  return { pack, rates: items.map((item) => rates.get(item.id)!) };
}

/** Standard normal deviate of the 90 % point. */
export const z90 = 1.2815515655446004;

/** Spreads on the ln scale below and above the median of a rate or duration: two half-lognormals joined at P50. */
export function halfSigmas(spread: Spread): { readonly low: number; readonly high: number } {
  return { low: Math.log(spread.p50 / spread.p10) / z90, high: Math.log(spread.p90 / spread.p50) / z90 };
}

/**
 * Mean of each rate, money per unit, by item.
 * Two half-lognormals: P50 (exp(a^2/2) Phi(-a) + exp(b^2/2) Phi(b)) with a, b the spreads below and above.
 */
export function meanRates(rates: Rates): Readonly<Record<string, number>> {
  return Object.fromEntries(
    rates.rates.map((rate) => {
      const { low, high } = halfSigmas(rate);
      const factor =
        Math.exp((low * low) / 2) * normalCdf(-low) + Math.exp((high * high) / 2) * normalCdf(high);
      return [rate.item, rate.p50 * factor];
    }),
  );
}
