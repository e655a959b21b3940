import type { Descriptor } from '../../../model/index.ts';
import type { formManual } from '../formManual.ts';

/** Checks of a deck slab, for the forms that have one; `thickness` names the figure of its thickness. */
export function slabCheckFigures({ check }: ReturnType<typeof formManual>, thickness: string): Descriptor[] {
  return [
    ...['slab-span', 'slab-root'].flatMap((id) =>
      check(
        id,
        [
          'As / d, As the greater of M / (z fyd) at ultimate and M / (z sigma) in service, per metre of slab',
          thickness,
          'data/slab/leverRatio',
          'data/slab/barAxisM',
          'data/slab/serviceStressMPa/:standard',
        ],
        ['most bars that can be placed in one face', 'data/slab/steelRatioMost'],
        'EN 1992-1-1 (from memory)',
      ),
    ),
    ...check(
      'slab-thickness',
      ['thickness that its moments ask for', thickness],
      ['thickest practical slab', 'data/slab/mostThicknessM'],
    ),
  ];
}
