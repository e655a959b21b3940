import type { Descriptor, FormId } from '../../../model/index.ts';
import { formManual } from '../formManual.ts';

/** What beams with a closed cell tell of torsion and of how they share the load out. */
export function torsionFigures(form: FormId): Descriptor[] {
  const { sized } = formManual(form);
  return [
    sized(
      'torqueArmM',
      'torque of the beam twisted most over the shear that traffic gives a beam',
      'm',
      'shares of linked beams, lanes placed for the most torque',
      'beamLines',
      'spacingM',
      'spans',
      'compositeInertiaM4',
      'cellM2',
    ),
    sized(
      'cellM2',
      'area of the closed cell within the middle of its walls',
      'm2',
      'outline of the beam with its slab',
      'beamHeightM',
      'slabM',
    ),
    sized(
      'shearRatio',
      'traffic shear of a beam over its share of moment',
      '',
      'lever rule close to a support over the share of linked beams; 1 at least',
      'spacingM',
      'laneVehicles',
    ),
  ];
}
