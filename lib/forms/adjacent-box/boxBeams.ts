import type { MeasuredLine, Shape } from '../../model/index.ts';
import { barKg } from '../common/bars.ts';
import { check } from '../common/checks.ts';
import { measured } from '../common/measured.ts';
import type { BeamChoice } from '../common/precast/beamChoice.ts';
import { slabData } from '../common/slab/slabData.ts';
import { structuralDepthM } from '../common/precast/precastDrawing.ts';
import type { CrossWalls } from '../common/precast/precastKind.ts';
import type { PrecastModel } from '../common/precast/precastModel.ts';
import type { PrecastForm } from '../common/precast/sizePrecast.ts';
import { adjacentData } from './adjacentData.ts';
import { voidM2 } from './boxBeam.ts';
import { boxTraffic } from './boxTraffic.ts';
import { boxChoices } from './chooseBoxes.ts';
import { shearKey } from './shearKey.ts';

/** Box beams side by side: what differs from other beams under a slab. */
export const boxBeams: PrecastForm = {
  form: 'adjacent-box',
  relief: adjacentData.relief,
  diaphragm: adjacentData.diaphragm,
  spans: 'linked',
  crossWalls,
  traffic: boxTraffic,
  choices: boxChoices,
  // The topping lies on the boxes: only its edges are formed.
  formworkM2: ({ slab, lengthM }) => 2 * lengthM * slab.edgeM,
  extraChecks: (model) => {
    const { shearKNm, mostKNm } = shearKey(model);
    return [check('shear-key', 'shear of wheels across a key', shearKNm, mostKNm, 'kN/m')];
  },
  extraLines,
  extraFigures: (model) => {
    const { shearKNm, tieKNm } = shearKey(model);
    return { keyShearKNm: shearKNm, tieKNm };
  },
  extraShapes: ties,
};

function crossWalls({ layout, shape }: BeamChoice): CrossWalls {
  return {
    supportM2: layout.count * layout.spacingM * shape.depthM,
    withinM2: 0,
    ofBeamM2: voidM2(shape),
    endBlockM: adjacentData.endBlockM.value,
  };
}

function extraLines(model: PrecastModel): MeasuredLine[] {
  const { layout, lengthM, task } = model;
  const { key } = adjacentData.box;
  const { tieKNm, strandM2PerM } = shearKey(model);
  const { link } = adjacentData;
  const { spansM } = task;
  const linkM = spansM
    .slice(1)
    .reduce((sum, spanM, i) => sum + link.lengthOverSpan * (spanM + spansM[i]!), 0);
  const recessM2 = key.upperM * key.upperRecessM + (key.lowerM - key.upperM) * key.lowerRecessM;
  const keyM2 = 2 * recessM2 + key.lowerM * adjacentData.layout.jointM;
  return [
    measured(
      'deck',
      'deck-concrete',
      (layout.count - 1) * keyM2 * lengthM,
      'grout in the keys',
      `${layout.count - 1} keys ${(key.lowerM * 1000).toFixed(0)} mm deep`,
    ),
    measured(
      'deck',
      'prestress',
      barKg(strandM2PerM * lengthM, task.deck.widthM),
      'ties across the beams',
      `${tieKNm.toFixed(0)} kN per m of joint`,
    ),
    measured(
      'deck',
      'reinforcement',
      slabData.lapAndDetail.value * barKg(link.ratio * model.slab.midM * task.deck.widthM, linkM),
      'bars of the topping over the piers',
      `${(100 * link.ratio).toFixed(1)} % of the topping where it links two spans`,
    ),
  ];
}

/** Tie through the beams, faint. */
function ties(model: PrecastModel): Shape[] {
  const half = model.task.deck.widthM / 2;
  const z = model.shape.depthM / 2 - structuralDepthM(model);
  return [
    {
      part: 'tie',
      material: 'strand',
      kind: 'line',
      points: [
        [-half, z],
        [half, z],
      ],
      thicknessM: 0.02,
      faint: true,
    },
  ];
}
