import { practice, type Descriptor } from '../../model/index.ts';
import type { formManual } from '../common/formManual.ts';
import { leastSteelM } from './sizeFloor.ts';

/** Checks of a floor of cross-girders and stringers between two main planes, for the forms that have one. */
export function floorCheckFigures({ check }: ReturnType<typeof formManual>): Descriptor[] {
  return [
    ...['cross-girder', 'end-cross-girder', 'stringer'].flatMap((id) =>
      check(
        id,
        [
          'highest share used of bending, shear, fatigue and stiffness, as a simple composite beam',
          'planesM',
          'slabM',
          './task/depthM',
          './task/skewDeg?',
        ],
        ['1 by definition'],
        'EN 1993-1-1, EN 1993-1-9, EN 1994-2 (from memory)',
      ),
    ),
    ...check(
      'floor-room',
      ['least height of a cross-girder', 'practice/floor/leastSteelM'],
      ['floor depth - slab', './task/depthM', 'slabM'],
    ),
  ];
}

/** Figures of practice of the floor. */
export const floorPractice: readonly Descriptor[] = [
  practice('floor/leastSteelM', leastSteelM, 'least height of a cross-girder', 'm', 'common-practice'),
];
