import type { Descriptor } from '../../model/index.ts';
import { formManual } from '../common/formManual.ts';
import { precastManual } from '../common/precast/precastManual.ts';
import { torsionFigures } from '../common/precast/torsionFigures.ts';

const { figure, sized, check } = formManual('precast-trough');

/** Troughs: layout, torsion and handling, then what all beams under a slab have. */
export const troughFigures: readonly Descriptor[] = [
  sized(
    'beamLines',
    'lines of troughs',
    'no',
    'cheapest number by concrete and strand within the usual spacing that holds',
    './task/deck/widthM',
    'spans',
    'data/precast-trough/layout/leastSpacingM',
    'data/precast-trough/layout/mostSpacingM',
    'data/pretensioned/proxy/strandKgPerM3',
  ),
  figure('spacingM', {
    label: 'spacing of the troughs',
    unit: 'm',
    method: 'layout',
    formula: 'deck width / lines',
    inputs: (at) => ({ width: `${at.unit}/task/deck/widthM`, lines: `${at.unit}/figures/beamLines` }),
    compute: ({ width, lines }) => width / lines,
  }),
  figure('overhangM', {
    label: 'deck beyond the axis of the outer trough',
    unit: 'm',
    method: 'layout',
    formula: 'half a spacing',
    inputs: (at) => ({ spacing: `${at.unit}/figures/spacingM` }),
    compute: ({ spacing }) => spacing / 2,
  }),
  sized(
    'openTorsionM4',
    'torsion constant of a trough before its slab',
    'm4',
    'sum of s t3 / 3 of its plates',
    'beamHeightM',
    'webM',
  ),
  sized(
    'closedTorsionM4',
    'torsion constant of a trough closed by the slab',
    'm4',
    '4 A2 / sum (s / t)',
    'cellM2',
    'webM',
    'slabM',
  ),
  ...check(
    'hauling-twist',
    ['torque of a cross-fall on the road over the open torsion constant', 'openTorsionM4', 'ownKNm', 'spans'],
    ['0.7 of the mean tensile strength at release', 'data/pretensioned/release/strength/:standard'],
  ),
  ...check(
    'wet-webs',
    [
      'bending of a leaning web at its foot under wet slab, men and forms',
      'spacingM',
      'slabM',
      'beamHeightM',
    ],
    ['mean tensile strength', 'webM'],
  ),
  ...torsionFigures('precast-trough'),
  ...precastManual('precast-trough'),
];
