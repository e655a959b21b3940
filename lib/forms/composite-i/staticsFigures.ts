import type { Descriptor } from '../../model/index.ts';
import { formManual } from '../common/formManual.ts';

const { figure, sized } = formManual('composite-i');

/** Moments and shears of one composite girder. */
export const staticsFigures: readonly Descriptor[] = [
  figure('sagDesignKNm', {
    label: 'greatest design moment in the spans, one girder',
    unit: 'kNm',
    method: 'greatest of the spans',
    formula: 'greatest of the spans',
    inputs: (at) => ({
      spans: at.design.task.spansM.map((_, i) => `${at.unit}/figures/span${i + 1}SagDesignKNm`),
    }),
    compute: ({ spans }) => Math.max(...spans),
  }),
  sized(
    'span*SagDesignKNm',
    'design moment in span *, one girder',
    'kNm',
    'continuous beam built in stages: gamma G (steel and wet slab, on the steel) + gamma G superimposed + gamma Q traffic',
    'spans',
    'slabMeanM',
    './task/deck/superimposedKNm',
    'laneVehicles',
    'trafficUniformKNm',
  ),
  sized(
    'pier*HogDesignKNm',
    'design moment at pier *, one girder',
    'kNm',
    'gamma G permanent + shrinkage + gamma Q traffic',
    'pier#PermanentKNm',
    'pier#TrafficKNm',
  ),
  sized(
    'pier*ShearDesignKN',
    'design shear beside pier *, one girder',
    'kN',
    'gamma G permanent + gamma Q traffic, the greater side; traffic of a skew deck at its obtuse corner',
    './task/skewDeg?',
    'spans',
    'slabMeanM',
    './task/deck/superimposedKNm',
    'laneVehicles',
    'trafficUniformKNm',
  ),
  sized(
    'pier*PermanentKNm',
    'permanent moment at pier *, one girder, characteristic',
    'kNm',
    'continuous beam built in stages: steel and wet slab on the steel girder, superimposed on the composite one',
    'spans',
    'slabMeanM',
    './task/deck/superimposedKNm',
    'plateKgM2',
  ),
  sized(
    'pier*TrafficKNm',
    'traffic moment at pier *, one girder, characteristic',
    'kNm',
    'area of the influence line x uniform load + vehicles at their worst place',
    'spans',
    'laneVehicles',
    'trafficUniformKNm',
  ),
];
