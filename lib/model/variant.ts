/** Lightweight concrete of a box: its diaphragms, struts and ribs stay of ordinary concrete. */
export interface LightConcreteAsked {
  /** Oven-dry density, kg/m3. */
  readonly densityKgM3: number;
  /** By span: length about its middle that is made of it, m; the whole box when absent. */
  readonly middleM?: readonly number[];
}

/** How the main unit of an option is made where its form leaves a choice; empty = constant depth under a plain slab, of the usual concrete. */
export interface Variant {
  /** Depth over the inner supports over the depth at midspan, above 1: a parabola between them. */
  readonly haunchRatio?: number;
  /** Beams between the girders, so that fewer girders carry the slab. */
  readonly substringers?: true;
  /** Tendons across the top slab of a concrete box, so that fewer cells carry it. */
  readonly transverse?: true;
  /** Inclined struts under the wings of a concrete box, so that fewer cells carry its deck. */
  readonly struts?: true;
  /** Ribs across the deck under the slab of a concrete box, so that fewer cells carry it. */
  readonly ribs?: true;
  /** Ends of a box square to the road on skew abutments, where its bearings do not twist it; along them when absent, if none of them lifts. */
  readonly squareEnds?: true;
  /** Width of a concrete box between the axes of its outer webs at the top, m. */
  readonly boxWidthM?: number;
  /** Cylinder strength of the concrete of a box, MPa. */
  readonly strengthMPa?: number;
  /** Lightweight concrete in all of a box or about the middles of its spans. */
  readonly light?: LightConcreteAsked;
  /** Ballast in the cells of a box by span, kN per m of deck. */
  readonly ballastKNm?: readonly number[];
  /** Neighbouring piers in the middle of the unit that its deck is cast in with, 1 or more; on bearings everywhere when absent. */
  readonly castInPiers?: number;
}

/** Choices of a variant that the search makes itself where nobody has; the others are as the form finds best until they are asked for. */
export const searchedChoices = [
  'haunchRatio',
  'substringers',
  'transverse',
  'struts',
  'ribs',
  'squareEnds',
] as const;
type SearchedChoice = (typeof searchedChoices)[number];

/** How the main unit of an option is asked to be made: absent = without, 'unknown' = whichever costs least, or what is usual. */
export type AskedVariant = Omit<Variant, SearchedChoice | 'castInPiers'> & {
  readonly [Key in SearchedChoice]?: Variant[Key] | 'unknown';
} & {
  /** Unknown: on bearings, as is usual here. */
  readonly castInPiers?: number | 'unknown';
};

/** What is said of how a unit is made: what is left to the search, or to what is usual, is left out. */
export function saidOf(asked: AskedVariant): Variant {
  return Object.fromEntries(Object.entries(asked).filter(([, value]) => value !== 'unknown'));
}

/** Whether anything of how a unit is made is left to the search; all of it where nothing is asked. */
export const isOpen = (asked: AskedVariant | undefined): boolean =>
  asked === undefined || searchedChoices.some((key) => asked[key] === 'unknown');

/** What is asked, and what is left open made as in another variant; null where that is against what is asked. */
export function asMade(asked: AskedVariant | undefined, made: Variant): Variant | null {
  if (asked === undefined) return made;
  const said = saidOf(asked);
  const agrees = searchedChoices.every((key) => asked[key] === 'unknown' || said[key] === made[key]);
  if (!agrees) return null;
  const found = searchedChoices.filter((key) => made[key] !== undefined);
  return { ...said, ...Object.fromEntries(found.map((key) => [key, made[key]])) };
}
