/** How the main unit of an option is made where its form leaves a choice; empty = constant depth under a plain slab. */
export interface Variant {
  /** Depth over the inner supports over the depth at midspan, above 1: a parabola between them. */
  readonly haunchRatio?: number;
  /** Beams between the girders, so that fewer girders carry the slab. */
  readonly substringers?: true;
  /** Tendons across the top slab of a concrete box, so that fewer cells carry it. */
  readonly transverse?: true;
  /** Inclined struts under the wings of a concrete box, so that fewer cells carry its deck. */
  readonly struts?: true;
}
