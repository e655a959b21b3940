import type { AskedVariant } from './variant.ts';
import type { FormId, GroundClassId, MethodId, StandardId } from './ids.ts';

/**
 * The study after reading: every default has been applied once, everything is in metres, kilonewtons and
 * money of the study's currency, and `'unknown'` is a legal answer wherever the type allows it.
 * The file format and its checks live in `lib/study`.
 */
export interface Study {
  readonly format: 'spanledger-study';
  readonly version: number;
  readonly title: string;
  readonly reference: string;
  /** Shown wherever the study is shown, e.g. that a worked example is invented. */
  readonly notice: string;
  readonly brief: Brief;
  /**
   * Dotted paths of fields of the brief, e.g. 'brief.road.startLevelM', that hold a start value nobody has confirmed: a list
   * or a group stands for all in it. Each once, in order; results do not hang on it.
   */
  readonly assumed: readonly string[];
  readonly books: Books;
  readonly options: OptionsSlice;
  readonly priorities: Priorities;
  readonly notes: readonly Note[];
  readonly decision: Decision | null;
}

export type Unknown = 'unknown';

export interface Brief {
  readonly crossing: Crossing;
  readonly road: Road;
  readonly deck: readonly DeckStrip[];
  /** Surfacing thickness, m. */
  readonly surfacingM: number;
  readonly loading: StandardId;
  readonly obstacles: readonly Obstacle[];
  readonly waters: readonly Water[];
  readonly groundStretches: readonly GroundStretch[];
  readonly access: Access;
  readonly demands: Demands;
  readonly budget: Budget | Unknown;
}

export interface Crossing {
  /** Chainages of the two abutment bearing lines, or of the outermost places where they may stand, m; start < end. */
  readonly startM: number;
  readonly endM: number;
  /**
   * Windows of the abutments: farthest along the start abutment may stand, and nearest the end abutment may, m. Unknown or
   * absent: it stands at `startM`, or at `endM`.
   */
  readonly startLatestM?: number | Unknown;
  readonly endEarliestM?: number | Unknown;
  /** Ground and bed levels along the centre line; chainages rise; covers start to end. */
  readonly ground: readonly ProfilePoint[];
  readonly planRadiusM: number | 'straight' | Unknown;
  /** Skew of the supports from square, degrees, 0 = square. */
  readonly skewDeg: number | Unknown;
  /** Design ground acceleration on rock, share of gravity; 0 where none is to be reckoned with. */
  readonly groundAccelerationG: number | Unknown;
  /** Site class of EN 1998-1, A rock to E soft over stiff. */
  readonly siteClass: SiteClass | Unknown;
}

export const siteClasses = ['A', 'B', 'C', 'D', 'E'] as const;
export type SiteClass = (typeof siteClasses)[number];

export interface ProfilePoint {
  readonly chainageM: number;
  readonly levelM: number;
}

export interface Road {
  /** Proposed finished road levels at the two abutment bearing lines, m. */
  readonly startLevelM: number;
  readonly endLevelM: number;
  /** Which ends of the road are tied to something that cannot move. */
  readonly fixedEnd: 'start' | 'end' | 'both' | 'none';
  /** How far a free end may rise above its proposed level, m. */
  readonly mayRiseM: number;
  /** Steepest gradient allowed, as a ratio (0.06 = 6 %). */
  readonly maxGradient: number;
  /** Side slope of approach fill, horizontal to vertical. */
  readonly fillSideSlope: number;
  /** Speed the vertical curves are laid out for, km/h. */
  readonly designSpeedKmh: number | Unknown;
  /** Least radius of a crest and of a sag, m; 0 lets gradients meet at an angle; unknown = by the design speed. */
  readonly crestRadiusM: number | Unknown;
  readonly sagRadiusM: number | Unknown;
  /**
   * How a free end is joined to the road behind it: `moves` = it falls at the steepest gradient and meets the ground where
   * it will; `fixed` = one gradient from a place that stays.
   */
  readonly startTieIn: TieIn;
  readonly endTieIn: TieIn;
  /**
   * Length of the approach behind each abutment, m: where a fixed tie-in lies, how far one that moves may reach, or how
   * much of the existing road behind a fixed end may be regraded.
   */
  readonly startApproachM: number | Unknown;
  readonly endApproachM: number | Unknown;
  /**
   * Gradient of the existing road behind a fixed end, as a ratio, rising with the chainage. Absent or unknown: nothing is
   * said about the change of gradient there.
   */
  readonly startGradient?: number | Unknown;
  readonly endGradient?: number | Unknown;
  /** Whether the fill of the approaches runs out in side slopes or stands between retaining walls. */
  readonly approachSides: ApproachSides;
}

