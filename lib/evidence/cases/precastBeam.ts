import type { SlabDesign } from '../../forms/common/slab/designSlab.ts';
import { beamMoments, noMoments } from '../../forms/common/precast/beamMoments.ts';
import type { BeamChoice } from '../../forms/common/precast/beamChoice.ts';
import { elementsPerSpan, precastModel } from '../../forms/common/precast/precastModel.ts';
import { sizeStrands } from '../../forms/common/precast/sizeStrands.ts';
import { catalogueBeam } from '../../forms/precast-i/beamShapes.ts';
import { iBeams } from '../../forms/precast-i/iBeams.ts';
import type { EvidenceCase } from '../caseInputs.ts';

const foot = 0.3048;
const inch = 0.0254;
const kip = 4.4482216;
const klf = kip / foot;
const kipFoot = kip * foot;

/**
 * Strands, moments and composite section of an inner beam of a deck laid out as published, not as the tool would: girder,
 * spacing, slab and fill are given. Inputs in feet and inches; superimposed load in klf a beam; no diaphragms within the
 * span. Moments at midspan in kip-feet.
 */
export const precastBeam: EvidenceCase = (inputs) => {
  const count = inputs.number('beams');
  const spacingM = inputs.number('spacingFt') * foot;
  const slabM = inputs.number('slabIn') * inch;
  const spansM = inputs.numbers('spansFt').map((span) => span * foot);
  const widthM = inputs.number('widthFt') * foot;
  const choice: BeamChoice = {
    layout: {
      count,
      spacingM,
      overhangM: (widthM - (count - 1) * spacingM) / 2,
      offsetsM: Array.from({ length: count }, (_, i) => (i - (count - 1) / 2) * spacingM),
    },
    shape: catalogueBeam(inputs.text('girder')),
    slab: levelSlab(slabM),
    haunchM: inputs.number('fillIn') * inch,
  };
  const task = {
    form: 'precast-i' as const,
    spansM,
    deck: {
      widthM,
      carriagewayM: inputs.number('roadwayFt') * foot,
      carriagewayOffsetM: 0,
      lanes: inputs.number('lanes'),
      footwayM: 0,
      surfacingM: 0.05,
      superimposedKNm: count * inputs.number('superimposedKlf') * klf,
    },
    standard: 'hl93' as const,
    planRadiusM: Infinity,
    method: 'crane' as const,
    depthM: choice.shape.depthM + choice.haunchM + slabM,
  };
  const model = { ...precastModel(iBeams, task, choice, Math.floor(count / 2) - 1), diaphragmKN: 0 };
  const { plan, use } = sizeStrands(model, 0);
  const moments = noMoments();
  beamMoments(model, 0, elementsPerSpan / 2, moments);
  return {
    strands: plan.count,
    relievedStrands: plan.relieved,
    momentFactor: model.traffic.vehicleFactor,
    shearFactor: model.traffic.vehicleFactor * model.traffic.shearRatio,
    ownKipFt: moments.own / kipFoot,
    slabKipFt: (moments.simple - moments.own) / kipFoot,
    superimposedKipFt: moments.superimposed / kipFoot,
    trafficKipFt: moments.trafficMax / kipFoot,
    designKipFt: moments.design / kipFoot,
    compositeInertiaIn4: model.composite.inertiaM4 / inch ** 4,
    soffitStressKsi: use.tension.demand / 6.894757,
    elasticKsi: (model.jackMPa - plan.stress.transferMPa) / 6.894757,
  };
};

/** A slab of one thickness; what bars it has does not matter here. */
function levelSlab(thicknessM: number): SlabDesign {
  return {
    midM: thicknessM,
    rootM: thicknessM,
    edgeM: thicknessM,
    meanM: thicknessM,
    mainBarsKgM2: 0,
    crossBarsKgM2: 0,
    spanMomentKNm: 0,
    rootMomentKNm: 0,
    checks: [],
  };
}
