import type { PierShaft } from '../model/index.ts';
import type { Combo } from './combos.ts';
import { resultantAt } from './combos.ts';
import { substructureData } from './data.ts';

/** What a pier shaft has to do. */
export interface ShaftTask {
  /** Height from the top of the foundation to the bearings, m. */
  readonly heightM: number;
  readonly footLevelM: number;
  /** Length of the line of supports under the deck, m: its width where they are square to it. */
  readonly alongSupportsM: number;
  /** True where it stands in water or may be struck: one wall instead of two columns. */
  readonly leaf: boolean;
  /** The deck is cast in with it: one wall, bars for its bending at both ends. */
  readonly framed?: true;
  /** Loads at bearing level, of a framed shaft by its thickness, m; the shaft's own weight is added here. */
  readonly combos: readonly Combo[] | ((lengthM: number) => readonly Combo[]);
  /** Largest design vertical load, kN. */
  readonly designVerticalKN: number;
  /** Permanent vertical load, kN: the axial force that helps in bending. */
  readonly permanentKN: number;
}

const thickest = 8;

/** How a shaft is made: one wall, solid or hollow, or two solid columns with a head. */
export interface ShaftShape {
  readonly columns: 1 | 2;
  readonly hollow: boolean;
}

/** What a pier may be made as: one that the deck bends is kept thin, the others may be hollow where that costs less. */
export function shaftShapes({
  heightM,
  leaf,
  framed,
}: Pick<ShaftTask, 'heightM' | 'leaf' | 'framed'>): readonly ShaftShape[] {
  const { framedHollowAboveM, hollowFromM } = substructureData.pier;
  if (framed) return [{ columns: 1, hollow: heightM > framedHollowAboveM }];
  const solid = { columns: leaf ? 1 : 2, hollow: false } as const;
  return heightM < hollowFromM ? [solid] : [solid, { columns: 1, hollow: true }];
}

/** Least thickness of a shaft, m. */
export function leastThickness({ columns, hollow }: ShaftShape, framed = false): number {
  const { pier } = substructureData;
  if (columns === 2) return pier.leastColumnM;
  return hollow && !framed ? pier.leastHollowM : pier.leastLeafM;
}

/** What concrete of a shaft costs beside that of a solid one. */
export const shaftPrice = ({ hollow }: ShaftShape): number =>
  hollow ? substructureData.pier.hollowPrice : 1;

/**
 * Sizes a pier shaft by axial stress, slenderness and bending at its foot: the thinnest in steps that passes all three.
 * One leaf where struck or in water, two columns with a head elsewhere, or one hollow shaft where that costs less. Bars by
 * published ratios. Returns dimensions along (length) and across (width) the road, m, concrete in m3 and bars in kg.
 * A shaft that would be thicker than 8 m is returned at 8 m: its height is far outside the tool's range. One that the deck
 * is cast in with draws the more from what moves the thicker it is: where none passes, the one that is bent least beyond
 * what it carries is returned.
 */
export function sizeShaft(task: ShaftTask): PierShaft {
  const [first, ...others] = shaftShapes(task).map((shape) => shaftOf(task, shape));
  return others.reduce((best, one) => (isCheaper(one, best) ? one : best), first!).shaft;
}

interface SizedShaft {
  readonly shaft: PierShaft;
  readonly stands: boolean;
  /** Concrete, m3 of a solid shaft that costs as much. */
  readonly worthM3: number;
}

const isCheaper = (one: SizedShaft, other: SizedShaft): boolean =>
  one.stands === other.stands ? one.worthM3 < other.worthM3 : one.stands;

