import { bracketKey } from '../drawing/barred.ts';
import { keyedIn } from '../drawing/handles.ts';
import type { Piece } from '../drawing/piece.ts';
import { listed } from '../format.ts';
import { h, type HtmlChild } from '../html.ts';

/** So many are named; of more their number is said. */
const NAMED = 3;

/** A drawing, and beneath it what letters in it stand for, and which of its handles have no room to be pointed at. */
export function withKeyed(drawing: Piece): HtmlChild {
  const names = keyedIn(drawing);
  const key = bracketKey(drawing);
  const letters =
    key.length > 0 &&
    h(
      'p',
      { class: 'keyed-only' },
      key.map(({ letter, names: barring }, i) => [i > 0 && '; ', h('b', {}, letter), ` ${barring}`]),
      '.',
    );
  if (names.length === 0) return [drawing, letters];
  const more = names.length - NAMED;
  const said = more > 1 ? [...names.slice(0, NAMED), `${String(more)} more`] : names;
  return [
    drawing,
    letters,
    h(
      'p',
      { class: 'keyed-only on-screen' },
      `No room to point at ${listed(said)}: the Tab key comes to them.`,
    ),
  ];
}
