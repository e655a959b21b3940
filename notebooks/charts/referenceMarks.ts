import { colours, letters } from '../drawing/ink.ts';
import { label } from '../drawing/label.ts';
import { textWidth } from '../drawing/lettering.ts';
import type { Piece } from '../drawing/piece.ts';
import { g } from '../drawing/piece.ts';

/** A work as it is cited in a chart: its number in the list of sources; in italics where it is from memory. */
export interface ReferenceMark {
  readonly number: number;
  readonly read: boolean;
}

/** Numbers of works in a row. */
export function referenceMarks(marks: readonly ReferenceMark[], x: number, y: number): Piece {
  let at = x;
  return g(
    { class: 'references' },
    marks.map(({ number, read }, index) => {
      const text = index < marks.length - 1 ? `${String(number)},` : String(number);
      const piece = label(at, y, text, { fill: colours.third, italic: !read });
      at += textWidth(text, letters.drawing) + 4;
      return piece;
    }),
  );
}
