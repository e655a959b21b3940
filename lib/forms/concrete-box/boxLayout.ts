import type { UnitTask } from '../../model/index.ts';
import { designSlab, type SlabDesign } from '../common/slab/designSlab.ts';
import type { SlabCase } from '../common/slab/slabCase.ts';
import { acrossSlab } from './acrossSlab.ts';
import { boxData } from './boxData.ts';

/** Cells and webs of a box, and its top slab. */
export interface BoxLayout {
  readonly cells: number;
  readonly webs: number;
  /** Between web axes at the top, m. */
  readonly spacingM: number;
  /** From the axis of an outer web to the edge of the deck, m. */
  readonly overhangM: number;
  /** Horizontal over vertical of the outer webs. */
  readonly slope: number;
  readonly slab: SlabDesign;
  /** Strand of tendons across the top slab, kg per m2 of deck, and their lasting force, kN/m; absent where it has none. */
  readonly across?: { readonly strandKgM2: number; readonly forceKNm: number };
}

/** Cells of a box under a top slab with or without tendons across the deck. */
export function cellsFor(widthM: number, hasTendonsAcross: boolean): number {
  const { overhangOverSpacing, mostWebSpacingM } = boxData.layout;
  const mostM = hasTendonsAcross ? boxData.across.mostWebSpacingM : mostWebSpacingM;
  return Math.max(1, Math.ceil(widthM / mostM - 2 * overhangOverSpacing - 1e-9));
}

/**
 * As few cells as keep the webs within the practical spacing of a slab, plain or with tendons across the deck, overhangs in
 * a fixed proportion to it, outer webs leaning inwards, and the top slab designed across the webs.
 */
export function boxLayout(task: UnitTask): BoxLayout {
  const { overhangOverSpacing } = boxData.layout;
  const { deck, transverse } = task;
  const cells = cellsFor(deck.widthM, transverse === true);
  const spacingM = deck.widthM / (cells + 2 * overhangOverSpacing);
  const overhangM = overhangOverSpacing * spacingM;
  const slabCase: SlabCase = {
    standard: task.standard,
    deck,
    direction: 'across',
    spacingM,
    overhangM,
    continuous: true,
    uniform: false,
  };
  const base = {
    cells,
    webs: cells + 1,
    spacingM,
    overhangM,
    slope: webSlope(cells * spacingM, task.depthM),
  };
  if (!transverse) return { ...base, slab: designSlab(slabCase) };
  const { strandKgM2, forceKNm, ...slab } = acrossSlab(slabCase);
  return { ...base, slab, across: { strandKgM2, forceKNm } };
}

/** Horizontal over vertical of the outer webs of a box of given width between their axes at the top and depth, m. */
export function webSlope(topM: number, depthM: number): number {
  const { most, bottomOverTop } = boxData.webSlope;
  return Math.min(most, ((1 - bottomOverTop) * topM) / (2 * depthM));
}
