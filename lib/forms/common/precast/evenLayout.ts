import type { BeamLayout } from './beamChoice.ts';

/** `count` beams that share a deck evenly, each in the middle of its part; nothing is left beyond the outer parts. */
export function evenLayout(widthM: number, count: number): BeamLayout {
  const spacingM = widthM / count;
  return {
    count,
    spacingM,
    overhangM: 0,
    offsetsM: Array.from({ length: count }, (_, i) => (i - (count - 1) / 2) * spacingM),
  };
}
