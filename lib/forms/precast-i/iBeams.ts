import type { CrossWalls } from '../common/precast/precastKind.ts';
import type { BeamChoice } from '../common/precast/beamChoice.ts';
import type { PrecastForm } from '../common/precast/sizePrecast.ts';
import { beamTraffic } from './beamTraffic.ts';
import { rankedChoices } from './chooseBeams.ts';
import { precastData } from './precastData.ts';

/** I and bulb-tee beams: what differs from other beams under a slab. */
export const iBeams: PrecastForm = {
  form: 'precast-i',
  relief: precastData.relief,
  diaphragm: precastData.diaphragm,
  spans: 'continuous',
  crossWalls,
  traffic: beamTraffic,
  choices: rankedChoices,
  // Soffit between top flanges, overhangs and edges.
  formworkM2: ({ task, layout, shape, slab, lengthM }) =>
    lengthM * (Math.max(0, task.deck.widthM - layout.count * shape.topWidthM) + 2 * slab.edgeM),
};

function crossWalls({ layout, shape, haunchM }: BeamChoice): CrossWalls {
  const { heightShare } = precastData.diaphragm;
  const one = layout.spacingM - shape.webM;
  const between = (layout.count - 1) * one;
  return {
    supportM2: between * (shape.depthM + haunchM),
    withinM2: heightShare * shape.depthM * between,
    ofBeamM2: heightShare * shape.depthM * one,
  };
}
