import { closeBeamCorner, concrete, materials } from '../../actions/index.ts';
import { bredt } from '../../mechanics/index.ts';
import type { UnitTask } from '../../model/index.ts';
import type { BeamChoice } from '../common/precast/beamChoice.ts';
import type { CompositeBeam } from '../common/precast/compositeBeam.ts';
import type { LinkedBeams } from '../common/precast/linkedBeams.ts';
import { linkedTraffic, type Cell } from '../common/precast/linkedTraffic.ts';
import type { BeamTraffic } from '../common/precast/precastKind.ts';
import { adjacentData } from './adjacentData.ts';

/** Shear modulus over that of elasticity at a Poisson ratio of 0.2. */
const shearShare = 1 / 2.4;

/** Bredt cell of a box with its topping on the top slab, and its torsion constant, m4. */
function boxCell(task: UnitTask, { shape }: BeamChoice, slabM: number): Cell & { constantM4: number } {
  const { topM, bottomM, webM } = adjacentData.box[task.standard];
  const wideM = shape.acrossM - webM;
  const top = topM + slabM;
  const highM = shape.depthM + slabM - (top + bottomM) / 2;
  const cellM2 = wideM * highM;
  const constantM4 = bredt(cellM2, [
    { lengthM: wideM, thicknessM: top },
    { lengthM: wideM, thicknessM: bottomM },
    { lengthM: 2 * highM, thicknessM: webM },
  ]);
  return { cellM2, aroundM: 2 * (wideM + highM), constantM4 };
}

/** The deck as beams hinged in their keys: the grout carries shear, no moment across is counted on. */
function hingedBoxes(task: UnitTask, choice: BeamChoice, composite: CompositeBeam): LinkedBeams {
  const { ecmMPa } = concrete(task.standard, materials.concreteDefaultMPa[task.standard].girder);
  return {
    offsetsM: choice.layout.offsetsM,
    spanM: Math.max(...task.spansM),
    bendingKNm2: ecmMPa * 1e3 * composite.inertiaM4,
    torsionKNm2: ecmMPa * 1e3 * shearShare * boxCell(task, choice, composite.slabM).constantM4,
    halfM: choice.layout.spacingM / 2,
    link: 'hinge',
  };
}

/** Traffic on the box that carries most, or on box `asked`, with the torque of the box twisted most. */
export function boxTraffic(
  task: UnitTask,
  choice: BeamChoice,
  composite: CompositeBeam,
  _ratio: number,
  asked?: number,
): BeamTraffic {
  const { cellM2, aroundM } = boxCell(task, choice, composite.slabM);
  const deck = { spanM: Math.max(...task.spansM), depthM: task.depthM };
  const corner = closeBeamCorner(deck, task.skewDeg ?? 0);
  return linkedTraffic(task, hingedBoxes(task, choice, composite), { cellM2, aroundM }, corner, asked);
}
