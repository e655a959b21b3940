import type { LoadStandard } from '../../actions/index.ts';
import type { StandardId } from '../../model/index.ts';
import type { MemberRules } from './memberSection.ts';

/** Loads of one truss plane, kN per m of truss, characteristic. */
interface PlaneLoads {
  /** Slab and floor steel. */
  readonly floorKNm: number;
  readonly superimposedKNm: number;
}

/** Everything about one span that does not change with the height of its trusses. */
export interface TrussCase {
  readonly standardId: StandardId;
  readonly standard: LoadStandard;
  readonly rules: MemberRules;
  readonly loads: PlaneLoads;
  readonly memberWidthM: number;
  /** Between the two planes, m. */
  readonly planesM: number;
  /** Length of what runs across along the supports, and bearings of one plane ahead of the other, m; 0 ahead on a square deck. */
  readonly crossM: number;
  readonly aheadM: number;
  /** Floor face that the wind meets, m. */
  readonly floorDepthM: number;
}
