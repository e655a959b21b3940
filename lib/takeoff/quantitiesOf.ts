import type { BillPart, MeasuredLine, Quantities } from '../model/index.ts';
import { itemOf } from './items.ts';

/** Materials of measured lines: each line counts into the material of its item. Absent materials are 0. */
export function quantitiesOf(lines: readonly MeasuredLine[]): Quantities {
  const total = {
    concreteM3: 0,
    reinforcementKg: 0,
    prestressKg: 0,
    structuralSteelKg: 0,
    stayCableKg: 0,
    mainCableKg: 0,
  };
  for (const line of lines) {
    const { material } = itemOf(line.item);
    if (material !== null) total[material] += line.quantity;
  }
  return total;
}

/** Quantities per m2 of deck; `deckAreaM2` > 0, else a RangeError. */
export function perM2(quantities: Quantities, deckAreaM2: number): Quantities {
  if (!(deckAreaM2 > 0)) throw new RangeError(`deck area: expected more than 0 m2, received ${deckAreaM2}`);
  return {
    concreteM3: quantities.concreteM3 / deckAreaM2,
    reinforcementKg: quantities.reinforcementKg / deckAreaM2,
    prestressKg: quantities.prestressKg / deckAreaM2,
    structuralSteelKg: quantities.structuralSteelKg / deckAreaM2,
    stayCableKg: quantities.stayCableKg / deckAreaM2,
    mainCableKg: quantities.mainCableKg / deckAreaM2,
  };
}

const supportParts: ReadonlySet<BillPart> = new Set([
  'pylons',
  'piers',
  'foundations',
  'abutments',
  'river-works',
]);

/**
 * Materials of the superstructure and of what carries it (pylons, piers, abutments, foundations), apart. Walls of the
 * approaches are neither.
 */
export function splitQuantities(lines: readonly MeasuredLine[]): {
  readonly superstructure: Quantities;
  readonly supports: Quantities;
} {
  return {
    superstructure: quantitiesOf(
      lines.filter((line) => !supportParts.has(line.part) && line.part !== 'approaches'),
    ),
    supports: quantitiesOf(lines.filter((line) => supportParts.has(line.part))),
  };
}
