import { money2, odds } from '../format.ts';
import type { FormInk } from '../forms/formInk.ts';
import { optionNumber } from '../forms/optionNumber.ts';
import type { AppraisedOption, Site, Standing } from '../model.ts';
import type { Axis } from './axis.ts';
import { optionWords } from './elevation.ts';
import { elevationText } from './elevationText.ts';
import type { Frame } from './frame.ts';
import type { Paper } from './ink.ts';
import { colours, pens } from './ink.ts';
import type { Piece } from './piece.ts';
import { handles } from './handles.ts';
import { optionHandles, pierBays, type InHand } from './supportHandles.ts';
import { el, g, num } from './piece.ts';
import type { Scale } from './scale.ts';

export interface StackInput {
  readonly site: Site;
  /** In the order in which they are to stand. */
  readonly options: readonly AppraisedOption[];
  readonly standing: Standing;
  /** Money, or null where none is known. */
  readonly budget: number | null;
  readonly currency: string;
  /** Number of the reference option, or null. */
  readonly reference: number | null;
  readonly widthPx: number;
  readonly scale?: Scale;
  /** Words beside an option's spans; made from its depths and road level where left out. */
  readonly notes?: Readonly<Record<number, string>>;
  readonly paper?: Paper;
  readonly prefix?: string;
  /** Piers, depth and spans of the reference can be taken hold of. */
  readonly hands?: InHand;
}

/** Room left of the sheet for the bar of the reference option, px; the drawing is that much wider than asked. */
export const stackOutset = 14;

/** Below this width the rows are laid out for a hand-held screen. */
export const narrowBelow = 680;

/** What all rows of one stack share. */
export interface StackSheet {
  readonly input: StackInput;
  readonly ink: FormInk;
  readonly scale: Scale;
  readonly shown: { readonly fromM: number; readonly toM: number };
  /** Elevations stand under their costs and take the whole width. */
  readonly isTall: boolean;
  /** Width of the whole, px: that asked for, or more where the elevations are pushed sideways. */
  readonly sheetPx: number;
  readonly axis: Axis;
  readonly unit: { readonly per: number; readonly label: string };
}

/** A row in its own measure: what stands in it begins at 0, and `chosenRow` puts it in its place. */
export interface StackRow {
  readonly piece: Piece;
  readonly bottom: number;
  readonly frame: Frame;
}

/** Words for an elevation as they were last found: an option that is not in hand stays the same. */
const wordsLast = new WeakMap<AppraisedOption, { readonly site: Site; readonly words: string }>();

function toldOf(site: Site, option: AppraisedOption): string {
  const last = wordsLast.get(option);
  if (last?.site === site) return last.words;
  const words = elevationText(site, option);
  wordsLast.set(option, { site, words });
  return words;
}

/**
 * One row as something that can be chosen: number, form, spans and cost are its name. What it holds is measured from its
 * top: a row that only moves, because one above it has grown, stays the same drawing in another place.
 */
export function chosenRow(
  shared: StackSheet,
  option: AppraisedOption,
  top: number,
  height: number,
  children: readonly (Piece | null | false)[],
  hands: readonly (Piece | null)[] = [],
): Piece {
  const { input, unit } = shared;
  const reference = input.reference === option.number;
  const { p10, p50, p90 } = option.cost;
  const within = input.standing.within[option.number];
  const words = `${optionWords(option)}: ${money2(p50 / unit.per)} ${unit.label}, ${money2(p10 / unit.per)} to ${money2(p90 / unit.per)}${within === undefined ? '' : `, ${odds(within)} % within budget`}${option.status === 'out' ? ', out' : ''}`;
  const told = `${input.prefix ?? 'stack'}-words-${String(option.number)}`;
  return g(
    {
      class: reference ? 'row reference' : 'row',
      'data-key': `row ${String(option.number)}`,
      'data-option': option.number,
      transform: `translate(0 ${num(top)})`,
    },
    el('desc', { id: told }, toldOf(input.site, option)),
    el('rect', {
      class: 'frame',
      role: 'button',
      tabindex: 0,
      'aria-pressed': reference ? 'true' : 'false',
      'aria-label': words,
      'aria-describedby': told,
      x: -4,
      y: 2,
      width: shared.sheetPx + 8,
      height: height - 4,
      fill: colours.sheet,
      'fill-opacity': 0,
      stroke: 'none',
    }),
    g({ 'aria-hidden': 'true' }, children),
    hands,
    reference &&
      el('path', {
        d: `M${num(2.65 / 2 - stackOutset)},4V${num(height - 4)}`,
        stroke: shared.ink.accent,
        'stroke-width': pens.heavy,
      }),
  );
}

/** What of an option can be taken hold of in its row, spans in their dimension line with their middle at `spanY`. */
export function rowHandles(
  { input }: StackSheet,
  option: AppraisedOption,
  frame: Frame,
  spanY: number,
  hands: InHand,
  { rightPx, height }: { readonly rightPx: number; readonly height: number },
): Piece[] {
  const { site, prefix } = input;
  return [
    pierBays(site, option, frame),
    handles(
      optionHandles(site, option, frame, spanY, hands),
      { left: 0, top: 0, right: rightPx, bottom: height },
      hands.hold,
      prefix ?? 'stack',
    ),
  ];
}

/** Number in its circle: filled for the reference, ring in the form's colour for the others, grey when out. */
export function rowNumber(
  shared: StackSheet,
  option: AppraisedOption,
  x: number,
  y: number,
  radius = 9.5,
): Piece {
  const filled = shared.input.reference === option.number;
  return optionNumber(option.number, x, y, {
    colour: filled ? shared.ink.accent : shared.ink.line(option.form),
    filled,
    radius,
  });
}
