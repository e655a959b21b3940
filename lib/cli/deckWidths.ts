/** Barriers take what the carriageway leaves of the width, half on each side, m (common practice, no source). */
export const BARRIERS_M = 1;
/** No traffic lane is marked narrower, m (common practice, no source). */
export const LEAST_LANE_M = 2.5;
/** Widest deck that is asked for, m; wider roads stand on decks side by side. */
export const WIDEST_DECK_M = 60;
/** Narrowest deck that carries a lane between its barriers, m. */
export const NARROWEST_DECK_M = LEAST_LANE_M + BARRIERS_M;
