import type { Descriptor } from '../../model/index.ts';
import { formManual } from '../common/formManual.ts';
import { precastManual } from '../common/precast/precastManual.ts';
import { splicedManual } from './spliced/splicedFigures.ts';

const { figure, sized } = formManual('precast-i');

/** Precast I-beams: layout of the beams, then what all beams under a slab have. */
export const precastIFigures: readonly Descriptor[] = [
  sized(
    'beamLines',
    'lines of beams',
    'no',
    'cheapest number by concrete and strand within the usual spacing that holds',
    './task/deck/widthM',
    'spans',
    'data/precast-i/layout/leastSpacingM',
    'data/precast-i/layout/mostSpacingM',
    'data/pretensioned/proxy/strandKgPerM3',
  ),
  figure('spacingM', {
    label: 'spacing of the beams',
    unit: 'm',
    method: 'layout',
    formula: 'deck width / (lines - 1 + 2 x overhang over spacing)',
    inputs: (at) => ({
      width: `${at.unit}/task/deck/widthM`,
      lines: `${at.unit}/figures/beamLines`,
      ratio: 'data/precast-i/layout/overhangOverSpacing',
    }),
    compute: ({ width, lines, ratio }) => width / (lines - 1 + 2 * ratio),
  }),
  figure('overhangM', {
    label: 'overhang beyond the outer beam',
    unit: 'm',
    method: 'layout',
    formula: '(deck width - (lines - 1) x spacing) / 2',
    inputs: (at) => ({
      width: `${at.unit}/task/deck/widthM`,
      lines: `${at.unit}/figures/beamLines`,
      spacing: `${at.unit}/figures/spacingM`,
    }),
    compute: ({ width, lines, spacing }) => (width - (lines - 1) * spacing) / 2,
  }),
  ...splicedManual,
  ...precastManual('precast-i'),
];
