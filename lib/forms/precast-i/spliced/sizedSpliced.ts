import type { BeamShear } from '../../common/precast/beamShear.ts';
import type { PierContinuity } from '../../common/precast/pierBars.ts';
import type { SizedTendons } from './sizeTendons.ts';

/** Tendons, links by span and bars by inner support of spliced beams. */
export interface SizedSpliced {
  readonly sized: SizedTendons;
  readonly shears: readonly BeamShear[];
  readonly piers: readonly PierContinuity[];
}
