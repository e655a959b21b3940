import type { Site } from '../model/index.ts';
import { substructureData } from './data.ts';

/** Shares of an earthquake along and across the road that come together: one in full with a part of the other. */
export function quakeDirections(): readonly (readonly [along: number, across: number])[] {
  const { orthogonalShare } = substructureData.seismic;
  return [
    [1, orthogonalShare],
    [orthogonalShare, 1],
  ];
}

/** What an earthquake asks of supports: horizontal force as a share of the weight that moves. */
export interface SeismicLoad {
  /** Of a deck that a pier of limited ductility holds: acceleration x soil x 2.5 / 1.5, on the plateau of the spectrum. */
  readonly pierShare: number;
  /** Of a deck held by an abutment, which moves with the ground: acceleration x soil. */
  readonly groundShare: number;
}

/**
 * Base shear of the design earthquake as shares of weight (EN 1998-1 and 1998-2, see the data file); null where the ground
 * acceleration is not known. Every pier is taken to sway on the plateau of the spectrum: tall piers, which sway longer, are
 * on the safe side. Without a site class the worst is taken.
 */
export function seismicLoad({ seismic }: Pick<Site, 'seismic'>): SeismicLoad | null {
  if (seismic == null) return null;
  const { amplification, behaviour } = substructureData.seismic;
  const soil = substructureData.seismic[`soil${seismic.siteClass ?? 'E'}`];
  const groundShare = seismic.groundAccelerationG * soil;
  return { pierShare: (groundShare * amplification) / behaviour, groundShare };
}
