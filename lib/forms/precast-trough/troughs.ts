import type { BeamChoice } from '../common/precast/beamChoice.ts';
import type { CrossWalls } from '../common/precast/precastKind.ts';
import type { PrecastForm } from '../common/precast/sizePrecast.ts';
import { troughChoices } from './chooseTroughs.ts';
import { handlingChecks, openTroughM4 } from './handling.ts';
import { troughData } from './troughData.ts';
import { closedCell, troughTraffic } from './troughTraffic.ts';

/** Open troughs: what differs from other beams under a slab. */
export const troughs: PrecastForm = {
  form: 'precast-trough',
  relief: troughData.relief,
  diaphragm: troughData.diaphragm,
  spans: 'continuous',
  crossWalls,
  traffic: troughTraffic,
  choices: troughChoices,
  // Soffit inside and between troughs, overhangs and edges.
  formworkM2: ({ task, layout, shape, slab, lengthM }) =>
    lengthM * (Math.max(0, task.deck.widthM - layout.count * shape.topWidthM) + 2 * slab.edgeM),
  extraChecks: handlingChecks,
  extraFigures: (model) => ({
    openTorsionM4: openTroughM4(model),
    closedTorsionM4: closedCell(model.task, model, model.composite).constantM4,
  }),
};

/** Over a support the troughs are filled and the gaps between them closed, edges left out. */
function crossWalls({ layout, shape }: BeamChoice): CrossWalls {
  const widthM = (layout.count - 1) * layout.spacingM + shape.acrossM;
  return {
    supportM2: widthM * shape.depthM - layout.count * shape.areaM2,
    withinM2: 0,
    ofBeamM2: 0,
  };
}
