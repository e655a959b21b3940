import type { GroundStretch, ObstacleKind, Road, SiteClass } from './study.ts';
import type { StandardId } from './ids.ts';

/** The crossing as the later stages read it: plain data, chainages and levels in metres. */
export interface Site {
  readonly startM: number;
  readonly endM: number;
  readonly lengthM: number;
  readonly groundX: readonly number[];
  readonly groundZ: readonly number[];
  readonly zones: readonly Zone[];
  readonly soffitLimits: readonly SoffitLimit[];
  readonly waters: readonly WaterBody[];
  readonly groundStretches: readonly GroundStretch[];
  readonly road: Road;
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

/** Finished road level along the crossing for one construction depth. */
export interface RoadProfile {
  /** Level at both abutments, m; the road runs straight between them. */
  readonly startLevelM: number;
  readonly endLevelM: number;
  /** Rise above the proposed levels at each end, m. */
  readonly startRiseM: number;
  readonly endRiseM: number;
  /** Fill added behind each abutment by that rise, m3. */
  readonly addedFillM3: number;
  readonly gradient: number;
}
