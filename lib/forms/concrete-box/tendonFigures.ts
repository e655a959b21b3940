import type { Descriptor } from '../../model/index.ts';
import { formManual } from '../common/formManual.ts';

const { sized } = formManual('concrete-box');

/** Tendons of a concrete box and the moments they answer. */
export const tendonFigures: readonly Descriptor[] = [
  sized('tendonCount', 'draped tendons', 'no', 'webs x tendons of one web', 'webs', 'strandCount'),
  sized(
    'strandsPerTendon',
    'strands of one tendon',
    'no',
    'strands of one web / tendons of one web',
    'strandCount',
    'tendonCount',
  ),
  sized(
    'strandCount',
    'strands where they are most',
    'no',
    'fewest with which service, bending and compression hold',
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
    'lasting force of the draped tendons',
    'kN',
    'least force with which the concrete stays within its limits in service and the section holds at ultimate',
    'span*OwnKNm',
    'span*TrafficKNm',
    'pier*OwnKNm',
    'pier*TrafficKNm',
    'eccentricityMidspanM',
    'eccentricityPierM',
  ),
  sized(
    'launchingForceKN',
    'force of the centred tendons for launching',
    'kN',
    'tension of the concrete while launching within its limit; 0 where it is not launched',
    'spans',
    'data/concrete-box/launching/tensionMPa',
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
  sized(
    'eccentricityMidspanM',
    'greatest eccentricity of the tendons below the centroid',
    'm',
    'distance of the lowest ducts from the centroid',
    'centroidFromTopM',
    './task/depthM',
    'data/concrete-box/ductCoverM',
  ),
  sized(
    'eccentricityPierM',
    'greatest eccentricity of the tendons above the centroid',
    'm',
    'distance of the highest ducts from the centroid, negative upwards',
    'centroidFromTopM',
    './task/depthM',
    'data/concrete-box/ductCoverM',
  ),
  ...(
    [
      ['span*OwnKNm', 'own-weight moment in span *'],
      ['pier*OwnKNm', 'own-weight moment at pier *'],
    ] as const
  ).map(([name, label]) =>
    sized(
      name,
      label,
      'kNm',
      'continuous beam under the box and its diaphragms',
      'spans',
      'areaM2',
      'pierAreaM2',
    ),
  ),
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
      'area of the influence line x lane load + vehicles at their worst place, whole deck',
      'spans',
      './task/deck/carriagewayM',
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
  sized(
    'launchingHogKNm',
    'greatest hogging while launching',
    'kNm',
    'cantilever with its nose just before it lands',
    'spans',
    'areaM2',
    'data/concrete-box/launching/noseOverSpan',
  ),
  sized(
    'launchingSagKNm',
    'greatest sagging while launching',
    'kNm',
    'greatest of all stages',
    'spans',
    'areaM2',
    'data/concrete-box/launching/noseOverSpan',
  ),
];
