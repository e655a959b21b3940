import { loadStandard } from '../../actions/index.ts';
import type { UnitTask } from '../../model/index.ts';
import { designSlab, type SlabDesign } from '../common/slab/designSlab.ts';
import type { SlabCase } from '../common/slab/slabCase.ts';
import { acrossSlab } from './acrossSlab.ts';
import { boxData } from './boxData.ts';
import { designRibs, type RibCase, type Ribs } from './ribs.ts';
import { cellsWithin, mostSpacingM, strutPlan, type StrutPlan } from './strutPlan.ts';
import { designStruts, type Struts } from './struts.ts';

/** Cells and webs of a box, and its top slab. */
export interface BoxLayout {
  readonly cells: number;
  readonly webs: number;
  /** Between web axes at the top, m. */
  readonly spacingM: number;
  /** From the axis of an outer web, or the line of strut heads beyond it, to the edge of the deck, m. */
  readonly overhangM: number;
  /** Horizontal over vertical of the outer webs. */
  readonly slope: number;
  readonly slab: SlabDesign;
  /** Strand of tendons across the top slab, kg per m2 of deck, and their lasting force, kN/m; absent where it has none. */
  readonly across?: { readonly strandKgM2: number; readonly forceKNm: number };
  /** Struts under the wings; absent where they only overhang. */
  readonly struts?: Struts;
  /** Ribs across the deck under the slab; absent where it spans from web to web. */
  readonly ribs?: Ribs;
}

/** Cells of a box under a top slab with or without tendons across the deck. */
export function cellsFor(widthM: number, hasTendonsAcross: boolean): number {
  return cellsUnder(widthM, mostSpacingM(hasTendonsAcross));
}

/** Cells of a box under a deck of a width, webs at most `mostM` apart, m. */
export function cellsUnder(widthM: number, mostM: number): number {
  const { overhangOverSpacing } = boxData.layout;
  return Math.max(1, Math.ceil(widthM / mostM - 2 * overhangOverSpacing - 1e-9));
}

/**
 * As few cells as keep the webs within the practical spacing of a slab, plain, with tendons across the deck or on ribs, overhangs in
 * a fixed proportion to it or as the width asked of the box leaves them, outer webs leaning inwards, and the top slab designed across the webs and, where the wings have
 * them, their struts.
 * @param deepestM greatest depth of the box, m; `depthM` of the task is the least
 */
export function boxLayout(task: UnitTask, deepestM = task.depthM): BoxLayout {
  const { deck, depthM, standard, boxWidthM } = task;
  const across = task.transverse === true;
  const plan = task.struts
    ? strutPlan(deck.widthM, depthM, across, boxWidthM)
    : plainPlan(deck.widthM, task.ribs ? boxData.ribs.mostWebSpacingM : mostSpacingM(across), boxWidthM);
  const { cells, spacingM, overhangM } = plan;
  const slabCase: SlabCase = {
    standard,
    deck,
    direction: 'across',
    spacingM,
    overhangM,
    continuous: true,
    uniform: false,
  };
  const slope = webSlope(cells * spacingM, depthM);
  const base = { cells, webs: cells + 1, spacingM, overhangM, slope };
  if (task.ribs) return { ...base, ...ribbed({ standard, deck, plan, depthM }) };
  if (!task.struts) return { ...base, ...topSlab(slabCase, across) };
  // The weight of the slab presses on the struts, and their pull thickens the slab a little: twice is enough.
  const first = topSlab(slabCase, across);
  const strutCase = { standard, deck, plan, depthM, deepestM, slope };
  const { tie } = designStruts({ ...strutCase, slab: first.slab });
  const share = across ? loadStandard(standard).factors.sls.vehicle : 1;
  const serviceKNm = tie.lastingKNm + share * tie.trafficKNm;
  const tied = topSlab({ ...slabCase, tie: { serviceKNm, ultimateKNm: tie.ultimateKNm } }, across);
  return { ...base, ...tied, struts: designStruts({ ...strutCase, slab: tied.slab }) };
}

function plainPlan(widthM: number, mostM: number, boxWidthM: number | undefined): StrutPlan {
  if (boxWidthM !== undefined)
    return { ...cellsWithin(boxWidthM, mostM), outM: 0, overhangM: (widthM - boxWidthM) / 2 };
  const { overhangOverSpacing } = boxData.layout;
  const cells = cellsUnder(widthM, mostM);
  const spacingM = widthM / (cells + 2 * overhangOverSpacing);
  return { cells, spacingM, outM: 0, overhangM: overhangOverSpacing * spacingM };
}

/**
 * A slab that spans along the deck from rib to rib, its bars named as those of a slab across it, and the ribs. What bends it
 * from rib to rib is not added to what it carries along the deck.
 */
function ribbed(ribCase: Omit<RibCase, 'slab'>): Pick<BoxLayout, 'slab' | 'ribs'> {
  const { standard, deck } = ribCase;
  const slab = designSlab({
    standard,
    deck,
    direction: 'along',
    spacingM: boxData.ribs.spacingM,
    overhangM: 0,
    continuous: true,
    uniform: true,
  });
  const { mainBarsKgM2, crossBarsKgM2 } = slab;
  return {
    slab: { ...slab, mainBarsKgM2: crossBarsKgM2, crossBarsKgM2: mainBarsKgM2 },
    ribs: designRibs({ ...ribCase, slab }),
  };
}

function topSlab(slabCase: SlabCase, isAcross: boolean): Pick<BoxLayout, 'slab' | 'across'> {
  if (!isAcross) return { slab: designSlab(slabCase) };
  const { strandKgM2, forceKNm, ...slab } = acrossSlab(slabCase);
  return { slab, across: { strandKgM2, forceKNm } };
}

/** Horizontal over vertical of the outer webs of a box of given width between their axes at the top and depth, m. */
export function webSlope(topM: number, depthM: number): number {
  const { most, bottomOverTop } = boxData.webSlope;
  return Math.min(most, ((1 - bottomOverTop) * topM) / (2 * depthM));
}
