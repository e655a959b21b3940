import type { At } from '../model/index.ts';

/** What the soffit over a support is reckoned from, as a formula, as inputs and as a level, m. */
export const soffitFormula =
  'road level - structural depth - surfacing - crossfall x width between kerbs / 2';

/** Inputs of the soffit over a support: levels and depths in m. */
export const soffitInputs = (at: At) =>
  ({
    road: `${at.foot}/roadM`,
    depth: `${at.foot}/deckDepthM`,
    surfacing: 'site/deck/surfacingM',
    crossfall: 'practice/site/crossfall',
    kerbs: 'site/deck/carriagewayM',
  }) as const;

/** Level of the soffit over a support, m. */
export const soffitOver = (v: Readonly<Record<keyof ReturnType<typeof soffitInputs>, number>>): number =>
  v.road - v.depth - v.surfacing - (v.crossfall * v.kerbs) / 2;
