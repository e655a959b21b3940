import { aashtoFactors, girderStiffnessM4, trafficEnvelope, trafficOnGirder } from '../../actions/index.ts';
import { lineBeam, uniform } from '../../mechanics/index.ts';
import type { EvidenceCase } from '../caseInputs.ts';

const foot = 0.3048;
const inch = 0.0254;
const kip = 4.4482216;

/** LM1 on one girder of two: axles of all lanes and uniform load. */
export const lm1OnGirder: EvidenceCase = (inputs) => {
  const girders = inputs.numbers('girdersM');
  const share = (girder: number) =>
    trafficOnGirder(
      'lm1',
      {
        widthM: inputs.number('widthM'),
        carriagewayM: inputs.number('carriagewayM'),
        carriagewayOffsetM: 0,
        lanes: 2,
        footwayM: 0,
        surfacingM: 0,
        superimposedKNm: 0,
      },
      girders,
      girder,
    );
  const near = share(girders.length - 1);
  return { axlesKN: 300 * near.vehicleFactor, uniformKNm: near.udlKNm };
};

/** AASHTO distribution factors of an inner girder, inputs in feet and inches. */
export const distributionFactors: EvidenceCase = (inputs) => {
  const kgM4 = girderStiffnessM4(
    inputs.number('modularRatio'),
    inputs.number('inertiaIn4') * inch ** 4,
    inputs.number('areaIn2') * inch ** 2,
    inputs.number('eccentricityIn') * inch,
  );
  const deck = {
    spacingM: inputs.number('spacingFt') * foot,
    spanM: inputs.number('spanFt') * foot,
    slabM: inputs.number('slabIn') * inch,
    kgM4,
    girders: inputs.number('girders'),
  };
  const square = aashtoFactors(deck);
  return {
    stiffnessIn4: kgM4 / inch ** 4,
    moment: square.moment,
    shear: square.shear,
    shearWithSkew: aashtoFactors({ ...deck, skewDeg: inputs.numberOr('skewDeg', 0) }).shear,
  };
};

/** Midspan moments of a simply supported girder: uniform loads in kip/ft, and HL-93 times a distribution factor. */
export const girderMoments: EvidenceCase = (inputs) => {
  const spanM = inputs.number('spanFt') * foot;
  const beam = lineBeam({ spansM: [spanM] });
  const middle = 10;
  const klf = kip / foot;
  const figures: Record<string, number> = {};
  for (const part of ['girder', 'slab', 'barrier', 'surfacing']) {
    const key = `${part}Klf`;
    if (inputs.has(key))
      figures[part] = uniform(beam, inputs.number(key) * klf).momentKNm[middle]! / (kip * foot);
  }
  const factor = inputs.number('factor');
  const base = {
    standard: 'hl93',
    footwayKNm: 0,
    shearRatio: 1,
    loadedLanes: 1,
    distribution: 'AASHTO factors',
  } as const;
  const at = (vehicleFactor: number, udlKNm: number): number =>
    trafficEnvelope(beam, { ...base, vehicleFactor, udlKNm }, { deflection: false }).momentMaxKNm[middle]! /
    (kip * foot);
  return { ...figures, truck: at(factor, 0), lane: at(0, factor * 0.64 * klf) };
};
