import { substructureData } from './data.ts';

/** Height of rubber that takes a movement, both ways together, mm: half of it each way at the strain allowed; m. */
export const rubberHeight = (movementMm: number): number =>
  movementMm / 2 / 1000 / substructureData.bearings.rubberStrain;

/**
 * Kind of the bearings of a support: laminated rubber where it is low enough to be stable and carries the load, pots that
 * slide or are held elsewhere. Movement in mm, design load of all bearings in MN.
 */
export function bearingKind(movementMm: number, loadMN: number, bearings: number): 'elastomeric' | 'pot' {
  const { mostRubberM, mostElastomericMN } = substructureData.bearings;
  return rubberHeight(movementMm) <= mostRubberM && loadMN <= mostElastomericMN * bearings
    ? 'elastomeric'
    : 'pot';
}
