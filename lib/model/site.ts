import type { GroundStretch, ObstacleKind, Road, SiteClass } from './study.ts';
import type { StandardId } from './ids.ts';

/** The crossing as the later stages read it: plain data, chainages and levels in metres. */
export interface Site {
  readonly startM: number;
  readonly endM: number;
  readonly lengthM: number;
  /** Innermost places of the abutments, m, where the brief leaves them a window; absent where both are fixed. */
  readonly windows?: { readonly startLatestM: number; readonly endEarliestM: number };
  /**
   * Where the abutments of an option stand inside the crossing: chainages of the ends of the crossing, m, at which the
   * road has its proposed levels and its approaches begin to fall. Absent where the abutments stand there themselves.
   */
  readonly roadEnds?: { readonly startM: number; readonly endM: number };
  readonly groundX: readonly number[];
  readonly groundZ: readonly number[];
  readonly zones: readonly Zone[];
  readonly soffitLimits: readonly SoffitLimit[];
  readonly waters: readonly WaterBody[];
  readonly groundStretches: readonly GroundStretch[];
  readonly road: Road;
  readonly roadCurves: RoadCurves;
  readonly deck: DeckSpec;
  readonly standard: StandardId;
  /** Infinity on a straight; null when unknown. */
  readonly planRadiusM: number | null;
  readonly skewDeg: number | null;
  /** Earthquake to be reckoned with: acceleration on rock, share of gravity; null or absent where it is not known. */
  readonly seismic?: { readonly groundAccelerationG: number; readonly siteClass: SiteClass | null } | null;
  /** Widest stretch barred to supports, m, and where it lies; null when nothing is barred. */
  readonly mainOpening: { readonly fromM: number; readonly toM: number; readonly widthM: number } | null;
}

/** A stretch where a support may not (hard) or had better not (soft) stand. */
export interface Zone {
  readonly fromM: number;
  readonly toM: number;
  readonly hard: boolean;
  readonly kind: ObstacleKind;
  readonly name: string;
  /** What an inner support in a soft one costs besides itself, money, where the brief says so; the rate of the pack elsewhere. */
  readonly pierPremium?: number;
}

/** Lowest soffit allowed along a stretch. */
export interface SoffitLimit {
  readonly fromM: number;
  readonly toM: number;
  readonly levelM: number;
  readonly reason: string;
  readonly kind: ObstacleKind | 'flood';
}

export interface WaterBody {
  readonly name: string;
  readonly fromM: number;
  readonly toM: number;
  readonly levelM: number;
  readonly floodLevelM: number | null;
  /** What is known of its flood beyond the level; absent on a site nobody surveyed from a brief. */
  readonly river?: RiverGiven;
}

/** What the brief says of a water in flood; null where it is not known. */
export interface RiverGiven {
  /** Stretch over which the flood stands, m, and clear height it needs under the soffit, m. */
  readonly floodFromM: number;
  readonly floodToM: number;
  readonly freeboardM: number;
  readonly flowM3s: number | null;
  readonly velocityMs: number | null;
  readonly allowedAffluxM: number | null;
  readonly grainMm: number | null;
  readonly siltFactor: number | null;
  readonly vesselDwtT: number | null;
  readonly vesselSpeedMs: number | null;
}

/** The deck as the structure sees it. */
export interface DeckSpec {
  readonly widthM: number;
  /** Width between kerbs (lanes and shoulders), m: decides the notional lanes. */
  readonly carriagewayM: number;
  /** Offset of the middle of the carriageway from the middle of the deck, m, positive to the right. */
  readonly carriagewayOffsetM: number;
  /** Marked lanes. */
  readonly lanes: number;
  readonly footwayM: number;
  readonly surfacingM: number;
  /** Characteristic superimposed dead load of surfacing, footway build-up, barriers, services: kN per m of deck. */
  readonly superimposedKNm: number;
}

/** Least radii of the road's vertical curves, m; 0 lets gradients meet at an angle. */
export interface RoadCurves {
  readonly crestRadiusM: number;
  readonly sagRadiusM: number;
}

/** A stretch of the road: level = levelM + gradient t + curvature1PerM t^2 / 2 at t = chainage - fromM. */
export interface RoadPiece {
  readonly fromM: number;
  readonly toM: number;
  /** Level at `fromM`, m. */
  readonly levelM: number;
  /** Gradient at `fromM`, rising with the chainage. */
  readonly gradient: number;
  /** Change of gradient per metre: 0 on a straight grade, negative on a crest, positive in a sag. */
  readonly curvature1PerM: number;
}

/** What an approach takes between its abutment and the place where it meets the ground. */
export interface Approach {
  readonly lengthM: number;
  readonly fillM3: number;
  /** Face of its retaining walls, both sides together, m2; 0 with side slopes. */
  readonly wallM2: number;
}

/**
 * How the existing road behind a fixed end is led from the gradient of the deck back to its own line: a curve at the
 * abutment that turns a little past the gradient of the road, and a curve the other way in which it meets it.
 */
export interface Regrading {
  /** The curve at the abutment: a crest where the road behind falls away more steeply than the deck, else a sag. */
  readonly kind: 'crest' | 'sag';
  /** Its radius, m. */
  readonly radiusM: number;
  /** Between the gradient of the deck at the abutment and that of the existing road, as a ratio, 0 or more. */
  readonly gradientChange: number;
  /** Curve behind the abutment, R x change of gradient, m: until the road runs parallel to the existing one. */
  readonly curveM: number;
  /** Half of it, the tangent length, m, and how far the curve lies from where its tangents meet, T^2 / 2R, m. */
  readonly tangentM: number;
  readonly offsetM: number;
  /** Greatest height above the existing road, or depth below it, m: at the end of that curve. */
  readonly apartM: number;
  /** Length over which the existing road is regraded until it is met again, m. */
  readonly lengthM: number;
  /** Whether it is met again within the steepest gradient; else only the curve is laid and measured. */
  readonly comesBack: boolean;
  /** Fill above and cut below the existing road, m3, and walls, both sides together, m2. */
  readonly fillM3: number;
  readonly cutM3: number;
  readonly wallM2: number;
}

/** Finished road level along the crossing and its approaches for one construction depth. */
export interface RoadProfile {
  /** Level at both ends of the crossing, m: at the abutments, where they have no windows. */
  readonly startLevelM: number;
  readonly endLevelM: number;
  /** Rise above the proposed levels at each end, m. */
  readonly startRiseM: number;
  readonly endRiseM: number;
  /** Fill of both approaches over that of the road as proposed, m3; a little less where a crest on the bridge spares one. */
  readonly addedFillM3: number;
  /** From end to end of the crossing. */
  readonly gradient: number;
  /** Steepest gradient between the abutments, either way. */
  readonly steepestGradient: number;
  /** Radius of the crest between the abutments, m; null where the road runs straight. */
  readonly crestRadiusM: number | null;
  /**
   * In order of chainage without gaps: the approach of each free end, the regrading behind a fixed one, and the road
   * between the abutments.
   */
  readonly pieces: readonly RoadPiece[];
  readonly approaches: { readonly start: Approach; readonly end: Approach };
  /** Behind each fixed end where the gradient of the existing road is known; absent where there is none such. */
  readonly regrading?: { readonly start?: Regrading; readonly end?: Regrading };
  /** Fixed end whose curve behind is spared by a crest sharper than the clearances ask for; absent where the road is the lowest. */
  readonly easedFor?: 'start' | 'end';
}
