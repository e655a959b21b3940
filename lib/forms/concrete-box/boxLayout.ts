import type { UnitTask } from '../../model/index.ts';
import { designSlab, type SlabDesign } from '../common/slab/designSlab.ts';
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
}

/**
 * As few cells as keep the webs within the practical spacing of a slab without ribs or transverse tendons, overhangs in
 * a fixed proportion to it, outer webs leaning inwards, and the top slab designed across the webs.
 */
export function boxLayout(task: UnitTask): BoxLayout {
  const { overhangOverSpacing, mostWebSpacingM } = boxData.layout;
  const { deck } = task;
  const cells = Math.max(1, Math.ceil(deck.widthM / mostWebSpacingM - 2 * overhangOverSpacing - 1e-9));
  const spacingM = deck.widthM / (cells + 2 * overhangOverSpacing);
  const overhangM = overhangOverSpacing * spacingM;
  return {
    cells,
    webs: cells + 1,
    spacingM,
    overhangM,
    slope: webSlope(cells * spacingM, task.depthM),
    slab: designSlab({
      standard: task.standard,
      deck,
      direction: 'across',
      spacingM,
      overhangM,
      continuous: true,
      uniform: false,
    }),
  };
}

/** Horizontal over vertical of the outer webs of a box of given width between their axes at the top and depth, m. */
export function webSlope(topM: number, depthM: number): number {
  const { most, bottomOverTop } = boxData.webSlope;
  return Math.min(most, ((1 - bottomOverTop) * topM) / (2 * depthM));
}
