import type { DeckSpec } from '../../model/index.ts';

/** Characteristic superimposed load of the deck by where it lies. */
export interface Superimposed {
  /** Surfacing, kN per m2 of carriageway. */
  readonly surfacingKNm2: number;
  /** Surfacing, kN per m of deck. */
  readonly surfacingKNm: number;
  /** Barriers, footway build-up and services, kN per m of deck. */
  readonly edgesKNm: number;
  readonly totalKNm: number;
}

/** Unit weight of asphalt surfacing, kN/m3. */
const surfacingKNm3 = 23.5;

/**
 * Splits the superimposed load of a deck into the surfacing of the carriageway and the rest, which is taken to lie
 * along the two edges. The total always stays `deck.superimposedKNm`.
 */
export function superimposedOn(deck: DeckSpec): Superimposed {
  const surfacingKNm = Math.min(deck.surfacingM * surfacingKNm3 * deck.carriagewayM, deck.superimposedKNm);
  return {
    surfacingKNm2: deck.carriagewayM > 0 ? surfacingKNm / deck.carriagewayM : 0,
    surfacingKNm,
    edgesKNm: deck.superimposedKNm - surfacingKNm,
    totalKNm: deck.superimposedKNm,
  };
}
