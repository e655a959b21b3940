import { trafficOnDeck, trafficOnInfluence, type TrafficLoad } from '../../actions/index.ts';
import { loadTrack, type Track } from '../../mechanics/index.ts';
import type { WallLoad } from '../../model/index.ts';
import { wheelStrips, type WheelStrips } from '../slab/wheelStrips.ts';
import type { FrameModel, FrameOnFeet } from './frameModel.ts';
import { slabDeckData } from '../slab/slabDeckData.ts';
import { portalData } from './portalData.ts';

/** Greatest and least effects of traffic: moments at the nodes, shears in the members. */
export interface TrafficRange {
  readonly momentMaxKNm: Float64Array;
  readonly momentMinKNm: Float64Array;
  readonly shearMaxKN: Float64Array;
  readonly shearMinKN: Float64Array;
}

/** Loads of all lanes on the feet: one span full with the vehicles in its middle, all full with the vehicles over a wall. */
interface LanesOnFeet {
  readonly inSpan: readonly (readonly WallLoad[])[];
  readonly overWall: readonly (readonly WallLoad[])[];
}

/** Traffic on a frame. Moments and shears are those of its heaviest metre times the width of the deck. */
export interface FrameTraffic {
  readonly strips: WheelStrips;
  readonly load: TrafficLoad;
  /** One for each kind of feet: vehicles and uniform load apart, so that combinations may take shares of them. */
  readonly cases: readonly { readonly vehicle: TrafficRange; readonly uniform: TrafficRange }[];
  /** Of all lanes, on stiff or on soft feet, at the middle of each span, whole stiffness, m. */
  readonly deflectionsM: readonly number[];
  /** What all lanes put on the feet, on stiff and on soft ones. */
  readonly feet: readonly LanesOnFeet[];
  /** The shares of that which stand beside braking. */
  readonly feetBraking: readonly LanesOnFeet[];
}

/** Places the traffic of the standard on the influence lines of the frame. */
export function frameTraffic(model: FrameModel): FrameTraffic {
  const { task, standard, shape, deckXM } = model;
  const { deck } = task;
  const load = trafficOnDeck(task.standard, deck);
  const between = standard.distributionFactors ? shape.spanM : slabDeckData.strip.innerSpan * shape.spanM;
  const strips = wheelStrips(task.standard, deck, between, shape.midspanM);
  // Under AASHTO the lane load goes with its vehicle.
  const laneKNm = standard.distributionFactors ? load.udlKNm / load.vehicleFactor : 0;
  const evenKNm = (laneKNm > 0 ? 0 : load.udlKNm) + load.footwayKNm;
  const track = loadTrack(deckXM);
  const bending = Math.max(load.vehicleFactor, deck.widthM / strips.vehicleWidthM);
  const shearing = Math.max(load.vehicleFactor, deck.widthM / strips.shearWidthM);
  const uniformKNm = Math.max(evenKNm, deck.widthM * strips.uniformKNm2);
  const vehicle: TrafficLoad = { ...load, vehicleFactor: 1, udlKNm: laneKNm, footwayKNm: 0 };
  const uniform: TrafficLoad = { ...load, vehicleFactor: 0, udlKNm: 1, footwayKNm: 0 };
  const { vehicleWithBraking, uniformWithBraking } = portalData.factors[task.standard];
  const braking: TrafficLoad = {
    ...load,
    vehicleFactor: vehicleWithBraking * load.vehicleFactor,
    udlKNm: uniformWithBraking * load.udlKNm,
    footwayKNm: uniformWithBraking * load.footwayKNm,
  };
  return {
    strips,
    load,
    cases: model.cases.map((one) => ({
      vehicle: rangeOf(one, track, vehicle, bending, shearing),
      uniform: rangeOf(one, track, uniform, uniformKNm, uniformKNm),
    })),
    deflectionsM: shape.middles.map((_, span) => deflection(model, track, load, span)),
    feet: model.cases.map((one) => onFeet(model, one, load)),
    feetBraking: model.cases.map((one) => onFeet(model, one, braking)),
  };
}

