import type { Asked } from './asked.ts';
import { level } from '../format.ts';
import { dimensionChain } from './dimension.ts';
import { colours, letters, pens } from './ink.ts';
import { label } from './label.ts';
import type { Piece } from './piece.ts';
import { el, num } from './piece.ts';
import { sheet } from './sheet.ts';

export interface StripChainInput {
  /** Edges of the strips, px. */
  readonly edges: readonly number[];
  /** Strips whose words stand further down: the middle, px, and where the words begin, px below the chain. */
  readonly leaders: readonly { readonly x: number; readonly toY: number }[];
  /** Room for the words under the chain, px. */
  readonly wordsPx: number;
  readonly overallM: number;
  readonly marginPx: number;
  /** What the overall dimension is of, where it is not the deck as first built. */
  readonly what?: string;
  /** Which figure the overall dimension is. */
  readonly figure?: Asked;
}

/** From the top of a chain to its dimension line, px. */
export const CHAIN_TOP_PX = 12;
/** Under the words to the foot of the chain, px: the overall dimension. */
const CHAIN_FOOT_PX = 30;

/** Dimension lines under a deck: its strips, room for the words of each, and the overall width at the foot. */
export function stripChain({
  edges,
  leaders,
  wordsPx,
  overallM,
  marginPx,
  what,
  figure,
}: StripChainInput): Piece {
  const [first, last] = [edges[0] ?? 0, edges.at(-1) ?? 0];
  const overallY = CHAIN_TOP_PX + wordsPx + 18;
  const words = `${level(overallM)}${what === undefined ? '' : ` ${what}`}`;
  return sheet(last + marginPx, CHAIN_TOP_PX + wordsPx + CHAIN_FOOT_PX, `${words} m overall`, [
    el('path', {
      d: [
        ...edges.map((x) => `M${num(x)},0V${num(CHAIN_TOP_PX + 4)}`),
        ...[first, last].map((x) => `M${num(x)},${num(overallY - 10)}V${num(overallY + 4)}`),
        ...leaders.map(({ x, toY }) => `M${num(x)},${num(CHAIN_TOP_PX)}V${num(CHAIN_TOP_PX + toY)}`),
      ].join(''),
      stroke: colours.rule,
      'stroke-width': pens.fine,
      fill: 'none',
    }),
    dimensionChain(edges, CHAIN_TOP_PX, []),
    dimensionChain([first, last], overallY, []),
    label((first + last) / 2, overallY - 5, words, {
      anchor: 'middle',
      size: letters.table,
      weight: 600,
      figure,
    }),
  ]);
}
