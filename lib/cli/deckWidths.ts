import { BARRIERS_M, LEAST_LANE_M } from '../site/index.ts';

/** Widest deck that is asked for, m; wider roads stand on decks side by side. */
export const WIDEST_DECK_M = 60;
/** Narrowest deck that carries a lane between its barriers, m. */
export const NARROWEST_DECK_M = LEAST_LANE_M + BARRIERS_M;
