import { saidScale } from './paper.ts';
import { boxOf, crossedAt, having, parts, runsOf, within, type Box, type Node } from './svg.ts';

/** What can be measured in a cross-section, m, from its left edge and from the top of its slab. */
export interface SectionMarks {
  /** From edge to edge of the deck. */
  readonly widthM: number;
  /** Surfaced strips between kerbs, m from the left edge. */
  readonly surfaced: readonly (readonly [fromM: number, toM: number])[];
  /** From the top of the slab on the middle of the deck to the lowest of the structure, at each cut that is drawn. */
  readonly depthM: Readonly<Record<string, number>>;
  /** Figures of the dimension over the deck. */
  readonly words: readonly string[];
}

const furniture = /parapet|barrier|surfacing|edge strip|kerb/u;
const slabs = /^(?:slab|deck|box|deck plate)$/u;

/** Measures a cross-section by the scale it states. */
export function measureSection(svg: Node): SectionMarks {
  const { pxPerM } = saidScale(svg);
  const cuts = having(svg, 'data-at');
  const edges = cuts.flatMap((cut) => parts(cut, 'edge strip')).map(boxOf);
  const left = Math.min(...edges.map((box) => box.left));
  const right = Math.max(...edges.map((box) => box.right));
  const middle = (left + right) / 2;
  const boxes = (cut: Node, name: RegExp, isWanted: boolean): Box[] =>
    having(cut, 'data-part')
      .filter(({ attrs }) => name.test(attrs['data-part']!) === isWanted)
      .map(boxOf);
  const depthM = Object.fromEntries(
    cuts.map((cut) => {
      const top = Math.min(
        ...having(cut, 'data-part')
          .filter(({ attrs }) => slabs.test(attrs['data-part']!))
          .flatMap((slab) => crossedAt(runsOf(slab), middle)),
      );
      const foot = Math.max(...boxes(cut, furniture, false).map((box) => box.bottom));
      return [cut.attrs['data-at']!, (foot - top) / pxPerM];
    }),
  );
  return {
    widthM: (right - left) / pxPerM,
    surfaced: boxes(cuts[0]!, /^surfacing$/u, true).map((box) => [
      (box.left - left) / pxPerM,
      (box.right - left) / pxPerM,
    ]),
    depthM,
    words: [...within(svg)].filter(({ tag }) => tag === 'text').map(({ text }) => text),
  };
}

/** The strips of a deck as they are drawn, left to right: what each is and its edges, px. */
export const stripsDrawn = (
  svg: Node,
): { readonly kind: string; readonly left: number; readonly right: number }[] =>
  having(svg, 'data-part').map((node) => {
    const { left, right } = boxOf(node);
    return { kind: node.attrs['data-part']!, left, right };
  });
