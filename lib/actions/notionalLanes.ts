import type { LoadStandard } from './loadStandard.ts';

/** Lanes that traffic is reckoned in, whatever is painted on the road. */
export interface NotionalLanes {
  readonly count: number;
  readonly widthM: number;
}

/**
 * Number and width of notional lanes between kerbs: one below `twoLanesFromM`, two halves up to two full lanes, then as
 * many full lanes as fit. EN 1991-2 table 4.1 and AASHTO LRFD 3.6.1.1.1 (from memory) share this shape.
 * @throws RangeError when the carriageway is not wider than 0
 */
export function notionalLanes(lanes: LoadStandard['lanes'], carriagewayM: number): NotionalLanes {
  if (!(carriagewayM > 0))
    throw new RangeError(`carriageway: expected more than 0 m, received ${carriagewayM}`);
  // A carriageway of exactly n lanes must hold n lanes in spite of rounding.
  const fit = Math.floor(carriagewayM / lanes.widthM + 1e-9);
  if (fit >= 2) return { count: fit, widthM: lanes.widthM };
  if (carriagewayM >= lanes.twoLanesFromM) return { count: 2, widthM: carriagewayM / 2 };
  return { count: 1, widthM: Math.min(carriagewayM, lanes.widthM) };
}
