import type { Figure } from '../../lib/index.ts';
import { currencySign, fixed, money2, moneyUnit, odds, powers, significant, use } from '../format.ts';
import { heldWords } from './heldWords.ts';

type Valued = Pick<Figure, 'path' | 'value' | 'unit'>;

/** A unit as it is printed: 'kg/m2' -> 'kg/m²', 'EUR/kg' -> '€/kg', 'deg' -> '°'; a count has none. */
function unitWords(unit: string): string {
  if (unit === 'no') return '';
  return powers(unit.replace(/\b[A-Z]{3}\b/u, (currency) => currencySign(currency)).replace(/^deg$/u, '°'));
}

/** Metres: chainages to the decimetre, lengths and levels to the centimetre, plates to the millimetre. */
function metres(value: number): string {
  const size = Math.abs(value);
  if (size >= 200) return fixed(value, Number.isInteger(value) ? 0 : 1);
  return size >= 0.1 || size < 0.0005 ? fixed(value, 2) : fixed(value, 3);
}

function number(value: number, unit: string): string {
  if (value === Infinity) return use(value);
  if (unit === 'm') return metres(value);
  if (unit === '' || unit === 'no') {
    if (Number.isInteger(value)) return fixed(value, 0);
  }
  if (Math.abs(value) < 1e-9) return '0';
  return significant(value, unit === 'months' ? 2 : 3);
}

/** Gradients are ratios in the study and per cent in the trade. */
const GRADIENT = /gradient(?:Change)?$/iu;

/** A figure as it is printed and its unit, which stands outside the underline. */
export interface PrintedValue {
  readonly text: string;
  readonly unit: string;
}

/**
 * A figure of the study as it is printed: no finer than its accuracy, costs to two significant figures, odds in steps
 * of 5 %.
 */
export function printedValue({ path, value, unit }: Valued): PrintedValue {
  if (value === null || value === 'unknown') return { text: 'unknown', unit: '' };
  if (typeof value === 'boolean') return { text: value ? 'yes' : 'no', unit: '' };
  if (typeof value === 'string') return { text: heldWords(path, value), unit: '' };
  if (/^standing\/(?:odds|within)\//u.test(path)) return { text: odds(value), unit: '%' };
  if (/^[A-Z]{3}$/u.test(unit)) {
    const size = Math.abs(value);
    const scale = size < 1000 ? { per: 1, label: currencySign(unit) } : moneyUnit(unit, size);
    return { text: money2(value / scale.per), unit: scale.label };
  }
  if (unit === '' && GRADIENT.test(path)) return { text: significant(100 * value, 3), unit: '%' };
  const text = path.includes('/pricePerM2/') ? money2(value) : number(value, unit);
  return { text, unit: unitWords(unit) };
}

/** The same in one run: '6.3 M€'. */
export function valueWords(figure: Valued): string {
  const { text, unit } = printedValue(figure);
  return unit === '' ? text : `${text} ${unit}`;
}
