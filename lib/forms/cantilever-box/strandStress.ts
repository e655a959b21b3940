import { materials } from '../../actions/index.ts';
import { boxData } from '../concrete-box/boxData.ts';
import type { TendonStress } from '../concrete-box/tendonForce.ts';
import type { CantileverBase } from './cantileverModel.ts';

/**
 * Losses of nearly straight tendons stressed from both ends, at their middle: friction over half their length, draw-in,
 * half of the shortening under `axialMPa`, and the lasting losses.
 * @param halfM half of their mean length, m
 * @param turnRad deviation on the way to the middle
 */
export function strandStress(
  model: Pick<CantileverBase, 'standardId' | 'concrete'>,
  halfM: number,
  turnRad: number,
  axialMPa: number,
): TendonStress {
  const { frictionPerRad, wobbleRadPerM, seatingM, longTerm } = boxData.losses;
  const { eMPa, ultimateMPa } = materials.strand[model.standardId];
  const jackMPa = boxData.jacking[model.standardId] * ultimateMPa;
  const kept = Math.exp(-frictionPerRad * (turnRad + wobbleRadPerM * halfM));
  const elastic = (0.5 * eMPa * axialMPa) / model.concrete.ecmMPa;
  const initialMPa = jackMPa * kept - (seatingM * eMPa) / (2 * halfM) - elastic;
  return { jackMPa, initialMPa, lastingMPa: (1 - longTerm) * initialMPa };
}
