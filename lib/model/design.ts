import type { BillPart, FormId, MethodId, StandardId } from './ids.ts';
import type { DeckSpec } from './site.ts';
import type { LightConcreteAsked } from './variant.ts';

/** What a form is asked to size: one unit of a crossing (or one bench case), without any knowledge of the site. */
export interface UnitTask {
  readonly form: FormId;
  /** Spans, m. */
  readonly spansM: readonly number[];
  readonly deck: DeckSpec;
  readonly standard: StandardId;
  /** Plan radius, m; Infinity on a straight. */
  readonly planRadiusM: number;
  /** Skew of the supports from square, degrees, above 0; absent where they are square or nobody knows. */
  readonly skewDeg?: number;
  readonly method: MethodId;
  /** Structural depth at midspan, m. */
  readonly depthM: number;
  /** Number of girders, where the form lets it be chosen. */
  readonly girders?: number;
  /** Composite I-girders on continuous spans: deeper over the inner supports; constant depth when absent. Steel boxes: their depth over the piers, sought when absent. */
  readonly haunch?: Haunch;
  /** Composite I-girders: beams between the girders, carried by the cross-frames, so that the slab spans half the spacing. */
  readonly substringers?: boolean;
  /** Concrete boxes: tendons across the top slab, so that fewer cells carry the deck. */
  readonly transverse?: true;
  /** Concrete boxes: inclined struts under the wings of the top slab, so that fewer cells carry the deck. */
  readonly struts?: true;
  /** Concrete boxes: ribs across the deck under the slab, so that fewer cells carry it. */
  readonly ribs?: true;
  /** Boxes on a skew: ends square to the road; along the skew when absent, where no bearing lifts there. */
  readonly squareEnds?: true;
  /** Concrete boxes: between the axes of the outer webs at the top, m; in a fixed proportion to the deck when absent. */
  readonly boxWidthM?: number;
  /** Concrete boxes: cylinder strength of the concrete, MPa; the usual one of the standard when absent. */
  readonly strengthMPa?: number;
  /** Concrete boxes: lightweight concrete; none when absent. */
  readonly light?: LightConcreteAsked;
  /** Concrete boxes: ballast in the cells by span, kN per m of deck, laid on the joined deck; none when absent. */
  readonly ballastKNm?: readonly number[];
  /** Cantilevered boxes: neighbouring piers in the middle that the deck is cast in with; on bearings everywhere when absent. */
  readonly castInPiers?: number;
  /** Cantilevered boxes: the shafts they are cast in with, once these stand; their restraint is not reckoned with when absent. */
  readonly shafts?: readonly ShaftUnder[];
  /** Thickness of an orthotropic deck plate, m, where it is given; by wheels and surfacing when absent. */
  readonly deckPlateM?: number;
  /** Cable-stayed: which supports (0-based) carry pylons. */
  readonly pylons?: readonly number[];
  /** Height of the soffit above ground at each support, m, where known (pylon legs, walls, falsework). */
  readonly clearUnderM?: readonly number[];
  /** Portal frames: what may strike the wall at each support; none when absent. */
  readonly strikes?: readonly (readonly Strike[])[];
  /** Portal frames: horizontal force of an earthquake as a share of the weight, 0 or more; none when absent. */
  readonly quakeShare?: number;
}

/** A vehicle, train or vessel against a support: characteristic force along and across the road, kN, at a height above ground, m. */
export interface Strike {
  readonly alongKN: number;
  readonly acrossKN: number;
  readonly aboveGroundM: number;
}

/** Depth law of haunched girders. */
export interface Haunch {
  /** Structural depth over inner supports, m. */
  readonly pierDepthM: number;
  readonly law: 'parabolic' | 'straight';
}

/** Structural depth of a unit, m: soffit to top of structural slab or plate. */
export interface DepthPair {
  readonly support: number;
  readonly midspan: number;
}

/** One limit state. */
export interface Check {
  readonly id: string;
  /** Plain words, e.g. 'bending at the piers'. */
  readonly label: string;
  readonly demand: number;
  readonly capacity: number;
  readonly unit: string;
  /** demand / capacity. */
  readonly utilisation: number;
}

export type Material = 'concrete' | 'steel' | 'strand' | 'stay' | 'surfacing';

/**
 * Form-free geometry. Points are [x, z] in metres. In elevation x runs along the unit from its first support
 * and z is height above the top of the structural slab on the road line (down is negative); in section x runs
 * across the deck from its middle and z the same.
 */
export interface Shape {
  readonly part: string;
  readonly material: Material;
  readonly kind: 'polygon' | 'line';
  readonly points: readonly (readonly [x: number, z: number])[];
  /** Holes of a polygon (voids of a box). */
  readonly holes?: readonly (readonly (readonly [x: number, z: number])[])[];
  /** Thickness of a line (member, stay, plate), m. */
  readonly thicknessM?: number;
  /** Drawn behind the rest: stiffeners, joints, hidden lines. */
  readonly faint?: boolean;
}

export interface SectionCut {
  /** Where it is cut, e.g. 'midspan', 'pier'. */
  readonly at: string;
  readonly xM: number;
  readonly shapes: readonly Shape[];
}

/** Characteristic vertical reactions at one support of a unit, kN, whole deck width. */
export interface SupportReaction {
  readonly permanentKN: number;
  readonly trafficMaxKN: number;
  /** Least traffic reaction (negative = uplift). */
  readonly trafficMinKN: number;
}

