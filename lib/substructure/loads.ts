import type { DeckSpec, StandardId } from '../model/index.ts';
import { substructureData } from './data.ts';

/**
 * Characteristic braking force of a deck, kN, for the loaded length, m.
 * LM1: 360 + 2.7 L, at most 900 kN (EN 1991-2 4.4.1). HL-93: the greater of 25 % of the truck and 5 % of truck and
 * lane load, on the lanes of one direction (AASHTO LRFD 3.6.4). Both from memory.
 */
export function brakingForce(standard: StandardId, lengthM: number, deck: Pick<DeckSpec, 'lanes'>): number {
  if (standard === 'lm1') {
    const { baseKN, perMKN, capKN } = substructureData.braking.lm1;
    return Math.min(capKN, baseKN + perMKN * lengthM);
  }
  const { truckShare, trainShare, truckKN, laneKNm } = substructureData.braking.hl93;
  const lane = Math.max(truckShare * truckKN, trainShare * (truckKN + laneKNm * lengthM));
  return lane * Math.max(1, Math.ceil(deck.lanes / 2));
}

/** Wind across a deck without traffic held at one support, kN: structural depth with the height of traffic, over the length, m. */
export function windOnDeck(depthM: number, lengthM: number): number {
  return substructureData.wind.pressureKNm2 * (depthM + substructureData.wind.trafficHeightM) * lengthM;
}

/**
 * Unbalanced friction of the sliding bearings on either side of a fixed point, kN.
 * Permanent loads, kN, one per sliding support. EN 1337-1 6.2 (from memory): adverse mu (1 + a) / 2 on one side,
 * relieving mu (1 - a) / 2 on the other; a = 1 up to 4 bearings, (16 - n) / 12 to 10, 0.5 beyond.
 */
export function unbalancedFriction(leftKN: readonly number[], rightKN: readonly number[]): number {
  const n = (leftKN.length + rightKN.length) * substructureData.bearings.perLine;
  const a = n <= 4 ? 1 : n < 10 ? (16 - n) / 12 : 0.5;
  const mu = substructureData.friction.coefficient;
  const left = sum(leftKN);
  const right = sum(rightKN);
  return (mu * (1 + a) * Math.max(left, right)) / 2 - (mu * (1 - a) * Math.min(left, right)) / 2;
}

/** Kind of deck for movements: which materials it holds, read from its measured lines. */
export type DeckMaterial = 'composite' | 'prestressed' | 'reinforced';

/** Movement of a length, m, through a range of temperature, K, mm: expansion per K x range x length. */
export const thermalMovement = (expansionPerK: number, rangeK: number, lengthM: number): number =>
  expansionPerK * rangeK * lengthM * 1000;

/** Movement at a joint, mm: both ways of temperature plus shortening, over the length to the fixed point, m. */
export function jointMovement(material: DeckMaterial, lengthM: number): number {
  const { expansionPerK, rangeK, shorteningPerM } = substructureData.movement[material];
  return thermalMovement(expansionPerK, rangeK, lengthM) + shorteningPerM * lengthM * 1000;
}

const sum = (values: readonly number[]): number => values.reduce((total, value) => total + value, 0);