/** What else the bridge is asked for. */
export interface Demands {
  /** Traffic lanes that stay in use on an existing bridge on the same line, so that the new one is built in halves; 0 = none. */
  readonly lanesKept: number;
  /** A gas main on the deck: none, hung outside, or to be hidden inside. */
  readonly gasMain: GasMain;
}

export const gasMains = ['none', 'outside', 'inside'] as const;
type GasMain = (typeof gasMains)[number];

export const tieIns = ['moves', 'fixed'] as const;
export type TieIn = (typeof tieIns)[number];

export const approachSidesKinds = ['slopes', 'walls'] as const;
export type ApproachSides = (typeof approachSidesKinds)[number];

export const stripKinds = ['lane', 'shoulder', 'verge', 'footway', 'barrier', 'parapet'] as const;
export type StripKind = (typeof stripKinds)[number];

/** One strip of the deck, left to right looking up-chainage. */
export interface DeckStrip {
  readonly kind: StripKind;
  readonly widthM: number;
  /** Width in the ultimate layout, m; equal to `widthM` unless given. */
  readonly ultimateWidthM: number;
}

export const obstacleKinds = ['river', 'railway', 'road', 'bank', 'utility', 'heritage'] as const;
export type ObstacleKind = (typeof obstacleKinds)[number];

export interface Obstacle {
  readonly kind: ObstacleKind;
  readonly name: string;
  /** Stretch of the crossing it occupies, chainages, m. */
  readonly fromM: number;
  readonly toM: number;
  /** `hard`: no support may stand here, ever. `soft`: one may, at a price or with a caution. `none`: free. */
  readonly supports: 'hard' | 'soft' | 'none';
  /**
   * What an inner support in a soft stretch costs besides itself (consents, protection, access), money of the study's
   * currency; unknown: the rate of the pack. Not read where the stretch is not soft.
   */
  readonly pierPremium: number | Unknown;
  /** Envelope to be kept free above it, or null where there is none. */
  readonly clearance: Clearance | null;
}

export interface Clearance {
  readonly fromM: number;
  readonly toM: number;
  /** Level the headroom is measured from (rail, road, water), m. */
  readonly datumLevelM: number;
  readonly headroomM: number;
  /** True once the authority has confirmed it; a preset otherwise. */
  readonly confirmed: boolean;
}

export interface Water {
  readonly name: string;
  readonly fromM: number;
  readonly toM: number;
  /** Ordinary water level, m. */
  readonly levelM: number;
  /** Design flood level, m, or unknown. */
  readonly floodLevelM: number | Unknown;
  readonly floodReturnYears: number | Unknown;
  /** Clear height from flood level to soffit, m. */
  readonly freeboardM: number;
  /** Flood plain: stretch over which the flood level and freeboard apply. */
  readonly floodFromM: number;
  readonly floodToM: number;
  /** Flow of the design flood, m3/s, and its mean velocity before the bridge stands, m/s; either gives the other. */
  readonly flowM3s: number | Unknown;
  readonly velocityMs: number | Unknown;
  /** Rise of the flood upstream of the bridge that its authority allows, m. */
  readonly allowedAffluxM: number | Unknown;
  /** Median grain of the bed, mm, and Lacey's silt factor where that is known instead. */
  readonly grainMm: number | Unknown;
  readonly siltFactor: number | Unknown;
  /** Largest vessel that passes, t deadweight, 0 where none does; and its speed, m/s. */
  readonly vesselDwtT: number | Unknown;
  readonly vesselSpeedMs: number | Unknown;
}

/** Ground along a stretch of the crossing. Odds sum to 1; a stretch of unknown ground carries preset odds. */
export interface GroundStretch {
  readonly fromM: number;
  readonly toM: number;
  readonly known: boolean;
  readonly classes: readonly GroundOdds[];
}

/** A class that ground may turn out to be. Where it bears (rock head, dense gravel, stiff clay) is said in one of two ways. */
export interface GroundOdds {
  readonly ground: GroundClassId;
  /** Level of the bearing stratum, m, all along the stretch. */
  readonly bearingLevelM?: number | undefined;
  /** Depth of the bearing stratum below the ground, m, which it follows. */
  readonly bearingDepthM?: number | undefined;
  readonly odds: number;
}

