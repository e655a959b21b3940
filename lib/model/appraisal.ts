import type { BillPart, Family, FormId, MethodId } from './ids.ts';
import type { Design, DepthPair, MeasuredLine, Quantities } from './design.ts';
import type { Dropped, Ruling } from './ruling.ts';
import type { RoadProfile, Site } from './site.ts';
import type { RegisterEntry, Unit } from './study.ts';
import type { DroppedCount } from './option.ts';
import type { Variant } from './variant.ts';

/** Low, likely and high: 10, 50 and 90 % of the draws. */
export interface Spread {
  readonly p10: number;
  readonly p50: number;
  readonly p90: number;
}

export type Status = 'in' | 'possible' | 'out';

/** A beam in the fill, a wall from the ground up, or columns through fill that spills out to the front. */
export type AbutmentWall = 'bank seat' | 'full height' | 'spill-through';

/** One support of an option with what stands under it. */
export interface Support {
  readonly chainageM: number;
  /** Index of the ground stretch it stands on. */
  readonly stretch: number;
  readonly kind: 'abutment' | 'pier' | 'pylon' | 'anchor-pier';
  readonly groundLevelM: number;
  /** Level of the top of the pier or abutment seat, m. */
  readonly topLevelM: number;
  readonly heightM: number;
  /** Depth of water at ordinary level, m; 0 on land. */
  readonly waterDepthM: number;
  readonly permanentKN: number;
  readonly trafficKN: number;
  readonly shaft: PierShaft;
  /** Abutments: how the fill is held, and whether the deck is cast into it without bearings and joint. */
  readonly abutment?: { readonly wall: AbutmentWall; readonly integral: boolean };
  readonly articulation: Articulation;
  /** Measured lines of the support above its foundation: bearings, joint, shaft or abutment walls, tie-downs. */
  readonly lines: readonly MeasuredLine[];
  /** One foundation for each ground class its stretch may turn out to be, with the odds. */
  readonly foundations: readonly Foundation[];
}

/** How the deck is held at a support. Forces are characteristic, kN, at bearing level. */
export interface Articulation {
  /** The deck's fixed point along the road, for at least one of the units that meet here. */
  readonly fixed: boolean;
  readonly bearings: number;
  /** Design vertical load of all bearings together, MN. */
  readonly bearingMN: number;
  readonly alongKN: number;
  /** Moment along the road that it takes while the deck is cantilevered from it, kNm; absent where none is. */
  readonly buildingKNm?: number;
  readonly acrossKN: number;
  /** Of a pier that the deck is cast in with; absent elsewhere. */
  readonly frame?: ShaftInFrame;
  /** Movement of the expansion joint here, mm; 0 where the deck is continuous. */
  readonly jointMovementMm: number;
  /** Design uplift taken by a tie-down, kN; 0 where there is none. */
  readonly tieDownKN: number;
  /** Kind of the bearings by movement and load; absent where the deck is cast in. */
  readonly bearingKind?: 'elastomeric' | 'pot';
  /** Force of a vessel against the support, kN; absent where none can reach it. */
  readonly vesselKN?: number;
}

/** A shaft in one with the deck as the deck bends it along the road. Moments in kNm, characteristic unless said. */
export interface ShaftInFrame {
  /** Bending stiffness that cracks and creep leave it, kNm2. */
  readonly eiKNm2: number;
  /** Chainage of the point of the deck that stays, m. */
  readonly stillM: number;
  /** How far the deck moves over it from where it was cast, mm, what of that is cooling, and the moment at its foot from it. */
  readonly pushMm: number;
  readonly cooledMm: number;
  readonly pushedKNm: number;
  /** Moment at its top from what is laid on the deck and from traffic. */
  readonly turnedKNm: number;
  /** Design moment along the road at the end that is worst off, and what it carries there. */
  readonly designKNm: number;
  readonly carriesKNm: number;
}

export interface PierShaft {
  /** Along and across the road, m. */
  readonly lengthM: number;
  readonly widthM: number;
  readonly columns: number;
  readonly hollow?: true;
  readonly concreteM3: number;
  readonly reinforcementKg: number;
}

export interface Foundation {
  readonly ground: string;
  readonly odds: number;
  /** Level of the bearing stratum under the support, m. */
  readonly bearingLevelM: number;
  readonly kind: 'spread' | 'bored-piles';
  readonly footing: {
    readonly lengthM: number;
    readonly widthM: number;
    readonly depthM: number;
    readonly topLevelM: number;
  };
  readonly piles: {
    readonly count: number;
    readonly diameterM: number;
    readonly lengthM: number;
    readonly toeLevelM: number;
  } | null;
  /**
   * Where nothing in the tool's range carries the loads on this ground: how many times the allowable load and reach of a
   * pile the group that is measured would need. Absent where the foundation stands.
   */
  readonly overload?: number;
  readonly lines: readonly MeasuredLine[];
}

