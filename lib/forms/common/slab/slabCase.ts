import type { DeckSpec, StandardId } from '../../../model/index.ts';

/** A deck slab on parallel lines: girders or webs (it spans across the road) or cross-girders (along the road). */
export interface SlabCase {
  readonly standard: StandardId;
  readonly deck: DeckSpec;
  readonly direction: 'across' | 'along';
  /** Distance between the supporting lines, m. */
  readonly spacingM: number;
  /** Length beyond the outer line, m; 0 where there is none. Only with `across`. */
  readonly overhangM: number;
  /** True on more than two lines or on stiff webs; false on two girders free to turn. */
  readonly continuous: boolean;
  /** Same thickness from line to line and in the overhang (level soffit); otherwise thicker over the lines. */
  readonly uniform: boolean;
  /** Tension that the slab carries in the direction of its span besides bending, half in each face, kN per m; none when absent. */
  readonly tie?: { readonly serviceKNm: number; readonly ultimateKNm: number };
}
