import type { CostTable, FormId, Site } from '../model/index.ts';
import { deepestPlace } from '../site/index.ts';

/** A stretch barred to supports, widened by half a pier, positions from the start of the frame. */
export interface Barred {
  readonly fromM: number;
  readonly toM: number;
  readonly name: string;
}

/**
 * Where supports may stand, measured from one end of the crossing. The end is chosen from the site itself, so that a
 * mirrored site gives the mirrored frame and the search, which breaks ties by position, gives the mirrored answer.
 */
export interface Frame {
  readonly startM: number;
  readonly endM: number;
  readonly lengthM: number;
  /** True when positions count from the end of the crossing. */
  readonly mirrored: boolean;
  /** Candidate positions, m, rising, both abutments included; none lies in a hard zone. */
  readonly X: Float64Array;
  /** Chainage of every candidate position, m. */
  readonly chainageM: Float64Array;
  /** 1 where a soft zone makes a support dearer. */
  readonly soft: Uint8Array;
  readonly barred: readonly Barred[];
  /** The barred stretch the main span goes over, or null. */
  readonly opening: Barred | null;
  /** Where there is none it goes over the deepest place. */
  readonly deepestM: number;
}

/** Positions closer than this are the same, m. */
export const SAME_M = 1e-6;
/** The grid is 1 m, coarser beyond this many steps: 2 m at 3 km. */
const MOST_STEPS = 1500;

type Span = readonly [from: number, to: number];

function inside(x: number, [from, to]: Span): boolean {
  return x > from + SAME_M && x < to - SAME_M;
}

function joined(zones: readonly Barred[]): Barred[] {
  const rising = [...zones].sort((a, b) => a.fromM - b.fromM);
  const all: Barred[] = [];
  for (const zone of rising) {
    const last = all.at(-1);
    if (last !== undefined && zone.fromM < last.toM - SAME_M) {
      const name = last.name === zone.name ? last.name : `${last.name} and ${zone.name}`;
      all[all.length - 1] = { fromM: last.fromM, toM: Math.max(last.toM, zone.toM), name };
    } else all.push(zone);
  }
  return all;
}

/** Even grid of about 1 m from abutment to abutment, with every zone edge on it, without barred places. */
function candidates(lengthM: number, barred: readonly Barred[], edges: readonly number[]): Float64Array {
  const steps = Math.min(Math.max(Math.round(lengthM), 1), MOST_STEPS);
  const exact = edges.filter((x) => x > SAME_M && x < lengthM - SAME_M).sort((a, b) => a - b);
  const X = [0];
  let zone = 0;
  const add = (x: number): void => {
    while (zone < barred.length && barred[zone]!.toM - SAME_M <= x) zone += 1;
    const free = zone === barred.length || x <= barred[zone]!.fromM + SAME_M;
    if (free && x - X.at(-1)! > SAME_M) X.push(x);
  };
  let edge = 0;
  for (let i = 1; i < steps; i += 1) {
    const x = (i * lengthM) / steps;
    // An edge goes first, so that a grid point within the tolerance gives way to it.
    for (; edge < exact.length && exact[edge]! <= x + SAME_M; edge += 1) add(exact[edge]!);
    add(x);
  }
  for (; edge < exact.length; edge += 1) add(exact[edge]!);
  if (lengthM - X.at(-1)! <= SAME_M) X.pop();
  X.push(lengthM);
  return Float64Array.from(X);
}

function local(site: Site, mirrored: boolean, fromM: number, toM: number): Span {
  return mirrored ? [site.endM - toM, site.endM - fromM] : [fromM - site.startM, toM - site.startM];
}

/** Stretches barred to supports on a site, from one end of it. */
export function barredOf(site: Site, pierHalfWidthM: number, mirrored = false): Barred[] {
  const widened = site.zones
    .filter(({ hard }) => hard)
    .map(({ fromM, toM, name }) => {
      const [a, b] = local(site, mirrored, fromM - pierHalfWidthM, toM + pierHalfWidthM);
      return { fromM: a, toM: b, name };
    })
    .filter(({ fromM, toM }) => toM > SAME_M && fromM < site.lengthM - SAME_M);
  return joined(widened);
}

function build(site: Site, pierHalfWidthM: number, mirrored: boolean): Frame {
  const { startM, endM, lengthM } = site;
  const barred = barredOf(site, pierHalfWidthM, mirrored);
  const softZones = site.zones
    .filter(({ hard }) => !hard)
    .map(({ fromM, toM }) => local(site, mirrored, fromM, toM));
  const edges = [...barred.flatMap(({ fromM, toM }) => [fromM, toM]), ...softZones.flat()];
  const X = candidates(lengthM, barred, edges);
  const soft = new Uint8Array(X.length);
  for (const zone of softZones)
    for (let i = 0; i < X.length && X[i]! < zone[1]; i += 1) if (inside(X[i]!, zone)) soft[i] = 1;
  const main = site.mainOpening;
  const [from, to] = main === null ? [0, 0] : local(site, mirrored, main.fromM, main.toM);
  const middle = (from + to) / 2;
  const opening =
    main === null ? null : (barred.find(({ fromM, toM }) => fromM < middle && toM > middle) ?? null);
  const ends = { startM, endM, lengthM, mirrored };
  const deepest = deepestPlace(site);
  const [deepestM] = local(site, mirrored, deepest, deepest);
  return { ...ends, deepestM, X, chainageM: X.map((x) => chainageOf(ends, x)), soft, barred, opening };
}

/** Chainage of a position, m, to the micrometre. */
export function chainageOf(
  frame: Pick<Frame, 'startM' | 'endM' | 'lengthM' | 'mirrored'>,
  x: number,
): number {
  if (x === 0) return frame.mirrored ? frame.endM : frame.startM;
  if (x === frame.lengthM) return frame.mirrored ? frame.startM : frame.endM;
  return Math.round((frame.mirrored ? frame.endM - x : frame.startM + x) * 1e6) / 1e6;
}

/** Compares two figures that a mirror would exchange; 0 when they agree to nine figures. */
function order(a: number, b: number): number {
  return Math.abs(a - b) <= 1e-9 * Math.max(1, Math.abs(a), Math.abs(b)) ? 0 : a - b;
}

/** Which end of the frame comes first: decided by the places themselves, then by what a support costs on them. */
function comesSecond(frame: Frame, costAt: (x: number) => number): boolean {
  const { X, soft, lengthM } = frame;
  const n = X.length;
  for (let i = 0; i < n / 2; i += 1) {
    const j = n - 1 - i;
    const difference = order(X[i]!, lengthM - X[j]!) || soft[i]! - soft[j]!;
    if (difference !== 0) return difference > 0;
  }
  const stride = Math.max(1, Math.floor(n / 200));
  for (let i = 1; i < n / 2; i += stride) {
    const difference = order(costAt(X[i]!), costAt(X[n - 1 - i]!));
    if (difference !== 0) return difference > 0;
  }
  return false;
}

/** The frame of a site for one form: its candidate positions, read from the end that comes first. */
export function frameOf(
  site: Site,
  pierHalfWidthM: number,
  form: FormId,
  table: CostTable,
  spanM: number,
): Frame {
  const frame = build(site, pierHalfWidthM, false);
  const second = comesSecond(frame, (x) => table.support(form, chainageOf(frame, x), spanM, spanM));
  return second ? build(site, pierHalfWidthM, true) : frame;
}
