import type { CostTable, FormId, Unit } from '../model/index.ts';
import { chainageOf, type Frame } from './frame.ts';
import { tableCost } from './tableCost.ts';

/** A unit in positions of the frame. */
export interface PlacedUnit {
  readonly form: FormId;
  readonly role: Unit['role'];
  /** Indices of its supports among the candidate positions, rising. */
  readonly at: readonly number[];
  readonly pylons?: readonly number[];
}

/** One arrangement that can be built, as the search finds it. */
export interface Candidate {
  /** As in `kindOf`. */
  readonly kind: number;
  /** Cost as the search adds it up: support costs split between spans, governing spans on their grid. */
  readonly estimate: number;
  /** Put together when asked for: most candidates are only counted. */
  readonly placed: () => readonly PlacedUnit[];
}

/** An arrangement with its chainages and its cost on the table. */
export interface Worked {
  readonly placed: readonly PlacedUnit[];
  readonly units: readonly Unit[];
  readonly cost: number;
}

/** Arrangements are different when they differ in this: number of supports, abutments included, and of pylons. */
export const kindFor = (supports: number, pylons: number): number => supports * 4 + pylons;

/** Number of pylons, and of supports, of a kind. */
export const pylonsOf = (kind: number): number => kind % 4;
export const supportsOf = (kind: number): number => Math.floor(kind / 4);

/** The kind of a row of placed units. */
export function kindOf(placed: readonly PlacedUnit[]): number {
  let supports = 1;
  let pylons = 0;
  for (const unit of placed) {
    supports += unit.at.length - 1;
    pylons += unit.pylons?.length ?? 0;
  }
  return kindFor(supports, pylons);
}

/** Turns placed units into chainages, rising whichever end the frame counts from. */
function unitsOf(frame: Frame, placed: readonly PlacedUnit[]): Unit[] {
  const units = placed.map((unit): Unit => {
    const supportsM = unit.at.map((i) => chainageOf(frame, frame.X[i]!));
    const { form, role, pylons } = unit;
    if (frame.mirrored) supportsM.reverse();
    if (pylons === undefined) return { form, role, supportsM };
    const last = unit.at.length - 1;
    return { form, role, supportsM, pylons: frame.mirrored ? pylons.map((i) => last - i).reverse() : pylons };
  });
  return frame.mirrored ? units.reverse() : units;
}

/** Works out what a row of placed units costs. */
export function workOut(frame: Frame, table: CostTable, placed: readonly PlacedUnit[]): Worked {
  const units = unitsOf(frame, placed);
  return { placed, units, cost: tableCost(units, table) };
}
