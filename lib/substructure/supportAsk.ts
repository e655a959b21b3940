import type { IntegralWall, Support } from '../model/index.ts';
import type { FrameAsk } from './framedShaft.ts';

/** What one support is asked to carry: nothing here knows the form. Loads characteristic, kN. */
export interface SupportAsk {
  readonly name: string;
  /** Index along the crossing; absent in a trial for the cost table. */
  readonly index?: number;
  readonly kind: Support['kind'];
  readonly chainageM: number;
  /** Finished road level here, m. */
  readonly roadLevelM: number;
  /** Level of the lowest soffit that rests here, m. */
  readonly soffitLevelM: number;
  readonly permanentKN: number;
  /** Greatest traffic reaction. */
  readonly trafficKN: number;
  /** What traffic puts on the bearing at an obtuse corner over that of a square deck; 1 when absent. */
  readonly obtuseCorner?: number;
  /** What skew ends press on its bearings, all made like the one at the obtuse corner, kN, design; none when absent. */
  readonly skewPressKN?: number;
  /** Least traffic reaction; negative = uplift. */
  readonly trafficLeastKN: number;
  /** While its arms stand free: moment of one arm ahead of the other, kNm, and what it carries then, kN. */
  readonly building?: { readonly momentKNm: number; readonly verticalKN: number };
  /** Along the road at bearing level: braking and friction, or friction of a sliding bearing. */
  readonly alongKN: number;
  /** Wind across at deck level, without traffic. */
  readonly acrossKN: number;
  readonly fixed: boolean;
  /** Permanent load of all that this support holds along the road in an earthquake, kN; 0 where bearings slide. */
  readonly heldAlongKN: number;
  /** The deck is cast into this abutment: no bearings, no joint. */
  readonly castIn?: boolean;
  /** Pier only: the deck is cast in with it, and bends it. */
  readonly frame?: FrameAsk;
  readonly bearings: number;
  readonly jointMovementMm: number;
  /** Movement of the bearings, both ways together, mm; 0 where the deck is held. */
  readonly bearingMovementMm: number;
  /** Wall in one with the deck, measured with it; its loads stand for all others but wind. */
  readonly integral?: IntegralWall;
  /** Pylon only: its own weight, kN, its height above its foot, m, and the plan it stands on, m. */
  readonly pylon?: {
    readonly weightKN: number;
    readonly heightM: number;
    readonly lengthM: number;
    readonly widthM: number;
  };
}
