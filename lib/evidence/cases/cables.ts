import {
  ernstModulus,
  mainCableVolumeM3,
  parabolicCable,
  stayVolumeFan,
  stayVolumeHarp,
} from '../../mechanics/index.ts';
import type { EvidenceCase } from '../caseInputs.ts';

/** A parabolic cable of unit span and load, or of those given. */
export const parabola: EvidenceCase = (inputs) => {
  const spanM = inputs.numberOr('spanM', 1);
  const sagM = spanM * inputs.number('sagRatio');
  const wKNm = inputs.numberOr('wKNm', 1);
  const cable = parabolicCable({ spanM, sagM, wKNm });
  return {
    thrust: cable.hKN,
    thrustOverWl: cable.hKN / (wKNm * spanM),
    tension: cable.tMaxKN,
    tensionOverThrust: cable.tMaxKN / cable.hKN,
    length: cable.lengthM,
    lengthOverSpan: cable.lengthM / spanM,
    volumeM3: mainCableVolumeM3({ spanM, sagM, wKNm, stressMPa: inputs.numberOr('stressMPa', 700) }),
  };
};

/** Ernst modulus in GPa, tangent or secant. */
export const stayModulus: EvidenceCase = (inputs) => ({
  modulusGPa:
    ernstModulus({
      eMPa: 1000 * inputs.number('eGPa'),
      horizontalM: inputs.number('horizontalM'),
      stressMPa: inputs.number('stressMPa'),
      ...(inputs.has('toStressMPa') ? { toStressMPa: inputs.number('toStressMPa') } : {}),
      unitWeightKNm3: inputs.number('unitWeightKNm3'),
    }) / 1000,
});

/** Volumes of fan and harp; with unit inputs the coefficient of w a2 / s. */
export const stayVolumes: EvidenceCase = (inputs) => {
  const reachM = inputs.numberOr('reachM', 1);
  const fan = {
    reachM,
    heightM: reachM * inputs.number('heightRatio'),
    wKNm: inputs.numberOr('wKNm', 1),
    // 0.001 MPa is 1 kN/m2: with unit load and reach the volume is then the coefficient itself.
    stressMPa: inputs.numberOr('stressMPa', 0.001),
  };
  return { fan: stayVolumeFan(fan), harp: stayVolumeHarp(fan) };
};
