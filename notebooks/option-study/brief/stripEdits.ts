import type { DeckStrip, Study } from '../../../lib/index.ts';
import { putAt, type Path } from '../../page/place.ts';
import type { Figure } from '../../page/figureText.ts';

const at = (index: number): Path => ['brief', 'deck', index];

/** A strip made wider or narrower; its ultimate width goes with it for as long as it is the same. */
export function withStripWidth(study: Study, index: number, widthM: Figure): Study {
  const strip = study.brief.deck[index];
  if (strip === undefined || widthM === 'unknown') return study;
  const isSame = strip.ultimateWidthM === strip.widthM;
  const changed: DeckStrip = { ...strip, widthM, ...(isSame && { ultimateWidthM: widthM }) };
  return putAt(study, at(index), changed);
}

/** Whether any strip is to have another width later. */
export const hasUltimate = (deck: readonly DeckStrip[]): boolean =>
  deck.some(({ widthM, ultimateWidthM }) => widthM !== ultimateWidthM);

/** The strip put into a gap: one like its left neighbour, at the left edge like the first. */
export const stripForGap = (deck: readonly DeckStrip[], gap: number): DeckStrip =>
  deck[Math.max(0, gap - 1)]!;
