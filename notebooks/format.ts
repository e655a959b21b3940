/** Figures as they are printed: thin space in thousands, true minus, no figure finer than its accuracy. */
export const thin = '\u2009';
export const minus = '\u2212';
export const unknownMark = '\u2013';

function grouped(digits: string): string {
  const [whole = '', part] = digits.split('.');
  const spaced = whole.replace(/\B(?=(\d{3})+$)/g, thin);
  return part === undefined ? spaced : `${spaced}.${part}`;
}

/** A number with a fixed count of places: 1240.5 -> '1 240.50'. Not a number gives a dash. */
export function fixed(value: number, places: number): string {
  if (!Number.isFinite(value)) return unknownMark;
  const text = Math.abs(value).toFixed(places);
  const isZero = Number(text) === 0;
  return `${value < 0 && !isZero ? minus : ''}${grouped(text)}`;
}

/** Share of what a check has that is used, two places; without limit where it has nothing. */
export const use = (utilisation: number): string => (utilisation === Infinity ? '∞' : fixed(utilisation, 2));

/** Level or depth in metres, two places. */
export const level = (metres: number): string => fixed(metres, 2);

/** Chainage in metres: whole where it is whole, else one place. */
export const chainage = (metres: number): string =>
  fixed(metres, Math.abs(metres - Math.round(metres)) < 0.05 ? 0 : 1);

/** Length in metres: whole where it is whole to the centimetre, else one place. */
export const length = (metres: number): string =>
  fixed(metres, Math.abs(metres - Math.round(metres)) < 0.05 ? 0 : 1);

/** Rounded to a count of significant figures: 9.66 -> '9.7', 12.4 -> '12', 3412 -> '3 400'. */
export function significant(value: number, figures: number): string {
  if (!Number.isFinite(value)) return unknownMark;
  if (value === 0) return '0';
  const rounded = Number(value.toPrecision(figures));
  const places = Math.max(0, figures - 1 - Math.floor(Math.log10(Math.abs(rounded))));
  return fixed(rounded, places);
}

/** A figure as somebody typed it, to three significant figures without idle zeros: 7.00 -> '7', 11.5 -> '11.5'. */
export const plain = (value: number): string =>
  Number.isFinite(value)
    ? significant(value, 3)
        .replace(/(\.\d*?)0+$/, '$1')
        .replace(/\.$/, '')
    : unknownMark;

/** Money is printed to two significant figures. */
export const money2 = (value: number): string => significant(value, 2);

/** The same with its sign: '+0.2', '−1.3'. */
export function signed(value: number, places: number): string {
  const text = fixed(value, places);
  return Number(Math.abs(value).toFixed(places)) === 0 || value < 0 ? text : `+${text}`;
}

const POWERS = { 2: '²', 3: '³', 4: '⁴' } as const;

/** Powers of lengths, and those written with a caret, as they are printed: '0.35 m2 at 3 m3/s, c^2' -> '0.35 m² at 3 m³/s, c²'. */
export const powers = (text: string): string =>
  text.replace(/(?:\^|(?<=\b[cm]?m))([234])(?!\d)/gu, (_, power: '2' | '3' | '4') => POWERS[power]);

/** Sign of a currency where it has a usual one, else its letters. */
export function currencySign(currency: string): string {
  const signs: Readonly<Record<string, string>> = { EUR: '€', GBP: '£', USD: '$' };
  return signs[currency] ?? currency;
}

export interface MoneyUnit {
  /** Money in one printed unit. */
  readonly per: number;
  /** E.g. 'M€'. */
  readonly label: string;
}

/** One unit for a whole chart: millions where the largest figure reaches a million, else thousands. */
export function moneyUnit(currency: string, largest: number): MoneyUnit {
  const sign = currencySign(currency);
  return largest >= 0.95e6 ? { per: 1e6, label: `M${sign}` } : { per: 1e3, label: `k${sign}` };
}

/** Odds in steps of 5 per cent: '<5', '5' ... '95', '>95'. */
export function odds(share: number): string {
  if (!Number.isFinite(share)) return unknownMark;
  if (share < 0.025) return '<5';
  if (share > 0.975) return '>95';
  return String(Math.round(share * 20) * 5);
}

/** More spans than this are counted instead of listed. */
const LISTED_SPANS = 10;

/** Spans as they are said: '70 + 90 + 70', of many '20 spans up to 272'. */
export const spansText = (spansM: readonly number[]): string =>
  spansM.length > LISTED_SPANS
    ? `${String(spansM.length)} spans up to ${length(Math.max(...spansM))}`
    : spansM.map(length).join(' + ');

/** Spans inside a sentence: 'spans 70 + 90 + 70', of many '20 spans up to 272'. */
export const spansPhrase = (spansM: readonly number[]): string =>
  `${spansM.length > LISTED_SPANS ? '' : 'spans '}${spansText(spansM)}`;

/** Words at the start of a sentence. */
export const capitalised = (words: string): string => `${words.charAt(0).toUpperCase()}${words.slice(1)}`;

/** A list in words: 'a, b and c'. */
export function listed(words: readonly string[]): string {
  if (words.length < 2) return words.join('');
  return `${words.slice(0, -1).join(', ')} and ${words[words.length - 1] ?? ''}`;
}

const small = 'no one two three four five six seven eight nine ten eleven twelve'.split(' ');

/** A count in words up to twelve, in figures beyond. */
export const countWords = (count: number): string => small[count] ?? String(count);

/** Curves flatter than this cannot be told from a straight on any drawing of a crossing, m. */
const FLATTEST_M = 100_000;

/** Radius of a curve of the road, m, to the ten metres; of one that is straight to the eye only that. */
export const radiusText = (radiusM: number): string =>
  Math.abs(radiusM) > FLATTEST_M
    ? `> ${fixed(FLATTEST_M, 0)}`
    : fixed(Math.round(Math.abs(radiusM) / 10) * 10, 0);

/** A limiting span, m: to the tenth, from 100 m to the metre, for it is found to half a hundredth. */
export const reachText = (spanM: number): string => fixed(spanM, spanM < 100 ? 1 : 0);