export interface Access {
  /** Longest piece and heaviest piece that can be brought to site, m and t. */
  readonly haulLengthM: number | Unknown;
  readonly haulMassT: number | Unknown;
  readonly crane: boolean | Unknown;
  readonly barge: boolean | Unknown;
  /** Load moment by its chart of the largest crane that can stand on site, tm. */
  readonly craneMomentTm: number | Unknown;
  /** Level ground in line with the deck behind an abutment, from which it could be launched, m; 0 = none. */
  readonly launchYardM: number | Unknown;
}

export interface Budget {
  /** Money of the study's currency. */
  readonly amount: number;
  /** Price date: '2026 Q1', '2026-03' or '2026-03-15', or 'unknown'. */
  readonly priceDate: string;
  readonly includes: string;
}

/** What the study takes from the shelf: rates, factors, house rules. */
export interface Books {
  readonly currency: string;
  /** Name of the rate pack in `data/rates`. */
  readonly ratePack: string;
  /** Rates typed over the pack's, by item; each with its reason. */
  readonly rates: readonly RateOverride[];
  /** Draws and seed of the cost simulation. */
  readonly draws: number;
  readonly seed: number;
  /** Odds between which two options cannot be separated, e.g. 0.2 to 0.8. */
  readonly unseparated: readonly [low: number, high: number];
}

export interface RateOverride {
  readonly item: string;
  readonly p10: number;
  readonly p50: number;
  readonly p90: number;
  readonly reason: string;
}

/** Options as the study stores them. */
export interface OptionsSlice {
  /** Forms asked for; an empty list asks for every form the tool can size. */
  readonly forms: readonly FormId[];
  /** Forms worked out even where a rule puts them out. */
  readonly workOutAnyway: readonly FormId[];
  /** Numbers given so far. A number is never given twice. */
  readonly register: readonly RegisterEntry[];
  /** Options frozen by hand. */
  readonly kept: readonly KeptOption[];
  /** View setting: the option others are compared with, or null. */
  readonly reference: number | null;
}

export interface RegisterEntry {
  readonly number: number;
  readonly form: FormId;
  readonly method: MethodId;
  /** Number of supports, abutments included. */
  readonly supports: number;
}

/** A stretch of the crossing with one form, from support to support. */
export interface Unit {
  readonly form: FormId;
  readonly role: 'main' | 'approach';
  /** Chainages of its supports, m, rising; at least two. */
  readonly supportsM: readonly number[];
  /** Units hung from pylons: which of its supports (0-based) carry them. Absent elsewhere. */
  readonly pylons?: readonly number[];
}

export interface KeptOption {
  readonly number: number;
  readonly form: FormId;
  readonly method: MethodId;
  readonly units: readonly Unit[];
  /** Structural depth at midspan of the main unit, m; null = least crossing cost. */
  readonly depthM: number | null;
  /** How its main unit is made; absent = least crossing cost. */
  readonly variant?: AskedVariant;
  /** Supports that hold their place while others are moved: 0-based along the crossing, abutments counted. */
  readonly locked?: readonly number[];
}

/** Empty until the deciding pages are built; kept in the file so that nothing is lost. */
interface Priorities {
  readonly weights: Readonly<Record<string, number>>;
}

export interface Note {
  /** A station of the page, '3+020', or an option, 'option 3'. */
  readonly about: string;
  readonly text: string;
  readonly author: string;
  /** Day of its words, '2026-03-02', or as it was written elsewhere. */
  readonly date: string;
}

/** Which option is taken forward and why, as it was drafted and then edited; once issued, with what it was decided on. */
export interface Decision {
  readonly option: number;
  readonly reasons: readonly string[];
  /** Why each other option was dropped. */
  readonly dropped: readonly { readonly option: number; readonly reason: string }[];
  /** What is still to be found out. */
  readonly questions: readonly string[];
  /** Who does not agree, and why; '' where nobody has said so. */
  readonly dissent: string;
  /** Who decided, and the day of it, '2026-03-02'. */
  readonly author: string;
  readonly date: string;
  /** Null while it is a draft. */
  readonly issued: Issued | null;
}

/** What a decision stood on when it was issued: the fingerprint of what was asked, and what came of it. */
export interface Issued {
  readonly date: string;
  readonly fingerprint: string;
  readonly currency: string;
  readonly leader: number | null;
  readonly options: readonly IssuedOption[];
}

/** An option as it stood when a decision was issued; money of the study's currency. */
interface IssuedOption {
  readonly number: number;
  readonly form: FormId;
  readonly status: 'in' | 'possible' | 'out';
  readonly p10: number;
  readonly p50: number;
  readonly p90: number;
}
