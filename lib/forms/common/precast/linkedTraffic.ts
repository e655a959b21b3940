import {
  atObtuseCorner,
  crossValue,
  leverRule,
  loadStandard,
  trafficOnCrossLine,
  type CrossLine,
  type TrafficLoad,
} from '../../../actions/index.ts';
import type { UnitTask } from '../../../model/index.ts';
import { heaviestVehicleKN } from './heaviestVehicle.ts';
import { beamShares, type LinkedBeams } from './linkedBeams.ts';
import type { BeamTraffic } from './precastKind.ts';

/** The closed cell of one beam: area within the middle lines of its walls and their length. */
export interface Cell {
  readonly cellM2: number;
  readonly aroundM: number;
}

/**
 * Traffic on the beam of a linked deck that carries most, or on beam `asked`. Moments by the shares of the linked beams;
 * shears by the lever rule where that is more (close to a support a wheel has no length over which to spread); torque from
 * the beam that is twisted most, so that all beams can be made alike.
 */
export function linkedTraffic(
  task: UnitTask,
  beams: LinkedBeams,
  cell: Cell,
  corner: number,
  asked?: number,
): BeamTraffic {
  const { standard, deck } = task;
  const n = beams.offsetsM.length;
  const half = deck.carriagewayOffsetM === 0 ? Math.ceil(n / 2) : n;
  const wanted = asked === undefined ? Array.from({ length: half }, (_, i) => i) : [asked];
  const shares = beamShares(beams, wanted);
  const weighKNm = (2 * heaviestVehicleKN(loadStandard(standard))) / beams.spanM;
  const weigh = ({ vehicleFactor, udlKNm, footwayKNm }: TrafficLoad): number =>
    vehicleFactor * weighKNm + udlKNm + footwayKNm;
  // The lines of neighbours differ little: only those that peak highest are loaded.
  const highest = Math.max(...shares.map(({ bending }) => peakOnRoad(task, bending)));
  const loads = shares.flatMap(({ bending }, k) =>
    peakOnRoad(task, bending) < 0.9 * highest
      ? []
      : [{ beam: wanted[k]!, load: trafficOnCrossLine(standard, deck, bending, weighKNm) }],
  );
  const { beam, load } = loads.reduce((most, next) => (weigh(next.load) > weigh(most.load) ? next : most));
  const twisting = Math.max(...shares.map(({ torsion }) => swing(torsion)));
  const torques = shares
    .filter(({ torsion }) => swing(torsion) === twisting)
    .flatMap(({ torsion }) =>
      [1, -1].map((sign) =>
        trafficOnCrossLine(
          standard,
          deck,
          { ...torsion, value: torsion.value.map((value) => sign * value) },
          weighKNm,
        ),
      ),
    );
  const lever =
    n > 1 ? trafficOnCrossLine(standard, deck, leverRule(beams.offsetsM, beam), weighKNm).vehicleFactor : 0;
  return {
    load: atObtuseCorner(
      { ...load, shearRatio: Math.max(1, lever / load.vehicleFactor), distribution: 'linked beams' },
      corner,
    ),
    torsion: { armM: Math.max(...torques.map(weigh)) / weigh(load), ...cell },
  };
}

/** Highest point of a line between the kerbs. */
function peakOnRoad({ deck }: UnitTask, line: CrossLine): number {
  const left = deck.carriagewayOffsetM - deck.carriagewayM / 2;
  const right = left + deck.carriagewayM;
  return Math.max(
    crossValue(line, left),
    crossValue(line, right),
    ...line.value.filter((_, i) => line.yM[i]! > left && line.yM[i]! < right),
  );
}

const swing = ({ value }: CrossLine): number => Math.max(...value) - Math.min(...value);
