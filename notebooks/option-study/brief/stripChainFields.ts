import { stripKinds, type DeckStrip, type Study } from '../../../lib/index.ts';
import { letters } from '../../drawing/ink.ts';
import { textWidth } from '../../drawing/lettering.ts';
import { pxPerMetre, type Scale } from '../../drawing/scale.ts';
import { CHAIN_TOP_PX, stripChain } from '../../drawing/stripChain.ts';
import { toDom } from '../../drawing/toDom.ts';
import { fixed } from '../../format.ts';
import { h } from '../../html.ts';
import type { Fields, Figure, Made, Path, StudyStore } from '../../page/index.ts';
import { putAt } from '../../page/index.ts';
import { confirmAction, listAction, saidBelow, sayIn } from './fieldTable.ts';
import { withEntry, withoutEntry } from './listEdits.ts';
import { stripForGap, withStripWidth } from './stripEdits.ts';
import { stripLayout } from './stripLayout.ts';

/** The deck as it is first built, or as it will be laid out at last. */
export type DeckLayout = 'present' | 'ultimate';

/** A part that stands over a drawing and is set anew for every draft. */
export interface StripChainFields {
  readonly element: HTMLElement;
  /** What the fields say against their values. */
  readonly told: HTMLElement;
  readonly show: (deck: readonly DeckStrip[], scale: Scale) => void;
}

const list: Path = ['brief', 'deck'];
/** Room at the left and right of a deck, px. */
export const DECK_MARGIN_PX = 24;
/** Height of one tier of words, px: a figure over a name. */
const TIER_PX = 40;
const AIR_PX = 10;

/** Widths as they are drawn, m: a width under the keyboard may for a moment be none. */
export const drawnWidths = (deck: readonly DeckStrip[], layout: DeckLayout): number[] =>
  deck.map(({ widthM, ultimateWidthM }) => {
    const width = layout === 'present' ? widthM : ultimateWidthM;
    return width > 0 && width <= 200 ? width : 0.1;
  });

/** Puts an element at a place over a drawing. The policy of the page bars style attributes in markup, not this. */
function putOver(element: HTMLElement, leftPx: number, topPx: number): void {
  element.style.left = `${String(Math.round(leftPx))}px`;
  element.style.top = `${String(Math.round(topPx))}px`;
}

const stripWidth = (index: number, layout: DeckLayout): Made<Figure> => {
  const key = layout === 'present' ? 'widthM' : 'ultimateWidthM';
  return {
    key: `brief.deck.${index}.${key}`,
    has: ({ brief }) => index < brief.deck.length,
    get: ({ brief }) => brief.deck[index]![key],
    put: (study, width) =>
      layout === 'present' ? withStripWidth(study, index, width) : putAt(study, [...list, index, key], width),
    owns: [[...list, index, key]],
    // An ultimate width that is that of the deck as first built is no other figure.
    from: ({ brief: { deck } }) =>
      deck[index]!.ultimateWidthM === deck[index]!.widthM
        ? [
            [...list, index, 'widthM'],
            [...list, index, 'ultimateWidthM'],
          ]
        : [[...list, index, key]],
  };
};

function widthField(fields: Fields, index: number, layout: DeckLayout): HTMLElement {
  return fields.figure(stripWidth(index, layout), {
    label: layout === 'present' ? `width of strip ${index + 1}` : `ultimate width of strip ${index + 1}`,
    places: 2,
    unit: 'm',
    step: 0.1,
    min: { value: 0, open: true },
    max: { value: 200 },
  });
}

