import { fixed, level } from '../format.ts';
import type { Variant } from '../model.ts';

/** A way of making a unit that it has or has not. */
interface WayField {
  readonly kind: 'way';
  readonly label: string;
}

/** A figure of how a unit is made; all in the unit that is shown. */
interface FigureOf {
  readonly label: string;
  /** Steps to it from the variant. */
  readonly steps: readonly [keyof Variant, ...string[]];
  readonly unit?: string;
  readonly places: number;
  readonly step: number;
  /** Where stepping starts from while it is empty. */
  readonly from: number;
  /** What stands for it while it is empty. */
  readonly empty: string;
}
interface FigureChoice extends FigureOf {
  readonly kind: 'figure';
  /** The value that is the plain way, and the least. */
  readonly plain?: number;
  /** The least, where there is no plain one. */
  readonly least?: number;
  /** The most that a study file may say, where the form itself has nothing against it. */
  readonly most?: number;
  /** What it comes to in a unit of which it is not asked, and the figures of the design that it is told from. */
  readonly found?: (figures: Readonly<Record<string, number>>) => Found | undefined;
}
interface Found {
  readonly value: number;
  readonly of: readonly string[];
}
/** A figure for each span of the main unit. */
export interface SpanField extends FigureOf {
  readonly kind: 'by-span';
  /** What a span of a length, m, has where nothing is said of it. */
  readonly usual: (spanM: number) => number;
}
export type FigureField = FigureChoice | SpanField;
export type ChoiceField = WayField | FigureField;

/** How a choice of a form is asked for and said. */
export interface FormChoice {
  /** Its first field makes or clears it; the others are there once it is made. */
  readonly fields: readonly [ChoiceField, ...FigureField[]];
  /** In words, of a unit that is made so; null where its figures come to nothing. */
  readonly said: (variant: Variant) => string | null;
  /** In words, of a unit that is not, where the search might have made it so. */
  readonly without?: string;
}

const way = (label: string, words: string, without?: string): FormChoice => ({
  fields: [{ kind: 'way', label }],
  said: () => words,
  ...(without === undefined ? {} : { without }),
});

/** The choices that a form may leave, in the order in which they are asked. */
export const formChoices: Readonly<Record<keyof Variant, FormChoice>> = {
  haunchRatio: {
    fields: [
      {
        kind: 'figure',
        label: 'depth over piers over that at midspan',
        steps: ['haunchRatio'],
        places: 2,
        step: 0.1,
        from: 1.5,
        empty: 'as costs least',
        plain: 1,
        most: 4,
      },
    ],
    said: ({ haunchRatio = 1 }) => `${fixed(haunchRatio, 2)} times as deep over piers as at midspan`,
    without: 'constant depth',
  },
  substringers: way(
    'substringers between the girders',
    'substringers between the girders',
    'no substringers',
  ),
  transverse: way('tendons across the top slab', 'top slab prestressed across', 'no tendons across'),
  struts: way('struts under the wings', 'wings on struts', 'no struts'),
  ribs: way('ribs across the deck', 'slab on ribs', 'no ribs'),
  boxWidthM: {
    fields: [
      {
        kind: 'figure',
        label: 'width of the box between its outer webs',
        steps: ['boxWidthM'],
        unit: 'm',
        places: 2,
        step: 0.1,
        from: 6,
        empty: 'as its cells ask',
        found: ({ cells, webSpacingM }) =>
          cells === undefined || webSpacingM === undefined
            ? undefined
            : { value: cells * webSpacingM, of: ['cells', 'webSpacingM'] },
      },
    ],
    said: ({ boxWidthM = NaN }) => `box ${level(boxWidthM)} m wide between its webs`,
  },
  strengthMPa: {
    fields: [
      {
        kind: 'figure',
        label: 'cylinder strength of its concrete',
        steps: ['strengthMPa'],
        unit: 'MPa',
        places: 0,
        step: 5,
        from: 50,
        empty: 'the usual',
      },
    ],
    said: ({ strengthMPa = NaN }) => `concrete of ${fixed(strengthMPa, 0)} MPa`,
  },
  light: {
    fields: [
      {
        kind: 'figure',
        label: 'lightweight concrete, oven-dry density',
        steps: ['light', 'densityKgM3'],
        unit: 'kg/m³',
        places: 0,
        step: 50,
        from: 1800,
        empty: 'none',
      },
      {
        kind: 'by-span',
        label: 'length of it about the middle of a span',
        steps: ['light', 'middleM'],
        unit: 'm',
        places: 1,
        step: 1,
        from: 0,
        empty: 'all of it',
        usual: (spanM) => spanM,
      },
    ],
    said: ({ light }) =>
      light === undefined
        ? null
        : `lightweight concrete of ${fixed(light.densityKgM3, 0)} kg/m³${light.middleM ? ' about the middles of spans' : ''}`,
  },
  ballastKNm: {
    fields: [
      {
        kind: 'by-span',
        label: 'ballast in its cells',
        steps: ['ballastKNm'],
        unit: 'kN/m',
        places: 0,
        step: 10,
        from: 0,
        empty: 'none',
        usual: () => 0,
      },
    ],
    said: ({ ballastKNm = [] }) => (ballastKNm.some((kNm) => kNm > 0) ? 'ballast in its cells' : null),
  },
  // Nothing is said of ends that are not: most decks have no skew.
  squareEnds: way('ends square to the road on a skew', 'ends square to the road'),
  castInPiers: {
    fields: [
      {
        kind: 'figure',
        label: 'piers in the middle that the deck is cast in with',
        steps: ['castInPiers'],
        places: 0,
        step: 1,
        least: 1,
        from: 1,
        empty: 'none, on bearings as usual',
      },
    ],
    said: ({ castInPiers = 0 }) => `cast in with ${castInPiers === 1 ? 'one pier' : `${castInPiers} piers`}`,
  },
};

/** The choices made in a variant, in words. */
export function choicesSaid(variant: Variant): string[] {
  const made = Object.keys(formChoices) as (keyof Variant)[];
  return made
    .filter((key) => variant[key] !== undefined)
    .flatMap((key) => formChoices[key].said(variant) ?? []);
}
