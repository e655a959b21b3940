import type { Family, FormId } from '../model.ts';

/** How a form's hatch is ruled for printing without colour. Distances and widths in px. */
export type HatchRule =
  | {
      readonly kind: 'lines';
      readonly angle: 0 | 45 | 90 | 135;
      readonly apart: number;
      readonly widths: readonly number[];
      readonly offsets: readonly number[];
      readonly dash?: readonly [on: number, off: number];
    }
  | { readonly kind: 'crossed'; readonly apart: number; readonly width: number }
  | {
      readonly kind: 'arcs';
      readonly radius: number;
      readonly apart: number;
      readonly turned: boolean;
      readonly width: number;
    };

/** Everything a page needs to tell a form: glyph first, then hatch, then colour. */
export interface FormLook {
  readonly family: Family;
  /** Short name for charts and tables. */
  readonly short: string;
  /** Name as a heading beside an option. */
  readonly name: string;
  readonly colour: string;
  readonly hatch: HatchRule;
}

const upright = (
  apart: number,
  widths: readonly number[] = [0.7],
  offsets: readonly number[] = [0],
): HatchRule => ({ kind: 'lines', angle: 90, apart, widths, offsets });
const rising = (
  apart: number,
  widths: readonly number[] = [0.7],
  offsets: readonly number[] = [0],
): HatchRule => ({ kind: 'lines', angle: 45, apart, widths, offsets });
const falling = (apart: number): HatchRule => ({
  kind: 'lines',
  angle: 135,
  apart,
  widths: [0.7],
  offsets: [0],
});

/**
 * The seventeen forms. Colours were searched inside each family's hue so that every one reaches 3.05 to 1 on white and
 * any two differ by 7.8 (CIEDE2000) or more to normal, red-, green- and blue-blind eyes.
 */
export const formLooks: Readonly<Record<FormId, FormLook>> = {
  slab: {
    family: 'slab',
    short: 'Slab',
    name: 'Slab',
    colour: '#746D67',
    hatch: { kind: 'lines', angle: 0, apart: 3.2, widths: [0.7], offsets: [0] },
  },
  'portal-frame': {
    family: 'girder',
    short: 'Portal frame',
    name: 'Portal frame',
    colour: '#8594B3',
    hatch: { kind: 'lines', angle: 90, apart: 3.6, widths: [0.7], offsets: [0], dash: [4.6, 2.4] },
  },
  'precast-i': {
    family: 'girder',
    short: 'Precast I',
    name: 'Precast I-girders',
    colour: '#1599E7',
    hatch: upright(6),
  },
  'precast-trough': {
    family: 'girder',
    short: 'Precast trough',
    name: 'Precast troughs',
    colour: '#1B4153',
    hatch: upright(7, [0.7, 0.7], [0, 2.2]),
  },
  'adjacent-box': {
    family: 'box',
    short: 'Adjacent box',
    name: 'Adjacent box beams',
    colour: '#3C2111',
    hatch: rising(7.2, [2, 0.7], [0, 3.6]),
  },
  'half-through': {
    family: 'girder',
    short: 'Half-through',
    name: 'Half-through girders',
    colour: '#172454',
    hatch: upright(7, [2.3]),
  },
  'composite-i': {
    family: 'girder',
    short: 'Composite I',
    name: 'Composite I-girders',
    colour: '#3871C9',
    hatch: upright(2.8),
  },
  'composite-box': {
    family: 'box',
    short: 'Composite box',
    name: 'Composite box',
    colour: '#956C4F',
    hatch: rising(6.4),
  },
  'concrete-box': {
    family: 'box',
    short: 'Concrete box',
    name: 'Concrete box',
    colour: '#5B3200',
    hatch: rising(3.2, [1.2]),
  },
  'cantilever-box': {
    family: 'box',
    short: 'Cantilever-built box',
    name: 'Concrete box, cantilever-built',
    colour: '#B88D0B',
    hatch: rising(7, [0.7, 0.7], [0, 2.2]),
  },
  'steel-box': {
    family: 'box',
    short: 'Steel box',
    name: 'Steel box, steel deck',
    colour: '#A1905E',
    hatch: { kind: 'lines', angle: 45, apart: 4.2, widths: [0.7], offsets: [0], dash: [4.6, 2.4] },
  },
  truss: {
    family: 'truss',
    short: 'Truss',
    name: 'Through truss',
    colour: '#82556E',
    hatch: { kind: 'crossed', apart: 5.2, width: 0.7 },
  },
  'tied-arch': {
    family: 'arch',
    short: 'Tied arch',
    name: 'Tied arch',
    colour: '#699782',
    hatch: { kind: 'arcs', radius: 3.4, apart: 5.2, turned: false, width: 0.7 },
  },
  'deck-arch': {
    family: 'arch',
    short: 'Deck arch',
    name: 'Deck arch',
    colour: '#3B5943',
    hatch: { kind: 'arcs', radius: 3, apart: 2.9, turned: true, width: 0.7 },
  },
  extradosed: {
    family: 'cable-supported',
    short: 'Extradosed',
    name: 'Extradosed',
    colour: '#8A6E96',
    hatch: falling(6.4),
  },
  'cable-stayed': {
    family: 'cable-supported',
    short: 'Cable-stayed',
    name: 'Cable-stayed',
    colour: '#4D1E95',
    hatch: falling(3.2),
  },
  suspension: {
    family: 'cable-supported',
    short: 'Suspension',
    name: 'Suspension',
    colour: '#6F508B',
    hatch: { kind: 'lines', angle: 135, apart: 4.2, widths: [0.7], offsets: [0], dash: [4.6, 2.4] },
  },
};
