import { bench } from 'vitest';
import type { MeasuredLine } from '../../lib/model/index.ts';
import { drawDrivers, drawRates, priceOption, ratesFor } from '../../lib/price/index.ts';
import { standSupports } from '../../lib/substructure/index.ts';
import { items } from '../../lib/takeoff/index.ts';
import { lineOf, optionOf } from '../price/priced.ts';
import { crossing, plainDesign, profile, unitOn } from '../substructure/crossing.ts';

const books = { draws: 10_000, seed: 1 };
const rates = ratesFor({ ratePack: 'demo-2026', rates: [] });
const draws = drawDrivers(crossing, books, ['composite-i']);
const drawn = drawRates(rates, draws);
const supports = standSupports(crossing, [unitOn([0, 60, 140, 200])], [plainDesign([60, 80, 60])], profile);
const lines: MeasuredLine[] = items
  .slice(0, 20)
  .map(({ id }, k) => lineOf(id, 100 + k, k < 8 ? { unit: 0 } : {}));

bench('drawDrivers: every driver, item, stretch and form, 10,000 draws', () => {
  drawDrivers(crossing, books, ['composite-i']);
});

bench('drawRates: every rate on 10,000 draws', () => {
  drawRates(rates, draws);
});

bench('priceOption: 12 options of 20 items with 4 supports on 10,000 draws', () => {
  for (let option = 0; option < 12; option++) priceOption(optionOf(lines, supports), draws, drawn);
});
