import { described, type At, type Descriptor, type MeasuredLine, type Quantities } from '../model/index.ts';
import { itemOf } from './items.ts';
import { splitQuantities } from './quantitiesOf.ts';

const sum = (values: readonly number[]): number => values.reduce((total, value) => total + value, 0);

type Material = keyof Quantities;
const materialWords: Readonly<Record<Material, readonly [label: string, unit: string]>> = {
  concreteM3: ['concrete', 'm3'],
  reinforcementKg: ['reinforcing bars', 'kg'],
  prestressKg: ['prestressing strand', 'kg'],
  structuralSteelKg: ['structural steel', 'kg'],
  stayCableKg: ['stay cables', 'kg'],
  mainCableKg: ['main cables', 'kg'],
};
const materialOf = (at: At): Material => at.name('material') as Material;
const words = (at: At): readonly [label: string, unit: string] => materialWords[materialOf(at)];

/** Lines of one material, of the superstructure or of what carries it, as `splitQuantities` parts them. */
function linesOf(
  at: At,
  part: 'superstructure' | 'supports',
): { readonly whole: string[]; readonly likely: string[]; readonly odds: string[] } {
  const material = materialOf(at);
  const counts = (line: MeasuredLine): boolean =>
    itemOf(line.item).material === material &&
    splitQuantities([{ ...line, quantity: 1 }])[part][material] > 0;
  const whole = at.option.lines.flatMap((line, i) =>
    counts(line) ? [`${at.root}/lines/${i}/quantity`] : [],
  );
  const likely: string[] = [];
  const odds: string[] = [];
  for (const [s, support] of at.option.supports.entries()) {
    for (const [f, foundation] of support.foundations.entries()) {
      const foot = `${at.root}/supports/${s}/foundations/${f}`;
      for (const [i, line] of foundation.lines.entries()) {
        if (!counts(line)) continue;
        likely.push(`${foot}/lines/${i}/quantity`);
        odds.push(`${foot}/odds`);
      }
    }
  }
  return { whole, likely, odds };
}

/** What the lines of the take-off add up to. */
export const quantityFigures: readonly Descriptor[] = [
  described({
    path: 'options/:option/quantities/:material',
    label: (at) => `${words(at)[0]} of the superstructure`,
    unit: (at) => words(at)[1],
    method: 'sum',
    formula: (at) =>
      linesOf(at, 'superstructure').whole.length === 0
        ? 'none is measured'
        : 'lines of this material but those of pylons, piers, abutments, foundations, river works and approaches',
    inputs: (at) => ({ lines: linesOf(at, 'superstructure').whole }),
    compute: ({ lines }) => sum(lines),
  }),
  described({
    path: 'options/:option/supportQuantities/:material',
    label: (at) => `${words(at)[0]} of supports and foundations`,
    unit: (at) => words(at)[1],
    method: 'sum weighed by odds',
    formula: (at) => {
      const { whole, likely } = linesOf(at, 'supports');
      return whole.length + likely.length === 0
        ? 'none is measured'
        : 'lines of this material in pylons, piers, abutments + lines of each foundation x odds of its ground';
    },
    inputs: (at) => linesOf(at, 'supports'),
    compute: ({ whole, likely, odds }) => sum(whole) + sum(likely.map((quantity, i) => quantity * odds[i]!)),
  }),
  described({
    path: 'options/:option/perM2/:material',
    label: (at) => `${words(at)[0]} per m2 of deck`,
    unit: (at) => `${words(at)[1]}/m2`,
    method: 'ratio',
    formula: 'quantity of the superstructure / deck area',
    inputs: (at) => ({ quantity: `${at.root}/quantities/${materialOf(at)}`, area: `${at.root}/deckAreaM2` }),
    compute: ({ quantity, area }) => quantity / area,
  }),
];