function shaftOf(task: ShaftTask, shape: ShaftShape): SizedShaft {
  const { pier } = substructureData;
  const { columns, hollow } = shape;
  const widthM = shaftWidth(task.alongSupportsM);
  const isOne = columns === 1;
  const sectionOf = (lengthM: number): Section => ({
    lengthM,
    widthM: isOne ? widthM : lengthM,
    columns,
    hollow,
  });
  const first = leastThickness(shape, task.framed);
  let t = first;
  let stands = passes(task, sectionOf(t));
  while (t < thickest && !stands) {
    t = round1(t + pier.stepM);
    stands = passes(task, sectionOf(t));
  }
  if (task.framed && !stands) t = leastBent(task, sectionOf, first);
  const head = isOne ? 0 : pier.headDepthM * t * widthM;
  const heightM = isOne ? task.heightM : Math.max(0, task.heightM - pier.headDepthM);
  const area = sectionArea(t, isOne ? widthM : t, hollow) * columns;
  const concreteM3 = area * heightM + head;
  const ratio = pier[shaftBarsBy(shape, task.framed)];
  const headRatio = substructureData.footing.barsKgM3;
  return {
    shaft: {
      lengthM: t,
      widthM,
      columns,
      ...(hollow && { hollow }),
      concreteM3,
      reinforcementKg: area * heightM * ratio + head * headRatio,
    },
    stands,
    worthM3: shaftPrice(shape) * concreteM3,
  };
}

/** Radius of gyration over thickness: 1 / sqrt(12) of a solid shaft, about 0.4 of a thin hollow wall. */
export const gyration = (hollow: boolean): number => (hollow ? 0.4 : 1 / Math.sqrt(12));

/** Concrete area of one shaft or column, m2. */
export function sectionArea(lengthM: number, widthM: number, hollow: boolean): number {
  if (!hollow) return lengthM * widthM;
  const wall = 2 * substructureData.pier.wallM;
  return lengthM * widthM - Math.max(0, lengthM - wall) * Math.max(0, widthM - wall);
}

/** Width of a leaf under a deck so wide along its supports, m. */
export const shaftWidth = (alongSupportsM: number): number =>
  Math.max(substructureData.pier.leastLeafWidthM, substructureData.pier.leafWidthShare * alongSupportsM);

/** Inertia of a leaf about the axis across the road, m4. */
export function shaftInertia(lengthM: number, widthM: number, hollow: boolean): number {
  const wall = 2 * substructureData.pier.wallM;
  const inner = hollow ? Math.max(0, widthM - wall) * Math.max(0, lengthM - wall) ** 3 : 0;
  return (widthM * lengthM ** 3 - inner) / 12;
}

/** Ratios of bars, by how a shaft is made. */
type ShaftBars =
  | 'leafBarsKgM3'
  | 'columnBarsKgM3'
  | 'hollowBarsKgM3'
  | 'framedLeafBarsKgM3'
  | 'framedHollowBarsKgM3';

/** Which of the ratios for piers the bars of a shaft follow, above ground and below: kg in a m3 of concrete. */
export function shaftBarsBy(
  { columns, hollow = false }: { readonly columns: number; readonly hollow?: boolean },
  framed = false,
): ShaftBars {
  if (framed) return hollow ? 'framedHollowBarsKgM3' : 'framedLeafBarsKgM3';
  if (hollow) return 'hollowBarsKgM3';
  return columns === 1 ? 'leafBarsKgM3' : 'columnBarsKgM3';
}

/** One shaft or column of a pier, m. */
interface Section {
  readonly lengthM: number;
  readonly widthM: number;
  readonly columns: number;
  readonly hollow: boolean;
}

/** Design moment along the road and what carries it, of one shaft or column, kNm. */
export interface AlongUse {
  readonly designKNm: number;
  readonly carriesKNm: number;
}

const useOf = ({ designKNm, carriesKNm }: AlongUse): number => designKNm / carriesKNm;

/** Among the thicknesses that carry the weight, the one that is bent least beyond what it carries, m. */
function leastBent(task: ShaftTask, sectionOf: (lengthM: number) => Section, first: number): number {
  const { stepM } = substructureData.pier;
  let best = thickest;
  let least = Infinity;
  for (let t = first; t <= thickest; t = round1(t + stepM)) {
    const section = sectionOf(t);
    if (!carriesWeight(task, section)) continue;
    const use = useOf(alongUse(task, section));
    if (use < least) [best, least] = [t, use];
  }
  return best;
}

