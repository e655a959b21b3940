import { trafficOnDeck, trafficEnvelope, type TrafficLoad } from '../../actions/index.ts';
import {
  beamTrack,
  lineBeam,
  momentLine,
  reversed,
  runGroup,
  shearLine,
  type AxleGroup,
  type LineBeam,
} from '../../mechanics/index.ts';
import type { CaseInputs, EvidenceCase } from '../caseInputs.ts';

const foot = 0.3048;
const kip = 4.4482216;

/** Fine stations, so that the section under the greatest moment is met to a two-hundredth of the half span. */
const stations = 400;

/** A train of axles on a simple span in the units given: greatest moment anywhere, greatest end shear. */
export const axlesOnSimpleSpan: EvidenceCase = (inputs) => {
  const beam = lineBeam({ spansM: [inputs.number('span')], stationsPerSpan: stations });
  const train = axleTrain(inputs);
  return greatest(beam, [train, reversed(train)]);
};

/**
 * Highway trucks of the older American standard: the larger of truck and lane load (uniform with one concentrated load,
 * a different one for moment and shear). Units of the inputs.
 */
export const truckOrLane: EvidenceCase = (inputs) => {
  const span = inputs.number('span');
  const beam = lineBeam({ spansM: [span], stationsPerSpan: stations });
  const train = axleTrain(inputs);
  const truck = greatest(beam, [train, reversed(train)]);
  const w = inputs.number('laneUniform');
  const lane = {
    moment: (w * span * span) / 8 + (inputs.number('laneForMoment') * span) / 4,
    shear: (w * span) / 2 + inputs.number('laneForShear'),
  };
  return {
    moment: Math.max(truck.moment, lane.moment),
    shear: Math.max(truck.shear, lane.shear),
    truckMoment: truck.moment,
    laneMoment: lane.moment,
    laneShear: lane.shear,
  };
};

/** One lane of HL-93 on a simple span, feet and kips, dynamic allowance left out. */
export const hl93SimpleSpan: EvidenceCase = (inputs) => {
  const spanFt = inputs.number('spanFt');
  const beam = lineBeam({ spansM: [spanFt * foot], stationsPerSpan: 100 });
  const load = oneLane();
  const both = trafficEnvelope(beam, load, { deflection: false });
  const lane = trafficEnvelope(beam, { ...load, vehicleFactor: 0 }, { deflection: false });
  return {
    momentKipFt: Math.max(...both.momentMaxKNm) / (kip * foot),
    shearKip: both.shearMaxKN[0]! / kip,
    laneMidspanMomentKipFt: lane.momentMaxKNm[50]! / (kip * foot),
    truckMidspanMomentKipFt: (both.momentMaxKNm[50]! - lane.momentMaxKNm[50]!) / (kip * foot),
  };
};

/** One lane of HL-93 on two equal spans: least moment at the pier, with and without dynamic allowance. */
export const hl93TwoSpans: EvidenceCase = (inputs) => {
  const beam = lineBeam({ spansM: [inputs.number('spanFt') * foot, inputs.number('spanFt') * foot] });
  const at = beam.supportAt[1]!;
  const pier = (load: TrafficLoad): number =>
    trafficEnvelope(beam, load, { deflection: false }).momentMinKNm[at]! / (kip * foot);
  const load = oneLane();
  return {
    pierMomentKipFt: pier(load),
    withDynamicKipFt: pier({ ...load, vehicleFactor: 1 }),
    laneKipFt: pier({ ...load, vehicleFactor: 0 }),
    twoTrucksKipFt: pier({ ...load, udlKNm: 0 }) / 0.9,
  };
};

/** LM1 on a simple span, kNm and kN: each lane, the sum over a carriageway, and the end shear of lane 1. */
export const lm1SimpleSpan: EvidenceCase = (inputs) => {
  const beam = lineBeam({ spansM: [inputs.number('spanM')], stationsPerSpan: stations });
  const base = trafficOnDeck('lm1', {
    widthM: 12,
    carriagewayM: inputs.numberOr('carriagewayM', 9),
    carriagewayOffsetM: 0,
    lanes: 2,
    footwayM: 0,
    surfacingM: 0,
    superimposedKNm: 0,
  });
  const most = (vehicleFactor: number, udlKNm: number): { moment: number; shear: number } => {
    const envelope = trafficEnvelope(beam, { ...base, vehicleFactor, udlKNm }, { deflection: false });
    return { moment: Math.max(...envelope.momentMaxKNm), shear: envelope.shearMaxKN[0]! };
  };
  const lane1 = most(1, 27);
  return {
    tandemAlone: most(1, 0).moment,
    lane1: lane1.moment,
    lane2: most(2 / 3, 7.5).moment,
    lane3: most(1 / 3, 7.5).moment,
    carriageway: most(base.vehicleFactor, base.udlKNm).moment,
    lane1Shear: lane1.shear,
  };
};

function oneLane(): TrafficLoad {
  return {
    standard: 'hl93',
    vehicleFactor: 1 / 1.33,
    udlKNm: (0.64 * kip) / foot,
    footwayKNm: 0,
    shearRatio: 1,
    loadedLanes: 1,
    distribution: 'whole deck',
  };
}

function axleTrain(inputs: CaseInputs): AxleGroup {
  const gaps = inputs.numbers('gaps');
  const atM = [0];
  for (const gap of gaps) atM.push(atM[atM.length - 1]! + gap);
  return { atM, loadKN: inputs.numbers('axles'), whole: false };
}

function greatest(beam: LineBeam, trains: readonly AxleGroup[]): { moment: number; shear: number } {
  const track = beamTrack(beam);
  const run = { max: 0, min: 0 };
  let moment = 0;
  let shear = 0;
  for (const train of trains) {
    for (let s = 1; s < beam.xM.length - 1; s++) {
      runGroup(track, train, momentLine(beam, s), s, run);
      moment = Math.max(moment, run.max);
    }
    runGroup(track, train, shearLine(beam, 0, 'right'), 0, run);
    shear = Math.max(shear, run.max);
  }
  return { moment, shear };
}
