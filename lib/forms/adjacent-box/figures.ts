import type { Descriptor } from '../../model/index.ts';
import { formManual } from '../common/formManual.ts';
import { precastManual } from '../common/precast/precastManual.ts';
import { torsionFigures } from '../common/precast/torsionFigures.ts';

const { figure, sized, check } = formManual('adjacent-box');

/** Adjacent boxes: layout, keys and ties, then what all beams under a slab have. */
export const adjacentFigures: readonly Descriptor[] = [
  sized(
    'beamLines',
    'lines of beams',
    'no',
    'cheapest number of beams whose width lies within practice that holds',
    './task/deck/widthM',
    'spans',
    'data/adjacent-box/layout/leastWidthM',
    'data/adjacent-box/layout/mostWidthM/:standard',
    'data/pretensioned/proxy/strandKgPerM3',
  ),
  figure('spacingM', {
    label: 'width of a beam with its joint',
    unit: 'm',
    method: 'layout',
    formula: 'deck width / lines',
    inputs: (at) => ({ width: `${at.unit}/task/deck/widthM`, lines: `${at.unit}/figures/beamLines` }),
    compute: ({ width, lines }) => width / lines,
  }),
  figure('overhangM', {
    label: 'overhang beyond the outer beam',
    unit: 'm',
    method: 'layout',
    formula: 'none: the beams fill the deck',
    inputs: () => ({}),
    compute: () => 0,
  }),
  figure('fillM', {
    label: 'fill between beam and topping',
    unit: 'm',
    method: 'layout',
    formula: 'none: the topping lies on the beams',
    inputs: () => ({}),
    compute: () => 0,
  }),
  figure('slabM', {
    label: 'topping',
    unit: 'm',
    method: 'figure of practice',
    formula: 'taken as it is',
    inputs: (at) => ({ topping: `data/adjacent-box/topping/${at.design.task.standard}` }),
    compute: ({ topping }) => topping,
  }),
  sized(
    'keyShearKNm',
    'design shear across a key beside the heaviest axles',
    'kN/m',
    'half of each wheel over its patch and the width of a beam',
    'spacingM',
    'brief/loading',
  ),
  sized(
    'tieKNm',
    'tie across the beams',
    'kN/m',
    '(shear - cohesion of the grout) / friction, at least the usual tie',
    'keyShearKNm',
    'data/adjacent-box/key/friction',
    'data/adjacent-box/key/leastTieKNm',
  ),
  ...check(
    'shear-key',
    ['half of each wheel over its patch and the width of a beam', 'keyShearKNm'],
    ['cohesion x depth of the key + friction x greatest tie', 'data/adjacent-box/key/mostTieMPa'],
    'EN 1992-1-1 6.2.5 (from memory)',
  ),
  ...check(
    'top-slab',
    ['thickness that wheels ask for between the webs', 'spacingM'],
    ['top slab of the beam and topping', 'slabM'],
  ),
  ...torsionFigures('adjacent-box'),
  ...precastManual('adjacent-box'),
];
