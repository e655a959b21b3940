import { concrete, materials, spreadBoxCorner } from '../../actions/index.ts';
import { bredt } from '../../mechanics/index.ts';
import type { UnitTask } from '../../model/index.ts';
import type { BeamChoice } from '../common/precast/beamChoice.ts';
import type { CompositeBeam } from '../common/precast/compositeBeam.ts';
import type { LinkedBeams } from '../common/precast/linkedBeams.ts';
import { linkedTraffic, type Cell } from '../common/precast/linkedTraffic.ts';
import type { BeamTraffic } from '../common/precast/precastKind.ts';
import { troughData } from './troughData.ts';
import { webAxisM } from './troughShape.ts';

/** Shear modulus over that of elasticity at a Poisson ratio of 0.2. */
const shearShare = 1 / 2.4;

/** Bredt cell of a trough once the slab closes it, and its torsion constant, m4; the slab by its modulus. */
export function closedCell(
  task: UnitTask,
  { shape, haunchM }: BeamChoice,
  { slabM, slabRatio }: CompositeBeam,
): Cell & { constantM4: number } {
  const { bottomWidthM, webM } = troughData.trough;
  const web = webM[task.standard];
  const topM = 2 * webAxisM(shape.depthM, task.standard);
  const lowM = bottomWidthM - web;
  const highM = shape.depthM + haunchM + (slabM - shape.bottomFlangeM) / 2;
  const sideM = Math.hypot(highM, (topM - lowM) / 2);
  const cellM2 = ((topM + lowM) / 2) * highM;
  const constantM4 = bredt(cellM2, [
    { lengthM: topM, thicknessM: slabM * slabRatio },
    { lengthM: lowM, thicknessM: shape.bottomFlangeM },
    { lengthM: 2 * sideM, thicknessM: web },
  ]);
  return { cellM2, aroundM: topM + lowM + 2 * sideM, constantM4 };
}

/** The deck as closed troughs linked by the slab between their webs. */
function linkedTroughs(task: UnitTask, choice: BeamChoice, composite: CompositeBeam): LinkedBeams {
  const { girder, slab } = materials.concreteDefaultMPa[task.standard];
  const eKNm2 = concrete(task.standard, girder).ecmMPa * 1e3;
  const slabKNm2 = concrete(task.standard, slab).ecmMPa * 1e3;
  const halfM = webAxisM(choice.shape.depthM, task.standard) + troughData.trough.webM[task.standard] / 2;
  return {
    offsetsM: choice.layout.offsetsM,
    spanM: Math.max(...task.spansM),
    bendingKNm2: eKNm2 * composite.inertiaM4,
    torsionKNm2: eKNm2 * shearShare * closedCell(task, choice, composite).constantM4,
    halfM,
    link: {
      lengthM: Math.max(0.1, choice.layout.spacingM - 2 * halfM),
      stiffnessKNm: (slabKNm2 * composite.slabM ** 3) / 12,
    },
  };
}

/** Traffic on the trough that carries most, or on trough `asked`, with the torque of the one twisted most. */
export function troughTraffic(
  task: UnitTask,
  choice: BeamChoice,
  composite: CompositeBeam,
  _ratio: number,
  asked?: number,
): BeamTraffic {
  const { cellM2, aroundM } = closedCell(task, choice, composite);
  const { spacingM } = choice.layout;
  const deck = { spanM: Math.max(...task.spansM), depthM: task.depthM, spacingM };
  const corner = spreadBoxCorner(deck, task.skewDeg ?? 0);
  return linkedTraffic(task, linkedTroughs(task, choice, composite), { cellM2, aroundM }, corner, asked);
}
