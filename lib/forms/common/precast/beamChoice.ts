import type { SlabDesign } from '../slab/designSlab.ts';
import type { BeamShape } from './beamShape.ts';

/** Where the beams of a deck stand. */
export interface BeamLayout {
  readonly count: number;
  readonly spacingM: number;
  readonly overhangM: number;
  /** From the middle of the deck, left to right, m. */
  readonly offsetsM: readonly number[];
}

/** What is laid down before the strands are sought: beams across the deck, their shape, the slab on them. */
export interface BeamChoice {
  readonly layout: BeamLayout;
  readonly shape: BeamShape;
  readonly slab: SlabDesign;
  /** Fill between beam and slab, m. */
  readonly haunchM: number;
}
