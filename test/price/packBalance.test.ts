import { expect, it } from 'vitest';
import { ratePacks } from '../../lib/price/index.ts';

/**
 * Quantities per m2 of deck by published laws, both from memory of the named documents: composite twin girders
 * 0.105 L^1.6 + 100 kg/m2 of steel and 0.25 to 0.30 m3/m2 of slab (French practice); cast-in-place box 0.35 + 0.0045 L
 * m3/m2, bars 90 + 0.35 L kg/m3, strand 0.4 L kg/m2 (Menn 1990). Formwork, paint and falsework (8 m high): common
 * practice, no source.
 */
const composite = (spanM: number): Record<string, number> => ({
  'plate-girder-steel': 0.105 * spanM ** 1.6 + 100,
  'deck-concrete': 0.275,
  reinforcement: 60,
  'slab-formwork': 0.95,
  paint: 1.8,
});
const box = (spanM: number): Record<string, number> => {
  const concrete = 0.35 + 0.0045 * spanM;
  return {
    'box-concrete': concrete,
    reinforcement: concrete * (90 + 0.35 * spanM),
    prestress: 0.4 * spanM,
    'box-formwork': 2.6,
    falsework: 8,
  };
};

it('every rate pack prices steel and concrete for one market: box and composite decks within 15 % at 50 to 70 m', () => {
  for (const pack of ratePacks.values()) {
    const price = (quantities: Record<string, number>): number =>
      Object.entries(quantities).reduce(
        (sum, [item, quantity]) => sum + quantity * pack.rates.find((rate) => rate.item === item)!.p50,
        0,
      );
    for (const spanM of [50, 60, 70]) {
      const ratio = price(box(spanM)) / price(composite(spanM));
      expect(ratio, `${pack.name} at ${spanM} m`).toBeGreaterThan(0.85);
      expect(ratio, `${pack.name} at ${spanM} m`).toBeLessThan(1.15);
    }
  }
});