/**
 * A wall in one with the deck, instead of an abutment or a pier: its concrete and bars stand in the lines of the
 * design down to the top of its foundation, which is sized for `loads` on every ground.
 */
export interface IntegralWall {
  /** Which support of the unit, 0-based. */
  readonly support: number;
  /** Thickness at the foot along the road, m. */
  readonly footM: number;
  /** From the top of the structural slab to the top of the foundation, m. */
  readonly heightM: number;
  readonly concreteM3: number;
  readonly reinforcementKg: number;
  /** Movement of the end of the deck from warm to cold with shrinkage, mm. */
  readonly movementMm: number;
  /** Characteristic loads on the foundation, kN and kNm, pressure of the fill on the wall included; along and moment positive towards the span. */
  readonly loads: readonly (WallLoad & {
    /** Accidental: what strikes the wall; its force along is in these loads, that across is not. */
    readonly struck?: Strike;
  })[];
  /** What an earthquake puts on the foundation, the frame on feet of each kind; absent where none is reckoned with. */
  readonly quake?: readonly WallQuake[];
}

/** Loads on the foundation of a wall in one with the deck, kN and kNm; along and moment positive towards the span. */
export interface WallLoad {
  readonly verticalKN: number;
  readonly alongKN: number;
  readonly momentKNm: number;
}

/** An earthquake in full along and in full across: what rests there without it, and what it adds either way. */
export interface WallQuake {
  readonly rest: WallLoad;
  readonly along: WallLoad;
  readonly acrossKN: number;
  /** Height over the top of the foundation at which the force across acts, m. */
  readonly acrossAboveM: number;
}

/** A shaft that a deck is cast in with, as it stands under it. */
export interface ShaftUnder {
  /** Which support of the unit, 0-based. */
  readonly support: number;
  /** From its foot to the deck, m. */
  readonly heightM: number;
  /** Bending stiffness along the road with what cracks and creep leave of it, kNm2. */
  readonly eiKNm2: number;
  /** How far the deck moves over it as it shortens and as it cools, m; positive towards the end of the unit. */
  readonly shortenedM: number;
  readonly cooledM: number;
}

/** A pier in one with the deck, without bearings, as the deck meets it. */
export interface CastInPier {
  /** Which support of the unit, 0-based. */
  readonly support: number;
  /** Couple that turns the deck over it, kNm per radian, its other supports letting it turn. */
  readonly deckTurnKNm: number;
  /** Couple that keeps the deck from turning over it, kNm, either way: under what is laid on it, and the most under traffic. */
  readonly laidKNm: number;
  readonly trafficKNm: number;
}

/** A sized unit. */
export interface Design {
  readonly task: UnitTask;
  readonly depthM: DepthPair;
  /** Structural depth along the unit: x from the first support, m, and depth, m. */
  readonly depthAlong: { readonly xM: readonly number[]; readonly depthM: readonly number[] };
  readonly elevation: readonly Shape[];
  readonly sections: readonly SectionCut[];
  readonly reactions: readonly SupportReaction[];
  /** What traffic puts on the bearing at an obtuse corner over that of a square deck, above 1; absent on a square deck and where the form has no figure for it. */
  readonly obtuseCorner?: number;
  /**
   * What skew ends press on the bearings of an end or of the pier next to it where all of them are made like the one at the
   * obtuse corner, kN, design; absent where ends are square or do not twist the deck.
   */
  readonly skewPressKN?: number;
  /** Walls in one with the deck; absent where it rests on bearings. */
  readonly walls?: readonly IntegralWall[];
  /** Piers in one with the deck; absent where it rests on bearings. */
  readonly castIn?: readonly CastInPier[];
  readonly checks: readonly Check[];
  /** The check with the highest utilisation. */
  readonly limitingCheck: Check;
  /** Self-weight part of the governing characteristic moment or force, 0 to 1. */
  readonly ownWeightShare: number;
  /** Measured lines of the superstructure, of pylons and anchorages where the form has them, and of its temporary works. */
  readonly lines: readonly MeasuredLine[];
  /** Longest and heaviest piece to be brought to site, m and t; null where cast in place. */
  readonly heaviestPiece: { readonly lengthM: number; readonly massT: number } | null;
  readonly warnings: readonly string[];
  /** Beams put together on towers: rows of splices and tendon stages of the unit, which take time beside its length. */
  readonly staging?: { readonly splices: number; readonly stages: number };
  /** Named figures of the section and statics for tables and tests (inertia, moments, plate sizes ...), unit in the name. */
  readonly figures: Readonly<Record<string, number>>;
}

/** One measured line of the take-off. `item` is a key of `data/rates/items.json`. */
export interface MeasuredLine {
  readonly part: BillPart;
  readonly item: string;
  readonly quantity: number;
  /** What was measured, e.g. 'bottom flanges', 'pier 2 shaft'. */
  readonly what: string;
  /** How, e.g. '2 girders, 48 plates, 7850 kg/m3'. */
  readonly how: string;
  /** Index of the support along the crossing it belongs to, where it belongs to one. */
  readonly support?: number;
  /** Index of the unit whose design it came from; set by the take-off, absent on lines of the supports and the crossing. */
  readonly unit?: number;
}

/** Materials of an option or a superstructure; absent materials are 0. */
export interface Quantities {
  readonly concreteM3: number;
  readonly reinforcementKg: number;
  readonly prestressKg: number;
  readonly structuralSteelKg: number;
  readonly stayCableKg: number;
  readonly mainCableKg: number;
}
