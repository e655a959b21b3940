import type { TrafficLoad } from '../../../actions/index.ts';
import type { FormId, StandardId, UnitTask } from '../../../model/index.ts';
import type { BeamChoice } from './beamChoice.ts';
import type { CompositeBeam } from './compositeBeam.ts';
import type { DiaphragmData } from './diaphragmData.ts';

/** Traffic on the beam that carries most, and the torsion that goes with it. */
export interface BeamTraffic {
  readonly load: TrafficLoad;
  /** Torque over the shear that traffic gives the beam, m, and the closed cell that carries it; absent on open beams. */
  readonly torsion?: { readonly armM: number; readonly cellM2: number; readonly aroundM: number };
}

/** Faces of cross-walls, m2. */
export interface CrossWalls {
  /** Over the width of the deck, cast in place: over supports and within a span. */
  readonly supportM2: number;
  readonly withinM2: number;
  /** Within a span, what hangs on one beam. */
  readonly ofBeamM2: number;
  /** Where those within a span are cast with the beam: length of the solid block at each end of it, m. */
  readonly endBlockM?: number;
}

/** How the kinds of pretensioned beam under a slab differ for their statics. */
export interface PrecastKind {
  readonly form: FormId;
  /** What is done with strands at the ends of a beam. */
  readonly relief: Readonly<Record<StandardId, 'debonded' | 'draped'>>;
  readonly diaphragm: DiaphragmData;
  /** Over piers: beams made continuous for traffic, or spans by themselves with the slab run through between them. */
  readonly spans: 'continuous' | 'linked';
  readonly crossWalls: (choice: BeamChoice) => CrossWalls;
  /** Traffic on the beam that carries most, or on beam `beam`; `ratio` is the modulus of the beam over that of the slab. */
  readonly traffic: (
    task: UnitTask,
    choice: BeamChoice,
    composite: CompositeBeam,
    ratio: number,
    beam?: number,
  ) => BeamTraffic;
}
