import type { Site, Unit } from '../model/index.ts';
import { erectionData } from './erectionData.ts';

/**
 * Radius at which the worst piece is set, m: from a crane beside the deck, standing at the edge of the widest water or
 * barred stretch under a unit, to the middle of the deck over the middle of that stretch.
 */
export function pickRadius({ zones, waters, deck }: Site, { supportsM }: Unit): number {
  const from = supportsM[0]!;
  const to = supportsM.at(-1)!;
  const barred = [...waters, ...zones.filter(({ hard }) => hard)].map(
    (stretch) => Math.min(to, stretch.toM) - Math.max(from, stretch.fromM),
  );
  const along = Math.max(0, ...barred) / 2;
  return Math.hypot(along, deck.widthM / 2 + erectionData.crane.besideDeckM);
}
