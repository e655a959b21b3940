import type { Piece } from '../drawing/piece.ts';
import { toDom } from '../drawing/toDom.ts';
import { h } from '../html.ts';

export type PaperName = 'A4' | 'Letter';

/** Room for a drawing on a sheet laid across, px at 96 to the inch: 10 mm free all round, two lines of words on top. */
export const paperRoom: Readonly<Record<PaperName, { readonly widthPx: number; readonly heightPx: number }>> =
  {
    A4: { widthPx: 1046, heightPx: 660 },
    Letter: { widthPx: 980, heightPx: 682 },
  };

/** How a drawing goes on paper. */
export interface OnPaper {
  /** Size on paper over size on the sheet; 1 is the scale that is written on it. */
  readonly reduced: number;
  /** Parts of a drawing higher than a page, each from and to px down the drawing. */
  readonly parts: readonly (readonly [from: number, to: number])[];
  /** The scale in words. */
  readonly words: string;
}

/**
 * Lays a drawing out on paper: at its own scale where it is narrow enough, else reduced to the width of the paper; one
 * higher than a page is cut at the gaps it gives, else where the page ends.
 * @param scale 1 to this, where the drawing has one
 * @param gaps px down the drawing where it may be cut
 */
export function onPaper(
  size: { readonly widthPx: number; readonly heightPx: number },
  scale: number | null,
  paper: PaperName,
  gaps: readonly number[] = [],
): OnPaper {
  const room = paperRoom[paper];
  const reduced = Math.min(1, room.widthPx / size.widthPx);
  const most = room.heightPx / reduced;
  const parts: [number, number][] = [];
  for (let from = 0; from < size.heightPx - 1;) {
    const end = from + most;
    const gap = gaps.filter((at) => at > from + 1 && at <= end).at(-1);
    const to = end >= size.heightPx ? size.heightPx : (gap ?? end);
    parts.push([from, to]);
    from = to;
  }
  const at =
    scale === null
      ? ''
      : reduced === 1
        ? `1:${String(scale)} on ${paper}; `
        : `about 1:${String(Math.round(scale / reduced / 10) * 10)} on ${paper}, reduced from 1:${String(scale)}; `;
  return { reduced, parts, words: `${at}the scale bar rules` };
}

const scaleIn = (piece: Piece): number | null => {
  const own = piece.attrs['data-scale'];
  if (own !== undefined) return Number(own);
  for (const child of piece.children) {
    const found = typeof child === 'string' ? null : scaleIn(child);
    if (found !== null) return found;
  }
  return null;
};

/** Feet of the rows of a stack, px down it. */
function gapsIn(piece: Piece): number[] {
  return piece.children.flatMap((child) => {
    if (typeof child === 'string') return [];
    if (!(child.attrs['class'] ?? '').startsWith('row')) return gapsIn(child);
    const frame = child.children.find(
      (one): one is Piece => typeof one !== 'string' && one.attrs['class'] === 'frame',
    );
    return frame === undefined ? [] : [Number(frame.attrs['y']) + Number(frame.attrs['height']) + 4];
  });
}

/** How drawings are printed alone. */
export interface Printed {
  readonly paper: PaperName;
  /** What they are of, and what they are. */
  readonly heading: readonly string[];
  /** What is said of them before all that they show is there; '' once it is. */
  readonly unfinished: string;
}

/** Prints drawings alone, each on its own sheets, with what they are and their scale over them. */
export function printDrawing(pieces: readonly Piece[], { paper, heading, unfinished }: Printed): void {
  const sheets = pieces.flatMap((piece) => {
    const [widthPx, heightPx] = [Number(piece.attrs['width']), Number(piece.attrs['height'])];
    const laid = onPaper({ widthPx, heightPx }, scaleIn(piece), paper, gapsIn(piece));
    return laid.parts.map(([from, to], i) => {
      const part = laid.parts.length > 1 ? `part ${String(i + 1)} of ${String(laid.parts.length)}; ` : '';
      const window: Piece = {
        ...piece,
        attrs: {
          ...piece.attrs,
          width: String(widthPx * laid.reduced),
          height: String((to - from) * laid.reduced),
          viewBox: `0 ${String(from)} ${String(widthPx)} ${String(to - from)}`,
          class: 'alone',
        },
      };
      return h(
        'div',
        { class: 'alone-sheet' },
        h(
          'p',
          {},
          h('b', {}, heading[0] ?? ''),
          ` ${heading.slice(1).join(' ')}. ${part}${laid.words}.`,
          unfinished !== '' && ` ${unfinished}`,
        ),
        toDom(window, document),
      );
    });
  });
  const { documentElement: root, body } = document;
  const alone = h('div', { class: `alone-print ${paper.toLowerCase()}` }, sheets);
  body.append(alone);
  root.classList.add('print-alone');
  const tidy = (): void => {
    alone.remove();
    root.classList.remove('print-alone');
  };
  addEventListener('afterprint', tidy, { once: true });
  print();
}
