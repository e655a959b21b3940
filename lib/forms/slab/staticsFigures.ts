import type { Descriptor } from '../../model/index.ts';
import { formManual } from '../common/formManual.ts';

const { sized } = formManual('slab');
const moments = ['span*OwnKNm', 'span*TrafficKNm', 'pier*OwnKNm', 'pier*TrafficKNm'] as const;

/** Strips of the wheels, moments, and the steel of a slab bridge. */
export const slabStatics: readonly Descriptor[] = [
  sized(
    'vehicleWidthM',
    'width of slab that carries a vehicle in bending',
    'm',
    'moment of one vehicle on a beam / greatest moment per metre of the plate with its lanes; AASHTO: equivalent strip',
    'spans',
    './task/depthM',
    './task/deck/widthM',
    './task/deck/carriagewayM',
    'data/slab-deck/strip/endSpan',
    'data/slab-deck/strip/innerSpan',
  ),
  sized(
    'vehicleShearWidthM',
    'width of slab that carries a vehicle in shear',
    'm',
    'wheels of lanes beside each other, spread at 45 degrees; AASHTO: equivalent strip',
    './task/depthM',
    './task/deck/carriagewayM',
    'data/slab-deck/strip/shearSpread',
  ),
  sized(
    'heaviestUniformKNm2',
    'uniform load of the heaviest metre',
    'kN/m2',
    'others + (first lane - others) x its share of the plate; with the vehicle under AASHTO, then 0',
    'spans',
    './task/deck/widthM',
    './task/deck/carriagewayM',
  ),
  sized(
    'evenTrafficShare',
    'traffic shared evenly over that of the heaviest metre',
    '',
    'moment of all lanes / (moment of the heaviest metre x deck width)',
    'vehicleWidthM',
    'heaviestUniformKNm2',
    './task/deck/widthM',
  ),
  sized(
    'wheelsAcrossKNm',
    'moment of the wheels across the road, per metre',
    'kNm/m',
    'plate on two edges, moment along them under the wheels; 0 under AASHTO, where bars across are a share',
    'spans',
    './task/depthM',
    './task/deck/carriagewayM',
  ),
  ...(
    [
      ['span*OwnKNm', 'own-weight moment in span *'],
      ['pier*OwnKNm', 'own-weight moment at pier *'],
    ] as const
  ).map(([name, label]) => sized(name, label, 'kNm', 'continuous beam under the slab', 'spans', 'areaM2')),
  ...(
    [
      ['span*TrafficKNm', 'traffic moment in span *'],
      ['pier*TrafficKNm', 'traffic moment at pier *'],
    ] as const
  ).map(([name, label]) =>
    sized(
      name,
      label,
      'kNm',
      'moment of the heaviest metre, by influence line, x deck width',
      'spans',
      'vehicleWidthM',
      'heaviestUniformKNm2',
      './task/deck/widthM',
    ),
  ),
  sized(
    'pier*ParasiticKNm',
    'parasitic moment of the tendons at pier *',
    'kNm',
    'lasting force x moment of unit force on the continuous beam',
    'tendonForceKN',
    'eccentricityMidspanM',
    'spans',
  ),
  ...(
    [
      ['barsLowM2PerM', 'bars along in the soffit where they are most', 'm2/m'],
      ['barsHighM2PerM', 'bars along in the top where they are most', 'm2/m'],
      ['barsLowSizeM', 'size of the bars in the soffit', 'm'],
      ['barsHighSizeM', 'size of the bars in the top', 'm'],
    ] as const
  ).map(([name, label, unit]) =>
    sized(
      name,
      label,
      unit,
      'smallest size that holds the ultimate moment less what the tendons hold; without tendons stress and cracks in service too',
      ...moments,
      './task/depthM',
      'data/slab-deck/bars/coverM',
      'data/slab-deck/crack/widthMm',
    ),
  ),
  sized(
    'barsAcrossM2PerM',
    'bars across in the soffit',
    'm2/m',
    'greatest of wheels (or the share of the bars along), distribution and the least of a slab',
    'wheelsAcrossKNm',
    'barsLowM2PerM',
    './task/depthM',
    'data/slab/distributionShare',
    'data/slab/steelRatioLeast',
  ),
  sized(
    'shearAloneUse',
    'greatest shear over what the concrete carries without links',
    '',
    'largest ratio from an effective depth off the supports',
    'vehicleShearWidthM',
    ...moments,
    './task/depthM',
    'data/slab-deck/shear/crd',
  ),
  sized(
    'linkedM',
    'length of deck with links',
    'm',
    'where shear is more than the concrete alone carries',
    'shearAloneUse',
    'spans',
  ),
  sized(
    'bearingsPerPier',
    'bearings side by side on a pier',
    'no',
    'fewest at which the slab is not punched without links; at the closest spacing with them',
    'soffitWidthM',
    ...moments,
    'data/slab-deck/punching/usualM',
    'data/slab-deck/punching/closestM',
  ),
  sized(
    'tendonCount',
    'tendons side by side',
    'no',
    'at their usual spacing, or closer for more strands',
    'soffitWidthM',
    'strandCount',
    'data/slab-deck/tendons/usualM',
  ),
  sized(
    'strandCount',
    'strands where they are most',
    'no',
    'fewest with which the concrete stays within its limits in service and the bars that fit are enough',
    'tendonForceKN',
    'lastingStressMPa',
    'data/concrete-box/strandAreaMm2/:standard',
  ),
  sized(
    'meanStrandShare',
    'strands along the deck over those where they are most',
    '',
    'tendons stop where fewer will do',
    'spans',
    'data/concrete-box/staggering/leastShare',
  ),
  sized(
    'tendonForceKN',
    'lasting force of the tendons',
    'kN',
    'least force with which the concrete stays within its limits in service',
    ...moments,
    'eccentricityMidspanM',
    'eccentricityPierM',
  ),
  sized(
    'jackingStressMPa',
    'stress of the strand at the jack',
    'MPa',
    'limit of the standard',
    'data/concrete-box/jacking/:standard',
  ),
  sized(
    'lastingStressMPa',
    'stress of the strand after all losses, mean',
    'MPa',
    'jacking stress x exp(-(mu alpha + k x)), seating, and long-term losses',
    'jackingStressMPa',
    'spans',
    'data/concrete-box/losses/frictionPerRad',
    'data/concrete-box/losses/wobbleRadPerM',
    'data/concrete-box/losses/longTerm',
  ),
  ...(
    [
      ['eccentricityMidspanM', 'greatest eccentricity of the tendons below the centroid'],
      ['eccentricityPierM', 'greatest eccentricity of the tendons above the centroid'],
    ] as const
  ).map(([name, label]) =>
    sized(
      name,
      label,
      'm',
      'share of the distance between the ducts at the face and the centroid that needs the least force',
      'centroidFromTopM',
      './task/depthM',
      'data/concrete-box/ductCoverM',
    ),
  ),
];