/** What an option does to one water in its design flood, square to the flow; null where flow or flood level is unknown. */
export interface RiverCheck {
  /** Index among the waters of the site. */
  readonly water: number;
  readonly flowM3s: number | null;
  /** Mean velocity before the bridge stands, m/s. */
  readonly velocityMs: number | null;
  /** Area under the flood level: of the river, between the abutments, and that less the piers, m2. */
  readonly areaM2: number | null;
  readonly bridgeAreaM2: number | null;
  readonly openingM2: number | null;
  readonly affluxM: number | null;
  readonly allowedAffluxM: number | null;
  /** Width of the opening less the piers, and the width the river makes for itself in alluvium, m. */
  readonly waterwayM: number | null;
  readonly regimeWidthM: number | null;
  /** Flow as given and by velocity x area, greater over smaller. */
  readonly flowSpread: number | null;
}

/** A water as an option crosses it. */
export interface RiverCrossed extends RiverCheck {
  /** Least height of the soffit over the flood with its afflux, m, and what it should be. */
  readonly freeboardM: number | null;
  readonly freeboardNeededM: number;
}

/** Everything worked out for one option before prices are drawn. */
export interface WorkedOption {
  readonly number: number;
  readonly form: FormId;
  readonly family: Family;
  readonly method: MethodId;
  readonly units: readonly Unit[];
  /** One design per unit, in order. */
  readonly designs: readonly Design[];
  readonly depthM: DepthPair;
  /** How its main unit is made; absent on options made before there was a choice. */
  readonly variant?: Variant;
  readonly profile: RoadProfile;
  readonly supports: readonly Support[];
  /** All measured lines except the foundations that depend on the ground class. */
  readonly lines: readonly MeasuredLine[];
  /** Months, low, likely, high. */
  readonly months: Spread;
}

export interface AppraisedOption extends WorkedOption {
  /** Chainages of its abutments, m, where the brief leaves them a window; absent where they are fixed. */
  readonly startM?: number;
  readonly endM?: number;
  readonly status: Status;
  readonly rulings: readonly Ruling[];
  /** What is wrong with where its supports stand, each by name: only an arrangement set by hand has any. */
  readonly faults: readonly string[];
  /** Superstructure. */
  readonly quantities: Quantities;
  /** Superstructure, per m2 of deck. */
  readonly perM2: Quantities;
  /** Pylons, piers, abutments and foundations, these weighed by the odds of the ground. */
  readonly supportQuantities: Quantities;
  /** Least spare headroom, m, and what it is measured to; null where nothing has to be kept clear. */
  readonly headroom: { readonly spareM: number; readonly reason: string; readonly chainageM: number } | null;
  /** Every water whose flood reaches the crossing; absent on options made before rivers were looked at. */
  readonly rivers?: readonly RiverCrossed[];
  /** What 100 mm more of construction depth does to the approaches; null where no road clears with it. */
  readonly hundredMm: HundredMm | null;
  readonly deckAreaM2: number;
  readonly cost: Spread;
  readonly quartiles: readonly [q1: number, q3: number];
  readonly pricePerM2: { readonly withApproaches: number; readonly withoutApproaches: number };
  readonly parts: readonly { readonly part: BillPart; readonly p50: number }[];
  readonly limitingCheck: { readonly id: string; readonly label: string; readonly utilisation: number };
}

/** What more of construction depth adds to the approaches and to the regrading behind fixed ends; less than 0 where it spares. */
export interface HundredMm {
  readonly fillM3: number;
  readonly cutM3: number;
  /** Face of retaining walls. */
  readonly wallM2: number;
  readonly surfacingM2: number;
  readonly parapetM: number;
  /** Money at mean rates. */
  readonly amount: number;
}

/** Where the options stand on cost. */
export interface Standing {
  /** Number of the option that leads, or null when none may. */
  readonly leader: number | null;
  /** Maximal runs in P50 order in which no pair can be separated. */
  readonly groups: readonly (readonly number[])[];
  /** odds[a][b] = share of draws in which option a is cheaper than option b. */
  readonly odds: Readonly<Record<number, Readonly<Record<number, number>>>>;
  /** Share of draws within the budget, by option; empty without a budget. */
  readonly within: Readonly<Record<number, number>>;
  readonly because: readonly string[];
}

export interface Appraisal {
  readonly study: { readonly title: string; readonly version: number; readonly fingerprint: string };
  readonly site: Site;
  readonly options: readonly AppraisedOption[];
  readonly currency: string;
  readonly dropped: readonly Dropped[];
  readonly droppedCounts: readonly DroppedCount[];
  /** Numbers given so far, for the study to keep, and those that nothing proposes any more. */
  readonly register: readonly RegisterEntry[];
  readonly retired: readonly number[];
  /** Forms asked for that this is the answer of, and those still to come: none where it is the whole answer. */
  readonly forms: readonly FormId[];
  readonly toCome: readonly FormId[];
  readonly standing: Standing;
}