function carriesWeight(task: ShaftTask, { lengthM: t, widthM, columns, hollow }: Section): boolean {
  const { pier, concrete, factors } = substructureData;
  const area = sectionArea(t, widthM, hollow);
  const ownKN = area * columns * task.heightM * concrete.weightKNm3;
  const axial =
    (task.designVerticalKN + factors.permanent * ownKN) / (area * columns * concrete.fcdMPa * 1000);
  if (axial > pier.axialShare) return false;
  return (pier.effectiveLength * task.heightM) / (gyration(hollow) * t) <= pier.slenderness;
}

/** Bending capacity of one shaft or column of a depth, m, kNm; at its foot its own weight helps. */
function capacityOf(task: ShaftTask, section: Section, depthM: number, where: 'foot' | 'top'): number {
  const { pier, concrete } = substructureData;
  const { lengthM, widthM, columns, hollow } = section;
  const area = sectionArea(lengthM, widthM, hollow);
  const ownKN = where === 'foot' ? area * columns * task.heightM * concrete.weightKNm3 : 0;
  const steelM2 = (area * pier[shaftBarsBy(section, task.framed)] * pier.verticalShare) / steelKgM3;
  return bendingCapacity(area, depthM, steelM2, Math.max(0, task.permanentKN + ownKN) / columns);
}

const combosOf = ({ combos }: ShaftTask, { lengthM }: Section): readonly Combo[] =>
  typeof combos === 'function' ? combos(lengthM) : combos;

/** The bending along the road that comes nearest to what carries it: at the foot, of a framed shaft at its top as well. */
export function alongUse(task: ShaftTask, section: Section): AlongUse {
  const { imposed: factor } = substructureData.factors;
  const foot = capacityOf(task, section, section.lengthM, 'foot');
  const top = task.framed ? capacityOf(task, section, section.lengthM, 'top') : 0;
  let worst: AlongUse = { designKNm: 0, carriesKNm: foot };
  for (const combo of combosOf(task, section)) {
    const { ultimate, imposed, momentAlongKNm = 0 } = combo;
    /** A moment at the ultimate limit state, of which the deck's movement has a factor of its own. */
    const design = (all: number, moved = 0): number => ultimate * all - (ultimate - factor) * moved;
    const atFoot = design(resultantAt(combo, task.footLevelM).momentAlongKNm, imposed?.footKNm);
    const ends: AlongUse[] = [{ designKNm: atFoot / section.columns, carriesKNm: foot }];
    if (imposed) ends.push({ designKNm: design(-momentAlongKNm, imposed.topKNm), carriesKNm: top });
    for (const end of ends) if (useOf(end) > useOf(worst)) worst = end;
  }
  return worst;
}

function passes(task: ShaftTask, section: Section): boolean {
  if (!carriesWeight(task, section)) return false;
  const { designKNm, carriesKNm } = alongUse(task, section);
  const across = capacityOf(task, section, section.widthM, 'foot');
  // Two columns joined by a head work as a frame across the road: each bends half the storey height.
  const acrossShare = section.columns === 2 ? 1 / 4 : 1;
  return (
    designKNm <= carriesKNm &&
    combosOf(task, section).every(
      (combo) => combo.ultimate * resultantAt(combo, task.footLevelM).momentAcrossKNm * acrossShare <= across,
    )
  );
}

/**
 * Bending capacity of a rectangular wall or column, kNm: axial force on the stress block plus half the vertical bars
 * on a lever of 0.8 of the depth. Area in m2, depth in m, steel in m2, axial force in kN.
 */
export function bendingCapacity(areaM2: number, depthM: number, steelM2: number, normalKN: number): number {
  const { fcdMPa, fydMPa } = substructureData.concrete;
  const share = Math.min(1, normalKN / (areaM2 * fcdMPa * 1000));
  return (normalKN * depthM * (1 - share)) / 2 + (steelM2 / 2) * fydMPa * 1000 * 0.8 * depthM;
}

const steelKgM3 = 7850;
const round1 = (value: number): number => Math.round(value * 10) / 10;
