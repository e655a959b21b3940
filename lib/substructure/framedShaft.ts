import type { CastInPier } from '../model/index.ts';
import { substructureData } from './data.ts';
import { thermalMovement, type DeckMaterial } from './loads.ts';

/** A shaft between a rigid foundation and a deck that resists turning over it. */
export interface FramedShaft {
  readonly heightM: number;
  /** With what cracks and creep leave of it. */
  readonly eiKNm2: number;
  readonly deckTurnKNm: number;
}

/** Moments at the two ends of a shaft, kNm, each 0 or more, and the force across it, kN. */
export interface EndMoments {
  readonly topKNm: number;
  readonly footKNm: number;
  readonly forceKN: number;
}

/** What a deck does to the pier it is cast in with. */
export type FrameAsk = Omit<CastInPier, 'support'> & {
  /** How far the deck moves over it from where it was cast, m, what of that is cooling, and the chainage that stays. */
  readonly pushM: number;
  readonly cooledM: number;
  readonly stillM: number;
};

/**
 * How far a deck moves one way over a pier it is cast in with, m: half of the range of temperature and all of its shortening
 * over the length to the point that stays, m. Bearings have both ways of temperature.
 */
export function pushOf(
  material: DeckMaterial,
  lengthM: number,
): { readonly pushM: number; readonly cooledM: number } {
  const { expansionPerK, rangeK, shorteningPerM } = substructureData.movement[material];
  const cooledM = thermalMovement(expansionPerK, rangeK / 2, lengthM) / 1000;
  return { pushM: cooledM + shorteningPerM * lengthM, cooledM };
}

/** Stiffness of a shaft against its top turning while it stays in its place, 4 E I / h, kNm per radian. */
const turnOf = ({ eiKNm2, heightM }: FramedShaft): number => (4 * eiKNm2) / heightM;

/**
 * The top pushed along by so many metres. 6 E I push / h^2 at both ends under a deck that does not turn at all; under one that
 * turns with it nothing at the top and 3 E I push / h^2 at the foot (slope deflection, any text on frames).
 */
export function pushedBy(shaft: FramedShaft, pushM: number): EndMoments {
  const { heightM, eiKNm2, deckTurnKNm } = shaft;
  const fixedKNm = (6 * eiKNm2 * pushM) / heightM ** 2;
  const turn = turnOf(shaft);
  const topKNm = (fixedKNm * deckTurnKNm) / (deckTurnKNm + turn);
  const footKNm = (fixedKNm * (deckTurnKNm + turn / 2)) / (deckTurnKNm + turn);
  return { topKNm, footKNm, forceKN: (topKNm + footKNm) / heightM };
}

/** Stiffness of a shaft against its top moving along the road, kN per m: 12 E I / h^3 under a deck that does not turn. */
export const swayOf = (shaft: FramedShaft): number => pushedBy(shaft, 1).forceKN;

/** A force along the road at the top, kN, which may move. */
export const swayedBy = (shaft: FramedShaft, forceKN: number): EndMoments =>
  pushedBy(shaft, forceKN / swayOf(shaft));

/**
 * The deck turns over the shaft, its top staying in its place: of the couple that would keep the deck from turning, kNm, the
 * shaft takes its share by stiffness at the top and half of that at its foot.
 */
export function turnedBy(shaft: FramedShaft, heldKNm: number): EndMoments {
  const turn = turnOf(shaft);
  const topKNm = (heldKNm * turn) / (turn + shaft.deckTurnKNm);
  return { topKNm, footKNm: topKNm / 2, forceKN: (1.5 * topKNm) / shaft.heightM };
}

/** What comes together at the ends, each in its worse direction. */
export function together(...all: readonly EndMoments[]): EndMoments {
  const sum = (of: (one: EndMoments) => number): number => all.reduce((total, one) => total + of(one), 0);
  return {
    topKNm: sum(({ topKNm }) => topKNm),
    footKNm: sum(({ footKNm }) => footKNm),
    forceKN: sum(({ forceKN }) => forceKN),
  };
}
