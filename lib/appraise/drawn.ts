import { sizeableForms } from '../forms/index.ts';
import { drawDrivers, drawRate, type Draws, type RateDraws } from '../price/index.ts';
import { kept, remembered } from '../kept.ts';
import type { Workbench } from './workbench.ts';

/** The draws of a study with its rates on them. */
export interface Drawn {
  readonly draws: Draws;
  readonly rates: RateDraws;
  /** Text of all they were made from. */
  readonly key: string;
}

/**
 * Draws the drivers of a study and puts its rates on them. Whatever forms it asks for, they are drawn for all, so that the
 * draws serve every part of it. The drivers stay as they were drawn until seed,
 * number, length or odds of the ground change; of the rates only those are put on them anew that have changed.
 *
 * @throws RangeError on a number of draws, a seed or a form that cannot be drawn
 */
export function drawn({ kept: memory, study, site, rates, booksKey }: Workbench): Drawn {
  const { draws: count, seed } = study.books;
  const key = JSON.stringify([count, seed, site.lengthM, site.groundStretches]);
  const { draws, rates: onDraws } = remembered(memory.draws, key, () => ({
    draws: drawDrivers(site, study.books, sizeableForms),
    rates: kept<Float64Array>(200),
  }));
  return {
    draws,
    rates: new Map(
      rates.rates.map((rate) => [
        rate.item,
        remembered(onDraws, JSON.stringify(rate), () => drawRate(rate, draws)),
      ]),
    ),
    key: `${key} ${booksKey}`,
  };
}
