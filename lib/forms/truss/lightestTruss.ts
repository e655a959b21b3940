import type { Floor } from '../floor/sizeFloor.ts';
import type { PanelForces } from './panelForces.ts';
import { sizeTruss, type SizedTruss } from './sizeTruss.ts';
import type { TrussCase } from './trussCase.ts';
import { trussData } from './trussData.ts';
import { trussGeometry } from './trussGeometry.ts';

/** A layout of panels with the heights it may have. */
export interface Layout {
  readonly panels: number;
  readonly hangers: boolean;
  /** Heights to try, m, rising; at least one. */
  readonly heights: readonly number[];
  readonly forces: PanelForces;
  readonly floor: Floor;
  /** With members as wide as they may be. */
  readonly case: TrussCase;
}

interface Candidate {
  readonly layout: Layout;
  readonly truss: SizedTruss;
  readonly memberWidthM: number;
  /** Trusses, bracing and floor, kg. */
  readonly steelKg: number;
}

/** Layouts whose heights are searched, after all have been tried at two heights. */
const searched = 2;

/**
 * The truss of least steel among layouts: all are tried at two heights, the best few at all their heights, and the best of
 * those with narrower members. A truss in which every member fits is preferred to a lighter one in which one does not.
 * @throws RangeError when there is no layout
 */
export function lightestTruss(layouts: readonly Layout[]): Candidate {
  const first = layouts.map((layout) => {
    const middle = candidate(layout, Math.floor(layout.heights.length / 2), undefined);
    const low = candidate(layout, 0, middle.truss.ownKNm);
    return isBetter(low, middle) ? low : middle;
  });
  first.sort((a, b) => (isBetter(a, b) ? -1 : isBetter(b, a) ? 1 : 0));
  const valleys = first.slice(0, searched).map(valley);
  const [start, ...rest] = valleys;
  if (start === undefined)
    throw new RangeError('truss: expected a span of 20 m or more, received one without a layout');
  return narrower(rest.reduce((best, next) => (isBetter(next, best) ? next : best), start));
}

/**
 * Steel against height has one valley, with ripples from plate steps: walk down it from where the layout was first tried,
 * looking two steps ahead.
 */
function valley(start: Candidate): Candidate {
  const { layout } = start;
  let k = layout.heights.indexOf(start.truss.geometry.heightM);
  const tried = new Map<number, Candidate>([[k, start]]);
  const at = (k: number): Candidate | null => {
    if (layout.heights[k] === undefined) return null;
    const known = tried.get(k);
    if (known) return known;
    const made = candidate(layout, k, start.truss.ownKNm);
    tried.set(k, made);
    return made;
  };
  for (;;) {
    const here = tried.get(k)!;
    const next = [k - 1, k + 1, k - 2, k + 2].find((other) => {
      const one = at(other);
      return one !== null && isBetter(one, here);
    });
    if (next === undefined) return here;
    k = next;
  }
}

/** The same layout with narrower members while that saves steel. */
function narrower(widest: Candidate): Candidate {
  const { leastM, stepM } = trussData.memberWidth;
  const { layout } = widest;
  let best = widest;
  for (let memberWidthM = widest.memberWidthM - stepM; memberWidthM >= leastM - 1e-9; memberWidthM -= stepM) {
    const slim = { ...layout.case, memberWidthM };
    const truss = sizeTruss(widest.truss.geometry, layout.forces, slim, best.truss.ownKNm);
    const next = { layout, truss, memberWidthM, steelKg: steelOf(truss, layout) };
    if (!isBetter(next, best)) break;
    best = next;
  }
  return best;
}

function candidate(layout: Layout, height: number, ownKNm: number | undefined): Candidate {
  const { spanM } = layout.forces;
  const geometry = trussGeometry(spanM, layout.heights[height]!, layout.panels, layout.hangers);
  const truss = sizeTruss(geometry, layout.forces, layout.case, ownKNm);
  return { layout, truss, memberWidthM: layout.case.memberWidthM, steelKg: steelOf(truss, layout) };
}

/** Steel of a span: one more cross-girder than panels. */
function steelOf(truss: SizedTruss, { floor }: Layout): number {
  const { spanM } = truss.geometry;
  const lastKg = floor.crossGirder.massKgPerM * floor.crossM;
  return 2 * truss.planeKg + truss.bracing.massKg + floor.steelKgPerM * spanM + lastKg;
}

function isBetter(a: Candidate, b: Candidate): boolean {
  const use = Math.max(1, a.truss.worst.section.utilisation);
  const bestUse = Math.max(1, b.truss.worst.section.utilisation);
  return use < bestUse - 1e-9 || (use <= bestUse + 1e-9 && a.steelKg < b.steelKg);
}
