import { girderStiffnessM4, loadStandard, trafficOnGirder, type TrafficLoad } from '../../actions/index.ts';
import type { UnitTask } from '../../model/index.ts';
import type { BeamChoice } from '../common/precast/beamChoice.ts';
import type { CompositeBeam } from '../common/precast/compositeBeam.ts';
import { heaviestVehicleKN } from '../common/precast/heaviestVehicle.ts';
import type { BeamTraffic } from '../common/precast/precastKind.ts';

/** Traffic on the beam that carries most, or on beam `girder`; all beams are made like it. Open beams take no torsion. */
export function beamTraffic(
  task: UnitTask,
  { layout, shape, haunchM }: BeamChoice,
  composite: CompositeBeam,
  modularRatio: number,
  girder?: number,
): BeamTraffic {
  const armM = shape.depthM - shape.centroidM + haunchM + composite.slabM / 2;
  const spanM = Math.max(...task.spansM);
  const options = {
    spanM,
    slabM: composite.slabM,
    skewDeg: task.skewDeg ?? 0,
    kgM4: girderStiffnessM4(modularRatio, shape.inertiaM4, shape.areaM2, armM),
  };
  if (girder !== undefined)
    return { load: trafficOnGirder(task.standard, task.deck, layout.offsetsM, girder, options) };
  // On a symmetrical deck the outer beam and its neighbour tell all; the middle is never worse.
  const left = layout.offsetsM.slice(0, 2).map((_, i) => i);
  const lines = task.deck.carriagewayOffsetM === 0 ? left : [...left, layout.count - 2, layout.count - 1];
  const loads = [...new Set(lines)].map((i) =>
    trafficOnGirder(task.standard, task.deck, layout.offsetsM, i, options),
  );
  const perVehicle = (2 * heaviestVehicleKN(loadStandard(task.standard))) / spanM;
  const weigh = (load: TrafficLoad): number =>
    load.vehicleFactor * perVehicle + load.udlKNm + load.footwayKNm;
  return { load: loads.reduce((worst, next) => (weigh(next) > weigh(worst) ? next : worst)) };
}
