import type { Descriptor, FormId } from '../../../model/index.ts';
import { formManual } from '../formManual.ts';

/** Moments, shears and strands of the spans and bars over the piers of one precast beam. */
export function staticsFigures(form: FormId): Descriptor[] {
  const { figure, sized } = formManual(form);
  return [
    figure(/^span\d+DesignKNm$/u, {
      label: (at) =>
        `design moment at the middle of ${at.name('figure').replace(/^span(\d+).*$/u, 'span $1')}`,
      unit: 'kNm',
      method: 'combination',
      formula: 'gamma G own weight and slab + gamma superimposed + gamma Q traffic',
      inputs: (at) => {
        const start = `${at.unit}/figures/${at.name('figure').replace('DesignKNm', '')}`;
        const { standard } = at.design.task;
        return {
          simple: `${start}SimpleKNm`,
          superimposed: `${start}SuperimposedKNm`,
          traffic: `${start}TrafficKNm`,
          permanentFactor: `data/${standard}/factors/uls/permanent`,
          superimposedFactor: `data/${standard}/factors/uls/superimposed`,
          trafficFactor: `data/${standard}/factors/uls/traffic`,
        };
      },
      compute: (v) =>
        v.permanentFactor * v.simple + v.superimposedFactor * v.superimposed + v.trafficFactor * v.traffic,
    }),
    sized(
      'span*SimpleKNm',
      'own weight, slab and diaphragms at the middle of span *, the span by itself',
      'kNm',
      'w L2 / 8 and point loads of the diaphragms',
      'spans',
      'ownKNm',
      'wetKNm',
    ),
    sized(
      'span*SuperimposedKNm',
      'superimposed load at the middle of span *, the span by itself',
      'kNm',
      'w L2 / 8',
      'spans',
      'superimposedKNm',
    ),
    sized(
      'span*TrafficKNm',
      'traffic at the middle of span *, the span by itself',
      'kNm',
      'axles and lane load of the beam at their worst place',
      'spans',
      'laneVehicles',
      'trafficUniformKNm',
    ),
    sized(
      'span*ShearDesignKN',
      'greatest design shear of a beam in span *',
      'kN',
      'own weight on the span by itself, the rest on it or on the continuous beam, less what draped strands carry; traffic of a skew deck at its obtuse corner',
      './task/skewDeg?',
      'spans',
      'laneVehicles',
      'span#Strands*',
    ),
    sized(
      'span*Strands',
      'strands of a beam in span *',
      'no',
      'fewest pairs that hold in service after losses and at ultimate',
      'span#SimpleKNm',
      'span#SuperimposedKNm',
      'span#TrafficKNm',
      'beamHeightM',
      'data/pretensioned/service/tensionMPa/:standard',
    ),
    sized(
      'span*RelievedStrands',
      'strands debonded or draped at the ends in span *',
      'no',
      'fewest that the ends can stand at release',
      'span#Strands',
      'data/pretensioned/relief/debonded/mostShare',
    ),
    sized(
      'span*TopStrands',
      'strands in the top flange in span *',
      'no',
      'fewest pairs that hold the top of the beam at release',
      'span#Strands',
      'data/pretensioned/strand/mostTop',
    ),
    sized(
      'span*StrandHeightM',
      'centroid of the strands above the soffit in span *',
      'm',
      'rows of the strand grid filled from the bottom',
      'span#Strands',
      'data/pretensioned/strand/pitchM/:standard',
      'data/pretensioned/strand/axisM/:standard',
    ),
    sized(
      'span*LossesMPa',
      'losses of the strands in span *',
      'MPa',
      'elastic shortening, shrinkage, creep and relaxation at midspan',
      'span#Strands',
      'ownKNm',
      'data/pretensioned/strand/jacking/:standard',
    ),
    sized(
      'pier*HogDesignKNm',
      'design moment of a beam over pier *',
      'kNm',
      'superimposed load and traffic on the continuous beam',
      'spans',
      'superimposedKNm',
      'laneVehicles',
      'trafficUniformKNm',
    ),
    sized(
      'pier*BarsM2',
      'bars in the slab over pier *, of one beam',
      'm2',
      'M / (z fyd) at ultimate or M / (z sigma) in service, whichever is more',
      'pier#HogDesignKNm',
      'data/pretensioned/continuity/barAxisM',
      'data/slab/serviceStressMPa/:standard',
    ),
  ];
}
