import type { Scale } from './scale.ts';
import { pxPerMetre } from './scale.ts';

/** Where a drawing lies on its sheet: one scale for both directions, heights are never exaggerated. */
export interface Frame {
  readonly scale: Scale;
  readonly pxPerM: number;
  /** Chainages shown, m. */
  readonly fromM: number;
  readonly toM: number;
  /** Pixels of the left and right end. */
  readonly left: number;
  readonly right: number;
  /** Pixel across of a chainage, m. */
  readonly x: (chainageM: number) => number;
  /** Pixel down of a level, m. */
  readonly y: (levelM: number) => number;
}

/** Makes a frame from the chainages shown, the pixel of the left end and the pixel of one level. */
export function frameOf(
  scale: Scale,
  span: { readonly fromM: number; readonly toM: number },
  left: number,
  at: { readonly levelM: number; readonly y: number },
): Frame {
  const pxPerM = pxPerMetre(scale);
  const x = (chainageM: number): number => left + (chainageM - span.fromM) * pxPerM;
  return {
    scale,
    pxPerM,
    fromM: span.fromM,
    toM: span.toM,
    left,
    right: x(span.toM),
    x,
    y: (levelM) => at.y - (levelM - at.levelM) * pxPerM,
  };
}
