import { fixed, thin } from '../format.ts';

/** A figure or the answer that it is not known. */
export type Figure = number | 'unknown';

/** An end of what is allowed, in the unit that is shown, with the reason in words where there is one. */
export interface Limit {
  readonly value: number;
  /** E.g. 'the flange at the pier is at 100 %'. */
  readonly because?: string;
  /** True when the value itself is no longer allowed. */
  readonly open?: boolean;
}

/** How a figure is written and what is allowed; all in the unit that is shown. */
export interface FigureRules {
  /** Places after the point. */
  readonly places: number;
  /** A count: nothing between whole numbers is taken. */
  readonly whole?: boolean;
  readonly unit?: string;
  readonly min?: Limit;
  readonly max?: Limit;
  /** Word that stands for not known; absent where that is no legal answer. */
  readonly unknown?: string;
  /** That word says something known, e.g. 'the start': it is underlined as what was typed. */
  readonly isSaid?: boolean;
}

export type ReadFigure =
  | { readonly ok: true; readonly value: Figure }
  | { readonly ok: false; readonly why: string };

const spaces = /[\s\u2009\u202f\u00a0]/gu;

/** Plain digits and point of a figure as people type it, or why it cannot be told. */
function plain(text: string): { readonly digits: string } | { readonly why: string } {
  const marks = text.match(/[.,]/gu) ?? [];
  const last = marks.at(-1);
  if (last === undefined) return { digits: text };
  const kinds = new Set(marks).size;
  const groups = /^[+-]?\d{1,3}(?:([.,])\d{3})(?:\1\d{3})*(?:[.,]\d*)?$/u;
  if (marks.length > 1) {
    // Several marks: the last is the point when it differs from the others, and the others part thousands.
    if (!groups.test(text)) return { why: `'${text}' cannot be read: write thousands with spaces` };
    if (kinds === 1) return { digits: text.replace(/[.,]/gu, '') };
    const at = text.lastIndexOf(last);
    return { digits: `${text.slice(0, at).replace(/[.,]/gu, '')}.${text.slice(at + 1)}` };
  }
  if (last === ',' && /^[+-]?[1-9]\d{0,2},\d{3}$/u.test(text)) {
    const [whole, rest] = text.split(',');
    return {
      why: `'${text}' can be read as ${whole}${thin}${rest} or as ${whole}.${rest}: write one of them`,
    };
  }
  return { digits: text.replace(',', '.') };
}

/**
 * Reads a figure as people type it: comma or point, spaces of any kind in thousands, true minus, the unit behind it if
 * it is there. An empty field, '?' and the word for it mean not known, where that is allowed. Says why it cannot be read.
 */
export function readFigure(text: string, { unit, unknown }: FigureRules): ReadFigure {
  const typed = text.trim();
  const isUnknown = typed === '' || typed === '?' || typed.toLowerCase() === unknown?.toLowerCase();
  if (isUnknown) {
    return unknown === undefined
      ? { ok: false, why: 'a figure is needed here' }
      : { ok: true, value: 'unknown' };
  }
  const bare = unit !== undefined && typed.endsWith(unit) ? typed.slice(0, -unit.length) : typed;
  const squeezed = bare.replace(spaces, '').replace(/[\u2212\u2013]/gu, '-');
  const found = plain(squeezed);
  if ('why' in found) return { ok: false, why: found.why };
  if (!/^[+-]?(?:\d+\.?\d*|\.\d+)$/u.test(found.digits)) {
    return { ok: false, why: `'${typed}' is not a figure` };
  }
  return { ok: true, value: Number(found.digits) };
}

/** A figure as it is printed in its sentence, without its unit. */
export function writeFigure(value: Figure, { places, unknown = 'unknown' }: FigureRules): string {
  return value === 'unknown' ? unknown : fixed(value, places);
}

/** What is wrong with a value, and the nearest one that is allowed; null when nothing is. */
export interface Refusal {
  readonly why: string;
  readonly nearest: number | null;
}

/** The smallest step that can be seen, e.g. 0.01 for two places. */
export const smallestStep = (places: number): number => Number(`1e-${String(places)}`);

/** Rounded to the places shown, so that what is kept is what is read. */
const atPlaces = (value: number, places: number): number => Number(value.toFixed(places));

/** Judges a value against the limits; an open limit allows the next value that can be told from it. */
export function judgeFigure(value: Figure, rules: FigureRules): Refusal | null {
  if (value === 'unknown') {
    return rules.unknown === undefined ? { why: 'a figure is needed here', nearest: null } : null;
  }
  if (!Number.isFinite(value)) return { why: 'a figure is needed here', nearest: null };
  const { min, max, places, unit, whole } = rules;
  const said = (limit: Limit, words: string): string => {
    const units = unit === undefined ? '' : ` ${unit}`;
    const because = limit.because === undefined ? '' : `, because ${limit.because}`;
    return `${words} ${fixed(limit.value, places)}${units}${because}`;
  };
  const step = smallestStep(places);
  if (min !== undefined && !(min.open === true ? value > min.value : value >= min.value)) {
    return {
      why: said(min, min.open === true ? 'more than' : 'at least'),
      nearest: atPlaces(min.value + (min.open === true ? step : 0), places),
    };
  }
  if (max !== undefined && !(max.open === true ? value < max.value : value <= max.value)) {
    return {
      why: said(max, max.open === true ? 'less than' : 'at most'),
      nearest: atPlaces(max.value - (max.open === true ? step : 0), places),
    };
  }
  if (whole === true && !Number.isInteger(value)) {
    return { why: `a whole number is expected, not ${value}`, nearest: Math.round(value) };
  }
  return null;
}

/** The value moved by `by`, rounded to the places shown and held inside the limits. */
export function movedFigure(from: number, by: number, rules: FigureRules): number {
  const moved = atPlaces(from + by, rules.places);
  return judgeFigure(moved, rules)?.nearest ?? moved;
}