/** The words of one strip: its width over its name; those of the deck as first built can be changed in kind. */
function stripWords(
  fields: Fields,
  store: StudyStore,
  index: number,
  layout: DeckLayout,
  count: number,
): HTMLElement {
  const width = widthField(fields, index, layout);
  if (layout === 'ultimate') {
    const name = h('span', { class: 'name' });
    fields.follow([], ({ brief }) => {
      sayIn(name, brief.deck[index]?.kind ?? '');
    });
    return h('div', { class: 'strip' }, width, name);
  }
  const kind = fields.choice([...list, index, 'kind'], {
    label: `kind of strip ${index + 1}`,
    choices: stripKinds.map((value) => ({ value, words: value })),
  });
  const takeOut = listAction('take out', `take out strip ${index + 1}`, `take.deck.${index}`, () =>
    store.edit((study) => withoutEntry(study, list, index), { what: 'taking out a strip' }),
  );
  return h(
    'div',
    { class: 'strip' },
    width,
    h('span', { class: 'name' }, kind),
    h(
      'span',
      { class: 'acts' },
      confirmAction(fields, store, {
        words: 'confirm',
        what: `strip ${index + 1}`,
        key: `confirm.deck.${index}`,
        paths: [[...list, index].join('.')],
      }),
      count > 1 && takeOut,
    ),
  );
}

function gapAction(store: StudyStore, gap: number): HTMLElement {
  return listAction(
    '+',
    `add a strip ${gap === 0 ? 'at the left edge' : `after strip ${gap}`}`,
    `add.deck.${gap}`,
    () =>
      store.edit((study) => withEntry(study, list, gap, stripForGap(study.brief.deck, gap)), {
        what: 'adding a strip',
      }),
  );
}

/** Width of the words of a strip with the air beside them, px. */
function wordsWidth(strip: DeckStrip, widthM: number): number {
  const figure = textWidth(fixed(widthM, 2), letters.table, 600) + 4;
  return Math.max(figure, textWidth(strip.kind, letters.drawing)) + AIR_PX;
}

/**
 * The chain of dimensions under a deck with the width of each strip to be changed in it. Gaps take a new strip, names
 * are exchanged, in the deck as first built.
 */
export function stripChainFields(
  fields: Fields,
  store: StudyStore,
  layout: DeckLayout,
  { brief }: Study,
): StripChainFields {
  const count = brief.deck.length;
  const words = brief.deck.map((_, index) => stripWords(fields, store, index, layout, count));
  const gaps = layout === 'ultimate' ? [] : [0, ...brief.deck.keys()].map((_, gap) => gapAction(store, gap));
  for (const gap of gaps) gap.classList.add('gap-add');
  const drawn = h('div', { class: 'drawn' });
  const element = h('div', { class: 'strip-chain' }, drawn, interleaved(gaps, words));
  return {
    element,
    told: saidBelow(element),
    show(deck, scale) {
      if (deck.length !== count) return;
      const widths = drawnWidths(deck, layout);
      const ppm = pxPerMetre(scale);
      const { edges, places, tiers } = stripLayout(
        widths.map((width) => width * ppm),
        deck.map((strip, i) => wordsWidth(strip, widths[i]!)),
      );
      const chain = stripChain({
        edges: edges.map((x) => x + DECK_MARGIN_PX),
        leaders: places.flatMap(({ middle, tier }) =>
          tier === 0 ? [] : [{ x: middle + DECK_MARGIN_PX, toY: tier * TIER_PX + 4 }],
        ),
        wordsPx: tiers * TIER_PX + 4,
        overallM: widths.reduce((sum, width) => sum + width, 0),
        marginPx: DECK_MARGIN_PX,
        figure: layout === 'ultimate' ? 'site/deck/ultimateWidthM' : 'site/deck/widthM',
        ...(layout === 'ultimate' && { what: 'ultimate' }),
      });
      drawn.replaceChildren(toDom(chain, document));
      places.forEach(({ middle, tier }, i) =>
        putOver(words[i]!, middle + DECK_MARGIN_PX, CHAIN_TOP_PX + 4 + tier * TIER_PX),
      );
      gaps.forEach((gap, i) => putOver(gap, edges[i]! + DECK_MARGIN_PX, CHAIN_TOP_PX));
    },
  };
}

/** Gaps and strips as they follow each other across the deck, so that the Tab key goes from left to right. */
const interleaved = (gaps: readonly HTMLElement[], strips: readonly HTMLElement[]): HTMLElement[] =>
  strips.flatMap((strip, i) => [...gaps.slice(i, i + 1), strip]).concat(gaps.slice(strips.length));
