import { colours, letters } from '../drawing/ink.ts';
import { label } from '../drawing/label.ts';
import type { Piece } from '../drawing/piece.ts';
import { g } from '../drawing/piece.ts';
import type { FormInk } from '../forms/formInk.ts';
import { glyph } from '../forms/glyph.ts';
import { optionNumber } from '../forms/optionNumber.ts';
import type { AppraisedOption } from '../model.ts';

/** What every chart of options is given. */
export interface OptionsInput {
  /** In one order for all charts: by P50. */
  readonly options: readonly AppraisedOption[];
  readonly reference: number | null;
  readonly widthPx: number;
  readonly paper?: 'colour' | 'black';
  readonly prefix?: string;
}

/** Start of a row: circle, then glyph, then the name where there is room; the same in every chart. */
export function rowHead(
  option: AppraisedOption,
  y: number,
  ink: FormInk,
  reference: number | null,
  name?: string,
): Piece {
  const filled = option.number === reference;
  return g(
    {},
    optionNumber(option.number, 10, y, { colour: filled ? ink.accent : ink.line(option.form), filled }),
    glyph(option.form, 26, y - 8, ink.line(option.form)),
    name !== undefined &&
      label(68, y + 4.5, name, { size: letters.table, weight: filled ? 600 : 400, fill: colours.ink }),
  );
}

/** Options by their cost at the median, the order of every chart. */
export const byCost = (options: readonly AppraisedOption[]): AppraisedOption[] =>
  [...options].sort((a, b) => a.cost.p50 - b.cost.p50 || a.number - b.number);
