import type { SlabDesign } from '../../../lib/forms/common/slab/designSlab.ts';
import { catalogueBeam } from '../../../lib/forms/precast-i/beamShapes.ts';
import type { BeamChoice } from '../../../lib/forms/common/precast/beamChoice.ts';
import type { UnitTask } from '../../../lib/model/index.ts';

export const foot = 0.3048;
export const inch = 0.0254;
/** kN per kip, kNm per kip-foot, kN/m per kip per foot, MPa per ksi. */
export const kip = 4.4482216;
export const kipFoot = kip * foot;
export const klf = kip / foot;
export const ksi = 6.894757;

function slabOf(thicknessM: number): SlabDesign {
  return {
    midM: thicknessM,
    rootM: thicknessM,
    edgeM: thicknessM,
    meanM: thicknessM,
    mainBarsKgM2: 20,
    crossBarsKgM2: 10,
    spanMomentKNm: 0,
    rootMomentKNm: 0,
    checks: [],
  };
}

function choiceOf(
  name: string,
  count: number,
  spacingFt: number,
  overhangFt: number,
  slabIn: number,
  haunchIn: number,
): BeamChoice {
  return {
    layout: {
      count,
      spacingM: spacingFt * foot,
      overhangM: overhangFt * foot,
      offsetsM: Array.from({ length: count }, (_, i) => (i - (count - 1) / 2) * spacingFt * foot),
    },
    shape: catalogueBeam(name),
    slab: slabOf(slabIn * inch),
    haunchM: haunchIn * inch,
  };
}

function taskOf(
  spansFt: readonly number[],
  widthFt: number,
  roadwayFt: number,
  lanes: number,
  superimposedKlf: number,
  girders: number,
): UnitTask {
  return {
    form: 'precast-i',
    spansM: spansFt.map((span) => span * foot),
    deck: {
      widthM: widthFt * foot,
      carriagewayM: roadwayFt * foot,
      carriagewayOffsetM: 0,
      lanes,
      footwayM: 0,
      surfacingM: 0.05,
      superimposedKNm: superimposedKlf * klf,
    },
    standard: 'hl93',
    planRadiusM: Infinity,
    method: 'crane',
    depthM: 2.1,
    girders,
  };
}

/**
 * PCI Bridge Design Manual, example 9.1a (from memory): BT-72, simple span 120 ft, six beams at 9 ft, slab 8 in (7.5 in
 * structural), fill 0.5 in, barrier 0.100 and surfacing 0.200 klf a beam.
 */
export const pci = {
  task: taskOf([120], 51, 48, 4, 6 * 0.3, 6),
  choice: choiceOf('BT-72', 6, 9, 3, 8, 0.5),
};

/**
 * FHWA comprehensive design example NHI-04-043 (geometry read, results from memory): two spans of 110 ft, six AASHTO VI
 * at 9 ft 8 in, slab 8 in, parapets 2 x 0.649 and surfacing 0.030 x 52 klf.
 */
export const fhwa = {
  task: taskOf([110, 110], 55.375, 52, 4, 2 * 0.649 + 0.03 * 52, 6),
  choice: choiceOf('AASHTO VI', 6, 9 + 8 / 12, 3.52, 8, 0),
};
