import type { FormId } from '../model.ts';
import { colours } from '../drawing/ink.ts';
import type { Paper } from '../drawing/ink.ts';
import type { Piece } from '../drawing/piece.ts';
import { formLooks } from './formLook.ts';
import { hatchId, hatches } from './hatch.ts';

/** How forms are inked on one sheet. */
export interface FormInk {
  readonly paper: Paper;
  /** Line of a form: its colour, or ink on a sheet without colour. */
  readonly line: (form: FormId) => string;
  /** Face of a deck: 17 % of the colour on white, or white. */
  readonly face: (form: FormId) => string;
  /** Filling of a bar or mark: the colour, or the hatch. */
  readonly bar: (form: FormId) => string;
  /** Edge round a bar: none in colour, ink round a hatch. */
  readonly barEdge: (form: FormId) => string;
  /** The accent, or ink. */
  readonly accent: string;
  /** Patterns that the fillings refer to. */
  readonly defs: readonly Piece[];
}

/** A colour mixed into white, `part` of it, as a solid tint. */
export function tint(colour: string, part: number): string {
  const mix = [1, 3, 5].map((at) => {
    const value = parseInt(colour.slice(at, at + 2), 16);
    return Math.round(255 + (value - 255) * part)
      .toString(16)
      .padStart(2, '0');
  });
  return `#${mix.join('').toUpperCase()}`;
}

/**
 * Inks for the forms of one drawing.
 * @param prefix keeps the patterns of this drawing apart from those of others on the page
 */
export function formInk(paper: Paper, forms: Iterable<FormId>, prefix: string): FormInk {
  if (paper === 'colour') {
    return {
      paper,
      line: (form) => formLooks[form].colour,
      face: (form) => tint(formLooks[form].colour, 0.17),
      bar: (form) => formLooks[form].colour,
      barEdge: () => 'none',
      accent: colours.accent,
      defs: [],
    };
  }
  return {
    paper,
    line: () => colours.ink,
    face: () => colours.sheet,
    bar: (form) => `url(#${hatchId(prefix, form)})`,
    barEdge: () => colours.ink,
    accent: colours.ink,
    defs: hatches(forms, prefix),
  };
}
