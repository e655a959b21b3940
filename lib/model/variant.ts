/** Lightweight concrete of a box: its diaphragms, struts and ribs stay of ordinary concrete. */
export interface LightConcreteAsked {
  /** Oven-dry density, kg/m3. */
  readonly densityKgM3: number;
  /** By span: length about its middle that is made of it, m; the whole box when absent. */
  readonly middleM?: readonly number[];
}

/** How the main unit of an option is made where its form leaves a choice; empty = constant depth under a plain slab, of the usual concrete. The search chooses among the first five; the others are asked for. */
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
  /** Width of a concrete box between the axes of its outer webs at the top, m. */
  readonly boxWidthM?: number;
  /** Cylinder strength of the concrete of a box, MPa. */
  readonly strengthMPa?: number;
  /** Lightweight concrete in all of a box or about the middles of its spans. */
  readonly light?: LightConcreteAsked;
  /** Ballast in the cells of a box by span, kN per m of deck. */
  readonly ballastKNm?: readonly number[];
}
