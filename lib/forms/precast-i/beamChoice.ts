import type { SlabDesign } from '../common/slab/designSlab.ts';
import type { BeamLayout } from './beamLayout.ts';
import type { BeamShape } from './beamShapes.ts';

/** What is laid down before the strands are sought: beams across the deck, their shape, the slab on them. */
export interface BeamChoice {
  readonly layout: BeamLayout;
  readonly shape: BeamShape;
  readonly slab: SlabDesign;
  /** Fill between beam and slab, m. */
  readonly haunchM: number;
}