function rangeOf(
  { unit }: FrameOnFeet,
  track: Track,
  load: TrafficLoad,
  bending: number,
  shearing: number,
): TrafficRange {
  const nodes = unit[0]!.momentKNm.length;
  const out = {
    momentMaxKNm: new Float64Array(nodes),
    momentMinKNm: new Float64Array(nodes),
    shearMaxKN: new Float64Array(nodes - 1),
    shearMinKN: new Float64Array(nodes - 1),
  };
  const line = new Float64Array(unit.length);
  for (let i = 0; i < nodes; i++) {
    for (let k = 0; k < unit.length; k++) line[k] = unit[k]!.momentKNm[i]!;
    const { max, min } = trafficOnInfluence(load, track, line);
    out.momentMaxKNm[i] = bending * max;
    out.momentMinKNm[i] = bending * min;
  }
  for (let e = 0; e < nodes - 1; e++) {
    // Along a wall the shear of a vertical load does not change.
    if (e > 0 && e < nodes - 2 && sameAll(unit, e)) {
      out.shearMaxKN[e] = out.shearMaxKN[e - 1]!;
      out.shearMinKN[e] = out.shearMinKN[e - 1]!;
      continue;
    }
    for (let k = 0; k < unit.length; k++) line[k] = unit[k]!.shearKN[e]!;
    const { max, min } = trafficOnInfluence(load, track, line);
    out.shearMaxKN[e] = shearing * max;
    out.shearMinKN[e] = shearing * min;
  }
  return out;
}

const sameAll = (unit: FrameOnFeet['unit'], e: number): boolean =>
  unit.every(({ shearKN }) => Math.abs(shearKN[e]! - shearKN[e - 1]!) < 1e-9);

function deflection({ cases, standard }: FrameModel, track: Track, load: TrafficLoad, span: number): number {
  return Math.max(
    ...cases.flatMap(({ unit }) => {
      const line = Float64Array.from(unit, ({ middlesM }) => middlesM[span]!);
      return standard.deflection.combinations.map(
        ({ vehicle, uniform }) =>
          trafficOnInfluence(
            {
              ...load,
              vehicleFactor: load.vehicleFactor * vehicle,
              udlKNm: load.udlKNm * uniform,
              footwayKNm: load.footwayKNm * uniform,
            },
            track,
            line,
          ).max,
      );
    }),
  );
}

/** Loads on the feet with one span full and the vehicles in its middle, or the whole deck full and they over a wall. */
function onFeet(
  { standard, deckXM, deckNodes, shape }: FrameModel,
  { unit }: FrameOnFeet,
  load: TrafficLoad,
): LanesOnFeet {
  const heaviest = Math.max(
    ...standard.vehicles.map(({ axles }) => axles.reduce((sum, { loadKN }) => sum + loadKN, 0)),
  );
  const vehiclesKN = load.vehicleFactor * heaviest * (1 + standard.dynamicAllowance);
  const evenKNm = load.udlKNm + load.footwayKNm;
  const knees = shape.walls.map(({ knee }) => knee - deckNodes[0]!);
  const sum = (at: number, from: number, to: number): WallLoad[] =>
    shape.walls.map((_, wall) => {
      let verticalKN = 0;
      let alongKN = 0;
      let momentKNm = 0;
      for (let k = from; k <= to; k++) {
        const left = k > from ? deckXM[k]! - deckXM[k - 1]! : 0;
        const right = k < to ? deckXM[k + 1]! - deckXM[k]! : 0;
        const kN = (evenKNm * (left + right)) / 2 + (k === at ? vehiclesKN : 0);
        const foot = unit[k]!.feet[wall]!;
        verticalKN += kN * foot.verticalKN;
        alongKN += kN * foot.alongKN;
        momentKNm += kN * foot.momentKNm;
      }
      return { verticalKN, alongKN, momentKNm };
    });
  return {
    inSpan: shape.middles.map((node, span) => sum(node - deckNodes[0]!, knees[span]!, knees[span + 1]!)),
    overWall: knees.map((knee) => sum(knee, 0, unit.length - 1)),
  };
}
