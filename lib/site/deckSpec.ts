import type { DeckSpec, DeckStrip, StandardId, StripKind } from '../model/index.ts';

/**
 * Surfacing, kN/m3. lm1: asphalt 23 to 25, EN 1991-1-1 table A.6 (from memory); hl93: bituminous wearing surface
 * 0.140 kcf, AASHTO LRFD table 3.5.1-1 (from memory).
 */
export const SURFACING_KN_M3: Readonly<Record<StandardId, number>> = { lm1: 23.5, hl93: 22 };

/** Raised footway and verge: 100 mm of fill and paving at 24 kN/m3. Common practice, no source. */
export const FOOTWAY_KN_M2 = 2.4;

/** Steel vehicle barrier or parapet with its plinth, kN per m of each line. Common practice, no source. */
export const BARRIER_LINE_KN_M = 5;

export const carriage: ReadonlySet<StripKind> = new Set<StripKind>(['lane', 'shoulder']);
export const raised: ReadonlySet<StripKind> = new Set<StripKind>(['footway', 'verge']);
export const railed: ReadonlySet<StripKind> = new Set<StripKind>(['barrier', 'parapet']);

function widthOf(strips: readonly DeckStrip[], kinds: ReadonlySet<StripKind>): number {
  return strips.reduce((sum, strip) => (kinds.has(strip.kind) ? sum + strip.widthM : sum), 0);
}

/** Middle of the stretch from the first to the last lane or shoulder, from the left edge, m. */
function carriageMiddle(strips: readonly DeckStrip[]): number {
  let x = 0;
  let first = Infinity;
  let last = 0;
  for (const strip of strips) {
    if (carriage.has(strip.kind)) {
      first = Math.min(first, x);
      last = x + strip.widthM;
    }
    x += strip.widthM;
  }
  return first < last ? (first + last) / 2 : x / 2;
}

/**
 * The deck as the structure sees it, from its strips (left to right looking up-chainage) and the surfacing thickness, m.
 * The carriageway is lanes and shoulders together. Superimposed load: surfacing over the carriageway, build-up on
 * footways and verges, one line load for each barrier and parapet; services are not included.
 * A deck without lanes has carriageway 0 and its offset at 0.
 */
export function deckSpec(strips: readonly DeckStrip[], surfacingM: number, standard: StandardId): DeckSpec {
  const widthM = strips.reduce((sum, strip) => sum + strip.widthM, 0);
  const carriagewayM = widthOf(strips, carriage);
  const lines = strips.filter((strip) => railed.has(strip.kind)).length;
  return {
    widthM,
    carriagewayM,
    carriagewayOffsetM: carriageMiddle(strips) - widthM / 2,
    lanes: strips.filter((strip) => strip.kind === 'lane').length,
    footwayM: widthOf(strips, new Set<StripKind>(['footway'])),
    surfacingM,
    superimposedKNm:
      surfacingM * SURFACING_KN_M3[standard] * carriagewayM +
      FOOTWAY_KN_M2 * widthOf(strips, raised) +
      BARRIER_LINE_KN_M * lines,
  };
}
