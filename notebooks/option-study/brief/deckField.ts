import { CROSSFALL, type Brief } from '../../../lib/index.ts';
import { deckStrips } from '../../drawing/deckStrips.ts';
import { largestScale, type Scale } from '../../drawing/scale.ts';
import { scaleBar } from '../../drawing/scaleBar.ts';
import { sheet } from '../../drawing/sheet.ts';
import { toDom } from '../../drawing/toDom.ts';
import { h } from '../../html.ts';
import { standing, type Path, type StudyStore } from '../../page/index.ts';
import type { Graph } from '../../reactive/index.ts';
import { confirmAction, sayIn } from './fieldTable.ts';
import { problemBeside } from './problemBeside.ts';
import { DECK_MARGIN_PX, drawnWidths, stripChainFields } from './stripChainFields.ts';
import { hasUltimate } from './stripEdits.ts';

const list: Path = ['brief', 'deck'];

/** Widest drawing of a deck, px: the body of the sheet without the margins of the drawing. */
const ROOM_PX = 930;

/** The same on smaller screens, by what stands beside the body there. */
const roomPx = (): number =>
  Math.min(ROOM_PX, innerWidth - (innerWidth < 700 ? 42 : 200) - 2 * DECK_MARGIN_PX);

const bar = (scale: Scale, widthPx: number): Element =>
  toDom(
    sheet(widthPx, 30, `Scale 1 to ${String(scale)}`, [
      scaleBar(scale, DECK_MARGIN_PX, 20, { heights: false, widthPx: Math.max(120, widthPx - 200) }),
    ]),
    document,
  );

/** The deck as strips drawn to scale, each with its name and its present and ultimate width to be changed under it. */
export function deckField(graph: Graph, store: StudyStore): HTMLElement {
  /** Whether the ultimate layout is set out although it says the same as the present one. */
  let isOpen = false;
  return standing(graph, store, {
    say: problemBeside,
    shape: ({ brief }) => brief.deck.length,
    build(study, fields) {
      const present = stripChainFields(fields, store, 'present', study);
      const ultimate = stripChainFields(fields, store, 'ultimate', study);
      const drawn = h('div', { class: 'drawn' });
      const scaled = h('div', { class: 'drawn' });
      const told = h('p', { class: 'refusal', role: 'status' });
      const later = h('summary', {});
      const more = h('details', { class: 'behind ultimate', open: isOpen }, later, ultimate.element);
      more.addEventListener('toggle', () => {
        isOpen = more.open;
      });
      const draw = ({ deck, surfacingM }: Brief): void => {
        const widths = drawnWidths(deck, 'present');
        const most = Math.max(
          ...[widths, drawnWidths(deck, 'ultimate')].map((all) => all.reduce((sum, one) => sum + one, 0)),
        );
        const scale = largestScale(most, roomPx());
        const strips = deck.map(({ kind }, i) => ({ kind, widthM: widths[i]! }));
        const piece = deckStrips({
          strips,
          surfacingM,
          crossfall: CROSSFALL,
          scale,
          marginPx: DECK_MARGIN_PX,
        });
        drawn.replaceChildren(toDom(piece, document));
        scaled.replaceChildren(bar(scale, Number(piece.attrs['width'])));
        present.show(deck, scale);
        ultimate.show(deck, scale);
        later.textContent = hasUltimate(deck) ? 'Ultimate layout' : 'Ultimate layout: the same widths';
      };
      let before: Brief | undefined;
      fields.follow([list], ({ brief }, problems) => {
        // The study keeps what has not changed as it was: the deck is drawn anew only when it is another one.
        if (brief.deck !== before?.deck || brief.surfacingM !== before.surfacingM) draw(brief);
        before = brief;
        sayIn(told, problems.map(problemBeside).join(' '));
      });
      const resized = new AbortController();
      addEventListener(
        'resize',
        () => {
          if (!drawn.isConnected) return resized.abort();
          if (before !== undefined) draw(before);
        },
        { signal: resized.signal },
      );
      return h(
        'div',
        { class: 'deck-field' },
        h('div', { class: 'deck-drawing' }, drawn, present.element, more, scaled),
        confirmAction(fields, store, {
          words: 'Confirm the deck',
          what: 'the deck',
          key: 'confirm.deck',
          paths: [list.join('.')],
        }),
        told,
        present.told,
        ultimate.told,
      );
    },
  }).element;
}
